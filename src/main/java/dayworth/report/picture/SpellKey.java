package dayworth.report.picture;

import dayworth.buildup.Pattern;
import java.util.ArrayList;
import java.util.List;

/** How the line of each pattern looks, in as many rows as their names need. */
final class SpellKey {

  private static final double ROW = 20;
  private static final double SAMPLE = 34;
  private static final double GAP = 8;
  private static final double APART = 24;
  private static final double WIDEST_NAME = 180;
  private static final double RADIUS = 3.4;

  /** A sample with its name. */
  private record Entry(Pen pen, String name, double x, int row) {}

  private final List<Entry> entries = new ArrayList<>();

  SpellKey(List<Pattern> patterns, double width) {
    double x = 0;
    int row = 0;
    for (int i = 0; i < patterns.size(); i++) {
      String name = Type.LABEL.fit(Words.safe(patterns.get(i).name()), WIDEST_NAME);
      double taken = SAMPLE + GAP + Type.LABEL.width(name);
      if (x > 0 && x + taken > width) {
        x = 0;
        row++;
      }
      entries.add(new Entry(Pen.PATTERNS.get(i % Pen.PATTERNS.size()), name, x, row));
      x += taken + APART;
    }
  }

  double height() {
    return entries.isEmpty() ? 0 : (entries.get(entries.size() - 1).row() + 1) * ROW + GAP;
  }

  void paint(Sheet sheet, double top) {
    for (Entry entry : entries) {
      double x = Layout.MARGIN + entry.x();
      double y = top + entry.row() * ROW + ROW / 2;
      sheet.line(entry.pen(), x, y, x + SAMPLE, y);
      sheet.disc(entry.pen().color(), x + SAMPLE / 2, y, RADIUS);
      sheet.text(
          Type.LABEL,
          entry.pen().color(),
          Sheet.Anchor.START,
          x + SAMPLE + GAP,
          y + 4,
          entry.name());
    }
  }
}
