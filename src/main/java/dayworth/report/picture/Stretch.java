package dayworth.report.picture;

import dayworth.contract.FinishCost;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/**
 * The finishes between two neighbouring rows of the curve, where neither the price of a unit nor
 * what it is worth changes.
 *
 * @param from the longer finish, ticks
 * @param to the shorter finish, ticks
 * @param price of a unit of time, what running costs and sections save or cost included
 * @param time cost that a unit earlier saves because less time passes
 * @param damages that a unit earlier saves
 * @param bonus that a unit earlier earns
 */
record Stretch(
    long from, long to, BigDecimal price, BigDecimal time, BigDecimal damages, BigDecimal bonus) {

  /** From the longest finish to the shortest; empty if nothing can be bought. */
  static List<Stretch> of(CurveAnswer answer) {
    long perUnit = answer.of().network().scale().ticksPerUnit();
    List<Stretch> stretches = new ArrayList<>();
    for (int i = 1; i < answer.rows().size(); i++) {
      Finish from = answer.rows().get(i - 1);
      Finish to = answer.rows().get(i);
      FinishCost later = answer.whole(from);
      FinishCost sooner = answer.whole(to);
      long ticks = from.duration() - to.duration();
      stretches.add(
          new Stretch(
              from.duration(),
              to.duration(),
              perUnit(answer.priced(to).minus(answer.priced(from)), ticks, perUnit),
              perUnit(later.timeRelated().minus(sooner.timeRelated()), ticks, perUnit),
              perUnit(later.damages().minus(sooner.damages()), ticks, perUnit),
              perUnit(sooner.bonus().minus(later.bonus()), ticks, perUnit)));
    }
    return stretches;
  }

  private static BigDecimal perUnit(Money money, long ticks, long ticksPerUnit) {
    return money.times(ticksPerUnit).dividedBy(ticks).cents();
  }

  BigDecimal worth() {
    return time.add(damages).add(bonus);
  }

  boolean isWorthIt() {
    return price.compareTo(worth()) <= 0;
  }
}
