package dayworth.decision;

import dayworth.engine.Change;
import dayworth.engine.Curve;
import dayworth.engine.Step;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.util.List;

/** The cheapest plans at several finishes of one answer. */
public final class PlansAlong {

  private PlansAlong() {}

  /**
   * A plan with its times for each finish. Between two breakpoints each plan is computed anew; at
   * breakpoints and at the finish asked for it is the answer's own.
   *
   * @param finishes ticks, none shorter than the curve's shortest
   */
  public static List<Timing> at(CurveAnswer answer, List<Long> finishes) {
    return finishes.stream().map(finish -> at(answer, finish)).toList();
  }

  private static Timing at(CurveAnswer answer, long finish) {
    if (finish == answer.asked().timing().finish()) {
      return answer.asked().timing();
    }
    Network network = answer.of().network();
    boolean isConvex = answer.of().isConvex();
    Curve curve = answer.curve();
    if (finish == curve.longest()) {
      return Timing.by(network, curve.firstPlan(), finish);
    }
    for (int k = 0; k < curve.steps().size(); k++) {
      if (finish == curve.steps().get(k).to()) {
        return Timing.by(network, curve.planAfter(k + 1), finish);
      }
    }
    Plan plan = isConvex ? Stepping.planWithin(curve.network(), finish) : between(curve, finish);
    return Timing.by(network, plan, finish);
  }

  /** Along a piece that was joined from several the plan moves evenly. */
  private static Plan between(Curve curve, long finish) {
    int k = 0;
    while (curve.steps().get(k).to() > finish) {
      k++;
    }
    Step step = curve.steps().get(k);
    long[] durations = curve.planAfter(k).toArray();
    for (Change change : step.changes()) {
      durations[change.activity()] -=
          Math.floorDiv(change.shortened() * (step.from() - finish), step.ticks());
    }
    return Plan.of(durations);
  }
}
