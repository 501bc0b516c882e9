package dayworth.casefile;

import dayworth.decision.Notice;

/**
 * Where something stands.
 *
 * @param file the file's name within the case folder
 * @param line the first line of the record, 1 for the header row; 0 for the whole file
 * @param column the column's or term's name; empty for the whole row
 */
record Place(String file, int line, String column) {

  /** As much of a cell as a reader needs to find it again. */
  private static final int LONGEST_FOUND = 60;

  static Place whole(String file) {
    return new Place(file, 0, "");
  }

  /** What is to be said about this place; {@code found} is cut short and kept on one line. */
  Notice notice(String wrong, String found, String right) {
    return new Notice(file, line, column, clipped(wrong), clipped(found), right);
  }

  private static String clipped(String text) {
    String line = text.replaceAll("\\p{Cntrl}+", " ");
    return line.length() <= LONGEST_FOUND ? line : line.substring(0, LONGEST_FOUND) + "...";
  }
}
