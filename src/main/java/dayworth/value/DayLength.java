package dayworth.value;

import java.math.BigDecimal;

/**
 * How long a working day is in ticks: the exact fraction {@code ticks / days}.
 *
 * <p>It need not be whole: a week of six working days makes a working day the sixth of a unit. The
 * end of a working day is then the last tick of it, less than a tick before its true end.
 *
 * @param ticks at least 1
 * @param days how many working days so many ticks are; at least 1
 */
public record DayLength(long ticks, long days) {

  public DayLength {
    if (ticks < 1 || days < 1) {
      throw new IllegalArgumentException("a working day takes time, not " + ticks + "/" + days);
    }
  }

  /** A working day of so many time units, which must be whole ticks. */
  public static DayLength ofUnits(BigDecimal unitsPerDay, TimeScale scale) {
    return new DayLength(scale.ticks(unitsPerDay), 1);
  }

  /** A working day where one time unit is a week of {@code daysPerWeek} working days. */
  public static DayLength ofWeek(int daysPerWeek, TimeScale scale) {
    return new DayLength(scale.ticksPerUnit(), daysPerWeek);
  }

  /** The number of the working day at whose end a duration is over: days rounded up. */
  long daysToFinish(long duration) {
    return -Math.floorDiv(-Math.multiplyExact(duration, days), ticks);
  }

  /** How many whole working days come before a time: days rounded down. */
  long daysBefore(long time) {
    return Math.floorDiv(Math.multiplyExact(time, days), ticks);
  }

  /** The last tick of the first {@code count} working days. */
  public long endOf(long count) {
    return Math.floorDiv(Math.multiplyExact(count, ticks), days);
  }

  /** The first tick that is after {@code count} working days. */
  long morningAfter(long count) {
    return -Math.floorDiv(-Math.multiplyExact(count, ticks), days);
  }
}
