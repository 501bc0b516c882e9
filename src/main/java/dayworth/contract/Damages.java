package dayworth.contract;

import dayworth.value.Money;
import java.util.Optional;

/**
 * Liquidated damages: money for each time unit of lateness beyond the grace.
 *
 * @param rate money per time unit
 * @param grace lateness that costs nothing, in ticks; only what is beyond it is charged
 * @param cap the most that can be charged
 */
public record Damages(Money rate, long grace, Optional<Money> cap) {

  /** No damages. */
  public static final Damages NONE = new Damages(Money.ZERO, 0, Optional.empty());

  /** What is charged for finishing {@code late} ticks after the contract finish. */
  Money forLateness(long late, long ticksPerUnit) {
    if (late <= grace) {
      return Money.ZERO;
    }
    Money charge = rate.times(late - grace).dividedBy(ticksPerUnit);
    return cap.map(charge::min).orElse(charge);
  }
}
