package dayworth.report.picture;

import java.util.ArrayList;
import java.util.List;

/** Lines that fill boxes, cut at their edges, because viewers blur patterns. */
final class Hatch {

  private Hatch() {}

  /** Level lines. */
  static List<double[]> level(Box box, double every) {
    List<double[]> lines = new ArrayList<>();
    for (double y = box.bottom() - every / 2; y > box.y(); y -= every) {
      lines.add(new double[] {box.x(), y, box.right(), y});
    }
    return lines;
  }

  /** Lines that rise to the right, meeting those of the boxes beside. */
  static List<double[]> rising(Box box, double every) {
    List<double[]> lines = new ArrayList<>();
    double first = Math.ceil((box.x() + box.y()) / every) * every;
    for (double sum = first; sum < box.right() + box.bottom(); sum += every) {
      double left = Math.max(box.x(), sum - box.bottom());
      double right = Math.min(box.right(), sum - box.y());
      lines.add(new double[] {left, sum - left, right, sum - right});
    }
    return lines;
  }

  /** Dots, drawn with a round pen. */
  static List<double[]> dots(Box box, double every) {
    List<double[]> lines = new ArrayList<>();
    for (double y = box.bottom() - every / 2; y > box.y() + 1; y -= every) {
      for (double x = Math.ceil(box.x() / every) * every; x < box.right() - 1; x += every) {
        lines.add(new double[] {x, y, x + 0.1, y});
      }
    }
    return lines;
  }
}
