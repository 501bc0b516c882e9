package dayworth.buildup;

import dayworth.value.Money;

/**
 * A spell as a way to do an activity of a case.
 *
 * @param duration in thousandths of a time unit, rounded up
 * @param cost of the whole activity, or of what is left of it
 */
public record Way(Spell spell, long duration, Money cost, Verdict verdict) {

  public String name() {
    return spell.name();
  }
}
