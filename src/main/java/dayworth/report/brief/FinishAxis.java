package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.report.brief.Places.Room;
import dayworth.report.brief.svg.Drawing;
import dayworth.report.brief.svg.Drawing.Anchor;
import dayworth.report.brief.svg.Face;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * The axis that the curve, the prices, the map and the slider share: finishes, the longest on the
 * left, so that reading to the right is buying time.
 */
final class FinishAxis {

  static final int BROAD = 760;
  static final int NARROW = 360;

  private static final double WIDEST_COLUMN = 48;
  private static final double SIZE = 12;

  private final Words words;
  private final List<Long> finishes;
  private final Set<Long> named;
  private final double left;
  private final double right;
  private final double column;
  private final int width;

  private FinishAxis(
      BriefAnswer answer,
      Words words,
      int width,
      double left,
      double mostRight,
      boolean hasContract) {
    this.words = words;
    this.width = width;
    this.left = left;
    this.finishes = answer.states().stream().map(state -> state.finish().duration()).toList();
    long unit = answer.of().network().scale().ticksPerUnit();
    double units = (longest() - shortest()) / (double) unit + 1;
    this.column = Math.min(WIDEST_COLUMN, (mostRight - left) / units);
    this.right = left + column * units;
    this.named = new LinkedHashSet<>();
    named.add(answer.finish().duration());
    named.add(longest());
    named.add(shortest());
    if (hasContract) {
      answer.curve().atContract().ifPresent(finish -> named.add(finish.duration()));
    }
    named.add(answer.curve().leastTotal().duration());
    named.removeIf(finish -> finish > longest() || finish < shortest());
  }

  /** For a broad page, with a gutter on both sides. */
  static FinishAxis broad(BriefAnswer answer, Words words) {
    return new FinishAxis(answer, words, BROAD, 176, 642, true);
  }

  /** For a narrow page, from edge to edge. */
  static FinishAxis narrow(BriefAnswer answer, Words words) {
    return new FinishAxis(answer, words, NARROW, 10, 350, true);
  }

  boolean isNarrow() {
    return width == NARROW;
  }

  int width() {
    return width;
  }

  double left() {
    return left;
  }

  double right() {
    return right;
  }

  long longest() {
    return finishes.get(0);
  }

  long shortest() {
    return finishes.get(finishes.size() - 1);
  }

  List<Long> finishes() {
    return finishes;
  }

  /** How wide one unit of time is. */
  double column() {
    return column;
  }

  double x(long finish) {
    double first = left + column / 2;
    return longest() == shortest() ? first : first + (right - left - column) * share(finish);
  }

  /** 0 at the longest finish, 1 at the shortest. */
  double share(long finish) {
    return longest() == shortest() ? 0 : (longest() - finish) / (double) (longest() - shortest());
  }

  /** The column of the chosen finish; the slider moves it. */
  void mark(Drawing drawing, long chosen, double top, double height) {
    double w = Math.max(9, column);
    drawing.open(
        " class=\"mark\" data-x=\""
            + Drawing.n(left + column / 2)
            + "\" data-w=\""
            + Drawing.n(right - left - column)
            + "\" transform=\"translate("
            + Drawing.n(x(chosen))
            + " 0)\"");
    drawing.box("mk", -w / 2, top, w, height);
    drawing.close();
  }

  /** How high figures and dates are. */
  double height() {
    return words.hasDates() ? 46 : 20;
  }

  /** The axis below a picture. */
  void below(Drawing drawing, double y) {
    drawing.line("ax", left, y, right, y);
    for (long finish : labelled()) {
      drawing.line("ax", x(finish), y, x(finish), y + 4);
    }
    figures(drawing, y + 16, y + 30, y + 43);
  }

  /** Figures and dates above a map. */
  void above(Drawing drawing, double baseline) {
    figures(drawing, baseline, baseline - 14, baseline - 27);
  }

  private void figures(Drawing drawing, double figureY, double dayY, double monthY) {
    Optional<LocalDate> last = Optional.empty();
    double free = Double.NEGATIVE_INFINITY;
    for (long finish : labelled()) {
      double x = x(finish);
      String style = named.contains(finish) ? "a b" : "a";
      drawing.text(style, Anchor.MIDDLE, x, figureY, words.figure(finish));
      Optional<LocalDate> date = words.date(finish);
      if (date.isPresent()) {
        LocalDate day = date.get();
        drawing.text("a q", Anchor.MIDDLE, x, dayY, Integer.toString(day.getDayOfMonth()));
        boolean newMonth = last.filter(d -> d.getMonth() == day.getMonth()).isEmpty();
        if (newMonth && x - 12 > free) {
          drawing.text("a q", Anchor.MIDDLE, x, monthY, Words.month(day));
          free = x + 14;
        }
        last = date;
      }
    }
    if (!isNarrow()) {
      drawing.text("a q", Anchor.END, left - 12, figureY, words.workingUnits());
      if (words.hasDates()) {
        drawing.text("a q", Anchor.END, left - 12, dayY, "finish on");
      }
    }
  }

  /** Finishes with a figure, from long to short: named ones, and of the others what has room. */
  private List<Long> labelled() {
    Places places = new Places();
    List<Long> labelled = new ArrayList<>();
    for (long finish : named) {
      if (places.place(List.of(room(finish))).isPresent()) {
        labelled.add(finish);
      }
    }
    for (long finish : regular()) {
      if (!named.contains(finish) && places.place(List.of(room(finish))).isPresent()) {
        labelled.add(finish);
      }
    }
    labelled.sort(java.util.Comparator.reverseOrder());
    return labelled;
  }

  private Room room(long finish) {
    double w = Face.SEMIBOLD.width(words.figure(finish), SIZE) + 5;
    return new Room(x(finish) - w / 2, 0, w, 10);
  }

  /** Every finish of whole units where all have room, else every fifth or tenth and so on. */
  private List<Long> regular() {
    double widest = finishes.stream().mapToDouble(finish -> room(finish).w()).max().orElse(1);
    long unit = words.ticksPerUnit();
    for (long step : new long[] {1, 5, 10, 20, 50, 100, 200, 500, 1000}) {
      if (column * step >= widest + 1) {
        return finishes.stream().filter(finish -> finish % (unit * step) == 0).toList();
      }
    }
    return List.of();
  }
}
