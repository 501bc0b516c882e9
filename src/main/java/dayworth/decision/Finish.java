package dayworth.decision;

import dayworth.contract.FinishCost;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.Optional;

/**
 * One finish and all the money that goes with it.
 *
 * @param duration ticks
 * @param direct the direct cost
 * @param running cost that runs between two events
 * @param other what depends on the finish alone
 * @param pricePerUnit what the next unit of earlier finish costs, per unit; empty at the shortest
 * @param breakpoint whether the curve bends here
 */
public record Finish(
    long duration,
    Money direct,
    Money running,
    FinishCost other,
    Optional<Money> pricePerUnit,
    boolean breakpoint) {

  /** What is spent on the work itself: direct and running cost, exact. */
  public Money spent() {
    return direct.plus(running);
  }

  /** All the money, each part rounded to cents as it is reported, so that the parts add up. */
  public BigDecimal total() {
    return direct
        .cents()
        .add(running.cents())
        .add(other.timeRelated().cents())
        .add(other.fixed().cents())
        .add(other.damages().cents())
        .subtract(other.bonus().cents());
  }
}
