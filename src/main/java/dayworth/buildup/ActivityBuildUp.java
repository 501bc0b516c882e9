package dayworth.buildup;

import dayworth.value.Money;
import java.util.List;
import java.util.stream.Stream;

/**
 * What working patterns buy in one activity.
 *
 * @param activity its index in the case
 * @param ofRemaining whether all of it is of what is left of work in progress
 * @param labour what it takes
 * @param normal its duration at the normal pattern, in thousandths of a time unit
 * @param normalCost the cost at it
 * @param ways by pattern, then by weeks
 */
public record ActivityBuildUp(
    int activity,
    boolean ofRemaining,
    Labour labour,
    long normal,
    Money normalCost,
    List<Way> ways) {

  public ActivityBuildUp {
    ways = List.copyOf(ways);
  }

  /** The ways worth offering: no other is at least as quick and as cheap. */
  public Stream<Way> measures() {
    return ways.stream().filter(way -> way.verdict().isMeasure());
  }

  /** The ways of one pattern, by weeks. */
  public List<Way> ways(Pattern pattern) {
    return ways.stream()
        .filter(way -> way.spell().pattern().name().equals(pattern.name()))
        .toList();
  }
}
