package dayworth.engine.proof;

import dayworth.engine.proof.Verdict.Refuted;
import dayworth.value.Money;
import dayworth.value.SlopeScale;
import java.math.BigInteger;
import java.util.Optional;

/**
 * What a flow proves: for every finish T at once, that no plan that meets T costs less than {@code
 * base + Σ length × flow − v × T}. Counted once, then held against as many plans as wanted.
 */
public final class FlowBound {

  private final SlopeScale scale;
  private final Money base;
  private final BigInteger lengths;
  private final BigInteger through;
  private final Optional<Refuted> fault;

  FlowBound(FlowLimits limits, BigInteger lengths, BigInteger through, Optional<Refuted> fault) {
    this.scale = limits.scale();
    this.base = limits.base();
    this.lengths = lengths;
    this.through = through;
    this.fault = fault;
  }

  /** Why the flow proves nothing; empty if it keeps its limits and is conserved everywhere. */
  public Optional<Refuted> fault() {
    return fault;
  }

  /** The price of a tick that the flow carries from the project start to its finish. */
  public Money pricePerTick() {
    return scale.money(through);
  }

  /**
   * What every plan that finishes within {@code finish} ticks costs at least.
   *
   * @throws IllegalStateException if the flow has a fault
   */
  public Money at(long finish) {
    if (fault.isPresent()) {
      throw new IllegalStateException("a faulty flow proves nothing: " + fault.get());
    }
    BigInteger paid = through.multiply(BigInteger.valueOf(finish));
    return base.plus(scale.money(lengths.subtract(paid)));
  }

  boolean isExact() {
    return scale.exact();
  }
}
