package dayworth.engine.stepping;

import java.util.Arrays;

/**
 * Half-arcs by the shift at which they become tight; least first.
 *
 * <p>A radix heap (Ahuja, Mehlhorn, Orlin and Tarjan 1990, "Faster algorithms for the shortest path
 * problem", Journal of the ACM 37): bucket b holds keys whose highest bit that differs from the
 * last key taken out is bit b − 1, bucket 0 those equal to it. Keys must be at least the last key
 * taken out, and at least zero. An entry only ever moves to lower buckets, each time in one sweep
 * over memory.
 */
final class ArrivalQueue {

  private final Bucket[] buckets = new Bucket[Long.SIZE];

  /** Bit b is set if bucket b holds anything. */
  private long filled;

  private long last;

  ArrivalQueue() {
    Arrays.setAll(buckets, b -> new Bucket());
  }

  boolean isEmpty() {
    return filled == 0;
  }

  /** Forgets all entries and the last key. */
  void clear() {
    for (long rest = filled; rest != 0; rest &= rest - 1) {
      buckets[Long.numberOfTrailingZeros(rest)].clear();
    }
    filled = 0;
    last = 0;
  }

  long leastKey() {
    return buckets[Long.numberOfTrailingZeros(filled)].least;
  }

  void push(long key, int half) {
    int b = Long.SIZE - Long.numberOfLeadingZeros(key ^ last);
    buckets[b].add(key, half);
    filled |= 1L << b;
  }

  /** Takes out a half-arc with the least key. */
  int pop() {
    if ((filled & 1) == 0) {
      spreadLowest();
    }
    Bucket equal = buckets[0];
    int half = equal.halves[--equal.size];
    if (equal.size == 0) {
      equal.clear();
      filled &= ~1L;
    }
    return half;
  }

  private void spreadLowest() {
    int lowest = Long.numberOfTrailingZeros(filled);
    Bucket bucket = buckets[lowest];
    last = bucket.least;
    filled &= ~(1L << lowest);
    int size = bucket.size;
    bucket.clear();
    for (int k = 0; k < size; k++) {
      push(bucket.keys[k], bucket.halves[k]);
    }
  }

  private static final class Bucket {

    private long[] keys = new long[16];
    private int[] halves = new int[16];
    private int size;
    private long least = Long.MAX_VALUE;

    void add(long key, int half) {
      if (size == keys.length) {
        keys = Arrays.copyOf(keys, 2 * size);
        halves = Arrays.copyOf(halves, 2 * size);
      }
      keys[size] = key;
      halves[size++] = half;
      least = Math.min(least, key);
    }

    void clear() {
      size = 0;
      least = Long.MAX_VALUE;
    }
  }
}
