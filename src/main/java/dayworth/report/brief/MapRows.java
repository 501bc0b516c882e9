package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.network.Activity;
import dayworth.network.Network;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * The activities of the compression map, in file order: those that are shortened or critical at
 * some finish; where they are many, those of which most is bought.
 *
 * @param shown indices in the network
 * @param quiet how many are never shortened nor critical
 * @param crowded how many have no room
 */
record MapRows(List<Integer> shown, int quiet, int crowded) {

  private static final int MOST = 40;

  /** Networks of so many activities are shown whole. */
  private static final int SMALL = 20;

  MapRows {
    shown = List.copyOf(shown);
  }

  static MapRows of(BriefAnswer answer) {
    Network network = answer.of().network();
    List<Integer> told = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      if (answer.of().isToGo(i) && (answer.of().toGo() <= SMALL || isTold(answer, i))) {
        told.add(i);
      }
    }
    int quiet = answer.of().toGo() - told.size();
    int crowded = Math.max(0, told.size() - MOST);
    if (crowded > 0) {
      told.sort(Comparator.<Integer>comparingDouble(i -> -share(answer, i)).thenComparing(i -> i));
      told = new ArrayList<>(told.subList(0, MOST));
      told.sort(null);
    }
    return new MapRows(told, quiet, crowded);
  }

  private static boolean isTold(BriefAnswer answer, int activity) {
    return answer.states().stream()
        .anyMatch(
            state ->
                bought(answer, state, activity) > 0
                    || answer.of().isCritical(state.timing(), activity));
  }

  /** How much is bought of it over all finishes. */
  private static double share(BriefAnswer answer, int activity) {
    return answer.states().stream().mapToDouble(state -> bought(answer, state, activity)).sum();
  }

  /** Ticks that an activity is shorter than normal. */
  static long bought(BriefAnswer answer, BriefAnswer.State state, int activity) {
    Activity one = answer.of().network().activity(activity);
    return one.normal() - state.timing().plan().duration(activity);
  }
}
