package dayworth.report.brief;

import dayworth.decision.Finish;
import dayworth.report.brief.page.Picture;
import dayworth.report.brief.svg.Drawing;
import dayworth.report.brief.svg.Drawing.Anchor;
import dayworth.report.brief.svg.Face;
import dayworth.report.brief.svg.Hatch;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/** What the choices cost, as stacks in the columns of the table below them. */
final class ChoicePicture {

  /** The first column of the table, which has no stack, takes this share. */
  static final double FIRST = 0.26;

  private static final double HEIGHT = 212;
  private static final double BASE = 206;
  private static final double TOP = 42;
  private static final double GAP = 1.6;
  private static final double NARROW_BAR = 44;

  private final Words words;
  private final Outcome outcome;
  private final List<Finish> choices;
  private final List<String> names;
  private final MoneyScale scale;

  ChoicePicture(Words words, Outcome outcome, List<Finish> choices, List<String> names) {
    this.words = words;
    this.outcome = outcome;
    this.choices = choices;
    this.names = names;
    List<BigDecimal> tops = new ArrayList<>();
    for (Finish choice : choices) {
      tops.add(
          Outcome.timeRelated(choice)
              .add(Outcome.running(choice))
              .add(Outcome.damages(choice))
              .add(outcome.extraDirect(choice).max(BigDecimal.ZERO)));
    }
    this.scale = MoneyScale.of(tops, TOP, BASE);
  }

  Picture picture() {
    List<String> said = new ArrayList<>();
    for (int i = 0; i < choices.size(); i++) {
      said.add(
          names.get(i)
              + ", "
              + words.finish(choices.get(i).duration())
              + ": "
              + words.money(outcome.depends(choices.get(i))));
    }
    return new Picture(
        "",
        "What each choice costs",
        String.join("; ", said),
        List.of(
            new Picture.Drawn(Picture.Use.BROAD, draw(1040, FIRST * 1040, 76)),
            new Picture.Drawn(Picture.Use.NARROW, draw(360, 0, 44))));
  }

  private String draw(double width, double first, double widest) {
    double legend = first > 0 ? 0 : 20;
    Drawing drawing = new Drawing(width, HEIGHT + legend);
    double column = (width - first) / choices.size();
    double bar = Math.min(widest, column - 18);
    drawing.line("g0", first, BASE, width, BASE);
    for (int i = 0; i < choices.size(); i++) {
      stack(drawing, choices.get(i), first + column * (i + 0.5), bar, column);
    }
    if (first > 0) {
      double total = Face.SEMIBOLD.width(words.money(outcome.depends(choices.get(0))), 17);
      names(drawing, first + column / 2 - Math.max(bar, total) / 2 - 10);
    } else {
      legend(drawing);
    }
    return drawing.svg();
  }

  /** The parts from below: time, running, damages, extra direct; the bonus is cut off the top. */
  private List<Piece> pieces(Finish finish) {
    return List.of(
        new Piece("Time-related cost", "slate", "tr", Outcome.timeRelated(finish)),
        new Piece("Running cost", "", "ru", Outcome.running(finish)),
        new Piece("Damages", "brick", "da", Outcome.damages(finish)),
        new Piece("Extra direct cost", "", "ex", outcome.extraDirect(finish)));
  }

  private record Piece(String name, String ink, String kind, BigDecimal amount) {}

  private void stack(Drawing drawing, Finish finish, double x, double bar, double column) {
    boolean large = bar > NARROW_BAR;
    BigDecimal sum = BigDecimal.ZERO;
    double left = x - bar / 2;
    for (Piece piece : pieces(finish)) {
      if (piece.amount().signum() <= 0) {
        continue;
      }
      double bottom = scale.y(sum) - (sum.signum() == 0 ? 0 : GAP);
      sum = sum.add(piece.amount());
      double top = scale.y(sum);
      piece(drawing, piece.kind(), left, top, bar, bottom - top);
    }
    BigDecimal bonus = Outcome.bonus(finish);
    if (bonus.signum() > 0) {
      double top = scale.y(sum);
      double h = scale.y(sum.subtract(bonus)) - top;
      drawing.box("w-bo", left, top, bar, h);
      drawing.path("k-bo", Hatch.dots(left, top, bar, h, 6));
      drawing.box("over", left, top, bar, h);
    }
    double total = scale.y(outcome.depends(finish));
    drawing.line("tot", left - 8, total, x + bar / 2 + 8, total);
    String style = large ? "big plum" : "b plum";
    double above = Math.min(scale.y(sum), total) - (large ? 8 : 6);
    String text = words.money(outcome.depends(finish));
    // Where amounts have no room beside each other, the table below has them.
    if (large || Face.SEMIBOLD.width(text, 13) <= column - 4) {
      drawing.text(style, Anchor.MIDDLE, x, above, text);
    }
  }

  private static void piece(Drawing drawing, String kind, double x, double y, double w, double h) {
    if (h <= 0.2) {
      return;
    }
    switch (kind) {
      case "ex" -> drawing.box("f-ex", x, y, w, h);
      case "ru" -> {
        drawing.box("w-ru", x, y, w, h);
        drawing.path("k-ru", Hatch.falling(x, y, w, h, 6));
      }
      case "tr" -> {
        drawing.box("w-tr", x, y, w, h);
        drawing.path("k-tr", Hatch.level(x, y, w, h, 5));
      }
      default -> {
        drawing.box("w-da", x, y, w, h);
        drawing.path("k-da", Hatch.rising(x, y, w, h, 8.5));
      }
    }
  }

  /** Names beside the first stack, each at the first part that has it; the rest go to the last. */
  private void names(Drawing drawing, double x) {
    Gutter left = new Gutter();
    List<String> told = new ArrayList<>();
    BigDecimal sum = BigDecimal.ZERO;
    for (Piece piece : pieces(choices.get(0))) {
      if (piece.amount().signum() > 0) {
        double middle = scale.y(sum.add(piece.amount().divide(BigDecimal.valueOf(2))));
        left.add(middle, Label.of(new Label.Line(piece.ink(), piece.name())));
        told.add(piece.name());
        sum = sum.add(piece.amount());
      }
    }
    Finish last = choices.get(choices.size() - 1);
    List<Label.Line> rest = new ArrayList<>();
    for (Piece piece : pieces(last)) {
      if (piece.amount().signum() > 0 && !told.contains(piece.name())) {
        rest.add(
            new Label.Line(
                piece.ink(),
                piece.kind().equals("ex") ? "Solid: extra direct cost" : piece.name()));
      }
    }
    if (Outcome.bonus(last).signum() > 0) {
      rest.add(new Label.Line("olive", "Dots: less bonus"));
    }
    for (int i = 0; i < rest.size(); i++) {
      left.add(TOP - 24 + i, Label.of(rest.get(i)));
    }
    left.write(drawing, Anchor.END, x, 0, BASE);
  }

  private void legend(Drawing drawing) {
    double x = 4;
    for (Piece piece : pieces(choices.get(0))) {
      boolean used =
          choices.stream()
              .anyMatch(
                  choice ->
                      pieces(choice).stream()
                          .anyMatch(p -> p.name().equals(piece.name()) && p.amount().signum() > 0));
      if (used) {
        String name = piece.name().replace(" cost", "");
        piece(drawing, piece.kind(), x, BASE + 10, 12, 12);
        drawing.text("a", Anchor.START, x + 16, BASE + 20, name);
        x += 16 + Face.MEDIUM.width(name, 12) + 12;
      }
    }
  }
}
