package dayworth.report;

import dayworth.decision.Choice;
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
          "saved_against_as_it_stands");

  private WeighTable() {}

  public static String of(WeighAnswer answer) {
    WeighTable table = new WeighTable();
    table.add(answer.granted(), "without");
    answer.claimed().ifPresent(claimed -> table.add(claimed, "with"));
    return table.csv.toString();
  }

  private void add(Weighing weighing, String extension) {
    weighing.choices().forEach(choice -> add(weighing, extension, choice));
  }

  private void add(Weighing weighing, String extension, Choice choice) {
    Lateness late = new Lateness(weighing.curve().of());
    Dates dates = new Dates(weighing.curve().of());
    Finish planned = weighing.asItStands();
    Finish finish = choice.finish();
    BigDecimal time = finish.other().timeRelated().cents();
    csv.row(
        extension,
        name(choice),
        weighing.curve().of().network().scale().text(finish.duration()),
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
        text(weighing.saved(finish)));
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
