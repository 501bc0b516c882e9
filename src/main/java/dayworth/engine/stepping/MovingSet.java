package dayworth.engine.stepping;

/**
 * The events that a {@link Squeeze} moves as one.
 *
 * <p>All events that are reached from the first one over half-arcs with room and no slack are held.
 * So may others be that were reached before flow took room away: to find out costs the half-arcs of
 * all events held, and most will be reached again soon. {@link #sweep} finds out.
 */
final class MovingSet {

  private static final byte OUTSIDE = 0;
  private static final byte HELD = 1;

  /** Held before the sweep and not yet reached again. */
  private static final byte IN_DOUBT = 2;

  /** Not held any more, but still among the members. */
  private static final byte LET_GO = 3;

  private final ArcNetwork net;
  private final long[] time;
  private final byte[] state;

  /** The events held and some that were let go of, in the order in which they were added. */
  private int[] members;

  private int count;

  /** What the set lost last. */
  private int[] lost;

  private int lostCount;

  MovingSet(ArcNetwork net, long[] time) {
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
    if (state[event] != LET_GO) {
      members[count++] = event;
    }
    state[event] = HELD;
  }

  /** Begins a new list of what is lost. */
  void forgetLost() {
    lostCount = 0;
  }

  void letGo(int event) {
    state[event] = LET_GO;
    lost[lostCount++] = event;
  }

  /** Keeps what can still be reached from the first event that was added. */
  void sweep() {
    int[] before = members;
    int countBefore = count;
    for (int k = 0; k < countBefore; k++) {
      state[before[k]] = state[before[k]] == HELD ? IN_DOUBT : OUTSIDE;
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
      int event = members[k];
      if (state[event] == HELD) {
        time[event] += shift;
      }
      state[event] = OUTSIDE;
    }
    count = 0;
    lostCount = 0;
  }
}
