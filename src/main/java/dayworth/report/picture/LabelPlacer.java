package dayworth.report.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Finds room for labels, one after the other: the important ones come first and keep theirs.
 *
 * <p>A label offers places in its order of preference. It gets the first that lies within the
 * picture and touches neither a label that is placed already nor a line. Labels placed later give
 * way: a label that may be left out is left out.
 */
final class LabelPlacer {

  private static final double AIR = 3;
  private static final double SHIFT = 4;

  private final Box room;
  private final List<Box> taken = new ArrayList<>();
  private final List<double[]> lines = new ArrayList<>();

  LabelPlacer(Box room) {
    this.room = room;
  }

  /** Nothing may be placed here. */
  void avoid(Box box) {
    taken.add(box);
  }

  /** Nothing may be placed on this line. */
  void avoidLine(double x1, double y1, double x2, double y2) {
    lines.add(new double[] {x1, y1, x2, y2});
  }

  /** The first place with room, which is then taken; empty if there is none. */
  Optional<Box> place(List<Box> places) {
    Optional<Box> found =
        places.stream().filter(place -> isFree(place) && isClear(place)).findFirst();
    found.ifPresent(taken::add);
    return found;
  }

  /**
   * A place for a label that must not be left out: the first with room; else the first that touches
   * no other label, though a line; else the first one moved up until it touches no other label,
   * beyond the room if need be.
   */
  Box placeAlways(List<Box> places) {
    Optional<Box> found = place(places);
    if (found.isPresent()) {
      return found.get();
    }
    Box box = places.stream().filter(this::isFree).findFirst().orElse(places.get(0));
    while (!touchesNoLabel(box)) {
      box = box.movedTo(box.x(), box.y() - SHIFT);
    }
    taken.add(box);
    return box;
  }

  private boolean isFree(Box place) {
    return room.holds(place) && touchesNoLabel(place);
  }

  private boolean touchesNoLabel(Box place) {
    Box aired = new Box(place.x() - AIR, place.y(), place.width() + 2 * AIR, place.height());
    return taken.stream().noneMatch(aired::overlaps);
  }

  private boolean isClear(Box place) {
    Box aired = new Box(place.x() - 1, place.y() + 1, place.width() + 2, place.height() - 1);
    return lines.stream().noneMatch(line -> aired.isCrossedBy(line[0], line[1], line[2], line[3]));
  }

  /**
   * Tops for labels stacked in a gutter, each as near to where it wants to be as the others allow:
   * the least sum of squared shifts that keeps their order and lets none overlap.
   *
   * <p>Pool adjacent violators (Ayer, Brunk, Ewing, Reid and Silverman 1955, "An empirical
   * distribution function for sampling with incomplete information").
   *
   * @param wanted tops, from upper to lower
   * @param heights the same order
   */
  static double[] stack(double[] wanted, double[] heights, double top, double bottom) {
    int count = wanted.length;
    double[] above = new double[count + 1];
    for (int i = 0; i < count; i++) {
      above[i + 1] = above[i] + heights[i];
    }
    List<double[]> pools = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      double[] pool = {wanted[i] - above[i], 1};
      while (!pools.isEmpty() && pools.get(pools.size() - 1)[0] > pool[0]) {
        double[] last = pools.remove(pools.size() - 1);
        pool =
            new double[] {
              (last[0] * last[1] + pool[0] * pool[1]) / (last[1] + pool[1]), last[1] + pool[1]
            };
      }
      pools.add(pool);
    }
    double[] tops = new double[count];
    int i = 0;
    for (double[] pool : pools) {
      double base = Math.max(top, Math.min(pool[0], bottom - above[count]));
      for (int k = 0; k < pool[1]; k++, i++) {
        tops[i] = base + above[i];
      }
    }
    return tops;
  }
}
