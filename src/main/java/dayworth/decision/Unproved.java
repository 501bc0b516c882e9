package dayworth.decision;

import dayworth.value.Money;

/**
 * A finish whose plan is the best that was found before the limit on branches was reached.
 *
 * @param duration ticks
 * @param cost of the best plan: direct and running cost and section money
 * @param bound no plan costs less
 */
public record Unproved(long duration, Money cost, Money bound) {

  /** By how much the plan may be too dear at most. */
  public Money gap() {
    return cost.minus(bound);
  }
}
