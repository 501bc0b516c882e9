package dayworth.engine.stepping;

import java.util.Arrays;

/**
 * Events and arcs between them, with the flow over each arc: the residual network.
 *
 * <p>An arc from u to v with length w says that v comes at least w ticks after u; falling short by
 * a tick costs the arc's capacity, or is impossible where that is {@link #UNLIMITED}. Each arc is
 * stored as two half-arcs, one at each end, so that all half-arcs at an event lie side by side:
 *
 * <ul>
 *   <li>{@code first[v] .. first[v + 1] - 1} are the half-arcs that leave event v;
 *   <li>{@code head[h]} is the event that half-arc h leads to, {@code mate[h]} its other half;
 *   <li>{@code length[h]} is the arc's length, negative on the half that runs backwards;
 *   <li>{@code room[h]} is how much more can flow over it: capacity less flow forwards, the flow
 *       itself backwards.
 * </ul>
 */
final class ArcNetwork {

  /** More than any flow; room of this size never shrinks. */
  static final long UNLIMITED = Long.MAX_VALUE;

  final int[] first;
  final int[] head;
  final int[] mate;
  final long[] length;
  final long[] room;

  /** The forward half of each arc, by the order in which arcs were added. */
  private final int[] forward;

  private ArcNetwork(Builder arcs, int events) {
    int halves = 2 * arcs.size;
    first = new int[events + 1];
    head = new int[halves];
    mate = new int[halves];
    length = new long[halves];
    room = new long[halves];
    forward = new int[arcs.size];
    for (int a = 0; a < arcs.size; a++) {
      first[arcs.from[a] + 1]++;
      first[arcs.to[a] + 1]++;
    }
    for (int v = 0; v < events; v++) {
      first[v + 1] += first[v];
    }
    int[] next = Arrays.copyOf(first, events);
    for (int a = 0; a < arcs.size; a++) {
      int ahead = next[arcs.from[a]]++;
      int back = next[arcs.to[a]]++;
      forward[a] = ahead;
      put(ahead, back, arcs.to[a], arcs.lengths[a], arcs.capacities[a]);
      put(back, ahead, arcs.from[a], -arcs.lengths[a], 0);
    }
  }

  private void put(int half, int other, int to, long ticks, long amount) {
    head[half] = to;
    mate[half] = other;
    length[half] = ticks;
    room[half] = amount;
  }

  int events() {
    return first.length - 1;
  }

  int arcs() {
    return forward.length;
  }

  /** The arc of each half-arc. */
  int[] arcOfHalf() {
    int[] arcOf = new int[head.length];
    for (int arc = 0; arc < forward.length; arc++) {
      arcOf[forward[arc]] = arc;
      arcOf[mate[forward[arc]]] = arc;
    }
    return arcOf;
  }

  long flow(int arc) {
    return room[mate[forward[arc]]];
  }

  int tail(int arc) {
    return head[mate[forward[arc]]];
  }

  int head(int arc) {
    return head[forward[arc]];
  }

  long length(int arc) {
    return length[forward[arc]];
  }

  /** Changes an arc's length; the times must keep it as before. */
  void setLength(int arc, long ticks) {
    length[forward[arc]] = ticks;
    length[mate[forward[arc]]] = -ticks;
  }

  /** Whether the arc can carry no more. */
  boolean isFull(int arc) {
    return room[forward[arc]] == 0;
  }

  /** Sets an arc's capacity and flow; the flow must be balanced by its caller. */
  void set(int arc, long capacity, long flow) {
    room[forward[arc]] = capacity == UNLIMITED ? UNLIMITED : capacity - flow;
    room[mate[forward[arc]]] = flow;
  }

  /** Sends {@code amount} over a half-arc. */
  void send(int half, long amount) {
    shift(half, -amount);
    shift(mate[half], amount);
  }

  private void shift(int half, long amount) {
    if (room[half] != UNLIMITED) {
      room[half] += amount;
    }
  }

  /** Collects arcs; they are numbered in the order in which they are added. */
  static final class Builder {

    private int size;
    private int[] from = new int[64];
    private int[] to = new int[64];
    private long[] lengths = new long[64];
    private long[] capacities = new long[64];

    /** Adds an arc and returns its number. */
    int add(int tail, int head, long length, long capacity) {
      if (size == from.length) {
        from = Arrays.copyOf(from, 2 * size);
        to = Arrays.copyOf(to, 2 * size);
        lengths = Arrays.copyOf(lengths, 2 * size);
        capacities = Arrays.copyOf(capacities, 2 * size);
      }
      from[size] = tail;
      to[size] = head;
      lengths[size] = length;
      capacities[size] = capacity;
      return size++;
    }

    ArcNetwork build(int events) {
      return new ArcNetwork(this, events);
    }
  }
}
