package dayworth.contract;

import dayworth.value.DayLength;
import dayworth.value.WorkingCalendar;
import java.time.LocalDate;
import java.util.Optional;

/**
 * When something is due.
 *
 * @param ticks the last tick at which it is on time; below zero where it was due before time counts
 * @param date the date, which may be a rest day; empty in a case without dates
 */
public record Due(long ticks, Optional<LocalDate> date) {

  /** In a case without dates. */
  public static Due at(long ticks) {
    return new Due(ticks, Optional.empty());
  }

  /** At the end of a date's working day, or of the last one before it. */
  public static Due on(LocalDate date, WorkingCalendar calendar) {
    return new Due(calendar.endOf(date), Optional.of(date));
  }

  /**
   * So many working days later, at least 1.
   *
   * @param day how long one is
   * @param calendar that of the case; empty in a case without dates
   */
  public Due later(long workingDays, DayLength day, Optional<WorkingCalendar> calendar) {
    long moved = Math.addExact(ticks, day.endOf(workingDays));
    Optional<LocalDate> later =
        calendar.flatMap(dates -> date.map(from -> dates.later(from, workingDays)));
    boolean endsDay = calendar.isPresent() && date.map(calendar.get()::endOf).orElse(-1L) == ticks;
    return endsDay ? on(later.orElseThrow(), calendar.get()) : new Due(moved, later);
  }

  /**
   * So many ticks after the start, whatever the data date is; its date is that of a project that
   * takes so long.
   */
  public static Due after(long ticks, WorkingCalendar calendar) {
    return new Due(calendar.counted(ticks), Optional.of(calendar.fromStart().finishDate(ticks)));
  }
}
