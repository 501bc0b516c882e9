package dayworth.decision;

import dayworth.engine.Flow;
import dayworth.engine.PieceWitness;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.Optional;

/** Keeps the flow of the piece of a curve on which a wish comes true: it proves that plan. */
final class FlowCatcher implements PieceWitness {

  private final Network network;
  private final Wish wish;
  private final Money most;
  private Optional<Flow> last = Optional.empty();
  private boolean found;

  /**
   * Waits for the wish's piece.
   *
   * @param most direct and running cost that there may be in all, where money is given
   */
  FlowCatcher(Network network, Wish wish, Money most) {
    this.network = network;
    this.wish = wish;
    this.most = most;
  }

  @Override
  public void piece(long from, Plan fromPlan, long to, Plan toPlan, Flow flow) {
    if (found) {
      return;
    }
    found =
        wish instanceof Wish.Within
            ? toPlan.cost(network).compareTo(most) >= 0
            : to <= wish.duration().orElseThrow();
    if (found || wish instanceof Wish.Within) {
      last = Optional.of(flow.copy());
    }
  }

  /** Its flow; of the last piece where even that leaves money over. */
  Flow flow() {
    return last.orElseThrow();
  }
}
