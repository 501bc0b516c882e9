package dayworth.casefile;

import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Set;

/**
 * Reads one word of a few.
 *
 * @param what what the words are, for a message
 */
record WordCell<T>(String what, Map<String, T> served, Set<String> notYet)
    implements CellParser<T> {

  /** Without words yet; they are added in the order in which messages name them. */
  static <T> WordCell<T> of(String what) {
    return new WordCell<>(what, Map.of(), Set.of());
  }

  WordCell<T> with(String word, T meaning) {
    Map<String, T> more = new LinkedHashMap<>(served);
    more.put(word, meaning);
    return new WordCell<>(what, more, notYet);
  }

  /** A word that cases may use one day. */
  WordCell<T> notYet(String word) {
    Set<String> more = new LinkedHashSet<>(notYet);
    more.add(word);
    return new WordCell<>(what, served, more);
  }

  @Override
  public T parse(String text, NumberStyle style) throws CellFault {
    if (notYet.contains(text)) {
      throw new CellFault("not served yet", "only " + String.join(" or ", served.keySet()));
    }
    T meaning = served.get(text);
    if (meaning == null) {
      Set<String> known = new LinkedHashSet<>(served.keySet());
      known.addAll(notYet);
      throw new CellFault("no such " + what, "one of " + String.join(", ", known));
    }
    return meaning;
  }
}
