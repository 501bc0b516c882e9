package dayworth.decision;

import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * What is different about one activity between two plans.
 *
 * @param activity index in the network
 * @param kind what happens to it
 * @param measure the measure that is switched on or off, or the new one of an exchange; {@link
 *     Plan#NO_MEASURE} where it goes along its line
 * @param shortened ticks taken out; negative if ticks are given back; 0 where a measure changes
 *     money alone
 * @param extra what the activity costs more; below zero where it costs less
 */
public record PlanChange(int activity, Kind kind, int measure, long shortened, Money extra) {

  /** What happens to an activity. */
  public enum Kind {
    COMPRESS,
    RELAX,
    ON,
    OFF,
    EXCHANGE
  }

  /** Whether ticks are given back. */
  public boolean isGivenBack() {
    return shortened < 0 || (shortened == 0 && kind == Kind.OFF);
  }

  /** The price of a tick; empty where no tick is taken out or given back. */
  public Optional<Money> pricePerTick() {
    return shortened == 0 ? Optional.empty() : Optional.of(extra.dividedBy(shortened));
  }

  /** All changes between two plans, in file order. */
  static List<PlanChange> between(Network network, Plan before, Plan after) {
    List<PlanChange> changes = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      long shortened = before.duration(i) - after.duration(i);
      int from = before.measure(i);
      int to = after.measure(i);
      if (shortened != 0 || from != to) {
        Money extra = after.costOf(network, i).minus(before.costOf(network, i));
        int measure = to == Plan.NO_MEASURE ? from : to;
        changes.add(new PlanChange(i, kind(from, to, shortened), measure, shortened, extra));
      }
    }
    return changes;
  }

  private static Kind kind(int from, int to, long shortened) {
    if (from == to) {
      return shortened > 0 ? Kind.COMPRESS : Kind.RELAX;
    }
    if (from == Plan.NO_MEASURE) {
      return Kind.ON;
    }
    return to == Plan.NO_MEASURE ? Kind.OFF : Kind.EXCHANGE;
  }
}
