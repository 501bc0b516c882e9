package dayworth.casefile;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/**
 * Finds the known name that a misspelt one was probably meant to be.
 *
 * <p>The fewest single letters put in, taken out or changed, whatever their case; of equal ones the
 * first. More than a third of the letters is another name. After {@link #MOST_SEARCHES} searches no
 * more are made: so many wrong names are not slips of the pen, and each search costs the length of
 * the list.
 */
final class Nearest {

  private static final int MOST_SEARCHES = 200;
  private static final int LONGEST_NAME = 100;

  private final Collection<String> known;
  private int searches;

  Nearest(Collection<String> known) {
    this.known = known;
  }

  /** The nearest known name, if one is near. */
  Optional<String> to(String name) {
    if (searches++ >= MOST_SEARCHES || name.length() > LONGEST_NAME) {
      return Optional.empty();
    }
    String sought = name.toLowerCase(Locale.ROOT);
    int least = Math.max(1, sought.length() / 3) + 1;
    Optional<String> nearest = Optional.empty();
    for (String candidate : known) {
      if (Math.abs(candidate.length() - sought.length()) < least) {
        int changes = changes(sought, candidate.toLowerCase(Locale.ROOT));
        if (changes < least) {
          least = changes;
          nearest = Optional.of(candidate);
        }
      }
    }
    return nearest;
  }

  /** What would be right: the nearest name, or else {@code otherwise}. */
  String hint(String name, String otherwise) {
    return to(name).map(near -> "nearest is " + near).orElse(otherwise);
  }

  private static int changes(String from, String to) {
    int[] above = new int[to.length() + 1];
    for (int j = 0; j <= to.length(); j++) {
      above[j] = j;
    }
    for (int i = 1; i <= from.length(); i++) {
      int[] here = new int[to.length() + 1];
      here[0] = i;
      for (int j = 1; j <= to.length(); j++) {
        int change = from.charAt(i - 1) == to.charAt(j - 1) ? 0 : 1;
        here[j] = Math.min(above[j - 1] + change, 1 + Math.min(above[j], here[j - 1]));
      }
      above = here;
    }
    return above[to.length()];
  }
}
