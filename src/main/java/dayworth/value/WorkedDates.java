package dayworth.value;

import java.time.DayOfWeek;
import java.time.LocalDate;
import java.util.Arrays;
import java.util.Collection;
import java.util.Set;
import java.util.function.LongPredicate;
import java.util.stream.IntStream;

/**
 * Numbers the working days from a first date on, 1, 2, 3 and so on, without walking through them.
 *
 * <p>Worked weekdays repeat every seven days, so the one with a number is found by a division.
 * Holidays that fall on worked weekdays are kept in order with the number of working days before
 * each; a binary search tells how many of them a date or a number has behind it. O(log holidays).
 */
final class WorkedDates {

  private static final int WEEK = 7;

  private final LocalDate first;

  /** Days after the first date, 0 to 6, that are worked weekdays; ascending. */
  private final int[] worked;

  /** Epoch days of the holidays on worked weekdays, on or after the first date; ascending. */
  private final long[] holidays;

  /** How many working days come before each of them; never falls. */
  private final long[] workedBefore;

  WorkedDates(LocalDate first, Set<DayOfWeek> weekdays, Collection<LocalDate> holidays) {
    if (weekdays.isEmpty()) {
      throw new IllegalArgumentException("some weekday must be worked");
    }
    this.first = first;
    this.worked =
        IntStream.range(0, WEEK)
            .filter(after -> weekdays.contains(first.plusDays(after).getDayOfWeek()))
            .toArray();
    this.holidays =
        holidays.stream()
            .filter(day -> !day.isBefore(first) && weekdays.contains(day.getDayOfWeek()))
            .mapToLong(LocalDate::toEpochDay)
            .sorted()
            .distinct()
            .toArray();
    this.workedBefore = new long[this.holidays.length];
    for (int i = 0; i < workedBefore.length; i++) {
      workedBefore[i] = weekdaysThrough(this.holidays[i]) - i - 1;
    }
  }

  /** How many holidays fall on worked weekdays, on or after the first date. */
  int holidaysThatCount() {
    return holidays.length;
  }

  /** How many of them come after a date. */
  int holidaysAfter(LocalDate date) {
    return holidays.length - countOf(holidays, holiday -> holiday <= date.toEpochDay());
  }

  /** How many working days there are up to and with a date; 0 before the first. */
  long through(LocalDate date) {
    long day = date.toEpochDay();
    return weekdaysThrough(day) - countOf(holidays, holiday -> holiday <= day);
  }

  /** The date of a working day by its number, 1 or more. */
  LocalDate date(long number) {
    if (number < 1) {
      throw new IllegalArgumentException("working days are numbered from 1, not " + number);
    }
    long skipped = countOf(workedBefore, before -> before < number);
    long weekday = number + skipped - 1;
    return first.plusDays(weekday / worked.length * WEEK + worked[(int) (weekday % worked.length)]);
  }

  private long weekdaysThrough(long epochDay) {
    long after = epochDay - first.toEpochDay();
    if (after < 0) {
      return 0;
    }
    int inWeek = (int) (after % WEEK);
    return after / WEEK * worked.length
        + Arrays.stream(worked).filter(offset -> offset <= inWeek).count();
  }

  /** How many values hold; those that hold come first. */
  private static int countOf(long[] values, LongPredicate holds) {
    int low = 0;
    int high = values.length;
    while (low < high) {
      int middle = (low + high) >>> 1;
      if (holds.test(values[middle])) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    return low;
  }
}
