package dayworth.report.picture;

import java.awt.Color;

/** The cells of the rows of the compression map. */
final class MapCells {

  static final double HEIGHT = 18;

  private static final double BELOW_CELL = 0.6;
  private static final double WIDE = 16;

  /** In a narrower frame no figure can be read. */
  private static final double LEAST_FRAMED = 11;

  private final MapInk ink = new MapInk();
  private final MapColumns columns;
  private final Words words;

  MapCells(MapColumns columns, Words words) {
    this.columns = columns;
    this.words = words;
  }

  /** Gathers the marks of a row. */
  void add(MapRow row, double top) {
    for (int column = 0; column < columns.count(); column++) {
      addCell(row, column, box(column, top));
    }
    addRelaxed(row, top);
    addCritical(row, top);
  }

  /** Paints what was gathered; figures are written over it. */
  void paint(Sheet sheet) {
    ink.paint(sheet);
  }

  void writeFigures(Sheet sheet, MapRow row, double top) {
    double free = 0;
    for (int column = 0; column < columns.count(); column++) {
      boolean told = row.bought(column) > 0 || row.isRelaxed(column);
      if (told && (isWide(column) || row.changes(column))) {
        free = writeFigure(sheet, row, column, top, free);
      }
    }
  }

  private boolean hasFramedFigure(int column, double top) {
    return box(column, top).width() >= LEAST_FRAMED;
  }

  private boolean isWide(int column) {
    return columns.right(column) - columns.left(column) >= WIDE;
  }

  private Box box(int column, double top) {
    double left = columns.left(column);
    double air = isWide(column) ? 1 : 0.5;
    return new Box(left + air, top, columns.right(column) - left - 2 * air, HEIGHT);
  }

  private void addCell(MapRow row, int column, Box box) {
    if (row.bought(column) > 0) {
      ink.bought(box, row.tone(column, Look.OCHRE.size()));
    } else if (row.isCritical(column)) {
      ink.empty(box);
    } else {
      ink.hatch(box);
    }
    if (row.isAtShortest(column)) {
      ink.cap(box);
    }
    if (row.isByMeasure(column)) {
      ink.measure(box);
    }
  }

  /** One frame around neighbours that are all given back; without figures their tones show. */
  private void addRelaxed(MapRow row, double top) {
    int column = 0;
    while (column < columns.count()) {
      int end = column;
      while (end < columns.count() && row.isRelaxed(end)) {
        if (hasFramedFigure(end, top)) {
          ink.plate(box(end, top));
        }
        end++;
      }
      if (end > column) {
        double left = box(column, top).x();
        ink.relaxed(new Box(left, top, box(end - 1, top).right() - left, HEIGHT));
      }
      column = end + 1;
    }
  }

  /** A riser where the activity becomes critical, and a band for as long as it stays so. */
  private void addCritical(MapRow row, double top) {
    double bottom = top + HEIGHT + BELOW_CELL;
    int column = 0;
    while (column < columns.count()) {
      int end = column;
      while (end < columns.count() && row.isCritical(end)) {
        end++;
      }
      if (end > column) {
        ink.riser(columns.left(column), top, HEIGHT + BELOW_CELL);
        ink.critical(columns.left(column), columns.right(end - 1), bottom);
      }
      column = end + 1;
    }
  }

  /**
   * Over two narrow columns where the second is the same; left out where it has no room.
   *
   * @param free where the figure before ends
   * @return where this one does
   */
  private double writeFigure(Sheet sheet, MapRow row, int column, double top, double free) {
    Box box = box(column, top);
    Type type = isWide(column) ? Type.AXIS_NAMED : Type.AXIS;
    String figure = words.figure(row.bought(column));
    double width = type.width(figure) + 0.5;
    boolean overTwo =
        width > box.width() && column + 1 < columns.count() && !row.changes(column + 1);
    double right = overTwo ? box(column + 1, top).right() : box.right();
    boolean unread = row.isRelaxed(column) && !hasFramedFigure(column, top);
    if (unread || width > right - box.x() || box.x() < free) {
      return free;
    }
    Color color = row.isRelaxed(column) ? Look.TEAL_INK : Look.INK;
    sheet.text(type, color, Sheet.Anchor.MIDDLE, (box.x() + right) / 2, top + 13, figure);
    return right;
  }
}
