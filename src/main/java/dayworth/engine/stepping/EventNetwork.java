package dayworth.engine.stepping;

import dayworth.engine.Flow;
import dayworth.engine.Flow.Over;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.value.SlopeScale;
import java.util.Arrays;

/**
 * A network of activities as events and arcs, with capacities that are cost slopes.
 *
 * <p>An activity has an event for its start and one for its finish, and arcs start→finish over its
 * normal duration (capacity: its slope), start→finish over its crash duration (unlimited) and
 * finish→start over minus its normal duration (unlimited: it is never stretched). What cannot be
 * compressed is one event. Where crashing is cheaper, an arc finish→start over minus the crash
 * duration (capacity: minus the slope) stands for the first. A span has an arc back from its later
 * moment to its earlier one over minus what is free (capacity: its rate).
 *
 * <p>Left out is what cannot matter: arcs on no chain as long as the shortest possible project (any
 * arc that carries flow lies on a chain at least as long as the project, and no project is
 * shorter), which holds only while no slope is negative and there are no spans; and arcs from the
 * project's start and to its finish that follow from others.
 */
final class EventNetwork {

  static final int BEGIN = 0;
  static final int END = 1;
  private static final int NONE = -1;

  final Network network;
  final SlopeScale scale;
  final ArcNetwork net;

  /** The event of each activity's start; -1 if the activity was left out. */
  private final int[] startEvent;

  /** The event of its finish; the start's where the activity cannot be compressed. */
  private final int[] finishEvent;

  /** Which constraint each arc stands for, and of which activity or link. */
  private final Over[] arcOver;

  private final int[] arcIndex;

  /** The arcs of each activity; -1 where it has none. */
  final int[] slopeArc;

  final int[] crashArc;
  final int[] stretchArc;
  final int[] cheaperArc;

  /** The arc of each span; -1 where its two moments are one event or its rate is too small. */
  final int[] spanArc;

  /** The length of each span's arc, also where it has none. */
  private final long[] spanLength;

  /** The arc that holds the project's finish; -1 if there is none. It is no part of a flow. */
  final int deadlineArc;

  private final long[] lateTimes;

  EventNetwork(EventNetworkBuilder from) {
    network = from.network;
    scale = from.scale;
    net = from.build();
    startEvent = from.startEvent;
    finishEvent = from.finishEvent;
    arcOver = from.arcOver();
    arcIndex = from.arcIndex();
    slopeArc = from.slopeArc;
    crashArc = from.crashArc;
    stretchArc = from.stretchArc;
    cheaperArc = from.cheaperArc;
    spanArc = from.spanArc;
    deadlineArc = from.deadlineArc;
    spanLength = network.spans().stream().mapToLong(from::spanLength).toArray();
    lateTimes = from.lateTimes();
  }

  static EventNetwork of(Network network, SlopeScale scale) {
    return new EventNetwork(new EventNetworkBuilder(network, scale));
  }

  /** The latest times of all events for the longest chain, before any money arc is filled. */
  long[] lateTimes() {
    return lateTimes.clone();
  }

  boolean has(int activity) {
    return startEvent[activity] != NONE;
  }

  int start(int activity) {
    return startEvent[activity];
  }

  int finish(int activity) {
    return finishEvent[activity];
  }

  /** Whether the activity has two events, so that its duration is open. */
  boolean isOpen(int activity) {
    return startEvent[activity] != finishEvent[activity];
  }

  Over over(int arc) {
    return arcOver[arc];
  }

  /** The activity or link that an arc belongs to. */
  int index(int arc) {
    return arcIndex[arc];
  }

  /** The scaled slope of an activity: what a tick of compression costs. */
  long slope(int activity) {
    return scaledSlope(network.activity(activity), scale);
  }

  static long scaledSlope(Activity activity, SlopeScale scale) {
    return activity.crashExtra().signum() < 0
        ? -scale.scaled(activity.slope().negate())
        : scale.scaled(activity.slope());
  }

  /** The flow as a checker reads it. */
  Flow flow() {
    Flow flow = new Flow(scale, network);
    long[] through = new long[network.size()];
    for (int arc = 0; arc < net.arcs(); arc++) {
      long amount = net.flow(arc);
      if (amount != 0 && arc != deadlineArc) {
        flow.set(arcOver[arc], arcIndex[arc], amount);
        countThrough(arc, amount, through);
      }
    }
    for (int j = 0; j < spanArc.length; j++) {
      if (isAlwaysCharged(j)) {
        flow.set(Over.SPAN, j, rate(j));
        countThroughSpan(j, rate(j), through);
      }
    }
    for (int i = 0; i < through.length; i++) {
      if (has(i) && !isOpen(i) && through[i] != 0) {
        flow.set(through[i] > 0 ? Over.CRASH : Over.BACK_OVER_NORMAL, i, Math.abs(through[i]));
      }
    }
    return flow;
  }

  /** What comes into an activity's start and does not leave it there runs on to its finish. */
  private void countThrough(int arc, long amount, long[] through) {
    if (arcOver[arc] == Over.FROM_PROJECT) {
      through[arcIndex[arc]] += amount;
    } else if (arcOver[arc] == Over.LINK) {
      Link link = network.link(arcIndex[arc]);
      if (link.relation().toStart()) {
        through[link.successor()] += amount;
      }
      if (link.relation().fromStart()) {
        through[link.predecessor()] -= amount;
      }
    } else if (arcOver[arc] == Over.SPAN) {
      countThroughSpan(arcIndex[arc], amount, through);
    }
  }

  private void countThroughSpan(int span, long amount, long[] through) {
    Moment from = network.spans().get(span).from();
    Moment to = network.spans().get(span).to();
    if (!from.isProjectStart() && !from.isFinish()) {
      through[from.activity()] += amount;
    }
    if (!to.isProjectStart() && !to.isFinish()) {
      through[to.activity()] -= amount;
    }
  }

  /** Whether a span lies within an activity that takes what it takes, longer than is free. */
  private boolean isAlwaysCharged(int span) {
    return spanArc[span] == NONE && spanLength[span] > 0;
  }

  /** The scaled rate of a span: what a tick of it costs. */
  long rate(int span) {
    return scale.scaled(network.spans().get(span).rate());
  }

  /** The starts that event times mean; only of a network of which nothing was left out. */
  long[] starts(Squeeze timeOf) {
    long[] starts = new long[network.size()];
    Arrays.setAll(starts, i -> timeOf.time(startEvent[i]) - timeOf.time(BEGIN));
    return starts;
  }

  /**
   * The durations that event times mean: what was left out is done its normal way.
   *
   * @param timeOf the time of each event
   */
  long[] durations(Squeeze timeOf) {
    long[] durations = new long[network.size()];
    Arrays.setAll(durations, i -> duration(i, timeOf));
    return durations;
  }

  private long duration(int i, Squeeze timeOf) {
    if (!has(i) || !isOpen(i)) {
      return network.activity(i).normal();
    }
    return timeOf.time(finishEvent[i]) - timeOf.time(startEvent[i]);
  }
}
