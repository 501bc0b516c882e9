package dayworth.buildup;

import dayworth.value.Money;
import dayworth.value.Quantity;
import java.util.OptionalInt;

/**
 * A working pattern: the hours and days of a week, how many workers, what they are paid and what
 * they lose.
 *
 * @param name as the case calls it
 * @param hoursPerWeek of one worker; more than 0
 * @param daysPerWeek on which a worker works; more than 0
 * @param crewFactor how many times the normal crew is at work; more than 0
 * @param crowdingLoss share of the output that is lost because workers are in each other's way; 0
 *     or more, below 1
 * @param onceCost paid once for a spell
 * @param weekCost paid for each week, pro rata: foreman, lighting, security, transport
 * @param weeksMax the longest spell; empty for any
 * @param note for people; may be empty
 */
public record Pattern(
    String name,
    Quantity hoursPerWeek,
    Quantity daysPerWeek,
    Quantity crewFactor,
    Quantity crowdingLoss,
    Money onceCost,
    Money weekCost,
    OptionalInt weeksMax,
    String note,
    PayLadder pay,
    OutputLoss loss) {

  public Pattern {
    if (hoursPerWeek.signum() <= 0 || daysPerWeek.signum() <= 0 || crewFactor.signum() <= 0) {
      throw new IllegalArgumentException(name + ": hours, days and workers are more than 0");
    }
    if (crowdingLoss.signum() < 0 || crowdingLoss.compareTo(Quantity.ONE) >= 0) {
      throw new IllegalArgumentException(name + ": some output is left");
    }
  }

  public Quantity hoursPerDay() {
    return hoursPerWeek.dividedBy(daysPerWeek);
  }

  /** How many hours a crew works in a week, all workers together. */
  Quantity crewHours(Labour labour) {
    return labour.crew().times(crewFactor).times(hoursPerWeek);
  }
}
