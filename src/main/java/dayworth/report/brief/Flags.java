package dayworth.report.brief;

import dayworth.report.brief.svg.Drawing;
import dayworth.report.brief.svg.Drawing.Anchor;
import java.util.ArrayList;
import java.util.List;

/**
 * Labels above a picture, each with a thin line down to its mark, in as few rows as they need: no
 * label on another, and no line through a label. Those that have no room are left out, the last
 * ones first.
 */
final class Flags {

  private static final double GAP = 8;
  private static final int MOST_ROWS = 4;

  private record Flag(double x, Label label) {}

  /** Row 0 is the lowest, next to the picture. */
  private record Placed(Flag flag, Anchor anchor, int row) {

    double left() {
      double w = flag.label().width();
      return switch (anchor) {
        case START -> flag.x() - 1;
        case MIDDLE -> flag.x() - w / 2;
        case END -> flag.x() - w + 1;
      };
    }

    double right() {
      return left() + flag.label().width();
    }

    boolean meets(Placed other) {
      boolean beside = right() + GAP <= other.left() || other.right() + GAP <= left();
      return (row == other.row() && !beside) || cuts(other) || other.cuts(this);
    }

    /** Whether this one's line goes down through a lower label. */
    private boolean cuts(Placed lower) {
      return row > lower.row()
          && flag.x() > lower.left() - GAP / 2
          && flag.x() < lower.right() + GAP / 2;
    }
  }

  private final double width;
  private final List<Flag> flags = new ArrayList<>();
  private List<Placed> placed = List.of();
  private double rowHeight;

  Flags(double width) {
    this.width = width;
  }

  /** The most telling first. */
  void add(double x, Label label) {
    flags.add(new Flag(x, label));
    rowHeight = Math.max(rowHeight, label.height() + 6);
  }

  /** Finds a place for each and says how much height they need. */
  double place() {
    for (int kept = flags.size(); kept > 0 && placed.isEmpty(); kept--) {
      for (int rows = 1; rows <= MOST_ROWS && placed.isEmpty(); rows++) {
        placed = place(flags.subList(0, kept), new ArrayList<>(), rows);
      }
    }
    return rows() * rowHeight;
  }

  private int rows() {
    return placed.stream().mapToInt(Placed::row).max().orElse(-1) + 1;
  }

  /** Where each can stand beside those that have their place; empty if that is impossible. */
  private List<Placed> place(List<Flag> left, List<Placed> done, int rows) {
    if (left.isEmpty()) {
      return List.copyOf(done);
    }
    for (int row = 0; row < rows; row++) {
      for (Anchor anchor : List.of(Anchor.END, Anchor.START, Anchor.MIDDLE)) {
        Placed one = new Placed(left.get(0), anchor, row);
        boolean inside = one.left() >= 0 && one.right() <= width;
        if (inside && done.stream().noneMatch(one::meets)) {
          done.add(one);
          List<Placed> all = place(left.subList(1, left.size()), done, rows);
          if (!all.isEmpty()) {
            return all;
          }
          done.remove(done.size() - 1);
        }
      }
    }
    return List.of();
  }

  /**
   * Writes them.
   *
   * @param ends down to where each line goes, in the order in which they were added
   */
  void write(Drawing drawing, List<Double> ends) {
    int rows = rows();
    for (int i = 0; i < placed.size(); i++) {
      Placed one = placed.get(i);
      double top = (rows - 1 - one.row()) * rowHeight;
      double x =
          switch (one.anchor()) {
            case START -> one.flag().x() - 1;
            case MIDDLE -> one.flag().x();
            case END -> one.flag().x() + 1;
          };
      double from = top + one.flag().label().height() + 4;
      if (ends.get(i) > from) {
        drawing.line("ld", one.flag().x(), from, one.flag().x(), ends.get(i));
      }
      one.flag().label().write(drawing, one.anchor(), x, top + 12);
    }
  }
}
