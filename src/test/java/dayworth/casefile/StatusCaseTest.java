package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.decision.Case;
import dayworth.decision.Status;
import dayworth.network.Activity;
import dayworth.value.Money;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * A small status with dates, worked by hand. From Monday 1 March 2027, Wednesday the 10th being a
 * holiday; the data date is Friday the 12th, after 9 working days, so that 0 is the morning of
 * Monday the 15th.
 */
class StatusCaseTest {

  private static final String ACTIVITIES =
      """
      id,normal_duration,normal_cost,crash_duration,crash_cost,not_before
      DONE,5,500,,,
      REST,10,1000,6,1400,2027-03-22
      FS,3,300,,,
      SS,3,300,,,
      SF,3,300,2,340,
      FF,3,300,,,
      LATE,3,300,,,11
      PAST,3,300,,,2027-03-03
      """;
  private static final String LINKS =
      """
      predecessor,successor,relation,lag
      DONE,FS,FS,8
      REST,SS,SS,7
      REST,SF,SF,9
      DONE,FF,FF,9
      """;
  private static final String TERMS =
      """
      term,value
      start_date,2027-03-01
      data_date,2027-03-12
      contract_finish,12
      time_related_cost,70
      time_related_per,calendar_day
      damages_rate,10
      """;

  @TempDir private Path folder;

  private Case read(String terms) throws IOException {
    return new CaseOnDisk(folder)
        .with("activities.csv", ACTIVITIES)
        .with("links.csv", LINKS)
        .with("holidays.csv", "date\n2027-03-10\n")
        .with("terms.csv", terms)
        .with(
            "progress.csv",
            """
            activity,started,finished,remaining_duration
            DONE,2027-03-01,2027-03-06,
            REST,2027-03-08,,4
            """)
        .sound();
  }

  private static Activity activity(Case read, String id) {
    return read.network().activity(read.network().indexOf(id).orElseThrow());
  }

  private static BigDecimal units(Case read, long ticks) {
    return read.network().scale().units(ticks).stripTrailingZeros();
  }

  /**
   * Saturday the 6th is the end of Friday the 5th, 4 working days before the 15th; Monday the 8th
   * is 4 before it too. FS: -4 + 8 = 4. SS: -4 + 7 = 3. SF: -4 + 9 = 5. FF: -4 + 9 = 5.
   */
  @Test
  void lagsCountWorkingDaysFromActualDates() throws IOException {
    Case read = read(TERMS);
    assertEquals(new BigDecimal("4"), units(read, activity(read, "FS").notBefore()));
    assertEquals(new BigDecimal("3"), units(read, activity(read, "SS").notBefore()));
    assertEquals(new BigDecimal("5"), units(read, activity(read, "SF").notFinishedBefore()));
    assertEquals(new BigDecimal("5"), units(read, activity(read, "FF").notFinishedBefore()));
    Status done = read.status(0);
    assertEquals(Optional.of(LocalDate.of(2027, 3, 1)), done.started());
    assertEquals(
        new BigDecimal("-9"), units(read, ((Status.Finished) done).start()), "9 days worked");
    assertTrue(read.isToGo(1) && !read.isToGo(0));
    assertEquals(7, read.toGo());
  }

  /** Numbers count from the start: 11 is 2 to go, 12 is 3; what is past or begun holds nothing. */
  @Test
  void numbersInACaseCountFromTheStart() throws IOException {
    Case read = read(TERMS);
    assertEquals(new BigDecimal("2"), units(read, activity(read, "LATE").notBefore()));
    assertEquals(0, activity(read, "PAST").notBefore());
    assertEquals(0, activity(read, "REST").notBefore());
    long due = read.terms().contractFinish().orElseThrow().ticks();
    assertEquals(new BigDecimal("3"), units(read, due));
  }

  /** 4 of 10 days are left, 400. 6/10 of 4 are 2.4 at the least, so 1.6 at 100 a day more. */
  @Test
  void proportionsAreExactWhereDecimalsAllowIt() throws IOException {
    Case read = read(TERMS);
    Activity rest = activity(read, "REST");
    assertEquals(new BigDecimal("4"), units(read, rest.normal()));
    assertEquals(new BigDecimal("2.4"), units(read, rest.crash()));
    assertEquals(Money.of(400), rest.normalCost());
    assertEquals(Money.of(560), rest.crashCost());
  }

  /**
   * A finish after 5 days is Friday the 19th: 7 calendar days from Saturday the 13th on, at 70; 2
   * days late at 10.
   */
  @Test
  void moneyCountsFromTheDayAfterTheDataDate() throws IOException {
    Case read = read(TERMS);
    long finish = read.network().scale().ticks(BigDecimal.valueOf(5));
    assertEquals(new BigDecimal("490.00"), read.terms().at(finish).timeRelated().cents());
    assertEquals(new BigDecimal("20.00"), read.terms().at(finish).damages().cents());
  }

  /** A data date on a Sunday is the end of the Friday before it. */
  @Test
  void aDataDateMayBeARestDay() throws IOException {
    Case friday = read(TERMS);
    Case sunday = read(TERMS.replace("2027-03-12", "2027-03-14"));
    assertEquals(friday.network().activities(), sunday.network().activities());
    long finish = sunday.network().scale().ticks(BigDecimal.valueOf(5));
    assertEquals(new BigDecimal("350.00"), sunday.terms().at(finish).timeRelated().cents());
  }

  /** In hours of 8 a day all is eight times as long. */
  @Test
  void hoursCountFromTheMorningAfterTheDataDate() throws IOException {
    Case read = read(TERMS + "time_unit,hour\nunits_per_working_day,8\n");
    // -4 days are -32 hours, so only the far lags would reach beyond 0; 8 and 9 do not.
    assertEquals(0, activity(read, "FS").notBefore());
    Status.InProgress rest = (Status.InProgress) read.status(1);
    assertEquals(new BigDecimal("-32"), units(read, rest.start()));
  }
}
