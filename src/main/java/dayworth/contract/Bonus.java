package dayworth.contract;

import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.Optional;

/**
 * Early-completion bonus: money for finishing before the contract finish.
 *
 * @param rate money for one of {@code per}; a part of a week brings its share
 * @param cap the most that is paid
 * @param capCount the most earliness that is paid for, counted in {@code per}
 */
public record Bonus(Money rate, Per per, Optional<Money> cap, Optional<BigDecimal> capCount) {

  /** No bonus. */
  public static final Bonus NONE =
      new Bonus(Money.ZERO, Per.UNIT, Optional.empty(), Optional.empty());

  /** What is paid for being so early. */
  Money forEarliness(Count early) {
    if (!early.isAboveZero()) {
      return Money.ZERO;
    }
    Money paid = capCount.map(most -> early.atMost(Count.of(most))).orElse(early).at(rate);
    return cap.map(paid::min).orElse(paid);
  }
}
