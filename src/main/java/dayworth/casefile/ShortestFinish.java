package dayworth.casefile;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import java.util.function.IntToLongFunction;

/**
 * The earliest finish that any plan can reach, and which not_before the longest chain begins with.
 *
 * <p>One forward pass over both events of each activity: its finish comes at least the crash
 * duration after its start, its start at most the normal duration before its finish, and every link
 * binds one event of the successor. The least times that satisfy all are reached together.
 * O(activities + links).
 */
final class ShortestFinish {

  /** The chain begins with the project's start. */
  static final int NONE = -1;

  private final Network network;
  private final IntToLongFunction notBefore;

  /** Earliest times in ticks, and the activity whose not_before the chain to each begins with. */
  private final long[] start;

  private final int[] startOrigin;
  private final long[] finish;
  private final int[] finishOrigin;

  private long shortest;
  private int origin = NONE;

  private ShortestFinish(Network network, IntToLongFunction notBefore) {
    this.network = network;
    this.notBefore = notBefore;
    start = new long[network.size()];
    startOrigin = new int[network.size()];
    finish = new long[network.size()];
    finishOrigin = new int[network.size()];
    for (int position = 0; position < network.size(); position++) {
      place(network.inOrder(position));
    }
  }

  static ShortestFinish of(Network network) {
    return new ShortestFinish(network, i -> network.activity(i).notBefore());
  }

  /** The same where one activity may start at any time. */
  static ShortestFinish without(Network network, int activity) {
    return new ShortestFinish(network, i -> i == activity ? 0 : network.activity(i).notBefore());
  }

  /** In ticks. */
  long ticks() {
    return shortest;
  }

  /** The only activity whose not_before can hold the finish, or {@link #NONE}. */
  int origin() {
    return origin;
  }

  private void place(int i) {
    Activity activity = network.activity(i);
    long waits = notBefore.applyAsLong(i);
    start[i] = waits;
    startOrigin[i] = waits > 0 ? i : NONE;
    finish[i] = 0;
    finishOrigin[i] = NONE;
    for (int k = 0; k < network.linksInto(i); k++) {
      bind(i, network.link(network.linkInto(i, k)));
    }
    if (finish[i] - activity.normal() > start[i]) {
      start[i] = finish[i] - activity.normal();
      startOrigin[i] = finishOrigin[i];
    }
    if (start[i] + activity.crash() >= finish[i]) {
      finish[i] = start[i] + activity.crash();
      finishOrigin[i] = startOrigin[i];
    }
    if (finish[i] > shortest) {
      shortest = finish[i];
      origin = finishOrigin[i];
    }
  }

  private void bind(int i, Link link) {
    int from = link.predecessor();
    boolean fromStart = link.relation().fromStart();
    long bound = (fromStart ? start[from] : finish[from]) + link.lag();
    int boundOrigin = fromStart ? startOrigin[from] : finishOrigin[from];
    if (link.relation().toStart() && bound > start[i]) {
      start[i] = bound;
      startOrigin[i] = boundOrigin;
    } else if (!link.relation().toStart() && bound > finish[i]) {
      finish[i] = bound;
      finishOrigin[i] = boundOrigin;
    }
  }
}
