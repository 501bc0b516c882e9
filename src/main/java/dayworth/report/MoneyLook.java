package dayworth.report;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Collection;

/** How the amounts of one table look: all whole, or all with cents. */
record MoneyLook(int decimals) {

  /** Whole if every amount is. */
  static MoneyLook of(Collection<BigDecimal> amounts) {
    boolean whole = amounts.stream().allMatch(a -> a.stripTrailingZeros().scale() <= 0);
    return new MoneyLook(whole ? 0 : 2);
  }

  String text(BigDecimal amount) {
    return Wording.grouped(amount.setScale(decimals, RoundingMode.HALF_UP));
  }
}
