package dayworth.value;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;

/**
 * The calendar against java.time walked one day after the other, over thirty years, on seeded
 * calendars with many holidays.
 */
class WalkedCalendarTest {

  private static final int SEEDS = 60;
  private static final int DAYS = 30 * 366;

  @Test
  void everyDateIsWhereAWalkFindsIt() {
    for (int seed = 0; seed < SEEDS; seed++) {
      Random random = new Random(seed);
      LocalDate start = LocalDate.of(1995, 1, 1).plusDays(random.nextInt(20_000));
      Set<DayOfWeek> weekdays = weekdays(random);
      List<LocalDate> holidays = holidays(random, start);
      DayLength length = new DayLength(1 + random.nextInt(30), 1 + random.nextInt(7));
      WorkingCalendar whole = WorkingCalendar.of(start, weekdays, holidays, length);
      boolean hasData = random.nextBoolean();
      LocalDate data = start.plusDays(random.nextInt(400));
      walk(seed, hasData ? whole.after(data) : whole, weekdays, Set.copyOf(holidays));
    }
  }

  private static void walk(
      int seed, WorkingCalendar calendar, Set<DayOfWeek> weekdays, Set<LocalDate> holidays) {
    LocalDate from = calendar.startDate();
    LocalDate counted = calendar.dataDate().map(date -> date.plusDays(1)).orElse(from);
    DayLength length = calendar.dayLength();
    // number of the working day, from the first on which time counts; 0 and below before
    long number = 0;
    for (LocalDate day = from; day.isBefore(counted); day = day.plusDays(1)) {
      number -= weekdays.contains(day.getDayOfWeek()) && !holidays.contains(day) ? 1 : 0;
    }
    for (int k = 0; k < DAYS; k++) {
      LocalDate day = from.plusDays(k);
      String at = "seed " + seed + ", " + day;
      boolean worked = weekdays.contains(day.getDayOfWeek()) && !holidays.contains(day);
      assertEquals(worked, calendar.isWorked(day), at);
      // the last whole tick of so many days, and the first after them
      assertEquals(ceiling(number * length.ticks(), length.days()), calendar.morningOf(day), at);
      number += worked ? 1 : 0;
      long end = Math.floorDiv(number * length.ticks(), length.days());
      assertEquals(end, calendar.endOf(day), at);
      assertEquals(ChronoUnit.DAYS.between(counted, day) + 1, calendar.calendarDaysTo(day), at);
      if (worked && number > 0) {
        long before = (number - 1) * length.ticks();
        long first = Math.floorDiv(before, length.days()) + 1;
        for (long tick = first; tick <= end; tick++) {
          assertEquals(day, calendar.finishDate(tick), at + ", tick " + tick);
        }
        for (long tick = ceiling(before, length.days());
            tick * length.days() < number * length.ticks();
            tick++) {
          assertEquals(day, calendar.startDate(tick), at + ", tick " + tick);
        }
      }
    }
  }

  private static long ceiling(long numerator, long denominator) {
    return -Math.floorDiv(-numerator, denominator);
  }

  private static Set<DayOfWeek> weekdays(Random random) {
    Set<DayOfWeek> weekdays = EnumSet.of(DayOfWeek.of(1 + random.nextInt(7)));
    for (DayOfWeek day : DayOfWeek.values()) {
      if (random.nextInt(3) > 0) {
        weekdays.add(day);
      }
    }
    return weekdays;
  }

  private static List<LocalDate> holidays(Random random, LocalDate start) {
    List<LocalDate> holidays = new ArrayList<>();
    for (int k = random.nextInt(400); k > 0; k--) {
      holidays.add(start.plusDays(random.nextInt(DAYS) - 300));
    }
    return holidays;
  }
}
