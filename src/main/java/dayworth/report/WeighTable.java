package dayworth.report;

import dayworth.decision.BestByLoss;
import dayworth.decision.Case;
import dayworth.decision.Choice;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import dayworth.decision.WeighAnswer;
import dayworth.decision.Weighing;
import java.math.BigDecimal;
import java.util.Locale;

/** The text of weigh.csv: a row for each choice, without and with the claimed extension. */
public final class WeighTable {

  private final CsvText csv =
      new CsvText(
          "extension",
          "choice",
          "duration",
          "finish_date",
          "late",
          "late_calendar_days",
          "direct_cost",
          "extra_direct_cost",
          "running_cost",
          "running_cost_saved",
          "time_related_cost",
          "time_related_cost_saved",
          "fixed_cost",
          "damages",
          "bonus",
          "total_cost",
          "saved_against_as_it_stands",
          "loss_factor");

  private WeighTable() {}

  public static String of(WeighAnswer answer) {
    WeighTable table = new WeighTable();
    table.add(answer.granted(), "without");
    answer.claimed().ifPresent(claimed -> table.add(claimed, "with"));
    answer.byLoss().ifPresent(best -> best.tried().forEach(table::add));
    return table.csv.toString();
  }

  private void add(Weighing weighing, String extension) {
    for (Choice choice : weighing.choices()) {
      add(weighing.curve(), extension, name(choice), choice.finish());
    }
  }

  private void add(BestByLoss.Tried tried) {
    add(tried.curve(), "without", "least_total_by_loss_factor", tried.best());
  }

  private void add(CurveAnswer curve, String extension, String choice, Finish finish) {
    Case of = curve.of();
    Lateness late = new Lateness(of);
    Dates dates = new Dates(of);
    Finish planned = curve.asPlanned();
    BigDecimal time = finish.other().timeRelated().cents();
    csv.row(
        extension,
        choice,
        of.network().scale().text(finish.duration()),
        dates.finish(finish.duration()),
        late.units(finish).map(BigDecimal::toPlainString).orElse(CsvText.BLANK),
        late.calendarDays(finish).map(Object::toString).orElse(CsvText.BLANK),
        CsvText.money(finish.direct()),
        text(finish.direct().cents().subtract(planned.direct().cents())),
        CsvText.money(finish.running()),
        text(planned.running().cents().subtract(finish.running().cents())),
        text(time),
        text(planned.other().timeRelated().cents().subtract(time)),
        CsvText.money(finish.other().fixed()),
        CsvText.money(finish.other().damages()),
        CsvText.money(finish.other().bonus()),
        text(finish.total()),
        text(planned.total().subtract(finish.total())),
        of.buildUp().isNone()
            ? CsvText.BLANK
            : WayFigures.number(of.buildUp().lossFactor()).toPlainString());
  }

  /** A kind of choice as files name it. */
  static String name(Choice choice) {
    String kind = choice.kind().name().toLowerCase(Locale.ROOT);
    return choice.section().isEmpty() ? kind : kind + ": " + choice.section();
  }

  private static String text(BigDecimal amount) {
    return amount.toPlainString();
  }
}
