package dayworth.engine.branching;

import dayworth.network.Moment;
import dayworth.value.Money;
import java.util.List;

/**
 * Money that hangs on when one or two moments come, whatever its shape, as long as it never falls
 * (or never rises) when one of them comes later.
 */
public interface Charge {

  /** For people. */
  String name();

  /** The moments that it hangs on; each another. */
  List<Moment> moments();

  /** Whether the k-th moment costs more, or the same, the later it comes; otherwise less. */
  boolean rises(int k);

  /**
   * The times from the window's least to its most, both included, between which the money for the
   * k-th moment is nowhere below the straight line from one to the next: the ends of working days
   * and the bends of the money.
   */
  long[] points(int k, Window window);

  /**
   * The exact money.
   *
   * @param times of the moments, ticks
   */
  Money at(long[] times);

  /**
   * Money for each moment by itself that in sum is never more than {@link #at} while the moments
   * come within the windows, and equals it where the windows are points. Each part rises or falls
   * as its moment does.
   */
  List<Part> within(List<Window> windows);

  /** Money for one moment. */
  @FunctionalInterface
  interface Part {

    /** The money when the moment comes at a time. */
    Money at(long time);
  }
}
