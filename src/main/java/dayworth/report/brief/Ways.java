package dayworth.report.brief;

import dayworth.network.Activity;
import dayworth.network.Measure;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.Optional;

/** How a plan does an activity, and what that costs above its normal cost. */
final class Ways {

  private Ways() {}

  /** The measure that a plan does an activity by; empty where it is only compressed or normal. */
  static Optional<Measure> measure(Network network, Plan plan, int activity) {
    int measure = plan.measure(activity);
    return measure == Plan.NO_MEASURE
        ? Optional.empty()
        : Optional.of(network.measures().get(measure));
  }

  /** What an activity costs above its normal cost, without the package of its measure; exact. */
  static Money extra(Network network, Plan plan, int activity) {
    Activity one = network.activity(activity);
    return measure(network, plan, activity)
        .map(measure -> measure.cost().minus(one.normalCost()))
        .orElseGet(() -> one.slope().times(one.normal() - plan.duration(activity)));
  }
}
