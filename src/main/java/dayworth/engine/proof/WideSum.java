package dayworth.engine.proof;

import java.math.BigInteger;

/**
 * An exact sum of products of longs: kept in a long while it fits, poured into a big integer
 * whenever it would not.
 */
final class WideSum {

  private long small;
  private BigInteger large = BigInteger.ZERO;

  void addProduct(long a, long b) {
    long product = a * b;
    if (Math.multiplyHigh(a, b) != product >> (Long.SIZE - 1)) {
      large = large.add(BigInteger.valueOf(a).multiply(BigInteger.valueOf(b)));
      return;
    }
    long sum = small + product;
    if (((small ^ sum) & (product ^ sum)) < 0) {
      large = large.add(BigInteger.valueOf(small));
      sum = product;
    }
    small = sum;
  }

  BigInteger total() {
    return large.add(BigInteger.valueOf(small));
  }
}
