package dayworth.report.brief;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What is taken on a drawing, so that no label stands on another or on a line. */
final class Places {

  private final List<Room> taken = new ArrayList<>();

  /** A rectangle on a drawing. */
  record Room(double x, double y, double w, double h) {

    boolean meets(Room other) {
      return x < other.x + other.w && other.x < x + w && y < other.y + other.h && other.y < y + h;
    }

    boolean isWithin(Room frame) {
      return x >= frame.x
          && y >= frame.y
          && x + w <= frame.x + frame.w
          && y + h <= frame.y + frame.h;
    }
  }

  void take(Room room) {
    taken.add(room);
  }

  /** Takes what a thin line between two points covers. */
  void takeLine(double x1, double y1, double x2, double y2) {
    int pieces = Math.max(1, (int) Math.ceil(Math.hypot(x2 - x1, y2 - y1) / 6));
    for (int i = 0; i < pieces; i++) {
      double fromX = x1 + (x2 - x1) * i / pieces;
      double toX = x1 + (x2 - x1) * (i + 1) / pieces;
      double fromY = y1 + (y2 - y1) * i / pieces;
      double toY = y1 + (y2 - y1) * (i + 1) / pieces;
      take(
          new Room(
              Math.min(fromX, toX) - 1,
              Math.min(fromY, toY) - 1,
              Math.abs(toX - fromX) + 2,
              Math.abs(toY - fromY) + 2));
    }
  }

  boolean isFree(Room room) {
    return taken.stream().noneMatch(room::meets);
  }

  /** The first free one, which then is taken. */
  Optional<Room> place(List<Room> candidates) {
    Optional<Room> found = candidates.stream().filter(this::isFree).findFirst();
    found.ifPresent(this::take);
    return found;
  }
}
