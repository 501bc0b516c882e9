package dayworth.report.picture;

import dayworth.decision.CurveAnswer;
import dayworth.decision.PlansAlong;
import dayworth.network.Activity;
import dayworth.network.Timing;
import java.util.List;

/** Which activities are shortened, given back and critical, at every finish. */
final class CompressionMap implements Picture {

  private static final double ROW = 21;
  private static final double FIGURES_ABOVE = 24;
  private static final double AXIS_BELOW = 58;
  private static final double BOTTOM = 18;
  private static final double WIDEST_ID = 64;
  private static final double ID_GAP = 7;
  private static final double RIGHT = 14;

  private final CurveAnswer answer;
  private final Words words;
  private final Layout layout;
  private final MapWording wording;
  private final Heading heading;
  private final MapLegend legend;
  private final MapColumns columns;
  private final MapRows rows;
  private final FinishAxis finishes;
  private final Box plot;

  CompressionMap(CurveAnswer answer, Layout layout) {
    this.answer = answer;
    this.layout = layout;
    words = new Words(answer.of());
    columns = MapColumns.of(answer, new FinishAxis(answer, layout, layout.plot(0, 0), words));
    List<Timing> timings = PlansAlong.at(answer, columns.finishes());
    rows = MapRows.of(answer, timings);
    wording = new MapWording(answer, words, columns, timings, rows);
    heading = new Heading(layout, wording.title(), wording.note());
    legend = new MapLegend(layout, words, rows.haveMeasures());
    plot =
        layout.plot(heading.height() + FIGURES_ABOVE, Math.max(1, rows.shown().size()) * ROW + 4);
    finishes = new FinishAxis(answer, layout, plot, words);
  }

  @Override
  public int width() {
    return layout.width();
  }

  @Override
  public int height() {
    return (int) Math.ceil(plot.bottom() + AXIS_BELOW + legend.height() + BOTTOM);
  }

  @Override
  public String title() {
    return wording.title();
  }

  @Override
  public String description() {
    return wording.description();
  }

  @Override
  public void paint(Sheet sheet) {
    finishes.mark(sheet, answer.leastTotal().duration());
    heading.paint(sheet);
    finishes.paintAbove(sheet, answer.leastTotal().duration());
    finishes.paint(sheet, answer.leastTotal().duration());
    sheet.text(
        Type.AXIS,
        Look.QUIET,
        Sheet.Anchor.START,
        plot.right() + RIGHT,
        plot.y() - 9,
        "price of " + words.aUnit());
    MapCells cells = new MapCells(columns, words);
    double idWidth =
        rows.shown().stream()
            .mapToDouble(row -> Type.NAME.width(Words.safe(row.activity().id())))
            .max()
            .orElse(0);
    for (int i = 0; i < rows.shown().size(); i++) {
      cells.add(rows.shown().get(i), top(i));
    }
    cells.paint(sheet);
    finishes.frame(sheet, answer.leastTotal().duration());
    for (int i = 0; i < rows.shown().size(); i++) {
      MapRow row = rows.shown().get(i);
      cells.writeFigures(sheet, row, top(i));
      paintWords(sheet, row, Math.min(WIDEST_ID, idWidth), top(i) + 13);
    }
    legend.paint(sheet, plot.bottom() + AXIS_BELOW);
  }

  private double top(int row) {
    return plot.y() + 2 + row * ROW;
  }

  private void paintWords(Sheet sheet, MapRow row, double idWidth, double baseline) {
    Activity activity = row.activity();
    String id = Type.NAME.fit(Words.safe(activity.id()), idWidth);
    sheet.text(Type.NAME, Look.INK, Sheet.Anchor.START, Layout.MARGIN, baseline, id);
    double from = Layout.MARGIN + idWidth + ID_GAP;
    String name = Type.AXIS.fit(Words.safe(activity.name()), plot.x() - 8 - from);
    sheet.text(Type.AXIS, Look.INK, Sheet.Anchor.START, from, baseline, name);
    double room = layout.width() - plot.right() - RIGHT - 4;
    String price = Type.AXIS.fit(wording.price(row), room);
    sheet.text(Type.AXIS, Look.QUIET, Sheet.Anchor.START, plot.right() + RIGHT, baseline, price);
  }
}
