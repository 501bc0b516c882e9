package dayworth.report.picture;

import dayworth.contract.Due;
import dayworth.decision.CurveAnswer;
import java.awt.Color;
import java.awt.geom.Point2D;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What the next unit of time costs, as a staircase, against what it is worth. */
final class PricePicture implements Picture {

  private static final double PLOT_HEIGHT = 260;
  private static final double BELOW = 56;
  private static final double TOP_ROOM = 1.12;

  /** Prices more than so many times the worth run off the top, so that the crossing can be seen. */
  private static final double MOST_TIMES_WORTH = 4;

  private static final double NEAR_GUTTER = 40;

  private final CurveAnswer answer;
  private final Words words;
  private final List<Stretch> stretches;
  private final PriceWording wording;
  private final Layout layout;
  private final Heading heading;
  private final Flags flags;
  private final Box plot;
  private final FinishAxis finishes;
  private final MoneyAxis money;
  private final double top;

  PricePicture(CurveAnswer answer, Layout layout) {
    this.answer = answer;
    this.layout = layout;
    words = new Words(answer.of());
    stretches = Stretch.of(answer);
    wording = new PriceWording(answer, words, stretches);
    heading = new Heading(layout, wording.title(), wording.note());
    flags = new Flags(layout.width());
    FinishAxis places = new FinishAxis(answer, layout, layout.plot(0, PLOT_HEIGHT), words);
    flags.add(Pen.STOP, wording.stop(), places.x(answer.leastTotal().duration()));
    contract().ifPresent(due -> flags.add(Pen.CONTRACT, wording.contract(due), places.x(due)));
    plot = layout.plot(heading.height() + flags.height(), PLOT_HEIGHT);
    finishes = new FinishAxis(answer, layout, plot, words);
    top = top();
    money = MoneyAxis.upTo(plot, top * TOP_ROOM);
  }

  private double top() {
    double worth = most(Stretch::worth);
    double price = most(Stretch::price);
    boolean runsOff = worth > 0 && price > MOST_TIMES_WORTH * worth;
    return Math.max(1e-9, runsOff ? MOST_TIMES_WORTH * worth : Math.max(price, worth));
  }

  private double most(java.util.function.Function<Stretch, BigDecimal> amount) {
    return stretches.stream().mapToDouble(s -> amount.apply(s).doubleValue()).max().orElse(0);
  }

  private Optional<Long> contract() {
    return answer
        .of()
        .terms()
        .contractFinish()
        .map(Due::ticks)
        .filter(due -> due <= answer.rows().get(0).duration())
        .filter(due -> due >= answer.shortest().duration())
        .filter(due -> due != answer.leastTotal().duration());
  }

  @Override
  public int width() {
    return layout.width();
  }

  @Override
  public int height() {
    return (int) Math.ceil(plot.bottom() + BELOW);
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
    heading.paint(sheet);
    money.paint(sheet, words);
    for (Worth worth : Worth.all()) {
      worth.bands(stretches).forEach(band -> worth.paint(sheet, box(band)));
    }
    finishes.paint(sheet, answer.leastTotal().duration());
    List<Double> ends = new ArrayList<>(List.of(plot.bottom()));
    contract().ifPresent(due -> ends.add(plot.bottom()));
    flags.paint(sheet, plot.y(), ends);
    LineChart chart = new LineChart(plot);
    chart.add(Pen.PRICE_PLATE, staircase());
    chart.add(Pen.PRICE, staircase());
    chart.paint(sheet);
    paintWords(sheet);
  }

  private Box box(Worth.Band band) {
    double left = finishes.x(band.from());
    double high = money.y(band.high());
    return new Box(left, high, finishes.x(band.to()) - left, money.y(band.low()) - high);
  }

  private double y(Stretch stretch) {
    return money.y(Math.min(top * TOP_ROOM, stretch.price().doubleValue()));
  }

  private List<Point2D.Double> staircase() {
    List<Point2D.Double> points = new ArrayList<>();
    for (Stretch stretch : stretches) {
      points.add(new Point2D.Double(finishes.x(stretch.from()), y(stretch)));
      points.add(new Point2D.Double(finishes.x(stretch.to()), y(stretch)));
    }
    return points;
  }

  private void paintWords(Sheet sheet) {
    Gutter left = new Gutter(Sheet.Anchor.END, plot.x() - 8);
    Gutter right = new Gutter(Sheet.Anchor.START, plot.right() + 8);
    LabelPlacer placer = placer();
    for (Worth worth : Worth.all()) {
      nameWorth(sheet, worth, left, right, placer);
    }
    if (!stretches.isEmpty()) {
      Stretch last = stretches.get(stretches.size() - 1);
      String price = words.amount(last.price());
      Label label = new Label(Look.INK, 1, List.of("Price of the next " + words.unit(), price));
      right.add(label, plot.right() - layout.inset(), y(last));
    }
    left.write(sheet, plot.y() - 6, plot.bottom() + 4);
    right.write(sheet, plot.y() - 6, plot.bottom() + 4);
    paintPrices(sheet, placer);
    paintGrid(sheet, placer);
  }

  private LabelPlacer placer() {
    LabelPlacer placer = new LabelPlacer(plot);
    List<Point2D.Double> steps = staircase();
    for (int i = 1; i < steps.size(); i++) {
      Point2D.Double from = steps.get(i - 1);
      placer.avoidLine(from.x, from.y, steps.get(i).x, steps.get(i).y);
    }
    List<Long> upright = new ArrayList<>(List.of(answer.leastTotal().duration()));
    contract().ifPresent(upright::add);
    for (long finish : upright) {
      placer.avoidLine(finishes.x(finish), plot.y(), finishes.x(finish), plot.bottom());
    }
    return placer;
  }

  /** In the gutter that the widest band begins or ends at; else in the plot, on a plate. */
  private void nameWorth(Sheet sheet, Worth worth, Gutter left, Gutter right, LabelPlacer placer) {
    Optional<Worth.Band> widest =
        worth.bands(stretches).stream()
            .max(java.util.Comparator.comparingLong(band -> band.from() - band.to()));
    if (widest.isEmpty()) {
      return;
    }
    String rate = words.amount(widest.get().share()) + " " + words.aUnit();
    Label label = new Label(worth.ink(), 0, List.of(worth.name(), rate));
    Box band = box(widest.get());
    if (band.x() < plot.x() + NEAR_GUTTER) {
      left.add(label, band.x(), band.middle());
    } else if (band.right() > plot.right() - NEAR_GUTTER) {
      right.add(label, band.right(), band.middle());
    } else {
      Label inside = new Label(worth.ink(), 0, List.of(worth.name() + " " + rate));
      Box place = placer.placeAlways(insides(band, inside));
      if (place.bottom() < band.y()) {
        double x = Math.max(band.x(), Math.min(band.right(), place.x() + place.width() / 2));
        sheet.line(Pen.LEADER, x, place.bottom() + 1, x, band.y() + 4);
      }
      inside.writeOnPlate(sheet, Sheet.Anchor.START, place);
    }
  }

  /** First in the band's middle, then beside it, then elsewhere in it, then ever higher above. */
  private List<Box> insides(Box band, Label label) {
    List<Box> places = new ArrayList<>();
    double middle = band.x() + band.width() / 2;
    double level = band.middle() - label.height() / 2;
    places.add(label.at(Sheet.Anchor.MIDDLE, middle, level));
    places.add(label.at(Sheet.Anchor.START, band.right() + 8, level));
    places.add(label.at(Sheet.Anchor.END, band.x() - 8, level));
    for (double y = band.y() + 4; y + label.height() < band.bottom(); y += 6) {
      places.add(label.at(Sheet.Anchor.MIDDLE, middle, y));
    }
    for (double y = band.y() - label.height() - 6; y > plot.y() + 2; y -= 6) {
      for (Sheet.Anchor anchor : Sheet.Anchor.values()) {
        places.add(label.at(anchor, middle, y));
      }
    }
    places.add(label.at(Sheet.Anchor.MIDDLE, middle, band.y() - label.height() - 6));
    return places;
  }

  /** One figure for each run of equal prices, above its step and ending before the riser. */
  private void paintPrices(Sheet sheet, LabelPlacer placer) {
    int i = 0;
    while (i < stretches.size()) {
      int end = i;
      while (end + 1 < stretches.size()
          && stretches.get(end + 1).price().compareTo(stretches.get(i).price()) == 0) {
        end++;
      }
      double from = finishes.x(stretches.get(i).from());
      double to = finishes.x(stretches.get(end).to());
      if (end + 1 < stretches.size()) {
        paintPrice(sheet, placer, stretches.get(i), from, to);
      }
      i = end + 1;
    }
  }

  private void paintPrice(
      Sheet sheet, LabelPlacer placer, Stretch stretch, double from, double to) {
    String figure = words.amount(stretch.price());
    double width = Type.AXIS.width(figure);
    double above = y(stretch) - 19;
    List<Box> places =
        List.of(
            new Box((from + to) / 2 - width / 2, above, width, 14),
            new Box(to - 7 - width, above, width, 14),
            new Box(Math.max(from + 7, to - width / 2), y(stretch) + 5, width, 14));
    placer.place(places).ifPresent(box -> onPlate(sheet, Look.INK, figure, box));
  }

  private void paintGrid(Sheet sheet, LabelPlacer placer) {
    for (BigDecimal amount : money.grid()) {
      String figure = words.amount(amount);
      double width = Type.AXIS.width(figure);
      Box right = new Box(plot.right() - width - 3, money.y(amount) - 15, width, 13);
      Box left = right.movedTo(plot.x() + 3, right.y());
      boolean bare = money.y(amount) < worthTop();
      if (amount.signum() != 0) {
        placer
            .place(bare ? List.of(left, right) : List.of(right, left))
            .ifPresent(box -> onPlate(sheet, Look.QUIET, figure, box));
      }
    }
  }

  private static void onPlate(Sheet sheet, Color ink, String figure, Box box) {
    sheet.fill(Look.PAPER, new Box(box.x() - 2, box.y() + 1, box.width() + 4, 13));
    sheet.text(Type.AXIS, ink, Sheet.Anchor.START, box.x(), box.y() + 11.5, figure);
  }

  /** Above this the paper is bare. */
  private double worthTop() {
    return money.y(most(Stretch::worth));
  }
}
