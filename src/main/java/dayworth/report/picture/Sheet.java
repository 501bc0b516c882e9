package dayworth.report.picture;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/** The paper a picture is painted on, whatever kind of file it becomes. */
final class Sheet {

  /** Which point of a line of text its place names. */
  enum Anchor {
    START(0),
    MIDDLE(0.5),
    END(1);

    private final double share;

    Anchor(double share) {
      this.share = share;
    }

    /** How much of a text's width lies to the left of its place. */
    double share() {
      return share;
    }
  }

  /** A line of text that was written. */
  record Written(String text, Anchor anchor, double x, double y, Type type) {

    Box box() {
      double width = type.width(text);
      return new Box(x - width * anchor.share, y - type.size(), width, type.size() * 1.2);
    }
  }

  private final Graphics2D graphics;
  private final List<Written> written = new ArrayList<>();

  Sheet(Graphics2D graphics) {
    this.graphics = graphics;
  }

  /** For a library that paints by itself. */
  Graphics2D graphics() {
    return graphics;
  }

  /** All text so far, in the order of writing. */
  List<Written> written() {
    return List.copyOf(written);
  }

  void fill(Color color, Box box) {
    graphics.setColor(color);
    graphics.fill(new Rectangle2D.Double(box.x(), box.y(), box.width(), box.height()));
  }

  void frame(Pen pen, Box box) {
    use(pen);
    graphics.draw(new Rectangle2D.Double(box.x(), box.y(), box.width(), box.height()));
  }

  /** Many boxes as one shape: a file of a picture with thousands of cells stays small. */
  void fill(Color color, List<Box> boxes) {
    if (!boxes.isEmpty()) {
      graphics.setColor(color);
      graphics.fill(shape(boxes));
    }
  }

  /** The frames of many boxes as one shape. */
  void frames(Pen pen, List<Box> boxes) {
    if (!boxes.isEmpty()) {
      use(pen);
      graphics.draw(shape(boxes));
    }
  }

  private static Path2D.Double shape(List<Box> boxes) {
    Path2D.Double path = new Path2D.Double();
    for (Box box : boxes) {
      path.moveTo(box.x(), box.y());
      path.lineTo(box.right(), box.y());
      path.lineTo(box.right(), box.bottom());
      path.lineTo(box.x(), box.bottom());
      path.closePath();
    }
    return path;
  }

  void line(Pen pen, double x1, double y1, double x2, double y2) {
    use(pen);
    graphics.draw(new Line2D.Double(x1, y1, x2, y2));
  }

  /** Many lines as one shape: x1, y1, x2, y2 of each. */
  void lines(Pen pen, List<double[]> lines) {
    if (lines.isEmpty()) {
      return;
    }
    Path2D.Double path = new Path2D.Double();
    for (double[] line : lines) {
      path.moveTo(line[0], line[1]);
      path.lineTo(line[2], line[3]);
    }
    use(pen);
    graphics.draw(path);
  }

  void disc(Color color, double x, double y, double radius) {
    graphics.setColor(color);
    graphics.fill(new Ellipse2D.Double(x - radius, y - radius, 2 * radius, 2 * radius));
  }

  void ring(Pen pen, double x, double y, double radius) {
    disc(Look.PAPER, x, y, radius);
    use(pen);
    graphics.draw(new Ellipse2D.Double(x - radius, y - radius, 2 * radius, 2 * radius));
  }

  /**
   * Writes a line of text.
   *
   * @param y its baseline
   */
  void text(Type type, Color color, Anchor anchor, double x, double y, String text) {
    if (text.isBlank()) {
      return;
    }
    graphics.setColor(color);
    graphics.setFont(type.font());
    graphics.drawString(text, (float) (x - type.width(text) * anchor.share), (float) y);
    written.add(new Written(text, anchor, x, y, type));
  }

  private void use(Pen pen) {
    BasicStroke stroke = pen.stroke();
    graphics.setColor(pen.color());
    graphics.setStroke(stroke);
  }
}
