package dayworth.report.picture;

import java.awt.Color;

/** The cells of one row of the compression map, and the marks that its legend explains. */
final class MapCells {

  static final double HEIGHT = 18;

  private static final double BAND = 2.4;
  private static final double WIDE = 16;
  private static final double HATCH_EVERY = 6;

  private final Sheet sheet;
  private final MapColumns columns;
  private final Words words;

  MapCells(Sheet sheet, MapColumns columns, Words words) {
    this.sheet = sheet;
    this.columns = columns;
    this.words = words;
  }

  void paint(MapRow row, double top) {
    for (int column = 0; column < columns.count(); column++) {
      paintCell(row, column, box(column, top));
    }
    for (int column = 0; column < columns.count(); column++) {
      paintBand(row, column, top);
      paintFigure(row, column, top);
    }
  }

  private Box box(int column, double top) {
    double left = columns.left(column);
    double width = columns.right(column) - left;
    double air = width >= WIDE ? 1 : 0.5;
    return new Box(left + air, top, width - 2 * air, HEIGHT);
  }

  private void paintCell(MapRow row, int column, Box box) {
    if (row.bought(column) > 0) {
      bought(sheet, box, row.tone(column, Look.OCHRE.size()));
    } else if (!row.isCritical(column)) {
      hatch(sheet, box);
    } else {
      sheet.frame(Pen.CELL, box);
    }
    if (row.isAtShortest(column)) {
      cap(sheet, box);
    }
    if (row.isRelaxed(column)) {
      relaxed(sheet, box);
    }
  }

  private void paintBand(MapRow row, int column, double top) {
    if (row.isCritical(column)) {
      double left = columns.left(column);
      double bottom = top + HEIGHT + 0.6;
      sheet.fill(Look.PLUM, new Box(left, bottom - BAND, columns.right(column) - left, BAND));
      if (row.becomesCritical(column)) {
        sheet.fill(Look.PLUM, new Box(left - BAND / 2, top, BAND, HEIGHT + 0.6));
      }
    }
  }

  /** In narrow columns only where it changes; over two of them where the second is the same. */
  private void paintFigure(MapRow row, int column, double top) {
    Box box = box(column, top);
    boolean told = row.bought(column) > 0 || row.isRelaxed(column);
    if (!told || (box.width() < WIDE && !row.changes(column))) {
      return;
    }
    String figure = words.figure(row.bought(column));
    double width = Type.AXIS_NAMED.width(figure) + 1;
    boolean overTwo =
        width > box.width() && column + 1 < columns.count() && !row.changes(column + 1);
    double right = overTwo ? box(column + 1, top).right() : box.right();
    if (width <= right - box.x()) {
      Color ink = row.isRelaxed(column) ? Look.TEAL_INK : Look.INK;
      double middle = (box.x() + right) / 2;
      sheet.text(Type.AXIS_NAMED, ink, Sheet.Anchor.MIDDLE, middle, top + 13, figure);
    }
  }

  static void bought(Sheet sheet, Box box, int tone) {
    sheet.fill(Look.OCHRE.get(tone), box);
  }

  static void cap(Sheet sheet, Box box) {
    sheet.fill(Look.INK, new Box(box.x(), box.y(), box.width(), 2.6));
  }

  static void hatch(Sheet sheet, Box box) {
    sheet.lines(Pen.FLOAT_HATCH, Hatch.rising(box, HATCH_EVERY));
  }

  /** On paper, whatever is bought still: the frame must be seen. */
  static void relaxed(Sheet sheet, Box box) {
    sheet.fill(Look.PAPER, box);
    sheet.frame(Pen.RELAXED, new Box(box.x() + 1, box.y() + 1, box.width() - 2, box.height() - 2));
  }

  static void critical(Sheet sheet, Box box) {
    sheet.fill(Look.PLUM, new Box(box.x(), box.y(), BAND, box.height()));
    sheet.fill(Look.PLUM, new Box(box.x(), box.bottom() - BAND, box.width(), BAND));
  }
}
