package dayworth.engine.measures;

import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Span;
import dayworth.value.Money;
import dayworth.value.MoneySum;
import dayworth.value.SlopeScale;
import java.math.BigInteger;
import java.util.Optional;

/**
 * A slope scale for bounds that any flow proves: a power of two, so fine that rounding down costs
 * little, and so coarse that flows that were narrowed many times stay whole.
 */
final class WayScale {

  private static final BigInteger MOST = BigInteger.ONE.shiftLeft(61);

  /** How many times all slopes together a flow may grow to while durations are narrowed. */
  private static final long TIMES_ALL_SLOPES = 64;

  private static final int FINEST = 40;

  private WayScale() {}

  /** The scale for a relaxed network; empty if its amounts are too large. */
  static Optional<SlopeScale> of(Network relaxed) {
    MoneySum slopes = new MoneySum();
    Money dearest = Money.of(1);
    for (Activity activity : relaxed.activities()) {
      slopes.add(activity.slope().max(activity.slope().negate()));
      dearest = dearest.max(activity.normalCost()).max(activity.crashCost());
    }
    for (Span span : relaxed.spans()) {
      slopes.add(span.rate());
    }
    Money most = slopes.total().times(TIMES_ALL_SLOPES).max(dearest);
    BigInteger room = MOST.multiply(most.denominator()).divide(most.numerator());
    int power = Math.min(FINEST, room.bitLength() - 1);
    return power < 0 ? Optional.empty() : Optional.of(new SlopeScale(1L << power, false));
  }
}
