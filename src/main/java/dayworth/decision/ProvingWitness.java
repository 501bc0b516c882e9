package dayworth.decision;

import dayworth.engine.Flow;
import dayworth.engine.PieceWitness;
import dayworth.engine.proof.FlowBound;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.proof.Verdict;
import dayworth.network.Network;
import dayworth.network.Plan;

/**
 * Has every piece of a curve checked while it is found. A flow that proves both ends of a piece
 * proves all between: the plans between the ends' plans are possible and cost what lies on the
 * straight line, and so does the flow's bound.
 */
final class ProvingWitness implements PieceWitness {

  private final Network network;
  private final ProofChecker checker;
  private final Watcher watcher;

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
  }

  private void require(Plan plan, long finish, FlowBound bound) {
    if (checker.check(plan, finish, bound, plan.cost(network)) instanceof Verdict.Refuted refuted) {
      throw new ProofFailed(
          "the finish at " + network.scale().text(finish) + ", " + refuted.where(), refuted.why());
    }
  }
}
