package dayworth.report.brief;

import dayworth.network.Link;
import dayworth.network.Relation;
import dayworth.report.brief.svg.Drawing;

/**
 * Links as lines that run level and upright only: along the lane where it is free, else between the
 * lanes. The script of the page does the same for other finishes.
 */
final class LinkRoutes {

  private static final double MIDDLE = NetworkLayout.BOX / 2;

  private final NetworkLayout layout;
  private final NetworkFrame frame;
  private final TimeRuler ruler;

  LinkRoutes(NetworkLayout layout, NetworkFrame frame, TimeRuler ruler) {
    this.layout = layout;
    this.frame = frame;
    this.ruler = ruler;
  }

  double left(int box) {
    return layout.left() + ruler.x(frame.start(box)) + NetworkLayout.BEFORE;
  }

  double right(int box) {
    return Math.max(left(box) + 8, layout.left() + ruler.x(frame.end(box)) - NetworkLayout.AFTER);
  }

  double middle(int box) {
    return layout.top(layout.lane(box)) + MIDDLE;
  }

  /**
   * A link as a path with its arrow, and where its lag can be told: a level run of it.
   *
   * @param from where the run begins; equal to {@code to} where there is none
   */
  record Route(String path, double from, double to, double y) {

    private static Route bare(String path) {
      return new Route(path, 0, 0, 0);
    }
  }

  /** The way of a link. */
  Route route(Link link) {
    int a = layout.box(link.predecessor());
    int b = layout.box(link.successor());
    return switch (link.relation()) {
      case FS -> finishToStart(a, b);
      case SS -> startToStart(a, b);
      case FF -> Route.bare(finishToFinish(a, b));
      case SF -> Route.bare(startToFinish(a, b));
    };
  }

  private Route finishToStart(int a, int b) {
    double ax = right(a);
    double bx = left(b);
    double ya = middle(a);
    double yb = middle(b);
    String begin = "M" + n(ax) + " " + n(ya);
    String end = "H" + n(bx) + arrow(bx, yb, 1);
    if (layout.lane(a) == layout.lane(b) && isFree(layout.lane(a), ax, bx)) {
      return new Route(begin + end, ax, bx - 6, ya);
    }
    double before = bx - NetworkLayout.BEFORE;
    double after = ax + NetworkLayout.AFTER;
    if (layout.lane(a) != layout.lane(b) && isFree(layout.lane(a), ax, before)) {
      return new Route(begin + "H" + n(before) + "V" + n(yb) + end, ax, before, ya);
    }
    if (layout.lane(a) != layout.lane(b) && isFree(layout.lane(b), after, bx)) {
      return new Route(begin + "H" + n(after) + "V" + n(yb) + end, after, bx - 6, yb);
    }
    double between = yb + (layout.lane(a) < layout.lane(b) ? -1 : 1) * (MIDDLE + 16);
    return Route.bare(
        begin + "H" + n(after) + "V" + n(between) + "H" + n(before) + "V" + n(yb) + end);
  }

  private Route startToStart(int a, int b) {
    double bx = left(b);
    double yb = middle(b);
    double down = Math.min(left(a) + 9, bx - 5);
    String end = "V" + n(yb) + "H" + n(bx) + arrow(bx, yb, 1);
    if (down < left(a)) {
      return Route.bare("M" + n(left(a)) + " " + n(middle(a)) + "H" + n(down) + end);
    }
    double edge = middle(a) + (layout.lane(b) < layout.lane(a) ? -MIDDLE : MIDDLE);
    boolean free = isFree(layout.lane(b), down, bx);
    String path = "M" + n(down) + " " + n(edge) + end;
    return free ? new Route(path, down, bx - 6, yb) : Route.bare(path);
  }

  private String finishToFinish(int a, int b) {
    double bx = right(b);
    double yb = middle(b);
    double out = Math.max(right(a), bx) + 6;
    return "M"
        + n(right(a))
        + " "
        + n(middle(a))
        + "H"
        + n(out)
        + "V"
        + n(yb)
        + "H"
        + n(bx)
        + arrow(bx, yb, -1);
  }

  private String startToFinish(int a, int b) {
    double bx = right(b);
    double yb = middle(b);
    double between = yb + (layout.lane(a) < layout.lane(b) ? -1 : 1) * (MIDDLE + 16);
    return "M"
        + n(left(a))
        + " "
        + n(middle(a))
        + "H"
        + n(left(a) - 4)
        + "V"
        + n(between)
        + "H"
        + n(bx + 6)
        + "V"
        + n(yb)
        + "H"
        + n(bx)
        + arrow(bx, yb, -1);
  }

  /** Whether no box of a lane stands between two places. */
  private boolean isFree(int lane, double from, double to) {
    for (int b = 0; b < layout.shown().size(); b++) {
      if (layout.lane(b) == lane && left(b) < to - 0.5 && right(b) > from + 0.5) {
        return false;
      }
    }
    return true;
  }

  private static String arrow(double x, double y, int way) {
    return "M"
        + n(x - way * 6)
        + " "
        + n(y - 3.4)
        + "L"
        + n(x)
        + " "
        + n(y)
        + "L"
        + n(x - way * 6)
        + " "
        + n(y + 3.4);
  }

  /** Whether a link has no slack between critical work. */
  boolean isCritical(Link link) {
    int a = layout.box(link.predecessor());
    int b = layout.box(link.successor());
    if (!frame.isCritical(a) || !frame.isCritical(b)) {
      return false;
    }
    long from =
        link.relation() == Relation.FS || link.relation() == Relation.FF
            ? frame.early(a) + frame.duration(a)
            : frame.early(a);
    long to =
        link.relation() == Relation.FF || link.relation() == Relation.SF
            ? frame.early(b) + frame.duration(b)
            : frame.early(b);
    return to - from == link.lag();
  }

  private static String n(double number) {
    return Drawing.n(number);
  }
}
