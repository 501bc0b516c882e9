package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.decision.Finish;
import dayworth.report.brief.Places.Room;
import dayworth.report.brief.page.Picture;
import dayworth.report.brief.svg.Drawing;
import dayworth.report.brief.svg.Drawing.Anchor;
import dayworth.report.brief.svg.Face;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** Money that depends on the finish, against the finish. */
final class CurvePicture {

  private static final double PLOT = 330;
  private static final int MOST_DOTS = 70;
  private static final double GUTTER = 116;

  /** What wastes much more than everything else costs would flatten the picture. */
  private static final double MOST_WASTE = 1.5;

  private final BriefAnswer answer;
  private final Words words;
  private final Outcome outcome;
  private final List<Finish> finishes;
  private final List<MoneyLine> lines;
  private final BigDecimal crash;
  private final boolean showsCrash;

  /** A line of money. */
  private record MoneyLine(
      String name, String ink, String stroke, Function<Finish, BigDecimal> amount) {}

  CurvePicture(BriefAnswer answer, Words words, Outcome outcome) {
    this.answer = answer;
    this.words = words;
    this.outcome = outcome;
    this.finishes = answer.states().stream().map(BriefAnswer.State::finish).toList();
    this.lines = lines();
    this.crash = outcome.depends(answer.curve().crashEverything());
    long at = answer.curve().crashEverything().duration();
    double most =
        finishes.stream().mapToDouble(f -> outcome.depends(f).doubleValue()).max().orElse(0);
    this.showsCrash =
        at == shortest().duration()
            && crash.compareTo(outcome.depends(shortest())) > 0
            && crash.doubleValue() <= Math.max(most * MOST_WASTE, 1);
  }

  private Finish shortest() {
    return finishes.get(finishes.size() - 1);
  }

  private List<MoneyLine> lines() {
    List<MoneyLine> all = new ArrayList<>();
    all.add(new MoneyLine("Extra direct cost", "", "s-ex", outcome::extraDirect));
    if (outcome.hasRunning()) {
      all.add(new MoneyLine("Running cost", "", "s-ru", Outcome::running));
    }
    if (outcome.hasTimeRelated()) {
      all.add(new MoneyLine("Time-related cost", "slate", "s-tr", Outcome::timeRelated));
    }
    if (outcome.hasDamages()) {
      all.add(new MoneyLine("Damages", "brick", "s-da", Outcome::damages));
    }
    if (outcome.hasBonus()) {
      all.add(new MoneyLine("Bonus", "olive", "s-bo", finish -> Outcome.bonus(finish).negate()));
    }
    return all;
  }

  Picture picture(String name) {
    String stepRight =
        "The longest finish is on the left: each step to the right buys one "
            + words.workingUnit()
            + ".";
    return new Picture(
        name,
        "Money that depends on the finish. " + stepRight,
        description(),
        List.of(
            new Picture.Drawn(Picture.Use.BROAD, broad()),
            new Picture.Drawn(Picture.Use.NARROW, narrow())));
  }

  private String description() {
    List<String> said = new ArrayList<>();
    said.add(said(words.asPlanned(), outcome.planned()));
    said.add(said("least total", answer.curve().leastTotal()));
    if (!answer.isLeastTotal()) {
      said.add(said("chosen", answer.finish()));
    }
    answer.curve().atContract().ifPresent(finish -> said.add(said("contract finish", finish)));
    said.add(said("shortest", answer.curve().shortest()));
    said.add(said("crashing everything", answer.curve().crashEverything()));
    return String.join("; ", said) + ". All values are in the last table.";
  }

  private String said(String name, Finish finish) {
    return name
        + " "
        + words.workingTime(finish.duration())
        + ", "
        + words.money(outcome.depends(finish));
  }

  private String broad() {
    FinishAxis axis = FinishAxis.broad(answer, words);
    Flags flags = flags(axis, false);
    double top = flags.place() + 16;
    MoneyScale scale = scale(top);
    Drawing drawing = new Drawing(FinishAxis.BROAD, scale.bottom() + 20 + axis.height());
    Places places = linePlaces(axis, scale);
    ground(drawing, axis, scale, top, places);
    money(drawing, axis, scale);
    flags.write(drawing, flagEnds(scale, false));
    points(drawing, axis, scale);
    gutters(drawing, axis, scale);
    axis.below(drawing, scale.bottom() + 20);
    return drawing.svg();
  }

  private String narrow() {
    FinishAxis axis = FinishAxis.narrow(answer, words);
    Flags flags = flags(axis, true);
    double top = flags.place() + 14;
    MoneyScale scale = scale(top);
    Drawing drawing = new Drawing(FinishAxis.NARROW, scale.bottom() + 20 + axis.height());
    Places places = linePlaces(axis, scale);
    ground(drawing, axis, scale, top, places);
    money(drawing, axis, scale);
    flags.write(drawing, flagEnds(scale, true));
    points(drawing, axis, scale);
    namesOnLines(drawing, axis, scale, places);
    axis.below(drawing, scale.bottom() + 20);
    return drawing.svg();
  }

  private MoneyScale scale(double top) {
    List<BigDecimal> amounts = new ArrayList<>();
    for (Finish finish : finishes) {
      amounts.add(outcome.depends(finish));
      lines.forEach(line -> amounts.add(line.amount().apply(finish)));
    }
    if (showsCrash) {
      amounts.add(crash);
    }
    if (isOnAxis(outcome.planned())) {
      amounts.add(outcome.depends(outcome.planned()));
    }
    return MoneyScale.of(amounts, top, top + PLOT);
  }

  private boolean isOnAxis(Finish finish) {
    return finish.duration() <= finishes.get(0).duration()
        && finish.duration() >= shortest().duration();
  }

  /** The grid, and the column of the chosen finish. */
  private void ground(
      Drawing drawing, FinishAxis axis, MoneyScale scale, double top, Places places) {
    axis.mark(drawing, answer.finish().duration(), top - 6, scale.bottom() - top + 26);
    drawing.line("g0", axis.left(), scale.y(0), axis.right(), scale.y(0));
    for (BigDecimal amount : scale.round(4)) {
      double y = scale.y(amount);
      drawing.line("g", axis.left(), y, axis.right(), y);
      String text = words.round(amount);
      double w = Face.MEDIUM.width(text, 12);
      places
          .place(
              List.of(
                  new Room(axis.left() + 3, y - 14, w, 11),
                  new Room(axis.right() - 3 - w, y - 14, w, 11),
                  new Room(axis.left() + 3, y + 3, w, 11),
                  new Room((axis.left() + axis.right() - w) / 2, y - 14, w, 11)))
          .ifPresent(room -> drawing.text("a q", Anchor.START, room.x(), room.y() + 10, text));
    }
  }

  private void money(Drawing drawing, FinishAxis axis, MoneyScale scale) {
    for (MoneyLine line : lines) {
      drawing.path(line.stroke(), path(axis, scale, line));
    }
    drawing.path("s-to", path(axis, scale, new MoneyLine("", "", "", outcome::depends)));
    if (finishes.size() <= MOST_DOTS && axis.column() >= 6) {
      for (Finish finish : finishes) {
        drawing.dot("d-ex", axis.x(finish.duration()), scale.y(outcome.extraDirect(finish)), 1.7);
        drawing.dot("d-to", axis.x(finish.duration()), scale.y(outcome.depends(finish)), 2.2);
      }
    }
  }

  /** Damages only where there are any, and a bonus likewise: a line at zero would say nothing. */
  private String path(FinishAxis axis, MoneyScale scale, MoneyLine line) {
    StringBuilder path = new StringBuilder();
    boolean part = line.stroke().equals("s-da") || line.stroke().equals("s-bo");
    for (int i = 0; i < finishes.size(); i++) {
      boolean told = !part || isTold(line, i - 1) || isTold(line, i) || isTold(line, i + 1);
      if (told) {
        boolean begins = path.length() == 0 || (part && !wasTold(line, i));
        path.append(begins ? 'M' : 'L')
            .append(Drawing.n(axis.x(finishes.get(i).duration())))
            .append(' ')
            .append(Drawing.n(scale.y(line.amount().apply(finishes.get(i)))));
      }
    }
    return path.toString();
  }

  private boolean wasTold(MoneyLine line, int i) {
    return isTold(line, i - 2) || isTold(line, i - 1) || isTold(line, i);
  }

  private boolean isTold(MoneyLine line, int i) {
    return i >= 0 && i < finishes.size() && line.amount().apply(finishes.get(i)).signum() != 0;
  }

  // Named points

  private record Named(String name, String ink, Finish finish) {}

  /** Points with a name above the picture, the most telling first. */
  private List<Named> flagged(boolean narrow) {
    List<Named> named = new ArrayList<>();
    Finish least = answer.curve().leastTotal();
    if (!answer.isLeastTotal()) {
      named.add(new Named("Put forward", " plum", answer.finish()));
      named.add(new Named("Least total", "", least));
    } else {
      named.add(new Named("Least total", " plum", answer.finish()));
    }
    answer
        .curve()
        .atContract()
        .filter(this::isOnAxis)
        .filter(finish -> named.stream().noneMatch(n -> same(n.finish(), finish)))
        .ifPresent(finish -> named.add(new Named("Contract finish", "", finish)));
    boolean plannedInGutter = !narrow && same(outcome.planned(), finishes.get(0));
    if (!plannedInGutter
        && isOnAxis(outcome.planned())
        && named.stream().noneMatch(n -> same(n.finish(), outcome.planned()))) {
      named.add(new Named(words.asPlanned(), "", outcome.planned()));
    }
    if (narrow && named.stream().noneMatch(n -> same(n.finish(), shortest()))) {
      named.add(new Named("Shortest", "", shortest()));
    }
    return named;
  }

  private boolean same(Finish one, Finish other) {
    return one.duration() == other.duration() && one.total().compareTo(other.total()) == 0;
  }

  private Flags flags(FinishAxis axis, boolean narrow) {
    Flags flags = new Flags(axis.width());
    for (Named named : flagged(narrow)) {
      flags.add(
          axis.x(named.finish().duration()), label(named.name(), named.ink(), named.finish()));
    }
    return flags;
  }

  /** A label beside the picture, where a line must not be long. */
  private Label slim(String name, Finish finish) {
    Label one = label(name, "", finish);
    if (one.width() <= GUTTER || words.date(finish.duration()).isEmpty()) {
      return one;
    }
    return Label.of(
        one.lines().get(0),
        new Label.Line("", words.finish(finish.duration())),
        new Label.Line("", words.time(finish.duration())),
        one.lines().get(2));
  }

  private Label label(String name, String ink, Finish finish) {
    return Label.of(
        new Label.Line("b" + ink, name),
        new Label.Line(
            "",
            words
                .date(finish.duration())
                .map(date -> words.shortDate(date) + ", " + words.time(finish.duration()))
                .orElse(words.workingTime(finish.duration()))),
        new Label.Line("b", words.money(outcome.depends(finish))));
  }

  private List<Double> flagEnds(MoneyScale scale, boolean narrow) {
    return flagged(narrow).stream().map(n -> scale.y(outcome.depends(n.finish())) - 8).toList();
  }

  private void points(Drawing drawing, FinishAxis axis, MoneyScale scale) {
    if (showsCrash) {
      double x = axis.x(shortest().duration());
      double y = scale.y(crash);
      double from = scale.y(outcome.depends(shortest()));
      if (from - y > 16) {
        drawing.line("waste", x, y + 7, x, from - 6);
      }
      drawing.path(
          "cross", "M" + Drawing.n(x - 5) + " " + Drawing.n(y - 5) + "l10 10m0 -10l-10 10");
    }
    for (Named named : flagged(true)) {
      open(drawing, axis, scale, named.finish());
    }
    open(drawing, axis, scale, finishes.get(0));
    double x = axis.x(answer.finish().duration());
    double y = scale.y(outcome.depends(answer.finish()));
    drawing.dot("ring", x, y, 7);
    drawing.dot("d-to", x, y, 3.6);
  }

  private void open(Drawing drawing, FinishAxis axis, MoneyScale scale, Finish finish) {
    drawing.dot("open", axis.x(finish.duration()), scale.y(outcome.depends(finish)), 4.6);
  }

  // Names of lines

  private void gutters(Drawing drawing, FinishAxis axis, MoneyScale scale) {
    Finish first = finishes.get(0);
    Finish last = shortest();
    Gutter left = new Gutter();
    Gutter right = new Gutter();
    if (same(first, outcome.planned())
        && flagged(false).stream().noneMatch(n -> same(n.finish(), first))) {
      left.add(scale.y(outcome.depends(first)), label(words.asPlanned(), "", first));
    } else {
      left.add(
          scale.y(outcome.depends(first)),
          Label.of(
              new Label.Line("b plum", "Total"),
              new Label.Line("b", words.money(outcome.depends(first)))));
    }
    for (MoneyLine line : lines) {
      addName(line, first, last, scale, left, right);
    }
    if (flagged(false).stream().noneMatch(n -> same(n.finish(), last))) {
      right.add(scale.y(outcome.depends(last)), slim("Shortest possible", last));
    }
    if (showsCrash) {
      right.add(scale.y(crash) - 6, crashLabel());
    }
    left.write(drawing, Anchor.END, axis.left() - 4, scale.top() - 30, scale.bottom() + 12);
    right.write(drawing, Anchor.START, axis.right() + 4, scale.top() - 40, scale.bottom() + 12);
  }

  private void addName(
      MoneyLine line, Finish first, Finish last, MoneyScale scale, Gutter left, Gutter right) {
    BigDecimal begin = line.amount().apply(first);
    BigDecimal end = line.amount().apply(last);
    boolean fromLeft = !line.stroke().equals("s-bo") || begin.signum() != 0;
    if (fromLeft) {
      left.add(
          scale.y(begin),
          Label.of(
              new Label.Line(line.ink(), line.name()), new Label.Line("", words.money(begin))));
      if (end.signum() != 0 && finishes.size() > 1) {
        right.add(scale.y(end), Label.of(new Label.Line(line.ink(), words.money(end))));
      }
    } else {
      right.add(
          scale.y(end), Label.of(new Label.Line(line.ink(), line.name() + " " + words.money(end))));
    }
  }

  private Label crashLabel() {
    BigDecimal wasted = crash.subtract(outcome.depends(shortest()));
    return Label.of(
        new Label.Line("b", "Crash everything"),
        new Label.Line("", words.money(crash) + ","),
        new Label.Line("", words.money(wasted) + " wasted"));
  }

  private void namesOnLines(Drawing drawing, FinishAxis axis, MoneyScale scale, Places places) {
    List<MoneyLine> all = withTotal();
    Room frame = new Room(axis.left(), scale.top() - 4, axis.right() - axis.left(), PLOT + 18);
    for (MoneyLine line : all) {
      name(drawing, axis, scale, line, places, frame);
    }
  }

  private List<MoneyLine> withTotal() {
    List<MoneyLine> all = new ArrayList<>(lines);
    all.add(new MoneyLine("Total", "b plum", "s-to", outcome::depends));
    return all;
  }

  /** What the lines of money cover. */
  private Places linePlaces(FinishAxis axis, MoneyScale scale) {
    Places places = new Places();
    for (MoneyLine line : withTotal()) {
      for (int i = 1; i < finishes.size(); i++) {
        places.takeLine(
            axis.x(finishes.get(i - 1).duration()),
            scale.y(line.amount().apply(finishes.get(i - 1))),
            axis.x(finishes.get(i).duration()),
            scale.y(line.amount().apply(finishes.get(i))));
      }
    }
    return places;
  }

  private void name(
      Drawing drawing,
      FinishAxis axis,
      MoneyScale scale,
      MoneyLine line,
      Places places,
      Room frame) {
    double w = new Label.Line(line.ink(), line.name()).width();
    List<Room> candidates = new ArrayList<>();
    for (int i = 0; i < finishes.size(); i++) {
      if (line.amount().apply(finishes.get(i)).signum() == 0 && !line.stroke().equals("s-ex")) {
        continue;
      }
      double x = axis.x(finishes.get(i).duration());
      double y = scale.y(line.amount().apply(finishes.get(i)));
      for (double left : new double[] {x, x - w / 2, x - w}) {
        candidates.add(new Room(left, y - 17, w, 12));
        candidates.add(new Room(left, y + 5, w, 12));
      }
    }
    candidates.removeIf(room -> !room.isWithin(frame));
    Optional<Room> room = places.place(candidates);
    room.ifPresent(
        found -> drawing.text(line.ink(), Anchor.START, found.x(), found.y() + 10, line.name()));
  }
}
