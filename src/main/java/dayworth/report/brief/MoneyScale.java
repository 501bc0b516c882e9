package dayworth.report.brief;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/** Money up and down a picture. */
record MoneyScale(double low, double high, double top, double bottom) {

  /** A scale that holds all amounts and zero. */
  static MoneyScale of(List<BigDecimal> amounts, double top, double bottom) {
    double low = amounts.stream().mapToDouble(BigDecimal::doubleValue).min().orElse(0);
    double high = amounts.stream().mapToDouble(BigDecimal::doubleValue).max().orElse(1);
    low = Math.min(0, low);
    high = Math.max(high, low + 1);
    return new MoneyScale(low, high, top, bottom);
  }

  double y(BigDecimal amount) {
    return y(amount.doubleValue());
  }

  double y(double amount) {
    return bottom - (amount - low) / (high - low) * (bottom - top);
  }

  /** Round amounts within the scale, zero left out. */
  List<BigDecimal> round(int most) {
    double step = step((high - low) / most);
    List<BigDecimal> round = new ArrayList<>();
    for (long k = (long) Math.ceil(low / step); k * step <= high; k++) {
      if (k != 0) {
        round.add(BigDecimal.valueOf(step).multiply(BigDecimal.valueOf(k)));
      }
    }
    return round;
  }

  private static double step(double least) {
    double power = Math.pow(10, Math.floor(Math.log10(Math.max(least, 1e-9))));
    for (double factor : new double[] {1, 2, 5}) {
      if (least <= factor * power) {
        return factor * power;
      }
    }
    return 10 * power;
  }
}
