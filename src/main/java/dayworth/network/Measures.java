package dayworth.network;

import java.util.List;
import java.util.stream.IntStream;

/**
 * The measures that may be bought, by their index. Immutable.
 *
 * @param list in file order
 * @param packages what measures share, by their index
 */
public record Measures(List<Measure> list, List<MeasurePackage> packages) {

  public static final Measures NONE = new Measures(List.of(), List.of());

  public Measures {
    list = List.copyOf(list);
    packages = List.copyOf(packages);
    for (Measure measure : list) {
      if (measure.inPackage().isPresent()
          && (measure.inPackage().getAsInt() < 0
              || measure.inPackage().getAsInt() >= packages.size())) {
        throw new IllegalArgumentException("measure " + measure.name() + " is in no package");
      }
    }
  }

  public boolean isNone() {
    return list.isEmpty();
  }

  public Measure get(int index) {
    return list.get(index);
  }

  /** The indices of an activity's measures, in file order. */
  public int[] of(int activity) {
    return IntStream.range(0, list.size())
        .filter(m -> list.get(m).activity() == activity)
        .toArray();
  }
}
