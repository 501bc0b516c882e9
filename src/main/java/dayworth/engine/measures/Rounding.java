package dayworth.engine.measures;

import dayworth.engine.Ways;
import dayworth.engine.stepping.Narrowing;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.SlopeScale;

/**
 * Makes a plan of whole ways out of durations that lie between them: each activity takes the
 * cheapest way that is no longer, and then, one by one, what saves most is relaxed into the float
 * that this leaves.
 *
 * <p>The plans are possible and often good; nothing says that they are cheapest. Where money hangs
 * on when activities start, starts stay where they are and float is what lies free behind a finish.
 * O(activities + links) for each way that is relaxed.
 */
final class Rounding {

  /** An activity that stands on its line, between two ways. */
  private static final int ON_LINE = -1;

  private final Network network;
  private final Opening opening;
  private final Ways ways;
  private final boolean startsStay;

  /** What each way costs, scaled. */
  private final long[] cost;

  /** What a tick of each activity's line saves, scaled. */
  private final long[] slope;

  private final long[] duration;
  private final int[] way;
  private final long[] start;
  private final long[] latest;

  /**
   * Prepares for many plans.
   *
   * @param startsStay whether money hangs on when activities start
   */
  Rounding(Network network, Opening opening, SlopeScale scale, boolean startsStay) {
    this.network = network;
    this.opening = opening;
    this.ways = opening.ways();
    this.startsStay = startsStay;
    this.cost = opening.scaledCosts(scale);
    int size = network.size();
    this.slope = new long[size];
    for (int i = 0; i < size; i++) {
      if (opening.hasLine(i) && network.activity(i).crashExtra().signum() > 0) {
        slope[i] = scale.scaled(network.activity(i).slope());
      }
    }
    this.duration = new long[size];
    this.way = new int[size];
    this.start = new long[size];
    this.latest = new long[size];
  }

  /** The plan; it may not keep the finish where shortening an activity makes others later. */
  Plan round(Narrowing from, long finish) {
    for (int i = 0; i < duration.length; i++) {
      take(i, from.duration(i));
      start[i] = from.start(i);
    }
    boolean isRelaxed = true;
    while (isRelaxed) {
      isRelaxed = relaxOne(finish);
    }
    return plan();
  }

  private Plan plan() {
    int[] measures = new int[way.length];
    for (int i = 0; i < measures.length; i++) {
      measures[i] = way[i] == ON_LINE ? Plan.NO_MEASURE : ways.get(way[i]).measure();
    }
    Plan plan = Plan.of(duration).using(measures);
    return startsStay ? plan.startingAt(start) : plan;
  }

  private void take(int i, long most) {
    Activity activity = network.activity(i);
    int best = ON_LINE;
    for (int w = ways.first(i); w < ways.first(i) + ways.count(i); w++) {
      boolean fits = opening.isOpen(w) && ways.get(w).duration() <= most;
      if (fits && (best == ON_LINE || cost[w] < cost[best])) {
        best = w;
      }
    }
    long onLine = Math.min(most, activity.normal());
    if (opening.hasLine(i)
        && onLine >= activity.crash()
        && (best == ON_LINE || costOnLine(i, onLine) < cost[best])) {
      way[i] = ON_LINE;
      duration[i] = onLine;
    } else {
      way[i] = best;
      duration[i] = ways.get(best).duration();
    }
  }

  private long costOnLine(int i, long ticks) {
    for (int w = ways.first(i); w < ways.first(i) + ways.count(i); w++) {
      if (ways.get(w).measure() == Plan.NO_MEASURE
          && ways.get(w).duration() == network.activity(i).normal()) {
        return cost[w] + slope[i] * (network.activity(i).normal() - ticks);
      }
    }
    return Long.MAX_VALUE;
  }

  /** Relaxes what saves most within the float; false if nothing saves anything. */
  private boolean relaxOne(long finish) {
    measure(finish);
    long most = 0;
    int activity = -1;
    int to = ON_LINE;
    for (int i = 0; i < duration.length; i++) {
      long room = latest[i] - start[i];
      if (room <= 0) {
        continue;
      }
      long now = way[i] == ON_LINE ? costOnLine(i, duration[i]) : cost[way[i]];
      for (int w = ways.first(i); w < ways.first(i) + ways.count(i); w++) {
        long longer = ways.get(w).duration() - duration[i];
        if (opening.isOpen(w) && longer > 0 && longer <= room && now - cost[w] > most) {
          most = now - cost[w];
          activity = i;
          to = w;
        }
      }
      if (opening.hasLine(i) && slope[i] > 0) {
        long onLine = Math.min(network.activity(i).normal(), duration[i] + room);
        if (onLine > duration[i]
            && onLine >= network.activity(i).crash()
            && now - costOnLine(i, onLine) > most) {
          most = now - costOnLine(i, onLine);
          activity = i;
          to = ON_LINE;
        }
      }
    }
    if (activity < 0) {
      return false;
    }
    duration[activity] =
        to == ON_LINE
            ? Math.min(
                network.activity(activity).normal(),
                duration[activity] + latest[activity] - start[activity])
            : ways.get(to).duration();
    way[activity] = to;
    return true;
  }

  private void measure(long finish) {
    if (!startsStay) {
      measureForward();
    }
    for (int position = duration.length - 1; position >= 0; position--) {
      int i = network.inOrder(position);
      long bound = finish - duration[i];
      for (int k = 0; k < network.linksOutOf(i); k++) {
        Link link = network.link(network.linkOutOf(i, k));
        int to = link.successor();
        if (!startsStay || !link.relation().fromStart()) {
          long next = startsStay ? start[to] : latest[to];
          bound = Math.min(bound, next - link.betweenStarts(duration[i], duration[to]));
        }
      }
      latest[i] = bound;
    }
  }

  private void measureForward() {
    for (int position = 0; position < duration.length; position++) {
      int i = network.inOrder(position);
      Activity activity = network.activity(i);
      long bound = Math.max(activity.notBefore(), activity.notFinishedBefore() - duration[i]);
      for (int k = 0; k < network.linksInto(i); k++) {
        Link link = network.link(network.linkInto(i, k));
        int from = link.predecessor();
        bound = Math.max(bound, start[from] + link.betweenStarts(duration[from], duration[i]));
      }
      start[i] = bound;
    }
  }
}
