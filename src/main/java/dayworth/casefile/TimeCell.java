package dayworth.casefile;

import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.regex.Pattern;

/** Reads a number of time units. */
enum TimeCell implements CellParser<BigDecimal> {
  /** At least 0. */
  DURATION(false),
  /** Of either sign. */
  LAG(true),
  /** At least 0; a date may stand here one day, and is told from a number that is none. */
  MOMENT(false) {
    @Override
    public BigDecimal parse(String text, NumberStyle style) throws CellFault {
      if (DATE.matcher(text).matches()) {
        throw new CellFault("a date is not served yet", "a number of time units after the start");
      }
      return super.parse(text, style);
    }
  };

  /** The longest duration or lag, in time units: 2,700 years of days. */
  static final BigDecimal MOST = BigDecimal.valueOf(1_000_000);

  private static final Pattern DATE = Pattern.compile("\\d{4}-\\d{2}-\\d{2}");

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

  /** Reads a real ISO 8601 date. */
  static LocalDate date(String text, NumberStyle style) throws CellFault {
    if (!DATE.matcher(text).matches()) {
      throw new CellFault("not a date", "year-month-day, such as 2026-09-07");
    }
    try {
      return LocalDate.parse(text);
    } catch (DateTimeParseException e) {
      throw new CellFault("no such date", "a day that the calendar has");
    }
  }
}
