package dayworth.report.brief;

import java.util.Arrays;
import java.util.TreeSet;

/**
 * Where times stand from left to right. It is even as long as every box has the room that its words
 * need; a stretch of short work is drawn wider, and everything right of it moves on. The script of
 * the page does the same for other finishes.
 */
final class TimeRuler {

  /** Two times are told apart by so many pixels at least. */
  private static final double LEAST = 2;

  private final long[] times;
  private final double[] xs;
  private final double perTick;

  /**
   * A ruler for boxes.
   *
   * @param least how wide each box has to be
   * @param perTick pixels of a tick where nothing needs more
   */
  TimeRuler(NetworkFrame frame, double[] least, double perTick) {
    this.perTick = perTick;
    TreeSet<Long> all = new TreeSet<>();
    all.add(0L);
    all.add(frame.finish());
    for (int b = 0; b < least.length; b++) {
      all.add(frame.start(b));
      all.add(frame.end(b));
    }
    times = all.stream().mapToLong(Long::longValue).toArray();
    xs = new double[times.length];
    for (int k = 1; k < times.length; k++) {
      xs[k] = xs[k - 1] + Math.max(LEAST, (times[k] - times[k - 1]) * perTick);
      for (int b = 0; b < least.length; b++) {
        if (frame.end(b) == times[k] && frame.duration(b) > 0) {
          xs[k] = Math.max(xs[k], xs[index(frame.start(b))] + least[b]);
        }
      }
    }
  }

  private int index(long time) {
    return Arrays.binarySearch(times, time);
  }

  /** Pixels from time 0; beyond the last time evenly. */
  double x(long time) {
    int k = index(time);
    if (k >= 0) {
      return xs[k];
    }
    int after = -k - 1;
    if (after == times.length) {
      return xs[after - 1] + (time - times[after - 1]) * perTick;
    }
    if (after == 0) {
      return (time - times[0]) * perTick;
    }
    double share = (time - times[after - 1]) / (double) (times[after] - times[after - 1]);
    return xs[after - 1] + (xs[after] - xs[after - 1]) * share;
  }

  double width() {
    return xs[xs.length - 1];
  }
}
