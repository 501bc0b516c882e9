package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;

import java.util.Arrays;
import java.util.List;

/**
 * Brings two events of a network closer together, always at the least price: the one primitive from
 * which curves, cheaper crash costs and the choice among ties are made.
 *
 * <p><b>Problem.</b> Event times t and a flow are given for which every half-arc u→v that has room
 * is kept: t(v) − t(u) ≥ its length. Make t(to) − t(from) smaller, at the least cost.
 *
 * <p><b>Method.</b> Primal-dual successive longest paths (Kelley 1961; Fulkerson 1961; the view by
 * minimum cuts is Phillips and Dessouky 1977). A set of events holds all that are reached from
 * {@code from} over half-arcs with room and no slack. While {@code to} is outside, the set moves
 * later as one until the next half-arc out of it becomes tight, and grows over it: the half-arcs
 * between set and rest are a minimum cut, and what flows over it is the price of a tick. When
 * {@code to} has joined, a maximum flow is sent over the half-arcs without slack ({@link
 * TightFlow}), and the events that still lead to {@code to} leave the set. Others stay, though some
 * may not be reached any more: moving them along costs nothing and saves most of them from leaving
 * and joining again. Only when {@code to} joins by way of one of these, all such are let go of.
 *
 * <p><b>Invariant.</b> Every half-arc with room is kept by the times, and where the set waits, none
 * without slack leads out of it; half-arcs with flow in both directions have no slack; so times and
 * flow are cheapest for the present t(to) − t(from).
 *
 * <p><b>Cost.</b> For each change of price the half-arcs of the events that move and lead to {@code
 * to}, a few times over; for each event that joins or leaves its half-arcs and their places in a
 * queue; at most once for each change of price the half-arcs of all that move. All numbers are
 * whole.
 */
final class Squeeze {

  /** Is told of every length at which the price changes. */
  interface Listener {

    /** Wants to know nothing. */
    Listener NONE =
        new Listener() {
          @Override
          public void arrived(long length) {}

          @Override
          public void priced(long length, long price) {}
        };

    /** The events have come to {@code length} of each other at the old price. */
    void arrived(long length);

    /** From {@code length} on the next tick costs {@code price}. */
    void priced(long length, long price);
  }

  /** Why a squeeze ended. */
  enum End {
    /** The events are as close as was asked. */
    CLOSE_ENOUGH,
    /** As much flow as was allowed has been sent. */
    AMOUNT_SENT,
    /** A path without limit holds the events apart; see {@link #heldBy}. */
    HELD
  }

  private final ArcNetwork net;

  /** Of an event that does not move its time; of one that does its time less the present shift. */
  private final long[] time;

  private final MovingSet moving;
  private final TightPart part;
  private final TightFlow flow;
  private final ArrivalQueue queue = new ArrivalQueue();

  /** Half-arcs out of the set that are tight already. */
  private int[] tight = new int[64];

  private int tightCount;

  private long shift;
  private long sent;

  Squeeze(ArcNetwork net, long[] times) {
    this.net = net;
    this.time = times.clone();
    this.moving = new MovingSet(net, time);
    this.part = new TightPart(net, time, moving);
    this.flow = new TightFlow(part, net.events());
  }

  /** The present time of an event. */
  long time(int event) {
    return moving.holds(event) ? time[event] + shift : time[event];
  }

  /** How much the last squeeze sent. */
  long sent() {
    return sent;
  }

  /** The half-arcs of the path that holds the events apart, from first to last. */
  List<Integer> heldBy() {
    return flow.heldBy();
  }

  /**
   * Brings {@code to} closer to {@code from}.
   *
   * @param most how much may be sent in all
   * @param close the difference of times at which to stop
   */
  End run(int from, int to, long most, long close, Listener listener) {
    settle();
    join(from);
    return goOn(from, to, most, close, listener);
  }

  /**
   * Goes on from where the last run stopped, which was with the same two events and nothing set
   * since.
   */
  End goOn(int from, int to, long most, long close, Listener listener) {
    sent = 0;
    while (sent < most) {
      if (!reach(from, to, close) || time(to) - time(from) <= close) {
        return End.CLOSE_ENOUGH;
      }
      int source = part.pick(from, to);
      if (source < 0) {
        moving.sweep();
        leave();
        continue;
      }
      long length = time(to) - time(from);
      listener.arrived(length);
      sent += flow.send(source, most == UNLIMITED ? UNLIMITED : most - sent);
      if (flow.isHeld()) {
        return End.HELD;
      }
      listener.priced(length, sent);
      if (sent < most) {
        part.letGoOfLeading();
        leave();
      }
    }
    return End.AMOUNT_SENT;
  }

  /** Lets go of all events; they keep the times they have come to. */
  void settle() {
    moving.clear(shift);
    queue.clear();
    tightCount = 0;
    shift = 0;
  }

  /** The times of all events; only after {@link #settle}. */
  long[] times() {
    return time.clone();
  }

  /** Sets the times of all events; only after {@link #settle}. */
  void goBackTo(long[] times) {
    System.arraycopy(times, 0, time, 0, time.length);
  }

  /** Grows the set until it holds {@code to}; false if the events came close enough before. */
  private boolean reach(int from, int to, long close) {
    while (true) {
      spread();
      if (moving.holds(to)) {
        return true;
      }
      long enough = time[to] - time[from] - close;
      if (queue.isEmpty() || queue.leastKey() > enough) {
        shift = Math.max(shift, enough);
        return false;
      }
      shift = queue.leastKey();
    }
  }

  /** Adds all that is reached from the set at the present shift. */
  private void spread() {
    while (tightCount > 0 || (!queue.isEmpty() && queue.leastKey() <= shift)) {
      int half = tightCount > 0 ? tight[--tightCount] : queue.pop();
      int tail = net.head[net.mate[half]];
      int head = net.head[half];
      if (!moving.holds(head)
          && moving.holds(tail)
          && net.room[half] > 0
          && time[head] - time[tail] - net.length[half] == shift) {
        join(head);
      }
    }
  }

  private void join(int event) {
    time[event] -= shift;
    moving.add(event);
    for (int out = net.first[event]; out < net.first[event + 1]; out++) {
      int head = net.head[out];
      if (net.room[out] > 0 && !moving.holds(head)) {
        await(out, time[head] - time[event] - net.length[out]);
      }
    }
  }

  private void await(int half, long key) {
    if (key > shift) {
      queue.push(key, half);
      return;
    }
    if (tightCount == tight.length) {
      tight = Arrays.copyOf(tight, 2 * tightCount);
    }
    tight[tightCount++] = half;
  }

  /** Gives the events that were let go of their own time again. */
  private void leave() {
    for (int k = 0; k < moving.lostCount(); k++) {
      time[moving.lost(k)] += shift;
    }
    for (int k = 0; k < moving.lostCount(); k++) {
      int event = moving.lost(k);
      for (int out = net.first[event]; out < net.first[event + 1]; out++) {
        int in = net.mate[out];
        int tail = net.head[out];
        if (net.room[in] > 0 && moving.holds(tail)) {
          queue.push(time[event] - time[tail] - net.length[in], in);
        }
      }
    }
  }
}
