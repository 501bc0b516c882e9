package dayworth.engine.measures;

import dayworth.engine.Flow;
import dayworth.engine.Ways;
import dayworth.engine.proof.WayBound;
import dayworth.engine.stepping.Narrowing;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.SlopeScale;
import java.math.BigInteger;
import java.util.ArrayDeque;
import java.util.Arrays;
import java.util.Deque;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;

/**
 * The cheapest choice of ways for one finish after the other.
 *
 * <p><b>Problem.</b> Each activity takes one of its open ways; the sum of their costs and of the
 * spans is to be least. Strongly NP-hard (De, Dunne, Ghosh and Wells 1997, "Complexity of the
 * discrete time-cost tradeoff problem for project networks").
 *
 * <p><b>Method.</b> Depth-first branch and bound (Demeulemeester, De Reyck, Foubert, Herroelen and
 * Vanhoucke 1998). A node holds which ways are allowed. Its relaxation is the {@link HullNetwork}
 * with narrowed durations, solved from its parent's by {@link Narrowing}; its bound is what the
 * resulting flow proves of the allowed ways ({@link WayBound}). A way that would lift the bound to
 * that of the best known plan is closed (reduced cost). Where a duration lies between two ways of
 * the hull the node is split: no longer than the one, no shorter than the other, or one of the ways
 * that lie above the hull between them. {@link Rounding} makes plans on the way.
 *
 * <p><b>Invariant.</b> Every plan of the opening lies in a node that waits, or was closed by a
 * bound that was counted from a flow. <b>Limits.</b> The number of nodes; what is left then keeps
 * its bound.
 */
public final class WaySearch {

  private final Network network;
  private final Opening opening;
  private final Ways ways;
  private final SlopeScale scale;
  private final WayBound counting;
  private final Narrowing narrowing;
  private final Rounding rounding;

  /** The ways on the hull of each activity, from short to long. */
  private final int[][] hull;

  private final Deque<Node> waiting = new ArrayDeque<>();
  private BigInteger leftOpen;
  private Optional<Unresolved> unresolved = Optional.empty();
  private long nodes;

  /** A share of the opening's plans. */
  private static final class Node {

    /** The state of the node it is split from. */
    private final Narrowing.State from;

    private final boolean[] allowed;

    /** Whose duration is to be narrowed first; -1 for none. */
    private final int activity;

    /** What its plans cost at least. */
    private final BigInteger bound;

    Node(Narrowing.State from, boolean[] allowed, int activity, BigInteger bound) {
      this.from = from;
      this.allowed = allowed;
      this.activity = activity;
      this.bound = bound;
    }
  }

  /**
   * A share of the plans that splitting by ways does not settle.
   *
   * @param plan the relaxation's, with starts
   * @param line an activity whose line must be taken by itself; -1 if it is not that
   */
  public record Unresolved(Plan plan, int line) {}

  /**
   * What is known after a search.
   *
   * @param bound scaled; what plans cost at least that were neither counted nor closed; empty if
   *     there are none
   * @param unresolved the cheapest of the shares that need another kind of split
   * @param nodes how many relaxations were solved
   */
  public record Outcome(Optional<BigInteger> bound, Optional<Unresolved> unresolved, long nodes) {}

  /**
   * Prepares for a network.
   *
   * @param network with all spans that are paid
   * @throws ArithmeticException if its amounts do not fit one scale
   */
  public WaySearch(Network network, Opening opening, boolean startsMatter) {
    this.network = network;
    this.opening = opening;
    this.ways = opening.ways();
    Network relaxed = HullNetwork.of(network, opening);
    scale =
        WayScale.of(relaxed)
            .orElseThrow(() -> new ArithmeticException("the slopes do not fit one scale"));
    counting = new WayBound(network, ways, opening.open(), opening.paidPackages(), scale);
    narrowing = new Narrowing(relaxed, scale);
    rounding = new Rounding(network, opening, scale, startsMatter);
    hull = new int[network.size()][];
    Arrays.setAll(hull, opening::hull);
  }

  /** Whether the amounts of a network are small enough to be exact. */
  public static boolean fits(Network network) {
    Ways ways = Ways.of(network);
    if (ways.isPlain()) {
      return true;
    }
    Network relaxed = HullNetwork.of(network, Opening.all(network, ways));
    return Stepping.scaleFor(relaxed).isPresent() && WayScale.of(relaxed).isPresent();
  }

  public SlopeScale scale() {
    return scale;
  }

  /**
   * Solves the relaxation for a finish; finishes must be asked from long to short.
   *
   * @return where a search can begin; empty if no plan of the relaxation finishes in time
   */
  public Optional<Narrowing.State> reach(long finish) {
    return narrowing.comesWithin(finish) ? Optional.of(narrowing.state()) : Optional.empty();
  }

  /** What the relaxation costs at least for a finish that was reached, in scaled units. */
  public BigInteger boundAt(Narrowing.State root) {
    narrowing.goBackTo(root);
    return counting.of(narrowing.flow()).atLeast(root.finish(), opening.open());
  }

  /** The relaxation's plan for a finish that was reached; its durations may lie between ways. */
  public Plan planAt(Narrowing.State root) {
    narrowing.goBackTo(root);
    return lying();
  }

  /**
   * Searches all plans of the opening for a finish.
   *
   * @param root from {@link #reach}
   * @param most how many nodes are solved at most
   * @param isOver whether to stop before that
   */
  public Outcome search(
      Narrowing.State root, Incumbent incumbent, long most, BooleanSupplier isOver) {
    waiting.clear();
    leftOpen = null;
    unresolved = Optional.empty();
    nodes = 0;
    waiting.push(new Node(root, opening.open(), -1, BigInteger.ZERO));
    while (!waiting.isEmpty()) {
      Node node = waiting.pop();
      if (node.bound.compareTo(incumbent.closedFrom()) >= 0) {
        continue;
      }
      if (nodes >= most || isOver.getAsBoolean()) {
        leave(node.bound);
      } else {
        solve(node, root.finish(), incumbent);
      }
    }
    return new Outcome(Optional.ofNullable(leftOpen), unresolved, nodes);
  }

  /**
   * Splits all plans of the opening for a finish until each share is bounded from {@code
   * closedFrom} on; no way is closed, so that the shares together hold every plan by how they were
   * split alone.
   *
   * @param root from {@link #reach}
   * @param closedFrom scaled
   * @param most how many shares are looked at, at most
   * @param shares is told of every share that is bounded
   * @return what is left; its bound is empty if all are bounded
   */
  public Outcome splitUp(
      Narrowing.State root, BigInteger closedFrom, long most, Consumer<BoundedShare> shares) {
    waiting.clear();
    leftOpen = null;
    unresolved = Optional.empty();
    nodes = 0;
    waiting.push(new Node(root, opening.open(), -1, BigInteger.ZERO));
    while (!waiting.isEmpty()) {
      Node node = waiting.pop();
      if (nodes++ >= most) {
        leave(node.bound);
        continue;
      }
      narrowing.goBackTo(node.from);
      if (node.activity >= 0 && !narrow(node.activity, node.allowed)) {
        continue;
      }
      Flow flow = narrowing.flow();
      WayBound.Proven proven = counting.of(flow);
      BigInteger bound = proven.atLeast(root.finish(), node.allowed);
      if (bound.compareTo(closedFrom) >= 0) {
        shares.accept(BoundedShare.of(network, opening, proven, node.allowed, flow));
      } else {
        split(node.allowed, bound, new Closed(closedFrom));
      }
    }
    return new Outcome(Optional.ofNullable(leftOpen), unresolved, nodes);
  }

  /** A plan is known that cannot be bettered. */
  private record Closed(BigInteger closedFrom) implements Incumbent {

    @Override
    public void offer(Plan plan) {
      // No better one can come.
    }
  }

  private boolean leave(BigInteger bound) {
    boolean isLeast = leftOpen == null || bound.compareTo(leftOpen) < 0;
    leftOpen = isLeast ? bound : leftOpen;
    return isLeast;
  }

  private void solve(Node node, long finish, Incumbent incumbent) {
    nodes++;
    narrowing.goBackTo(node.from);
    if (node.activity >= 0 && !narrow(node.activity, node.allowed)) {
      return;
    }
    BigInteger bound = node.bound;
    boolean isNarrower = true;
    for (int round = 0; isNarrower; round++) {
      WayBound.Proven proven = counting.of(narrowing.flow());
      BigInteger counted = proven.atLeast(finish, node.allowed);
      bound = bound.max(counted);
      if (bound.compareTo(incumbent.closedFrom()) >= 0) {
        return;
      }
      if (round == 0) {
        incumbent.offer(rounding.round(narrowing, finish));
      }
      Closing closing = close(proven, node.allowed, incumbent.closedFrom().subtract(counted));
      if (closing == Closing.ALL) {
        return;
      }
      isNarrower = closing == Closing.SOME;
    }
    split(node.allowed, bound, incumbent);
  }

  private enum Closing {
    NONE,
    SOME,
    /** No plan is left. */
    ALL
  }

  /**
   * Disallows ways that no better plan can use, and narrows the relaxation to the rest.
   *
   * @param room how far a way must lift the bound, scaled
   */
  private Closing close(WayBound.Proven proven, boolean[] allowed, BigInteger room) {
    if (room.signum() <= 0) {
      return Closing.ALL;
    }
    long most = room.bitLength() < Long.SIZE ? room.longValueExact() : Long.MAX_VALUE;
    Closing closing = Closing.NONE;
    for (int i = 0; i < network.size(); i++) {
      if (ways.isChoice(i) && close(i, proven, allowed, most)) {
        closing = Closing.SOME;
        if (!narrow(i, allowed)) {
          return Closing.ALL;
        }
      }
    }
    return closing;
  }

  /** Closes ways of one activity; its line only as a whole. Whether any was. */
  private boolean close(int i, WayBound.Proven proven, boolean[] allowed, long most) {
    int end = ways.first(i) + ways.count(i);
    int best = proven.best(i, allowed);
    boolean closesLine = true;
    for (int way = ways.first(i); way < end; way++) {
      closesLine &= !isEndOfLine(i, way) || !allowed[way] || proven.excess(i, way, best) >= most;
    }
    boolean any = false;
    for (int way = ways.first(i); way < end; way++) {
      boolean closes = isEndOfLine(i, way) ? closesLine : proven.excess(i, way, best) >= most;
      any |= allowed[way] && closes;
      allowed[way] &= !closes;
    }
    return any;
  }

  /** Narrows the relaxation to the allowed ways; whether it has a plan then. */
  private boolean narrow(int i, boolean[] allowed) {
    long shortest = Long.MAX_VALUE;
    long longest = 0;
    for (int way = ways.first(i); way < ways.first(i) + ways.count(i); way++) {
      if (allowed[way]) {
        shortest = Math.min(shortest, ways.get(way).duration());
        longest = Math.max(longest, ways.get(way).duration());
      }
    }
    return narrowing.narrow(i, shortest, longest);
  }

  private boolean isEndOfLine(int i, int way) {
    return opening.hasLine(i) && ways.get(way).measure() == Plan.NO_MEASURE;
  }

  /** Splits a node where a duration lies furthest between two ways. */
  private void split(boolean[] allowed, BigInteger bound, Incumbent incumbent) {
    int widest = -1;
    double most = -1;
    for (int i = 0; i < network.size(); i++) {
      int shorter = isOpen(i, allowed) ? shorterWay(i, narrowing.duration(i)) : -1;
      if (shorter >= 0) {
        double gap = gap(i, shorter, narrowing.duration(i));
        if (gap > most) {
          most = gap;
          widest = i;
        }
      }
    }
    if (widest < 0) {
      Plan plan = lying();
      incumbent.offer(plan);
      if (bound.compareTo(incumbent.closedFrom()) < 0 && leave(bound)) {
        unresolved = Optional.of(new Unresolved(plan, -1));
      }
    } else if (opening.hasLine(widest) && !hasLineOnHull(widest)) {
      if (leave(bound)) {
        unresolved = Optional.of(new Unresolved(lying(), widest));
      }
    } else {
      splitAt(widest, shorterWay(widest, narrowing.duration(widest)), allowed, bound);
    }
  }

  /** Whether an activity has allowed ways of different durations. */
  private boolean isOpen(int i, boolean[] allowed) {
    long duration = -1;
    for (int way = ways.first(i); ways.isChoice(i) && way < ways.first(i) + ways.count(i); way++) {
      if (allowed[way]) {
        if (duration >= 0 && ways.get(way).duration() != duration) {
          return true;
        }
        duration = ways.get(way).duration();
      }
    }
    return false;
  }

  /**
   * The place in the hull of the longest way that is shorter than a duration; -1 if the duration
   * can be taken as it is.
   */
  private int shorterWay(int i, long duration) {
    int[] on = hull[i];
    for (int k = 0; k < on.length; k++) {
      long ticks = ways.get(on[k]).duration();
      if (ticks == duration) {
        return -1;
      }
      if (ticks > duration) {
        return k > 0 && !isLine(i, on[k - 1], on[k]) ? k - 1 : -1;
      }
    }
    return -1;
  }

  private boolean isLine(int i, int shorter, int longer) {
    return isEndOfLine(i, shorter) && isEndOfLine(i, longer);
  }

  private boolean hasLineOnHull(int i) {
    for (int k = 1; k < hull[i].length; k++) {
      if (isLine(i, hull[i][k - 1], hull[i][k])) {
        return true;
      }
    }
    return false;
  }

  /** How much the nearer of the two ways differs in cost from the hull. */
  private double gap(int i, int shorter, long duration) {
    int p = hull[i][shorter];
    int q = hull[i][shorter + 1];
    double whole = (double) (ways.get(q).duration() - ways.get(p).duration());
    double part = (double) (duration - ways.get(p).duration()) / whole;
    double height = opening.cost(p).minus(opening.cost(q)).toDouble();
    return Math.abs(height) * Math.min(part, 1 - part);
  }

  private void splitAt(int i, int shorter, boolean[] allowed, BigInteger bound) {
    long low = ways.get(hull[i][shorter]).duration();
    long high = ways.get(hull[i][shorter + 1]).duration();
    Narrowing.State here = narrowing.state();
    for (int way = ways.first(i); way < ways.first(i) + ways.count(i); way++) {
      long ticks = ways.get(way).duration();
      if (allowed[way] && ticks > low && ticks < high) {
        push(here, allowed, i, ticks, ticks, bound);
      }
    }
    push(here, allowed, i, high, Long.MAX_VALUE, bound);
    push(here, allowed, i, 0, low, bound);
  }

  /** Lets the part of a node wait in which an activity's duration is within limits. */
  private void push(
      Narrowing.State from, boolean[] allowed, int i, long least, long most, BigInteger bound) {
    boolean[] part = allowed.clone();
    boolean any = false;
    for (int way = ways.first(i); way < ways.first(i) + ways.count(i); way++) {
      long ticks = ways.get(way).duration();
      part[way] &= ticks >= least && ticks <= most;
      any |= part[way];
    }
    if (any) {
      waiting.push(new Node(from, part, i, bound));
    }
  }

  /** The relaxation's plan, with a way for each duration that is one. */
  private Plan lying() {
    long[] durations = new long[network.size()];
    long[] starts = new long[network.size()];
    int[] measures = new int[network.size()];
    for (int i = 0; i < durations.length; i++) {
      durations[i] = narrowing.duration(i);
      starts[i] = narrowing.start(i);
      int way = opening.cheapestOf(i, durations[i]);
      measures[i] = way < 0 ? Plan.NO_MEASURE : ways.get(way).measure();
    }
    return Plan.scheduled(durations, starts).using(measures);
  }
}
