package dayworth.report;

import dayworth.decision.BestByRate;
import dayworth.decision.BestByRate.Range;
import dayworth.decision.Case;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;

/** Which finish is best at which rate, in ranges around the one that the case has. */
final class BreakEvenTable {

  private static final int MOST_ROWS = 7;
  private static final String INDENT = "    ";

  private final Case of;
  private final BestByRate best;
  private final List<Range> shown;
  private final int left;
  private final MoneyLook look;

  BreakEvenTable(Case of, BestByRate best) {
    this.of = of;
    this.best = best;
    List<Range> all = best.ranges();
    int present = all.indexOf(best.present());
    int first = Math.max(0, Math.min(present - MOST_ROWS / 2, all.size() - MOST_ROWS));
    this.shown = all.subList(first, Math.min(all.size(), first + MOST_ROWS));
    this.left = all.size() - shown.size();
    this.look = look(all, best.now());
  }

  /** Whole amounts unless two ends would then look the same. */
  private static MoneyLook look(List<Range> all, Money now) {
    List<BigDecimal> whole =
        all.stream().map(range -> range.from().rounded(0, RoundingMode.HALF_UP)).toList();
    boolean distinct = whole.stream().distinct().count() == whole.size();
    return distinct && MoneyLook.of(List.of(now.cents())).decimals() == 0
        ? new MoneyLook(0)
        : new MoneyLook(2);
  }

  List<String> lines(String title, Style style, int width) {
    TextColumns columns = new TextColumns(width - INDENT.length());
    columns.add("", false, column(this::range));
    if (new Dates(of).areKnown()) {
      columns.add(
          "", false, new Dates(of).column(shown.stream().map(r -> r.finish().duration()).toList()));
    }
    columns.add("", true, column(range -> Wording.duration(of, range.finish().duration())));
    columns.add("", false, column(this::note));
    List<String> lines = new ArrayList<>(Wording.wrap(title, Wording.INDENT, width));
    List<String> rows = columns.lines();
    for (int i = 0; i < shown.size(); i++) {
      // The header, which is empty, comes before the first row.
      String row = rows.get(i + 1);
      boolean present = shown.get(i).equals(best.present());
      lines.add(present ? style.bold("  > " + row) : INDENT + row);
    }
    if (left > 0) {
      lines.add(
          INDENT + Wording.count(left, "range is", "ranges are") + " left out: see result.json");
    }
    return lines;
  }

  private List<String> column(Function<Range, String> cell) {
    return shown.stream().map(cell).toList();
  }

  private String range(Range range) {
    String from = text(range.from());
    if (range.to().isEmpty()) {
      return "above " + from;
    }
    String to = text(range.to().get());
    return range.from().isZero() ? "up to " + to : from + " to " + to;
  }

  private String text(Money rate) {
    return look.text(rate.rounded(look.decimals(), RoundingMode.HALF_UP));
  }

  private String note(Range range) {
    List<String> notes = new ArrayList<>();
    BigDecimal now = best.now().cents();
    if (range.equals(best.present())) {
      notes.add("the case says " + MoneyLook.of(List.of(now)).text(now));
    }
    if (of.terms()
        .contractFinish()
        .filter(d -> d.ticks() == range.finish().duration())
        .isPresent()) {
      notes.add("contract finish");
    }
    if (range.isCapped()) {
      notes.add("damages capped");
    }
    return String.join(", ", notes);
  }
}
