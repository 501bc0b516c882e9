package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Timing;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Lanes of the network, one to a chain: the longest critical chain first, then the longest of what
 * is left, and so on. Chains share a lane where they do not meet at any finish, so that a box never
 * changes its lane.
 */
final class Lanes {

  /** So many milestones have room beside each other. */
  private static final int MOST_MARKS = 16;

  private final BriefAnswer answer;
  private final Network network;
  private final Timing chosen;
  private final Set<Integer> open;
  private final List<List<Integer>> lanes = new ArrayList<>();

  private Lanes(BriefAnswer answer, List<Integer> shown) {
    this.answer = answer;
    this.network = answer.of().network();
    this.chosen = answer.states().get(answer.chosenState()).timing();
    this.open = new HashSet<>(shown);
  }

  /** The activities of each lane, in the order of their starts. */
  static List<List<Integer>> of(BriefAnswer answer, List<Integer> shown) {
    Lanes all = new Lanes(answer, shown);
    while (all.open.stream().anyMatch(all.chosen::isCritical)) {
      all.put(all.longest(true));
    }
    while (!all.open.isEmpty()) {
      all.put(all.longest(false));
    }
    all.bringLinkedTogether();
    return all.lanes;
  }

  /** The longest chain of what has no lane yet, by its work. */
  private List<Integer> longest(boolean critical) {
    long[] length = new long[network.size()];
    int[] before = new int[network.size()];
    Arrays.fill(before, -1);
    int end = -1;
    for (int position = 0; position < network.size(); position++) {
      int i = network.inOrder(position);
      if (!open.contains(i) || (critical && !chosen.isCritical(i))) {
        continue;
      }
      for (int k = 0; k < network.linksInto(i); k++) {
        Link link = network.link(network.linkInto(i, k));
        int from = link.predecessor();
        boolean usable =
            open.contains(from)
                && !isMilestone(from)
                && !isMilestone(i)
                && chosen.finish(from) <= chosen.start(i)
                && (!critical || (chosen.isCritical(from) && chosen.slack(link) == 0));
        if (usable && (before[i] < 0 || length[from] > length[before[i]])) {
          before[i] = from;
        }
      }
      length[i] = chosen.plan().duration(i) + 1 + (before[i] < 0 ? 0 : length[before[i]]);
      if (end < 0 || length[i] > length[end]) {
        end = i;
      }
    }
    List<Integer> chain = new ArrayList<>();
    for (int i = end; i >= 0; i = before[i]) {
      chain.add(0, i);
    }
    return chain;
  }

  private boolean isMilestone(int activity) {
    return chosen.plan().duration(activity) == 0;
  }

  private void put(List<Integer> chain) {
    open.removeAll(chain);
    for (List<Integer> lane : lanes) {
      if (chain.stream().allMatch(i -> lane.stream().allMatch(other -> isApart(i, other)))) {
        lane.addAll(chain);
        lane.sort(Comparator.comparingLong(chosen::start));
        return;
      }
    }
    lanes.add(new ArrayList<>(chain));
  }

  /** Milestones need room for their words on both sides, so they have lanes of their own. */
  private boolean isApart(int one, int other) {
    if (isMilestone(one) || isMilestone(other)) {
      return isMilestone(one)
          && isMilestone(other)
          && answer.states().stream()
              .map(BriefAnswer.State::timing)
              .allMatch(t -> Math.abs(t.start(one) - t.start(other)) * MOST_MARKS > t.finish());
    }
    return answer.states().stream()
        .map(BriefAnswer.State::timing)
        .allMatch(
            timing ->
                timing.finish(one) <= timing.start(other)
                    || timing.finish(other) <= timing.start(one));
  }

  /** Swaps lanes as long as that makes the links between them shorter. */
  private void bringLinkedTogether() {
    boolean better = true;
    while (better) {
      better = false;
      for (int a = 0; a < lanes.size(); a++) {
        for (int b = a + 1; b < lanes.size(); b++) {
          long before = crossed();
          Collections.swap(lanes, a, b);
          if (crossed() < before) {
            better = true;
          } else {
            Collections.swap(lanes, a, b);
          }
        }
      }
    }
  }

  /** How many lanes all links cross; those without slack count twice. */
  private long crossed() {
    Map<Integer, Integer> laneOf = new HashMap<>();
    for (int l = 0; l < lanes.size(); l++) {
      for (int i : lanes.get(l)) {
        laneOf.put(i, l);
      }
    }
    long sum = 0;
    for (Link link : network.links()) {
      Integer from = laneOf.get(link.predecessor());
      Integer to = laneOf.get(link.successor());
      if (from != null && to != null) {
        sum += Math.abs(from - to) * (chosen.slack(link) == 0 ? 2L : 1L);
      }
    }
    return sum;
  }

  /** The groups that do most of a lane's work, at most two. */
  static String name(Network network, Timing timing, List<Integer> lane) {
    Map<String, Long> work = new LinkedHashMap<>();
    for (int i : lane) {
      String group = Words.safe(network.activity(i).group());
      if (!group.isEmpty()) {
        work.merge(group, timing.plan().duration(i) + 1, Long::sum);
      }
    }
    List<String> most = new ArrayList<>(work.keySet());
    most.sort(Comparator.comparingLong(group -> -work.get(group)));
    return Words.list(most.subList(0, Math.min(2, most.size())), 2);
  }
}
