package dayworth.contract;

import dayworth.network.Moment;
import dayworth.network.Span;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * A section's money where it is convex in the section's finish: per unit, without a cap on damages,
 * with a bonus no larger than the damages and then without grace. Early it costs a fixed amount
 * less; from there each tick later costs the bonus until the due time, and the damages after it.
 *
 * @param fixed minus the most bonus that can be earned
 * @param spans from the project's start to the section's finish
 */
record LinearSection(Money fixed, List<Span> spans) {

  /** Empty where the section's money is not convex or bends between two ticks. */
  static Optional<LinearSection> of(Section section, Counting counting) {
    Damages damages = section.damages();
    if (damages.per() != Per.UNIT || damages.cap().isPresent()) {
      return Optional.empty();
    }
    Optional<Long> grace = counting.wholeTicks(Count.of(damages.grace()));
    if (grace.isEmpty()) {
      return Optional.empty();
    }
    long chargedFrom = Math.addExact(section.due().ticks(), grace.get());
    if (section.bonus().rate().signum() == 0 || section.due().ticks() <= 0) {
      List<Span> late = new ArrayList<>();
      add(late, section, chargedFrom, counting.perTick(damages.rate()));
      return Optional.of(new LinearSection(Money.ZERO, late));
    }
    return grace.get() == 0 ? withBonus(section, counting) : Optional.empty();
  }

  private static Optional<LinearSection> withBonus(Section section, Counting counting) {
    Bonus bonus = section.bonus();
    Optional<Long> most = mostEarliness(section, counting);
    Money earned = counting.perTick(bonus.rate());
    Money charged = counting.perTick(section.damages().rate());
    if (bonus.per() != Per.UNIT || most.isEmpty() || earned.compareTo(charged) > 0) {
      return Optional.empty();
    }
    List<Span> spans = new ArrayList<>();
    long due = section.due().ticks();
    add(spans, section, due - most.get(), earned);
    add(spans, section, due, charged.minus(earned));
    return Optional.of(new LinearSection(earned.times(most.get()).negate(), spans));
  }

  /** The earliness in ticks beyond which no more is earned; empty if that is no whole number. */
  private static Optional<Long> mostEarliness(Section section, Counting counting) {
    Bonus bonus = section.bonus();
    Stream<BigDecimal> counts = bonus.capCount().stream();
    List<Optional<Long>> caps =
        Stream.concat(
                counts.map(Count::of),
                bonus.cap().stream().map(cap -> Count.reaching(cap, bonus.rate())))
            .map(counting::wholeTicks)
            .toList();
    if (caps.stream().anyMatch(Optional::isEmpty)) {
      return Optional.empty();
    }
    long due = section.due().ticks();
    return Optional.of(caps.stream().mapToLong(Optional::orElseThrow).reduce(due, Math::min));
  }

  private static void add(List<Span> spans, Section section, long free, Money rate) {
    if (rate.signum() > 0) {
      Moment finish = Moment.finishOf(section.activity());
      spans.add(new Span(section.name(), Moment.PROJECT_START, finish, free, rate));
    }
  }
}
