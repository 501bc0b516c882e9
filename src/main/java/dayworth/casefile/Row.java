package dayworth.casefile;

import java.util.List;
import java.util.Optional;

/**
 * A record of a CSV file.
 *
 * @param line its first line
 * @param cells without spaces around them
 */
record Row(int line, List<String> cells) {

  /** The text in the column with that index, if the row reaches so far. */
  Optional<String> text(int column) {
    return column < cells.size() ? Optional.of(cells.get(column)) : Optional.empty();
  }

  boolean isBlank() {
    return cells.stream().allMatch(String::isEmpty);
  }
}
