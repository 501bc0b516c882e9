package dayworth.decision;

import java.util.Comparator;

/**
 * Something about the input that its owner should know: a problem that stops everything, a warning
 * that stands in every result, or a note.
 *
 * @param file the file's name within the case folder
 * @param line 1 for the header row; 0 where the notice is about the whole file
 * @param column the column's or term's name; empty where the notice is about the whole row
 * @param wrong what is wrong, in a few words without a full stop
 * @param found what was found, as it stands in the file; empty where nothing was
 * @param right what would be right, or what follows
 */
public record Notice(String file, int line, String column, String wrong, String found, String right)
    implements Comparable<Notice> {

  private static final Comparator<Notice> BY_PLACE =
      Comparator.comparing(Notice::file)
          .thenComparingInt(Notice::line)
          .thenComparing(Notice::column)
          .thenComparing(Notice::wrong)
          .thenComparing(Notice::found)
          .thenComparing(Notice::right);

  /** Where it is: {@code file:line column}, without the parts that are not known. */
  public String place() {
    String at = line > 0 ? file + ":" + line : file;
    return column.isEmpty() ? at : at + " " + column;
  }

  @Override
  public int compareTo(Notice other) {
    return BY_PLACE.compare(this, other);
  }
}
