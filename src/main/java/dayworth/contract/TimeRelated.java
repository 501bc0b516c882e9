package dayworth.contract;

import dayworth.value.Money;

/**
 * Indirect cost that stops when the project finishes.
 *
 * @param rate money for one of {@code per}; a part of a week costs its share
 */
public record TimeRelated(Money rate, Per per) {

  /** None. */
  public static final TimeRelated NONE = new TimeRelated(Money.ZERO, Per.UNIT);

  /** What it comes to at a finish. */
  Money until(long finish, Counting counting) {
    return counting.until(finish, per).at(rate);
  }
}
