package dayworth.engine.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.Random;
import org.junit.jupiter.api.Test;

class WideSumTest {

  /** Expected: the JDK's big integers. */
  @Test
  void addsLikeBigIntegersWhateverTheSizes() {
    for (int bits = 1; bits <= Long.SIZE; bits++) {
      Random random = new Random(bits);
      WideSum sum = new WideSum();
      BigInteger expected = BigInteger.ZERO;
      for (int i = 0; i < 200; i++) {
        long a = random.nextLong() >> (Long.SIZE - bits);
        long b = random.nextLong() >> random.nextInt(Long.SIZE);
        sum.addProduct(a, b);
        expected = expected.add(BigInteger.valueOf(a).multiply(BigInteger.valueOf(b)));
      }
      assertEquals(expected, sum.total(), bits + " bits");
    }
  }

  @Test
  void theExtremesDoNotWrap() {
    WideSum sum = new WideSum();
    sum.addProduct(Long.MIN_VALUE, -1);
    sum.addProduct(Long.MIN_VALUE, 1);
    sum.addProduct(Long.MIN_VALUE, 1);
    assertEquals(BigInteger.valueOf(Long.MIN_VALUE), sum.total());
  }
}
