package dayworth.report;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;

/**
 * What is left to do once a set of results is wholly on the disk; it can be done again from the
 * beginning at any time.
 *
 * @param moves names of staged files that take their places
 * @param removals names that the last set had and this one has not
 */
record SwapJournal(List<String> moves, List<String> removals) {

  private static final String MOVE = "move ";
  private static final String REMOVE = "remove ";
  private static final String END = "end";
  private static final Pattern NAME =
      Pattern.compile("[A-Za-z0-9_-][A-Za-z0-9_.-]*(/[A-Za-z0-9_-][A-Za-z0-9_.-]*)*");

  SwapJournal {
    moves = List.copyOf(moves);
    removals = List.copyOf(removals);
    moves.forEach(SwapJournal::requireName);
    removals.forEach(SwapJournal::requireName);
  }

  /** Keeps every name inside the folder, even if somebody else wrote the journal. */
  private static void requireName(String name) {
    if (!NAME.matcher(name).matches()) {
      throw new IllegalArgumentException("a result cannot be called " + name);
    }
  }

  byte[] toBytes() {
    StringBuilder text = new StringBuilder();
    moves.forEach(name -> text.append(MOVE).append(name).append('\n'));
    removals.forEach(name -> text.append(REMOVE).append(name).append('\n'));
    return text.append(END).append('\n').toString().getBytes(StandardCharsets.UTF_8);
  }

  /**
   * Reads a journal back.
   *
   * @throws IOException if it is no journal, or names something outside the folder
   */
  static SwapJournal of(byte[] bytes) throws IOException {
    List<String> moves = new ArrayList<>();
    List<String> removals = new ArrayList<>();
    List<String> lines = new String(bytes, StandardCharsets.UTF_8).lines().toList();
    boolean ends = !lines.isEmpty() && lines.get(lines.size() - 1).equals(END);
    for (String line : ends ? lines.subList(0, lines.size() - 1) : lines) {
      if (line.startsWith(MOVE)) {
        moves.add(line.substring(MOVE.length()));
      } else if (line.startsWith(REMOVE)) {
        removals.add(line.substring(REMOVE.length()));
      } else {
        ends = false;
      }
    }
    if (!ends) {
      throw new IOException("the journal of an earlier run cannot be read");
    }
    try {
      return new SwapJournal(moves, removals);
    } catch (IllegalArgumentException outside) {
      throw new IOException("the journal of an earlier run cannot be used", outside);
    }
  }
}
