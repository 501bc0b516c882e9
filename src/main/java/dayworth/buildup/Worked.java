package dayworth.buildup;

import dayworth.value.Money;
import dayworth.value.Quantity;

/**
 * What a crew does in some time at one pattern. Hours are of all workers together.
 *
 * @param weeks how long
 * @param hours worked
 * @param lost of them, those that yield nothing because output falls at this pattern
 * @param crowded of the others, those that yield nothing because workers are in each other's way
 * @param paid how many straight-time hours are paid for them
 * @param weekCost the pattern's cost of so many weeks
 */
record Worked(
    Quantity weeks,
    Quantity hours,
    Quantity lost,
    Quantity crowded,
    Quantity paid,
    Money weekCost) {

  static final Worked NOTHING =
      new Worked(
          Quantity.ZERO, Quantity.ZERO, Quantity.ZERO, Quantity.ZERO, Quantity.ZERO, Money.ZERO);

  /** A whole week of a spell, 1 for its first. */
  static Worked week(Labour labour, Pattern pattern, int week) {
    Quantity hours = pattern.crewHours(labour);
    Quantity lost = hours.times(pattern.loss().in(week));
    Quantity workers = labour.crew().times(pattern.crewFactor());
    return new Worked(
        Quantity.ONE,
        hours,
        lost,
        hours.minus(lost).times(pattern.crowdingLoss()),
        workers.times(pattern.pay().paid(pattern.hoursPerWeek())),
        pattern.weekCost());
  }

  /** What is done, in hours of the normal pattern. */
  Quantity output() {
    return hours.minus(lost).minus(crowded);
  }

  /** Straight-time hours paid above those worked. */
  Quantity premiumHours() {
    return paid.minus(hours);
  }

  Worked plus(Worked other) {
    return new Worked(
        weeks.plus(other.weeks),
        hours.plus(other.hours),
        lost.plus(other.lost),
        crowded.plus(other.crowded),
        paid.plus(other.paid),
        weekCost.plus(other.weekCost));
  }

  /** As much of it as yields so much output; time, pay and cost are pro rata. */
  Worked until(Quantity output) {
    return times(output.dividedBy(output()));
  }

  private Worked times(Quantity factor) {
    return new Worked(
        weeks.times(factor),
        hours.times(factor),
        lost.times(factor),
        crowded.times(factor),
        paid.times(factor),
        factor.at(weekCost));
  }
}
