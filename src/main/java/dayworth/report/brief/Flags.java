package dayworth.report.brief;

import dayworth.report.brief.Places.Room;
import dayworth.report.brief.svg.Drawing;
import dayworth.report.brief.svg.Drawing.Anchor;
import java.util.ArrayList;
import java.util.List;

/** Labels above a picture, each with a thin line down to its mark; as many rows as they need. */
final class Flags {

  private static final double GAP = 8;
  private static final int MOST_ROWS = 8;

  private record Flag(double x, Label label) {}

  private record Placed(Flag flag, Anchor anchor, int row) {}

  private final double width;
  private final List<Flag> flags = new ArrayList<>();
  private final List<Placed> placed = new ArrayList<>();
  private double rowHeight;

  Flags(double width) {
    this.width = width;
  }

  /** Those added first have the choice. */
  void add(double x, Label label) {
    flags.add(new Flag(x, label));
    rowHeight = Math.max(rowHeight, label.height() + 6);
  }

  /** Finds a place for each and says how much height they need. */
  double place() {
    Places places = new Places();
    for (Flag flag : flags) {
      placed.add(place(flag, places));
    }
    int rows = placed.stream().mapToInt(Placed::row).max().orElse(-1) + 1;
    return rows * rowHeight;
  }

  private Placed place(Flag flag, Places places) {
    for (int row = 0; row < MOST_ROWS; row++) {
      for (Anchor anchor : List.of(Anchor.END, Anchor.START, Anchor.MIDDLE)) {
        Room room = room(flag, anchor, row);
        boolean inside = room.x() >= 0 && room.x() + room.w() <= width + GAP;
        if (inside && places.isFree(room)) {
          places.take(room);
          // What is added later may not stand where this one's line comes down.
          places.take(new Room(flag.x() - 2, row, 4, MOST_ROWS));
          return new Placed(flag, anchor, row);
        }
      }
    }
    return new Placed(flag, flag.x() > width / 2 ? Anchor.END : Anchor.START, MOST_ROWS - 1);
  }

  /** Rows are one high here. */
  private static Room room(Flag flag, Anchor anchor, int row) {
    double w = flag.label().width() + GAP;
    double x =
        switch (anchor) {
          case START -> flag.x() - 1;
          case MIDDLE -> flag.x() - w / 2;
          case END -> flag.x() - w + 1;
        };
    return new Room(x, row + 0.1, w, 0.8);
  }

  /**
   * Writes them.
   *
   * @param ends down to where each line goes, in the order in which they were added
   */
  void write(Drawing drawing, List<Double> ends) {
    for (int i = 0; i < placed.size(); i++) {
      Placed one = placed.get(i);
      double top = one.row() * rowHeight;
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
