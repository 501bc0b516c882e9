package dayworth.network;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.Deque;
import java.util.List;

/**
 * Finds loops of links: each one is a chain of links that leads back to its first activity.
 *
 * <p>Depth-first search with an explicit stack; a link to an activity on the current path closes a
 * loop. One loop is reported for each such link, so that every loop is broken when all reported
 * links are taken out. Time and memory O(activities + links).
 */
public final class Loop {

  private enum State {
    NEW,
    ON_PATH,
    DONE
  }

  private Loop() {}

  /**
   * The loops among {@code links}.
   *
   * @return for each loop the indices of its links in order; the last one closes it
   */
  public static List<List<Integer>> in(int activities, List<Link> links) {
    List<List<Integer>> outOf = new ArrayList<>();
    for (int i = 0; i < activities; i++) {
      outOf.add(new ArrayList<>());
    }
    for (int j = 0; j < links.size(); j++) {
      outOf.get(links.get(j).predecessor()).add(j);
    }
    List<List<Integer>> loops = new ArrayList<>();
    State[] state = new State[activities];
    Arrays.fill(state, State.NEW);
    for (int start = 0; start < activities; start++) {
      if (state[start] == State.NEW) {
        search(start, links, outOf, state, loops);
      }
    }
    return loops;
  }

  private static void search(
      int start,
      List<Link> links,
      List<List<Integer>> outOf,
      State[] state,
      List<List<Integer>> loops) {
    Deque<Integer> path = new ArrayDeque<>();
    Deque<Integer> taken = new ArrayDeque<>();
    int[] next = new int[state.length];
    path.push(start);
    state[start] = State.ON_PATH;
    while (!path.isEmpty()) {
      int here = path.peek();
      if (next[here] == outOf.get(here).size()) {
        state[here] = State.DONE;
        path.pop();
        taken.poll();
        continue;
      }
      int link = outOf.get(here).get(next[here]++);
      int there = links.get(link).successor();
      if (state[there] == State.ON_PATH) {
        loops.add(closing(link, there, taken, links));
      } else if (state[there] == State.NEW) {
        state[there] = State.ON_PATH;
        path.push(there);
        taken.push(link);
      }
    }
  }

  private static List<Integer> closing(
      int link, int there, Deque<Integer> taken, List<Link> links) {
    List<Integer> loop = new ArrayList<>(List.of(link));
    if (links.get(link).predecessor() != there) {
      for (int earlier : taken) {
        loop.add(earlier);
        if (links.get(earlier).predecessor() == there) {
          break;
        }
      }
    }
    Collections.reverse(loop);
    return loop;
  }
}
