package dayworth.engine.stepping;

/**
 * The events that are reached from one event over half-arcs with room and no slack.
 *
 * <p>Events are added as they are reached; after flow has taken room away, {@link #sweep} finds
 * anew what is still reached, and the rest is lost. A sweep costs the half-arcs of all events held.
 */
final class Reached {

  private static final byte OUTSIDE = 0;
  private static final byte HELD = 1;

  /** Held before the sweep and not yet reached again. */
  private static final byte IN_DOUBT = 2;

  private final ArcNetwork net;
  private final long[] time;
  private final byte[] state;

  /** The events held, in the order in which they were reached. */
  private int[] members;

  private int count;

  /** What the last sweep lost. */
  private int[] lost;

  private int lostCount;

  Reached(ArcNetwork net, long[] time) {
    this.net = net;
    this.time = time;
    state = new byte[net.events()];
    members = new int[net.events()];
    lost = new int[net.events()];
  }

  boolean holds(int event) {
    return state[event] == HELD;
  }

  void add(int event) {
    state[event] = HELD;
    members[count++] = event;
  }

  /** Keeps what can still be reached from the first event that was added. */
  void sweep() {
    int[] before = members;
    int countBefore = count;
    for (int k = 0; k < countBefore; k++) {
      state[before[k]] = IN_DOUBT;
    }
    members = lost;
    count = 0;
    add(before[0]);
    for (int read = 0; read < count; read++) {
      reachFrom(members[read]);
    }
    lost = before;
    lostCount = 0;
    for (int k = 0; k < countBefore; k++) {
      if (state[before[k]] == IN_DOUBT) {
        state[before[k]] = OUTSIDE;
        lost[lostCount++] = before[k];
      }
    }
  }

  private void reachFrom(int tail) {
    for (int half = net.first[tail]; half < net.first[tail + 1]; half++) {
      int head = net.head[half];
      if (state[head] == IN_DOUBT
          && net.room[half] > 0
          && time[tail] + net.length[half] == time[head]) {
        add(head);
      }
    }
  }

  int lostCount() {
    return lostCount;
  }

  int lost(int k) {
    return lost[k];
  }

  /** Lets go of all events; they move by {@code shift}. */
  void clear(long shift) {
    for (int k = 0; k < count; k++) {
      time[members[k]] += shift;
      state[members[k]] = OUTSIDE;
    }
    count = 0;
    lostCount = 0;
  }
}
