package dayworth.buildup;

import dayworth.value.Money;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Finds the ways that others dominate: that are neither quicker nor cheaper than some other one.
 *
 * <p>In the order of duration, then cost, a way is dominated if one before it costs no more; the
 * cheapest so far is the witness (the maxima of a set of vectors: Kung, Luccio and Preparata 1975).
 * O(ways log ways).
 */
final class Contest {

  /** A way before it is judged. */
  record Entry(String name, long duration, Money cost) {}

  private static final Comparator<Entry> QUICKEST_THEN_CHEAPEST =
      Comparator.comparingLong(Entry::duration).thenComparing(Entry::cost);

  private final Map<Entry, String> dominatorByEntry = new HashMap<>();

  /** Of equal entries the first stays. */
  Contest(List<Entry> entries) {
    List<Entry> ordered = entries.stream().sorted(QUICKEST_THEN_CHEAPEST).toList();
    Entry cheapest = ordered.get(0);
    for (Entry entry : ordered.subList(1, ordered.size())) {
      if (entry.cost().compareTo(cheapest.cost()) >= 0) {
        dominatorByEntry.put(entry, cheapest.name());
      } else {
        cheapest = entry;
      }
    }
  }

  /** The name of one that dominates an entry. */
  Optional<String> dominatorOf(Entry entry) {
    return Optional.ofNullable(dominatorByEntry.get(entry));
  }
}
