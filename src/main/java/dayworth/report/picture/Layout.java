package dayworth.report.picture;

/**
 * Where the finishes stand from left to right: the same in all pictures of an answer, so that they
 * can be read one under the other.
 *
 * @param plotWidth pixels between the two gutters
 * @param inset pixels from the plot's sides to the longest and the shortest finish
 */
record Layout(double plotWidth, double inset) {

  static final double MARGIN = 20;

  /** For the names of activities and of lines. */
  private static final double LEFT_GUTTER = 236;

  private static final double RIGHT_GUTTER = 176;

  private static final double WIDEST = 544;
  private static final double NARROWEST = 336;
  private static final double WIDEST_COLUMN = 48;
  private static final double LEAST_INSET = 6;

  /**
   * For so many units of time from the longest to the shortest finish.
   *
   * @param units at least 0
   */
  static Layout of(double units) {
    double column = Math.min(WIDEST_COLUMN, WIDEST / (units + 1));
    double width = Math.max(NARROWEST, column * (units + 1));
    return new Layout(width, Math.max(LEAST_INSET, Math.min(width / 2, column / 2)));
  }

  int width() {
    return (int) Math.ceil(LEFT_GUTTER + plotWidth + RIGHT_GUTTER);
  }

  /** What titles and notes may fill. */
  double textWidth() {
    return width() - 2 * MARGIN;
  }

  Box plot(double top, double height) {
    return new Box(LEFT_GUTTER, top, plotWidth, height);
  }
}
