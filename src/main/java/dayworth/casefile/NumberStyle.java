package dayworth.casefile;

import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * How numbers are written in one file: with a point, or in a file separated by semicolons with the
 * mark that its first number with decimals has.
 *
 * @param mark the decimal mark, a point or a comma
 * @param semicolons whether the file is separated by semicolons, so that the mark had to be guessed
 * @param line the line that shows the mark; 0 if none does
 */
record NumberStyle(char mark, boolean semicolons, int line) {

  /** What the contract asks for. */
  static final NumberStyle PLAIN = new NumberStyle('.', false, 0);

  private static final Pattern ONE_MARK = Pattern.compile("-?\\d+([.,])\\d+");

  /**
   * The style of a file separated by semicolons; {@code numbers} are the indices of its columns.
   */
  static NumberStyle ofSemicolons(List<Row> rows, List<Integer> numbers) {
    for (Row row : rows) {
      for (int column : numbers) {
        Optional<Character> mark = row.text(column).flatMap(NumberStyle::markIn);
        if (mark.isPresent()) {
          return new NumberStyle(mark.get(), true, row.line());
        }
      }
    }
    return new NumberStyle('.', true, 0);
  }

  private static Optional<Character> markIn(String text) {
    Matcher matcher = ONE_MARK.matcher(text);
    return matcher.matches() ? Optional.of(matcher.group(1).charAt(0)) : Optional.empty();
  }

  char otherMark() {
    return mark == '.' ? ',' : '.';
  }

  String markWord() {
    return mark == '.' ? "point" : "comma";
  }
}
