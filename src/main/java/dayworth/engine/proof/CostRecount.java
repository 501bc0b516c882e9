package dayworth.engine.proof;

import dayworth.network.Activity;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.value.Money;
import dayworth.value.MoneySum;
import java.math.BigInteger;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Recounts a plan's cost exactly: Σ normal cost + slope × (normal − duration), or what its measure
 * costs; each package that is used, once; and for each span its rate times the ticks beyond what is
 * free.
 *
 * <p>Slopes are fractions; those with equal denominators are added as whole numbers, so that a
 * large network is counted in one quick pass. A slope whose numerator does not fit in a long is
 * added as it is.
 */
final class CostRecount {

  private static final int BY_ITSELF = -1;

  private final Network network;
  private final Money normalCost;
  private final BigInteger[] denominators;

  /** For each activity the place of its slope's denominator, or {@link #BY_ITSELF}. */
  private final int[] group;

  private final long[] numerator;

  CostRecount(Network network) {
    this.network = network;
    this.group = new int[network.size()];
    this.numerator = new long[network.size()];
    Map<BigInteger, Integer> groups = new LinkedHashMap<>();
    MoneySum sum = new MoneySum();
    for (int i = 0; i < group.length; i++) {
      Activity activity = network.activity(i);
      sum.add(activity.normalCost());
      Money slope = activity.slope();
      boolean fits = slope.numerator().bitLength() < Long.SIZE;
      numerator[i] = fits ? slope.numerator().longValueExact() : 0;
      group[i] = fits ? groups.computeIfAbsent(slope.denominator(), d -> groups.size()) : BY_ITSELF;
    }
    this.normalCost = sum.total();
    this.denominators = groups.keySet().toArray(BigInteger[]::new);
  }

  Money of(Plan plan) {
    WideSum[] sums = new WideSum[denominators.length];
    for (int g = 0; g < sums.length; g++) {
      sums[g] = new WideSum();
    }
    MoneySum cost = new MoneySum().add(normalCost);
    for (int i = 0; i < group.length; i++) {
      Activity activity = network.activity(i);
      if (plan.measure(i) != Plan.NO_MEASURE) {
        cost.add(network.measures().get(plan.measure(i)).cost().minus(activity.normalCost()));
        continue;
      }
      long shortened = activity.normal() - plan.duration(i);
      if (group[i] != BY_ITSELF) {
        sums[group[i]].addProduct(numerator[i], shortened);
      } else if (shortened != 0) {
        cost.add(activity.slope(), shortened, 1);
      }
    }
    for (int g = 0; g < sums.length; g++) {
      cost.add(Money.fraction(sums[g].total(), denominators[g]));
    }
    for (int index : plan.packages(network)) {
      cost.add(network.measures().packages().get(index).cost());
    }
    for (Span span : network.spans()) {
      long apart = time(plan, span.to()) - time(plan, span.from());
      if (apart > span.free()) {
        cost.add(span.rate(), apart - span.free(), 1);
      }
    }
    return cost.total();
  }

  private static long time(Plan plan, Moment moment) {
    if (moment.isProjectStart()) {
      return 0;
    }
    long start = plan.start(moment.activity());
    return moment.isFinish() ? start + plan.duration(moment.activity()) : start;
  }
}
