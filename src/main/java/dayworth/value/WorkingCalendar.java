package dayworth.value;

import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * Turns times in ticks into dates and back. Immutable.
 *
 * <p>Work begins on the first working day on or after the start date; with a data date, time counts
 * from the first working day after it. A duration is over at the end of a working day, a time
 * starts in the morning of one. A working day is a worked weekday that is no holiday.
 */
public final class WorkingCalendar {

  private final LocalDate start;
  private final Set<DayOfWeek> weekdays;
  private final WorkedDates worked;
  private final DayLength day;
  private final Optional<LocalDate> dataDate;

  /** Working days from the start up to and with the data date; time counts after them. */
  private final long elapsedDays;

  private WorkingCalendar(
      LocalDate start,
      Set<DayOfWeek> weekdays,
      WorkedDates worked,
      DayLength day,
      Optional<LocalDate> dataDate) {
    this.start = start;
    this.weekdays = weekdays;
    this.worked = worked;
    this.day = day;
    this.dataDate = dataDate;
    this.elapsedDays = dataDate.map(worked::through).orElse(0L);
  }

  /**
   * A calendar in which time counts from the start.
   *
   * @param start may be a rest day
   * @param weekdays those that are worked; at least one
   * @param holidays may repeat, fall on rest days, and lie before the start
   * @param day how long a working day is
   */
  public static WorkingCalendar of(
      LocalDate start, Set<DayOfWeek> weekdays, Collection<LocalDate> holidays, DayLength day) {
    WorkedDates worked = new WorkedDates(start, weekdays, holidays);
    return new WorkingCalendar(
        start,
        Collections.unmodifiableSet(EnumSet.copyOf(weekdays)),
        worked,
        day,
        Optional.empty());
  }

  /** The same days, time counting from the first working day after {@code dataDate}. */
  public WorkingCalendar after(LocalDate dataDate) {
    return new WorkingCalendar(start, weekdays, worked, day, Optional.of(dataDate));
  }

  /** The same days, time counting from the start whatever the data date is. */
  public WorkingCalendar fromStart() {
    return new WorkingCalendar(start, weekdays, worked, day, Optional.empty());
  }

  public LocalDate startDate() {
    return start;
  }

  public Optional<LocalDate> dataDate() {
    return dataDate;
  }

  /** The weekdays that are worked. */
  public Set<DayOfWeek> weekdays() {
    return weekdays;
  }

  /** How many holidays fall on worked weekdays from when time counts. */
  public int holidaysThatCount() {
    return dataDate.map(worked::holidaysAfter).orElseGet(worked::holidaysThatCount);
  }

  public DayLength dayLength() {
    return day;
  }

  /** The first day on which time counts that is worked. */
  public LocalDate firstWorkingDay() {
    return worked.date(elapsedDays + 1);
  }

  public boolean isWorked(LocalDate date) {
    return worked.through(date) > worked.through(date.minusDays(1));
  }

  /**
   * The date at whose end a duration is over; a duration of 0 is over on the first working day.
   *
   * @throws IllegalArgumentException if the duration is below 0
   */
  public LocalDate finishDate(long duration) {
    requireNotBelowZero(duration);
    return worked.date(elapsedDays + Math.max(1, day.daysToFinish(duration)));
  }

  /**
   * The date in whose morning or during which work at a time starts.
   *
   * @throws IllegalArgumentException if the time is below 0
   */
  public LocalDate startDate(long time) {
    requireNotBelowZero(time);
    return worked.date(elapsedDays + day.daysBefore(time) + 1);
  }

  /** The same for work that lasts from {@code start} to {@code finish}: none has one date. */
  public LocalDate startDate(long start, long finish) {
    return start == finish ? finishDate(finish) : startDate(start);
  }

  /**
   * The last tick at which work still finishes by a date: the end of that working day, or of the
   * last one before it.
   *
   * @return 0 before the first working day; below 0 for a date before the data date
   */
  public long endOf(LocalDate date) {
    return day.endOf(worked.through(date) - elapsedDays);
  }

  /**
   * The first tick at which work starts on a date or later: the morning of that working day, or of
   * the next one after it.
   *
   * @return 0 before the first working day; below 0 for a date before the data date
   */
  public long morningOf(LocalDate date) {
    return day.morningAfter(worked.through(date.minusDays(1)) - elapsedDays);
  }

  /** The end of the first working day on or after a date. */
  public long endOfNext(LocalDate date) {
    return day.endOf(worked.through(date.minusDays(1)) + 1 - elapsedDays);
  }

  /** Whether a duration uses its last working day up. */
  public boolean isEndOfDay(long duration) {
    return day.endOf(day.daysToFinish(duration)) == duration;
  }

  /** The date that is so many working days, at least 1, after another, which may be a rest day. */
  public LocalDate later(LocalDate date, long workingDays) {
    return worked.date(worked.through(date) + workingDays);
  }

  /** The ends of working days from one time to another, both included; ascending. */
  public List<Long> endsOfDays(long from, long to) {
    List<Long> ends = new ArrayList<>();
    for (long count = day.daysToFinish(from); day.endOf(count) <= to; count++) {
      ends.add(day.endOf(count));
    }
    return ends;
  }

  /**
   * A time that was counted from the start, as this calendar counts it; rounded down where the
   * elapsed working days are no whole number of ticks.
   */
  public long counted(long fromStart) {
    return Math.subtractExact(fromStart, day.morningAfter(elapsedDays));
  }

  /** Calendar days from the start date, or the day after the data date, to a date, both counted. */
  public long calendarDaysTo(LocalDate finish) {
    LocalDate first = dataDate.map(date -> date.plusDays(1)).orElse(start);
    return ChronoUnit.DAYS.between(first, finish) + 1;
  }

  private static void requireNotBelowZero(long time) {
    if (time < 0) {
      throw new IllegalArgumentException("a time before the first one: " + time);
    }
  }
}
