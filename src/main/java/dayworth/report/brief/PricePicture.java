package dayworth.report.brief;

import dayworth.contract.Terms;
import dayworth.decision.BriefAnswer;
import dayworth.report.brief.Places.Room;
import dayworth.report.brief.page.Picture;
import dayworth.report.brief.svg.Drawing;
import dayworth.report.brief.svg.Drawing.Anchor;
import dayworth.report.brief.svg.Face;
import dayworth.report.brief.svg.Hatch;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** What each further unit of time costs, against what it is worth. */
final class PricePicture {

  private static final double PLOT = 190;
  private static final double TOP = 44;
  private static final int MOST_SAID = 60;

  private final BriefAnswer answer;
  private final Words words;
  private final List<Stretch> stretches;

  /** Neighbouring stretches in which something is the same. */
  private record Run(long from, long to, BigDecimal low, BigDecimal high) {}

  PricePicture(BriefAnswer answer, Words words, List<Stretch> stretches) {
    this.answer = answer;
    this.words = words;
    this.stretches = stretches;
  }

  Picture picture(String name) {
    return new Picture(
        name,
        "The price of each further "
            + words.unit()
            + " (heavy line) against what that "
            + words.unit()
            + " is worth (patterned), on the axis of Figure 1.",
        description(),
        List.of(
            new Picture.Drawn(Picture.Use.BROAD, draw(FinishAxis.broad(answer, words))),
            new Picture.Drawn(Picture.Use.NARROW, draw(FinishAxis.narrow(answer, words)))));
  }

  private String description() {
    List<String> said = new ArrayList<>();
    for (Stretch one : stretches) {
      if (said.size() == MOST_SAID) {
        said.add("and so on, as the last table has it");
        break;
      }
      said.add(
          "to "
              + words.time(one.to())
              + " costs "
              + words.money(one.price())
              + ", worth "
              + words.money(one.worth()));
    }
    return "A staircase of what "
        + words.aUnit()
        + " costs, against what it is worth: "
        + String.join("; ", said)
        + ".";
  }

  private String draw(FinishAxis axis) {
    double bottom = TOP + PLOT;
    Drawing drawing = new Drawing(axis.width(), bottom + 4 + axis.height());
    MoneyScale scale = scale(bottom);
    axis.mark(drawing, answer.finish().duration(), TOP - 6, PLOT + 6);
    bands(drawing, axis, scale);
    Places places = new Places();
    staircase(drawing, axis, scale, places);
    contractLine(drawing, axis, scale, places);
    stop(drawing, axis, scale, places);
    prices(drawing, axis, scale, places);
    contract(drawing, axis, scale, places);
    if (!axis.isNarrow()) {
      gutters(drawing, axis, scale);
    }
    axis.below(drawing, bottom);
    return drawing.svg();
  }

  private MoneyScale scale(double bottom) {
    List<BigDecimal> amounts = new ArrayList<>(List.of(BigDecimal.ZERO));
    for (Stretch one : stretches) {
      amounts.add(one.price().max(BigDecimal.ZERO));
      amounts.add(one.worth());
    }
    return new MoneyScale(
        0,
        Math.max(1, amounts.stream().mapToDouble(BigDecimal::doubleValue).max().orElse(1)),
        TOP,
        bottom);
  }

  private void bands(Drawing drawing, FinishAxis axis, MoneyScale scale) {
    band(drawing, axis, scale, runs(s -> BigDecimal.ZERO, Stretch::time), "tr");
    band(drawing, axis, scale, runs(Stretch::time, s -> s.time().add(s.damages())), "da");
    band(drawing, axis, scale, runs(s -> s.time().add(s.damages()), Stretch::worth), "bo");
    StringBuilder outline = new StringBuilder();
    for (Run run : runs(s -> BigDecimal.ZERO, Stretch::worth)) {
      outline
          .append(
              outline.length() == 0
                  ? "M" + x(axis, run.from()) + " " + y(scale, BigDecimal.ZERO)
                  : "")
          .append("L")
          .append(x(axis, run.from()))
          .append(" ")
          .append(y(scale, run.high()))
          .append("H")
          .append(x(axis, run.to()));
    }
    if (outline.length() > 0) {
      outline.append("V").append(y(scale, BigDecimal.ZERO));
    }
    drawing.path("s-wo", outline);
  }

  private void band(
      Drawing drawing, FinishAxis axis, MoneyScale scale, List<Run> runs, String kind) {
    StringBuilder hatch = new StringBuilder();
    for (Run run : runs) {
      double left = axis.x(run.from());
      double w = axis.x(run.to()) - left;
      double top = scale.y(run.high());
      double h = scale.y(run.low()) - top;
      if (h <= 0.3 || w <= 0) {
        continue;
      }
      drawing.box("w-" + kind, left, top, w, h);
      hatch.append(
          switch (kind) {
            case "tr" -> Hatch.level(left, top, w, h, 5);
            case "da" -> Hatch.rising(left, top, w, h, 8.5);
            default -> Hatch.dots(left, top, w, h, 6);
          });
    }
    drawing.path("k-" + kind, hatch);
  }

  private List<Run> runs(Function<Stretch, BigDecimal> low, Function<Stretch, BigDecimal> high) {
    List<Run> runs = new ArrayList<>();
    for (Stretch one : stretches) {
      BigDecimal bottom = low.apply(one).max(BigDecimal.ZERO);
      BigDecimal top = high.apply(one).max(bottom);
      Run last = runs.isEmpty() ? null : runs.get(runs.size() - 1);
      if (last != null && last.low().compareTo(bottom) == 0 && last.high().compareTo(top) == 0) {
        runs.set(runs.size() - 1, new Run(last.from(), one.to(), bottom, top));
      } else {
        runs.add(new Run(one.from(), one.to(), bottom, top));
      }
    }
    return runs;
  }

  private List<Run> priceRuns() {
    return runs(s -> BigDecimal.ZERO, Stretch::price);
  }

  private void staircase(Drawing drawing, FinishAxis axis, MoneyScale scale, Places places) {
    StringBuilder path = new StringBuilder();
    double lastX = 0;
    double lastY = 0;
    for (Run run : priceRuns()) {
      double fromX = axis.x(run.from());
      double toX = axis.x(run.to());
      double y = scale.y(run.high());
      path.append(path.length() == 0 ? "M" : "L")
          .append(x(axis, run.from()))
          .append(" ")
          .append(y(scale, run.high()))
          .append("H")
          .append(x(axis, run.to()));
      places.takeLine(fromX, y, toX, y);
      if (lastX > 0) {
        places.takeLine(fromX, lastY, fromX, y);
      }
      lastX = toX;
      lastY = y;
    }
    drawing.path("s-prh", path);
    drawing.path("s-pr", path);
  }

  /** Where buying ends, what the next unit would cost, and what it is worth. */
  private void stop(Drawing drawing, FinishAxis axis, MoneyScale scale, Places places) {
    long chosen = answer.finish().duration();
    double x = axis.x(chosen);
    drawing.line("stop", x, 32, x, scale.bottom());
    places.takeLine(x, 32, x, scale.bottom());
    String stop = (answer.isLeastTotal() ? "Stop at " : "Put forward: ") + words.both(chosen);
    Optional<Stretch> next = next();
    String then =
        next.map(
                s ->
                    "The next "
                        + words.unit()
                        + " costs "
                        + words.money(s.price())
                        + " and is worth "
                        + words.money(s.worth()))
            .orElse("No plan is shorter");
    Label label =
        axis.isNarrow()
            ? Label.of(
                new Label.Line("b plum", stop),
                new Label.Line(
                    "",
                    next.map(
                            s ->
                                "then "
                                    + words.money(s.price())
                                    + ", worth "
                                    + words.money(s.worth()))
                        .orElse("No plan is shorter")))
            : Label.of(new Label.Line("b plum", stop), new Label.Line("", then));
    double w = label.width();
    Anchor anchor =
        x + 8 + w <= axis.width() ? Anchor.START : x - 8 - w >= 0 ? Anchor.END : Anchor.MIDDLE;
    double at =
        switch (anchor) {
          case START -> x + 8;
          case END -> x - 8;
          case MIDDLE -> Math.max(w / 2, Math.min(axis.width() - w / 2, x));
        };
    label.write(drawing, anchor, at, 12);
    for (Stretch one : stretches) {
      if (one.to() == chosen) {
        double y = scale.y(one.price().max(BigDecimal.ZERO).max(BigDecimal.ZERO));
        drawing.dot("ring", x, y, 6);
        drawing.dot("d-to", x, y, 3);
        places.take(new Room(x - 8, y - 8, 16, 16));
      }
    }
  }

  private Optional<Stretch> next() {
    return stretches.stream()
        .filter(stretch -> stretch.from() == answer.finish().duration())
        .findFirst();
  }

  /** One figure for a run of equal prices, above the line where it has room. */
  private void prices(Drawing drawing, FinishAxis axis, MoneyScale scale, Places places) {
    List<Run> runs = priceRuns();
    for (int i = 0; i < runs.size(); i++) {
      Run run = runs.get(i);
      String figure = words.amount(run.high());
      double w = Face.SEMIBOLD.width(figure, 12);
      double left = axis.x(run.from());
      double right = axis.x(run.to());
      double y = scale.y(run.high());
      List<Room> candidates = new ArrayList<>();
      if (right - left >= w + 4) {
        candidates.add(new Room((left + right - w) / 2 - 2, y - 15, w + 4, 11));
        candidates.add(new Room(left + 3, y - 15, w + 4, 11));
      }
      candidates.add(new Room(right - 6 - w, y - 15, w + 4, 11));
      candidates.removeIf(room -> room.x() < axis.left() - 2 || room.y() < 32);
      boolean last = i == runs.size() - 1 && !axis.isNarrow();
      if (!last) {
        places
            .place(candidates)
            .ifPresent(
                room -> {
                  drawing.box("plate", room.x(), room.y() - 0.5, w + 4, 12.5);
                  drawing.text("a b", Anchor.START, room.x() + 2, room.y() + 9.5, figure);
                });
      }
    }
  }

  private Optional<Double> contractX(FinishAxis axis) {
    return answer
        .of()
        .terms()
        .contractFinish()
        .map(by -> by.ticks())
        .filter(ticks -> ticks <= axis.longest() && ticks >= axis.shortest())
        .filter(ticks -> ticks != answer.finish().duration())
        .map(axis::x);
  }

  private void contractLine(Drawing drawing, FinishAxis axis, MoneyScale scale, Places places) {
    contractX(axis)
        .ifPresent(
            x -> {
              drawing.line("con", x, TOP, x, scale.bottom());
              places.takeLine(x, TOP, x, scale.bottom());
            });
  }

  private void contract(Drawing drawing, FinishAxis axis, MoneyScale scale, Places places) {
    Optional<Double> line = contractX(axis);
    if (line.isEmpty()) {
      return;
    }
    double x = line.get();
    double w = Face.MEDIUM.width("contract finish", 13);
    List<Room> candidates = new ArrayList<>();
    for (double y = TOP; y < scale.bottom() - 20; y += 7) {
      candidates.add(new Room(x + 5, y, w, 12));
      candidates.add(new Room(x - 5 - w, y, w, 12));
    }
    candidates.removeIf(room -> room.x() < axis.left() || room.x() + room.w() > axis.right());
    places
        .place(candidates)
        .ifPresent(
            room -> {
              drawing.box("plate", room.x() - 2, room.y() - 1, w + 4, 14);
              drawing.text("", Anchor.START, room.x(), room.y() + 10, "contract finish");
            });
  }

  private void gutters(Drawing drawing, FinishAxis axis, MoneyScale scale) {
    if (stretches.isEmpty()) {
      return;
    }
    Terms terms = answer.of().terms();
    Stretch first = stretches.get(0);
    Stretch last = stretches.get(stretches.size() - 1);
    Gutter left = new Gutter();
    Gutter right = new Gutter();
    if (first.time().signum() > 0) {
      left.add(
          scale.y(first.time().doubleValue() / 2),
          Label.of(
              new Label.Line("slate", "Time-related cost"),
              new Label.Line(
                  "",
                  words.money(terms.timeRelated().rate())
                      + " "
                      + words.one(terms.timeRelated().per()))));
    }
    if (stretches.stream().anyMatch(s -> s.damages().signum() > 0)) {
      double at = first.time().doubleValue() + Math.max(0, first.damages().doubleValue()) / 2;
      left.add(
          scale.y(at),
          Label.of(
              new Label.Line("brick", "Damages"),
              new Label.Line(
                  "",
                  words.money(terms.damages().rate()) + " " + words.one(terms.damages().per()))));
    }
    if (stretches.stream().anyMatch(s -> s.bonus().signum() > 0)) {
      double at = last.time().doubleValue() + Math.max(0, last.bonus().doubleValue()) / 2;
      right.add(
          scale.y(at),
          Label.of(
              new Label.Line("olive", "Bonus"),
              new Label.Line(
                  "", words.money(terms.bonus().rate()) + " " + words.one(terms.bonus().per()))));
    }
    right.add(
        scale.y(last.price().max(BigDecimal.ZERO)),
        Label.of(
            new Label.Line("b", "Price of the"),
            new Label.Line("b", "last " + words.unit() + ", " + words.amount(last.price()))));
    left.write(drawing, Anchor.END, axis.left() - 4, 40, scale.bottom() - 2);
    right.write(drawing, Anchor.START, axis.right() + 4, 40, scale.bottom() - 2);
  }

  private static String x(FinishAxis axis, long finish) {
    return Drawing.n(axis.x(finish));
  }

  private static String y(MoneyScale scale, BigDecimal amount) {
    return Drawing.n(scale.y(amount));
  }
}
