package dayworth.report.brief.svg;

/** Patterns as lines cut to a box: some viewers blur patterns, and paper needs sharp ones. */
public final class Hatch {

  private Hatch() {}

  /** Lines that fall to the right, as far apart as {@code every} across. */
  public static String falling(double x, double y, double w, double h, double every) {
    StringBuilder path = new StringBuilder();
    double first = Math.ceil((x - y - h) / every) * every;
    for (double c = first; c <= x - y + w; c += every) {
      // The line is X - Y = c.
      double fromX = Math.max(x, c + y);
      double toX = Math.min(x + w, c + y + h);
      segment(path, fromX, fromX - c, toX, toX - c);
    }
    return path.toString();
  }

  /** Lines that rise to the right. */
  public static String rising(double x, double y, double w, double h, double every) {
    StringBuilder path = new StringBuilder();
    double first = Math.ceil((x + y) / every) * every;
    for (double c = first; c <= x + y + w + h; c += every) {
      // The line is X + Y = c.
      double fromX = Math.max(x, c - y - h);
      double toX = Math.min(x + w, c - y);
      segment(path, fromX, c - fromX, toX, c - toX);
    }
    return path.toString();
  }

  /** Level lines. */
  public static String level(double x, double y, double w, double h, double every) {
    StringBuilder path = new StringBuilder();
    for (double at = Math.ceil((y + 1) / every) * every; at < y + h; at += every) {
      path.append('M').append(n(x)).append(' ').append(n(at)).append('H').append(n(x + w));
    }
    return path.toString();
  }

  /** Level lines that a dotted stroke turns into dots. */
  public static String dots(double x, double y, double w, double h, double every) {
    StringBuilder path = new StringBuilder();
    int row = 0;
    for (double at = Math.ceil((y + 1) / 3) * 3; at < y + h - 0.5; at += 3) {
      double from = x + 1.5 + (row++ % 2) * every / 2;
      if (from < x + w) {
        path.append('M').append(n(from)).append(' ').append(n(at)).append('H').append(n(x + w));
      }
    }
    return path.toString();
  }

  private static void segment(StringBuilder path, double x1, double y1, double x2, double y2) {
    if (x2 - x1 > 0.4) {
      path.append('M').append(n(x1)).append(' ').append(n(y1));
      path.append('L').append(n(x2)).append(' ').append(n(y2));
    }
  }

  private static String n(double number) {
    return Drawing.n(number);
  }
}
