package dayworth.buildup;

import dayworth.value.Money;
import dayworth.value.Quantity;

/**
 * What an activity takes at the normal pattern.
 *
 * @param hours all hours of all workers together; more than 0
 * @param crew workers; more than 0, and not necessarily whole
 * @param rate pay for one straight-time hour
 * @param otherCost materials, plant and whatever else does not hang on the hours
 */
public record Labour(Quantity hours, Quantity crew, Money rate, Money otherCost) {

  public Labour {
    if (hours.signum() <= 0 || crew.signum() <= 0 || rate.signum() < 0 || otherCost.signum() < 0) {
      throw new IllegalArgumentException("work takes hours and workers, and costs no less than 0");
    }
  }

  /** A share of it, by the same crew: what is left of work in progress. */
  public Labour share(Quantity share) {
    return new Labour(hours.times(share), crew, rate, share.at(otherCost));
  }
}
