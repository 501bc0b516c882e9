package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;

import java.util.Arrays;
import java.util.List;

/**
 * A maximum flow between two events over half-arcs without slack.
 *
 * <p>Dinitz 1970 ("Algorithm for solution of a problem of maximum flow in networks with power
 * estimation") on the junctions and runs of a {@link TightPart}, with another measure of distance:
 * events are numbered in the order of the work, and only runs that go against that order count. A
 * path then has distance zero unless it takes flow back, so a few rounds block all paths where
 * counting every run would need a round for each length of path. Runs that keep the distance and
 * the order, and those that come one nearer, make no cycle; so flow is sent along them until every
 * path is blocked, and the distance grows from round to round.
 *
 * <p>A round costs the runs of the junctions that can reach the goal and the lengths of its paths.
 */
final class TightFlow {

  private static final int FAR = Integer.MAX_VALUE;
  private static final int GOAL = TightPart.GOAL;

  private final TightPart part;
  private final SeriesRuns runs;

  /** How many runs against the order lie between a junction and the goal. */
  private final int[] distance;

  /** Junctions at the present distance whose runs are still to be looked at. */
  private final int[] open;

  /** Junctions one farther; some may prove to be nearer. */
  private int[] farther = new int[64];

  private int fartherCount;

  /** The next half-run of each junction to try. */
  private final int[] next;

  /** The half-runs of the present path. */
  private final int[] path;

  private int pathLength;
  private boolean isHeld;

  TightFlow(TightPart part, int events) {
    this.part = part;
    runs = new SeriesRuns(part, events);
    distance = new int[events];
    open = new int[events];
    next = new int[events];
    path = new int[events];
  }

  /**
   * Sends as much from an event of the part to its goal as there is room for.
   *
   * @param most at most so much
   * @return what was sent; {@link #isHeld} tells if a path without limit was met
   */
  long send(int from, long most) {
    isHeld = false;
    long sent = 0;
    int source = runs.draw(from);
    while (sent < most && !isHeld && measure(source)) {
      sent += block(source, most == UNLIMITED ? UNLIMITED : most - sent);
    }
    runs.putBack();
    return sent;
  }

  /** Whether a path without limit holds the two events apart. */
  boolean isHeld() {
    return isHeld;
  }

  /** The half-arcs of the path without limit, from first to last. */
  List<Integer> heldBy() {
    return Arrays.stream(path, 0, pathLength)
        .flatMap(runs::links)
        .map(part::unlimited)
        .boxed()
        .toList();
  }

  /** Measures distances to the goal, round by round, until that of {@code source} is known. */
  private boolean measure(int source) {
    Arrays.fill(distance, 0, runs.junctions(), FAR);
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

  /** Finds all junctions at one distance, and those that may be one farther. */
  private void spread(int countAtFirst, int far) {
    int openCount = countAtFirst;
    fartherCount = 0;
    while (openCount > 0) {
      int here = open[--openCount];
      for (int out = runs.first[here]; out < runs.first[here + 1]; out++) {
        int tail = runs.head[out];
        int in = runs.mate[out];
        if (distance[tail] == FAR && runs.room[in] > 0) {
          if (runs.against[in] == 0) {
            know(tail, far);
            open[openCount++] = tail;
          } else {
            perhapsFarther(tail);
          }
        }
      }
    }
  }

  private void perhapsFarther(int junction) {
    if (fartherCount == farther.length) {
      farther = Arrays.copyOf(farther, 2 * fartherCount);
    }
    farther[fartherCount++] = junction;
  }

  private void know(int junction, int far) {
    distance[junction] = far;
    next[junction] = runs.first[junction];
  }

  /** Blocks every path on which each run keeps the order or comes one nearer to the goal. */
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
        here = runs.head[path[pathLength - 1]];
      } else if (pathLength == 0) {
        return sent;
      } else {
        here = runs.tail(path[--pathLength]);
        next[here]++;
      }
    }
    return sent;
  }

  /** Goes on over the next half-run that leads towards the goal. */
  private boolean advance(int here) {
    int end = runs.first[here + 1];
    for (int run = next[here]; run < end; run++) {
      if (distance[runs.head[run]] == distance[here] - runs.against[run] && runs.room[run] > 0) {
        next[here] = run;
        path[pathLength++] = run;
        return true;
      }
    }
    next[here] = end;
    return false;
  }

  private long roomOnPath(long most) {
    long room = most;
    for (int k = 0; k < pathLength; k++) {
      room = Math.min(room, runs.room[path[k]]);
    }
    return room;
  }

  /** Sends along the path and goes back to before its first half-run that is full. */
  private int sendOnPath(long amount) {
    int whole = pathLength - 1;
    for (int k = pathLength - 1; k >= 0; k--) {
      runs.send(path[k], amount);
      if (runs.room[path[k]] == 0) {
        whole = k;
      }
    }
    pathLength = whole;
    return runs.tail(path[whole]);
  }
}
