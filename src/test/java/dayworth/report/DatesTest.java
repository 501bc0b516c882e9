package dayworth.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.DayOfWeek;
import java.time.LocalDate;
import java.util.EnumSet;
import java.util.List;
import org.junit.jupiter.api.Test;

class DatesTest {

  @Test
  void datesAreSpokenWithTheirWeekday() {
    assertEquals("Wed 2 Dec 2026", Dates.spoken(LocalDate.parse("2026-12-02")));
    assertEquals("Wed 16 Sep 2026", Dates.spoken(LocalDate.parse("2026-09-16")));
  }

  @Test
  void weekdaysInARowAreTheirEnds() {
    assertEquals("Mon to Fri", Dates.weekdays(EnumSet.range(DayOfWeek.MONDAY, DayOfWeek.FRIDAY)));
    assertEquals("Mon to Sun", Dates.weekdays(EnumSet.allOf(DayOfWeek.class)));
    assertEquals("Sat Sun", Dates.weekdays(List.of(DayOfWeek.SUNDAY, DayOfWeek.SATURDAY)));
    assertEquals(
        "Mon Tue Thu",
        Dates.weekdays(EnumSet.of(DayOfWeek.MONDAY, DayOfWeek.TUESDAY, DayOfWeek.THURSDAY)));
  }

  /**
   * Day 1 is Monday 7 September 2026, day 85 Friday 1 January 2027; 48 weeks after the Monday, on
   * day 241, it is 9 August.
   */
  @Test
  void theYearStandsWhereADayCouldBeOfTwoYears() {
    Dates dates = new Dates(SeriesAnswer.DATED);
    assertEquals(List.of("Fri  1 Jan", "Mon  7 Sep"), dates.column(List.of(85L, 1L)));
    assertEquals(List.of("Mon  9 Aug 2027", "Mon  7 Sep 2026"), dates.column(List.of(241L, 1L)));
  }
}
