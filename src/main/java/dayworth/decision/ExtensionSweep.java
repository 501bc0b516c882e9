package dayworth.decision;

import dayworth.contract.Due;
import dayworth.contract.Extension;
import dayworth.contract.FinishCost;
import dayworth.contract.Terms;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.Function;

/**
 * The best finish for every extension of time in whole working days, from none on.
 *
 * <p>An extension moves the contract finish and with it damages and bonus; what else a finish costs
 * stays. Each working day is looked at, so nothing between two of them is missed. It ends where
 * nothing can change any more: no finish is late, and all have the same bonus or none has a cap.
 */
final class ExtensionSweep {

  /** Ten years; no contract is extended by more. */
  private static final long MOST_DAYS = 2_600;

  private final Terms terms;
  private final Extension claimed;

  /** Whether all other money is straight between two rows; if not, rows alone are looked at. */
  private final boolean isStraight;

  /** The rows of the curve by their duration. */
  private final TreeMap<Long, Finish> rows = new TreeMap<>();

  private final Map<Long, BigDecimal> beside = new HashMap<>();

  private ExtensionSweep(CurveAnswer answer, Extension claimed) {
    this.terms = answer.of().terms();
    this.claimed = claimed;
    this.isStraight = answer.of().isConvex();
    answer.rows().forEach(row -> rows.put(row.duration(), row));
  }

  static List<WeighAnswer.ByExtension> of(CurveAnswer answer, Extension claimed) {
    return new ExtensionSweep(answer, claimed).sweep();
  }

  private List<WeighAnswer.ByExtension> sweep() {
    List<WeighAnswer.ByExtension> found = new ArrayList<>();
    Due due = terms.contractFinish().orElseThrow();
    long from = 0;
    Finish best = best(terms.dueBy(due));
    boolean settled = false;
    for (long days = 1; days <= MOST_DAYS && !settled; days++) {
      Terms moved = terms.dueBy(due.later(days, claimed.day(), terms.calendar()));
      Finish now = best(moved);
      if (now.duration() != best.duration()) {
        found.add(new WeighAnswer.ByExtension(from, Optional.of(days - 1), best));
        from = days;
        best = now;
      }
      settled = isSettled(moved);
    }
    found.add(new WeighAnswer.ByExtension(from, Optional.empty(), best));
    return found;
  }

  /** The longest of the finishes that cost least. */
  private Finish best(Terms moved) {
    TreeSet<Long> durations = new TreeSet<>(rows.keySet());
    if (isStraight) {
      durations.addAll(moved.bends().subSet(rows.firstKey(), rows.lastKey()));
    }
    long best = rows.lastKey();
    Optional<BigDecimal> least = Optional.empty();
    for (long duration : durations.descendingSet()) {
      FinishCost cost = moved.at(duration);
      BigDecimal total =
          beside(duration).add(cost.damages().cents()).subtract(cost.bonus().cents());
      if (least.isEmpty() || total.compareTo(least.get()) < 0) {
        best = duration;
        least = Optional.of(total);
      }
    }
    return under(moved, asItIs(best));
  }

  /** What a finish costs beside the money that hangs on the contract finish. */
  private BigDecimal beside(long duration) {
    return beside.computeIfAbsent(
        duration,
        ticks -> {
          FinishCost now = terms.at(ticks);
          return asItIs(ticks).total().subtract(now.damages().cents()).add(now.bonus().cents());
        });
  }

  /** The finish under the contract finish of the case; between two rows all money is straight. */
  private Finish asItIs(long duration) {
    Finish sooner = rows.floorEntry(duration).getValue();
    Finish later = rows.ceilingEntry(duration).getValue();
    long span = later.duration() - sooner.duration();
    if (span == 0) {
      return sooner;
    }
    FinishCost here = terms.at(duration);
    Money share = Money.of(duration - sooner.duration()).dividedBy(span);
    return new Finish(
        duration,
        between(sooner.direct(), later.direct(), share),
        between(sooner.running(), later.running(), share),
        new FinishCost(
            here.timeRelated(),
            here.fixed(),
            here.damages().plus(ofSections(sooner, later, share, FinishCost::damages)),
            here.bonus().plus(ofSections(sooner, later, share, FinishCost::bonus))),
        later.pricePerUnit(),
        false);
  }

  private Money ofSections(
      Finish sooner, Finish later, Money share, Function<FinishCost, Money> kind) {
    return between(
        kind.apply(sooner.other()).minus(kind.apply(terms.at(sooner.duration()))),
        kind.apply(later.other()).minus(kind.apply(terms.at(later.duration()))),
        share);
  }

  private static Money between(Money sooner, Money later, Money share) {
    return sooner.plus(later.minus(sooner).times(share));
  }

  private Finish under(Terms moved, Finish finish) {
    FinishCost now = terms.at(finish.duration());
    FinishCost then = moved.at(finish.duration());
    return new Finish(
        finish.duration(),
        finish.direct(),
        finish.running(),
        new FinishCost(
            finish.other().timeRelated(),
            finish.other().fixed(),
            finish.other().damages().minus(now.damages()).plus(then.damages()),
            finish.other().bonus().minus(now.bonus()).plus(then.bonus())),
        finish.pricePerUnit(),
        finish.breakpoint());
  }

  private boolean isSettled(Terms moved) {
    FinishCost longest = moved.at(rows.lastKey());
    FinishCost shortest = moved.at(rows.firstKey());
    boolean capped = moved.bonus().cap().isPresent() || moved.bonus().capCount().isPresent();
    boolean late = moved.contractFinish().orElseThrow().ticks() < rows.lastKey();
    return !late
        && longest.damages().isZero()
        && (!capped || longest.bonus().equals(shortest.bonus()));
  }
}
