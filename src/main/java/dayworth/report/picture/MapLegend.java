package dayworth.report.picture;

import java.util.ArrayList;
import java.util.List;

/** The five marks of the compression map; no other picture needs a legend. */
final class MapLegend {

  private static final double MARK = 24;
  private static final double TO_TEXT = 7;
  private static final double BETWEEN = 22;
  private static final double LINE = 24;

  private record Mark(String text, double x, double y) {}

  private final Words words;
  private final List<Mark> marks = new ArrayList<>();
  private double bottom;

  MapLegend(Layout layout, Words words) {
    this.words = words;
    double x = Layout.MARGIN;
    double y = 0;
    for (String text : texts()) {
      double width = MARK + TO_TEXT + Type.LABEL.width(text);
      if (x > Layout.MARGIN && x + width > layout.width() - Layout.MARGIN) {
        x = Layout.MARGIN;
        y += LINE;
      }
      marks.add(new Mark(text, x, y));
      x += width + BETWEEN;
      bottom = y + MapCells.HEIGHT;
    }
  }

  private List<String> texts() {
    return List.of(
        "So many " + words.units() + " bought: the fuller, the nearer the limit",
        "At its shortest: nothing more to buy",
        "Fewer than at the finish before: given back",
        "Has float",
        "Critical from here on");
  }

  double height() {
    return bottom;
  }

  void paint(Sheet sheet, double top) {
    for (int i = 0; i < marks.size(); i++) {
      Mark mark = marks.get(i);
      Box box = new Box(mark.x(), top + mark.y(), MARK, MapCells.HEIGHT);
      paintMark(sheet, i, box);
      sheet.text(
          Type.LABEL,
          Look.INK,
          Sheet.Anchor.START,
          box.right() + TO_TEXT,
          box.y() + 13,
          mark.text());
    }
  }

  private static void paintMark(Sheet sheet, int which, Box box) {
    double middle = box.x() + box.width() / 2;
    switch (which) {
      case 0 -> {
        MapCells.bought(sheet, box, 1);
        figure(sheet, Look.INK, "2", middle, box);
      }
      case 1 -> {
        MapCells.bought(sheet, box, Look.OCHRE.size() - 1);
        MapCells.cap(sheet, box);
        figure(sheet, Look.INK, "6", middle, box);
      }
      case 2 -> {
        MapCells.relaxed(sheet, box);
        figure(sheet, Look.TEAL_INK, "1", middle, box);
      }
      case 3 -> MapCells.hatch(sheet, box);
      default -> MapCells.critical(sheet, box);
    }
  }

  private static void figure(Sheet sheet, java.awt.Color ink, String text, double middle, Box box) {
    sheet.text(Type.AXIS_NAMED, ink, Sheet.Anchor.MIDDLE, middle, box.y() + 13, text);
  }
}
