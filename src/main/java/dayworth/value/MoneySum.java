package dayworth.value;

import java.math.BigInteger;
import java.util.HashMap;
import java.util.Map;

/**
 * Adds many exact amounts quickly: numerators are gathered by denominator and brought together only
 * when the total is asked for.
 */
public final class MoneySum {

  private final Map<BigInteger, BigInteger> numeratorByDenominator = new HashMap<>();

  public MoneySum add(Money amount) {
    return add(amount.numerator(), amount.denominator());
  }

  /** Adds {@code amount * factor / divisor}. */
  public MoneySum add(Money amount, long factor, long divisor) {
    return add(
        amount.numerator().multiply(BigInteger.valueOf(factor)),
        amount.denominator().multiply(BigInteger.valueOf(divisor)));
  }

  private MoneySum add(BigInteger numerator, BigInteger denominator) {
    numeratorByDenominator.merge(denominator, numerator, BigInteger::add);
    return this;
  }

  /** The exact total; the same whatever the order of the additions. */
  public Money total() {
    Money total = Money.ZERO;
    for (Map.Entry<BigInteger, BigInteger> part : numeratorByDenominator.entrySet()) {
      total = total.plus(Money.fraction(part.getValue(), part.getKey()));
    }
    return total;
  }
}
