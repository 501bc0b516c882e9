package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;

import java.util.Arrays;

/**
 * The small part of a network that flow to one event can use: the events that move and from which
 * the goal can be reached over half-arcs with room and no slack, with their half-arcs among each
 * other.
 *
 * <p>While flow is sent no time changes, and no event can begin to lead to the goal that did not
 * before: a half-arc gains room only from a path whose events all lead there. So the part is picked
 * out once, with numbers of its own, and all that follows stays within memory that lies close
 * together. Half-arcs that lie side by side at both their ends, as those of one activity do, are
 * one half-link with the sum of their room.
 *
 * <ul>
 *   <li>{@code first[v] .. first[v + 1] - 1} are the half-links that leave the part's event v;
 *       event 0 is the goal;
 *   <li>{@code head[h]} is the event that half-link h leads to, {@code mate[h]} its other half,
 *       {@code room[h]} how much more can flow over it.
 * </ul>
 */
final class TightPart {

  /** The goal's number in the part. */
  static final int GOAL = 0;

  private static final int OUTSIDE = -1;

  private final ArcNetwork net;
  private final long[] time;
  private final MovingSet moving;

  /** The part's number of each event of the network. */
  private final int[] numberOf;

  /** The half-link that begins with each half-arc of the network; only those of the part hold. */
  private final int[] linkOf;

  private final int[] event;
  private int events;

  final int[] first;
  int[] head = new int[64];
  int[] mate = new int[64];
  long[] room = new long[64];

  /** The first half-arc of each half-link. */
  private int[] half = new int[64];

  TightPart(ArcNetwork net, long[] time, MovingSet moving) {
    this.net = net;
    this.time = time;
    this.moving = moving;
    numberOf = new int[net.events()];
    linkOf = new int[net.head.length];
    event = new int[net.events()];
    first = new int[net.events() + 1];
    Arrays.fill(numberOf, OUTSIDE);
  }

  /**
   * Picks out the part for a goal.
   *
   * @return the part's number of {@code from}, or a negative number if it does not lead there
   */
  int pick(int from, int to) {
    for (int v = 0; v < events; v++) {
      numberOf[event[v]] = OUTSIDE;
    }
    events = 0;
    take(to);
    int halves = 0;
    for (int v = 0; v < events; v++) {
      first[v] = halves;
      halves = listTight(event[v], halves);
    }
    first[events] = halves;
    if (numberOf[from] != OUTSIDE) {
      link();
    }
    return numberOf[from];
  }

  private void take(int here) {
    numberOf[here] = events;
    event[events++] = here;
  }

  /** Lists the half-arcs without slack at an event, and takes the events that lead to it. */
  private int listTight(int here, int listed) {
    int halves = listed;
    for (int out = net.first[here]; out < net.first[here + 1]; out++) {
      int tail = net.head[out];
      if (moving.holds(tail) && time[here] + net.length[out] == time[tail]) {
        if (halves == half.length) {
          half = Arrays.copyOf(half, 2 * halves);
        }
        half[halves++] = out;
        if (numberOf[tail] == OUTSIDE && net.room[net.mate[out]] > 0) {
          take(tail);
        }
      }
    }
    return halves;
  }

  /** Makes half-links of the half-arcs listed that stay within the part. */
  private void link() {
    if (head.length < half.length) {
      head = new int[half.length];
      mate = new int[half.length];
      room = new long[half.length];
    }
    int links = 0;
    for (int v = 0; v < events; v++) {
      int listed = first[v];
      first[v] = links;
      for (; listed < first[v + 1]; listed++) {
        links = link(half[listed], first[v], links);
      }
    }
    first[events] = links;
    for (int h = 0; h < links; h++) {
      mate[h] = linkOf[net.mate[half[h]]];
    }
  }

  /** Adds a half-arc to the last half-link of its tail, or as a new one. */
  private int link(int out, int firstOfTail, int links) {
    int next = numberOf[net.head[out]];
    if (next == OUTSIDE) {
      return links;
    }
    int last = links - 1;
    if (links > firstOfTail && areBesideEachOther(half[last], out)) {
      room[last] = sum(room[last], net.room[out]);
      return links;
    }
    half[links] = out;
    linkOf[out] = links;
    head[links] = next;
    room[links] = net.room[out];
    return links + 1;
  }

  /** Whether two half-arcs and all between them have the same ends and lie so at both. */
  private boolean areBesideEachOther(int one, int other) {
    for (int k = one + 1; k <= other; k++) {
      if (net.head[k] != net.head[one] || net.mate[k] - net.mate[one] != k - one) {
        return false;
      }
    }
    return true;
  }

  private static long sum(long one, long other) {
    return one == UNLIMITED || other == UNLIMITED ? UNLIMITED : Math.addExact(one, other);
  }

  int events() {
    return events;
  }

  /** The network's number of an event. */
  int event(int v) {
    return event[v];
  }

  /** Sends {@code amount} over a half-link, in the part and in the network. */
  void send(int h, long amount) {
    shift(h, -amount);
    shift(mate[h], amount);
    long rest = amount;
    for (int k = half[h]; rest > 0; k++) {
      if (isTight(k)) {
        long some = Math.min(rest, net.room[k]);
        net.send(k, some);
        rest -= some;
      }
    }
  }

  private void shift(int h, long amount) {
    if (room[h] != UNLIMITED) {
      room[h] += amount;
    }
  }

  private boolean isTight(int arcHalf) {
    return time[net.head[net.mate[arcHalf]]] + net.length[arcHalf] == time[net.head[arcHalf]];
  }

  /** The network's number of the half-arc that gives a half-link room without limit. */
  int unlimited(int h) {
    int k = half[h];
    while (net.room[k] != UNLIMITED || !isTight(k)) {
      k++;
    }
    return k;
  }

  /** Lets go of the events that still lead to the goal. */
  void letGoOfLeading() {
    boolean[] leads = new boolean[events];
    int[] open = new int[events];
    int count = 1;
    leads[GOAL] = true;
    moving.forgetLost();
    for (int k = 0; k < count; k++) {
      int here = open[k];
      moving.letGo(event[here]);
      for (int out = first[here]; out < first[here + 1]; out++) {
        int tail = head[out];
        if (!leads[tail] && room[mate[out]] > 0) {
          leads[tail] = true;
          open[count++] = tail;
        }
      }
    }
  }
}
