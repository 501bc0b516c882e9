package dayworth.engine.stepping;

import java.util.Arrays;

/**
 * The events that are reached from a root over half-arcs with room and no slack, each with the
 * half-arc by which it hangs.
 *
 * <p>When half-arcs are full, all that hung on them is cut off; {@link #mend} hangs back what is
 * reached over another tight half-arc, and the rest is lost. Cost: the half-arcs of what was cut
 * off.
 */
final class TightTree {

  private static final int NONE = -1;
  private static final byte OUTSIDE = 0;
  private static final byte INSIDE = 1;
  private static final byte CUT_OFF = 2;

  private final ArcNetwork net;
  private final long[] time;
  private final byte[] state;

  /** The half-arc into each event of the tree; none for the root. */
  private final int[] into;

  /** The children of an event as a doubly linked list. */
  private final int[] firstChild;

  private final int[] nextChild;
  private final int[] previousChild;

  /** All events that joined since the tree was cleared; one may stand here twice. */
  private int[] joined = new int[64];

  private int joinedCount;

  /** What is cut off; after mending what is lost. */
  private int[] off = new int[64];

  private int offCount;

  private int lostCount;

  /** Events that were hung back and may hang back others. */
  private int[] queue = new int[64];

  private int queueCount;

  TightTree(ArcNetwork net, long[] time) {
    this.net = net;
    this.time = time;
    int events = net.events();
    state = new byte[events];
    into = new int[events];
    firstChild = new int[events];
    nextChild = new int[events];
    previousChild = new int[events];
    Arrays.fill(into, NONE);
    Arrays.fill(firstChild, NONE);
  }

  boolean holds(int event) {
    return state[event] == INSIDE;
  }

  /** The half-arc by which the event hangs, or -1 at the root. */
  int into(int event) {
    return into[event];
  }

  void add(int event, int half) {
    joined = with(joined, joinedCount++, event);
    hang(event, half);
  }

  /** Empties the tree; what it holds moves by {@code shift}. */
  void clear(long shift) {
    for (int k = 0; k < joinedCount; k++) {
      int event = joined[k];
      if (state[event] == INSIDE) {
        time[event] += shift;
      }
      state[event] = OUTSIDE;
      into[event] = NONE;
      firstChild[event] = NONE;
    }
    joinedCount = 0;
  }

  /** Cuts off an event with everything that hangs on it. */
  void cut(int event) {
    if (state[event] != INSIDE) {
      return;
    }
    unlink(event);
    int read = offCount;
    cutOff(event);
    while (read < offCount) {
      for (int child = firstChild[off[read++]]; child != NONE; child = nextChild[child]) {
        cutOff(child);
      }
    }
  }

  private void cutOff(int event) {
    state[event] = CUT_OFF;
    off = with(off, offCount++, event);
  }

  /** Hangs back what can be, and keeps the rest as lost. */
  void mend() {
    for (int k = 0; k < offCount; k++) {
      firstChild[off[k]] = NONE;
    }
    for (int k = 0; k < offCount; k++) {
      if (state[off[k]] == CUT_OFF) {
        hangBack(off[k]);
      }
    }
    int lost = 0;
    for (int k = 0; k < offCount; k++) {
      if (state[off[k]] == CUT_OFF) {
        state[off[k]] = OUTSIDE;
        into[off[k]] = NONE;
        off[lost++] = off[k];
      }
    }
    lostCount = lost;
    offCount = 0;
  }

  int lostCount() {
    return lostCount;
  }

  int lost(int k) {
    return off[k];
  }

  /** Hangs an event on the tree if it can be, then all cut-off events that can hang on it. */
  private void hangBack(int event) {
    for (int out = net.first[event]; out < net.first[event + 1]; out++) {
      int in = net.mate[out];
      int parent = net.head[out];
      if (net.room[in] > 0
          && state[parent] == INSIDE
          && time[parent] + net.length[in] == time[event]) {
        hang(event, in);
        queueCount = 0;
        queue = with(queue, queueCount++, event);
        spread();
        return;
      }
    }
  }

  private void spread() {
    for (int read = 0; read < queueCount; read++) {
      int parent = queue[read];
      for (int out = net.first[parent]; out < net.first[parent + 1]; out++) {
        int event = net.head[out];
        if (net.room[out] > 0
            && state[event] == CUT_OFF
            && time[parent] + net.length[out] == time[event]) {
          hang(event, out);
          queue = with(queue, queueCount++, event);
        }
      }
    }
  }

  private void hang(int event, int half) {
    state[event] = INSIDE;
    into[event] = half;
    if (half == NONE) {
      return;
    }
    int parent = net.head[net.mate[half]];
    int next = firstChild[parent];
    firstChild[parent] = event;
    nextChild[event] = next;
    previousChild[event] = NONE;
    if (next != NONE) {
      previousChild[next] = event;
    }
  }

  private void unlink(int event) {
    int next = nextChild[event];
    int previous = previousChild[event];
    if (previous == NONE) {
      firstChild[net.head[net.mate[into[event]]]] = next;
    } else {
      nextChild[previous] = next;
    }
    if (next != NONE) {
      previousChild[next] = previous;
    }
  }

  private static int[] with(int[] list, int size, int value) {
    int[] roomy = size < list.length ? list : Arrays.copyOf(list, 2 * size);
    roomy[size] = value;
    return roomy;
  }
}
