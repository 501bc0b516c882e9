package dayworth.engine.branching;

import dayworth.engine.Flow;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.proof.Verdict;
import dayworth.engine.stepping.Descent;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import java.util.stream.IntStream;

/**
 * The cheapest plan for each of many finishes where some money is not convex.
 *
 * <p><b>Problem.</b> Direct cost and spans, which are convex in the times of events, plus charges,
 * which need not be.
 *
 * <p><b>Method.</b> Branch and bound (Land and Doig 1960, "An automatic method of solving discrete
 * programming problems") on when the charges' moments come, for all finishes at once. In a branch
 * each charge is replaced by its {@link Envelope}; the convex problem is solved by {@link Descent}
 * for the finishes that are still open, and its bound is rechecked from the flow ({@link
 * ProofChecker}). Its plans are possible, so their true cost bounds the answer from above. A finish
 * for which the branch's bound is no lower than the best plan's cost is closed in it; for the rest
 * the branch is split where an envelope is furthest from its charge (Falk and Soland 1969, "An
 * algorithm for separable nonconvex programming problems").
 *
 * <p><b>Invariant.</b> The windows of a branch's halves make up its own, so every plan lies in a
 * closed branch or in an open one; the bound of a finish is the least of both. <b>Limits.</b> The
 * number of convex problems is bounded; a finish that is still open then keeps a gap.
 */
public final class Branching {

  /** Finishes for which a branch is still to be solved, and what it costs there at least. */
  private record Open(Branch branch, List<Integer> rows, List<Money> bounds) {}

  /** A bound did not stand up to its recheck. */
  public static final class BoundRefuted extends RuntimeException {

    private static final long serialVersionUID = 1;

    private final long duration;

    BoundRefuted(long duration, String why) {
      super(why);
      this.duration = duration;
    }

    /** The finish that was to be bounded, ticks. */
    public long duration() {
      return duration;
    }
  }

  private final Network network;
  private final List<Charge> charges;
  private final long[] durations;
  private final Money fence;
  private final List<Best> best = new ArrayList<>();
  private final Deque<Open> open = new ArrayDeque<>();

  /** The branches that were not split further, where they are wanted. */
  private final Optional<List<Leaf>> leaves;

  private long solved;

  /** How many relaxations are solved at most. */
  private long mostNodes;

  private BooleanSupplier isOver = () -> false;

  private Branching(
      Network network, List<Charge> charges, long[] durations, Optional<List<Leaf>> leaves) {
    this.network = network;
    this.charges = charges;
    this.durations = durations;
    this.leaves = leaves;
    this.fence = ChargedMoney.fence(network, charges, durations[0]);
    Branch whole = Branch.whole(network, charges, durations[0]);
    List<Integer> rows = IntStream.range(0, durations.length).boxed().toList();
    rows.forEach(row -> best.add(new Best(whole)));
    open.add(new Open(whole, rows, rows.stream().map(row -> Money.ZERO).toList()));
  }

  /**
   * Solves every finish.
   *
   * @param durations ticks, from long to short; for each some plan must exist
   * @param most how many convex problems are solved at most, beyond one for each finish
   * @return one point for each duration that has a plan; a plan for a shorter one serves a longer
   *     one too
   * @throws BoundRefuted if a bound does not stand up to its recheck
   */
  public static List<Point> solve(
      Network network, List<Charge> charges, long[] durations, long most) {
    return solve(network, charges, durations, most, () -> false);
  }

  /**
   * The same, stopped early where somebody says that it is over; what is open then keeps a gap.
   *
   * @throws BoundRefuted if a bound does not stand up to its recheck
   */
  public static List<Point> solve(
      Network network, List<Charge> charges, long[] durations, long most, BooleanSupplier isOver) {
    Branching branching = new Branching(network, charges, durations, Optional.empty());
    branching.isOver = isOver;
    branching.run(most + durations.length);
    return branching.points();
  }

  /**
   * Solves one finish and keeps what proves it: together the leaves hold every plan, and none costs
   * less in any of them than its bound.
   *
   * @return empty if the limit is reached before it is proved
   * @throws BoundRefuted if a bound does not stand up to its recheck
   */
  public static Optional<Proof> prove(
      Network network, List<Charge> charges, long duration, long most) {
    if (network.hasChoices()) {
      return WayProof.of(network, charges, duration, most);
    }
    List<Leaf> leaves = new ArrayList<>();
    Branching branching =
        new Branching(network, charges, new long[] {duration}, Optional.of(leaves));
    branching.run(most);
    Point point = branching.points().get(0);
    return branching.open.isEmpty() ? Optional.of(new Proof(point, leaves)) : Optional.empty();
  }

  /**
   * A finish with the branches that prove its plan.
   *
   * @param leaves they hold every plan
   */
  public record Proof(Point point, List<Leaf> leaves) {

    public Proof {
      leaves = List.copyOf(leaves);
    }
  }

  /**
   * A branch that was not split further.
   *
   * @param network its convex problem
   * @param flow proves what that costs at least
   * @param fixed what comes on top
   */
  public record Leaf(Network network, Flow flow, Money fixed) {}

  private void run(long most) {
    mostNodes = most;
    while (!open.isEmpty() && solved < most && !isOver.getAsBoolean()) {
      goOn(open.remove());
    }
    open.forEach(this::leave);
  }

  /** Solves a branch for the finishes that are open in it, and splits it for those that remain. */
  private void goOn(Open node) {
    Relaxation relaxation = node.branch().relaxation(network, charges, fence);
    if (node.branch().opening().ways().isPlain()) {
      goOnConvex(node, relaxation);
    } else {
      goOnWithWays(node, relaxation);
    }
  }

  /** The same where activities have ways to choose from. */
  private void goOnWithWays(Open node, Relaxation relaxation) {
    List<Integer> rows = new ArrayList<>();
    for (int k = 0; k < node.rows().size(); k++) {
      if (!best.get(node.rows().get(k)).beats(node.bounds().get(k))) {
        rows.add(node.rows().get(k));
      }
    }
    WayBranch ways = new WayBranch(network, charges, node.branch(), relaxation, isOver);
    List<Optional<Money>> bounds =
        ways.solve(
            rows.stream().map(row -> new WayBranch.Row(durations[row], best.get(row))).toList(),
            mostNodes - solved);
    solved += ways.nodes();
    List<Integer> left = new ArrayList<>();
    List<Money> leftBounds = new ArrayList<>();
    for (int k = 0; k < rows.size(); k++) {
      if (bounds.get(k).isPresent()) {
        left.add(rows.get(k));
        leftBounds.add(bounds.get(k).get());
      }
    }
    if (left.isEmpty()) {
      return;
    }
    if (ways.halves().isEmpty()) {
      leave(new Open(node.branch(), left, leftBounds));
      return;
    }
    for (Branch half : ways.halves().get()) {
      open.add(new Open(half, left, leftBounds));
    }
  }

  private void goOnConvex(Open node, Relaxation relaxation) {
    Descent descent = new Descent(relaxation.network());
    ProofChecker checker = new ProofChecker(relaxation.network());
    List<Integer> rows = new ArrayList<>();
    List<Money> bounds = new ArrayList<>();
    Optional<Branch.Split> split = Optional.empty();
    Money widest = Money.ZERO;
    for (int k = 0; k < node.rows().size(); k++) {
      int row = node.rows().get(k);
      if (leaves.isEmpty() && best.get(row).beats(node.bounds().get(k))) {
        continue;
      }
      Plan plan = solve(descent, checker, relaxation.network(), durations[row]);
      best.get(row).offer(plan, ChargedMoney.cost(network, charges, plan), node.branch());
      Money bound = relaxation.cost(plan);
      if (leaves.isPresent() && best.get(row).beats(bound)) {
        leaves.get().add(new Leaf(relaxation.network(), descent.flow(), relaxation.fixed()));
      }
      if (!best.get(row).beats(bound)) {
        rows.add(row);
        bounds.add(bound);
        for (int j = 0; j < charges.size(); j++) {
          Money gap = ChargedMoney.at(charges.get(j), plan).minus(relaxation.chargeAt(j, plan));
          if (gap.compareTo(widest) > 0) {
            widest = gap;
            split = node.branch().splitFor(j, charges.get(j), plan);
          }
        }
      }
    }
    if (rows.isEmpty()) {
      return;
    }
    if (split.isEmpty()) {
      throw new IllegalStateException("a branch has a gap and nothing to split");
    }
    for (Branch half : node.branch().halves(split.get())) {
      open.add(new Open(half, rows, bounds));
    }
  }

  private Plan solve(Descent descent, ProofChecker checker, Network relaxed, long duration) {
    solved++;
    Plan plan =
        descent
            .anyWithin(duration)
            .orElseThrow(() -> new IllegalStateException("no plan within " + duration));
    if (checker.check(plan, duration, descent.flow(), plan.cost(relaxed))
        instanceof Verdict.Refuted refuted) {
      throw new BoundRefuted(duration, refuted.where() + ": " + refuted.why());
    }
    return plan;
  }

  private void leave(Open node) {
    for (int k = 0; k < node.rows().size(); k++) {
      Best of = best.get(node.rows().get(k));
      Money bound = node.bounds().get(k);
      if (!of.beats(bound)) {
        of.leftOpen = Optional.of(of.leftOpen.map(bound::min).orElse(bound));
      }
    }
  }

  private List<Point> points() {
    for (int row = durations.length - 2; row >= 0; row--) {
      best.get(row).offer(best.get(row + 1));
    }
    List<Point> points = new ArrayList<>();
    Optional<LeastChanged> plans = Optional.empty();
    Plan before = Plan.allNormal(network);
    Relaxation relaxed = best.get(0).branch.relaxation(network, charges, fence);
    for (int row = 0; row < durations.length && best.get(row).plan.isPresent(); row++) {
      Best of = best.get(row);
      Plan found = of.plan.get();
      if (plans.isEmpty() || !plans.get().serves(of.branch, found)) {
        if (row == 0 || !of.branch.equals(best.get(row - 1).branch)) {
          relaxed = of.branch.relaxation(network, charges, fence);
        }
        plans = Optional.of(new LeastChanged(network, charges, of.branch, relaxed, found));
      }
      before = plans.get().within(durations[row], before, of.cost).orElse(found);
      Money bound = of.leftOpen.map(of.cost::min).orElse(of.cost);
      points.add(new Point(durations[row], before, of.cost, bound, of.branch));
    }
    return points;
  }
}
