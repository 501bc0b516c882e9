package dayworth.engine.stepping;

import dayworth.value.Money;
import dayworth.value.SlopeScale;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/** The breakpoints of a curve and the price of a tick below each of them. */
public final class Prices implements Squeeze.Listener {

  private final SlopeScale scale;
  private final List<Long> breakpoints = new ArrayList<>();
  private final List<Long> scaledPrices = new ArrayList<>();

  Prices(SlopeScale scale) {
    this.scale = scale;
  }

  @Override
  public void arrived(long length) {
    breakpoints.add(length);
  }

  @Override
  public void priced(long length, long price) {
    scaledPrices.add(price);
  }

  /** How many breakpoints there are, the first and the last included. */
  public int size() {
    return breakpoints.size();
  }

  /** The k-th breakpoint, ticks, longest first. */
  public long breakpoint(int k) {
    return breakpoints.get(k);
  }

  /** What a tick costs on the piece just shorter than the k-th breakpoint; not of the last. */
  public Money price(int k) {
    return scale.money(BigInteger.valueOf(scaledPrices.get(k)));
  }
}
