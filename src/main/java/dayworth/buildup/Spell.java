package dayworth.buildup;

import dayworth.value.Money;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;

/**
 * An activity done for some weeks at one pattern and to its end at the normal one.
 *
 * @param pattern that of the spell
 * @param weeks of the spell; not whole where the work ends within a week
 * @param weeksAfter at the normal pattern; 0 where the spell lasts to the end
 * @param hoursWorked of all workers together, in the spell and after it
 * @param hoursLost of them, those that yield nothing because output falls
 * @param hoursCrowded of the others, those that yield nothing because the crew is crowded
 * @param pay of all hours worked
 * @param extra what all of it costs more than the normal pattern throughout
 */
public record Spell(
    Pattern pattern,
    Quantity weeks,
    Quantity weeksAfter,
    Quantity hoursWorked,
    Quantity hoursLost,
    Quantity hoursCrowded,
    Money pay,
    ExtraCost extra) {

  /** As many decimals as durations have. */
  private static final int DECIMALS = 3;

  static Spell of(Labour labour, Pattern pattern, Worked spell, Worked after, Worked normal) {
    Worked all = spell.plus(after);
    return new Spell(
        pattern,
        spell.weeks(),
        after.weeks(),
        all.hours(),
        all.lost(),
        all.crowded(),
        all.paid().at(labour.rate()),
        ExtraCost.of(labour, all, normal, pattern.onceCost()));
  }

  /** From the start of the spell to the end of the work. */
  public Quantity allWeeks() {
    return weeks.plus(weeksAfter);
  }

  /** What is done, in hours of the normal pattern: the labour hours. */
  public Quantity output() {
    return hoursWorked.minus(hoursLost).minus(hoursCrowded);
  }

  public boolean lastsToTheEnd() {
    return weeksAfter.signum() == 0;
  }

  /** Its length, rounded up to a thousandth of a week. */
  public BigDecimal roundedWeeks() {
    return weeks.rounded(DECIMALS, RoundingMode.CEILING);
  }

  /** Pattern and weeks: {@code long days 2 weeks}. */
  public String name() {
    BigDecimal length = roundedWeeks();
    boolean one = length.compareTo(BigDecimal.ONE) == 0;
    return pattern.name() + " " + length.toPlainString() + (one ? " week" : " weeks");
  }

  /** Where the losses of its weeks are from; a source that is not given is left out. */
  public List<String> lossSources() {
    int begun = weeks.rounded(0, RoundingMode.CEILING).intValueExact();
    return pattern.loss().sources(begun).stream().filter(source -> !source.isEmpty()).toList();
  }
}
