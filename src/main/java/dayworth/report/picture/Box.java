package dayworth.report.picture;

import java.awt.geom.Rectangle2D;

/** A rectangle of a picture, in pixels from its upper left corner. */
record Box(double x, double y, double width, double height) {

  double right() {
    return x + width;
  }

  double bottom() {
    return y + height;
  }

  double middle() {
    return y + height / 2;
  }

  boolean overlaps(Box other) {
    return x < other.right() && other.x < right() && y < other.bottom() && other.y < bottom();
  }

  boolean holds(Box other) {
    return x <= other.x
        && y <= other.y
        && other.right() <= right() + 1e-6
        && other.bottom() <= bottom() + 1e-6;
  }

  boolean isCrossedBy(double x1, double y1, double x2, double y2) {
    return new Rectangle2D.Double(x, y, width, height).intersectsLine(x1, y1, x2, y2);
  }

  Box movedTo(double newX, double newY) {
    return new Box(newX, newY, width, height);
  }
}
