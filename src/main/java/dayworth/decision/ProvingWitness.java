package dayworth.decision;

import dayworth.engine.Flow;
import dayworth.engine.PieceWitness;
import dayworth.engine.proof.FlowBound;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.proof.Verdict;
import dayworth.network.Network;
import dayworth.network.Plan;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Has every piece of a curve checked while it is found. A flow that proves both ends of a piece
 * proves all between: the plans between the ends' plans are possible and cost what lies on the
 * straight line, and so does the flow's bound.
 */
final class ProvingWitness implements PieceWitness {

  private final Network network;
  private final ProofChecker checker;
  private final Watcher watcher;
  private final List<List<Flow.Entry>> flows = new ArrayList<>();
  private long room = Evidence.MOST_ENTRIES;

  ProvingWitness(Network network, Watcher watcher) {
    this.network = network;
    this.watcher = watcher;
    this.checker = new ProofChecker(network);
  }

  @Override
  public void piece(long from, Plan fromPlan, long to, Plan toPlan, Flow flow) {
    watcher.now("finding and proving the curve, now at " + network.scale().text(to));
    FlowBound bound = checker.bound(flow);
    require(fromPlan, from, bound);
    if (to != from) {
      require(toPlan, to, bound);
    }
    keep(flow);
  }

  /** Once there is no room for all, none is kept. */
  private void keep(Flow flow) {
    if (room >= 0) {
      List<Flow.Entry> entries = flow.entries();
      room -= entries.size();
      flows.add(entries);
    }
    if (room < 0) {
      flows.clear();
    }
  }

  /** The flow of each piece; empty if they are too many to be carried. */
  Optional<List<List<Flow.Entry>>> flows() {
    return room < 0 ? Optional.empty() : Optional.of(List.copyOf(flows));
  }

  private void require(Plan plan, long finish, FlowBound bound) {
    if (checker.check(plan, finish, bound, plan.cost(network)) instanceof Verdict.Refuted refuted) {
      throw new ProofFailed(
          "the finish at " + network.scale().text(finish) + ", " + refuted.where(), refuted.why());
    }
  }
}
