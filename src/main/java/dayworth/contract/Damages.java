package dayworth.contract;

import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.Optional;

/**
 * Liquidated damages: money for lateness beyond the grace.
 *
 * @param rate money for one of {@code per}
 * @param grace lateness that costs nothing, counted in {@code per}; only what is beyond it is
 *     charged
 * @param cap the most that can be charged
 * @param partWeek used per week only
 */
public record Damages(
    Money rate, Per per, BigDecimal grace, Optional<Money> cap, PartWeek partWeek) {

  /** No damages. */
  public static final Damages NONE = perUnit(Money.ZERO, BigDecimal.ZERO, Optional.empty());

  /** Damages for each time unit. */
  public static Damages perUnit(Money rate, BigDecimal grace, Optional<Money> cap) {
    return new Damages(rate, Per.UNIT, grace, cap, PartWeek.PRO_RATA);
  }

  /** What is charged for being so late. */
  Money forLateness(Count late) {
    Count beyond = late.plus(Count.of(grace).negate());
    if (!beyond.isAboveZero()) {
      return Money.ZERO;
    }
    Money charge = (countsWholeWeeks() ? beyond.roundedUp() : beyond).at(rate);
    return cap.map(charge::min).orElse(charge);
  }

  /** Whether the charge rises by whole weeks. */
  boolean countsWholeWeeks() {
    return per == Per.WEEK && partWeek == PartWeek.WHOLE;
  }
}
