package dayworth.buildup;

import dayworth.value.Money;
import dayworth.value.Quantity;
import java.util.ArrayList;
import java.util.List;

/**
 * Adds up what an activity takes when it is done for 1, 2 and more weeks at a pattern and then at
 * the normal one.
 *
 * <p>The sum is the planners' own, week by week: output = workers × hours × (1 − loss of that week)
 * × (1 − crowding), pay = workers × hours paid by the ladder × rate; the work is done when the
 * output is the labour hours. A week is a week of the calendar whatever is worked in it. The week
 * in which the work ends counts pro rata, in time, pay and weekly cost. The last spell is the one
 * that lasts to the end, or the longest that the pattern allows.
 *
 * <p>The output of all weeks is the labour hours, to the last hour, and pay is the sum of the
 * labour's straight pay and the lines of the extra cost: all of it is exact. A spell costs one step
 * from the one before it.
 */
final class SpellSum {

  private final Labour labour;
  private final Pattern normal;

  /** All of the work at the normal pattern. */
  private final Worked throughout;

  /**
   * The sums of one activity.
   *
   * @param normal the pattern whose hours the labour hours are
   */
  SpellSum(Labour labour, Pattern normal) {
    this.labour = labour;
    this.normal = normal;
    this.throughout = Worked.week(labour, normal, 1).until(labour.hours());
  }

  /** How long all of it takes at the normal pattern. */
  Quantity normalWeeks() {
    return throughout.weeks();
  }

  /** What all of it costs at the normal pattern, with the other cost. */
  Money normalCost() {
    return throughout.paid().at(labour.rate()).plus(throughout.weekCost()).plus(labour.otherCost());
  }

  /**
   * Spells from a week to the longest.
   *
   * @param most more weeks than this are not added up, whatever the pattern allows
   */
  List<Spell> spells(Pattern pattern, int most) {
    List<Spell> spells = new ArrayList<>();
    Worked done = Worked.NOTHING;
    Quantity left = labour.hours();
    int longest = Math.min(most, pattern.weeksMax().orElse(most));
    for (int week = 1; week <= longest && left.signum() > 0; week++) {
      Worked whole = Worked.week(labour, pattern, week);
      done = done.plus(whole.output().compareTo(left) <= 0 ? whole : whole.until(left));
      left = labour.hours().minus(done.output());
      spells.add(Spell.of(labour, pattern, done, atNormal(left), throughout));
    }
    return spells;
  }

  private Worked atNormal(Quantity output) {
    return Worked.week(labour, normal, 1).until(output);
  }
}
