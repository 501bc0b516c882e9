package dayworth.engine.proof;

import dayworth.network.Network;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;

/**
 * Writes a circulation in decimals so that it stays one.
 *
 * <p><b>Problem.</b> A price of a third of something has no last digit, and amounts that are
 * rounded one by one no longer balance at the events. <b>Method.</b> Every circulation is a sum of
 * cycles, each as large as the least that is left on it (Ford and Fulkerson 1962, "Flows in
 * Networks"); each cycle's amount is cut to decimals and the cycles are added again.
 * <b>Invariant.</b> What was added balances at every event and is nowhere more than the true
 * amount, so it keeps every limit. <b>Cost.</b> At most as many cycles as arcs, each found by a
 * walk over at most all events. <b>Limits.</b> Each cycle loses less than one in the last place.
 */
final class DecimalFlow {

  private final List<Arc> arcs;
  private final BigInteger numerator;
  private final BigInteger perUnit;

  /** What is not yet in a cycle, by arc, in units of the slope scale. */
  private final long[] left;

  /** The arcs out of each event that carry something: {@code out[event]}, from {@code next} on. */
  private final List<List<Integer>> out = new ArrayList<>();

  private final int[] next;

  /** What the cycles come to, by arc, in units of the last decimal. */
  private final BigInteger[] cut;

  private DecimalFlow(List<Arc> arcs, Network network, long perUnit, int decimals) {
    this.arcs = arcs;
    this.numerator =
        BigInteger.TEN.pow(decimals).multiply(BigInteger.valueOf(network.scale().ticksPerUnit()));
    this.perUnit = BigInteger.valueOf(perUnit);
    this.left = arcs.stream().mapToLong(Arc::flow).toArray();
    this.cut = new BigInteger[left.length];
    Arrays.fill(cut, BigInteger.ZERO);
    int events = 2 * (network.size() + 1);
    IntStream.range(0, events).forEach(event -> out.add(new ArrayList<>()));
    for (int k = 0; k < left.length; k++) {
      if (left[k] != 0) {
        out.get(arcs.get(k).from().number()).add(k);
      }
    }
    this.next = new int[events];
  }

  /**
   * The flow of each arc in money per time unit.
   *
   * @param arcs a circulation in units of which {@code perUnit} make one money unit per tick
   * @param decimals how many there may be
   */
  static List<BigDecimal> of(List<Arc> arcs, Network network, long perUnit, int decimals) {
    DecimalFlow flow = new DecimalFlow(arcs, network, perUnit, decimals);
    if (Arrays.stream(flow.left).allMatch(flow::isWhole)) {
      IntStream.range(0, flow.cut.length).forEach(k -> flow.cut[k] = flow.cutOf(flow.left[k]));
    } else {
      flow.addCycles();
    }
    return Arrays.stream(flow.cut).map(amount -> plain(new BigDecimal(amount, decimals))).toList();
  }

  private boolean isWhole(long amount) {
    return BigInteger.valueOf(amount).multiply(numerator).mod(perUnit).signum() == 0;
  }

  private BigInteger cutOf(long amount) {
    return BigInteger.valueOf(amount).multiply(numerator).divide(perUnit);
  }

  /** Without zeros at its end. */
  static BigDecimal plain(BigDecimal number) {
    BigDecimal stripped = number.stripTrailingZeros();
    return stripped.scale() < 0 ? stripped.setScale(0) : stripped;
  }

  private void addCycles() {
    List<Integer> path = new ArrayList<>();
    int[] position = new int[next.length];
    Arrays.fill(position, -1);
    for (int first = 0; first < next.length; first++) {
      int event = first;
      while (true) {
        position[event] = path.size();
        int arc = arcOutOf(event);
        if (arc < 0) {
          break;
        }
        path.add(arc);
        event = arcs.get(arc).to().number();
        if (position[event] >= 0) {
          event = take(path, position[event], position);
        }
      }
      if (!path.isEmpty()) {
        throw new IllegalArgumentException("the flow is no circulation");
      }
      position[first] = -1;
    }
  }

  private int arcOutOf(int event) {
    List<Integer> all = out.get(event);
    while (next[event] < all.size() && left[all.get(next[event])] == 0) {
      next[event]++;
    }
    return next[event] < all.size() ? all.get(next[event]) : -1;
  }

  /** Takes the cycle at the end of a path off it; the walk goes on where the cycle began. */
  private int take(List<Integer> path, int from, int[] position) {
    List<Integer> cycle = path.subList(from, path.size());
    long amount = cycle.stream().mapToLong(arc -> left[arc]).min().orElseThrow();
    BigInteger written = cutOf(amount);
    for (int arc : cycle) {
      left[arc] -= amount;
      cut[arc] = cut[arc].add(written);
      position[arcs.get(arc).from().number()] = -1;
    }
    int event = arcs.get(cycle.get(0)).from().number();
    cycle.clear();
    return event;
  }
}
