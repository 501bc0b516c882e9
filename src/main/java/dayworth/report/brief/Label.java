package dayworth.report.brief;

import dayworth.report.brief.svg.Drawing;
import dayworth.report.brief.svg.Drawing.Anchor;
import dayworth.report.brief.svg.Face;
import java.util.List;

/** A few lines of words at a mark. */
record Label(List<Line> lines) {

  static final double LEADING = 14;
  private static final double SIZE = 13;

  Label {
    lines = List.copyOf(lines);
  }

  /** A line; its style may hold b for a heavier face. */
  record Line(String style, String text) {

    double width() {
      Face face = (" " + style + " ").contains(" b ") ? Face.SEMIBOLD : Face.MEDIUM;
      return face.width(text, SIZE);
    }
  }

  static Label of(Line... lines) {
    return new Label(List.of(lines));
  }

  double width() {
    return lines.stream().mapToDouble(Line::width).max().orElse(0);
  }

  double height() {
    return lines.size() * LEADING;
  }

  /** Writes it with its first baseline at {@code y}. */
  void write(Drawing drawing, Anchor anchor, double x, double y) {
    for (int i = 0; i < lines.size(); i++) {
      drawing.text(lines.get(i).style(), anchor, x, y + i * LEADING, lines.get(i).text());
    }
  }
}
