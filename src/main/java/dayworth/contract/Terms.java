package dayworth.contract;

import dayworth.value.Money;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;

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
        timeRelated.until(finish, counting),
        fixedCost,
        contractFinish.map(due -> damages.at(finish, due, counting)).orElse(Money.ZERO),
        contractFinish.map(due -> bonus.at(finish, due, counting)).orElse(Money.ZERO));
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
    return contractFinish.map(due -> one.at(finish, due, counting())).orElse(Money.ZERO);
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
    return contractFinish.stream()
        .flatMap(
            due ->
                Stream.concat(
                    Stream.of(due.ticks()),
                    Stream.concat(damages.bends(due, counting()), bonus.bends(due, counting()))))
        .collect(Collectors.toCollection(TreeSet::new));
  }

  private Counting counting() {
    return new Counting(scale, calendar);
  }
}
