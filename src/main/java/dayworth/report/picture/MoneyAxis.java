package dayworth.report.picture;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * The axis of money, upwards. Where a wide band of amounts has no line in it, the band is cut out,
 * and said to be: above and below the cut the scale is the same, so slopes can be compared.
 */
final class MoneyAxis {

  /** Amounts from low to high. */
  record Range(double low, double high) {

    double size() {
      return high - low;
    }
  }

  private static final double CUT_HEIGHT = 20;
  private static final double WORTH_CUTTING = 0.3;
  private static final double ROOM = 0.06;
  private static final double PIXELS_PER_GRID_LINE = 56;

  private final Box plot;
  private final double low;
  private final double high;
  private final Range cut;

  private MoneyAxis(Box plot, double low, double high, Range cut) {
    this.plot = plot;
    this.low = low;
    this.high = high;
    this.cut = cut;
  }

  /** An axis that shows these ranges, and zero, with some room around each. */
  static MoneyAxis over(Box plot, List<Range> ranges) {
    List<Range> all = new ArrayList<>(ranges);
    all.add(new Range(0, 0));
    double low = all.stream().mapToDouble(Range::low).min().orElse(0);
    double high = all.stream().mapToDouble(Range::high).max().orElse(0);
    Range gap = widestGap(all);
    // Where all amounts are one, nothing would be left beside the cut.
    boolean cuts = gap.size() > WORTH_CUTTING * (high - low) && gap.size() < high - low;
    double room = ROOM * (high - low - (cuts ? gap.size() : 0));
    Range cut = cuts ? roundedInside(gap, room) : new Range(low, low);
    double lowest = low < 0 ? low - room : low;
    return new MoneyAxis(plot, lowest, high > low ? high + room : low + 1, cut);
  }

  /** An axis from zero to an amount above it. */
  static MoneyAxis upTo(Box plot, double high) {
    return new MoneyAxis(plot, 0, high, new Range(0, 0));
  }

  private static Range widestGap(List<Range> ranges) {
    List<Range> sorted = new ArrayList<>(ranges);
    sorted.sort(Comparator.comparingDouble(Range::low));
    double reached = sorted.get(0).high();
    Range widest = new Range(reached, reached);
    for (Range range : sorted) {
      if (range.low() - reached > widest.size()) {
        widest = new Range(reached, range.low());
      }
      reached = Math.max(reached, range.high());
    }
    return widest;
  }

  /** As much of the gap as leaves room at both sides and is round. */
  private static Range roundedInside(Range gap, double room) {
    double step = NiceSteps.size(gap.size() - 2 * room, 20);
    return new Range(
        Math.ceil((gap.low() + room) / step) * step, Math.floor((gap.high() - room) / step) * step);
  }

  /** Where the scale is cut; without height if it is not. */
  Box cutBand() {
    return isCut()
        ? new Box(plot.x(), y(cut.low()) - CUT_HEIGHT, plot.width(), CUT_HEIGHT)
        : new Box(plot.x(), plot.bottom(), plot.width(), 0);
  }

  boolean isCut() {
    return cut.size() > 0;
  }

  double y(BigDecimal amount) {
    return y(amount.doubleValue());
  }

  double y(double amount) {
    boolean above = isCut() && amount > cut.low();
    double drawn = amount - low - (above ? cut.size() : 0);
    return plot.bottom() - drawn * scale() - (above ? CUT_HEIGHT : 0);
  }

  private double scale() {
    double height = plot.height() - (isCut() ? CUT_HEIGHT : 0);
    return height / (high - low - cut.size());
  }

  /** The round amounts with their lines, without those in the cut. */
  List<BigDecimal> grid() {
    double drawn = high - low - cut.size();
    double most = plot.height() / PIXELS_PER_GRID_LINE * (high - low) / drawn;
    return NiceSteps.between(low, high, most).stream()
        .filter(figure -> figure.doubleValue() <= cut.low() || figure.doubleValue() >= cut.high())
        .filter(figure -> y(figure) >= plot.y())
        .toList();
  }

  /** The lines across the plot and the words in the cut; zero is heavier. */
  void paint(Sheet sheet, Words words) {
    for (BigDecimal amount : grid()) {
      Pen pen = amount.signum() == 0 ? Pen.AXIS : Pen.GRID;
      sheet.line(pen, plot.x(), y(amount), plot.right(), y(amount));
    }
    if (isCut()) {
      Box band = cutBand();
      sheet.line(Pen.CUT, band.x(), band.y(), band.right(), band.y());
      sheet.line(Pen.CUT, band.x(), band.bottom(), band.right(), band.bottom());
      String said =
          "Nothing lies between "
              + words.amount(BigDecimal.valueOf(cut.low()))
              + " and "
              + words.amount(BigDecimal.valueOf(cut.high()))
              + ": cut out";
      double middle = plot.x() + plot.width() / 2;
      sheet.text(Type.AXIS, Look.QUIET, Sheet.Anchor.MIDDLE, middle, band.bottom() - 6, said);
    }
  }
}
