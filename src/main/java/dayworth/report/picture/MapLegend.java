package dayworth.report.picture;

import java.util.ArrayList;
import java.util.List;

/** The marks of the compression map; no other picture needs a legend. */
final class MapLegend {

  private static final double MARK = 24;
  private static final double TO_TEXT = 7;
  private static final double BETWEEN = 22;
  private static final double LINE = 24;

  private static final List<String> FIGURES = List.of("2", "6", "1");

  private record Mark(String text, double x, double y) {}

  private final Words words;
  private final boolean haveMeasures;
  private final List<Mark> marks = new ArrayList<>();
  private double bottom;

  MapLegend(Layout layout, Words words, boolean haveMeasures) {
    this.words = words;
    this.haveMeasures = haveMeasures;
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
    List<String> texts =
        new ArrayList<>(
            List.of(
                "So many " + words.units() + " bought: the fuller, the nearer the limit",
                "At its shortest: nothing more to buy",
                "Fewer than at the finish before: given back",
                "Has float",
                "Critical: no float"));
    if (haveMeasures) {
      texts.add("Done by a measure");
    }
    return texts;
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
    MapInk ink = new MapInk();
    switch (which) {
      case 0 -> ink.bought(box, 1);
      case 1 -> {
        ink.bought(box, Look.OCHRE.size() - 1);
        ink.cap(box);
      }
      case 2 -> {
        ink.plate(box);
        ink.relaxed(box);
      }
      case 3 -> ink.hatch(box);
      case 4 -> {
        ink.riser(box.x() + MapInk.BAND / 2, box.y(), box.height());
        ink.critical(box.x(), box.right(), box.bottom());
      }
      default -> {
        ink.bought(box, 1);
        ink.measure(box);
      }
    }
    ink.paint(sheet);
    if (which < FIGURES.size()) {
      java.awt.Color color = which == 2 ? Look.TEAL_INK : Look.INK;
      double middle = box.x() + box.width() / 2;
      sheet.text(
          Type.AXIS_NAMED, color, Sheet.Anchor.MIDDLE, middle, box.y() + 13, FIGURES.get(which));
    }
  }
}
