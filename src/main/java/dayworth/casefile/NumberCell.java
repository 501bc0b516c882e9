package dayworth.casefile;

import java.math.BigDecimal;

/** Reads a number of hours, days, weeks or workers, a factor or a share. */
enum NumberCell implements CellParser<BigDecimal> {
  LABOUR_HOURS(Least.ABOVE, "0", "1000000000", "more than 0, at most 1000000000"),
  CREW(Least.ABOVE, "0", "100000", "more than 0, at most 100000 workers"),
  HOURS_PER_WEEK(Least.ABOVE, "0", "168", "more than 0, at most 168, the hours of a week"),
  DAYS_PER_WEEK(Least.ABOVE, "0", "7", "more than 0, at most 7"),
  ABOVE_HOURS(Least.FROM, "0", "168", "0 or more, at most 168, the hours of a week"),
  /** Of the pay or of the crew. */
  FACTOR(Least.ABOVE, "0", "100", "more than 0, at most 100"),
  /** Of what is then left something is to be used. */
  SHARE(Least.FROM, "0", "0.999999", "0 or more and below 1, such as 0.15 for 15 %"),
  /** The same, or a gain. */
  LOSS(Least.ABOVE, "-1", "0.999999", "above -1 and below 1, such as 0.15 for 15 %");

  static final int MOST_DECIMALS = 6;
  private static final int THOUSANDS = 3;

  /** Whether the least value is allowed itself. */
  private enum Least {
    FROM,
    ABOVE
  }

  private final boolean leastIncluded;
  private final BigDecimal least;
  private final BigDecimal most;
  private final String right;

  NumberCell(Least from, String least, String most, String right) {
    this.leastIncluded = from == Least.FROM;
    this.least = new BigDecimal(least);
    this.most = new BigDecimal(most);
    this.right = right;
  }

  @Override
  public BigDecimal parse(String text, NumberStyle style) throws CellFault {
    BigDecimal number = NumberText.parse(text, style);
    int toLeast = number.compareTo(least);
    if (toLeast < 0 || (toLeast == 0 && !leastIncluded)) {
      throw new CellFault(number.signum() < 0 ? "negative" : "too small", right);
    }
    if (number.compareTo(most) > 0) {
      throw new CellFault("too large", right);
    }
    boolean maybeThousands =
        style.semicolons() && NumberText.digitsAfterMark(text, style) == THOUSANDS;
    if (this == LABOUR_HOURS && maybeThousands) {
      String bare = text.replace(String.valueOf(style.mark()), "");
      String wrong = "the " + style.markWord() + " may be a thousands mark";
      throw new CellFault(wrong, "write " + bare + " or " + text + "0");
    }
    if (number.stripTrailingZeros().scale() > MOST_DECIMALS) {
      throw new CellFault("too many decimals", "at most " + MOST_DECIMALS + " decimals");
    }
    return number;
  }
}
