package dayworth.engine.branching;

import dayworth.value.Money;
import java.math.RoundingMode;
import java.util.List;

/**
 * The grain to which slopes of envelopes are rounded down where the exact ones have no common
 * denominator that fits.
 *
 * <p>Slopes are used within the windows only, so rounding lowers all envelopes of a branch together
 * by at most the sum of the windows' lengths times the grain: less than a fifth of a cent. A branch
 * within another has shorter windows, so its grain divides what the other's scale can hold.
 *
 * @param perUnit how many grains make one money unit, a power of two; 0 leaves slopes exact
 */
record SlopeGrain(long perUnit) {

  static final SlopeGrain NONE = new SlopeGrain(0);

  /** One over the most that rounding may lower all envelopes by. */
  private static final long MOST_LOST = 500;

  /** The coarsest grain for a branch. */
  static SlopeGrain within(List<List<Window>> windows) {
    long length =
        windows.stream()
            .flatMap(List::stream)
            .mapToLong(window -> window.most() - window.least())
            .sum();
    long least = Math.multiplyExact(Math.max(1, length), MOST_LOST);
    return new SlopeGrain(Math.multiplyExact(2, Long.highestOneBit(least)));
  }

  Money roundedDown(Money slope) {
    return perUnit == 0
        ? slope
        : Money.of(slope.times(perUnit).rounded(0, RoundingMode.FLOOR)).dividedBy(perUnit);
  }
}
