package dayworth.report;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.ExtraCost;
import dayworth.buildup.Spell;
import dayworth.buildup.Way;
import dayworth.decision.BuildUpAnswer;
import dayworth.value.Quantity;

/**
 * The text of buildup.csv: for each activity a row for the normal way, then one for each pattern
 * and number of weeks with every line of its sum.
 */
public final class BuildUpTable {

  private final CsvText csv =
      new CsvText(
          "activity",
          "pattern",
          "weeks",
          "weeks_after",
          "duration",
          "saved",
          "hours_worked",
          "hours_lost",
          "hours_crowded",
          "output_hours",
          "pay",
          "premium",
          "lost_output",
          "extra_hours",
          "supervision",
          "once_cost",
          "extra_cost",
          "cost",
          "extra_per_unit_saved",
          "verdict",
          "dominated_by",
          "loss_factor",
          "loss_source");

  private final BuildUpAnswer answer;

  private BuildUpTable(BuildUpAnswer answer) {
    this.answer = answer;
  }

  public static String of(BuildUpAnswer answer) {
    BuildUpTable table = new BuildUpTable(answer);
    answer.all().activities().forEach(table::add);
    return table.csv.toString();
  }

  private void add(ActivityBuildUp built) {
    normal(built);
    built.ways().forEach(way -> way(built, way));
  }

  private void normal(ActivityBuildUp built) {
    String hours = text(built.labour().hours());
    csv.row(
        id(built),
        answer.all().patterns().get(0).name(),
        CsvText.BLANK,
        CsvText.BLANK,
        BuildUp.SCALE.text(built.normal()),
        "0",
        hours,
        "0",
        "0",
        hours,
        CsvText.BLANK,
        CsvText.BLANK,
        CsvText.BLANK,
        CsvText.BLANK,
        CsvText.BLANK,
        CsvText.BLANK,
        CsvText.BLANK,
        CsvText.money(built.normalCost()),
        CsvText.BLANK,
        "normal",
        CsvText.BLANK,
        CsvText.BLANK,
        CsvText.BLANK);
  }

  private void way(ActivityBuildUp built, Way way) {
    WayFigures figures = new WayFigures(built, way);
    Spell spell = way.spell();
    ExtraCost extra = spell.extra();
    csv.row(
        id(built),
        spell.pattern().name(),
        spell.roundedWeeks().toPlainString(),
        text(spell.weeksAfter()),
        figures.duration().toPlainString(),
        figures.saved().toPlainString(),
        text(spell.hoursWorked()),
        text(spell.hoursLost()),
        text(spell.hoursCrowded()),
        text(spell.output()),
        CsvText.money(spell.pay()),
        CsvText.money(extra.premium()),
        CsvText.money(extra.lostOutput()),
        CsvText.money(extra.extraHours()),
        CsvText.money(extra.supervision()),
        CsvText.money(extra.once()),
        CsvText.money(extra.total()),
        CsvText.money(way.cost()),
        figures.perUnitSaved().map(CsvText::money).orElse(CsvText.BLANK),
        figures.verdict(),
        figures.dominator().orElse(CsvText.BLANK),
        text(answer.all().lossFactor()),
        figures.sources());
  }

  private String id(ActivityBuildUp built) {
    return answer.of().network().activity(built.activity()).id();
  }

  private static String text(Quantity number) {
    return WayFigures.number(number).toPlainString();
  }
}
