package dayworth.value;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;

/**
 * One scale for all cost slopes, so that they are whole numbers and equal prices are equal numbers.
 *
 * <p>A slope of m money units per tick becomes {@code floor(m * perUnit)}. Where the common
 * denominator of all slopes fits, it is the scale and nothing is rounded. Otherwise the scale is
 * the largest power of two that fits and slopes are rounded down: a flow that keeps within the
 * rounded slopes keeps within the true ones, so its bound still holds for the true money.
 *
 * @param perUnit how many scaled units make one money unit
 * @param exact whether no slope was rounded
 */
public record SlopeScale(long perUnit, boolean exact) {

  /** The sum of all scaled slopes stays below this, so that no sum of flows overflows. */
  private static final BigInteger MOST = BigInteger.ONE.shiftLeft(61);

  /** What rounding may cost in all: less than half a cent. */
  private static final Money MOST_GAP = Money.of(1).dividedBy(200);

  /**
   * The scale for these slopes.
   *
   * @param slopes money per tick, none negative
   * @param ticks how far each slope reaches; the same order
   * @return empty if rounding could cost half a cent or more: the amounts are too large to be exact
   */
  public static Optional<SlopeScale> fit(List<Money> slopes, long[] ticks) {
    MoneySum sums = new MoneySum();
    for (Money slope : slopes) {
      sums.add(slope);
    }
    Money sum = sums.total();
    BigInteger room = sum.isZero() ? MOST : mostPerUnit(sum);
    Optional<BigInteger> common = commonDenominator(slopes, room);
    if (common.isPresent()) {
      return Optional.of(new SlopeScale(common.get().longValueExact(), true));
    }
    int power = room.bitLength() - 1;
    if (power < 0) {
      return Optional.empty();
    }
    SlopeScale rounding = new SlopeScale(1L << power, false);
    return rounding.mostGap(slopes, ticks).compareTo(MOST_GAP) < 0
        ? Optional.of(rounding)
        : Optional.empty();
  }

  /** The slope in scaled units, rounded down. */
  public long scaled(Money slope) {
    return slope
        .numerator()
        .multiply(BigInteger.valueOf(perUnit))
        .divide(slope.denominator())
        .longValueExact();
  }

  /** The money that {@code scaled} scaled units are. */
  public Money money(BigInteger scaled) {
    return Money.fraction(scaled, BigInteger.valueOf(perUnit));
  }

  private static BigInteger mostPerUnit(Money sum) {
    return MOST.multiply(sum.denominator()).divide(sum.numerator()).min(MOST);
  }

  private static Optional<BigInteger> commonDenominator(List<Money> slopes, BigInteger most) {
    BigInteger common = BigInteger.ONE;
    for (Money slope : slopes) {
      BigInteger denominator = slope.denominator();
      common = common.divide(common.gcd(denominator)).multiply(denominator);
      if (common.compareTo(most) > 0) {
        return Optional.empty();
      }
    }
    return Optional.of(common);
  }

  private Money mostGap(List<Money> slopes, long[] ticks) {
    MoneySum gap = new MoneySum();
    for (int i = 0; i < slopes.size(); i++) {
      Money lost = slopes.get(i).minus(money(BigInteger.valueOf(scaled(slopes.get(i)))));
      gap.add(lost.times(ticks[i]));
    }
    return gap.total();
  }
}
