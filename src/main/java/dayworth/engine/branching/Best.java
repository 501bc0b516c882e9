package dayworth.engine.branching;

import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.Optional;

/** The best that is known of one finish. */
final class Best {

  Optional<Plan> plan = Optional.empty();
  Money cost = Money.ZERO;
  Branch branch;

  /** What branches that were not gone on with cost at least; empty if there are none. */
  Optional<Money> leftOpen = Optional.empty();

  Best(Branch branch) {
    this.branch = branch;
  }

  boolean beats(Money bound) {
    return plan.isPresent() && cost.minus(bound).compareTo(Point.ROUNDING) < 0;
  }

  /** What is the best of a shorter finish serves this one too. */
  void offer(Best shorter) {
    shorter.plan.ifPresent(other -> offer(other, shorter.cost, shorter.branch));
  }

  void offer(Plan other, Money otherCost, Branch from) {
    if (plan.isEmpty() || otherCost.compareTo(cost) < 0) {
      plan = Optional.of(other);
      cost = otherCost;
      branch = from;
    }
  }
}
