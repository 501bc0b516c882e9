package dayworth.report.picture;

import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.Predicate;

/**
 * The finishes that are columns of the compression map: every whole unit of time where there is
 * room for it; else the breakpoints, of which those too near to another are left out.
 */
final class MapColumns {

  /** Pixels; narrower columns cannot be told apart. */
  private static final double NARROWEST = 9;

  /** Plans between breakpoints are computed anew, each about as long as the curve itself. */
  private static final long MOST_WORK = 30_000;

  private final FinishAxis axis;
  private final List<Long> finishes;
  private final boolean all;
  private final boolean whole;

  private MapColumns(FinishAxis axis, List<Long> finishes, boolean all, boolean whole) {
    this.axis = axis;
    this.finishes = finishes;
    this.all = all;
    this.whole = whole;
  }

  static MapColumns of(CurveAnswer answer, FinishAxis axis) {
    long unit = answer.of().network().scale().ticksPerUnit();
    List<Long> units = chosen(answer, row -> row.duration() % unit == 0);
    List<Long> breakpoints = chosen(answer, Finish::breakpoint);
    long work = (long) answer.of().network().size() * units.size();
    if (axis.unitWidth() >= NARROWEST && work <= MOST_WORK) {
      List<Long> apart = apart(answer, units, axis);
      return new MapColumns(axis, apart, true, true);
    }
    List<Long> apart = apart(answer, breakpoints, axis);
    return new MapColumns(axis, apart, apart.size() == breakpoints.size(), false);
  }

  private static List<Long> chosen(CurveAnswer answer, Predicate<Finish> which) {
    long longest = answer.rows().get(0).duration();
    long shortest = answer.shortest().duration();
    long least = answer.leastTotal().duration();
    return answer.rows().stream()
        .filter(
            row ->
                which.test(row)
                    || row.duration() == longest
                    || row.duration() == shortest
                    || row.duration() == least)
        .map(Finish::duration)
        .toList();
  }

  /** The least total, then both ends, then the others from long to short have their place. */
  private static List<Long> apart(CurveAnswer answer, List<Long> finishes, FinishAxis axis) {
    List<Long> inOrder = new ArrayList<>();
    inOrder.add(answer.leastTotal().duration());
    inOrder.add(answer.rows().get(0).duration());
    inOrder.add(answer.shortest().duration());
    inOrder.addAll(finishes);
    List<Long> kept = new ArrayList<>();
    for (long finish : inOrder) {
      double x = axis.x(finish);
      if (kept.stream().noneMatch(other -> Math.abs(axis.x(other) - x) < NARROWEST - 0.01)) {
        kept.add(finish);
      }
    }
    kept.sort(Comparator.reverseOrder());
    return kept;
  }

  /** Ticks, from long to short. */
  List<Long> finishes() {
    return finishes;
  }

  boolean areWholeUnits() {
    return whole;
  }

  boolean areAll() {
    return all;
  }

  int count() {
    return finishes.size();
  }

  /** Halfway to the column before, or as far before the first as the next is after it. */
  double left(int column) {
    double x = axis.x(finishes.get(column));
    return column > 0
        ? (x + axis.x(finishes.get(column - 1))) / 2
        : x - Math.min(axis.inset(), count() > 1 ? (axis.x(finishes.get(1)) - x) / 2 : 24);
  }

  double right(int column) {
    double x = axis.x(finishes.get(column));
    int last = count() - 1;
    return column < last
        ? left(column + 1)
        : x + Math.min(axis.inset(), last > 0 ? (x - axis.x(finishes.get(last - 1))) / 2 : 24);
  }
}
