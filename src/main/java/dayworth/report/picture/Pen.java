package dayworth.report.picture;

import java.awt.BasicStroke;
import java.awt.Color;
import java.util.List;

/**
 * How a line is drawn. Each kind of money has its own dash as well as its own colour, so that it is
 * known without colour.
 */
record Pen(Color color, BasicStroke stroke) {

  static final Pen GRID = solid(Look.RULE, 1);
  static final Pen AXIS = solid(Look.EDGE, 1);
  static final Pen LEADER = solid(Look.EDGE, 0.9);
  static final Pen TOTAL = solid(Look.PLUM, 3);
  static final Pen DIRECT = solid(Look.INK, 1.9);
  static final Pen LEAST_DIRECT = dashed(Look.INK, 1.1, 2, 3);
  static final Pen TIME = dashed(Look.SLATE, 1.9, 11, 4);
  static final Pen DAMAGES = dashed(Look.BRICK, 2, 4, 3);
  static final Pen BONUS = dotted(Look.OLIVE, 2.4, 4.6);
  static final Pen PRICE = new Pen(Look.INK, stroke(3, BasicStroke.CAP_SQUARE));
  static final Pen PRICE_PLATE = new Pen(Look.PAPER, stroke(6, BasicStroke.CAP_SQUARE));
  static final Pen CUT = dashed(Look.EDGE, 1, 2, 4);
  static final Pen BONUS_DOTS = solid(Look.OLIVE, 2);
  static final Pen STOP = solid(Look.PLUM, 1.6);
  static final Pen CONTRACT = dashed(Look.INK, 1.1, 6, 3);
  static final Pen CROSS = solid(Look.INK, 2.2);
  static final Pen WASTE = dashed(Look.INK, 1.4, 2, 2.4);
  static final Pen RING = solid(Look.PLUM, 2.2);
  static final Pen RELAXED = dashed(Look.TEAL, 2, 3.2, 2);
  static final Pen COLUMN = solid(Look.PLUM, 1.1);
  static final Pen CELL = solid(Look.RULE, 0.6);
  static final Pen WORTH = solid(Look.SLATE_INK, 1);
  static final Pen TIME_HATCH = solid(Look.SLATE, 0.9);
  static final Pen DAMAGES_HATCH = solid(Look.BRICK, 1.2);

  /** Working patterns, in the order of the case; told apart by their dashes too. */
  static final List<Pen> PATTERNS =
      List.of(
          solid(Look.INK, 1.9),
          dashed(Look.TEAL_INK, 2.1, 9, 4),
          dashed(Look.BRICK, 2.1, 3, 3),
          dashed(Look.SLATE, 2.1, 14, 3),
          dotted(Look.OLIVE_INK, 2.6, 4.6),
          dashed(Look.PLUM, 2.1, 6, 2));

  static final Pen FLOAT_HATCH = solid(Look.HATCH, 1.1);

  /** The edge of an empty ring. */
  static Pen ring(Color color) {
    return solid(color, 1.5);
  }

  private static Pen solid(Color color, double width) {
    return new Pen(color, stroke(width, BasicStroke.CAP_ROUND));
  }

  private static BasicStroke stroke(double width, int cap) {
    return new BasicStroke((float) width, cap, BasicStroke.JOIN_ROUND);
  }

  private static Pen dashed(Color color, double width, double on, double off) {
    return patterned(color, width, BasicStroke.CAP_BUTT, on, off);
  }

  private static Pen dotted(Color color, double width, double every) {
    return patterned(color, width, BasicStroke.CAP_ROUND, 0.1, every);
  }

  private static Pen patterned(Color color, double width, int cap, double on, double off) {
    float[] pattern = {(float) on, (float) off};
    return new Pen(
        color, new BasicStroke((float) width, cap, BasicStroke.JOIN_ROUND, 10, pattern, 0));
  }
}
