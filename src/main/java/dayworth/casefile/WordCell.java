package dayworth.casefile;

import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Reads one word of a few.
 *
 * @param what what the words are, for a message
 */
record WordCell<T>(String what, Map<String, T> words) implements CellParser<T> {

  static final WordCell<Boolean> YES_OR_NO =
      WordCell.<Boolean>of("choice").with("yes", true).with("no", false);

  /** Without words yet; they are added in the order in which messages name them. */
  static <T> WordCell<T> of(String what) {
    return new WordCell<>(what, Map.of());
  }

  WordCell<T> with(String word, T meaning) {
    Map<String, T> more = new LinkedHashMap<>(words);
    more.put(word, meaning);
    return new WordCell<>(what, more);
  }

  @Override
  public T parse(String text, NumberStyle style) throws CellFault {
    T meaning = words.get(text);
    if (meaning == null) {
      throw new CellFault("no such " + what, "one of " + String.join(", ", words.keySet()));
    }
    return meaning;
  }
}
