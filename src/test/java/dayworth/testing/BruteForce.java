package dayworth.testing;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Measure;
import dayworth.network.Network;
import dayworth.value.Money;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;

/**
 * Every choice of whole durations and of measures of a tiny network, each timed by relaxing all
 * inequalities until nothing moves. It shares no method with the program.
 */
public final class BruteForce {

  private final Network network;
  private final long[] duration;
  private final TreeMap<Long, Money> cheapest = new TreeMap<>();

  private BruteForce(Network network) {
    this.network = network;
    this.duration = new long[network.size()];
  }

  /** The least cost of each finish that some choice has. */
  public static Map<Long, Money> leastCosts(Network network) {
    BruteForce force = new BruteForce(network);
    force.choose(0, Money.ZERO, Set.of());
    return force.cheapest;
  }

  private void choose(int i, Money cost, Set<Integer> packages) {
    if (i == network.size()) {
      Money all = cost;
      for (int index : packages) {
        all = all.plus(network.measures().packages().get(index).cost());
      }
      cheapest.merge(finish(), all, Money::min);
      return;
    }
    Activity activity = network.activity(i);
    for (long d = activity.crash(); d <= activity.normal(); d++) {
      if (activity.divisible() || d == activity.crash() || d == activity.normal()) {
        duration[i] = d;
        Money extra = activity.crashCost().plus(activity.normalCost().negate());
        long most = activity.normal() - activity.crash();
        Money share = most == 0 ? Money.ZERO : extra.times(activity.normal() - d).dividedBy(most);
        choose(i + 1, cost.plus(activity.normalCost()).plus(share), packages);
      }
    }
    for (Measure measure : network.measures().list()) {
      if (measure.activity() == i) {
        duration[i] = measure.duration();
        Set<Integer> paid = new HashSet<>(packages);
        measure.inPackage().ifPresent(paid::add);
        choose(i + 1, cost.plus(measure.cost()), paid);
      }
    }
  }

  private long finish() {
    long[] start = new long[network.size()];
    for (int i = 0; i < start.length; i++) {
      long waits = network.activity(i).notFinishedBefore() - duration[i];
      start[i] = Math.max(network.activity(i).notBefore(), waits);
    }
    boolean moved = true;
    while (moved) {
      moved = false;
      for (Link link : network.links()) {
        int u = link.predecessor();
        int v = link.successor();
        long from = start[u] + (link.relation().fromStart() ? 0 : duration[u]);
        long least = from + link.lag() - (link.relation().toStart() ? 0 : duration[v]);
        if (start[v] < least) {
          start[v] = least;
          moved = true;
        }
      }
    }
    long finish = 0;
    for (int i = 0; i < start.length; i++) {
      finish = Math.max(finish, start[i] + duration[i]);
    }
    return finish;
  }
}
