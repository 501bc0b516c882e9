package dayworth.report;

import dayworth.decision.CrossCheck;
import dayworth.decision.CurveAnswer;
import dayworth.value.TimeScale;

/** The text of crosscheck.csv: the curve beside the linear programme. */
public final class CrosscheckTable {

  private CrosscheckTable() {}

  public static String of(CurveAnswer answer) {
    CsvText csv = new CsvText("duration", "stepping_cost", "lp_cost", "difference");
    TimeScale scale = answer.of().network().scale();
    for (CrossCheck.Comparison comparison : answer.crossCheck().comparisons()) {
      csv.row(
          scale.text(comparison.duration()),
          CsvText.money(comparison.stepping()),
          comparison.linear().toPlainString(),
          comparison.difference().toPlainString());
    }
    return csv.toString();
  }
}
