package dayworth.value;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.RoundingMode;

/**
 * An exact amount of money in currency units: a fraction in lowest terms with a positive
 * denominator.
 *
 * <p>Slopes do not divide evenly, so a plan's cost is a fraction; it is rounded once, by {@link
 * #cents}, where a person or a file reads it.
 */
public final class Money implements Comparable<Money> {

  public static final Money ZERO = new Money(BigInteger.ZERO, BigInteger.ONE);

  private final BigInteger numerator;
  private final BigInteger denominator;

  private Money(BigInteger numerator, BigInteger denominator) {
    this.numerator = numerator;
    this.denominator = denominator;
  }

  public static Money of(long units) {
    return new Money(BigInteger.valueOf(units), BigInteger.ONE);
  }

  public static Money of(BigDecimal amount) {
    return amount.scale() <= 0
        ? new Money(amount.toBigIntegerExact(), BigInteger.ONE)
        : fraction(amount.unscaledValue(), BigInteger.TEN.pow(amount.scale()));
  }

  /**
   * The amount {@code numerator / denominator}.
   *
   * @throws ArithmeticException if the denominator is zero
   */
  public static Money fraction(BigInteger numerator, BigInteger denominator) {
    if (denominator.signum() == 0) {
      throw new ArithmeticException("no amount has the denominator zero");
    }
    BigInteger divisor = numerator.gcd(denominator);
    if (denominator.signum() < 0) {
      divisor = divisor.negate();
    }
    return new Money(numerator.divide(divisor), denominator.divide(divisor));
  }

  public BigInteger numerator() {
    return numerator;
  }

  public BigInteger denominator() {
    return denominator;
  }

  public Money plus(Money other) {
    if (denominator.equals(other.denominator)) {
      BigInteger sum = numerator.add(other.numerator);
      return denominator.equals(BigInteger.ONE)
          ? new Money(sum, denominator)
          : fraction(sum, denominator);
    }
    return fraction(
        numerator.multiply(other.denominator).add(other.numerator.multiply(denominator)),
        denominator.multiply(other.denominator));
  }

  public Money minus(Money other) {
    return plus(other.negate());
  }

  public Money negate() {
    return new Money(numerator.negate(), denominator);
  }

  public Money times(long factor) {
    return fraction(numerator.multiply(BigInteger.valueOf(factor)), denominator);
  }

  public Money dividedBy(long divisor) {
    return fraction(numerator, denominator.multiply(BigInteger.valueOf(divisor)));
  }

  /**
   * How many times a divisor this amount is.
   *
   * @throws ArithmeticException if the divisor is zero
   */
  public Money dividedBy(Money divisor) {
    return fraction(
        numerator.multiply(divisor.denominator), denominator.multiply(divisor.numerator));
  }

  /** This amount times {@code numerator / denominator}. */
  public Money times(Money factor) {
    return fraction(numerator.multiply(factor.numerator), denominator.multiply(factor.denominator));
  }

  public Money min(Money other) {
    return compareTo(other) <= 0 ? this : other;
  }

  public Money max(Money other) {
    return compareTo(other) >= 0 ? this : other;
  }

  public int signum() {
    return numerator.signum();
  }

  public boolean isZero() {
    return numerator.signum() == 0;
  }

  /** Rounded half up (away from zero at exactly half) to two decimals, for people and files. */
  public BigDecimal cents() {
    return rounded(2, RoundingMode.HALF_UP);
  }

  public BigDecimal rounded(int decimals, RoundingMode mode) {
    return new BigDecimal(numerator).divide(new BigDecimal(denominator), decimals, mode);
  }

  /** For pictures and floating-point models only. */
  public double toDouble() {
    return rounded(12, RoundingMode.HALF_EVEN).doubleValue();
  }

  @Override
  public int compareTo(Money other) {
    if (denominator.equals(other.denominator)) {
      return numerator.compareTo(other.numerator);
    }
    return numerator.multiply(other.denominator).compareTo(other.numerator.multiply(denominator));
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Money money
        && numerator.equals(money.numerator)
        && denominator.equals(money.denominator);
  }

  @Override
  public int hashCode() {
    return 31 * numerator.hashCode() + denominator.hashCode();
  }

  /** The exact amount: a whole number or numerator/denominator. */
  @Override
  public String toString() {
    return denominator.equals(BigInteger.ONE)
        ? numerator.toString()
        : numerator + "/" + denominator;
  }
}
