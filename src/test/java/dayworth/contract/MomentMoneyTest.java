package dayworth.contract;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.network.Moment;
import dayworth.network.Plan;
import dayworth.testing.RandomTerms;
import dayworth.testing.WalkedMoney;
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
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** What sections and running costs come to, by hand and against a clerk with a wall calendar. */
class MomentMoneyTest {

  private static final int CASES = 400;

  /** Monday, 1 March 2027, five days a week. */
  private static final WorkingCalendar MONDAY =
      WorkingCalendar.of(
          LocalDate.of(2027, 3, 1),
          EnumSet.range(DayOfWeek.MONDAY, DayOfWeek.FRIDAY),
          Set.of(),
          DayLength.ofUnits(BigDecimal.ONE, TimeScale.WHOLE));

  private static final Bonus NO_BONUS = Bonus.NONE;

  private static Damages damages(long rate, Per per, String grace, long cap, PartWeek partWeek) {
    Optional<Money> most = cap == 0 ? Optional.empty() : Optional.of(Money.of(cap));
    return new Damages(Money.of(rate), per, new BigDecimal(grace), most, partWeek);
  }

  /** A section that is activity 0 and is due on Friday, 5 March, at 5. */
  private static Section due5(Damages damages, Bonus bonus) {
    return new Section("S", 0, Due.on(LocalDate.of(2027, 3, 5), MONDAY), damages, bonus);
  }

  /** The section's damages less its bonus when it finishes at a time. */
  private static String of(Section section, long finish) {
    MomentMoney money =
        new MomentMoney(TimeScale.WHOLE, Optional.of(MONDAY), List.of(section), List.of());
    Plan plan = Plan.scheduled(new long[] {finish}, new long[] {0});
    return money.damagesOf(plan).minus(money.bonusOf(plan)).cents().toPlainString();
  }

  /** Two working days late; 1 is in the grace, so 1 × 70; at most 300. */
  @Test
  void damagesPerUnit() {
    Section section = due5(damages(70, Per.UNIT, "1", 300, PartWeek.PRO_RATA), NO_BONUS);
    assertEquals("0.00", of(section, 6));
    assertEquals("70.00", of(section, 7));
    assertEquals("280.00", of(section, 10));
    assertEquals("300.00", of(section, 11));
  }

  /** 6 is Monday, 8 March: 3 calendar days late, 1 in the grace. 2 × 70. 8: 4 × 70 = 280. */
  @Test
  void damagesPerCalendarDay() {
    Section section = due5(damages(70, Per.CALENDAR_DAY, "1", 250, PartWeek.PRO_RATA), NO_BONUS);
    assertEquals("0.00", of(section, 5));
    assertEquals("140.00", of(section, 6));
    assertEquals("250.00", of(section, 8));
  }

  /** Monday is 3/7 of a week late, Friday, 12 March, 1 week, Monday, 15 March, 10/7. */
  @Test
  void damagesPerWeek() {
    Section shared = due5(damages(70, Per.WEEK, "0", 0, PartWeek.PRO_RATA), NO_BONUS);
    assertEquals("30.00", of(shared, 6));
    assertEquals("70.00", of(shared, 10));
    assertEquals("100.00", of(shared, 11));
    Section whole = due5(damages(70, Per.WEEK, "0", 0, PartWeek.WHOLE), NO_BONUS);
    assertEquals("70.00", of(whole, 6));
    assertEquals("70.00", of(whole, 10));
    assertEquals("140.00", of(whole, 11));
  }

  /** 3 days early, 3 × 20, at most 50; by count at most 2; by the week 3/7 × 70. */
  @Test
  void bonusAndItsCaps() {
    Damages none = Damages.NONE;
    Optional<Money> fifty = Optional.of(Money.of(50));
    Optional<BigDecimal> two = Optional.of(BigDecimal.valueOf(2));
    Money rate = Money.of(20);
    Bonus plain = new Bonus(rate, Per.UNIT, Optional.empty(), Optional.empty());
    assertEquals("-60.00", of(due5(none, plain), 2));
    assertEquals("0.00", of(due5(none, plain), 6));
    assertEquals("-50.00", of(due5(none, new Bonus(rate, Per.UNIT, fifty, Optional.empty())), 2));
    assertEquals("-40.00", of(due5(none, new Bonus(rate, Per.CALENDAR_DAY, fifty, two)), 2));
    Bonus byWeek = new Bonus(Money.of(70), Per.WEEK, Optional.empty(), Optional.empty());
    assertEquals("-30.00", of(due5(none, byWeek), 2));
  }

  /** Finished on Tuesday, 9 March, 4 days late, whatever the plan: 4 × 70. */
  @Test
  void aFinishedSectionHasItsMoneyFixed() {
    Section section =
        new Section(
            "S",
            0,
            new Due(-5, Optional.of(LocalDate.of(2027, 3, 5))),
            damages(70, Per.CALENDAR_DAY, "0", 0, PartWeek.PRO_RATA),
            NO_BONUS,
            Optional.of(new Section.Done(-3, LocalDate.of(2027, 3, 9))));
    assertEquals("280.00", of(section, 0));
    assertEquals("280.00", of(section, 20));
    MomentMoney money =
        new MomentMoney(TimeScale.WHOLE, Optional.of(MONDAY), List.of(section), List.of());
    assertEquals(List.of(), money.charges());
    assertEquals(List.of(), money.spans());
  }

  private static String hire(Per per, long from, long to) {
    return hire(MONDAY, Moment.startOf(0), per, from, to);
  }

  private static String hire(WorkingCalendar calendar, Moment from, Per per, long start, long end) {
    RunningCost cost = new RunningCost("H", from, Moment.finishOf(1), Money.of(10), per);
    MomentMoney money =
        new MomentMoney(TimeScale.WHOLE, Optional.of(calendar), List.of(), List.of(cost));
    Plan plan = Plan.scheduled(new long[] {0, 0}, new long[] {start, end});
    return money.runningOf(plan).cents().toPlainString();
  }

  /** From the morning of Friday (4) to the end of Monday (6): 2 units; Fri Sat Sun Mon. */
  @Test
  void hireOverAWeekend() {
    assertEquals("20.00", hire(Per.UNIT, 4, 6));
    assertEquals("40.00", hire(Per.CALENDAR_DAY, 4, 6));
    assertEquals("10.00", hire(Per.WEEK, 4, 6));
  }

  /** Monday to Friday is 5 days, one begun week; Monday to the next Monday 8 days, two. */
  @Test
  void hireByBegunWeeks() {
    assertEquals("10.00", hire(Per.WEEK, 0, 5));
    assertEquals("20.00", hire(Per.WEEK, 0, 6));
  }

  @Test
  void hireIsNeverBelowZero() {
    for (Per per : Per.values()) {
      assertEquals("0.00", hire(per, 6, 3));
    }
  }

  /** Data date Friday, 5 March: until the end of Monday Sat Sun Mon; to 6, the next Monday, 10. */
  @Test
  void hireThatHasBegunCountsFromTheDayAfterTheDataDate() {
    WorkingCalendar later = MONDAY.after(LocalDate.of(2027, 3, 5));
    assertEquals("10.00", hire(later, Moment.PROJECT_START, Per.UNIT, 9, 1));
    assertEquals("30.00", hire(later, Moment.PROJECT_START, Per.CALENDAR_DAY, 9, 1));
    assertEquals("10.00", hire(later, Moment.PROJECT_START, Per.WEEK, 9, 5));
    assertEquals("20.00", hire(later, Moment.PROJECT_START, Per.WEEK, 9, 6));
  }

  @Test
  void sectionsAndHireAreWhatAClerkCounts() {
    for (int seed = 0; seed < CASES; seed++) {
      Random random = new Random(seed);
      RandomTerms drawn = RandomTerms.of(random, new TimeScale(1), 20);
      Terms terms = drawn.terms();
      if (terms.contractFinish().isEmpty()) {
        continue;
      }
      WalkedMoney clerk = new WalkedMoney(terms, drawn.holidays());
      Due due = terms.contractFinish().get();
      Section section = new Section("S", 0, due, terms.damages(), terms.bonus());
      Per per = random.nextBoolean() ? Per.CALENDAR_DAY : Per.WEEK;
      RunningCost cost =
          new RunningCost("H", Moment.startOf(0), Moment.finishOf(1), Money.of(10), per);
      MomentMoney money =
          new MomentMoney(terms.scale(), terms.calendar(), List.of(section), List.of(cost));
      for (int k = 0; k < 20; k++) {
        long finish = random.nextInt(300);
        long start = random.nextInt(300);
        Plan plan = Plan.scheduled(new long[] {finish - start, 0}, new long[] {start, finish});
        String where = "seed " + seed + " from " + start + " to " + finish;
        assertEquals(clerk.damages(finish), money.damagesOf(plan), where);
        assertEquals(clerk.bonus(finish), money.bonusOf(plan), where);
        long days = 0;
        LocalDate last = clerk.finishDate(finish);
        for (LocalDate day = clerk.startDate(start); !day.isAfter(last); day = day.plusDays(1)) {
          days++;
        }
        long count = per == Per.WEEK ? -Math.floorDiv(-days, 7L) : days;
        assertEquals(Money.of(10 * count), money.runningOf(plan), where);
      }
    }
  }

  @Test
  void linearSectionsAreTheirMoneyAtEveryTick() {
    int linear = 0;
    for (int seed = 0; seed < 4 * CASES; seed++) {
      Random random = new Random(seed);
      Terms terms = RandomTerms.of(random, new TimeScale(1), 20).terms();
      if (terms.contractFinish().isEmpty()) {
        continue;
      }
      Due due = terms.contractFinish().get();
      Section section = new Section("S", 0, due, terms.damages(), terms.bonus());
      MomentMoney money =
          new MomentMoney(terms.scale(), terms.calendar(), List.of(section), List.of());
      if (!money.charges().isEmpty()) {
        continue;
      }
      linear++;
      for (long finish = 0; finish < 300; finish++) {
        Plan plan = Plan.scheduled(new long[] {finish}, new long[] {0});
        Money sum = money.fixed();
        for (var span : money.spans()) {
          sum = sum.plus(span.rate().times(plan.charged(span)));
        }
        assertEquals(
            money.damagesOf(plan).minus(money.bonusOf(plan)), sum, "seed " + seed + " " + finish);
      }
    }
    assertTrue(linear > 20, linear + " were linear");
  }
}
