package dayworth.network;

import dayworth.value.Money;

/**
 * Money for each tick by which one moment lies more than {@code free} ticks after another: rate ×
 * max(0, t(to) − t(from) − free).
 *
 * <p>Plant that is hired from a start to a finish is one with {@code free} zero; damages for a
 * section run from the project's start, and what is free is the section's due time. One that runs
 * to the project's start charges for coming early: rate × max(0, −free − t(from)).
 *
 * @param name for people
 * @param free ticks that cost nothing; may be negative
 * @param rate money per tick, above zero
 */
public record Span(String name, Moment from, Moment to, long free, Money rate) {

  public Span {
    if (rate.signum() <= 0) {
      throw new IllegalArgumentException("span " + name + ": the rate must be above zero");
    }
    if (to.equals(from)) {
      throw new IllegalArgumentException("span " + name + ": its two moments are the same");
    }
  }
}
