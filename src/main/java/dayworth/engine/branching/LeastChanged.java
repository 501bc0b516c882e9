package dayworth.engine.branching;

import dayworth.engine.Ways;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.stepping.Descent;
import dayworth.network.Activity;
import dayworth.network.Measures;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Of the plans that are as cheap as one that was found, and use the same measures in the same
 * branch, the one that changes least against another.
 */
final class LeastChanged {

  private final Network network;
  private final List<Charge> charges;
  private final Branch branch;
  private final Plan found;
  private final Descent descent;

  /**
   * Prepares.
   *
   * @param relaxed the branch's convex problem
   */
  LeastChanged(
      Network network, List<Charge> charges, Branch branch, Relaxation relaxed, Plan found) {
    this.network = network;
    this.charges = charges;
    this.branch = branch;
    this.found = found;
    Network open = relaxed.network();
    this.descent =
        new Descent(
            branch.opening().ways().isPlain()
                ? open
                : open.withActivities(settled(branch.opening().ways()), Measures.NONE));
  }

  /** Activities with a choice take the way that was found; what goes along its line stays open. */
  private List<Activity> settled(Ways ways) {
    List<Activity> settled = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      Activity activity = network.activity(i);
      boolean onLine = found.measure(i) == Plan.NO_MEASURE && ways.hasLine(i);
      settled.add(
          onLine
              ? activity
              : new Activity(
                  activity.id(),
                  activity.name(),
                  activity.group(),
                  found.duration(i),
                  found.duration(i),
                  Money.ZERO,
                  Money.ZERO,
                  activity.notBefore(),
                  activity.notFinishedBefore()));
    }
    return settled;
  }

  /** Whether plans like another can be sought here too. */
  boolean serves(Branch other, Plan like) {
    if (!other.equals(branch)) {
      return false;
    }
    Ways ways = branch.opening().ways();
    for (int i = 0; i < network.size(); i++) {
      boolean same =
          found.measure(i) == like.measure(i)
              && (found.duration(i) == like.duration(i)
                  || (found.measure(i) == Plan.NO_MEASURE && ways.hasLine(i)));
      if (!same) {
        return false;
      }
    }
    return true;
  }

  /**
   * The plan; empty if the branch has none that costs the same in truth.
   *
   * @param duration ticks; at most that of the call before
   */
  Optional<Plan> within(long duration, Plan before, Money cost) {
    return descent
        .within(duration, before)
        .map(plan -> plan.withMeasuresOf(found))
        .map(plan -> plan.isScheduled() ? plan : Timing.earliest(network, plan).scheduled())
        .filter(plan -> ProofChecker.possible(network, plan, duration).isEmpty())
        .filter(plan -> ChargedMoney.cost(network, charges, plan).equals(cost));
  }
}
