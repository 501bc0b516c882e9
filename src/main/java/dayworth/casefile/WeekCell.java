package dayworth.casefile;

import dayworth.buildup.BuildUp;
import java.math.BigDecimal;

/** Reads a whole number of weeks, at least 1. */
enum WeekCell implements CellParser<Integer> {
  WEEKS;

  private static final BigDecimal MOST = BigDecimal.valueOf(BuildUp.MOST_WEEKS);

  @Override
  public Integer parse(String text, NumberStyle style) throws CellFault {
    BigDecimal weeks = NumberText.parse(text, style);
    String right = "a whole number from 1 to " + BuildUp.MOST_WEEKS;
    if (weeks.stripTrailingZeros().scale() > 0) {
      throw new CellFault("not a whole number", right);
    }
    if (weeks.signum() <= 0) {
      throw new CellFault("too small", right);
    }
    if (weeks.compareTo(MOST) > 0) {
      throw new CellFault("too many weeks", right);
    }
    return weeks.intValueExact();
  }
}
