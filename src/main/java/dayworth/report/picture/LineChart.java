package dayworth.report.picture;

import java.awt.Graphics2D;
import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.List;
import org.knowm.xchart.XYChart;
import org.knowm.xchart.XYChartBuilder;
import org.knowm.xchart.XYSeries;
import org.knowm.xchart.style.XYStyler;
import org.knowm.xchart.style.markers.SeriesMarkers;

/**
 * Lines over two axes, drawn by XChart into a given box; axes, words and marks are painted around
 * and over them.
 *
 * <p>XChart draws each piece of a line by itself and begins its dash anew, which would turn a long
 * dash into a solid line where points lie close together. So it is given only the points where a
 * line bends.
 */
final class LineChart {

  private static final double STRAIGHT = 1e-6;

  private final Box plot;
  private final XYChart chart;
  private int lines;

  /** A chart whose axes run over the pixels of {@code plot}. */
  LineChart(Box plot) {
    this.plot = plot;
    chart =
        new XYChartBuilder()
            .width((int) Math.ceil(plot.width()))
            .height((int) Math.ceil(plot.height()))
            .build();
    XYStyler styler = chart.getStyler();
    styler.setLegendVisible(false);
    styler.setChartTitleVisible(false);
    styler.setAxisTitlesVisible(false);
    styler.setAxisTicksVisible(false);
    styler.setPlotGridLinesVisible(false);
    styler.setPlotBorderVisible(false);
    styler.setPlotMargin(0);
    styler.setChartPadding(0);
    styler.setPlotContentSize(1.0);
    styler.setChartBackgroundColor(new java.awt.Color(0, 0, 0, 0));
    styler.setPlotBackgroundColor(new java.awt.Color(0, 0, 0, 0));
    styler.setXAxisMin(0.0);
    styler.setXAxisMax(Math.ceil(plot.width()));
    styler.setYAxisMin(-Math.ceil(plot.height()));
    styler.setYAxisMax(0.0);
  }

  /** Adds a line through points of the picture; no points, no line. */
  void add(Pen pen, List<Point2D.Double> points) {
    if (points.isEmpty()) {
      return;
    }
    List<Point2D.Double> bends = bends(points);
    double[] xs = bends.stream().mapToDouble(point -> point.x - plot.x()).toArray();
    double[] ys = bends.stream().mapToDouble(point -> plot.y() - point.y).toArray();
    XYSeries series = chart.addSeries("line " + lines++, xs, ys);
    series.setMarker(SeriesMarkers.NONE);
    series.setLineColor(pen.color());
    series.setLineStyle(pen.stroke());
  }

  void paint(Sheet sheet) {
    if (lines == 0) {
      return;
    }
    Graphics2D graphics = sheet.graphics();
    graphics.translate(plot.x(), plot.y());
    chart.paint(graphics, chart.getWidth(), chart.getHeight());
    graphics.translate(-plot.x(), -plot.y());
  }

  /** The first and last point and those between where the direction changes. */
  static List<Point2D.Double> bends(List<Point2D.Double> points) {
    List<Point2D.Double> kept = new ArrayList<>();
    for (int i = 0; i < points.size(); i++) {
      boolean end = i == 0 || i == points.size() - 1;
      if (end || turns(kept.get(kept.size() - 1), points.get(i), points.get(i + 1))) {
        kept.add(points.get(i));
      }
    }
    return kept;
  }

  private static boolean turns(Point2D.Double a, Point2D.Double b, Point2D.Double c) {
    double cross = (b.x - a.x) * (c.y - b.y) - (b.y - a.y) * (c.x - b.x);
    return Math.abs(cross) > STRAIGHT * Math.max(1, a.distance(b) * b.distance(c));
  }
}
