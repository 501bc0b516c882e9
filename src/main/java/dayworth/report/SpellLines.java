package dayworth.report;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.ExtraCost;
import dayworth.buildup.Pattern;
import dayworth.buildup.PayLadder;
import dayworth.buildup.Verdict;
import dayworth.buildup.Way;
import dayworth.decision.BuildUpAnswer;
import dayworth.decision.Case;
import dayworth.network.Activity;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Collectors;

/** All spells of one activity, by pattern, each with every line of its extra cost. */
final class SpellLines {

  /** Cents are in the file. */
  private static final MoneyLook WHOLE = new MoneyLook(0);

  private final BuildUpAnswer answer;
  private final Case of;
  private final ActivityBuildUp built;

  SpellLines(BuildUpAnswer answer, ActivityBuildUp built) {
    this.answer = answer;
    this.of = answer.of();
    this.built = built;
  }

  List<String> lines(int width) {
    List<String> lines = new ArrayList<>(Wording.wrap(labour(), Wording.INDENT, width));
    for (Pattern pattern : answer.all().bought()) {
      List<Way> ways = built.ways(pattern);
      lines.add("");
      lines.addAll(Wording.wrap(facts(pattern), Wording.INDENT, width));
      table(ways, width).forEach(line -> lines.add(Wording.INDENT + Wording.INDENT + line));
      notOffered(ways).forEach(text -> lines.addAll(Wording.wrap(text, "    ", width)));
    }
    lines.add("");
    String read =
        "Amounts are whole here; buildup.csv has the cents. Premium is pay above the straight rate;"
            + " lost output and extra hours are straight pay for hours that yield nothing, because"
            + " output falls or the crew is crowded; weekly and once are the pattern's own costs.";
    lines.addAll(Wording.wrap(read, Wording.INDENT, width));
    return lines;
  }

  private String labour() {
    Activity activity = of.network().activity(built.activity());
    String name = activity.name().isEmpty() ? "" : " " + Wording.safe(activity.name());
    return Wording.safe(activity.id())
        + name
        + (built.ofRemaining() ? ", what is left of it" : "")
        + ": "
        + number(built.labour().hours())
        + " hours, a crew of "
        + number(built.labour().crew())
        + " at "
        + money(built.labour().rate())
        + " an hour, "
        + money(built.labour().otherCost())
        + " other cost; normal "
        + Wording.grouped(BuildUp.SCALE.units(built.normal()))
        + " "
        + Wording.unit(of, BuildUp.SCALE.units(built.normal()))
        + ", "
        + money(built.normalCost())
        + ".";
  }

  private static String facts(Pattern pattern) {
    String steps =
        pattern.pay().steps().stream().map(SpellLines::step).collect(Collectors.joining(", "));
    String crew =
        pattern.crewFactor().equals(Quantity.ONE)
            ? ""
            : ", " + number(pattern.crewFactor()) + " times the crew";
    String crowding =
        pattern.crowdingLoss().signum() == 0
            ? ""
            : ", " + number(pattern.crowdingLoss().times(Quantity.of(100))) + " % lost to crowding";
    return Wording.safe(pattern.name())
        + ": "
        + number(pattern.hoursPerWeek())
        + " hours in "
        + number(pattern.daysPerWeek())
        + " days"
        + crew
        + crowding
        + (steps.isEmpty() ? ", straight pay" : ", paid " + steps);
  }

  private static String step(PayLadder.Step step) {
    String from =
        step.aboveHours().signum() == 0 ? "for all hours" : "above " + number(step.aboveHours());
    return number(step.multiplier()) + " times " + from;
  }

  private List<String> table(List<Way> ways, int width) {
    TextColumns columns = new TextColumns(width - 2 * Wording.INDENT.length());
    List<WayFigures> all = ways.stream().map(way -> new WayFigures(built, way)).toList();
    columns.add("weeks", true, ways.stream().map(BuildUpText::weeks).toList());
    columns.add(of.unit().word() + "s", true, column(all, f -> Wording.grouped(f.duration())));
    columns.add("saved", true, column(all, f -> Wording.grouped(f.saved())));
    columns.add("premium", true, lines(all, ExtraCost::premium));
    columns.add("lost output", true, lines(all, ExtraCost::lostOutput));
    columns.add("extra hours", true, lines(all, ExtraCost::extraHours));
    columns.add("weekly", true, lines(all, ExtraCost::supervision));
    columns.add("once", true, lines(all, ExtraCost::once));
    columns.add("extra", true, lines(all, ExtraCost::total));
    columns.add(
        "per " + of.unit().word(),
        true,
        column(
            all,
            f ->
                f.way().verdict().isMeasure()
                    ? f.perUnitSaved().map(SpellLines::whole).orElse("")
                    : "no"));
    return columns.lines();
  }

  private static List<String> lines(List<WayFigures> all, Function<ExtraCost, Money> line) {
    return column(all, f -> whole(line.apply(f.way().spell().extra())));
  }

  private static List<String> column(List<WayFigures> all, Function<WayFigures, String> cell) {
    return all.stream().map(cell).toList();
  }

  private List<String> notOffered(List<Way> ways) {
    List<String> texts = new ArrayList<>();
    for (Way way : ways) {
      if (way.verdict() instanceof Verdict.Dominated dominated) {
        texts.add(
            "Not offered: "
                + Wording.safe(way.name())
                + "; "
                + Wording.safe(dominated.by())
                + " is as quick and no dearer.");
      } else if (!way.verdict().isMeasure()) {
        texts.add("Not offered: " + Wording.safe(way.name()) + " takes longer than normal.");
      }
    }
    return texts;
  }

  private static String whole(Money amount) {
    return WHOLE.text(amount.cents());
  }

  private static String money(Money amount) {
    return MoneyLook.of(List.of(amount.cents())).text(amount.cents());
  }

  private static String number(Quantity number) {
    return Wording.grouped(WayFigures.number(number));
  }
}
