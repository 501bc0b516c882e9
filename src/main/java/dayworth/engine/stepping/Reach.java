package dayworth.engine.stepping;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;

/**
 * How far every event is from the project's start and finish along the longest chain, when each
 * activity is passed forwards over a given duration and backwards over its normal one.
 *
 * <p>As no loop of activities exists, one pass in topological order settles both events of each
 * activity. O(activities + links). Passed forwards over crash durations this gives the shortest
 * possible project for all four relations.
 */
final class Reach {

  private final Network network;
  private final long[] duration;
  private final long[] startFromBegin;
  private final long[] finishFromBegin;
  private final long[] startToEnd;
  private final long[] finishToEnd;
  private long longest;

  /**
   * Measures the network.
   *
   * @param duration the least time from an activity's start to its finish, ticks
   */
  Reach(Network network, long[] duration) {
    this.network = network;
    this.duration = duration;
    int size = network.size();
    startFromBegin = new long[size];
    finishFromBegin = new long[size];
    startToEnd = new long[size];
    finishToEnd = new long[size];
    for (int position = 0; position < size; position++) {
      fromBegin(network.inOrder(position));
    }
    for (int position = size - 1; position >= 0; position--) {
      toEnd(network.inOrder(position));
    }
  }

  /** The longest chain of all: the project's duration. */
  long longest() {
    return longest;
  }

  long startFromBegin(int activity) {
    return startFromBegin[activity];
  }

  long finishFromBegin(int activity) {
    return finishFromBegin[activity];
  }

  /** From the activity's start to the project's finish. */
  long startToEnd(int activity) {
    return startToEnd[activity];
  }

  long finishToEnd(int activity) {
    return finishToEnd[activity];
  }

  /** The longest chain over a link. */
  long over(Link link) {
    return (link.relation().fromStart()
            ? startFromBegin[link.predecessor()]
            : finishFromBegin[link.predecessor()])
        + link.lag()
        + (link.relation().toStart()
            ? startToEnd[link.successor()]
            : finishToEnd[link.successor()]);
  }

  private void fromBegin(int i) {
    Activity activity = network.activity(i);
    long start = activity.notBefore();
    long finish = activity.notFinishedBefore();
    for (int k = 0; k < network.linksInto(i); k++) {
      Link link = network.link(network.linkInto(i, k));
      int from = link.predecessor();
      long bound =
          link.lag() + (link.relation().fromStart() ? startFromBegin[from] : finishFromBegin[from]);
      if (link.relation().toStart()) {
        start = Math.max(start, bound);
      } else {
        finish = Math.max(finish, bound);
      }
    }
    finish = Math.max(finish, start + duration[i]);
    startFromBegin[i] = Math.max(start, finish - activity.normal());
    finishFromBegin[i] = finish;
    longest = Math.max(longest, finish);
  }

  private void toEnd(int i) {
    Activity activity = network.activity(i);
    long start = Long.MIN_VALUE;
    long finish = 0;
    for (int k = 0; k < network.linksOutOf(i); k++) {
      Link link = network.link(network.linkOutOf(i, k));
      int to = link.successor();
      long bound = link.lag() + (link.relation().toStart() ? startToEnd[to] : finishToEnd[to]);
      if (link.relation().fromStart()) {
        start = Math.max(start, bound);
      } else {
        finish = Math.max(finish, bound);
      }
    }
    start = Math.max(start, finish + duration[i]);
    finishToEnd[i] = Math.max(finish, start - activity.normal());
    startToEnd[i] = start;
  }
}
