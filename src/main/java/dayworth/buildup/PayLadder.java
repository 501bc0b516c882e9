package dayworth.buildup;

import dayworth.value.Quantity;
import java.util.List;

/**
 * What the hours of a worker's week are paid, in straight-time hours: each step holds from its hour
 * up to the next; hours below the first step are paid once.
 *
 * <p>US federal law, for example, wants one and a half times the rate above 40 hours a week (Fair
 * Labor Standards Act): one step, above 40, times 1.5.
 *
 * @param steps by hours, ascending; may be empty
 */
public record PayLadder(List<Step> steps) {

  public static final PayLadder STRAIGHT = new PayLadder(List.of());

  /**
   * A step.
   *
   * @param aboveHours of a worker's week; 0 for all hours
   * @param multiplier of the straight-time rate; more than 0
   */
  public record Step(Quantity aboveHours, Quantity multiplier) {

    public Step {
      if (aboveHours.signum() < 0 || multiplier.signum() <= 0) {
        throw new IllegalArgumentException("above 0 hours or more, times more than 0");
      }
    }
  }

  public PayLadder {
    steps = List.copyOf(steps);
    for (int i = 1; i < steps.size(); i++) {
      if (steps.get(i - 1).aboveHours().compareTo(steps.get(i).aboveHours()) >= 0) {
        throw new IllegalArgumentException("steps rise, each from an hour of its own");
      }
    }
  }

  /** How many straight-time hours are paid for a week of so many hours. */
  public Quantity paid(Quantity hours) {
    Quantity paid = hours;
    for (int i = 0; i < steps.size(); i++) {
      Step step = steps.get(i);
      Quantity upTo = i + 1 < steps.size() ? steps.get(i + 1).aboveHours().min(hours) : hours;
      Quantity within = upTo.minus(step.aboveHours()).max(Quantity.ZERO);
      paid = paid.plus(within.times(step.multiplier().minus(Quantity.ONE)));
    }
    return paid;
  }
}
