package dayworth.report.brief;

import dayworth.contract.FinishCost;
import dayworth.decision.BriefAnswer;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/**
 * What lies between two neighbouring finishes: what a unit of time costs there and what it is
 * worth.
 *
 * @param from the longer one, ticks
 * @param to the shorter one, ticks
 * @param price of a unit: direct and running cost and section money
 * @param time what a unit saves of time-related cost
 * @param damages what it saves of them
 * @param bonus what it earns
 */
record Stretch(
    long from, long to, BigDecimal price, BigDecimal time, BigDecimal damages, BigDecimal bonus) {

  static List<Stretch> of(BriefAnswer answer) {
    List<Stretch> stretches = new ArrayList<>();
    for (int i = 1; i < answer.states().size(); i++) {
      stretches.add(
          between(
              answer.curve(),
              answer.states().get(i - 1).finish(),
              answer.states().get(i).finish()));
    }
    return stretches;
  }

  private static Stretch between(CurveAnswer curve, Finish longer, Finish shorter) {
    FinishCost before = curve.whole(longer);
    FinishCost after = curve.whole(shorter);
    long ticks = longer.duration() - shorter.duration();
    long unit = curve.of().network().scale().ticksPerUnit();
    return new Stretch(
        longer.duration(),
        shorter.duration(),
        perUnit(curve.priced(shorter).minus(curve.priced(longer)), unit, ticks),
        perUnit(before.timeRelated().minus(after.timeRelated()), unit, ticks),
        perUnit(before.damages().minus(after.damages()), unit, ticks),
        perUnit(after.bonus().minus(before.bonus()), unit, ticks));
  }

  private static BigDecimal perUnit(Money money, long unit, long ticks) {
    return money.times(unit).dividedBy(ticks).cents();
  }

  BigDecimal worth() {
    return time.add(damages).add(bonus);
  }

  /** Whether a unit costs less than it is worth. */
  boolean pays() {
    return price.compareTo(worth()) < 0;
  }
}
