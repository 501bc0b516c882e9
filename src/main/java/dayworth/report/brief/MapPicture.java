package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.network.Activity;
import dayworth.network.Measures;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.page.Picture;
import dayworth.report.brief.svg.Drawing;
import dayworth.report.brief.svg.Drawing.Anchor;
import dayworth.report.brief.svg.Face;
import dayworth.report.brief.svg.Hatch;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Which activities are shortened, given back and critical, at every finish. */
final class MapPicture {

  private static final int TONES = 5;
  private static final double CELL = 17;
  private static final double NARROWEST = 9;
  private static final double WIDE = 16;
  private static final double BROAD_ROW = 24;
  private static final double NARROW_ROW = 37;
  private static final double BETWEEN_GROUPS = 8;
  private static final int MOST_SAID = 40;

  /** Where groups change oftener, gaps between them tell nothing. */
  private static final int MOST_GROUPS = 14;

  private final BriefAnswer answer;
  private final Words words;
  private final MapRows rows;

  MapPicture(BriefAnswer answer, Words words) {
    this.answer = answer;
    this.words = words;
    this.rows = MapRows.of(answer);
  }

  MapRows rows() {
    return rows;
  }

  Picture picture(String name) {
    return new Picture(
        name,
        "Compression map: " + words.units() + " bought from each activity, for every finish.",
        description(),
        List.of(
            new Picture.Drawn(Picture.Use.BROAD, new Sheet(FinishAxis.broad(answer, words)).draw()),
            new Picture.Drawn(
                Picture.Use.NARROW, new Sheet(FinishAxis.narrow(answer, words)).draw())));
  }

  /** What the marks mean. */
  Part.Key key() {
    List<Part.Mark> marks = new ArrayList<>();
    marks.add(
        mark(
            drawing -> {
              drawing.box("o o2", 3, 1, 24, 17);
              drawing.text("a b t2", Anchor.MIDDLE, 15, 14, "2");
            },
            Words.capital(words.units()) + " bought: the fuller the tone, the nearer the limit."));
    marks.add(
        mark(
            drawing -> {
              drawing.box("o o5", 3, 1, 24, 17);
              drawing.box("cap", 3, 1, 24, 2.6);
              drawing.text("a b t5", Anchor.MIDDLE, 15, 14, "6");
            },
            "At its shortest: nothing more to buy."));
    if (anyRelaxed()) {
      marks.add(
          mark(
              drawing -> {
                drawing.box("rel", 3, 1, 24, 17);
                drawing.text("a b teal", Anchor.MIDDLE, 15, 14, "0");
              },
              "Relaxed: " + words.aUnit() + " bought at a later finish is given back."));
    }
    marks.add(
        mark(
            drawing -> drawing.path("k-fl", Hatch.falling(3, 1, 24, 17, 7)),
            "Has float. The hatch gives way as the finish comes nearer."));
    marks.add(
        mark(
            drawing -> {
              drawing.box("cr", 4, 0, 2.4, 19);
              drawing.box("cr", 4, 17, 24, 2.4);
            },
            "Critical from here on."));
    return new Part.Key(marks);
  }

  private interface Painter {
    void paint(Drawing drawing);
  }

  private static Part.Mark mark(Painter painter, String meaning) {
    Drawing drawing = new Drawing(30, 20);
    painter.paint(drawing);
    return new Part.Mark(drawing.marks(), meaning);
  }

  boolean anyRelaxed() {
    return rows.shown().stream()
        .anyMatch(
            i -> {
              for (int s = 1; s < answer.states().size(); s++) {
                if (bought(s, i) < bought(s - 1, i)) {
                  return true;
                }
              }
              return false;
            });
  }

  private long bought(int state, int activity) {
    return MapRows.bought(answer, answer.states().get(state), activity);
  }

  private String description() {
    List<String> said = new ArrayList<>();
    for (int activity : rows.shown()) {
      List<String> changes = new ArrayList<>();
      for (int s = 0; s < answer.states().size(); s++) {
        long before = s == 0 ? 0 : bought(s - 1, activity);
        if (bought(s, activity) != before) {
          changes.add(
              words.figure(bought(s, activity))
                  + " at "
                  + words.figure(answer.states().get(s).finish().duration()));
        }
      }
      if (!changes.isEmpty() && said.size() < MOST_SAID) {
        Activity one = answer.of().network().activity(activity);
        said.add(
            (Words.id(one) + " " + Words.name(one)).strip() + ": " + String.join(", ", changes));
      }
    }
    return "Rows are activities, columns are finishes, longest on the left. What is bought of each"
        + " and from which finish on: "
        + (said.isEmpty() ? "nothing" : String.join("; ", said))
        + ".";
  }

  /** The states that are columns, longest first. */
  private List<Integer> columns(FinishAxis axis) {
    List<Integer> wanted = new ArrayList<>();
    wanted.add(answer.chosenState());
    wanted.add(0);
    wanted.add(answer.states().size() - 1);
    long unit = words.ticksPerUnit();
    boolean units = axis.column() >= NARROWEST;
    for (int s = 0; s < answer.states().size(); s++) {
      boolean regular =
          units ? axis.finishes().get(s) % unit == 0 : answer.states().get(s).finish().breakpoint();
      if (regular) {
        wanted.add(s);
      }
    }
    List<Integer> kept = new ArrayList<>();
    for (int s : wanted) {
      double x = axis.x(axis.finishes().get(s));
      if (kept.stream()
          .noneMatch(k -> Math.abs(axis.x(axis.finishes().get(k)) - x) < NARROWEST - 0.01)) {
        kept.add(s);
      }
    }
    kept.sort(Comparator.naturalOrder());
    return kept;
  }

  /** The most ticks that can be taken out of an activity in any way. */
  private long most(int activity) {
    Activity one = answer.of().network().activity(activity);
    Measures measures = answer.of().network().measures();
    return Arrays.stream(measures.of(activity))
        .mapToLong(m -> one.normal() - measures.get(m).duration())
        .reduce(one.mostShortening(), Math::max);
  }

  private int tone(int activity, long bought) {
    int tone = (int) Math.ceil(bought * (double) TONES / Math.max(1, most(activity)));
    return Math.min(TONES, Math.max(1, tone));
  }

  /** One drawing. */
  private final class Sheet {

    private final FinishAxis axis;
    private final List<Integer> columns;
    private final double above;
    private final Map<String, StringBuilder> paths = new TreeMap<>();
    private final StringBuilder hatch = new StringBuilder();

    Sheet(FinishAxis axis) {
      this.axis = axis;
      this.columns = columns(axis);
      this.above = words.hasDates() ? 56 : 30;
    }

    String draw() {
      double height = above;
      boolean grouped = groupChanges() <= MOST_GROUPS;
      List<Double> tops = new ArrayList<>();
      String group = "";
      for (int k = 0; k < rows.shown().size(); k++) {
        String next = answer.of().network().activity(rows.shown().get(k)).group();
        height += grouped && k > 0 && !next.equals(group) ? BETWEEN_GROUPS : 0;
        group = next;
        tops.add(height);
        height += axis.isNarrow() ? NARROW_ROW : BROAD_ROW;
      }
      Drawing drawing = new Drawing(axis.width(), height + 4);
      axis.mark(drawing, answer.finish().duration(), 4, height - 4);
      axis.above(drawing, above - 14);
      if (!axis.isNarrow()) {
        drawing.text(
            "a q", Anchor.START, axis.right() + 10, above - 14, "price of " + words.aUnit());
      }
      for (int k = 0; k < tops.size(); k++) {
        cells(rows.shown().get(k), top(tops.get(k)));
      }
      drawing.path("k-fl", hatch);
      paths.forEach((style, path) -> drawing.path(style.substring(1), path));
      for (int k = 0; k < tops.size(); k++) {
        words(drawing, rows.shown().get(k), tops.get(k));
        figures(drawing, rows.shown().get(k), top(tops.get(k)));
      }
      return drawing.svg();
    }

    private int groupChanges() {
      int changes = 0;
      for (int k = 1; k < rows.shown().size(); k++) {
        String one = answer.of().network().activity(rows.shown().get(k)).group();
        changes +=
            one.equals(answer.of().network().activity(rows.shown().get(k - 1)).group()) ? 0 : 1;
      }
      return changes;
    }

    private double top(double rowTop) {
      return axis.isNarrow() ? rowTop + 15 : rowTop;
    }

    private double left(int column) {
      double x = x(column);
      if (column > 0) {
        return (x + x(column - 1)) / 2;
      }
      return columns.size() == 1 ? axis.left() : Math.max(axis.left(), x - (x(1) - x) / 2);
    }

    private double right(int column) {
      if (column < columns.size() - 1) {
        return left(column + 1);
      }
      double x = x(column);
      return columns.size() == 1
          ? axis.right()
          : Math.min(axis.right(), x + (x - x(column - 1)) / 2);
    }

    private double x(int column) {
      return axis.x(axis.finishes().get(columns.get(column)));
    }

    private long boughtAt(int column, int activity) {
      return bought(columns.get(column), activity);
    }

    private boolean isCritical(int column, int activity) {
      return answer.of().isCritical(answer.states().get(columns.get(column)).timing(), activity);
    }

    private boolean isRelaxed(int column, int activity) {
      return column > 0 && boughtAt(column, activity) < boughtAt(column - 1, activity);
    }

    private void cells(int activity, double top) {
      for (int c = 0; c < columns.size(); c++) {
        double air = right(c) - left(c) >= WIDE ? 1 : 0.5;
        double x = left(c) + air;
        double w = right(c) - left(c) - 2 * air;
        long bought = boughtAt(c, activity);
        boolean critical = isCritical(c, activity);
        if (bought > 0 && !(isRelaxed(c, activity) && w >= WIDE - 2)) {
          int tone = tone(activity, bought);
          rect("1o" + tone, x, top, w, CELL);
        } else if (isRelaxed(c, activity)) {
          rect("1plate", x, top, w, CELL);
        } else if (critical) {
          rect("0cell", x, top, w, CELL);
        } else {
          hatch.append(Hatch.falling(left(c), top, right(c) - left(c), CELL, 7));
        }
        if (isRelaxed(c, activity)) {
          rect("3rel", x + 1, top + 1, w - 2, CELL - 2);
        }
        if (bought > 0 && bought == most(activity)) {
          rect("2cap", x, top, w, 2.4);
        }
        if (critical) {
          rect("4cr", left(c), top + CELL, right(c) - left(c), 2.2);
          if (c == 0 || !isCritical(c - 1, activity)) {
            rect("4cr", left(c) - 1.2, top - 1, 2.4, CELL + 3.2);
          }
        }
      }
    }

    private void rect(String style, double x, double y, double w, double h) {
      StringBuilder path = paths.computeIfAbsent(style, key -> new StringBuilder());
      path.append('M').append(Drawing.n(x)).append(' ').append(Drawing.n(y));
      path.append('h').append(Drawing.n(w)).append('v').append(Drawing.n(h));
      path.append('h').append(Drawing.n(-w)).append('z');
    }

    private void figures(Drawing drawing, int activity, double top) {
      double free = 0;
      for (int c = 0; c < columns.size(); c++) {
        long bought = boughtAt(c, activity);
        boolean relaxed = isRelaxed(c, activity);
        boolean changes = c == 0 ? bought > 0 : bought != boughtAt(c - 1, activity);
        double w = right(c) - left(c);
        String figure = words.figure(bought);
        double room = Face.SEMIBOLD.width(figure, 12);
        boolean told = (bought > 0 || relaxed) && (w >= WIDE || changes);
        double x = (left(c) + right(c)) / 2;
        if (told && room <= w - 1 && x - room / 2 > free) {
          int tone = tone(activity, bought);
          String ink = relaxed ? (w >= WIDE ? " teal" : " t" + tone) : " t" + tone;
          drawing.text("a b" + ink, Anchor.MIDDLE, x, top + 13, figure);
          free = x + room / 2;
        }
      }
    }

    private void words(Drawing drawing, int activity, double rowTop) {
      Activity one = answer.of().network().activity(activity);
      double y = axis.isNarrow() ? rowTop + 10 : rowTop + 13.5;
      double idRoom = axis.isNarrow() ? 110 : 66;
      String id = Face.SEMIBOLD.fit(Words.id(one), 13, idRoom);
      double widest =
          rows.shown().stream()
              .mapToDouble(
                  i -> Face.SEMIBOLD.width(Words.id(answer.of().network().activity(i)), 13))
              .max()
              .orElse(0);
      double left = axis.isNarrow() ? axis.left() : 0;
      double from = left + Math.min(widest, idRoom) + 8;
      String price = price(activity);
      double priceWidth = Face.MEDIUM.width(price, 13);
      double room =
          axis.isNarrow() ? axis.width() - 10 - priceWidth - 8 - from : axis.left() - 10 - from;
      drawing.text("b", Anchor.START, left, y, id);
      drawing.text("", Anchor.START, from, y, Face.MEDIUM.fit(Words.name(one), 13, room));
      if (axis.isNarrow()) {
        drawing.text("q", Anchor.END, axis.width() - 10, y, price);
      } else {
        drawing.text(
            "q",
            Anchor.START,
            axis.right() + 10,
            y,
            Face.MEDIUM.fit(price, 13, axis.width() - axis.right() - 8));
      }
    }

    private String price(int activity) {
      Activity one = answer.of().network().activity(activity);
      if (!one.isCompressible()) {
        return most(activity) > 0 ? "by measures" : "cannot shorten";
      }
      return words.money(one.slope().times(words.ticksPerUnit()))
          + ", up to "
          + words.figure(one.mostShortening());
    }
  }
}
