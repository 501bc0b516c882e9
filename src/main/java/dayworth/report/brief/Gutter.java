package dayworth.report.brief;

import dayworth.report.brief.svg.Drawing;
import dayworth.report.brief.svg.Drawing.Anchor;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Labels beside a picture, each as near to its mark as the others let it. */
final class Gutter {

  private static final double GAP = 5;

  private record Entry(double y, Label label) {}

  private final List<Entry> entries = new ArrayList<>();

  /** A label whose middle would best stand at {@code y}. */
  void add(double y, Label label) {
    entries.add(new Entry(y, label));
  }

  void write(Drawing drawing, Anchor anchor, double x, double top, double bottom) {
    entries.sort(Comparator.comparingDouble(Entry::y));
    double[] tops = new double[entries.size()];
    double free = top;
    for (int i = 0; i < tops.length; i++) {
      Entry entry = entries.get(i);
      tops[i] = Math.max(free, entry.y() - entry.label().height() / 2);
      free = tops[i] + entry.label().height() + GAP;
    }
    double most = bottom;
    for (int i = tops.length - 1; i >= 0; i--) {
      double height = entries.get(i).label().height();
      tops[i] = Math.min(tops[i], most - height);
      most = tops[i] - GAP;
    }
    for (int i = 0; i < tops.length; i++) {
      entries.get(i).label().write(drawing, anchor, x, tops[i] + 11);
    }
  }
}
