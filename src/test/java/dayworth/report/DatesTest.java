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

  /** From Monday 7 September 2026: day 1 that Monday, day 84 Thursday 31 December, then 2027. */
  @Test
  void theYearStandsWhereItDiffers() {
    Dates dates = new Dates(SeriesAnswer.DATED);
    assertEquals(List.of("Thu 31 Dec", "Mon  7 Sep"), dates.column(List.of(84L, 1L)));
    assertEquals(List.of("Fri  1 Jan 2027", "Mon  7 Sep 2026"), dates.column(List.of(85L, 1L)));
  }
}
