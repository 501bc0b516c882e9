package dayworth.report.picture;

import java.util.List;

/** The finding above a picture and what has to be known to read it. */
final class Heading {

  private static final double GAP = 6;
  private static final double BELOW = 14;

  private final List<String> title;
  private final List<String> note;

  Heading(Layout layout, String title, String note) {
    this.title = Type.TITLE.wrap(title, layout.textWidth());
    this.note = Type.NOTE.wrap(note, layout.textWidth());
  }

  /** Pixels from the upper edge of the paper to what comes below. */
  double height() {
    return Layout.MARGIN
        + title.size() * Type.TITLE.leading()
        + GAP
        + note.size() * Type.NOTE.leading()
        + BELOW;
  }

  void paint(Sheet sheet) {
    double y = Layout.MARGIN + Type.TITLE.size();
    y = write(sheet, Type.TITLE, Look.INK, title, y);
    write(sheet, Type.NOTE, Look.QUIET, note, y + GAP - Type.TITLE.size() + Type.NOTE.size());
  }

  private static double write(
      Sheet sheet, Type type, java.awt.Color color, List<String> lines, double first) {
    double y = first;
    for (String line : lines) {
      sheet.text(type, color, Sheet.Anchor.START, Layout.MARGIN, y, line);
      y += type.leading();
    }
    return y;
  }
}
