package dayworth.value;

import java.math.BigDecimal;
import java.math.RoundingMode;

/**
 * An exact number of hours, workers or weeks, or a share of something: a fraction, so that a week
 * that is cut where the work is done loses nothing.
 *
 * <p>The arithmetic is that of {@link Money}; the types differ so that hours are never added to an
 * amount.
 */
public final class Quantity implements Comparable<Quantity> {

  public static final Quantity ZERO = of(0);
  public static final Quantity ONE = of(1);

  private final Money number;

  private Quantity(Money number) {
    this.number = number;
  }

  public static Quantity of(long number) {
    return new Quantity(Money.of(number));
  }

  public static Quantity of(BigDecimal number) {
    return new Quantity(Money.of(number));
  }

  public Quantity plus(Quantity other) {
    return new Quantity(number.plus(other.number));
  }

  public Quantity minus(Quantity other) {
    return new Quantity(number.minus(other.number));
  }

  public Quantity times(Quantity other) {
    return new Quantity(number.times(other.number));
  }

  /**
   * How many times {@code other} this is.
   *
   * @throws ArithmeticException if {@code other} is zero
   */
  public Quantity dividedBy(Quantity other) {
    return new Quantity(number.dividedBy(other.number));
  }

  /** What so many of something cost at a price for one. */
  public Money at(Money price) {
    return price.times(number);
  }

  public Quantity min(Quantity other) {
    return compareTo(other) <= 0 ? this : other;
  }

  public Quantity max(Quantity other) {
    return compareTo(other) >= 0 ? this : other;
  }

  public int signum() {
    return number.signum();
  }

  /** The number cut to some decimals, without zeros at its end. */
  public BigDecimal rounded(int decimals, RoundingMode mode) {
    BigDecimal rounded = number.rounded(decimals, mode).stripTrailingZeros();
    return rounded.scale() < 0 ? rounded.setScale(0) : rounded;
  }

  /** For pictures only. */
  public double toDouble() {
    return number.toDouble();
  }

  @Override
  public int compareTo(Quantity other) {
    return number.compareTo(other.number);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Quantity quantity && number.equals(quantity.number);
  }

  @Override
  public int hashCode() {
    return number.hashCode();
  }

  /** The exact number: whole, or numerator/denominator. */
  @Override
  public String toString() {
    return number.toString();
  }
}
