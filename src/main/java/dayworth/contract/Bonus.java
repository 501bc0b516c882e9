package dayworth.contract;

import dayworth.value.Money;
import java.util.Optional;

/**
 * Early-completion bonus: money for each time unit before the contract finish.
 *
 * @param rate money per time unit
 * @param cap the most that is paid
 * @param capTicks the most earliness that is paid for, in ticks
 */
public record Bonus(Money rate, Optional<Money> cap, Optional<Long> capTicks) {

  /** No bonus. */
  public static final Bonus NONE = new Bonus(Money.ZERO, Optional.empty(), Optional.empty());

  /** What is paid for finishing {@code early} ticks before the contract finish. */
  Money forEarliness(long early, long ticksPerUnit) {
    if (early <= 0) {
      return Money.ZERO;
    }
    long counted = capTicks.map(most -> Math.min(most, early)).orElse(early);
    Money paid = rate.times(counted).dividedBy(ticksPerUnit);
    return cap.map(paid::min).orElse(paid);
  }
}
