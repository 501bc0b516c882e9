package dayworth.report.picture;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/** Round figures for axes: 1, 2 or 5 times a power of ten. */
final class NiceSteps {

  private NiceSteps() {}

  /** The least round step that goes at most {@code most} times into {@code range}. */
  static double size(double range, double most) {
    if (range <= 0) {
      return 1;
    }
    double power = Math.pow(10, Math.floor(Math.log10(range / most)));
    for (double factor : new double[] {1, 2, 5}) {
      if (range / (factor * power) <= most) {
        return factor * power;
      }
    }
    return 10 * power;
  }

  /** The round figures from {@code low} to {@code high}, both included where they are round. */
  static List<BigDecimal> between(double low, double high, double most) {
    BigDecimal step = BigDecimal.valueOf(size(high - low, most));
    List<BigDecimal> figures = new ArrayList<>();
    long first = (long) Math.ceil(low / step.doubleValue() - 1e-9);
    long last = (long) Math.floor(high / step.doubleValue() + 1e-9);
    for (long i = first; i <= last; i++) {
      figures.add(step.multiply(BigDecimal.valueOf(i)));
    }
    return figures;
  }
}
