package dayworth.network;

import java.util.Arrays;

/**
 * When each activity of a plan can and must be done: the forward and the backward pass for all four
 * relations, work being contiguous. All times in ticks after the project start.
 *
 * <p>Activities are taken in topological order; as each duration is given, every link bounds the
 * difference of two starts. O(activities + links). Total float is late minus early; free float is
 * how far an activity can slip without moving another's early time or the finish.
 */
public final class Timing {

  private final Network network;
  private final Plan plan;
  private final long finish;
  private final long[] earlyStart;
  private final long[] lateStart;

  private Timing(Network network, Plan plan, long finish, long[] earlyStart, long[] lateStart) {
    this.network = network;
    this.plan = plan;
    this.finish = finish;
    this.earlyStart = earlyStart;
    this.lateStart = lateStart;
  }

  /** The times when the project finishes as early as the plan's durations allow. */
  public static Timing earliest(Network network, Plan plan) {
    long[] earlyStart = forward(network, plan);
    return at(network, plan, latestFinish(plan, earlyStart), earlyStart);
  }

  /**
   * The times when the project finishes at {@code finish}.
   *
   * @throws IllegalArgumentException if the plan cannot finish by then
   */
  public static Timing by(Network network, Plan plan, long finish) {
    long[] earlyStart = forward(network, plan);
    if (latestFinish(plan, earlyStart) > finish) {
      throw new IllegalArgumentException("the plan does not finish by " + finish + " ticks");
    }
    return at(network, plan, finish, earlyStart);
  }

  private static Timing at(Network network, Plan plan, long finish, long[] earlyStart) {
    return new Timing(network, plan, finish, earlyStart, backward(network, plan, finish));
  }

  public long finish() {
    return finish;
  }

  public Plan plan() {
    return plan;
  }

  /** When the plan starts an activity; where it leaves that open, as early as can be. */
  public long start(int activity) {
    return plan.isScheduled() ? plan.start(activity) : earlyStart[activity];
  }

  /** The plan with its starts: its own where it says them, else as early as can be. */
  public Plan scheduled() {
    long[] starts = new long[network.size()];
    Arrays.setAll(starts, this::start);
    return plan.startingAt(starts);
  }

  public long finish(int activity) {
    return start(activity) + plan.duration(activity);
  }

  public long earlyStart(int activity) {
    return earlyStart[activity];
  }

  public long earlyFinish(int activity) {
    return earlyStart[activity] + plan.duration(activity);
  }

  public long lateStart(int activity) {
    return lateStart[activity];
  }

  public long lateFinish(int activity) {
    return lateStart[activity] + plan.duration(activity);
  }

  public long totalFloat(int activity) {
    return lateStart[activity] - earlyStart[activity];
  }

  public long freeFloat(int activity) {
    long free = finish - earlyFinish(activity);
    for (int k = 0; k < network.linksOutOf(activity); k++) {
      free = Math.min(free, slack(network.link(network.linkOutOf(activity, k))));
    }
    return free;
  }

  public boolean isCritical(int activity) {
    return totalFloat(activity) == 0;
  }

  /** How much later than it must the successor comes at early times. */
  public long slack(Link link) {
    return earlyStart[link.successor()] - earlyStart[link.predecessor()] - between(link, plan);
  }

  private static long between(Link link, Plan plan) {
    return link.betweenStarts(plan.duration(link.predecessor()), plan.duration(link.successor()));
  }

  private static long[] forward(Network network, Plan plan) {
    long[] early = new long[network.size()];
    for (int position = 0; position < early.length; position++) {
      int activity = network.inOrder(position);
      long start = network.activity(activity).earliestStart(plan.duration(activity));
      for (int k = 0; k < network.linksInto(activity); k++) {
        Link link = network.link(network.linkInto(activity, k));
        start = Math.max(start, early[link.predecessor()] + between(link, plan));
      }
      early[activity] = start;
    }
    return early;
  }

  private static long[] backward(Network network, Plan plan, long finish) {
    long[] late = new long[network.size()];
    for (int position = late.length - 1; position >= 0; position--) {
      int activity = network.inOrder(position);
      long start = finish - plan.duration(activity);
      for (int k = 0; k < network.linksOutOf(activity); k++) {
        Link link = network.link(network.linkOutOf(activity, k));
        start = Math.min(start, late[link.successor()] - between(link, plan));
      }
      late[activity] = start;
    }
    return late;
  }

  private static long latestFinish(Plan plan, long[] earlyStart) {
    long latest = 0;
    for (int i = 0; i < earlyStart.length; i++) {
      latest = Math.max(latest, earlyStart[i] + plan.duration(i));
    }
    return latest;
  }
}
