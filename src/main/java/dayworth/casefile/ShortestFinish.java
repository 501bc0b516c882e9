package dayworth.casefile;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.function.IntToLongFunction;

/**
 * The earliest finish that any plan can reach, and the longest chain that leads to it.
 *
 * <p>One forward pass over both events of each activity: its finish comes at least the crash
 * duration after its start, its start at most the normal duration before its finish, and every link
 * binds one event of the successor. The least times that satisfy all are reached together.
 * O(activities + links).
 */
final class ShortestFinish {

  /** No activity, and no event. */
  static final int NONE = -1;

  private final Network network;
  private final IntToLongFunction notBefore;

  /** Earliest times in ticks by event: 2 x activity is its start, the next one its finish. */
  private final long[] time;

  /** The event from which the longest chain comes to an event; NONE where it begins there. */
  private final int[] before;

  private long shortest;
  private int last = NONE;

  private ShortestFinish(Network network, IntToLongFunction notBefore) {
    this.network = network;
    this.notBefore = notBefore;
    time = new long[2 * network.size()];
    before = new int[2 * network.size()];
    for (int position = 0; position < network.size(); position++) {
      place(network.inOrder(position));
    }
  }

  static ShortestFinish of(Network network) {
    return new ShortestFinish(network, i -> network.activity(i).notBefore());
  }

  /** The same where one activity may start at another time. */
  static ShortestFinish with(Network network, int activity, long notBefore) {
    return new ShortestFinish(
        network, i -> i == activity ? notBefore : network.activity(i).notBefore());
  }

  /** In ticks. */
  long ticks() {
    return shortest;
  }

  /** The only activity whose not_before can hold the finish, or {@link #NONE}. */
  int origin() {
    List<Integer> chain = chain();
    return !chain.isEmpty() && notBefore.applyAsLong(chain.get(0)) > 0 && beginsWithStart()
        ? chain.get(0)
        : NONE;
  }

  /** The activities of the longest chain, first to last. */
  List<Integer> chain() {
    List<Integer> chain = new ArrayList<>();
    for (int event = last; event != NONE; event = before[event]) {
      if (chain.isEmpty() || chain.get(chain.size() - 1) != event / 2) {
        chain.add(event / 2);
      }
    }
    Collections.reverse(chain);
    return chain;
  }

  /** Whether its first event is a start; a finish waits for no not_before of its own. */
  private boolean beginsWithStart() {
    int first = last;
    while (before[first] != NONE) {
      first = before[first];
    }
    return first % 2 == 0;
  }

  private void place(int i) {
    Activity activity = network.activity(i);
    int start = 2 * i;
    int finish = start + 1;
    time[start] = notBefore.applyAsLong(i);
    before[start] = NONE;
    time[finish] = activity.notFinishedBefore();
    before[finish] = NONE;
    for (int k = 0; k < network.linksInto(i); k++) {
      Link link = network.link(network.linkInto(i, k));
      int from = 2 * link.predecessor() + (link.relation().fromStart() ? 0 : 1);
      bind(link.relation().toStart() ? start : finish, time[from] + link.lag(), from);
    }
    bind(start, time[finish] - activity.normal(), finish);
    bind(finish, time[start] + activity.crash(), start);
    if (time[finish] > shortest) {
      shortest = time[finish];
      last = finish;
    }
  }

  private void bind(int event, long bound, int from) {
    if (bound > time[event]) {
      time[event] = bound;
      before[event] = from;
    }
  }
}
