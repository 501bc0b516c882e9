package dayworth.report;

import dayworth.decision.Case;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Status;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;

/**
 * The text of plan.csv: the plan asked for, an activity a row, at its early times; what is finished
 * has its dates alone.
 */
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
    Case of = answer.of();
    Timing timing = answer.asked().timing();
    TimeScale scale = of.network().scale();
    Activity activity = of.network().activity(index);
    Status status = of.status(index);
    long start = timing.start(index);
    long finish = timing.finish(index);
    long duration = timing.plan().duration(index);
    List<String> cells =
        new ArrayList<>(
            List.of(
                activity.id(),
                activity.name(),
                scale.text(duration),
                MeasureNames.of(of.network(), timing.plan().measure(index)),
                scale.text(activity.normal() - duration),
                CsvText.money(extraCost(of.network(), timing.plan(), index)),
                status.started().isPresent() ? CsvText.BLANK : scale.text(start),
                status.isFinished() ? CsvText.BLANK : scale.text(finish),
                dates.start(status, start, finish),
                dates.finish(status, finish)));
    times(timing, index)
        .map(ticks -> status.isFinished() ? CsvText.BLANK : scale.text(ticks))
        .forEach(cells::add);
    cells.add(CsvText.yesNo(of.isCritical(timing, index)));
    csv.row(cells.toArray(String[]::new));
  }

  /** Early and late times and floats, in the order of the columns. */
  private static Stream<Long> times(Timing timing, int index) {
    return Stream.of(
        timing.earlyStart(index),
        timing.earlyFinish(index),
        timing.lateStart(index),
        timing.lateFinish(index),
        timing.totalFloat(index),
        timing.freeFloat(index));
  }

  /** What an activity costs above its normal cost; exact. */
  static Money extraCost(Network network, Plan plan, int activity) {
    return plan.costOf(network, activity).minus(network.activity(activity).normalCost());
  }
}
