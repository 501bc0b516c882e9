package dayworth.report.picture;

import java.util.ArrayList;
import java.util.List;

/**
 * Labels above a plot, each on a line down to the point that it names.
 *
 * <p>There are few of them, so every way to hang them is tried: each to the left, the right or on
 * both sides of its line, in the lower or a higher row. The way with the fewest rows is taken, and
 * of those the one nearest to the wishes.
 */
final class Flags {

  private static final double AIR = 6;
  private static final double BELOW = 8;
  private static final List<Sheet.Anchor> SIDES =
      List.of(Sheet.Anchor.END, Sheet.Anchor.START, Sheet.Anchor.MIDDLE);

  private record Flag(Pen pen, Label label, double x) {}

  /** The box's place is from the foot of all flags, which is 0, upwards. */
  private record Hung(Sheet.Anchor side, int row, Box box) {}

  private final double width;
  private final List<Flag> flags = new ArrayList<>();
  private List<Hung> best = List.of();
  private int bestCost = Integer.MAX_VALUE;

  /** Flags between the sides of a sheet so wide. */
  Flags(double width) {
    this.width = width;
  }

  void add(Pen pen, Label label, double x) {
    flags.add(new Flag(pen, label, x));
    best = List.of();
    bestCost = Integer.MAX_VALUE;
    hang(new ArrayList<>(), 0);
  }

  double height() {
    return best.stream().mapToDouble(hung -> -hung.box().y()).max().orElse(0);
  }

  /**
   * Paints all.
   *
   * @param foot where the flags end
   * @param ends where the line of each ends, in the order of adding
   */
  void paint(Sheet sheet, double foot, List<Double> ends) {
    for (int i = 0; i < flags.size(); i++) {
      Flag flag = flags.get(i);
      Hung hung = best.get(i);
      Box box = hung.box().movedTo(hung.box().x(), foot + hung.box().y());
      double top = hung.side() == Sheet.Anchor.MIDDLE ? box.bottom() : box.y();
      sheet.line(flag.pen(), flag.x(), top, flag.x(), ends.get(i));
      flag.label().write(sheet, hung.side(), box);
    }
  }

  private void hang(List<Hung> hung, int cost) {
    if (cost >= bestCost) {
      return;
    }
    if (hung.size() == flags.size()) {
      best = List.copyOf(hung);
      bestCost = cost;
      return;
    }
    Flag flag = flags.get(hung.size());
    for (int row = 0; row < flags.size(); row++) {
      for (int side = 0; side < SIDES.size(); side++) {
        Hung here = hung(flag, SIDES.get(side), row);
        if (fits(here, flag, hung)) {
          hung.add(here);
          hang(hung, cost + 10 * row + side);
          hung.remove(hung.size() - 1);
        }
      }
    }
  }

  private Hung hung(Flag flag, Sheet.Anchor side, int row) {
    double rowHeight = flags.stream().mapToDouble(f -> f.label().height()).max().orElse(0) + AIR;
    double top = -BELOW - row * rowHeight - flag.label().height();
    double aside = (1 - 2 * side.share()) * AIR;
    return new Hung(side, row, flag.label().at(side, flag.x() + aside, top));
  }

  private boolean fits(Hung here, Flag flag, List<Hung> before) {
    if (here.box().x() < AIR || here.box().right() > width - AIR) {
      return false;
    }
    for (int i = 0; i < before.size(); i++) {
      Hung other = before.get(i);
      Box aired = new Box(other.box().x() - AIR, other.box().y(), other.box().width() + 2 * AIR, 1);
      boolean beside = here.box().right() <= aired.x() || aired.right() <= here.box().x();
      boolean clash =
          here.row() == other.row()
              ? !beside
              : here.row() > other.row()
                  ? isOver(flag.x(), other.box())
                  : isOver(flags.get(i).x(), here.box());
      if (clash) {
        return false;
      }
    }
    return true;
  }

  private static boolean isOver(double x, Box box) {
    return x > box.x() - 2 && x < box.right() + 2;
  }
}
