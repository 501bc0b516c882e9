package dayworth.casefile;

import java.math.BigDecimal;

/** Reads a percentage, which is added to an amount. */
enum PercentCell implements CellParser<BigDecimal> {
  PERCENT;

  /** A price of more than eleven times the cost is a slip of the pen. */
  private static final BigDecimal MOST = BigDecimal.valueOf(1000);

  private static final int MOST_DECIMALS = 4;

  @Override
  public BigDecimal parse(String text, NumberStyle style) throws CellFault {
    if (text.endsWith("%")) {
      String number = text.substring(0, text.length() - 1).strip();
      throw new CellFault("a per cent sign", "write " + number);
    }
    BigDecimal percent = NumberText.parse(text, style);
    if (percent.signum() < 0) {
      throw new CellFault("negative", "0 or more");
    }
    if (percent.stripTrailingZeros().scale() > MOST_DECIMALS) {
      throw new CellFault("too many decimals", "a percentage has at most 4 decimals");
    }
    if (percent.compareTo(MOST) > 0) {
      throw new CellFault("too much", "at most " + MOST);
    }
    return percent;
  }
}
