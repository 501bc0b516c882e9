package dayworth.engine.branching;

import dayworth.network.Plan;
import dayworth.value.Money;

/**
 * The cheapest plan found for a finish.
 *
 * @param duration ticks within which it finishes
 * @param plan says when each activity starts
 * @param cost its exact cost, charges included
 * @param bound no plan that finishes within the duration costs less; at most {@code cost}
 * @param branch where it was found
 */
public record Point(long duration, Plan plan, Money cost, Money bound, Branch branch) {

  /** Bounds on a rounded scale are less than half a cent low. */
  static final Money ROUNDING = Money.of(1).dividedBy(200);

  /** The same point where no more than another bound is known. */
  public Point boundedBy(Money other) {
    return new Point(duration, plan, cost, bound.min(other), branch);
  }

  /** Whether the plan is proved to be cheapest. */
  public boolean isProved() {
    return cost.minus(bound).compareTo(ROUNDING) < 0;
  }
}
