package dayworth.decision;

import dayworth.engine.Change;
import dayworth.engine.Curve;
import dayworth.engine.Flow;
import dayworth.engine.Obstacle;
import dayworth.engine.Step;
import dayworth.engine.branching.Branching;
import dayworth.engine.branching.Charge;
import dayworth.engine.branching.Point;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedSet;
import java.util.function.BiFunction;
import java.util.function.BooleanSupplier;
import java.util.function.IntToLongFunction;
import java.util.stream.IntStream;

/**
 * Where some money is not convex each finish that is to be reported is solved by branching.
 *
 * <p>The first finish is the shortest at which the sum is least whatever the finish: it is solved
 * first, without a deadline that binds.
 */
final class BranchedPlans implements CheapestPlans {

  /** A project that may last so much longer than as planned has no deadline that binds. */
  private static final long TIMES_AS_PLANNED = 2;

  private final Network network;
  private final List<Charge> charges;
  private final IntToLongFunction nodesFor;
  private final BooleanSupplier isOver;
  private final List<Point> points;
  private final Curve curve;
  private long relaxations;
  private final Map<Long, Plan> planOf = new HashMap<>();

  /**
   * Solves every finish.
   *
   * @param network with the convex money as spans
   * @param nodesFor how many relaxations are solved for so many finishes together
   * @param isOver whether to stop before that
   * @param bare the same network without them: its curve tells what stops the project
   * @param rows from the longest and the shortest finish to all that are to be solved, from long to
   *     short
   * @throws ProofFailed if a bound does not stand up to its recheck
   */
  BranchedPlans(
      Network network,
      List<Charge> charges,
      Curve bare,
      IntToLongFunction nodesFor,
      BooleanSupplier isOver,
      BiFunction<Long, Long, SortedSet<Long>> rows,
      Watcher watcher) {
    this.nodesFor = nodesFor;
    this.isOver = isOver;
    this.network = network;
    this.charges = charges;
    watcher.now("seeking the cheapest plan whatever the finish");
    Point free = unhurried(bare);
    long longest = Math.max(finish(free.plan()), bare.shortest());
    watcher.now("branching over the finishes");
    List<Point> solved = solve(rows.apply(longest, bare.shortest()));
    int first = 0;
    while (first + 1 < solved.size() && solved.get(first + 1).cost().equals(solved.get(0).cost())) {
      first++;
    }
    points = new ArrayList<>(solved.subList(first, solved.size()));
    if (!free.isProved()) {
      points.set(0, points.get(0).boundedBy(free.bound()));
    }
    points.forEach(point -> planOf.put(point.duration(), point.plan()));
    curve = curve(bare);
  }

  /** The cheapest plan of all. */
  private Point unhurried(Curve bare) {
    long asPlanned = Timing.earliest(network, Plan.allNormal(network)).finish();
    return solve(new long[] {far(bare.longest(), asPlanned)}).get(0);
  }

  /** A duration that no deadline of the project binds. */
  static long far(long longest, long asPlanned) {
    return Math.max(longest, asPlanned) * TIMES_AS_PLANNED;
  }

  private static long finish(Plan plan) {
    long finish = 0;
    for (int i = 0; i < plan.size(); i++) {
      finish = Math.max(finish, plan.start(i) + plan.duration(i));
    }
    return finish;
  }

  private List<Point> solve(SortedSet<Long> durations) {
    return solve(durations.stream().mapToLong(Long::longValue).toArray());
  }

  private List<Point> solve(long[] durations) {
    try {
      Branching.Solution solution =
          Branching.solve(
              network, charges, durations, nodesFor.applyAsLong(durations.length), isOver);
      relaxations += solution.relaxations();
      return solution.points();
    } catch (Branching.BoundRefuted refuted) {
      throw new ProofFailed(
          "the finish at " + network.scale().text(refuted.duration()), refuted.getMessage());
    }
  }

  /** One piece from each finish to the next, but one for several where the plan moves evenly. */
  private Curve curve(Curve bare) {
    List<Step> steps = new ArrayList<>();
    List<Plan> plans = new ArrayList<>(List.of(points.get(0).plan()));
    boolean lastIsEven = false;
    for (int k = 1; k < points.size(); k++) {
      Step step = step(points.get(k - 1), points.get(k));
      Step last = steps.isEmpty() ? step : steps.get(steps.size() - 1);
      boolean isEven = haveSameMeasures(points.get(k - 1).plan(), points.get(k).plan());
      boolean joins = lastIsEven && isEven && goesOnEvenly(last, step);
      lastIsEven = isEven;
      if (joins) {
        steps.set(steps.size() - 1, joined(last, step));
        plans.set(plans.size() - 1, points.get(k).plan());
      } else {
        steps.add(step);
        plans.add(points.get(k).plan());
      }
    }
    Point first = points.get(0);
    return new Curve(
        network, first.duration(), first.plan(), first.cost(), steps, obstacles(bare), plans);
  }

  /** The chain stops the project as a whole; where ways are what stops it before, none does. */
  private List<Obstacle> obstacles(Curve bare) {
    return points.get(points.size() - 1).duration() == bare.shortest()
        ? bare.obstacles()
        : List.of();
  }

  private Step step(Point from, Point to) {
    List<Change> changes = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      long shortened = from.plan().duration(i) - to.plan().duration(i);
      if (shortened != 0) {
        changes.add(new Change(i, shortened));
      }
    }
    return new Step(from.duration(), to.duration(), to.cost().minus(from.cost()), changes);
  }

  /** Otherwise something is switched, which is no even change. */
  private static boolean haveSameMeasures(Plan one, Plan other) {
    return IntStream.range(0, one.size()).allMatch(i -> one.measure(i) == other.measure(i));
  }

  private static boolean goesOnEvenly(Step last, Step next) {
    if (!last.pricePerTick().equals(next.pricePerTick())
        || last.changes().size() != next.changes().size()) {
      return false;
    }
    for (int k = 0; k < last.changes().size(); k++) {
      Change one = last.changes().get(k);
      Change other = next.changes().get(k);
      if (one.activity() != other.activity()
          || one.shortened() * next.ticks() != other.shortened() * last.ticks()) {
        return false;
      }
    }
    return true;
  }

  private static Step joined(Step last, Step next) {
    List<Change> changes = new ArrayList<>();
    for (int k = 0; k < last.changes().size(); k++) {
      Change one = last.changes().get(k);
      changes.add(new Change(one.activity(), one.shortened() + next.changes().get(k).shortened()));
    }
    return new Step(last.from(), next.to(), last.extra().plus(next.extra()), changes);
  }

  @Override
  public Curve curve() {
    return curve;
  }

  /** All of them must be finishes that were solved, or longer than the longest. */
  @Override
  public List<Plan> plans(SortedSet<Long> durations) {
    return durations.stream()
        .map(duration -> planOf.getOrDefault(duration, points.get(0).plan()))
        .toList();
  }

  @Override
  public CrossCheck crossCheck(long most, Watcher watcher) {
    return BranchChecking.of(network, charges, points, most, watcher);
  }

  @Override
  public List<Unproved> unproved() {
    return points.stream()
        .filter(point -> !point.isProved())
        .map(point -> new Unproved(point.duration(), point.cost(), point.bound()))
        .toList();
  }

  @Override
  public long relaxations() {
    return relaxations;
  }

  /** No one flow proves a finish: that takes a flow for each branch. */
  @Override
  public Optional<List<List<Flow.Entry>>> flows() {
    return Optional.empty();
  }
}
