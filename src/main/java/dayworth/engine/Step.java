package dayworth.engine;

import dayworth.value.Money;
import java.util.List;

/**
 * One straight piece of the curve, from a breakpoint to the next shorter one.
 *
 * @param from the longer duration, ticks
 * @param to the shorter duration, ticks
 * @param extra the exact money that the whole step costs
 * @param changes what changes between the plans of the two breakpoints, in file order
 */
public record Step(long from, long to, Money extra, List<Change> changes) {

  public Step {
    if (to >= from) {
      throw new IllegalArgumentException("a step makes the project shorter");
    }
    changes = List.copyOf(changes);
  }

  public long ticks() {
    return from - to;
  }

  /** The price of one tick on this piece. */
  public Money pricePerTick() {
    return extra.dividedBy(ticks());
  }
}
