package dayworth.value;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeout;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.time.DayOfWeek;
import java.time.Duration;
import java.time.LocalDate;
import java.util.Arrays;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** Dates counted by hand on a wall calendar; weekdays stand in the comments. */
class WorkingCalendarTest {

  private static final Set<DayOfWeek> MON_TO_FRI =
      EnumSet.range(DayOfWeek.MONDAY, DayOfWeek.FRIDAY);
  private static final Set<DayOfWeek> ALL = EnumSet.allOf(DayOfWeek.class);
  private static final DayLength ONE = new DayLength(1, 1);

  private static LocalDate date(String text) {
    return LocalDate.parse(text);
  }

  private static WorkingCalendar days(String start, String... holidays) {
    return WorkingCalendar.of(
        date(start), MON_TO_FRI, Arrays.stream(holidays).map(LocalDate::parse).toList(), ONE);
  }

  @Test
  void fiveDaysFromMondayAreOverOnFriday() {
    WorkingCalendar calendar = days("2026-09-07"); // a Monday
    assertEquals(date("2026-09-11"), calendar.finishDate(5));
    assertEquals(date("2026-09-14"), calendar.startDate(5), "what follows starts on Monday");
    assertEquals(date("2026-09-14"), calendar.finishDate(6));
    assertEquals(5, calendar.endOf(date("2026-09-11")));
    assertEquals(5, calendar.endOf(date("2026-09-13")), "a Sunday means the Friday before");
    assertEquals(5, calendar.morningOf(date("2026-09-12")), "a Saturday means the Monday after");
    assertEquals(4, calendar.morningOf(date("2026-09-11")));
    assertEquals(6, calendar.endOfNext(date("2026-09-12")));
    assertEquals(5, calendar.endOfNext(date("2026-09-11")));
  }

  @Test
  void nothingLastsNoDayAndHasItsFinishDateTwice() {
    WorkingCalendar calendar = days("2026-09-07");
    assertEquals(date("2026-09-07"), calendar.finishDate(0));
    assertEquals(date("2026-09-07"), calendar.startDate(0, 0));
    assertEquals(date("2026-09-11"), calendar.startDate(5, 5));
    assertEquals(date("2026-09-14"), calendar.startDate(5, 6));
  }

  @Test
  void workBeginsOnTheFirstWorkingDayOnOrAfterTheStart() {
    WorkingCalendar calendar = days("2027-05-01", "2027-05-03"); // a Saturday and the Monday
    assertFalse(calendar.isWorked(date("2027-05-01")));
    assertFalse(calendar.isWorked(date("2027-05-03")));
    assertTrue(calendar.isWorked(date("2027-05-04")));
    assertEquals(date("2027-05-04"), calendar.firstWorkingDay());
    assertEquals(date("2027-05-04"), calendar.finishDate(1));
    assertEquals(0, calendar.endOf(date("2027-05-02")));
    assertEquals(0, calendar.morningOf(date("2027-05-02")));
    assertEquals(0, calendar.endOf(date("2020-01-01")));
    // Sat 1, Sun 2, Mon 3, Tue 4 May, both counted
    assertEquals(4, calendar.calendarDaysTo(date("2027-05-04")));
  }

  @Test
  void holidaysOnRestDaysBeforeTheStartAndTwiceCountOnceOrNotAtAll() {
    WorkingCalendar calendar =
        days(
            "2027-12-20", // a Monday
            "2027-12-25", // a Saturday
            "2027-12-17", // the Friday before the start
            "2027-12-24", // a Friday
            "2027-12-24",
            "2027-12-27"); // a Monday
    assertEquals(2, calendar.holidaysThatCount());
    // 20, 21, 22, 23, then 28, 29 December
    assertEquals(date("2027-12-23"), calendar.finishDate(4));
    assertEquals(date("2027-12-28"), calendar.finishDate(5));
    assertEquals(date("2027-12-29"), calendar.finishDate(6));
    assertEquals(4, calendar.endOf(date("2027-12-27")));
    assertEquals(4, calendar.morningOf(date("2027-12-24")));
  }

  @Test
  void leapDaysAreDays() {
    // Mon 28 Feb 2028, Tue 29 Feb, Wed 1 March
    assertEquals(date("2028-02-29"), days("2028-02-28").finishDate(2));
    assertEquals(date("2028-03-01"), days("2028-02-28").finishDate(3));
    // Mon 27 Feb, Tue 28 Feb, Wed 1 March 2023
    assertEquals(date("2023-03-01"), days("2023-02-27").finishDate(3));
    // 1900 had no 29 February: Wed 28 Feb, Thu 1 March
    assertEquals(date("1900-03-01"), days("1900-02-28").finishDate(2));
  }

  /** 20,871 weeks of five days are 400 years, after which dates and weekdays repeat. */
  @Test
  void fourHundredYearsAreAsManyWeeks() {
    WorkingCalendar calendar = days("2001-01-01"); // a Monday, as 1 January 2401 is
    assertEquals(date("2400-12-29"), calendar.finishDate(20_871 * 5)); // the Friday
    assertEquals(date("2401-01-01"), calendar.startDate(20_871 * 5));
  }

  @Test
  void hoursMakeADayWhenThereAreEnoughOfThem() {
    WorkingCalendar calendar =
        WorkingCalendar.of(
            date("2026-09-10"), // a Thursday
            MON_TO_FRI,
            List.of(),
            DayLength.ofUnits(new BigDecimal("7.5"), new TimeScale(1)));
    // 7.5 h are 75 ticks: Thursday; 7.6 h reach into Friday; 15 h end on Friday
    assertEquals(date("2026-09-10"), calendar.finishDate(75));
    assertEquals(date("2026-09-11"), calendar.finishDate(76));
    assertEquals(date("2026-09-11"), calendar.finishDate(150));
    assertEquals(date("2026-09-10"), calendar.startDate(74));
    assertEquals(date("2026-09-11"), calendar.startDate(75));
    assertEquals(date("2026-09-14"), calendar.startDate(150));
    assertEquals(150, calendar.endOf(date("2026-09-13")));
    assertEquals(List.of(75L, 150L, 225L), calendar.endsOfDays(10, 225));
    assertEquals(List.of(75L), calendar.endsOfDays(75, 149));
    assertTrue(calendar.isEndOfDay(150));
    assertFalse(calendar.isEndOfDay(149));
  }

  @Test
  void shiftsAroundTheClock() {
    WorkingCalendar calendar =
        WorkingCalendar.of(
            date("2027-09-04"), // a Saturday
            ALL,
            List.of(date("2027-09-06")),
            DayLength.ofUnits(BigDecimal.valueOf(3), TimeScale.WHOLE));
    // Saturday 1 to 3, Sunday 4 to 6, Tuesday 7 to 9
    assertEquals(date("2027-09-05"), calendar.finishDate(6));
    assertEquals(date("2027-09-07"), calendar.finishDate(7));
    assertEquals(date("2027-09-05"), calendar.startDate(5));
  }

  @Test
  void partOfADayReachesIntoIt() {
    WorkingCalendar calendar =
        WorkingCalendar.of(date("2026-09-07"), MON_TO_FRI, List.of(), new DayLength(1000, 1));
    assertEquals(date("2026-09-07"), calendar.finishDate(1));
    assertEquals(date("2026-09-11"), calendar.finishDate(4001));
    assertEquals(date("2026-09-11"), calendar.startDate(4999));
  }

  @Test
  void aWeekIsTheCasesOwnWorkingDays() {
    WorkingCalendar five =
        WorkingCalendar.of(
            date("2026-09-07"), MON_TO_FRI, List.of(), DayLength.ofWeek(5, new TimeScale(1)));
    // one week is 10 ticks and 5 working days; 1.2 weeks are 6
    assertEquals(date("2026-09-11"), five.finishDate(10));
    assertEquals(date("2026-09-14"), five.finishDate(12));
    assertEquals(date("2026-09-15"), five.finishDate(13));
    assertEquals(12, five.endOf(date("2026-09-14")));
    // six days a week: a working day is 1000/6 ticks, Tuesday ends within tick 333
    WorkingCalendar six =
        WorkingCalendar.of(
            date("2026-09-07"),
            EnumSet.range(DayOfWeek.MONDAY, DayOfWeek.SATURDAY),
            List.of(),
            DayLength.ofWeek(6, new TimeScale(3)));
    assertEquals(333, six.endOf(date("2026-09-08")));
    assertEquals(date("2026-09-08"), six.finishDate(333));
    assertEquals(date("2026-09-09"), six.finishDate(334));
    assertEquals(334, six.morningOf(date("2026-09-09")));
    assertEquals(date("2026-09-09"), six.startDate(334));
    assertEquals(date("2026-09-12"), six.finishDate(1000));
    assertEquals(List.of(166L, 333L, 500L, 666L), six.endsOfDays(100, 700));
  }

  @Test
  void timeCountsFromTheDayAfterTheDataDate() {
    // start Mon 7 Sep; the data date Fri 18 Sep ends the tenth working day
    WorkingCalendar calendar = days("2026-09-07").after(date("2026-09-18"));
    assertEquals(date("2026-09-21"), calendar.firstWorkingDay());
    assertEquals(date("2026-09-21"), calendar.finishDate(0));
    assertEquals(date("2026-09-25"), calendar.finishDate(5));
    assertEquals(date("2026-09-21"), calendar.startDate(0));
    assertEquals(5, calendar.endOf(date("2026-09-25")));
    assertEquals(-5, calendar.endOf(date("2026-09-11")));
    assertEquals(2, calendar.counted(12));
    assertEquals(date("2026-09-22"), calendar.fromStart().finishDate(12));
    // from Sat 19 to Fri 25 September, both counted
    assertEquals(7, calendar.calendarDaysTo(date("2026-09-25")));
  }

  /** By hand: the data date is the Sunday, so time counts from Monday 21 September. */
  @Test
  void aDataDateOnARestDay() {
    WorkingCalendar calendar = days("2026-09-07").after(date("2026-09-20"));
    assertEquals(date("2026-09-21"), calendar.finishDate(1));
    assertEquals(1, calendar.calendarDaysTo(date("2026-09-21")));
  }

  @Test
  void farDatesAreQuick() {
    WorkingCalendar calendar = days("2001-01-01", "2001-01-02");
    assertTimeout(
        Duration.ofSeconds(5),
        () -> {
          for (long day = 1; day < 1_000_000; day++) {
            assertEquals(day, calendar.endOf(calendar.finishDate(day)));
          }
        });
  }

  @Test
  void thereIsNoTimeBeforeTheFirst() {
    WorkingCalendar calendar = days("2026-09-07");
    assertThrows(IllegalArgumentException.class, () -> calendar.finishDate(-1));
    assertThrows(IllegalArgumentException.class, () -> calendar.startDate(-1));
    assertThrows(IllegalArgumentException.class, () -> new DayLength(0, 1));
    assertThrows(
        IllegalArgumentException.class,
        () ->
            WorkingCalendar.of(
                date("2026-09-07"), EnumSet.noneOf(DayOfWeek.class), List.of(), ONE));
  }
}
