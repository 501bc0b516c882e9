package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;

import java.util.Arrays;

/**
 * The small part of a network that flow to one event can use: the events that are reached and from
 * which the goal can be reached over half-arcs with room and no slack, with their half-arcs among
 * each other.
 *
 * <p>While flow is sent no time changes, and no event can begin to lead to the goal that did not
 * before: a half-arc gains room only from a path whose events all lead there. So the part is picked
 * out once, with numbers of its own, and every search after that stays within memory that lies
 * close together.
 *
 * <ul>
 *   <li>{@code first[v] .. first[v + 1] - 1} are the half-arcs that leave the part's event v; event
 *       0 is the goal;
 *   <li>{@code head[h]}, {@code mate[h]}, {@code room[h]} are as in {@link ArcNetwork};
 *   <li>{@code against[h]} is one if half-arc h runs against the order of the work, else zero.
 * </ul>
 */
final class TightPart {

  private static final int OUTSIDE = -1;

  private final ArcNetwork net;
  private final long[] time;
  private final Reached reached;

  /** The part's number of each event of the network. */
  private final int[] numberOf;

  /** The part's number of each half-arc of the network; only those of the part are kept up. */
  private final int[] halfOf;

  private final int[] event;
  private int events;

  final int[] first;
  int[] head = new int[64];
  int[] mate = new int[64];
  byte[] against = new byte[64];
  long[] room = new long[64];

  /** The network's number of each half-arc of the part. */
  private int[] half = new int[64];

  TightPart(ArcNetwork net, long[] time, Reached reached) {
    this.net = net;
    this.time = time;
    this.reached = reached;
    numberOf = new int[net.events()];
    halfOf = new int[net.head.length];
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
    for (int v = 0; v < events; v++) {
      takeThoseLeadingTo(event[v]);
    }
    if (numberOf[from] != OUTSIDE) {
      copyHalves(to);
    }
    return numberOf[from];
  }

  private void take(int here) {
    numberOf[here] = events;
    event[events++] = here;
  }

  private void takeThoseLeadingTo(int here) {
    for (int out = net.first[here]; out < net.first[here + 1]; out++) {
      int tail = net.head[out];
      if (numberOf[tail] == OUTSIDE
          && time[here] + net.length[out] == time[tail]
          && reached.holds(tail)
          && net.room[net.mate[out]] > 0) {
        take(tail);
      }
    }
  }

  private void copyHalves(int to) {
    int halves = 0;
    for (int v = 0; v < events; v++) {
      first[v] = halves;
      int tail = event[v];
      for (int out = net.first[tail]; out < net.first[tail + 1]; out++) {
        int next = net.head[out];
        if (numberOf[next] != OUTSIDE && time[tail] + net.length[out] == time[next]) {
          makeRoomFor(halves);
          half[halves] = out;
          halfOf[out] = halves;
          head[halves] = numberOf[next];
          room[halves] = net.room[out];
          against[halves] = (byte) (tail < next || next == to ? 0 : 1);
          halves++;
        }
      }
    }
    first[events] = halves;
    for (int h = 0; h < halves; h++) {
      mate[h] = halfOf[net.mate[half[h]]];
    }
  }

  private void makeRoomFor(int halves) {
    if (halves == half.length) {
      int more = 2 * halves;
      half = Arrays.copyOf(half, more);
      head = Arrays.copyOf(head, more);
      mate = Arrays.copyOf(mate, more);
      room = Arrays.copyOf(room, more);
      against = Arrays.copyOf(against, more);
    }
  }

  int events() {
    return events;
  }

  int tail(int h) {
    return head[mate[h]];
  }

  /** The network's number of a half-arc. */
  int half(int h) {
    return half[h];
  }

  /** Sends {@code amount} over a half-arc. */
  void send(int h, long amount) {
    shift(h, -amount);
    shift(mate[h], amount);
  }

  private void shift(int h, long amount) {
    if (room[h] != UNLIMITED) {
      room[h] += amount;
    }
  }

  /** Tells the network what has been sent. */
  void putBack() {
    for (int h = 0; h < first[events]; h++) {
      net.room[half[h]] = room[h];
    }
  }
}
