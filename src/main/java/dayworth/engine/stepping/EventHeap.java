package dayworth.engine.stepping;

import java.util.Arrays;

/** A 4-ary heap of half-arcs by the shift at which they become tight; least first. */
final class EventHeap {

  private long[] keys = new long[64];
  private int[] halves = new int[64];
  private int size;

  boolean isEmpty() {
    return size == 0;
  }

  void clear() {
    size = 0;
  }

  long leastKey() {
    return keys[0];
  }

  void push(long key, int half) {
    if (size == keys.length) {
      keys = Arrays.copyOf(keys, 2 * size);
      halves = Arrays.copyOf(halves, 2 * size);
    }
    int hole = size++;
    while (hole > 0) {
      int above = (hole - 1) >> 2;
      if (keys[above] <= key) {
        break;
      }
      keys[hole] = keys[above];
      halves[hole] = halves[above];
      hole = above;
    }
    keys[hole] = key;
    halves[hole] = half;
  }

  /** Takes out the half-arc with the least key. */
  int pop() {
    int least = halves[0];
    size--;
    sink(keys[size], halves[size]);
    return least;
  }

  private void sink(long key, int half) {
    int hole = 0;
    for (int child = 1; child < size; child = 4 * hole + 1) {
      int smallest = child;
      for (int other = child + 1; other < Math.min(child + 4, size); other++) {
        if (keys[other] < keys[smallest]) {
          smallest = other;
        }
      }
      if (key <= keys[smallest]) {
        break;
      }
      keys[hole] = keys[smallest];
      halves[hole] = halves[smallest];
      hole = smallest;
    }
    keys[hole] = key;
    halves[hole] = half;
  }
}
