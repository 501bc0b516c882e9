package dayworth.contract;

import dayworth.value.Money;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.util.Optional;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;

/**
 * What time is worth under the contract and on the site.
 *
 * @param scale the scale of every time here
 * @param calendar turns a finish into its date; needed where money goes by the date
 * @param timeRelated indirect cost until the finish
 * @param fixedCost indirect cost that does not depend on time
 * @param contractFinish by when the contract wants completion
 * @param damages charged after the contract finish
 * @param bonus paid before the contract finish
 * @param extension of time, claimed but not granted
 */
public record Terms(
    TimeScale scale,
    Optional<WorkingCalendar> calendar,
    TimeRelated timeRelated,
    Money fixedCost,
    Optional<Due> contractFinish,
    Damages damages,
    Bonus bonus,
    Optional<Extension> extension) {

  /**
   * Joins the terms.
   *
   * @throws IllegalArgumentException if money goes by the date and there are no dates
   */
  public Terms {
    boolean byDate =
        timeRelated.per().isByDate() || damages.per().isByDate() || bonus.per().isByDate();
    boolean dueHasDate = contractFinish.flatMap(Due::date).isPresent();
    if ((byDate && calendar.isEmpty())
        || (contractFinish.isPresent() && dueHasDate != calendar.isPresent())) {
      throw new IllegalArgumentException("money by the date needs dates");
    }
  }

  /** Terms without a claim for more time. */
  public Terms(
      TimeScale scale,
      Optional<WorkingCalendar> calendar,
      TimeRelated timeRelated,
      Money fixedCost,
      Optional<Due> contractFinish,
      Damages damages,
      Bonus bonus) {
    this(scale, calendar, timeRelated, fixedCost, contractFinish, damages, bonus, Optional.empty());
  }

  /** No terms at all: only direct cost counts. */
  public static Terms none(TimeScale scale) {
    return new Terms(
        scale,
        Optional.empty(),
        TimeRelated.NONE,
        Money.ZERO,
        Optional.empty(),
        Damages.NONE,
        Bonus.NONE);
  }

  /** The money that goes with finishing at {@code finish} ticks. */
  public FinishCost at(long finish) {
    Counting counting = counting();
    return new FinishCost(
        timeRelated.until(counting.until(finish, timeRelated.per())),
        fixedCost,
        contractFinish
            .map(due -> damages.forLateness(counting.lateness(due, finish, damages.per())))
            .orElse(Money.ZERO),
        contractFinish
            .map(due -> bonus.forEarliness(counting.lateness(due, finish, bonus.per()).negate()))
            .orElse(Money.ZERO));
  }

  /** The same terms with another contract finish, and no claim for more time. */
  public Terms dueBy(Due due) {
    return new Terms(scale, calendar, timeRelated, fixedCost, Optional.of(due), damages, bonus);
  }

  /**
   * For how many of what damages are per they are charged, were there no cap: what they cost at a
   * rate of 1.
   */
  public Money damagesCount(long finish) {
    Damages one =
        new Damages(
            Money.of(1), damages.per(), damages.grace(), Optional.empty(), damages.partWeek());
    return contractFinish
        .map(due -> one.forLateness(counting().lateness(due, finish, damages.per())))
        .orElse(Money.ZERO);
  }

  /** For how many of what it is per time-related cost runs: what it costs at a rate of 1. */
  public Money timeRelatedCount(long finish) {
    return counting().until(finish, timeRelated.per()).at(Money.of(1));
  }

  /**
   * The finishes where a money rule bends: contract finish, end of grace, cap reached, bonus limit.
   *
   * <p>Money that goes by the date changes between two working days; the bend is then the end of
   * the last working day before it, or for a cap of the first on which it is reached. A cap that is
   * reached between two ticks is moved to the nearest tick on the far side; the reader of a case
   * chooses a scale fine enough for what it can resolve.
   */
  public SortedSet<Long> bends() {
    SortedSet<Long> bends = new TreeSet<>();
    contractFinish.ifPresent(
        due -> {
          bends.add(due.ticks());
          addDamages(due, bends);
          addBonus(due, bends);
        });
    return bends;
  }

  private void addDamages(Due due, Set<Long> bends) {
    if (damages.rate().signum() == 0) {
      return;
    }
    Per per = damages.per();
    Count grace = Count.of(damages.grace());
    counting().lastAtMost(due, Count.NONE, per).ifPresent(bends::add);
    counting().lastAtMost(due, grace, per).ifPresent(bends::add);
    damages.cap().flatMap(cap -> capReached(due, grace, cap)).ifPresent(bends::add);
  }

  /** A whole week is charged from its first day, a part of one when it is over. */
  private Optional<Long> capReached(Due due, Count grace, Money cap) {
    Count charged = Count.reaching(cap, damages.rate());
    if (damages.countsWholeWeeks()) {
      Count before = charged.roundedUp().plus(Count.of(-1, 1));
      return counting().firstBeyond(due, grace.plus(before), damages.per());
    }
    return counting().firstAtLeast(due, grace.plus(charged), damages.per());
  }

  private void addBonus(Due due, Set<Long> bends) {
    if (bonus.rate().signum() == 0) {
      return;
    }
    Per per = bonus.per();
    counting().lastAtMost(due, Count.NONE, per).ifPresent(bends::add);
    bonus
        .capCount()
        .map(Count::of)
        .flatMap(most -> counting().lastAtMost(due, most.negate(), per))
        .ifPresent(bends::add);
    bonus
        .cap()
        .map(cap -> Count.reaching(cap, bonus.rate()))
        .flatMap(most -> counting().lastAtMost(due, most.negate(), per))
        .ifPresent(bends::add);
  }

  private Counting counting() {
    return new Counting(scale, calendar);
  }
}
