package dayworth.network;

import dayworth.value.Money;

/**
 * A cost that is paid once if any measure in the package is used.
 *
 * @param name for people
 * @param cost at least 0
 */
public record MeasurePackage(String name, Money cost) {

  public MeasurePackage {
    if (cost.signum() < 0) {
      throw new IllegalArgumentException("package " + name + ": a cost of at least 0");
    }
  }
}
