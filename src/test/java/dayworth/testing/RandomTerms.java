package dayworth.testing;

import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.PartWeek;
import dayworth.contract.Per;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.value.DayLength;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.math.BigDecimal;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;

/**
 * Terms with dates drawn from a seed: every per, grace, caps and counts with decimals, contract
 * finishes on rest days and in units, part weeks both ways, holidays in heaps, data dates.
 *
 * @param terms what was drawn
 * @param holidays the holidays of its calendar
 */
public record RandomTerms(Terms terms, Set<LocalDate> holidays) {

  private static final List<Per> PERS = List.of(Per.values());

  /**
   * Draws.
   *
   * @param scale the scale of the times
   * @param reach about how many units the contract finish is after the start
   */
  public static RandomTerms of(Random random, TimeScale scale, int reach) {
    LocalDate start = LocalDate.of(2024, 1, 1).plusDays(random.nextInt(1500));
    Set<LocalDate> holidays = new HashSet<>();
    for (int k = random.nextInt(30); k > 0; k--) {
      holidays.add(start.plusDays(random.nextInt(200) - 20));
    }
    EnumSet<DayOfWeek> weekdays = EnumSet.of(DayOfWeek.of(1 + random.nextInt(7)));
    for (DayOfWeek day : DayOfWeek.values()) {
      if (random.nextInt(4) > 0) {
        weekdays.add(day);
      }
    }
    WorkingCalendar calendar =
        WorkingCalendar.of(start, weekdays, holidays, length(random, scale, weekdays.size()));
    if (random.nextInt(4) == 0) {
      calendar = calendar.after(start.plusDays(random.nextInt(30)));
    }
    Due due =
        random.nextBoolean()
            ? Due.on(start.plusDays(random.nextInt(2 * reach + 1)), calendar)
            : Due.after((long) random.nextInt(reach + 1) * scale.ticksPerUnit(), calendar);
    Terms terms =
        new Terms(
            scale,
            Optional.of(calendar),
            new TimeRelated(rate(random), per(random)),
            Money.ZERO,
            random.nextInt(6) == 0 ? Optional.empty() : Optional.of(due),
            new Damages(
                rate(random),
                per(random),
                random.nextBoolean() ? BigDecimal.ZERO : count(random, 4),
                cap(random),
                random.nextBoolean() ? PartWeek.WHOLE : PartWeek.PRO_RATA),
            new Bonus(
                rate(random),
                per(random),
                cap(random),
                random.nextBoolean() ? Optional.empty() : Optional.of(count(random, 8))));
    return new RandomTerms(terms, holidays);
  }

  private static DayLength length(Random random, TimeScale scale, int daysPerWeek) {
    return switch (random.nextInt(3)) {
      case 0 -> DayLength.ofWeek(daysPerWeek, scale);
      case 1 -> DayLength.ofUnits(BigDecimal.valueOf(1 + random.nextInt(3)), scale);
      default -> DayLength.ofUnits(BigDecimal.ONE, scale);
    };
  }

  private static Per per(Random random) {
    return PERS.get(random.nextInt(PERS.size()));
  }

  private static Money rate(Random random) {
    return Money.of(random.nextInt(5) == 0 ? 0 : 1 + random.nextInt(60));
  }

  private static Optional<Money> cap(Random random) {
    return random.nextBoolean() ? Optional.empty() : Optional.of(Money.of(1 + random.nextInt(400)));
  }

  private static BigDecimal count(Random random, int most) {
    return BigDecimal.valueOf(random.nextInt(most * 10 + 1), 1);
  }
}
