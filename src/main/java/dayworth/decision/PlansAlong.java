package dayworth.decision;

import dayworth.engine.Curve;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Network;
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
    Curve curve = answer.curve();
    if (finish == curve.longest()) {
      return Timing.by(network, curve.firstPlan(), finish);
    }
    for (int k = 0; k < curve.steps().size(); k++) {
      if (finish == curve.steps().get(k).to()) {
        return Timing.by(network, curve.planAfter(k + 1), finish);
      }
    }
    return Timing.by(network, Stepping.planWithin(network, finish), finish);
  }
}
