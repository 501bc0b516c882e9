package dayworth.network;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.Collections;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.IntPredicate;

/**
 * The chains of critical activities from one that waits for nothing to one that nothing waits for.
 *
 * <p>Two critical activities are neighbours on a chain if a link between them has no slack. The
 * links make no loop, so chains are counted exactly from the end backwards, the count of an
 * activity being the sum over its neighbours; nothing is listed to be counted, and the count may be
 * astronomically large. O(activities + links) additions.
 */
public final class CriticalChains {

  private final Network network;
  private final Timing timing;
  private final IntPredicate isCritical;
  private final BigInteger[] chainsFrom;
  private final List<Integer> starts = new ArrayList<>();

  private CriticalChains(Network network, Timing timing, IntPredicate isCritical) {
    this.network = network;
    this.timing = timing;
    this.isCritical = isCritical;
    this.chainsFrom = new BigInteger[network.size()];
    Arrays.fill(chainsFrom, BigInteger.ZERO);
    boolean[] waits = new boolean[network.size()];
    for (int position = network.size() - 1; position >= 0; position--) {
      int activity = network.inOrder(position);
      if (isCritical.test(activity)) {
        countFrom(activity, waits);
      }
    }
    for (int i = 0; i < network.size(); i++) {
      if (isCritical.test(i) && !waits[i]) {
        starts.add(i);
      }
    }
  }

  /**
   * The chains of a plan.
   *
   * @param isCritical which activities, by index, can be on them
   */
  public static CriticalChains of(Network network, Timing timing, IntPredicate isCritical) {
    return new CriticalChains(network, timing, isCritical);
  }

  public BigInteger count() {
    return starts.stream().map(i -> chainsFrom[i]).reduce(BigInteger.ZERO, BigInteger::add);
  }

  /** The first few chains in file order, each as activity indices. */
  public List<List<Integer>> first(int most) {
    List<List<Integer>> found = new ArrayList<>();
    List<List<Integer>> open = new ArrayList<>();
    for (int i = starts.size() - 1; i >= 0; i--) {
      open.add(List.of(starts.get(i)));
    }
    while (!open.isEmpty() && found.size() < most) {
      List<Integer> chain = open.remove(open.size() - 1);
      List<Integer> next = neighbours(chain.get(chain.size() - 1));
      if (next.isEmpty()) {
        found.add(chain);
      }
      Collections.reverse(next);
      for (int activity : next) {
        List<Integer> longer = new ArrayList<>(chain);
        longer.add(activity);
        open.add(longer);
      }
    }
    return found;
  }

  /**
   * Chains that together pass the given activities, as far as these are critical: all chains if
   * they are few, otherwise one for each activity that no chain before it passes.
   *
   * @param most how many at most; some activities may then be left out
   */
  public List<List<Integer>> passing(Collection<Integer> activities, int most) {
    if (count().compareTo(BigInteger.valueOf(most)) <= 0) {
      return first(most);
    }
    Set<Integer> wanted = new TreeSet<>(activities);
    wanted.removeIf(activity -> !timing.isCritical(activity));
    List<List<Integer>> found = new ArrayList<>();
    while (!wanted.isEmpty() && found.size() < most) {
      List<Integer> chain = through(wanted.iterator().next(), wanted);
      wanted.removeAll(chain);
      found.add(chain);
    }
    return found;
  }

  /** A chain through an activity that passes wanted ones rather than others where it can. */
  private List<Integer> through(int activity, Set<Integer> wanted) {
    List<Integer> chain = new ArrayList<>(List.of(activity));
    for (List<Integer> before = before(activity); !before.isEmpty(); ) {
      chain.add(0, rather(before, wanted));
      before = before(chain.get(0));
    }
    for (List<Integer> next = neighbours(activity); !next.isEmpty(); ) {
      chain.add(rather(next, wanted));
      next = neighbours(chain.get(chain.size() - 1));
    }
    return chain;
  }

  private static int rather(List<Integer> some, Set<Integer> wanted) {
    return some.stream().filter(wanted::contains).findFirst().orElse(some.get(0));
  }

  /** Critical predecessors without slack, in file order. */
  private List<Integer> before(int activity) {
    List<Integer> before = new ArrayList<>();
    for (int k = 0; k < network.linksInto(activity); k++) {
      Link link = network.link(network.linkInto(activity, k));
      if (timing.isCritical(link.predecessor()) && timing.slack(link) == 0) {
        before.add(link.predecessor());
      }
    }
    before.sort(null);
    return before;
  }

  private void countFrom(int activity, boolean[] waits) {
    List<Integer> next = neighbours(activity);
    BigInteger count = next.isEmpty() ? BigInteger.ONE : BigInteger.ZERO;
    for (int neighbour : next) {
      waits[neighbour] = true;
      count = count.add(chainsFrom[neighbour]);
    }
    chainsFrom[activity] = count;
  }

  /** Critical successors without slack, each once, in file order. */
  private List<Integer> neighbours(int activity) {
    List<Integer> next = new ArrayList<>();
    for (int k = 0; k < network.linksOutOf(activity); k++) {
      Link link = network.link(network.linkOutOf(activity, k));
      if (isCritical.test(link.successor()) && timing.slack(link) == 0) {
        next.add(link.successor());
      }
    }
    next.sort(null);
    for (int i = next.size() - 1; i > 0; i--) {
      if (next.get(i).equals(next.get(i - 1))) {
        next.remove(i);
      }
    }
    return next;
  }
}
