package dayworth.decision;

import dayworth.contract.FinishCost;
import dayworth.contract.MomentMoney;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.Optional;

/** Counts all the money of a plan that says when activities start. */
final class PlanCost {

  private PlanCost() {}

  /**
   * A finish that is no row of a curve: it has no price.
   *
   * @param duration ticks within which the plan finishes
   * @param plan says when activities start where money hangs on that
   */
  static Finish of(Case of, Plan plan, long duration) {
    Money running = of.momentMoney().isNone() ? Money.ZERO : of.momentMoney().runningOf(plan);
    return new Finish(
        duration,
        plan.directCost(of.network()),
        running,
        other(of, plan, duration),
        Optional.empty(),
        false);
  }

  private static FinishCost other(Case of, Plan plan, long duration) {
    MomentMoney money = of.momentMoney();
    FinishCost whole = of.terms().at(duration);
    return money.isNone() ? whole : whole.plus(money.damagesOf(plan), money.bonusOf(plan));
  }
}
