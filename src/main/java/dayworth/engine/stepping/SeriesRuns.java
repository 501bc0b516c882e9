package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;

import java.util.Arrays;
import java.util.stream.IntStream;

/**
 * A {@link TightPart} with what lies in series drawn together: only the goal, the source and events
 * at which more than two others meet are left as junctions, and between them runs of half-links.
 *
 * <p>What flows into an event from one side flows on to the other, so a run has as much room as its
 * narrowest place, in either direction. Of ten events of a large network eight lie in series and
 * one is a dead end; the flow is found among the rest and then sent over every link of its runs.
 * Runs that lead nowhere or back to where they begin are left without room.
 *
 * <ul>
 *   <li>{@code first[j] .. first[j + 1] - 1} are the half-runs that leave junction j; junction 0 is
 *       the goal;
 *   <li>{@code head[r]} is the junction that half-run r leads to, {@code mate[r]} the same run from
 *       there, {@code room[r]} how much more can flow over it;
 *   <li>{@code against[r]} is one if half-run r goes against the order of the work, else zero.
 * </ul>
 *
 * <p>Making it costs the half-links of the part.
 */
final class SeriesRuns {

  private static final int NONE = -1;
  private static final int IN_SERIES = -1;
  private static final int DEAD_END = -2;

  private final TightPart part;

  /** The number of each event of the part that is a junction; of others what they are. */
  private final int[] junctionOf;

  /** The event of each junction. */
  private final int[] event;

  private int junctions;

  final int[] first;
  int[] head = new int[64];
  int[] mate = new int[64];
  byte[] against = new byte[64];
  long[] room = new long[64];

  /** What was sent over each half-run, less what was sent over its mate. */
  private long[] sent = new long[64];

  /** The first half-link of each half-run. */
  private int[] start = new int[64];

  /** The half-run that begins with each half-link; only those at junctions hold. */
  private int[] runFrom = new int[64];

  SeriesRuns(TightPart part, int events) {
    this.part = part;
    junctionOf = new int[events];
    event = new int[events];
    first = new int[events + 1];
  }

  /**
   * Draws the part together as it is now.
   *
   * @param source an event of the part
   * @return its junction
   */
  int draw(int source) {
    findJunctions(source);
    listRuns();
    for (int j = 0; j < junctions; j++) {
      for (int run = first[j]; run < first[j + 1]; run++) {
        if (mate[run] == NONE) {
          walk(j, run);
        }
      }
    }
    return junctionOf[source];
  }

  int junctions() {
    return junctions;
  }

  private void findJunctions(int source) {
    junctions = 0;
    for (int v = 0; v < part.events(); v++) {
      int links = part.first[v + 1] - part.first[v];
      if (links > 2 || v == TightPart.GOAL || v == source) {
        event[junctions] = v;
        junctionOf[v] = junctions++;
      } else {
        junctionOf[v] = links == 2 ? IN_SERIES : DEAD_END;
      }
    }
  }

  private void listRuns() {
    int links = part.first[part.events()];
    if (runFrom.length < links) {
      runFrom = new int[2 * links];
    }
    int runs = 0;
    for (int j = 0; j < junctions; j++) {
      first[j] = runs;
      int end = part.first[event[j] + 1];
      for (int half = part.first[event[j]]; half < end; half++) {
        makeRoomFor(runs);
        start[runs] = half;
        mate[runs] = NONE;
        sent[runs] = 0;
        runFrom[half] = runs++;
      }
    }
    first[junctions] = runs;
  }

  private void makeRoomFor(int runs) {
    if (runs == start.length) {
      int more = 2 * runs;
      start = Arrays.copyOf(start, more);
      head = Arrays.copyOf(head, more);
      mate = Arrays.copyOf(mate, more);
      room = Arrays.copyOf(room, more);
      sent = Arrays.copyOf(sent, more);
      against = Arrays.copyOf(against, more);
    }
  }

  /** Follows a run to the junction at its other end. */
  private void walk(int from, int run) {
    long ahead = UNLIMITED;
    long back = UNLIMITED;
    int half = start[run];
    int last = half;
    while (half != NONE) {
      ahead = Math.min(ahead, part.room[half]);
      back = Math.min(back, part.room[part.mate[half]]);
      last = half;
      half = after(half);
    }
    int to = junctionOf[part.head[last]];
    if (to == DEAD_END || to == from) {
      close(from, run);
    } else {
      int other = runFrom[part.mate[last]];
      put(run, other, to, ahead, isAgainst(from, to));
      put(other, run, from, back, isAgainst(to, from));
    }
  }

  /** The half-link with which a run goes on; none where it ends. */
  private int after(int half) {
    int here = part.head[half];
    if (junctionOf[here] != IN_SERIES) {
      return NONE;
    }
    int one = part.first[here];
    return part.mate[half] == one ? one + 1 : one;
  }

  private boolean isAgainst(int from, int to) {
    return to != TightPart.GOAL && part.event(event[from]) > part.event(event[to]);
  }

  private void put(int run, int other, int to, long amount, boolean isAgainst) {
    head[run] = to;
    mate[run] = other;
    room[run] = amount;
    against[run] = (byte) (isAgainst ? 1 : 0);
  }

  private void close(int from, int run) {
    put(run, run, from, 0, false);
  }

  int tail(int run) {
    return head[mate[run]];
  }

  /** Sends {@code amount} over a half-run. */
  void send(int run, long amount) {
    shift(run, -amount);
    shift(mate[run], amount);
    sent[run] += amount;
    sent[mate[run]] -= amount;
  }

  private void shift(int run, long amount) {
    if (room[run] != UNLIMITED) {
      room[run] += amount;
    }
  }

  /** Sends through the part what has been sent over its runs. */
  void putBack() {
    for (int run = 0; run < first[junctions]; run++) {
      if (sent[run] > 0) {
        for (int half = start[run]; half != NONE; half = after(half)) {
          part.send(half, sent[run]);
        }
      }
    }
  }

  /** The half-links of a half-run, from first to last. */
  IntStream links(int run) {
    return IntStream.iterate(start[run], half -> half >= 0, this::after);
  }
}
