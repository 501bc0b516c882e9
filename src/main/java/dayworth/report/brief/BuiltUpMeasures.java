package dayworth.report.brief;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.Caution;
import dayworth.buildup.ExtraCost;
import dayworth.buildup.Labour;
import dayworth.buildup.OutputLoss;
import dayworth.buildup.Pattern;
import dayworth.buildup.Spell;
import dayworth.buildup.Way;
import dayworth.decision.BriefAnswer;
import dayworth.decision.MeetAnswer.Bought;
import dayworth.network.Measure;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.report.CautionText;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.page.Part.Statement;
import dayworth.report.brief.page.Table;
import dayworth.report.brief.page.Table.Cell;
import dayworth.report.brief.page.Table.Column;
import dayworth.report.brief.page.Table.Row;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What the cost of each measure in use is made of: line by line where it was built up from labour,
 * with the source of every loss of output; and which costs the case gives as one sum.
 */
final class BuiltUpMeasures {

  /** More tables nobody reads; the rest is in the files of the build-up. */
  private static final int MOST_TABLES = 12;

  private static final int MOST_IDS = 6;
  private static final Quantity HUNDRED = Quantity.of(100);

  private final Words words;
  private final Numbering numbering;
  private final BuildUp all;
  private final List<Used> used = new ArrayList<>();
  private final List<Integer> asOneSum = new ArrayList<>();

  /** A measure in use that was built up. */
  private record Used(int activity, ActivityBuildUp built, Way way) {}

  BuiltUpMeasures(BriefAnswer answer, Words words, Numbering numbering) {
    this.words = words;
    this.numbering = numbering;
    this.all = answer.of().buildUp();
    Network network = answer.of().network();
    Plan plan = answer.chosen().curve().asked().timing().plan();
    for (Bought one : answer.chosen().bought()) {
      Optional<Measure> measure = Ways.measure(network, plan, one.activity());
      if (measure.isPresent()) {
        builtUp(one.activity(), measure.get())
            .ifPresentOrElse(used::add, () -> asOneSum.add(one.activity()));
      }
    }
  }

  /** No row of measures.csv has the name of a spell of the same activity. */
  private Optional<Used> builtUp(int activity, Measure measure) {
    return all.of(activity)
        .flatMap(
            built ->
                built
                    .measures()
                    .filter(way -> way.name().equals(measure.name()))
                    .findFirst()
                    .map(way -> new Used(activity, built, way)));
  }

  List<Part> parts() {
    List<Part> parts = new ArrayList<>();
    for (Used one : used.subList(0, Math.min(MOST_TABLES, used.size()))) {
      parts.add(new Part.Sheet(table(one)));
      parts.add(new Part.Statements(statements(one)));
    }
    int left = used.size() - MOST_TABLES;
    if (left > 0) {
      parts.add(
          new Part.Prose(
              List.of(
                  Words.capital(Words.count(left, "more measure is", "more measures are"))
                      + " built up from labour; buildup.csv has the lines.")));
    }
    parts.addAll(cautions());
    if (!asOneSum.isEmpty()) {
      parts.add(given());
    }
    return parts;
  }

  private Part given() {
    String ids = Words.list(asOneSum.stream().map(words::id).toList(), MOST_IDS);
    return new Part.Gap(
        "Not in the case: what the cost of "
            + (asOneSum.size() == 1 ? "this measure is" : "these measures is")
            + " made of.",
        "For "
            + ids
            + " measures.csv gives the cost of the measure as one sum, without crew, hours and"
            + " output. With labour.csv, patterns.csv, pay.csv and output_loss.csv this part shows"
            + " the lines and the source of every productivity figure.");
  }

  // Line by line

  private Table table(Used one) {
    Spell spell = one.way().spell();
    Labour labour = one.built().labour();
    ExtraCost extra = spell.extra();
    List<Row> rows = new ArrayList<>();
    rows.add(
        row(
            "Premium",
            "paid above the straight rate of " + words.money(labour.rate()) + " an hour",
            extra.premium()));
    rows.add(
        row(
            "Lost output",
            spell.hoursLost().signum() == 0
                ? "none"
                : hours(spell.hoursLost()) + " that yield nothing, at the straight rate",
            extra.lostOutput()));
    rows.add(
        row(
            "Extra hours",
            spell.hoursCrowded().signum() == 0
                ? "none: the crew is not crowded"
                : hours(spell.hoursCrowded())
                    + " more for the same output, because the crew is crowded",
            extra.extraHours()));
    rows.add(row("Supervision", supervision(spell), extra.supervision()));
    rows.add(row("Once", extra.once().isZero() ? "none" : "paid once for the spell", extra.once()));
    Row sum = row("Sum", "more than at the normal pattern throughout", extra.total());
    rows.add(new Row(Row.Kind.SUM, sum.cells()));
    return new Table(
        numbering.table(),
        words.id(one.activity())
            + " by "
            + Words.safe(one.way().name())
            + ": what it costs more than the normal pattern",
        List.of(Column.words("Line"), Column.words("What it is"), Column.figures("Amount")),
        rows,
        Table.Look.STACKING);
  }

  private Row row(String name, String what, Money amount) {
    return new Row(
        Row.Kind.PLAIN, List.of(Cell.of(name), Cell.of(what), Cell.of(words.money(amount))));
  }

  private String supervision(Spell spell) {
    boolean normalHasNone = all.patterns().get(0).weekCost().isZero();
    return normalHasNone
        ? words.money(spell.pattern().weekCost()) + " a week for " + weeks(spell.weeks())
        : "cost by the week, less that of the normal pattern";
  }

  private List<Statement> statements(Used one) {
    List<Statement> said = new ArrayList<>();
    said.add(new Statement(hoursAndWeeks(one), "labour.csv, patterns.csv"));
    said.addAll(losses(one.way().spell()));
    return said;
  }

  private String hoursAndWeeks(Used one) {
    Spell spell = one.way().spell();
    Pattern pattern = spell.pattern();
    Quantity workers = one.built().labour().crew().times(pattern.crewFactor());
    String after =
        spell.lastsToTheEnd()
            ? ""
            : ", then "
                + weeks(spell.weeksAfter())
                + " of "
                + Words.decimals(all.patterns().get(0).hoursPerWeek())
                + " hours by the normal crew";
    return Words.capital(weeks(spell.weeks()))
        + " of "
        + Words.decimals(pattern.hoursPerWeek())
        + " hours a week for each of "
        + Words.decimals(workers)
        + " workers, on "
        + Words.decimals(pattern.daysPerWeek())
        + " days a week"
        + after
        + "; "
        + Words.decimals(spell.hoursWorked())
        + " hours worked in all for "
        + Words.decimals(one.built().labour().hours())
        + " hours of output.";
  }

  private List<Statement> losses(Spell spell) {
    List<Statement> said = new ArrayList<>();
    Pattern pattern = spell.pattern();
    if (pattern.loss().weeks().isEmpty()) {
      said.add(
          new Statement(
              "No loss of output is given for this pattern, so none is counted.",
              "output_loss.csv: no row for it"));
    } else {
      int begun = spell.weeks().rounded(0, RoundingMode.CEILING).intValueExact();
      String sources =
          String.join(
              "; ",
              pattern.loss().sources(begun).stream()
                  .map(source -> source.isEmpty() ? "no source given" : Words.safe(source))
                  .toList());
      said.add(
          new Statement(
              "Output lost: " + byWeeks(pattern.loss(), begun) + ".",
              "output_loss.csv, source: " + sources));
    }
    if (pattern.crowdingLoss().signum() > 0) {
      said.add(
          new Statement(
              "Lost to crowding: "
                  + percent(pattern.crowdingLoss())
                  + " of the output, in every week.",
              "patterns.csv, crowding_loss; no source given"));
    }
    return said;
  }

  /** Weeks of one loss after another are told together. */
  private static String byWeeks(OutputLoss loss, int weeks) {
    List<String> runs = new ArrayList<>();
    int from = 1;
    for (int week = 1; week <= weeks; week++) {
      if (week == weeks || !loss.in(week + 1).equals(loss.in(week))) {
        runs.add(
            percent(loss.in(from))
                + (from == week ? " in week " + week : " in weeks " + from + " to " + week));
        from = week + 1;
      }
    }
    return String.join(", ", runs);
  }

  // What asks for care

  private List<Part> cautions() {
    Map<Pattern, Quantity> longest = new LinkedHashMap<>();
    for (Used one : used) {
      Spell spell = one.way().spell();
      longest.merge(spell.pattern(), spell.weeks(), Quantity::max);
    }
    List<Part> cautions = new ArrayList<>();
    longest.forEach(
        (pattern, weeks) -> {
          List<String> said =
              Caution.of(pattern, all.patterns().get(0), weeks).stream()
                  .map(caution -> CautionText.of(caution, pattern))
                  .toList();
          if (!said.isEmpty()) {
            cautions.add(
                new Part.Caution(
                    "Caution, " + Words.safe(pattern.name()) + ".",
                    Words.capital(String.join("; ", said)) + "."));
          }
        });
    if (!cautions.isEmpty()) {
      cautions.add(new Part.Caution("Who decides.", CautionText.WHO_DECIDES));
    }
    return cautions;
  }

  private static String hours(Quantity hours) {
    String number = Words.decimals(hours);
    return number + (number.equals("1") ? " hour" : " hours");
  }

  private static String weeks(Quantity weeks) {
    String number = Words.decimals(weeks);
    return number + (number.equals("1") ? " week" : " weeks");
  }

  private static String percent(Quantity share) {
    return Words.decimals(share.times(HUNDRED)) + " %";
  }
}
