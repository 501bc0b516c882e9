package dayworth.contract;

import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.Optional;
import java.util.stream.Stream;

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

  /** What is charged for a finish. */
  Money at(long finish, Due due, Counting counting) {
    return forLateness(counting.lateness(due, finish, per));
  }

  /** What is charged for being so late, counted in {@code per}. */
  Money forLateness(Count late) {
    Count beyond = late.plus(Count.of(grace).negate());
    if (!beyond.isAboveZero()) {
      return Money.ZERO;
    }
    Money charge = (countsWholeWeeks() ? beyond.roundedUp() : beyond).at(rate);
    return cap.map(charge::min).orElse(charge);
  }

  /** The finishes where the charge bends: from when on there is one, and where it is capped. */
  Stream<Long> bends(Due due, Counting counting) {
    if (rate.signum() == 0) {
      return Stream.empty();
    }
    return Stream.of(
            counting.lastAtMost(due, Count.NONE, per),
            counting.lastAtMost(due, Count.of(grace), per),
            cap.flatMap(most -> capReached(due, most, counting)))
        .flatMap(Optional::stream);
  }

  /** A whole week is charged from its first day, a part of one when it is over. */
  private Optional<Long> capReached(Due due, Money most, Counting counting) {
    Count free = Count.of(grace);
    Count charged = Count.reaching(most, rate);
    return countsWholeWeeks()
        ? counting.firstBeyond(due, free.plus(charged.roundedUp()).plus(Count.of(-1, 1)), per)
        : counting.firstAtLeast(due, free.plus(charged), per);
  }

  private boolean countsWholeWeeks() {
    return per == Per.WEEK && partWeek == PartWeek.WHOLE;
  }
}
