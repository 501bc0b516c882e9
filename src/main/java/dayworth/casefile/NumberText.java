package dayworth.casefile;

import java.math.BigDecimal;

/** Reads a plain decimal: digits, one decimal mark, no grouping, no exponent. */
final class NumberText {

  /** More digits than any sensible number has; also bounds the work of reading one. */
  private static final int LONGEST = 40;

  private NumberText() {}

  static BigDecimal parse(String text, NumberStyle style) throws CellFault {
    if (text.length() > LONGEST) {
      throw new CellFault("not a number", "a number has at most " + LONGEST + " digits");
    }
    if (isPlain(text, style.mark())) {
      return new BigDecimal(text.replace(',', '.'));
    }
    if (style.semicolons() && isPlain(text, style.otherMark())) {
      throw new CellFault(
          "two decimal marks in one file",
          "one mark for the whole file; line " + style.line() + " has a " + style.markWord());
    }
    throw new CellFault("not a number", NumberHint.of(text, style));
  }

  /** How many digits stand after the mark, counting zeros. */
  static int digitsAfterMark(String text, NumberStyle style) {
    int at = text.indexOf(style.mark());
    return at < 0 ? 0 : text.length() - at - 1;
  }

  private static boolean isPlain(String text, char mark) {
    int first = text.startsWith("-") ? 1 : 0;
    int at = text.indexOf(mark);
    int end = at < 0 ? text.length() : at;
    return isDigits(text, first, end) && (at < 0 || isDigits(text, at + 1, text.length()));
  }

  private static boolean isDigits(String text, int from, int to) {
    for (int i = from; i < to; i++) {
      if (text.charAt(i) < '0' || text.charAt(i) > '9') {
        return false;
      }
    }
    return from < to;
  }
}
