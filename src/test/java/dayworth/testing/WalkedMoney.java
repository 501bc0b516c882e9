package dayworth.testing;

import dayworth.contract.PartWeek;
import dayworth.contract.Per;
import dayworth.contract.Terms;
import dayworth.value.Money;
import dayworth.value.WorkingCalendar;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.time.LocalDate;
import java.util.Set;

/**
 * The money of a finish counted by walking from day to day with java.time, as a clerk with a wall
 * calendar would; nothing of the code under test is used but the terms' own numbers.
 */
public final class WalkedMoney {

  /** All amounts and counts times this are whole: thousandths, sevenths and ticks. */
  private static final long GRAIN = 7_000;

  private final Terms terms;
  private final Set<LocalDate> holidays;

  public WalkedMoney(Terms terms, Set<LocalDate> holidays) {
    this.terms = terms;
    this.holidays = Set.copyOf(holidays);
  }

  /** Time-related cost. */
  public Money timeRelated(long finish) {
    Per per = terms.timeRelated().per();
    long count =
        per == Per.UNIT
            ? inUnits(finish)
            : inDays(daysBetween(firstDay().minusDays(1), finishDate(finish)), per);
    return money(terms.timeRelated().rate(), count);
  }

  /** Damages; zero without a contract finish. */
  public Money damages(long finish) {
    if (terms.contractFinish().isEmpty()) {
      return Money.ZERO;
    }
    long grace = grains(terms.damages().grace());
    long beyond = late(finish, terms.damages().per()) - grace;
    if (beyond <= 0) {
      return Money.ZERO;
    }
    if (terms.damages().per() == Per.WEEK && terms.damages().partWeek() == PartWeek.WHOLE) {
      long weeks = 0;
      while (weeks * GRAIN < beyond) {
        weeks++;
      }
      beyond = weeks * GRAIN;
    }
    Money charge = money(terms.damages().rate(), beyond);
    return terms.damages().cap().filter(cap -> cap.compareTo(charge) < 0).orElse(charge);
  }

  /** Bonus; zero without a contract finish. */
  public Money bonus(long finish) {
    if (terms.contractFinish().isEmpty()) {
      return Money.ZERO;
    }
    long early = -late(finish, terms.bonus().per());
    if (early <= 0) {
      return Money.ZERO;
    }
    if (terms.bonus().capCount().isPresent()) {
      early = Math.min(early, grains(terms.bonus().capCount().get()));
    }
    Money pay = money(terms.bonus().rate(), early);
    return terms.bonus().cap().filter(cap -> cap.compareTo(pay) < 0).orElse(pay);
  }

  /** All of it, without the fixed cost. */
  public Money sum(long finish) {
    return timeRelated(finish).plus(damages(finish)).minus(bonus(finish));
  }

  /** Working days are crossed off, each worth its length, until the duration is used up. */
  public LocalDate finishDate(long duration) {
    WorkingCalendar calendar = terms.calendar().orElseThrow();
    LocalDate day = firstDay();
    while (!isWorked(day)) {
      day = day.plusDays(1);
    }
    long left = duration * calendar.dayLength().days() - calendar.dayLength().ticks();
    while (left > 0) {
      day = day.plusDays(1);
      left -= isWorked(day) ? calendar.dayLength().ticks() : 0;
    }
    return day;
  }

  /** Working days are crossed off while all of each fits before the time. */
  public LocalDate startDate(long time) {
    WorkingCalendar calendar = terms.calendar().orElseThrow();
    LocalDate day = firstDay();
    long left = time * calendar.dayLength().days();
    while (!isWorked(day) || left >= calendar.dayLength().ticks()) {
      left -= isWorked(day) ? calendar.dayLength().ticks() : 0;
      day = day.plusDays(1);
    }
    return day;
  }

  /** The start date, or the day after the data date. */
  public LocalDate firstDay() {
    WorkingCalendar calendar = terms.calendar().orElseThrow();
    return calendar.dataDate().isPresent()
        ? calendar.dataDate().get().plusDays(1)
        : calendar.startDate();
  }

  private boolean isWorked(LocalDate day) {
    return terms.calendar().orElseThrow().weekdays().contains(day.getDayOfWeek())
        && !holidays.contains(day);
  }

  private long late(long finish, Per per) {
    if (per == Per.UNIT) {
      return inUnits(finish - terms.contractFinish().orElseThrow().ticks());
    }
    LocalDate due = terms.contractFinish().orElseThrow().date().orElseThrow();
    return inDays(daysBetween(due, finishDate(finish)), per);
  }

  private long inUnits(long ticks) {
    return ticks * GRAIN / terms.scale().ticksPerUnit();
  }

  private static long inDays(long days, Per per) {
    return per == Per.WEEK ? days * GRAIN / 7 : days * GRAIN;
  }

  private static long grains(BigDecimal count) {
    return count.multiply(BigDecimal.valueOf(GRAIN)).longValueExact();
  }

  private static long daysBetween(LocalDate from, LocalDate to) {
    long days = 0;
    for (LocalDate day = from; day.isBefore(to); day = day.plusDays(1)) {
      days++;
    }
    for (LocalDate day = to; day.isBefore(from); day = day.plusDays(1)) {
      days--;
    }
    return days;
  }

  private static Money money(Money rate, long grains) {
    return Money.fraction(
        rate.numerator().multiply(BigInteger.valueOf(grains)),
        rate.denominator().multiply(BigInteger.valueOf(GRAIN)));
  }
}
