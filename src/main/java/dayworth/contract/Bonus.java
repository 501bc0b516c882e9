package dayworth.contract;

import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * Early-completion bonus: money for finishing before the contract finish.
 *
 * @param rate money for one of {@code per}; a part of a week brings its share
 * @param cap the most that is paid
 * @param capCount the most earliness that is paid for, counted in {@code per}
 */
public record Bonus(Money rate, Per per, Optional<Money> cap, Optional<BigDecimal> capCount) {

  /** No bonus. */
  public static final Bonus NONE =
      new Bonus(Money.ZERO, Per.UNIT, Optional.empty(), Optional.empty());

  /** What is paid for a finish. */
  Money at(long finish, Due due, Counting counting) {
    return forEarliness(counting.lateness(due, finish, per).negate());
  }

  /** What is paid for being so early, counted in {@code per}. */
  Money forEarliness(Count early) {
    if (!early.isAboveZero()) {
      return Money.ZERO;
    }
    Money paid = capCount.map(most -> early.atMost(Count.of(most))).orElse(early).at(rate);
    return cap.map(paid::min).orElse(paid);
  }

  /** The finishes where the pay bends: up to when there is any, and where it is capped. */
  Stream<Long> bends(Due due, Counting counting) {
    if (rate.signum() == 0) {
      return Stream.empty();
    }
    Stream<Count> most =
        Stream.concat(
            capCount.map(Count::of).stream(),
            cap.map(money -> Count.reaching(money, rate)).stream());
    return Stream.concat(Stream.of(Count.NONE), most)
        .flatMap(early -> counting.lastAtMost(due, early.negate(), per).stream());
  }
}
