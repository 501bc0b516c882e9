package dayworth.contract;

import dayworth.value.Money;

/**
 * Money that depends on the finish alone, apart from the direct cost.
 *
 * @param timeRelated indirect cost that stops when the project finishes
 * @param fixed indirect cost that does not depend on time
 * @param damages liquidated damages to pay
 * @param bonus bonus earned; a positive amount is money coming in
 */
public record FinishCost(Money timeRelated, Money fixed, Money damages, Money bonus) {

  /** With money of sections. */
  public FinishCost plus(Money moreDamages, Money moreBonus) {
    return new FinishCost(timeRelated, fixed, damages.plus(moreDamages), bonus.plus(moreBonus));
  }

  /** The sum, the bonus taken off. */
  public Money sum() {
    return timeRelated.plus(fixed).plus(damages).minus(bonus);
  }
}
