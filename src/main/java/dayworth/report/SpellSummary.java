package dayworth.report;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.Pattern;
import dayworth.buildup.Way;
import dayworth.decision.BuildUpAnswer;
import dayworth.decision.Case;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** A row for each activity and pattern: how far its spells go, and what the quickest one costs. */
final class SpellSummary {

  private static final int MOST_ROWS = 60;
  private static final int MOST_NAMED = 6;

  /** The offered spells of one activity at one pattern. */
  private record Line(
      ActivityBuildUp built, Pattern pattern, boolean isFirst, List<Way> all, List<Way> offered) {

    Optional<WayFigures> quickest() {
      return offered.stream()
          .min(Comparator.comparingLong(Way::duration))
          .map(way -> new WayFigures(built, way));
    }

    /** Spells that are not offered. */
    List<Way> useless() {
      return all.stream().filter(way -> !way.verdict().isMeasure()).toList();
    }
  }

  private final Case of;
  private final List<Line> rows = new ArrayList<>();

  SpellSummary(BuildUpAnswer answer) {
    this.of = answer.of();
    Pattern first = answer.all().patterns().get(Math.min(1, answer.all().patterns().size() - 1));
    for (ActivityBuildUp built : answer.shown()) {
      for (Pattern pattern : answer.all().bought()) {
        List<Way> all = built.ways(pattern);
        rows.add(
            new Line(
                built,
                pattern,
                pattern.equals(first),
                all,
                all.stream().filter(w -> w.verdict().isMeasure()).toList()));
      }
    }
  }

  List<String> lines(int width) {
    List<Line> shown = rows.subList(0, Math.min(MOST_ROWS, rows.size()));
    TextColumns columns = new TextColumns(width - Wording.INDENT.length());
    columns.add("", false, column(shown, this::idOnce));
    String units = of.unit().word() + "s";
    columns.add("normal " + units, true, column(shown, this::normalOnce));
    columns.add("", false, column(shown, line -> Wording.safe(line.pattern().name())));
    columns.add("weeks", true, column(shown, SpellSummary::weeks));
    columns.add("least " + units, true, column(shown, line -> figure(line, WayFigures::duration)));
    columns.add("saves", true, column(shown, line -> figure(line, WayFigures::saved)));
    columns.add("extra cost", true, column(shown, line -> amount(line, f -> f.extra().cents())));
    columns.add(
        "per " + of.unit().word(),
        true,
        column(shown, line -> amount(line, f -> f.perUnitSaved().orElseThrow().cents())));
    List<String> lines = new ArrayList<>();
    columns.lines().forEach(line -> lines.add((Wording.INDENT + line).stripTrailing()));
    if (rows.size() > shown.size()) {
      String left = Wording.count(rows.size() - shown.size(), "row is", "rows are");
      lines.add(Wording.INDENT + left + " left out: see buildup.csv");
    }
    lines.add("");
    String read =
        "Weeks are those of the spells that are offered; the figures are of the quickest one, and"
            + " what follows it is worked at the normal pattern.";
    lines.addAll(Wording.wrap(read, Wording.INDENT, width));
    useless(lines, width);
    return lines;
  }

  /** Those first that a spell of the same pattern beats: it is what overtime does by itself. */
  private void useless(List<String> lines, int width) {
    List<String> own = new ArrayList<>();
    List<String> others = new ArrayList<>();
    List<String> slower = new ArrayList<>();
    for (Line line : rows) {
      for (Way way : line.useless()) {
        Optional<String> by = new WayFigures(line.built(), way).dominator();
        String name = id(line) + " " + Wording.safe(way.name());
        if (by.isEmpty()) {
          slower.add(name);
        } else {
          boolean isOwn = by.get().startsWith(line.pattern().name() + " ");
          (isOwn ? own : others).add(name + " (" + Wording.safe(by.get()) + ")");
        }
      }
    }
    own.addAll(others);
    String dominated =
        Wording.count(own.size(), "spell gains", "spells gain")
            + " nothing over what stands in brackets, which is as quick and no dearer: ";
    String late =
        Wording.count(slower.size(), "spell is", "spells are")
            + " cheaper than the normal way and slower: ";
    list(lines, dominated, own, width);
    list(lines, late, slower, width);
  }

  private static void list(List<String> lines, String what, List<String> names, int width) {
    if (names.isEmpty()) {
      return;
    }
    int named = Math.min(MOST_NAMED, names.size());
    String more =
        names.size() > named ? ", and " + Wording.count(names.size() - named, "more", "more") : "";
    String text = what + String.join(", ", names.subList(0, named)) + more + ".";
    lines.addAll(Wording.wrap(text, Wording.INDENT, width));
  }

  private static List<String> column(List<Line> lines, Function<Line, String> cell) {
    return lines.stream().map(cell).toList();
  }

  private String idOnce(Line line) {
    return line.isFirst() ? id(line) : "";
  }

  private String normalOnce(Line line) {
    return line.isFirst() ? Wording.grouped(BuildUp.SCALE.units(line.built().normal())) : "";
  }

  private String id(Line line) {
    return Wording.safe(of.network().activity(line.built().activity()).id());
  }

  private static String weeks(Line line) {
    List<Way> offered = line.offered();
    if (offered.isEmpty()) {
      return "none";
    }
    String first = BuildUpText.weeks(offered.get(0));
    String last = BuildUpText.weeks(offered.get(offered.size() - 1));
    return first.equals(last) ? first : first + " to " + last;
  }

  private static String figure(Line line, Function<WayFigures, BigDecimal> figure) {
    return line.quickest().map(figure).map(Wording::grouped).orElse("");
  }

  /** Whole amounts: cents are in the file. */
  private static String amount(Line line, Function<WayFigures, BigDecimal> amount) {
    return line.quickest().map(amount).map(new MoneyLook(0)::text).orElse("");
  }
}
