package dayworth.report.picture;

import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import java.awt.geom.Point2D;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Money against the finish, with the points that are spoken of named on the line. */
final class CurvePicture implements Picture {

  /** Of the name of a section. */
  private static final double SECTION_WIDTH = 190;

  private static final double PLOT_HEIGHT = 340;
  private static final double BELOW = 56;
  private static final double RING = 4.5;
  private static final int MOST_DOTS = 60;

  private final CurveAnswer answer;
  private final Words words;
  private final Amounts amounts;
  private final CurveWording wording;
  private final Layout layout;
  private final Heading heading;
  private final Flags flags;
  private final List<Double> flagEnds = new ArrayList<>();
  private final List<MoneyLine> lines;
  private final List<SectionMark> sections;
  private final Box plot;
  private final FinishAxis finishes;
  private final MoneyAxis money;

  CurvePicture(CurveAnswer answer, Layout layout) {
    this.answer = answer;
    this.layout = layout;
    words = new Words(answer.of());
    amounts = new Amounts(answer);
    wording = new CurveWording(answer, words, amounts);
    heading = new Heading(layout, wording.title(), wording.note());
    lines = MoneyLine.of(answer, amounts);
    sections = SectionMark.of(answer);
    flags = new Flags(layout.width());
    FinishAxis places = new FinishAxis(answer, layout, layout.plot(0, PLOT_HEIGHT), words);
    addFlags(places);
    addSectionFlags(places);
    plot = layout.plot(heading.height() + flags.height(), PLOT_HEIGHT);
    finishes = new FinishAxis(answer, layout, plot, words);
    List<MoneyAxis.Range> ranges = new ArrayList<>();
    lines.forEach(line -> ranges.add(line.range(answer)));
    money = MoneyAxis.over(plot, ranges);
    flagged().forEach(finish -> flagEnds.add(y(finish) - RING));
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
    finishes.mark(sheet, answer.leastTotal().duration());
    heading.paint(sheet);
    money.paint(sheet, words);
    finishes.paint(sheet, answer.leastTotal().duration());
    flags.paint(sheet, plot.y(), flagEnds);
    paintLines(sheet);
    paintPoints(sheet);
    paintGrid(sheet);
    paintGutters(sheet);
  }

  private List<Finish> flagged() {
    List<Finish> flagged = new ArrayList<>(List.of(answer.leastTotal()));
    contract().ifPresent(flagged::add);
    sections.forEach(mark -> flagged.add(mark.finish()));
    return flagged;
  }

  /** The contract finish where it lies on the axis and is not the least total itself. */
  private Optional<Finish> contract() {
    return answer
        .atContract()
        .filter(due -> due.duration() <= answer.rows().get(0).duration())
        .filter(due -> due.duration() != answer.leastTotal().duration());
  }

  private void addFlags(FinishAxis places) {
    Finish least = answer.leastTotal();
    boolean both = answer.atContract().filter(f -> f.duration() == least.duration()).isPresent();
    String name = both ? "Least total, contract finish" : "Least total";
    flags.add(Pen.LEADER, named(name, least, Look.PLUM), places.x(least.duration()));
    contract()
        .ifPresent(
            due ->
                flags.add(
                    Pen.LEADER, named("Contract finish", due, Look.INK), places.x(due.duration())));
  }

  private void addSectionFlags(FinishAxis places) {
    for (SectionMark mark : sections) {
      String name = Type.LABEL.fit(Words.safe(mark.name()), SECTION_WIDTH);
      long at = mark.finish().duration();
      Label label = new Label(Look.INK, 1, List.of(name, "on time from " + words.time(at)));
      flags.add(Pen.LEADER, label, places.x(at));
    }
  }

  private Label named(String name, Finish finish, java.awt.Color ink) {
    String total = words.money(amounts.total(finish));
    return new Label(ink, 1, List.of(name, words.time(finish.duration()), total));
  }

  private double y(Finish finish) {
    return money.y(amounts.total(finish));
  }

  private void paintLines(Sheet sheet) {
    LineChart chart = new LineChart(plot);
    for (MoneyLine line : lines) {
      chart.add(line.pen(), points(line));
    }
    chart.paint(sheet);
    if (answer.rows().size() <= MOST_DOTS) {
      for (MoneyLine line : lines) {
        boolean dotted = line.isTotal() || line.pen().equals(Pen.DIRECT);
        points(line).stream()
            .filter(point -> dotted)
            .forEach(at -> sheet.disc(line.pen().color(), at.x, at.y, line.isTotal() ? 2.4 : 1.8));
      }
    }
  }

  /** Damages and bonus are not drawn where there are none. */
  private List<Point2D.Double> points(MoneyLine line) {
    List<Point2D.Double> points = new ArrayList<>();
    for (int i = 0; i < answer.rows().size(); i++) {
      boolean drawn = !line.stopsAtZero() || isNearMoney(line, i);
      if (drawn) {
        Finish row = answer.rows().get(i);
        double x = finishes.x(row.duration());
        if (line.isStaircase() && !points.isEmpty()) {
          points.add(new Point2D.Double(x, points.get(points.size() - 1).y));
        }
        points.add(new Point2D.Double(x, money.y(line.amount().apply(row))));
      }
    }
    return points;
  }

  private boolean isNearMoney(MoneyLine line, int row) {
    List<Finish> rows = answer.rows();
    return rows.subList(Math.max(0, row - 1), Math.min(rows.size(), row + 2)).stream()
        .anyMatch(near -> line.amount().apply(near).signum() != 0);
  }

  private void paintPoints(Sheet sheet) {
    List<Finish> named = new ArrayList<>(flagged());
    named.add(answer.rows().get(0));
    named.add(answer.shortest());
    for (Finish finish : named) {
      sheet.ring(Pen.RING, finishes.x(finish.duration()), y(finish), RING);
    }
    Finish least = answer.leastTotal();
    sheet.ring(Pen.RING, finishes.x(least.duration()), y(least), RING + 1);
    sheet.disc(Look.PLUM, finishes.x(least.duration()), y(least), 2.4);
  }

  /** The round amounts, where neither a line nor a word is in the way. */
  private void paintGrid(Sheet sheet) {
    LabelPlacer placer = new LabelPlacer(plot);
    placer.avoid(money.cutBand());
    for (MoneyLine line : lines) {
      List<Point2D.Double> points = points(line);
      for (int i = 1; i < points.size(); i++) {
        Point2D.Double from = points.get(i - 1);
        placer.avoidLine(from.x, from.y, points.get(i).x, points.get(i).y);
      }
    }
    flagged()
        .forEach(
            f ->
                placer.avoidLine(
                    finishes.x(f.duration()), plot.y(), finishes.x(f.duration()), y(f)));
    for (BigDecimal amount : money.grid()) {
      String figure = words.amount(amount);
      double width = Type.AXIS.width(figure);
      double top = money.y(amount) - 15;
      List<Box> places =
          List.of(
              new Box(plot.x() + 3, top, width, 13),
              new Box(plot.right() - 3 - width, top, width, 13),
              new Box(plot.x() + plot.width() / 4 - width / 2, top, width, 13),
              new Box(plot.x() + plot.width() / 2 - width / 2, top, width, 13));
      if (amount.signum() != 0) {
        placer
            .place(places)
            .ifPresent(
                box ->
                    sheet.text(
                        Type.AXIS, Look.QUIET, Sheet.Anchor.START, box.x(), box.y() + 11, figure));
      }
    }
  }

  private void paintGutters(Sheet sheet) {
    Gutter left = new Gutter(Sheet.Anchor.END, plot.x() - 8);
    Gutter right = new Gutter(Sheet.Anchor.START, plot.right() + 8);
    Finish first = answer.rows().get(0);
    Finish last = answer.shortest();
    for (MoneyLine line : lines) {
      double fromY = money.y(line.amount().apply(first));
      double toY = money.y(line.amount().apply(last));
      left(line).ifPresent(label -> left.add(label, finishes.x(first.duration()), fromY));
      right(line).ifPresent(label -> right.add(label, finishes.x(last.duration()), toY));
    }
    left.write(sheet, plot.y() - 6, plot.bottom() + 4);
    right.write(sheet, plot.y() - 6, plot.bottom() + 4);
  }

  private Optional<Label> left(MoneyLine line) {
    Finish first = answer.rows().get(0);
    BigDecimal amount = line.amount().apply(first);
    if (line.isTotal()) {
      return Optional.of(wording.firstPoint());
    }
    if (line.pen().equals(Pen.BONUS) && amount.signum() == 0) {
      return Optional.empty();
    }
    List<String> said =
        amount.signum() == 0 ? List.of(line.name()) : List.of(line.name(), words.amount(amount));
    return Optional.of(new Label(line.ink(), 0, said));
  }

  private Optional<Label> right(MoneyLine line) {
    BigDecimal amount = line.amount().apply(answer.shortest());
    if (line.isTotal()) {
      return Optional.of(wording.lastPoint());
    }
    if (amount.signum() == 0) {
      return Optional.empty();
    }
    boolean unnamed = line.pen().equals(Pen.BONUS);
    List<String> said =
        unnamed ? List.of(line.name(), words.amount(amount)) : List.of(words.amount(amount));
    return Optional.of(new Label(line.ink(), 0, said));
  }
}
