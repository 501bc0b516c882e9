package dayworth.testing;

import dayworth.engine.Flow;
import dayworth.engine.Flow.Over;
import dayworth.network.Activity;
import dayworth.network.Plan;
import dayworth.value.Money;

/**
 * A plan and a flow that prove each other, made from the primal and dual values of an outside
 * solver.
 *
 * @param plan the durations, rounded to ticks
 * @param flow the dual values, rounded to scaled units
 */
public record OutsideProof(Plan plan, Flow flow) {

  /**
   * Splits what runs from an activity's start to its finish over the activity's constraints,
   * cheapest first.
   */
  static void spread(Activity activity, int index, long net, Flow flow) {
    Money slope = activity.slope();
    if (slope.signum() >= 0) {
      long overNormal = Math.max(0, Math.min(net, flow.scale().scaled(slope)));
      flow.set(Over.SLOPE, index, overNormal);
      flow.set(Over.CRASH, index, Math.max(0, net - overNormal));
      flow.set(Over.BACK_OVER_NORMAL, index, Math.max(0, -net));
    } else {
      long overCrash = Math.max(0, Math.min(-net, flow.scale().scaled(slope.negate())));
      flow.set(Over.BACK_OVER_CRASH, index, overCrash);
      flow.set(Over.BACK_OVER_NORMAL, index, Math.max(0, -net - overCrash));
      flow.set(Over.CRASH, index, Math.max(0, net));
    }
  }
}
