package dayworth.contract;

import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.math.RoundingMode;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/**
 * What time is worth under the contract and on the site.
 *
 * @param scale the scale of every time here
 * @param timeRelatedRate indirect cost per time unit until the finish
 * @param fixedCost indirect cost that does not depend on time
 * @param contractFinish ticks after the start by which the contract wants completion
 * @param damages charged after the contract finish
 * @param bonus paid before the contract finish
 */
public record Terms(
    TimeScale scale,
    Money timeRelatedRate,
    Money fixedCost,
    Optional<Long> contractFinish,
    Damages damages,
    Bonus bonus) {

  /** No terms at all: only direct cost counts. */
  public static Terms none(TimeScale scale) {
    return new Terms(scale, Money.ZERO, Money.ZERO, Optional.empty(), Damages.NONE, Bonus.NONE);
  }

  /** The money that goes with finishing at {@code finish} ticks. */
  public FinishCost at(long finish) {
    long perUnit = scale.ticksPerUnit();
    return new FinishCost(
        timeRelatedRate.times(finish).dividedBy(perUnit),
        fixedCost,
        contractFinish.map(due -> damages.forLateness(finish - due, perUnit)).orElse(Money.ZERO),
        contractFinish.map(due -> bonus.forEarliness(due - finish, perUnit)).orElse(Money.ZERO));
  }

  /**
   * The finishes where a money rule bends: contract finish, end of grace, cap reached, bonus limit.
   *
   * <p>A bend between two ticks is moved to the nearest tick on the far side, where the cap is just
   * reached; the reader of a case chooses a scale fine enough for what it can resolve.
   */
  public SortedSet<Long> bends() {
    SortedSet<Long> bends = new TreeSet<>();
    contractFinish.ifPresent(
        due -> {
          bends.add(due);
          if (damages.rate().signum() > 0) {
            bends.add(due + damages.grace());
            damages
                .cap()
                .ifPresent(cap -> bends.add(due + damages.grace() + ticksFor(cap, damages.rate())));
          }
          if (bonus.rate().signum() > 0) {
            bonus.capTicks().ifPresent(most -> bends.add(due - most));
            bonus.cap().ifPresent(cap -> bends.add(due - ticksFor(cap, bonus.rate())));
          }
        });
    return bends;
  }

  /** How many ticks at {@code rate} per unit reach {@code cap}, rounded up to a whole tick. */
  private long ticksFor(Money cap, Money rate) {
    Money ticks =
        Money.fraction(
            cap.numerator().multiply(rate.denominator()),
            cap.denominator().multiply(rate.numerator()));
    return ticks.times(scale.ticksPerUnit()).rounded(0, RoundingMode.CEILING).longValueExact();
  }
}
