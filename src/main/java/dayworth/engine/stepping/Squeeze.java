package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;

import java.util.ArrayList;
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
 * minimum cuts is Phillips and Dessouky 1977). A tree holds the events that are reached from {@code
 * from} over half-arcs with room and no slack. While {@code to} is outside, the tree moves later as
 * one until the next half-arc out of it becomes tight, and grows over it: the half-arcs between
 * tree and rest are a minimum cut, and what flows over it is the price of a tick. When {@code to}
 * is reached, as much as the path has room for is sent along it; what hung on a half-arc that is
 * now full is hung elsewhere in the tree or leaves it. So a step touches only what it changes.
 *
 * <p><b>Invariant.</b> Every half-arc with room is kept by the times; half-arcs with flow in both
 * directions have no slack; so times and flow are cheapest for the present t(to) − t(from).
 *
 * <p><b>Cost.</b> Each event that joins or leaves costs its half-arcs and their places in a heap.
 * All numbers are whole.
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

  private static final int NONE = -1;

  private final ArcNetwork net;

  /** Of an event outside the tree its time; of one inside its time less the present shift. */
  private final long[] time;

  private final TightTree tree;
  private final EventHeap heap = new EventHeap();

  /** Half-arcs out of the tree that are tight already, in the order in which they were found. */
  private int[] tight = new int[64];

  private int tightRead;
  private int tightWrite;

  private long shift;
  private long sent;

  Squeeze(ArcNetwork net, long[] times) {
    this.net = net;
    this.time = times.clone();
    this.tree = new TightTree(net, time);
  }

  /** The present time of an event. */
  long time(int event) {
    return tree.holds(event) ? time[event] + shift : time[event];
  }

  /** How much the last squeeze sent. */
  long sent() {
    return sent;
  }

  /** The half-arcs of the path that holds the events apart, from first to last. */
  List<Integer> heldBy(int to) {
    List<Integer> path = new ArrayList<>();
    for (int half = tree.into(to); half != NONE; half = tree.into(tail(half))) {
      path.add(0, half);
    }
    return path;
  }

  /**
   * Brings {@code to} closer to {@code from}.
   *
   * @param most how much may be sent in all
   * @param close the difference of times at which to stop
   */
  End run(int from, int to, long most, long close, Listener listener) {
    settle();
    sent = 0;
    join(from, NONE);
    long told = UNLIMITED;
    while (sent < most) {
      if (!reach(from, to, close)) {
        return End.CLOSE_ENOUGH;
      }
      long length = time(to) - time(from);
      if (length <= close) {
        return End.CLOSE_ENOUGH;
      }
      if (length < told) {
        listener.arrived(length);
      }
      if (!augment(to, most)) {
        return End.HELD;
      }
      told = length;
      if (!tree.holds(to)) {
        listener.priced(length, sent);
      }
    }
    return End.AMOUNT_SENT;
  }

  /** Takes the tree apart; its events keep the times they have come to. */
  void settle() {
    tree.clear(shift);
    heap.clear();
    tightRead = 0;
    tightWrite = 0;
    shift = 0;
  }

  /** Grows the tree until it holds {@code to}; false if the events came close enough before. */
  private boolean reach(int from, int to, long close) {
    while (!tree.holds(to)) {
      if (tightRead < tightWrite) {
        int half = tight[tightRead++];
        if (isTightNow(half)) {
          join(net.head[half], half);
        }
        continue;
      }
      tightRead = 0;
      tightWrite = 0;
      long enough = time[to] - time[from] - close;
      if (heap.isEmpty() || heap.leastKey() > enough) {
        shift = Math.max(shift, enough);
        return false;
      }
      long key = heap.leastKey();
      int half = heap.pop();
      if (leavesTree(half) && key == shiftWhenTight(half)) {
        shift = key;
        join(net.head[half], half);
      }
    }
    return true;
  }

  private boolean isTightNow(int half) {
    return leavesTree(half) && shiftWhenTight(half) == shift;
  }

  private boolean leavesTree(int half) {
    return net.room[half] > 0 && !tree.holds(net.head[half]) && tree.holds(tail(half));
  }

  private long shiftWhenTight(int half) {
    return time[net.head[half]] - time[tail(half)] - net.length[half];
  }

  private int tail(int half) {
    return net.head[net.mate[half]];
  }

  private void join(int event, int half) {
    time[event] -= shift;
    tree.add(event, half);
    for (int out = net.first[event]; out < net.first[event + 1]; out++) {
      if (net.room[out] > 0 && !tree.holds(net.head[out])) {
        await(out);
      }
    }
  }

  private void await(int half) {
    long key = shiftWhenTight(half);
    if (key > shift) {
      heap.push(key, half);
      return;
    }
    if (tightWrite == tight.length) {
      tight = Arrays.copyOf(tight, 2 * tightWrite);
    }
    tight[tightWrite++] = half;
  }

  /** Sends what the tree's path to an event has room for; false if that has no limit. */
  private boolean augment(int to, long most) {
    long amount = most == UNLIMITED ? UNLIMITED : most - sent;
    for (int half = tree.into(to); half != NONE; half = tree.into(tail(half))) {
      amount = Math.min(amount, net.room[half]);
    }
    if (amount == UNLIMITED) {
      return false;
    }
    sent += amount;
    for (int half = tree.into(to); half != NONE; half = tree.into(tail(half))) {
      net.send(half, amount);
      if (net.room[half] == 0) {
        tree.cut(net.head[half]);
      }
    }
    tree.mend();
    leave();
    return true;
  }

  /** Lets go of the events that found no other place in the tree. */
  private void leave() {
    for (int k = 0; k < tree.lostCount(); k++) {
      time[tree.lost(k)] += shift;
    }
    for (int k = 0; k < tree.lostCount(); k++) {
      int event = tree.lost(k);
      for (int out = net.first[event]; out < net.first[event + 1]; out++) {
        int in = net.mate[out];
        if (net.room[in] > 0 && tree.holds(net.head[out])) {
          await(in);
        }
      }
    }
  }
}
