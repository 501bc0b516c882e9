package dayworth.report;

import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import dayworth.value.TimeScale;

/** The text of curve.csv: what each finish costs, longest first. */
public final class CurveTable {

  private CurveTable() {}

  public static String of(CurveAnswer answer) {
    CsvText csv =
        new CsvText(
            "duration",
            "finish_date",
            "direct_cost",
            "running_cost",
            "time_related_cost",
            "fixed_cost",
            "damages",
            "bonus",
            "total_cost",
            "price_per_unit",
            "breakpoint");
    Dates dates = new Dates(answer.of());
    TimeScale scale = answer.of().network().scale();
    for (Finish row : answer.rows()) {
      csv.row(
          scale.text(row.duration()),
          dates.finish(row.duration()),
          CsvText.money(row.direct()),
          CsvText.money(row.running()),
          CsvText.money(row.other().timeRelated()),
          CsvText.money(row.other().fixed()),
          CsvText.money(row.other().damages()),
          CsvText.money(row.other().bonus()),
          row.total().toPlainString(),
          row.pricePerUnit().map(CsvText::money).orElse(CsvText.BLANK),
          CsvText.yesNo(row.breakpoint()));
    }
    return csv.toString();
  }
}
