package dayworth.engine.measures;

import dayworth.engine.Way;
import dayworth.engine.Ways;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import dayworth.value.MoneySum;
import dayworth.value.SlopeScale;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * A share of all plans, by what they may use: those in which some packages are used or not, and
 * some activities go along their line or not. Immutable.
 *
 * <p>While a package is undecided each activity that uses it pays an equal share of its cost: in
 * sum no more than the package costs, whoever uses it.
 */
public final class Opening {

  private final Network network;
  private final Ways ways;
  private final PackageState[] packages;
  private final boolean[] open;
  private final boolean[] line;

  /** What each way costs beside its own cost while its package is undecided. */
  private final Money[] share;

  /** Of each way with its share. */
  private final Money[] cost;

  /** The ways on the hull of each activity, from short to long. */
  private final int[][] hull;

  private Opening(
      Network network, Ways ways, PackageState[] packages, boolean[] open, boolean[] line) {
    this.network = network;
    this.ways = ways;
    this.packages = packages;
    this.open = open;
    this.line = line;
    this.share = shares();
    this.cost = new Money[ways.count()];
    Arrays.setAll(cost, way -> ways.get(way).cost().plus(share[way]));
    this.hull = new int[network.size()][];
    Arrays.setAll(hull, this::hullOf);
  }

  /** All plans. */
  public static Opening all(Network network, Ways ways) {
    PackageState[] packages = new PackageState[network.measures().packages().size()];
    Arrays.fill(packages, PackageState.UNDECIDED);
    boolean[] open = new boolean[ways.count()];
    Arrays.fill(open, true);
    boolean[] line = new boolean[network.size()];
    for (int i = 0; i < line.length; i++) {
      line[i] = ways.hasLine(i);
    }
    return new Opening(network, ways, packages, open, line);
  }

  /** The plans of this share that pay for a package, and those that do not use it. */
  public List<Opening> halvesByPackage(int index) {
    PackageState[] paid = packages.clone();
    paid[index] = PackageState.PAID;
    PackageState[] notUsed = packages.clone();
    notUsed[index] = PackageState.NOT_USED;
    boolean[] without = open.clone();
    for (int way = 0; way < without.length; way++) {
      without[way] &= ways.get(way).inPackage() != index;
    }
    return List.of(
        new Opening(network, ways, notUsed, without, line),
        new Opening(network, ways, paid, open, line));
  }

  /** The plans in which an activity goes along its line, and those in which it does not. */
  public List<Opening> halvesByLine(int activity) {
    boolean[] alone = open.clone();
    for (int way = ways.first(activity); way < ways.first(activity + 1); way++) {
      alone[way] &= ways.get(way).measure() == Plan.NO_MEASURE;
    }
    boolean[] pointsOnly = line.clone();
    pointsOnly[activity] = false;
    return List.of(
        new Opening(network, ways, packages, alone, line),
        new Opening(network, ways, packages, open, pointsOnly));
  }

  public Ways ways() {
    return ways;
  }

  /** Whether a way is open. */
  public boolean isOpen(int way) {
    return open[way];
  }

  /** All open ways, by their number; a copy. */
  public boolean[] open() {
    return open.clone();
  }

  /** Whether an activity can take any duration between its crash and its normal way. */
  public boolean hasLine(int activity) {
    return line[activity];
  }

  /** Whether each package is paid for, by its index. */
  public boolean[] paidPackages() {
    boolean[] isPaid = new boolean[packages.length];
    for (int index = 0; index < isPaid.length; index++) {
      isPaid[index] = packages[index] == PackageState.PAID;
    }
    return isPaid;
  }

  public PackageState state(int index) {
    return packages[index];
  }

  /** What an activity pays for a way: its cost and a share of an undecided package. */
  public Money cost(int way) {
    return cost[way];
  }

  /** The same of each way in scaled units, rounded down; only to compare. */
  long[] scaledCosts(SlopeScale scale) {
    long[] scaled = new long[ways.count()];
    Arrays.setAll(scaled, way -> scale.scaled(cost(way)));
    return scaled;
  }

  /** What the packages that are paid for cost. */
  public Money paid() {
    MoneySum sum = new MoneySum();
    for (int index = 0; index < packages.length; index++) {
      if (packages[index] == PackageState.PAID) {
        sum.add(network.measures().packages().get(index).cost());
      }
    }
    return sum.total();
  }

  /**
   * How much of an undecided package's cost is not yet paid by the shares of those that use it.
   *
   * @param plan may have durations between two ways: then each is used in part
   * @return zero where the package is not used, or decided
   */
  public Money notPaid(int index, Plan plan) {
    Money used = Money.ZERO;
    for (int i = 0; i < network.size() && packages[index] == PackageState.UNDECIDED; i++) {
      if (ways.isChoice(i)) {
        used = used.plus(shareUsed(index, i, plan.duration(i)));
      }
    }
    return used.isZero() ? used : network.measures().packages().get(index).cost().minus(used);
  }

  /** What an activity pays of a package for a duration: of a way, or of two on its hull. */
  private Money shareUsed(int index, int activity, long duration) {
    int way = cheapestOf(activity, duration);
    if (way >= 0) {
      return shareIn(index, way);
    }
    int[] on = hull[activity];
    for (int k = 1; k < on.length; k++) {
      long shorter = duration(on[k - 1]);
      long longer = duration(on[k]);
      if (longer > duration && shorter < duration) {
        return shareIn(index, on[k - 1])
            .times(longer - duration)
            .plus(shareIn(index, on[k]).times(duration - shorter))
            .dividedBy(longer - shorter);
      }
    }
    return Money.ZERO;
  }

  /** The cheapest open way of a duration; -1 if there is none. */
  int cheapestOf(int activity, long duration) {
    int best = -1;
    for (int way = ways.first(activity); way < ways.first(activity) + ways.count(activity); way++) {
      if (open[way]
          && duration(way) == duration
          && (best < 0 || cost(way).compareTo(cost(best)) < 0)) {
        best = way;
      }
    }
    return best;
  }

  private Money shareIn(int index, int way) {
    return ways.get(way).inPackage() == index ? share[way] : Money.ZERO;
  }

  /**
   * The open ways on the lower hull of duration and cost, from short to long; of those of one
   * duration the cheapest (Andrew 1979, "Another efficient algorithm for convex hulls in two
   * dimensions").
   */
  public int[] hull(int activity) {
    return hull[activity].clone();
  }

  private int[] hullOf(int activity) {
    List<Integer> hull = new ArrayList<>();
    for (int way = ways.first(activity); way < ways.first(activity + 1); way++) {
      if (!open[way]) {
        continue;
      }
      int last = hull.size() - 1;
      if (last >= 0 && duration(hull.get(last)) == duration(way)) {
        if (cost(hull.get(last)).compareTo(cost(way)) <= 0) {
          continue;
        }
        hull.remove(last);
      }
      while (hull.size() > 1
          && isAbove(hull.get(hull.size() - 2), hull.get(hull.size() - 1), way)) {
        hull.remove(hull.size() - 1);
      }
      hull.add(way);
    }
    return hull.stream().mapToInt(Integer::intValue).toArray();
  }

  /** Whether the middle one of three ways lies above the line through the other two. */
  private boolean isAbove(int shorter, int middle, int longer) {
    Money first = cost[shorter].minus(cost[middle]).times(duration(longer) - duration(middle));
    Money second = cost[middle].minus(cost[longer]).times(duration(middle) - duration(shorter));
    return first.compareTo(second) < 0;
  }

  /** By how much a tick more is cheaper from one way to a longer one. */
  Money fall(int shorter, int longer) {
    return cost(shorter).minus(cost(longer)).dividedBy(duration(longer) - duration(shorter));
  }

  long duration(int way) {
    return ways.get(way).duration();
  }

  private Money[] shares() {
    List<Set<Integer>> users = new ArrayList<>();
    while (users.size() < packages.length) {
      users.add(new HashSet<>());
    }
    for (int i = 0; i < network.size(); i++) {
      for (int way = ways.first(i); way < ways.first(i + 1); way++) {
        if (open[way] && ways.get(way).inPackage() != Way.NO_PACKAGE) {
          users.get(ways.get(way).inPackage()).add(i);
        }
      }
    }
    Money[] shares = new Money[ways.count()];
    for (int way = 0; way < shares.length; way++) {
      int index = ways.get(way).inPackage();
      boolean shared =
          open[way] && index != Way.NO_PACKAGE && packages[index] == PackageState.UNDECIDED;
      shares[way] =
          shared
              ? network.measures().packages().get(index).cost().dividedBy(users.get(index).size())
              : Money.ZERO;
    }
    return shares;
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Opening opening
        && Arrays.equals(packages, opening.packages)
        && Arrays.equals(open, opening.open)
        && Arrays.equals(line, opening.line);
  }

  @Override
  public int hashCode() {
    return 31 * Arrays.hashCode(packages) + Arrays.hashCode(open);
  }
}
