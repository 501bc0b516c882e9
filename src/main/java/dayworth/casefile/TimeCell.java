package dayworth.casefile;

import dayworth.value.TimeScale;
import java.math.BigDecimal;

/** Reads a number of time units. */
enum TimeCell implements CellParser<BigDecimal> {
  /** At least 0. */
  DURATION(false),
  /** Of either sign. */
  LAG(true);

  /** The longest duration or lag, in time units: 2,700 years of days. */
  static final BigDecimal MOST = BigDecimal.valueOf(1_000_000);

  private final boolean mayBeNegative;

  TimeCell(boolean mayBeNegative) {
    this.mayBeNegative = mayBeNegative;
  }

  @Override
  public BigDecimal parse(String text, NumberStyle style) throws CellFault {
    BigDecimal units = NumberText.parse(text, style);
    if (units.signum() < 0 && !mayBeNegative) {
      throw new CellFault("negative", "0 or more");
    }
    if (units.stripTrailingZeros().scale() > TimeScale.MOST_DECIMALS) {
      throw new CellFault("too many decimals", "a time has at most 3 decimals");
    }
    if (units.abs().compareTo(MOST) > 0) {
      throw new CellFault("too long", "at most 1000000 time units");
    }
    return units;
  }
}
