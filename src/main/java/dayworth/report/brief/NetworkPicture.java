package dayworth.report.brief;

import dayworth.contract.Due;
import dayworth.decision.BriefAnswer;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Relation;
import dayworth.network.Timing;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.page.Picture;
import dayworth.report.brief.svg.Drawing;
import dayworth.report.brief.svg.Drawing.Anchor;
import dayworth.report.brief.svg.Face;
import dayworth.report.brief.svg.Hatch;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The network at one finish: boxes on a scale of time, in lanes by chain, with early and late
 * times.
 */
final class NetworkPicture {

  private static final double SIZE = 12;
  private static final int MOST_NOTCHES = 8;

  /** So many lanes go on a broad page of paper. */
  private static final int MOST_LANES = 6;

  private static final int MOST_SAID = 60;

  /** Panels on paper share so much, that no box is only ever cut. */
  private static final double SHARED = 120;

  private final BriefAnswer answer;
  private final Words words;
  private final NetworkLayout layout;

  NetworkPicture(BriefAnswer answer, Words words, NetworkLayout layout) {
    this.answer = answer;
    this.words = words;
    this.layout = layout;
  }

  Picture picture(String name) {
    Drawing drawing = new Drawing(layout.width(), layout.height());
    drawing.openSheet("net");
    still(drawing);
    drawing.open(" id=\"net-moving\"");
    moving(drawing, answer.chosenState());
    drawing.close();
    drawing.closeSheet();
    List<Picture.Drawn> drawings = new ArrayList<>();
    drawings.add(new Picture.Drawn(Picture.Use.ALWAYS, sized(drawing.svg())));
    if (layout.width() > NetworkLayout.PAGE || layout.lanes().size() > MOST_LANES) {
      panels().forEach(panel -> drawings.add(new Picture.Drawn(Picture.Use.PAPER, panel)));
    }
    String boxes =
        "Each box begins at its start and ends at its finish; where work is short the scale is"
            + " stretched so that its words have room. One lane to a chain.";
    return new Picture(name, boxes, description(), drawings);
  }

  /** A wide picture is not squeezed into the page but scrolls. */
  private String sized(String svg) {
    return "<svg style=\"min-width:"
        + Drawing.n(layout.width())
        + "px\" "
        + svg.substring("<svg ".length());
  }

  /** On paper the picture is cut into pages, so that its words can be read. */
  private List<String> panels() {
    int lanes = Math.max(1, layout.lanes().size());
    int rows = (lanes + MOST_LANES - 1) / MOST_LANES;
    int each = (lanes + rows - 1) / rows;
    List<String> panels = new ArrayList<>();
    for (int row = 0; row < rows; row++) {
      double top = row == 0 ? 0 : layout.top(row * each) - 16;
      double bottom = row == rows - 1 ? layout.height() : layout.top((row + 1) * each) - 12;
      double from = 0;
      do {
        panels.add(panel(from, top, bottom - top));
        from += NetworkLayout.PAGE - SHARED;
      } while (from < layout.width() - SHARED);
    }
    return panels;
  }

  private static String panel(double left, double top, double height) {
    return "<svg viewBox=\""
        + Drawing.n(left)
        + " "
        + Drawing.n(top)
        + " "
        + Drawing.n(NetworkLayout.PAGE)
        + " "
        + Drawing.n(height)
        + "\"><use href=\"#net\"/></svg>";
  }

  private String description() {
    NetworkFrame frame = layout.frame(answer.chosenState());
    List<String> said = new ArrayList<>();
    for (int b = 0; b < layout.shown().size() && b < MOST_SAID; b++) {
      Activity one = layout.activity(b);
      said.add(
          (Words.id(one) + " " + Words.name(one)).strip()
              + ": "
              + words.unit()
              + " "
              + words.figure(frame.start(b))
              + " to "
              + words.figure(frame.end(b))
              + ", float "
              + words.figure(frame.late(b) - frame.early(b)));
    }
    return "Activities as boxes on a scale of "
        + words.workingUnits()
        + ", at the finish of "
        + words.time(answer.finish().duration())
        + ". "
        + String.join("; ", said)
        + ".";
  }

  /** Lanes and what stands beside them. */
  private void still(Drawing drawing) {
    for (int l = 0; l < layout.lanes().size(); l++) {
      String name = layout.laneName(layout.lanes().get(l));
      List<String> lines = Face.SEMIBOLD.wrap(name, 13, layout.left() - 4, 3);
      double y = layout.top(l) + 34 - (lines.size() - 1) * 7;
      for (int i = 0; i < lines.size(); i++) {
        drawing.text("b slate", Anchor.START, 0, y + i * 14, lines.get(i));
      }
    }
    if (words.hasDates()) {
      drawing.text("a q", Anchor.START, 0, 42, "from");
    }
    drawing.text(
        "a q", Anchor.START, 0, layout.height() - 21, words.units() + (isTight() ? "" : " done"));
  }

  private boolean isTight() {
    return words.units().length() > 6;
  }

  /** What another finish moves. */
  private void moving(Drawing drawing, int state) {
    NetworkFrame frame = layout.frame(state);
    TimeRuler ruler = layout.ruler(frame);
    LinkRoutes routes = new LinkRoutes(layout, frame, ruler);
    axis(drawing, frame, ruler);
    for (int b = 0; b < layout.shown().size(); b++) {
      floatOf(drawing, frame, ruler, routes, b);
    }
    rest(drawing, state, ruler);
    for (Link link : layout.links()) {
      String lag = link.relation() != Relation.FS || link.lag() != 0 ? " lag" : "";
      LinkRoutes.Route route = routes.route(link);
      drawing.path("lk" + (routes.isCritical(link) ? " lkc" : "") + lag, route.path());
      lagOf(drawing, link, route);
    }
    for (int b = 0; b < layout.shown().size(); b++) {
      box(drawing, frame, routes, state, b);
    }
  }

  /** How long the wait is, where its line has room for the words. */
  private void lagOf(Drawing drawing, Link link, LinkRoutes.Route route) {
    String label = lagLabel(link);
    double w = Face.MEDIUM.width(label, SIZE);
    if (!label.isEmpty() && route.to() - route.from() >= w + 8) {
      double middle = (route.from() + route.to()) / 2;
      drawing.text("a", Anchor.MIDDLE, middle, route.y() - 4, label);
    }
  }

  /** What is written at a link; empty for one without a lag. */
  String lagLabel(Link link) {
    if (link.lag() == 0) {
      return "";
    }
    String time = (link.lag() < 0 ? "−" : "") + words.time(Math.abs(link.lag()));
    return link.relation() == Relation.SS ? "start + " + time : time;
  }

  // The scale of time

  /** Round times from the start on, as many as have room on an even scale. */
  List<Long> ticks() {
    long longest = Math.max(1, answer.states().get(0).finish().duration());
    long unit = words.ticksPerUnit();
    double perUnit = (layout.width() - layout.left() - NetworkLayout.RIGHT) / longest * unit;
    long step = 1;
    for (long one : new long[] {1, 2, 5, 10, 20, 25, 50, 100, 200, 500, 1000, 5000}) {
      step = one;
      if (one * perUnit >= 50) {
        break;
      }
    }
    List<Long> ticks = new ArrayList<>();
    for (long at = 0; at <= longest; at += step * unit) {
      ticks.add(at);
    }
    return ticks;
  }

  /** What stands at a time above the picture. */
  String tickDate(long tick) {
    return words.calendar().map(dates -> Words.dayMonth(dates.startDate(tick))).orElse("");
  }

  private void axis(Drawing drawing, NetworkFrame frame, TimeRuler ruler) {
    double bottom = layout.height() - 34;
    double free = Double.NEGATIVE_INFINITY;
    double end = layout.left() + ruler.x(frame.finish());
    for (long tick : ticks()) {
      double x = layout.left() + ruler.x(tick);
      if (tick > frame.finish() || x < free) {
        continue;
      }
      free = x + 46;
      drawing.line("g", x, 34, x, bottom);
      if (end - x > 46 || tick == 0) {
        drawing.text("a q", Anchor.START, x + 4, 42, tickDate(tick));
      }
      if (end - x > 24 || tick == frame.finish()) {
        drawing.text("a", Anchor.MIDDLE, x, bottom + 13, words.figure(tick));
      }
    }
    Optional<Due> due = answer.of().terms().contractFinish().filter(by -> by.ticks() >= 0);
    double most = layout.width() - 2;
    due.map(by -> layout.left() + ruler.x(by.ticks()))
        .filter(x -> x <= most)
        .ifPresent(
            x -> {
              drawing.line("con", x, 31, x, bottom);
              drawing.text("", Anchor.END, x + 4, 26, contractLabel());
            });
    drawing.line("fin", end, 31, end, bottom);
    drawing.text("b plum", Anchor.END, end + 6, bottom + 30, finishLabel(frame.finish()));
  }

  String contractLabel() {
    return answer
        .of()
        .terms()
        .contractFinish()
        .map(by -> "contract finish " + words.shortDue(by))
        .orElse("");
  }

  String finishLabel(long finish) {
    return "finish " + words.finish(finish);
  }

  // Boxes

  private void floatOf(
      Drawing drawing, NetworkFrame frame, TimeRuler ruler, LinkRoutes routes, int b) {
    long spare = frame.late(b) - frame.early(b);
    if (spare <= 0) {
      return;
    }
    double from = routes.right(b);
    double to = layout.left() + ruler.x(frame.late(b) + frame.duration(b));
    to = Math.min(to, layout.left() + ruler.x(frame.finish())) - NetworkLayout.AFTER;
    for (int other = 0; other < layout.shown().size(); other++) {
      if (layout.lane(other) == layout.lane(b) && routes.left(other) > from - 1) {
        to = Math.min(to, routes.left(other) - 4);
      }
    }
    if (to - from > 3) {
      double y = layout.top(layout.lane(b)) + 6;
      drawing.path("k-fl", Hatch.falling(from, y, to - from, 48, 7));
    }
  }

  private void box(Drawing drawing, NetworkFrame frame, LinkRoutes routes, int state, int b) {
    double x = routes.left(b);
    double w = routes.right(b) - x;
    double y = layout.top(layout.lane(b));
    boolean critical = frame.isCritical(b);
    if (frame.duration(b) == 0) {
      milestone(drawing, frame, x, y, critical, b);
      return;
    }
    drawing.box(critical ? "bx bxc" : "bx", x, y, w, NetworkLayout.BOX);
    if (critical) {
      drawing.box("cr", x, y, w, 3);
      drawing.box("cr", x, y + NetworkLayout.BOX - 3, w, 3);
    }
    long d = frame.duration(b);
    drawing.text("a", Anchor.START, x + 4, y + 13.5, words.figure(frame.early(b)));
    drawing.text("a", Anchor.END, x + w - 4, y + 13.5, words.figure(frame.early(b) + d));
    drawing.text("a", Anchor.START, x + 4, y + 53.5, words.figure(frame.late(b)));
    drawing.text("a", Anchor.END, x + w - 4, y + 53.5, words.figure(frame.late(b) + d));
    drawing.text("a b", Anchor.MIDDLE, x + w / 2, y + 13.5, Words.shortId(layout.activity(b)));
    String spare = words.figure(frame.late(b) - frame.early(b));
    double room =
        w
            - 20
            - Face.MEDIUM.width(words.figure(frame.late(b)), SIZE)
            - Face.MEDIUM.width(words.figure(frame.late(b) + d), SIZE);
    boolean wide = Face.MEDIUM.width("float " + spare, SIZE) <= room;
    drawing.text("a", Anchor.MIDDLE, x + w / 2, y + 53.5, wide ? "float " + spare : spare);
    name(drawing, x + w / 2, y, w - 8, Words.name(layout.activity(b)));
    notches(drawing, x, x + w, y + NetworkLayout.BOX, state, b);
  }

  private static void name(Drawing drawing, double x, double y, double room, String name) {
    List<String> lines = Face.MEDIUM.wrap(name, SIZE, room, 2);
    double first = lines.size() == 1 ? 34 : 27.5;
    for (int i = 0; i < lines.size(); i++) {
      drawing.text("nm", Anchor.MIDDLE, x, y + first + i * 12.5, lines.get(i));
    }
  }

  private void milestone(
      Drawing drawing, NetworkFrame frame, double x, double y, boolean critical, int b) {
    double middle = y + NetworkLayout.BOX / 2;
    drawing.path(
        critical ? "ms msc" : "ms",
        "M" + Drawing.n(x + 4) + " " + Drawing.n(middle - 9) + "l7 9l-7 9l-7 -9z");
    drawing.text("a b", Anchor.MIDDLE, x + 4, y + 13.5, Words.shortId(layout.activity(b)));
    drawing.text("a", Anchor.MIDDLE, x + 4, y + 53.5, words.figure(frame.early(b)));
  }

  /** A notch for each unit that is bought, a hollow one for each that is given back. */
  private void notches(Drawing drawing, double left, double right, double y, int state, int b) {
    long unit = words.ticksPerUnit();
    long bought = bought(state, b);
    long back = givenBack(state, b);
    if (bought == 0 && back == 0) {
      return;
    }
    int full = (int) Math.min(MOST_NOTCHES, (bought + unit - 1) / unit);
    int hollow = (int) Math.min(MOST_NOTCHES - full, (back + unit - 1) / unit);
    double x = right - 1;
    for (int i = 0; i < full + hollow && x - 6 > left; i++) {
      drawing.box(i < full ? "notch" : "notcho", x - 3.6, y - 1, 3.6, 9);
      x -= 6;
    }
    String label =
        bought == 0 ? words.figure(back) + " given back" : words.figure(bought) + " bought";
    if (x - 3 - Face.MEDIUM.width(label, SIZE) >= left - 2) {
      drawing.text(bought == 0 ? "a teal" : "a och", Anchor.END, x - 3, y + 9.5, label);
    } else {
      String short1 = words.figure(bought == 0 ? back : bought);
      if (x - 3 - Face.MEDIUM.width(short1, SIZE) >= left - 2) {
        drawing.text(bought == 0 ? "a teal" : "a och", Anchor.END, x - 3, y + 9.5, short1);
      }
    }
  }

  private long bought(int state, int b) {
    return layout.activity(b).normal() - layout.frame(state).duration(b);
  }

  /** Ticks that are bought at some longer finish and no more at this one. */
  private long givenBack(int state, int b) {
    long most = 0;
    for (int s = 0; s < state; s++) {
      most = Math.max(most, bought(s, b));
    }
    return Math.max(0, most - bought(state, b));
  }

  // What has no box

  private void rest(Drawing drawing, int state, TimeRuler ruler) {
    double y = layout.bottom() + 6;
    Timing timing = answer.states().get(state).timing();
    for (Map.Entry<String, List<Integer>> group : layout.rest().entrySet()) {
      RestSpan span = RestSpan.of(timing, group.getValue());
      double left = layout.left() + ruler.x(span.from()) + NetworkLayout.BEFORE;
      double right = Math.max(left + 8, layout.left() + ruler.x(span.to()) - NetworkLayout.AFTER);
      drawing.path("k-fl", Hatch.falling(left, y, right - left, 24, 7));
      drawing.box("cell", left, y, right - left, 24);
      String label = restLabel(group.getKey(), group.getValue().size()) + floats(span);
      drawing.box("plate", left + 6, y + 4, Face.MEDIUM.width(label, 13) + 10, 16);
      drawing.text("", Anchor.START, left + 11, y + 16.5, label);
      y += 34;
    }
  }

  static String restLabel(String group, int count) {
    String name = group.isEmpty() ? "Others" : group;
    return name + ": " + Words.count(count, "activity", "activities") + " not drawn, float ";
  }

  String floats(RestSpan span) {
    return words.figure(span.least())
        + (span.least() == span.most() ? "" : " to " + words.figure(span.most()))
        + " "
        + words.units();
  }

  /** When activities that are not drawn can be done, and their least and most float; ticks. */
  record RestSpan(long from, long to, long least, long most) {

    static RestSpan of(Timing timing, List<Integer> some) {
      return new RestSpan(
          some.stream().mapToLong(timing::earlyStart).min().orElseThrow(),
          some.stream().mapToLong(timing::lateFinish).max().orElseThrow(),
          some.stream().mapToLong(timing::totalFloat).min().orElseThrow(),
          some.stream().mapToLong(timing::totalFloat).max().orElseThrow());
    }
  }

  /** How to read a box. */
  Part.Key key() {
    List<Part.Mark> marks = new ArrayList<>();
    Drawing critical = new Drawing(30, 20);
    critical.box("bx bxc", 2, 2, 26, 16);
    critical.box("cr", 2, 2, 26, 2.6);
    critical.box("cr", 2, 15.4, 26, 2.6);
    marks.add(new Part.Mark(critical.marks(), "Banded above and below: critical."));
    Drawing notch = new Drawing(30, 20);
    notch.box("notch", 8, 4, 4.6, 12);
    notch.box("notcho", 17, 4, 4.6, 12);
    marks.add(
        new Part.Mark(
            notch.marks(),
            "A notch under a box is one " + words.unit() + " bought, a hollow one is given back."));
    Drawing hatch = new Drawing(30, 20);
    hatch.path("k-fl", Hatch.falling(3, 2, 24, 16, 7));
    marks.add(new Part.Mark(hatch.marks(), "Hatched: float, how far the work can slip."));
    Drawing lag = new Drawing(30, 20);
    lag.path("lk lag", "M2 10H28");
    marks.add(
        new Part.Mark(
            lag.marks(), "Dotted: a waiting time, or a link from a start or to a finish."));
    return new Part.Key(marks);
  }
}
