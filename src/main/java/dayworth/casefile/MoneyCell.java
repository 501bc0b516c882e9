package dayworth.casefile;

import java.math.BigDecimal;

/** Reads an amount of money. */
enum MoneyCell implements CellParser<BigDecimal> {
  /** At least 0. */
  AMOUNT(false),
  /** A cap: a cap of nothing would cancel what it caps. */
  ABOVE_ZERO(true);

  static final int MOST_DECIMALS = 4;

  /** The largest amount, in currency units. */
  static final BigDecimal MOST = BigDecimal.valueOf(1_000_000_000_000L);

  private static final int THOUSANDS = 3;

  private final boolean aboveZero;

  MoneyCell(boolean aboveZero) {
    this.aboveZero = aboveZero;
  }

  @Override
  public BigDecimal parse(String text, NumberStyle style) throws CellFault {
    BigDecimal amount = NumberText.parse(text, style);
    if (amount.signum() < 0) {
      throw new CellFault("negative", aboveZero ? "more than 0" : "0 or more");
    }
    if (style.semicolons() && NumberText.digitsAfterMark(text, style) == THOUSANDS) {
      throw new CellFault(
          "the " + style.markWord() + " may be a thousands mark",
          "write " + text.replace(String.valueOf(style.mark()), "") + " or " + text + "0");
    }
    if (amount.stripTrailingZeros().scale() > MOST_DECIMALS) {
      throw new CellFault("too many decimals", "money has at most 4 decimals");
    }
    if (amount.compareTo(MOST) > 0) {
      throw new CellFault("too much", "at most 1000000000000");
    }
    if (aboveZero && amount.signum() == 0) {
      throw new CellFault("a cap of nothing", "more than 0, or no cap");
    }
    return amount;
  }
}
