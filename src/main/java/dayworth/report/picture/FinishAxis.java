package dayworth.report.picture;

import dayworth.decision.CurveAnswer;
import dayworth.value.TimeScale;
import java.awt.Color;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;

/** The axis of finishes: the longest on the left, so that reading to the right is buying time. */
final class FinishAxis {

  private static final double LABEL_AIR = 14;
  private static final int TICK = 5;

  private final Box plot;
  private final double inset;
  private final long longest;
  private final long shortest;
  private final Words words;
  private final TimeScale scale;

  /**
   * The axis of an answer's finishes.
   *
   * @param plot as {@code layout} has it
   */
  FinishAxis(CurveAnswer answer, Layout layout, Box plot, Words words) {
    this.plot = plot;
    this.inset = layout.inset();
    this.longest = answer.rows().get(0).duration();
    this.shortest = answer.shortest().duration();
    this.words = words;
    this.scale = answer.of().network().scale();
  }

  /** Where a finish, in ticks, stands; a single finish stands in the middle. */
  double x(long duration) {
    return longest == shortest
        ? plot.x() + plot.width() / 2
        : plot.x()
            + inset
            + (plot.width() - 2 * inset) * (longest - duration) / (double) (longest - shortest);
  }

  /** Pixels from the plot's side to the finish nearest to it. */
  double inset() {
    return inset;
  }

  /** Pixels from one unit of time to the next. */
  double unitWidth() {
    return longest == shortest
        ? 2 * inset
        : (plot.width() - 2 * inset) * scale.ticksPerUnit() / (double) (longest - shortest);
  }

  /** The column of a finish, from top to bottom of the plot, washed. */
  void mark(Sheet sheet, long duration) {
    sheet.fill(Look.PLUM_WASH, column(duration));
  }

  /** The same column framed, over what covers its wash. */
  void frame(Sheet sheet, long duration) {
    sheet.frame(Pen.COLUMN, column(duration));
  }

  private Box column(long duration) {
    double width = Math.max(6, unitWidth());
    return new Box(x(duration) - width / 2, plot.y(), width, plot.height());
  }

  /** The figures alone, above the plot. */
  void paintAbove(Sheet sheet, long named) {
    figures(sheet, named, plot.y() - TICK, plot.y() - 1, plot.y() - 9);
  }

  /** The line below the plot with its figures and, below them, what they are. */
  void paint(Sheet sheet, long named) {
    double y = plot.bottom();
    sheet.line(Pen.AXIS, plot.x(), y, plot.right(), y);
    figures(sheet, named, y, y + TICK, y + 18);
    String caption =
        "Finish, in " + words.many() + ": each step to the right buys time" + dates(named);
    sheet.text(
        Type.AXIS, Look.QUIET, Sheet.Anchor.MIDDLE, plot.x() + plot.width() / 2, y + 36, caption);
  }

  /** The dates of the figures that are named. */
  private String dates(long named) {
    Set<Long> durations = new LinkedHashSet<>(List.of(longest, named, shortest));
    String dates =
        durations.stream()
            .flatMap(at -> words.date(at).map(date -> words.figure(at) + " is " + date).stream())
            .collect(Collectors.joining(", "));
    return dates.isEmpty() ? "" : ". " + dates;
  }

  private void figures(Sheet sheet, long named, double from, double to, double baseline) {
    LabelPlacer placer = new LabelPlacer(new Box(0, baseline - 20, plot.right() + plot.x(), 40));
    Map<Long, Color> marked = new LinkedHashMap<>();
    marked.put(named, Look.PLUM);
    marked.putIfAbsent(longest, Look.INK);
    marked.putIfAbsent(shortest, Look.INK);
    List<Long> durations = new ArrayList<>(marked.keySet());
    durations.addAll(steps());
    for (long duration : durations) {
      Color ink = marked.getOrDefault(duration, Look.QUIET);
      Type type = marked.containsKey(duration) ? Type.AXIS_NAMED : Type.AXIS;
      String figure = words.figure(duration);
      double width = type.width(figure) + LABEL_AIR;
      if (placer
          .place(List.of(new Box(x(duration) - width / 2, baseline - 12, width, 14)))
          .isPresent()) {
        sheet.line(Pen.AXIS, x(duration), from, x(duration), to);
        sheet.text(type, ink, Sheet.Anchor.MIDDLE, x(duration), baseline, figure);
      }
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
