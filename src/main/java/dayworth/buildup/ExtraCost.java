package dayworth.buildup;

import dayworth.value.Money;

/**
 * What a spell costs more than the normal pattern throughout, by what it is paid for. The lines add
 * up to the whole difference: the hours that yield something are labour hours, paid at the straight
 * rate either way.
 *
 * @param premium what is paid above the straight rate for all hours worked, whether they yield
 *     something or not
 * @param lostOutput the straight rate of hours that yield nothing because output falls in that week
 *     of the spell
 * @param extraHours the straight rate of the further hours that the same output takes a crowded
 *     crew
 * @param supervision cost by the week: foreman, lighting, security, transport
 * @param once cost paid once for the spell
 */
public record ExtraCost(
    Money premium, Money lostOutput, Money extraHours, Money supervision, Money once) {

  static ExtraCost of(Labour labour, Worked all, Worked normal, Money once) {
    Money rate = labour.rate();
    return new ExtraCost(
        all.premiumHours().minus(normal.premiumHours()).at(rate),
        all.lost().at(rate),
        all.crowded().at(rate),
        all.weekCost().minus(normal.weekCost()),
        once);
  }

  public Money total() {
    return premium.plus(lostOutput).plus(extraHours).plus(supervision).plus(once);
  }
}
