package dayworth.contract;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.value.DayLength;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.math.BigDecimal;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/** Each rule of the money with its sum; Monday to Friday, one tick a working day. */
class TermsTest {

  private static final Optional<Money> NO_CAP = Optional.empty();
  private static final LocalDate MONDAY = LocalDate.parse("2026-09-07");
  private static final WorkingCalendar CALENDAR =
      WorkingCalendar.of(
          MONDAY,
          EnumSet.range(DayOfWeek.MONDAY, DayOfWeek.FRIDAY),
          List.of(),
          new DayLength(1, 1));

  private static Money money(long units) {
    return Money.of(units);
  }

  private static Damages damages(long rate, Per per, String grace, PartWeek partWeek) {
    return new Damages(money(rate), per, new BigDecimal(grace), NO_CAP, partWeek);
  }

  private static Terms terms(Damages damages, Bonus bonus, String contractFinish) {
    return new Terms(
        TimeScale.WHOLE,
        Optional.of(CALENDAR),
        TimeRelated.NONE,
        Money.ZERO,
        Optional.of(Due.on(LocalDate.parse(contractFinish), CALENDAR)),
        damages,
        bonus);
  }

  private static Money charged(Damages damages, String contractFinish, long finish) {
    return terms(damages, Bonus.NONE, contractFinish).at(finish).damages();
  }

  private static Money paid(Bonus bonus, String contractFinish, long finish) {
    return terms(Damages.NONE, bonus, contractFinish).at(finish).bonus();
  }

  private static Money timeRelated(long rate, Per per, long finish) {
    return new Terms(
            TimeScale.WHOLE,
            Optional.of(CALENDAR),
            new TimeRelated(money(rate), per),
            Money.ZERO,
            Optional.empty(),
            Damages.NONE,
            Bonus.NONE)
        .at(finish)
        .timeRelated();
  }

  /** The contract finish is Friday 11 September. */
  @Test
  void aWorkingDaySavedOverAWeekendIsThreeCalendarDays() {
    Damages perDay = damages(4_000, Per.CALENDAR_DAY, "0", PartWeek.PRO_RATA);
    assertEquals(money(0), charged(perDay, "2026-09-11", 5));
    // the sixth working day is Monday 14: 3 days late
    assertEquals(money(12_000), charged(perDay, "2026-09-11", 6));
    assertEquals(money(16_000), charged(perDay, "2026-09-11", 7));
    Damages perUnit = damages(4_000, Per.UNIT, "0", PartWeek.PRO_RATA);
    assertEquals(money(4_000), charged(perUnit, "2026-09-11", 6));
  }

  /** Sunday 13 September: by the date Monday is 1 day late, in units it is 1 after Friday. */
  @Test
  void aContractFinishOnARestDay() {
    Damages perDay = damages(4_000, Per.CALENDAR_DAY, "0", PartWeek.PRO_RATA);
    assertEquals(money(4_000), charged(perDay, "2026-09-13", 6));
    assertEquals(money(0), charged(perDay, "2026-09-13", 5));
    Damages perUnit = damages(4_000, Per.UNIT, "0", PartWeek.PRO_RATA);
    assertEquals(money(4_000), charged(perUnit, "2026-09-13", 6));
    Bonus bonus = new Bonus(money(100), Per.CALENDAR_DAY, NO_CAP, Optional.empty());
    // Friday is 2 days before the Sunday
    assertEquals(money(200), paid(bonus, "2026-09-13", 5));
  }

  @Test
  void aContractFinishInUnitsHasTheDateOfSuchAProject() {
    Due fiveDays = Due.after(5, CALENDAR);
    assertEquals(Optional.of(LocalDate.parse("2026-09-11")), fiveDays.date());
    // time counts from Monday 14 September: the contract finish was at its 0
    WorkingCalendar toGo = CALENDAR.after(LocalDate.parse("2026-09-12"));
    assertEquals(new Due(0, fiveDays.date()), Due.after(5, toGo));
    assertEquals(new Due(-1, Optional.of(LocalDate.parse("2026-09-10"))), Due.after(4, toGo));
  }

  @Test
  void onlyWhatIsBeyondTheGraceIsCharged() {
    Damages perDay = damages(4_000, Per.CALENDAR_DAY, "4", PartWeek.PRO_RATA);
    // Monday is 3 days late, Tuesday 4, Wednesday 5
    assertEquals(money(0), charged(perDay, "2026-09-11", 7));
    assertEquals(money(4_000), charged(perDay, "2026-09-11", 8));
    Damages half = damages(4_000, Per.CALENDAR_DAY, "2.5", PartWeek.PRO_RATA);
    assertEquals(money(2_000), charged(half, "2026-09-11", 6));
  }

  /** Wednesday 16 is 5 days after Friday 11, Friday 18 is 7, Monday 21 is 10. */
  @Test
  void aPartOfAWeekIsItsShareOrAWholeOne() {
    Damages share = damages(7_000, Per.WEEK, "0", PartWeek.PRO_RATA);
    Damages whole = damages(7_000, Per.WEEK, "0", PartWeek.WHOLE);
    assertEquals(money(5_000), charged(share, "2026-09-11", 8));
    assertEquals(money(7_000), charged(whole, "2026-09-11", 8));
    assertEquals(money(7_000), charged(share, "2026-09-11", 10));
    assertEquals(money(7_000), charged(whole, "2026-09-11", 10));
    assertEquals(money(10_000), charged(share, "2026-09-11", 11));
    assertEquals(money(14_000), charged(whole, "2026-09-11", 11));
  }

  /** Monday 21 is 10 days late, 3 of them beyond the week. */
  @Test
  void wholeWeeksAreCountedAfterTheGrace() {
    assertEquals(
        money(3_000), charged(damages(7_000, Per.WEEK, "1", PartWeek.PRO_RATA), "2026-09-11", 11));
    assertEquals(
        money(7_000), charged(damages(7_000, Per.WEEK, "1", PartWeek.WHOLE), "2026-09-11", 11));
    assertEquals(
        money(0), charged(damages(7_000, Per.WEEK, "1", PartWeek.WHOLE), "2026-09-11", 10));
  }

  @Test
  void damagesStopAtTheirCap() {
    Damages capped =
        new Damages(
            money(4_000),
            Per.CALENDAR_DAY,
            BigDecimal.ONE,
            Optional.of(money(10_000)),
            PartWeek.PRO_RATA);
    // 3 - 1 = 2 days: 8,000; 4 - 1 = 3 days: 12,000, capped
    assertEquals(money(8_000), charged(capped, "2026-09-11", 6));
    assertEquals(money(10_000), charged(capped, "2026-09-11", 7));
  }

  /** The contract finish is Monday 21 September; Friday 18 is 3 days early, Monday 14 is 7. */
  @Test
  void theBonusStopsAtItsCaps() {
    Bonus inDays =
        new Bonus(
            money(500),
            Per.CALENDAR_DAY,
            Optional.of(money(9_999)),
            Optional.of(new BigDecimal(6)));
    assertEquals(money(1_500), paid(inDays, "2026-09-21", 10));
    assertEquals(money(3_000), paid(inDays, "2026-09-21", 6));
    Bonus inMoney =
        new Bonus(money(500), Per.CALENDAR_DAY, Optional.of(money(2_000)), Optional.empty());
    assertEquals(money(2_000), paid(inMoney, "2026-09-21", 6));
    Bonus perWeek = new Bonus(money(700), Per.WEEK, NO_CAP, Optional.of(new BigDecimal("0.5")));
    assertEquals(money(300), paid(perWeek, "2026-09-21", 10));
    assertEquals(money(350), paid(perWeek, "2026-09-21", 6));
    assertEquals(money(0), paid(inDays, "2026-09-21", 11));
  }

  @Test
  void timeRelatedCostRunsFromTheStartToTheFinishDate() {
    assertEquals(money(60), timeRelated(10, Per.UNIT, 6));
    // Monday 7 to Monday 14, both counted: 8 days
    assertEquals(money(80), timeRelated(10, Per.CALENDAR_DAY, 6));
    assertEquals(money(80).dividedBy(7), timeRelated(10, Per.WEEK, 6));
    assertEquals(money(10), timeRelated(10, Per.CALENDAR_DAY, 0));
  }

  /**
   * Contract finish Friday 11 (day 5). Grace 4 days: Tuesday 15 (day 7). Cap 10,000 at 4,000: 2.5
   * days more, so 6.5 days late: reached on Friday 18 (day 10). Bonus for 2 days: Wednesday 9 (day
   * 3); 400 at 500 are 0.8 of a day: Thursday (day 4).
   */
  @Test
  void bendsByTheDateAreEndsOfWorkingDays() {
    Terms terms =
        terms(
            new Damages(
                money(4_000),
                Per.CALENDAR_DAY,
                new BigDecimal(4),
                Optional.of(money(10_000)),
                PartWeek.PRO_RATA),
            new Bonus(
                money(500),
                Per.CALENDAR_DAY,
                Optional.of(money(400)),
                Optional.of(new BigDecimal(2))),
            "2026-09-11");
    assertEquals(new TreeSet<>(Set.of(3L, 4L, 5L, 7L, 10L)), terms.bends());
  }

  /** A cap of 8,000 at 7,000 a week is two weeks, begun on the 8th day: Monday 21 (day 11). */
  @Test
  void aCapInWholeWeeksIsReachedWhenItsWeekBegins() {
    Damages whole =
        new Damages(
            money(7_000), Per.WEEK, BigDecimal.ZERO, Optional.of(money(8_000)), PartWeek.WHOLE);
    // Saturday 19 is the 8th day
    assertEquals(new TreeSet<>(Set.of(5L, 11L)), terms(whole, Bonus.NONE, "2026-09-11").bends());
    assertEquals(money(7_000), charged(whole, "2026-09-11", 10));
    assertEquals(money(8_000), charged(whole, "2026-09-11", 11));
  }

  @Test
  void aCapBeyondAllProjectsIsNoBend() {
    Damages slow =
        new Damages(
            Money.of(new BigDecimal("0.0001")),
            Per.CALENDAR_DAY,
            BigDecimal.ZERO,
            Optional.of(money(1_000_000_000_000L)),
            PartWeek.PRO_RATA);
    assertEquals(new TreeSet<>(Set.of(5L)), terms(slow, Bonus.NONE, "2026-09-11").bends());
    Terms inUnits =
        new Terms(
            new TimeScale(3),
            Optional.empty(),
            TimeRelated.NONE,
            Money.ZERO,
            Optional.of(Due.at(5_000)),
            Damages.perUnit(slow.rate(), BigDecimal.ZERO, slow.cap()),
            Bonus.NONE);
    assertEquals(new TreeSet<>(Set.of(5_000L)), inUnits.bends());
  }

  @Test
  void moneyByTheDateNeedsDates() {
    assertThrows(
        IllegalArgumentException.class,
        () ->
            new Terms(
                TimeScale.WHOLE,
                Optional.empty(),
                new TimeRelated(money(1), Per.WEEK),
                Money.ZERO,
                Optional.empty(),
                Damages.NONE,
                Bonus.NONE));
    assertTrue(Per.WEEK.isByDate());
  }
}
