package dayworth.report.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Labels beside a plot, each at the height of the line's end that it names. */
final class Gutter {

  private static final double AIR = 5;
  private static final double SHIFTED = 6;

  private record Entry(Label label, double x, double y) {}

  private final Sheet.Anchor anchor;
  private final double edge;
  private final List<Entry> entries = new ArrayList<>();

  /** Labels that begin or end at {@code edge}. */
  Gutter(Sheet.Anchor anchor, double edge) {
    this.anchor = anchor;
    this.edge = edge;
  }

  /** Names the point at x and y. */
  void add(Label label, double x, double y) {
    entries.add(new Entry(label, x, y));
  }

  void write(Sheet sheet, double top, double bottom) {
    entries.sort(Comparator.comparingDouble(Entry::y));
    double[] wanted = entries.stream().mapToDouble(e -> e.y() - e.label().height() / 2).toArray();
    double[] heights = entries.stream().mapToDouble(e -> e.label().height() + AIR).toArray();
    double[] tops = LabelPlacer.stack(wanted, heights, top, bottom);
    double toPlot = anchor == Sheet.Anchor.END ? 3 : -3;
    for (int i = 0; i < tops.length; i++) {
      Entry entry = entries.get(i);
      if (Math.abs(tops[i] - wanted[i]) > SHIFTED) {
        double middle = tops[i] + entry.label().height() / 2;
        sheet.line(Pen.LEADER, edge + toPlot, middle, entry.x() - 2 * toPlot, entry.y());
      }
      entry.label().write(sheet, anchor, entry.label().at(anchor, edge, tops[i]));
    }
  }
}
