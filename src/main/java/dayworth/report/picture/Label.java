package dayworth.report.picture;

import java.awt.Color;
import java.util.List;

/**
 * A few lines of words that stay together.
 *
 * @param strong how many of the lines, from the first, are in bold
 * @param lines at least one
 */
record Label(Color color, int strong, List<String> lines) {

  static final double LEADING = 15;
  private static final double ASCENT = 12;

  Label {
    lines = List.copyOf(lines);
  }

  double width() {
    double width = 0;
    for (int i = 0; i < lines.size(); i++) {
      width = Math.max(width, type(i).width(lines.get(i)));
    }
    return width;
  }

  double height() {
    return lines.size() * LEADING;
  }

  /** The box that it fills with its upper corner, or upper middle, at a point. */
  Box at(Sheet.Anchor anchor, double x, double top) {
    return new Box(x - width() * anchor.share(), top, width(), height());
  }

  void write(Sheet sheet, Sheet.Anchor anchor, Box box) {
    double x = box.x() + box.width() * anchor.share();
    for (int i = 0; i < lines.size(); i++) {
      sheet.text(type(i), color, anchor, x, box.y() + ASCENT + i * LEADING, lines.get(i));
    }
  }

  /** The same on a plate of paper, so that it reads over a hatch. */
  void writeOnPlate(Sheet sheet, Sheet.Anchor anchor, Box box) {
    sheet.fill(Look.PAPER, new Box(box.x() - 3, box.y() - 1, box.width() + 6, box.height() + 2));
    write(sheet, anchor, box);
  }

  private Type type(int line) {
    return line < strong ? Type.NAME : Type.LABEL;
  }
}
