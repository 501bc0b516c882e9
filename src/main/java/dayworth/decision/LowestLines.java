package dayworth.decision;

import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Which of some straight lines is the lowest, at every x from 0 on.
 *
 * <p><b>Method.</b> At 0 the lowest line is taken, of equal ones the flattest; from there on the
 * line that crosses it first, of those that cross together the flattest, and so on. All in exact
 * fractions. <b>Invariant.</b> Each line taken is flatter than the one before it. <b>Cost.</b>
 * Lines times stretches.
 */
final class LowestLines {

  /**
   * A line.
   *
   * @param atZero its height at 0
   * @param slope how much it rises with 1
   */
  record Line(Money atZero, Money slope) {

    Money at(Money x) {
      return atZero.plus(slope.times(x));
    }

    /** Where a flatter line, not lower at 0, comes down to this one. */
    private Money crossing(Line flatter) {
      return flatter.atZero.minus(atZero).dividedBy(slope.minus(flatter.slope));
    }
  }

  /**
   * Where one line is the lowest.
   *
   * @param to empty where it is so for ever
   * @param line its index; of equal lines the first
   */
  record Stretch(Money from, Optional<Money> to, int line) {}

  private LowestLines() {}

  /** The stretches in order; they cover everything from 0 on. */
  static List<Stretch> of(List<Line> lines) {
    List<Stretch> stretches = new ArrayList<>();
    int now = lowestAtZero(lines);
    Money from = Money.ZERO;
    Optional<Integer> next = next(lines, now);
    while (next.isPresent()) {
      Money to = lines.get(now).crossing(lines.get(next.get()));
      if (to.compareTo(from) > 0) {
        stretches.add(new Stretch(from, Optional.of(to), now));
      }
      from = to;
      now = next.get();
      next = next(lines, now);
    }
    stretches.add(new Stretch(from, Optional.empty(), now));
    return stretches;
  }

  private static int lowestAtZero(List<Line> lines) {
    int lowest = 0;
    for (int i = 1; i < lines.size(); i++) {
      int higher = lines.get(i).atZero().compareTo(lines.get(lowest).atZero());
      boolean flatter = lines.get(i).slope().compareTo(lines.get(lowest).slope()) < 0;
      lowest = higher < 0 || (higher == 0 && flatter) ? i : lowest;
    }
    return lowest;
  }

  /** The flatter line that comes down first; of those that come together the flattest. */
  private static Optional<Integer> next(List<Line> lines, int now) {
    Optional<Integer> next = Optional.empty();
    Money first = Money.ZERO;
    for (int i = 0; i < lines.size(); i++) {
      Line line = lines.get(i);
      if (line.slope().compareTo(lines.get(now).slope()) < 0) {
        Money crossing = lines.get(now).crossing(line);
        int later = next.isEmpty() ? -1 : crossing.compareTo(first);
        boolean flatter = later == 0 && line.slope().compareTo(lines.get(next.get()).slope()) < 0;
        if (later < 0 || flatter) {
          next = Optional.of(i);
          first = crossing;
        }
      }
    }
    return next;
  }
}
