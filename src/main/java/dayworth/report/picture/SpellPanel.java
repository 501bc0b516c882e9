package dayworth.report.picture;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;

/**
 * A figure of one activity against the weeks of a spell: a line for each pattern, all from the
 * normal way, which is at no weeks.
 */
final class SpellPanel {

  /** A spell. */
  record Point(double weeks, double value, boolean isOffered) {}

  /** The spells of one pattern, by weeks. */
  record Line(String name, Pen pen, List<Point> points) {}

  private static final double NAMES_SHARE = 0.74;
  private static final double ROOM = 0.12;
  private static final double RADIUS = 3.4;
  private static final double OFF = 8;
  private static final int MOST_GRID_LINES = 4;
  private static final int MOST_WEEKS_NAMED = 8;
  private static final String WEEKS = "weeks";
  private static final double SIDE = 20;
  private static final double TICK_AIR = 8;

  private final Box plot;
  private final double atNone;
  private final boolean fromZero;
  private final List<Line> lines = new ArrayList<>();

  /**
   * An empty panel.
   *
   * @param atNone the figure at no weeks
   * @param fromZero whether the axis shows zero
   */
  SpellPanel(Box plot, double atNone, boolean fromZero) {
    this.plot = plot;
    this.atNone = atNone;
    this.fromZero = fromZero;
  }

  void add(Line line) {
    lines.add(line);
  }

  void paint(Sheet sheet, String caption, Words words) {
    sheet.text(Type.AXIS_NAMED, Look.INK, Sheet.Anchor.START, plot.x(), plot.y() - 8, caption);
    paintAxes(sheet, words);
    LabelPlacer placer = new LabelPlacer(plot);
    for (Line line : lines) {
      paintLine(sheet, line, placer);
    }
    lines.forEach(line -> paintMarks(sheet, line, placer));
    lines.stream()
        .filter(line -> !line.points().isEmpty())
        .forEach(line -> name(sheet, line, placer));
  }

  private void paintAxes(Sheet sheet, Words words) {
    for (BigDecimal figure : NiceSteps.between(low(), high(), MOST_GRID_LINES)) {
      double y = y(figure.doubleValue());
      sheet.line(Pen.GRID, plot.x(), y, plot.right(), y);
      sheet.text(
          Type.AXIS, Look.QUIET, Sheet.Anchor.END, plot.x() - 6, y + 4, words.amount(figure));
    }
    sheet.line(Pen.AXIS, plot.x(), plot.bottom(), plot.right(), plot.bottom());
    paintWeeks(sheet);
  }

  /** Figures that would run into others are left out. */
  private void paintWeeks(Sheet sheet) {
    double baseline = plot.bottom() + 16;
    double from = plot.x() - SIDE;
    LabelPlacer placer =
        new LabelPlacer(new Box(from, plot.bottom(), plot.right() - from, 2 * SIDE));
    double unit = Type.AXIS.width(WEEKS);
    placer.avoid(new Box(plot.right() - unit, plot.bottom(), unit, SIDE));
    sheet.text(Type.AXIS, Look.QUIET, Sheet.Anchor.END, plot.right(), baseline, WEEKS);
    for (BigDecimal weeks : NiceSteps.between(0, longest(), MOST_WEEKS_NAMED)) {
      double x = x(weeks.doubleValue());
      String figure = weeks.signum() == 0 ? "0" : weeks.stripTrailingZeros().toPlainString();
      double width = Type.AXIS.width(figure) + TICK_AIR;
      if (placer.place(List.of(new Box(x - width / 2, plot.bottom(), width, SIDE))).isPresent()) {
        sheet.line(Pen.AXIS, x, plot.bottom(), x, plot.bottom() + 4);
        sheet.text(Type.AXIS, Look.QUIET, Sheet.Anchor.MIDDLE, x, baseline, figure);
      }
    }
  }

  private void paintLine(Sheet sheet, Line line, LabelPlacer placer) {
    double fromX = x(0);
    double fromY = y(atNone);
    List<double[]> parts = new ArrayList<>();
    for (Point point : line.points()) {
      double toX = x(point.weeks());
      double toY = y(point.value());
      parts.add(new double[] {fromX, fromY, toX, toY});
      placer.avoidLine(fromX, fromY, toX, toY);
      fromX = toX;
      fromY = toY;
    }
    parts.forEach(part -> sheet.line(line.pen(), part[0], part[1], part[2], part[3]));
  }

  private void paintMarks(Sheet sheet, Line line, LabelPlacer placer) {
    for (Point point : line.points()) {
      double x = x(point.weeks());
      double y = y(point.value());
      if (point.isOffered()) {
        sheet.disc(line.pen().color(), x, y, RADIUS);
      } else {
        sheet.ring(Pen.ring(line.pen().color()), x, y, RADIUS);
      }
      placer.avoid(new Box(x - RADIUS, y - RADIUS, 2 * RADIUS, 2 * RADIUS));
    }
  }

  /** Where there is room: the key above the rows names every line. */
  private void name(Sheet sheet, Line line, LabelPlacer placer) {
    Point last = line.points().get(line.points().size() - 1);
    double x = x(last.weeks());
    double y = y(last.value());
    String fitted = Type.LABEL.fit(line.name(), plot.width() * (1 - NAMES_SHARE) + 40);
    Label label = new Label(line.pen().color(), 0, List.of(fitted));
    List<Box> places = new ArrayList<>();
    for (double up : new double[] {0, 6, -6}) {
      places.add(label.at(Sheet.Anchor.START, x + OFF, y - label.height() / 2 - up));
    }
    places.add(label.at(Sheet.Anchor.END, x - OFF, y - label.height()));
    places.add(label.at(Sheet.Anchor.START, x + OFF, y - label.height() - OFF));
    places.add(label.at(Sheet.Anchor.START, x + OFF, y + OFF));
    placer.place(places).ifPresent(box -> label.writeOnPlate(sheet, Sheet.Anchor.START, box));
  }

  private double x(double weeks) {
    return plot.x() + plot.width() * NAMES_SHARE * weeks / longest();
  }

  private double y(double value) {
    return plot.bottom() - plot.height() * (value - low()) / (high() - low());
  }

  private double longest() {
    return lines.stream()
        .flatMap(line -> line.points().stream())
        .mapToDouble(Point::weeks)
        .max()
        .orElse(1);
  }

  /** Without zero a duration's axis begins a little below the least, so that days can be told. */
  private double low() {
    double least = values().min().orElse(0);
    double most = values().max().orElse(0);
    return fromZero ? Math.min(0, least) : Math.max(0, least - ROOM * Math.max(1, most - least));
  }

  private double high() {
    double most = values().max().orElse(0);
    return most + ROOM * Math.max(1, most - low());
  }

  private DoubleStream values() {
    return DoubleStream.concat(
        DoubleStream.of(atNone),
        lines.stream().flatMap(line -> line.points().stream()).mapToDouble(Point::value));
  }
}
