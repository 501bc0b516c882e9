package dayworth.contract;

import dayworth.value.Money;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.math.BigInteger;
import java.math.RoundingMode;
import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.Optional;

/**
 * Counts time in what a rate is per: ticks where it is per unit, calendar days of the finish date
 * where it is per calendar day or week.
 */
record Counting(TimeScale scale, Optional<WorkingCalendar> calendar) {

  private static final int DAYS_PER_WEEK = 7;

  /** Ticks or days further off than this are beyond every project: 10,000 years and more. */
  private static final BigInteger FAR_TICKS = BigInteger.TEN.pow(15);

  private static final BigInteger FAR_DAYS = BigInteger.valueOf(4_000_000);

  /** From when time counts until a finish. */
  Count until(long finish, Per per) {
    return per.isByDate()
        ? Count.of(dated().calendarDaysTo(dated().finishDate(finish)), stepsPerOne(per))
        : Count.of(finish, stepsPerOne(per));
  }

  /** How late a finish is; below zero if it is early. */
  Count lateness(Due due, long finish, Per per) {
    long late =
        per.isByDate()
            ? ChronoUnit.DAYS.between(date(due), dated().finishDate(finish))
            : Math.subtractExact(finish, due.ticks());
    return Count.of(late, stepsPerOne(per));
  }

  /** How late something was that is done. */
  Count lateness(Due due, Section.Done done, Per per) {
    long late =
        per.isByDate()
            ? ChronoUnit.DAYS.between(date(due), done.date())
            : Math.subtractExact(done.ticks(), due.ticks());
    return Count.of(late, stepsPerOne(per));
  }

  /** The last finish that is at most so late; empty where that is beyond every project. */
  Optional<Long> lastAtMost(Due due, Count late, Per per) {
    return steps(late, per, RoundingMode.FLOOR)
        .map(
            steps ->
                per.isByDate()
                    ? dated().endOf(date(due).plusDays(steps))
                    : Math.addExact(due.ticks(), steps));
  }

  /**
   * The finish from which it is at least so late; where money goes by the date, the end of the
   * first working day that is. Empty where that is beyond every project.
   */
  Optional<Long> firstAtLeast(Due due, Count late, Per per) {
    return steps(late, per, RoundingMode.CEILING).map(steps -> first(due, steps, per));
  }

  /** The same for more than so late. */
  Optional<Long> firstBeyond(Due due, Count late, Per per) {
    return steps(late, per, RoundingMode.FLOOR).map(steps -> first(due, steps + 1, per));
  }

  private long first(Due due, long steps, Per per) {
    return per.isByDate()
        ? dated().endOfNext(date(due).plusDays(steps))
        : Math.addExact(due.ticks(), steps);
  }

  private Optional<Long> steps(Count late, Per per, RoundingMode mode) {
    BigInteger steps = late.steps(stepsPerOne(per), mode);
    BigInteger far = per.isByDate() ? FAR_DAYS : FAR_TICKS;
    return steps.abs().compareTo(far) > 0 ? Optional.empty() : Optional.of(steps.longValueExact());
  }

  private long stepsPerOne(Per per) {
    return switch (per) {
      case UNIT -> scale.ticksPerUnit();
      case CALENDAR_DAY -> 1;
      case WEEK -> DAYS_PER_WEEK;
    };
  }

  /** The money for a tick at a rate per unit. */
  Money perTick(Money rate) {
    return rate.dividedBy(scale.ticksPerUnit());
  }

  /** So many units in ticks; empty where that is no whole number of them. */
  Optional<Long> wholeTicks(Count units) {
    BigInteger down = units.steps(scale.ticksPerUnit(), RoundingMode.FLOOR);
    BigInteger up = units.steps(scale.ticksPerUnit(), RoundingMode.CEILING);
    return down.equals(up) && down.bitLength() < Long.SIZE
        ? Optional.of(down.longValueExact())
        : Optional.empty();
  }

  private WorkingCalendar dated() {
    return calendar.orElseThrow();
  }

  private static LocalDate date(Due due) {
    return due.date().orElseThrow();
  }
}
