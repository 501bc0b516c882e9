package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;

import java.util.Arrays;
import java.util.List;

/**
 * A maximum flow between two events over half-arcs without slack.
 *
 * <p>Dinitz 1970 ("Algorithm for solution of a problem of maximum flow in networks with power
 * estimation"), with another measure of distance: events are numbered in the order of the work, and
 * only half-arcs that run against that order count. A path then has distance zero unless it takes
 * flow back, so a few rounds block all paths where counting every half-arc would need a round for
 * each length of path. Half-arcs that keep the distance and run with the order, and those that come
 * one nearer, make no cycle; so flow is sent along them until every path is blocked, and the
 * distance grows from round to round.
 *
 * <p>A round costs the half-arcs of the events that can reach the goal and the lengths of its
 * paths.
 */
final class TightFlow {

  private static final int FAR = Integer.MAX_VALUE;

  private final ArcNetwork net;
  private final long[] time;
  private final Reached reached;

  /** How many half-arcs against the order lie between an event and the goal. */
  private final int[] distance;

  /** The events whose distance is known, nearest first. */
  private final int[] measured;

  private int measuredCount;

  /** Events at the present distance whose half-arcs are still to be looked at. */
  private final int[] open;

  /** Events one farther; some may prove to be nearer. */
  private final int[] farther;

  /** The next half-arc of each event to try. */
  private final int[] next;

  /** The half-arcs of the present path. */
  private final int[] path;

  private int pathLength;
  private boolean isHeld;

  TightFlow(ArcNetwork net, long[] time, Reached reached) {
    this.net = net;
    this.time = time;
    this.reached = reached;
    int events = net.events();
    distance = new int[events];
    measured = new int[events];
    open = new int[events];
    farther = new int[net.head.length];
    next = new int[events];
    path = new int[events];
    Arrays.fill(distance, FAR);
  }

  /**
   * Sends as much as there is room for.
   *
   * @param most at most so much
   * @return what was sent; {@link #isHeld} tells if a path without limit was met
   */
  long send(int from, int to, long most) {
    isHeld = false;
    long sent = 0;
    while (sent < most && !isHeld && measure(from, to)) {
      sent += block(from, to, most == UNLIMITED ? UNLIMITED : most - sent);
    }
    return sent;
  }

  /** Whether a path without limit holds the two events apart. */
  boolean isHeld() {
    return isHeld;
  }

  /** The half-arcs of the path without limit, from first to last. */
  List<Integer> heldBy() {
    return Arrays.stream(path, 0, pathLength).boxed().toList();
  }

  /** Measures distances to the goal, round by round, until that of {@code from} is known. */
  private boolean measure(int from, int to) {
    for (int k = 0; k < measuredCount; k++) {
      distance[measured[k]] = FAR;
    }
    measuredCount = 0;
    int openCount = 1;
    open[0] = to;
    know(to, 0);
    for (int far = 0; openCount > 0; far++) {
      int fartherCount = spread(openCount, far, to);
      if (distance[from] != FAR) {
        return true;
      }
      openCount = 0;
      for (int k = 0; k < fartherCount; k++) {
        if (distance[farther[k]] == FAR) {
          know(farther[k], far + 1);
          open[openCount++] = farther[k];
        }
      }
    }
    return false;
  }

  /** Finds all events at one distance, and those that may be one farther. */
  private int spread(int countAtFirst, int far, int to) {
    int openCount = countAtFirst;
    int fartherCount = 0;
    while (openCount > 0) {
      int head = open[--openCount];
      for (int out = net.first[head]; out < net.first[head + 1]; out++) {
        int tail = net.head[out];
        if (distance[tail] == FAR
            && time[head] + net.length[out] == time[tail]
            && reached.holds(tail)
            && net.room[net.mate[out]] > 0) {
          if (isInOrder(tail, head, to)) {
            know(tail, far);
            open[openCount++] = tail;
          } else {
            farther[fartherCount++] = tail;
          }
        }
      }
    }
    return fartherCount;
  }

  private static boolean isInOrder(int tail, int head, int to) {
    return tail < head || head == to;
  }

  private void know(int event, int far) {
    distance[event] = far;
    next[event] = net.first[event];
    measured[measuredCount++] = event;
  }

  /** Blocks every path on which each half-arc keeps the order or comes one nearer to the goal. */
  private long block(int from, int to, long most) {
    long sent = 0;
    pathLength = 0;
    int here = from;
    while (sent < most) {
      if (here == to) {
        long amount = roomOnPath(most == UNLIMITED ? UNLIMITED : most - sent);
        if (amount == UNLIMITED) {
          isHeld = true;
          return sent;
        }
        sent += amount;
        here = sendOnPath(amount);
      } else if (advance(here, to)) {
        here = net.head[path[pathLength - 1]];
      } else if (pathLength == 0) {
        return sent;
      } else {
        here = tail(path[--pathLength]);
        next[here]++;
      }
    }
    return sent;
  }

  /** Goes on over the next half-arc that leads towards the goal. */
  private boolean advance(int here, int to) {
    int end = net.first[here + 1];
    for (int half = next[here]; half < end; half++) {
      int head = net.head[half];
      int nearer = isInOrder(here, head, to) ? 0 : 1;
      if (distance[head] == distance[here] - nearer
          && net.room[half] > 0
          && time[here] + net.length[half] == time[head]) {
        next[here] = half;
        path[pathLength++] = half;
        return true;
      }
    }
    next[here] = end;
    return false;
  }

  private long roomOnPath(long most) {
    long room = most;
    for (int k = 0; k < pathLength; k++) {
      room = Math.min(room, net.room[path[k]]);
    }
    return room;
  }

  /** Sends along the path and goes back to before its first half-arc that is full. */
  private int sendOnPath(long amount) {
    int whole = pathLength - 1;
    for (int k = pathLength - 1; k >= 0; k--) {
      net.send(path[k], amount);
      if (net.room[path[k]] == 0) {
        whole = k;
      }
    }
    pathLength = whole;
    return tail(path[whole]);
  }

  private int tail(int half) {
    return net.head[net.mate[half]];
  }
}
