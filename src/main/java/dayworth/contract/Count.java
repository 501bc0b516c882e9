package dayworth.contract;

import dayworth.value.Money;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.RoundingMode;

/**
 * How many of what a rate is per: units, calendar days or weeks. An exact fraction; below zero it
 * looks backwards.
 *
 * @param denominator above zero
 */
record Count(BigInteger numerator, BigInteger denominator) {

  static final Count NONE = of(0, 1);

  /** So many steps of which {@code stepsPerOne} make one. */
  static Count of(long steps, long stepsPerOne) {
    return new Count(BigInteger.valueOf(steps), BigInteger.valueOf(stepsPerOne));
  }

  static Count of(BigDecimal count) {
    BigDecimal plain = count.setScale(Math.max(0, count.scale()));
    return new Count(plain.unscaledValue(), BigInteger.TEN.pow(plain.scale()));
  }

  /** How many at a rate, which is above zero, come to an amount. */
  static Count reaching(Money amount, Money rate) {
    return new Count(
        amount.numerator().multiply(rate.denominator()),
        amount.denominator().multiply(rate.numerator()));
  }

  Count plus(Count other) {
    return new Count(
        numerator.multiply(other.denominator).add(other.numerator.multiply(denominator)),
        denominator.multiply(other.denominator));
  }

  Count negate() {
    return new Count(numerator.negate(), denominator);
  }

  Count atMost(Count most) {
    return plus(most.negate()).isAboveZero() ? most : this;
  }

  Count roundedUp() {
    return new Count(steps(1, RoundingMode.CEILING), BigInteger.ONE);
  }

  boolean isAboveZero() {
    return numerator.signum() > 0;
  }

  /** In steps of which {@code stepsPerOne} make one, rounded to whole steps. */
  BigInteger steps(long stepsPerOne, RoundingMode mode) {
    BigDecimal steps = new BigDecimal(numerator.multiply(BigInteger.valueOf(stepsPerOne)));
    return steps.divide(new BigDecimal(denominator), 0, mode).toBigIntegerExact();
  }

  /** The exact money for so many. */
  Money at(Money rate) {
    return rate.times(Money.fraction(numerator, denominator));
  }
}
