package dayworth.engine.branching;

import dayworth.engine.stepping.Stepping;
import dayworth.network.Activity;
import dayworth.network.Measure;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.value.Money;
import dayworth.value.MoneySum;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;

/** What a network's money comes to with charges, and how much it can come to. */
public final class ChargedMoney {

  private ChargedMoney() {}

  /** The exact cost of a plan that says when activities start, charges included. */
  public static Money cost(Network network, List<Charge> charges, Plan plan) {
    MoneySum sum = new MoneySum().add(plan.cost(network));
    charges.forEach(charge -> sum.add(at(charge, plan)));
    return sum.total();
  }

  /**
   * Whether every branch has a scale for its slopes; otherwise the amounts are too large to be
   * exact.
   *
   * @param longest ticks; no duration that is asked for may be longer
   */
  public static boolean fits(Network network, List<Charge> charges, long longest) {
    if (charges.isEmpty()) {
      return Stepping.scaleFor(network).isPresent();
    }
    Money fence = fence(network, charges, longest);
    Branch whole = Branch.whole(network, charges, longest);
    SlopeGrain grain = SlopeGrain.within(whole.windows());
    Money steepest = fence.plus(Money.of(1).dividedBy(grain.perUnit()));
    List<Span> spans = new ArrayList<>(network.spans());
    for (Charge charge : charges) {
      for (Moment moment : charge.moments()) {
        spans.add(new Span(charge.name(), Moment.PROJECT_START, moment, longest, steepest));
      }
    }
    Network fenced = network.withSpans(spans);
    return Stepping.scaleFor(fenced)
        .filter(scale -> scale.perUnit() >= grain.perUnit())
        .isPresent();
  }

  /**
   * Money per tick that makes leaving a window dearer than anything within: all that compression,
   * measures, spans and charges can come to, in whole units.
   */
  public static Money fence(Network network, List<Charge> charges, long longest) {
    MoneySum sum = new MoneySum().add(Money.of(1));
    for (Activity activity : network.activities()) {
      Money extra = activity.crashExtra();
      sum.add(extra.max(extra.negate()));
    }
    for (Measure measure : network.measures().list()) {
      Money extra = measure.cost().minus(network.activity(measure.activity()).normalCost());
      sum.add(extra.max(extra.negate()));
    }
    network.measures().packages().forEach(each -> sum.add(each.cost()));
    for (Span span : network.spans()) {
      sum.add(span.rate(), longest + Math.abs(span.free()), 1);
    }
    for (Charge charge : charges) {
      sum.add(extreme(charge, longest, true).minus(extreme(charge, longest, false)));
    }
    return Money.of(sum.total().rounded(0, RoundingMode.CEILING));
  }

  private static Money extreme(Charge charge, long longest, boolean dearest) {
    long[] times = new long[charge.moments().size()];
    for (int k = 0; k < times.length; k++) {
      times[k] = charge.rises(k) == dearest ? longest : 0;
    }
    return charge.at(times);
  }

  static Money at(Charge charge, Plan plan) {
    return charge.at(charge.moments().stream().mapToLong(plan::time).toArray());
  }
}
