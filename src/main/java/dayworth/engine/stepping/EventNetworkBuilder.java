package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;

import dayworth.engine.Flow.Over;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Span;
import dayworth.value.SlopeScale;
import java.util.Arrays;

/** Chooses the events and arcs of an {@link EventNetwork}, leaving out what cannot matter. */
final class EventNetworkBuilder {

  private static final int NONE = -1;

  final Network network;
  final SlopeScale scale;
  final int[] startEvent;
  final int[] finishEvent;
  final int[] slopeArc;
  final int[] crashArc;
  final int[] stretchArc;
  final int[] cheaperArc;

  /** The arc of each span; -1 where its two moments are one event or its rate is too small. */
  final int[] spanArc;

  /** The arc from the project's finish back to its start; -1 if there is none. */
  int deadlineArc = NONE;

  private final ArcNetwork.Builder arcs = new ArcNetwork.Builder();
  private final long[] slope;

  /** Chains while nothing is paid for: where crashing is free it is done. */
  private final Reach cheapest;

  /** Chains with every activity at its normal duration. */
  private final Reach normal;

  /** Chains shorter than this never carry flow. */
  private long least;

  private boolean hasDeadline;

  private Over[] overs = new Over[64];
  private int[] indices = new int[64];
  private int arcCount;
  private int events = 2;

  EventNetworkBuilder(Network network, SlopeScale scale) {
    this.network = network;
    this.scale = scale;
    int size = network.size();
    slope = new long[size];
    Arrays.setAll(slope, i -> EventNetwork.scaledSlope(network.activity(i), scale));
    cheapest = new Reach(network, cheapestDurations());
    normal =
        Arrays.stream(slope).allMatch(s -> s > 0)
            ? cheapest
            : new Reach(
                network, network.activities().stream().mapToLong(Activity::normal).toArray());
    least =
        Arrays.stream(slope).anyMatch(s -> s < 0) || !network.spans().isEmpty()
            ? Long.MIN_VALUE
            : shortest();
    startEvent = none(size);
    finishEvent = none(size);
    slopeArc = none(size);
    crashArc = none(size);
    stretchArc = none(size);
    cheaperArc = none(size);
    spanArc = none(network.spans().size());
  }

  private static int[] none(int size) {
    int[] none = new int[size];
    Arrays.fill(none, NONE);
    return none;
  }

  /** How long each activity takes while nothing is paid for: crash where that is not dearer. */
  private long[] cheapestDurations() {
    long[] durations = new long[network.size()];
    Arrays.setAll(
        durations, i -> slope[i] > 0 ? network.activity(i).normal() : network.activity(i).crash());
    return durations;
  }

  private long shortest() {
    return new Reach(network, network.activities().stream().mapToLong(Activity::crash).toArray())
        .longest();
  }

  /** Leaves out nothing, and adds an arc from the project's finish back to its start. */
  EventNetworkBuilder withDeadline() {
    least = Long.MIN_VALUE;
    hasDeadline = true;
    return this;
  }

  ArcNetwork build() {
    for (int position = 0; position < network.size(); position++) {
      addActivity(network.inOrder(position));
    }
    for (int j = 0; j < network.links().size(); j++) {
      addLink(j);
    }
    for (int i = 0; i < network.size(); i++) {
      if (startEvent[i] != NONE) {
        addEnds(i);
      }
    }
    for (int j = 0; j < network.spans().size(); j++) {
      addSpan(j);
    }
    if (hasDeadline) {
      deadlineArc = arc(Over.TO_PROJECT, NONE, EventNetwork.END, EventNetwork.BEGIN, 0, 0);
    }
    return arcs.build(events);
  }

  Over[] arcOver() {
    return Arrays.copyOf(overs, arcCount);
  }

  int[] arcIndex() {
    return Arrays.copyOf(indices, arcCount);
  }

  long[] lateTimes() {
    long[] times = new long[events];
    times[EventNetwork.END] = cheapest.longest();
    for (int i = 0; i < network.size(); i++) {
      if (startEvent[i] != NONE) {
        times[finishEvent[i]] = cheapest.longest() - cheapest.finishToEnd(i);
        times[startEvent[i]] = cheapest.longest() - cheapest.startToEnd(i);
      }
    }
    return times;
  }

  private int arc(Over over, int index, int tail, int head, long length, long capacity) {
    if (arcCount == overs.length) {
      overs = Arrays.copyOf(overs, 2 * arcCount);
      indices = Arrays.copyOf(indices, 2 * arcCount);
    }
    overs[arcCount] = over;
    indices[arcCount++] = index;
    return arcs.add(tail, head, length, capacity);
  }

  private void addActivity(int i) {
    boolean startMatters = normal.startFromBegin(i) + normal.startToEnd(i) >= least;
    boolean finishMatters = normal.finishFromBegin(i) + normal.finishToEnd(i) >= least;
    if (!startMatters && !finishMatters) {
      return;
    }
    Activity activity = network.activity(i);
    startEvent[i] = events++;
    if (!activity.isCompressible()) {
      finishEvent[i] = startEvent[i];
      return;
    }
    finishEvent[i] = events++;
    addDuration(i, activity);
  }

  private void addDuration(int i, Activity activity) {
    int start = startEvent[i];
    int finish = finishEvent[i];
    if (slope[i] > 0) {
      slopeArc[i] = arc(Over.SLOPE, i, start, finish, activity.normal(), slope[i]);
    }
    crashArc[i] = arc(Over.CRASH, i, start, finish, activity.crash(), UNLIMITED);
    stretchArc[i] = arc(Over.BACK_OVER_NORMAL, i, finish, start, -activity.normal(), UNLIMITED);
    if (slope[i] < 0) {
      cheaperArc[i] = arc(Over.BACK_OVER_CRASH, i, finish, start, -activity.crash(), 0);
    }
  }

  private void addLink(int j) {
    Link link = network.link(j);
    int from = link.predecessor();
    int to = link.successor();
    if (startEvent[from] == NONE || startEvent[to] == NONE || normal.over(link) < least) {
      return;
    }
    int tail = link.relation().fromStart() ? startEvent[from] : finishEvent[from];
    int head = link.relation().toStart() ? startEvent[to] : finishEvent[to];
    long length = link.lag();
    if (!link.relation().fromStart() && finishEvent[from] == startEvent[from]) {
      length += network.activity(from).normal();
    }
    if (!link.relation().toStart() && finishEvent[to] == startEvent[to]) {
      length -= network.activity(to).normal();
    }
    arc(Over.LINK, j, tail, head, length, UNLIMITED);
  }

  /** Its capacity is given to it when it has been filled. */
  private void addSpan(int j) {
    Span span = network.spans().get(j);
    int tail = event(span.to());
    int head = event(span.from());
    if (tail != head && scale.scaled(span.rate()) > 0) {
      spanArc[j] = arc(Over.SPAN, j, tail, head, spanLength(span), 0);
    }
  }

  private int event(Moment moment) {
    if (moment.isProjectStart()) {
      return EventNetwork.BEGIN;
    }
    return (moment.isFinish() ? finishEvent : startEvent)[moment.activity()];
  }

  /** The length of a span's arc, from its later moment's event to its earlier one's. */
  long spanLength(Span span) {
    return offset(span.to()) - offset(span.from()) - span.free();
  }

  /** How long after its event a moment comes. */
  private long offset(Moment moment) {
    boolean apart =
        !moment.isProjectStart()
            && moment.isFinish()
            && finishEvent[moment.activity()] == startEvent[moment.activity()];
    return apart ? network.activity(moment.activity()).normal() : 0;
  }

  private void addEnds(int i) {
    Activity activity = network.activity(i);
    long earliest = activity.notBefore();
    if (earliest + normal.startToEnd(i) >= least && !startFollows(i)) {
      arc(Over.FROM_PROJECT, i, EventNetwork.BEGIN, startEvent[i], earliest, UNLIMITED);
    }
    long earliestFinish = activity.notFinishedBefore();
    if (earliestFinish + normal.finishToEnd(i) >= least
        && earliestFinish > earliest + activity.crash()) {
      long length = earliestFinish - (finishEvent[i] == startEvent[i] ? activity.normal() : 0);
      arc(Over.FROM_PROJECT_TO_FINISH, i, EventNetwork.BEGIN, finishEvent[i], length, UNLIMITED);
    }
    if (normal.finishFromBegin(i) >= least && !finishFollows(i)) {
      long length = finishEvent[i] == startEvent[i] ? activity.normal() : 0;
      arc(Over.TO_PROJECT, i, finishEvent[i], EventNetwork.END, length, UNLIMITED);
    }
  }

  /** Whether another activity's start already keeps this one from starting before the project. */
  private boolean startFollows(int i) {
    if (network.activity(i).notBefore() > 0) {
      return false;
    }
    for (int k = 0; k < network.linksInto(i); k++) {
      Link link = network.link(network.linkInto(i, k));
      if (link.relation().toStart()
          && link.lag() >= 0
          && startEvent[link.predecessor()] != NONE
          && normal.over(link) >= least) {
        return true;
      }
    }
    return false;
  }

  /** Whether another activity's finish already keeps this one from finishing after the project. */
  private boolean finishFollows(int i) {
    for (int k = 0; k < network.linksOutOf(i); k++) {
      Link link = network.link(network.linkOutOf(i, k));
      if (!link.relation().fromStart()
          && link.lag() >= 0
          && startEvent[link.successor()] != NONE
          && normal.over(link) >= least) {
        return true;
      }
    }
    return false;
  }
}
