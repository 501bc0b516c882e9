package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.network.Network;
import dayworth.network.Timing;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Which activities the network shows as boxes: all of a small one; of a large one what is critical
 * at the chosen finish, what the slider can make critical, and what is nearest to it. The rest is
 * counted by its group.
 *
 * @param shown indices in the network, in file order
 * @param rest the others by group, the largest group first
 */
record NetworkChoice(List<Integer> shown, Map<String, List<Integer>> rest) {

  private static final int MOST = 60;
  private static final int MOST_GROUPS = 6;

  static NetworkChoice of(BriefAnswer answer) {
    Network network = answer.of().network();
    List<Integer> toGo = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      if (answer.of().isToGo(i)) {
        toGo.add(i);
      }
    }
    Timing chosen = answer.states().get(answer.chosenState()).timing();
    List<Integer> ranked = new ArrayList<>(toGo);
    ranked.sort(
        Comparator.<Integer>comparingLong(chosen::totalFloat)
            .thenComparingLong(i -> leastFloat(answer, i))
            .thenComparing(i -> i));
    List<Integer> shown =
        ranked.subList(0, Math.min(MOST, ranked.size())).stream().sorted().toList();
    List<Integer> left = toGo.stream().filter(i -> !shown.contains(i)).toList();
    return new NetworkChoice(shown, groups(network, left));
  }

  private static long leastFloat(BriefAnswer answer, int activity) {
    return answer.states().stream()
        .mapToLong(state -> state.timing().totalFloat(activity))
        .min()
        .orElseThrow();
  }

  private static Map<String, List<Integer>> groups(Network network, List<Integer> left) {
    Map<String, List<Integer>> byGroup = new LinkedHashMap<>();
    for (int i : left) {
      byGroup
          .computeIfAbsent(Words.safe(network.activity(i).group()), g -> new ArrayList<>())
          .add(i);
    }
    List<Map.Entry<String, List<Integer>>> largest = new ArrayList<>(byGroup.entrySet());
    largest.sort(Comparator.comparingInt(entry -> -entry.getValue().size()));
    Map<String, List<Integer>> told = new LinkedHashMap<>();
    List<Integer> others = new ArrayList<>();
    for (Map.Entry<String, List<Integer>> entry : largest) {
      boolean own = told.size() < MOST_GROUPS - 1 || largest.size() <= MOST_GROUPS;
      if (own && !entry.getKey().isEmpty()) {
        told.put(entry.getKey(), entry.getValue());
      } else {
        others.addAll(entry.getValue());
      }
    }
    if (!others.isEmpty()) {
      told.put("", others);
    }
    return told;
  }
}
