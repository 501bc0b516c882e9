package dayworth.engine.proof;

import dayworth.engine.Flow;
import dayworth.engine.Obstacle;
import dayworth.engine.proof.Verdict.Proved;
import dayworth.engine.proof.Verdict.Refuted;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.List;
import java.util.Optional;

/**
 * Rechecks points of a curve from the activities and links alone: a plan that finishes within T and
 * a flow whose bound equals its cost prove each other.
 *
 * <p><b>Why.</b> Weak duality (Kelley 1961, "Critical-path planning and scheduling: mathematical
 * basis"; Fulkerson 1961, "A network flow computation for project cost curves"). Let any plan
 * finish within T, with duration d = f − s, normal N, crash C; let x ≥ 0 be what the flow sends
 * over a constraint "event v at least w after event u". Each constraint gives a term x × (w − (t_v
 * − t_u)), and none is more than what the plan pays for it:
 *
 * <ul>
 *   <li>slope c ≥ 0, s to f, w = N, x ≤ c: the activity costs normal cost + c(N − d), and c(N − d)
 *       ≥ x(N − d) as N − d ≥ 0. A slope of zero lets nothing through, and shortening is free.
 *   <li>crashing cheaper, c &lt; 0, f to s, w = −C, x ≤ |c|: it costs crash cost + |c|(d − C), and
 *       |c|(d − C) ≥ x(d − C) = x(−C − (s − f)) as d − C ≥ 0.
 *   <li>crash, s to f, w = C: x(C − d) ≤ 0. Back over normal, f to s, w = −N: x(d − N) ≤ 0.
 *   <li>link, w its lag: x(lag − (t_v − t_u)) ≤ 0.
 *   <li>project start to s, w the not-before time: x(w − s) ≤ 0; to f, w the not-finished-before
 *       time: x(w − f) ≤ 0. f to project finish, w = 0: x(f − F) ≤ 0.
 *   <li>span of rate r, its later moment to its earlier one, w = minus what is free, x ≤ r: it
 *       costs r·max(0, t(to) − t(from) − free) ≥ x(w − (t(from) − t(to))).
 * </ul>
 *
 * Added up, cost ≥ Σ cheapest cost + Σ w·x − Σ x(t_v − t_u). As the flow is conserved at every
 * event and v leaves the project start and reaches its finish, the last sum is v·F ≤ v·T: cost ≥
 * base + Σ w·x − v·T, whatever the plan. One that costs exactly that cannot be beaten. Limits are
 * rounded down to the flow's scale, so the bound holds for the true slopes.
 *
 * <p>O(activities + links) for a flow and for a plan; exact: sums run in longs and spill over into
 * big integers.
 */
public final class ProofChecker {

  /** A bound on a rounded scale is less than half a cent below the cost. */
  private static final Money MOST_GAP = Money.of(1).dividedBy(200);

  private final Network network;
  private final CostRecount costs;
  private Optional<FlowLimits> lastLimits = Optional.empty();

  public ProofChecker(Network network) {
    this.network = network;
    this.costs = new CostRecount(network);
  }

  /**
   * Checks one point.
   *
   * @param finish ticks within which the plan is said to finish and to be cheapest
   * @param claimed the cost that is said to be the plan's
   */
  public Verdict check(Plan plan, long finish, Flow flow, Money claimed) {
    return check(plan, finish, bound(flow), claimed);
  }

  /** Counts a flow once, to be held against several plans. */
  public FlowBound bound(Flow flow) {
    FlowLimits limits =
        lastLimits
            .filter(last -> last.scale().equals(flow.scale()))
            .orElseGet(() -> new FlowLimits(network, flow.scale()));
    lastLimits = Optional.of(limits);
    return FlowRecount.of(network, limits, flow);
  }

  /** Checks one point with a flow that is already counted. */
  public Verdict check(Plan plan, long finish, FlowBound bound, Money claimed) {
    Optional<Refuted> fault = ScheduleCheck.fault(network, plan, finish).or(bound::fault);
    if (fault.isPresent()) {
      return fault.get();
    }
    Money cost = costs.of(plan);
    if (!cost.equals(claimed)) {
      return new Refuted(Place.PROJECT, "costs " + cost + ", not the claimed " + claimed);
    }
    Money least = bound.at(finish);
    Money gap = cost.minus(least);
    boolean closed = bound.isExact() ? gap.isZero() : gap.compareTo(MOST_GAP) < 0;
    return gap.signum() >= 0 && closed
        ? new Proved(cost, least)
        : new Refuted(
            Place.PROJECT, "costs " + cost + " and the flow proves only " + least + "; equal");
  }

  /**
   * Checks whether a plan can be carried out within {@code finish} ticks, whatever it costs.
   *
   * @return what makes it impossible; empty if it is possible
   */
  public static Optional<Refuted> possible(Network network, Plan plan, long finish) {
    return ScheduleCheck.fault(network, plan, finish);
  }

  /**
   * Checks the chain that is said to stop the project from being shorter.
   *
   * @param shortest ticks that its terms must add up to
   * @return what is wrong with it; empty if no plan can be shorter
   */
  public static Optional<Refuted> stops(Network network, List<Obstacle> obstacles, long shortest) {
    return new StoppingChain(network).fault(obstacles, shortest);
  }
}
