package dayworth.decision;

import dayworth.engine.Curve;
import dayworth.engine.Flow;
import dayworth.engine.stepping.Descent;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;

/** Where all money is convex the curve is exact everywhere, and stepping proves it as a whole. */
final class ConvexPlans implements CheapestPlans {

  private final Network network;
  private final Curve curve;
  private final Optional<List<List<Flow.Entry>>> flows;

  /**
   * Finds and proves the curve.
   *
   * @param network with all money that hangs on moments as spans
   * @throws ProofFailed if a check refutes it
   */
  ConvexPlans(Network network, Watcher watcher) {
    this.network = network;
    ProvingWitness witness = new ProvingWitness(network, watcher);
    this.curve = Stepping.curve(network, witness);
    this.flows = witness.flows();
  }

  @Override
  public Curve curve() {
    return curve;
  }

  /** Where no money hangs on moments after all, each activity starts as early as it can. */
  @Override
  public List<Plan> plans(SortedSet<Long> durations) {
    Descent descent = new Descent(network);
    List<Plan> plans = new ArrayList<>();
    Plan before = Plan.allNormal(network);
    for (long duration : durations) {
      before = descent.within(duration, before).orElseThrow();
      plans.add(Timing.earliest(network, before).scheduled());
    }
    return plans;
  }

  @Override
  public CrossCheck crossCheck(long most, Watcher watcher) {
    return CrossChecking.of(network, curve, most, watcher);
  }

  @Override
  public List<Unproved> unproved() {
    return List.of();
  }

  @Override
  public long relaxations() {
    return 0;
  }

  @Override
  public Optional<List<List<Flow.Entry>>> flows() {
    return flows;
  }
}
