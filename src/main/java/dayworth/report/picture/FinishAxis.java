package dayworth.report.picture;

import dayworth.value.TimeScale;
import java.awt.Color;
import java.util.ArrayList;
import java.util.List;

/** The axis of finishes: the longest on the left, so that reading to the right is buying time. */
final class FinishAxis {

  private static final double LABEL_AIR = 14;
  private static final int TICK = 5;

  private final Box plot;
  private final long longest;
  private final long shortest;
  private final Words words;
  private final TimeScale scale;

  /**
   * @param longest ticks
   * @param shortest ticks, at most {@code longest}
   */
  FinishAxis(Box plot, long longest, long shortest, Words words, TimeScale scale) {
    this.plot = plot;
    this.longest = longest;
    this.shortest = shortest;
    this.words = words;
    this.scale = scale;
  }

  /** Where a finish stands; a single finish stands in the middle. */
  double x(long duration) {
    return longest == shortest
        ? plot.x() + plot.width() / 2
        : plot.x() + plot.width() * (longest - duration) / (double) (longest - shortest);
  }

  /** The line below the plot with its figures and, below them, what they are. */
  void paint(Sheet sheet, long named) {
    double y = plot.bottom();
    sheet.line(Pen.AXIS, plot.x(), y, plot.right(), y);
    LabelPlacer placer = new LabelPlacer(new Box(0, y, plot.right() + plot.x(), 40));
    tick(sheet, placer, named, Type.AXIS_NAMED, Look.PLUM);
    tick(sheet, placer, longest, Type.AXIS_NAMED, Look.INK);
    tick(sheet, placer, shortest, Type.AXIS_NAMED, Look.INK);
    for (long duration : steps()) {
      tick(sheet, placer, duration, Type.AXIS, Look.QUIET);
    }
    String caption = "Finish, in " + words.many() + ": each step to the right buys time";
    sheet.text(
        Type.AXIS, Look.QUIET, Sheet.Anchor.MIDDLE, plot.x() + plot.width() / 2, y + 36, caption);
  }

  private void tick(Sheet sheet, LabelPlacer placer, long duration, Type type, Color ink) {
    String figure = words.figure(duration);
    double width = type.width(figure) + LABEL_AIR;
    Box place = new Box(x(duration) - width / 2, plot.bottom() + 6, width, 14);
    if (placer.place(List.of(place)).isPresent()) {
      sheet.line(Pen.AXIS, x(duration), plot.bottom(), x(duration), plot.bottom() + TICK);
      sheet.text(type, ink, Sheet.Anchor.MIDDLE, x(duration), plot.bottom() + 18, figure);
    }
  }

  private List<Long> steps() {
    List<Long> steps = new ArrayList<>();
    double most = Math.max(2, plot.width() / 34);
    double units = (longest - shortest) / (double) scale.ticksPerUnit();
    double step = NiceSteps.size(units, most);
    long ticks = Math.max(1, Math.round(step * scale.ticksPerUnit()));
    for (long at = Math.floorDiv(longest, ticks) * ticks; at >= shortest; at -= ticks) {
      steps.add(at);
    }
    return steps;
  }
}
