package dayworth.value;

import java.math.BigDecimal;

/**
 * How many ticks make one time unit: ten to the power of {@code decimals}.
 *
 * <p>All times of a case are whole ticks, so that two times are equal or they are not.
 *
 * @param decimals digits after the point that a tick resolves, 0 to {@link #MOST_DECIMALS}
 */
public record TimeScale(int decimals) {

  /** The finest resolution: a thousandth of a time unit. */
  public static final int MOST_DECIMALS = 3;

  /** One tick is one time unit. */
  public static final TimeScale WHOLE = new TimeScale(0);

  public TimeScale {
    if (decimals < 0 || decimals > MOST_DECIMALS) {
      throw new IllegalArgumentException("a time has 0 to 3 decimals, not " + decimals);
    }
  }

  /** The coarsest scale on which {@code units} is whole; it must have at most 3 decimals. */
  public static TimeScale of(BigDecimal units) {
    return new TimeScale(Math.max(0, units.stripTrailingZeros().scale()));
  }

  /** The finer of the two. */
  public TimeScale and(TimeScale other) {
    return decimals >= other.decimals ? this : other;
  }

  public long ticksPerUnit() {
    return BigDecimal.ONE.movePointRight(decimals).longValueExact();
  }

  /**
   * The time in ticks.
   *
   * @throws ArithmeticException if {@code units} is not a whole number of ticks or does not fit
   */
  public long ticks(BigDecimal units) {
    return units.movePointRight(decimals).longValueExact();
  }

  /** The time in units, without trailing zeros. */
  public BigDecimal units(long ticks) {
    BigDecimal units = BigDecimal.valueOf(ticks, decimals).stripTrailingZeros();
    return units.scale() < 0 ? units.setScale(0) : units;
  }

  /** The time in units as plain text, with as many decimals as it needs. */
  public String text(long ticks) {
    return units(ticks).toPlainString();
  }
}
