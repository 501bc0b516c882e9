package dayworth.engine.proof;

import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.value.Money;
import dayworth.value.MoneySum;
import dayworth.value.SlopeScale;
import java.math.BigInteger;

/**
 * What flows may run over activities, on one slope scale: a slope in scaled units, rounded down, so
 * that a flow within it is within the true slope.
 */
final class FlowLimits {

  private final SlopeScale scale;
  private final long[] overNormal;
  private final long[] backOverCrash;
  private final long[] backOverSpan;
  private final Money base;

  FlowLimits(Network network, SlopeScale scale) {
    this.scale = scale;
    this.overNormal = new long[network.size()];
    this.backOverCrash = new long[network.size()];
    this.backOverSpan = network.spans().stream().mapToLong(span -> floor(span.rate())).toArray();
    MoneySum sum = new MoneySum();
    for (int i = 0; i < network.size(); i++) {
      Activity activity = network.activity(i);
      Money slope = activity.slope();
      if (slope.signum() >= 0) {
        overNormal[i] = floor(slope);
      } else {
        backOverCrash[i] = floor(slope.negate());
      }
      sum.add(activity.normalCost().min(activity.crashCost()));
    }
    this.base = sum.total();
  }

  SlopeScale scale() {
    return scale;
  }

  /** What the activities cost together if each is done its cheapest way. */
  Money base() {
    return base;
  }

  /** The most over the normal duration; zero where crashing is free or cheaper. */
  long overNormal(int activity) {
    return overNormal[activity];
  }

  /** The most back over the crash duration; zero where crashing is not cheaper. */
  long backOverCrash(int activity) {
    return backOverCrash[activity];
  }

  /** The most back over a span. */
  long backOverSpan(int span) {
    return backOverSpan[span];
  }

  /** A slope beyond a long is cut to the largest long, which is on the safe side too. */
  private long floor(Money slope) {
    BigInteger scaled =
        slope.numerator().multiply(BigInteger.valueOf(scale.perUnit())).divide(slope.denominator());
    return scaled.min(BigInteger.valueOf(Long.MAX_VALUE)).longValueExact();
  }
}
