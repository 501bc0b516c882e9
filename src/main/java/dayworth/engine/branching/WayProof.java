package dayworth.engine.branching;

import dayworth.engine.measures.BoundedShare;
import dayworth.network.Network;
import dayworth.value.Money;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;

/**
 * Keeps what proves the cheapest plan of one finish where activities have ways to choose from: the
 * branches, and in each the shares of plans by the ways they may use, none of which can hold a
 * cheaper plan. Together they hold every plan.
 */
final class WayProof {

  private final Network network;
  private final List<Charge> charges;
  private final long duration;
  private final Money fence;
  private final Point point;
  private final List<Branching.Leaf> leaves = new ArrayList<>();

  private WayProof(Network network, List<Charge> charges, long duration, Point point) {
    this.network = network;
    this.charges = charges;
    this.duration = duration;
    this.fence = ChargedMoney.fence(network, charges, duration);
    this.point = point;
  }

  /**
   * The proof.
   *
   * @param most how many shares are looked at, at most
   * @return empty if that is not enough
   */
  static Optional<Branching.Proof> of(
      Network network, List<Charge> charges, long duration, long most) {
    Point point = Branching.solve(network, charges, new long[] {duration}, most).get(0);
    if (!point.isProved()) {
      return Optional.empty();
    }
    WayProof proof = new WayProof(network, charges, duration, point);
    return proof.run(most)
        ? Optional.of(new Branching.Proof(point, proof.leaves))
        : Optional.empty();
  }

  private boolean run(long most) {
    Deque<Branch> open = new ArrayDeque<>();
    open.push(Branch.whole(network, charges, duration));
    long left = most;
    while (!open.isEmpty()) {
      Branch branch = open.pop();
      WayBranch ways =
          new WayBranch(
              network, charges, branch, branch.relaxation(network, charges, fence), () -> false);
      List<BoundedShare> shares = new ArrayList<>();
      left -= ways.splitUp(duration, point.cost(), left, shares);
      if (ways.halves().isPresent()) {
        ways.halves().get().forEach(open::push);
      } else if (left <= 0) {
        return false;
      } else {
        for (BoundedShare share : shares) {
          leaves.add(new Branching.Leaf(share.network(), share.flow(), ways.fixed()));
        }
      }
    }
    return true;
  }
}
