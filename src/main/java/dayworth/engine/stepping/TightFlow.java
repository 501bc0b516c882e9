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

  /** The goal's number in the part. */
  private static final int GOAL = 0;

  private final TightPart part;

  /** How many half-arcs against the order lie between an event and the goal. */
  private final int[] distance;

  /** Events at the present distance whose half-arcs are still to be looked at. */
  private final int[] open;

  /** Events one farther; some may prove to be nearer. */
  private int[] farther = new int[64];

  private int fartherCount;

  /** The next half-arc of each event to try. */
  private final int[] next;

  /** The half-arcs of the present path. */
  private final int[] path;

  private int pathLength;
  private boolean isHeld;

  TightFlow(ArcNetwork net, long[] time, Reached reached) {
    part = new TightPart(net, time, reached);
    int events = net.events();
    distance = new int[events];
    open = new int[events];
    next = new int[events];
    path = new int[events];
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
    int source = part.pick(from, to);
    if (source < 0) {
      return sent;
    }
    while (sent < most && !isHeld && measure(source)) {
      sent += block(source, most == UNLIMITED ? UNLIMITED : most - sent);
    }
    part.putBack();
    return sent;
  }

  /** Whether a path without limit holds the two events apart. */
  boolean isHeld() {
    return isHeld;
  }

  /** The half-arcs of the path without limit, from first to last. */
  List<Integer> heldBy() {
    return Arrays.stream(path, 0, pathLength).map(part::half).boxed().toList();
  }

  /** Measures distances to the goal, round by round, until that of {@code source} is known. */
  private boolean measure(int source) {
    Arrays.fill(distance, 0, part.events(), FAR);
    int openCount = 1;
    open[0] = GOAL;
    know(GOAL, 0);
    for (int far = 0; openCount > 0; far++) {
      spread(openCount, far);
      if (distance[source] != FAR) {
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
  private void spread(int countAtFirst, int far) {
    int openCount = countAtFirst;
    fartherCount = 0;
    while (openCount > 0) {
      int here = open[--openCount];
      for (int out = part.first[here]; out < part.first[here + 1]; out++) {
        int tail = part.head[out];
        int in = part.mate[out];
        if (distance[tail] == FAR && part.room[in] > 0) {
          if (part.against[in] == 0) {
            know(tail, far);
            open[openCount++] = tail;
          } else {
            perhapsFarther(tail);
          }
        }
      }
    }
  }

  private void perhapsFarther(int event) {
    if (fartherCount == farther.length) {
      farther = Arrays.copyOf(farther, 2 * fartherCount);
    }
    farther[fartherCount++] = event;
  }

  private void know(int event, int far) {
    distance[event] = far;
    next[event] = part.first[event];
  }

  /** Blocks every path on which each half-arc keeps the order or comes one nearer to the goal. */
  private long block(int source, long most) {
    long sent = 0;
    pathLength = 0;
    int here = source;
    while (sent < most) {
      if (here == GOAL) {
        long amount = roomOnPath(most == UNLIMITED ? UNLIMITED : most - sent);
        if (amount == UNLIMITED) {
          isHeld = true;
          return sent;
        }
        sent += amount;
        here = sendOnPath(amount);
      } else if (advance(here)) {
        here = part.head[path[pathLength - 1]];
      } else if (pathLength == 0) {
        return sent;
      } else {
        here = part.tail(path[--pathLength]);
        next[here]++;
      }
    }
    return sent;
  }

  /** Goes on over the next half-arc that leads towards the goal. */
  private boolean advance(int here) {
    int end = part.first[here + 1];
    for (int half = next[here]; half < end; half++) {
      if (distance[part.head[half]] == distance[here] - part.against[half] && part.room[half] > 0) {
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
      room = Math.min(room, part.room[path[k]]);
    }
    return room;
  }

  /** Sends along the path and goes back to before its first half-arc that is full. */
  private int sendOnPath(long amount) {
    int whole = pathLength - 1;
    for (int k = pathLength - 1; k >= 0; k--) {
      part.send(path[k], amount);
      if (part.room[path[k]] == 0) {
        whole = k;
      }
    }
    pathLength = whole;
    return part.tail(path[whole]);
  }
}
