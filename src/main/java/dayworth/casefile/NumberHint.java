package dayworth.casefile;

import java.math.BigDecimal;
import java.util.regex.Pattern;

/** Guesses how a number that is written otherwise should be written. */
final class NumberHint {

  private static final Pattern GROUPING = Pattern.compile("[\\s\\u00a0\\u2009\\u202f'\\u2019_]");
  private static final Pattern PLAIN = Pattern.compile("-?\\d+(\\.\\d+)?");
  private static final Pattern EXPONENT = Pattern.compile("-?\\d+(\\.\\d+)?[eE][+-]?\\d{1,2}");
  private static final Pattern MAYBE_THOUSANDS = Pattern.compile("-?\\d{1,3},\\d{3}");
  private static final int MOST_EXPONENT = 15;

  private NumberHint() {}

  /** What would be right instead of {@code text}, which is no plain number. */
  static String of(String text, NumberStyle style) {
    String bare = GROUPING.matcher(text).replaceAll("").replace('\u2212', '-');
    if (!style.semicolons() && MAYBE_THOUSANDS.matcher(bare).matches()) {
      return "write " + bare.replace(",", "") + " or " + bare.replace(',', '.');
    }
    String guess = withoutExponent(withOnePoint(withDigitFirst(bare)));
    return PLAIN.matcher(guess).matches()
        ? "write " + guess.replace('.', style.mark())
        : "digits only, with a " + style.markWord() + " before decimals";
  }

  private static String withDigitFirst(String bare) {
    String unsigned = bare.startsWith("+") ? bare.substring(1) : bare;
    return unsigned.startsWith(".") || unsigned.startsWith(",") ? "0" + unsigned : unsigned;
  }

  /** The last mark is taken for the decimal one, unless it is there more than once. */
  private static String withOnePoint(String bare) {
    int last = Math.max(bare.lastIndexOf('.'), bare.lastIndexOf(','));
    if (last < 0) {
      return bare;
    }
    String before = bare.substring(0, last);
    boolean groups = before.indexOf(bare.charAt(last)) >= 0;
    return before.replaceAll("[.,]", "") + (groups ? "" : ".") + bare.substring(last + 1);
  }

  private static String withoutExponent(String bare) {
    if (!EXPONENT.matcher(bare).matches()) {
      return bare;
    }
    BigDecimal value = new BigDecimal(bare);
    return Math.abs(value.scale()) <= MOST_EXPONENT ? value.toPlainString() : bare;
  }
}
