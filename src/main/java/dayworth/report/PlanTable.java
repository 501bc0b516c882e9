package dayworth.report;

import dayworth.decision.CurveAnswer;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Timing;
import dayworth.value.Money;
import dayworth.value.TimeScale;

/** The text of plan.csv: the plan asked for, an activity a row, at its early times. */
public final class PlanTable {

  private PlanTable() {}

  public static String of(CurveAnswer answer) {
    CsvText csv =
        new CsvText(
            "id",
            "name",
            "duration",
            "measure",
            "units_compressed",
            "extra_cost",
            "start",
            "finish",
            "start_date",
            "finish_date",
            "early_start",
            "early_finish",
            "late_start",
            "late_finish",
            "total_float",
            "free_float",
            "critical");
    Network network = answer.of().network();
    Dates dates = new Dates(answer.of());
    for (int i = 0; i < network.size(); i++) {
      row(csv, answer, dates, i);
    }
    return csv.toString();
  }

  private static void row(CsvText csv, CurveAnswer answer, Dates dates, int index) {
    Network network = answer.of().network();
    Timing timing = answer.asked().timing();
    TimeScale scale = network.scale();
    Activity activity = network.activity(index);
    long duration = timing.plan().duration(index);
    csv.row(
        activity.id(),
        activity.name(),
        scale.text(duration),
        CsvText.BLANK,
        scale.text(activity.normal() - duration),
        CsvText.money(extraCost(activity, duration)),
        scale.text(timing.start(index)),
        scale.text(timing.finish(index)),
        dates.start(timing.start(index), timing.finish(index)),
        dates.finish(timing.finish(index)),
        scale.text(timing.earlyStart(index)),
        scale.text(timing.earlyFinish(index)),
        scale.text(timing.lateStart(index)),
        scale.text(timing.lateFinish(index)),
        scale.text(timing.totalFloat(index)),
        scale.text(timing.freeFloat(index)),
        CsvText.yesNo(timing.isCritical(index)));
  }

  /** What an activity costs above its normal cost; exact. */
  static Money extraCost(Activity activity, long duration) {
    return activity.slope().times(activity.normal() - duration);
  }
}
