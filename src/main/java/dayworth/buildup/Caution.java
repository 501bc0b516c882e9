package dayworth.buildup;

import dayworth.value.Quantity;
import java.util.ArrayList;
import java.util.List;

/**
 * Something about a pattern that asks for care, because injuries or lost output have been found to
 * go with it. It judges no pattern: local working-time rules, agreements and the competent person
 * decide.
 */
public enum Caution {
  /** More than 48 hours a week. */
  LONG_WEEK,
  /** 60 hours a week or more. */
  VERY_LONG_WEEK,
  /** Days of 12 hours or more. */
  LONG_DAYS,
  /** No day of the week is free. */
  NO_REST_DAY,
  /** More hours than the normal pattern for more than four weeks on end. */
  LONG_SPELL,
  /** More workers than the normal crew, some of whom may work evenings or nights. */
  LATE_SHIFT;

  private static final Quantity LONG_WEEK_HOURS = Quantity.of(48);
  private static final Quantity VERY_LONG_WEEK_HOURS = Quantity.of(60);
  private static final Quantity LONG_DAY_HOURS = Quantity.of(12);
  private static final Quantity ALL_DAYS = Quantity.of(7);

  /** Four weeks are a judgement: in published tables the loss has then about doubled. */
  private static final Quantity LONG_SPELL_WEEKS = Quantity.of(4);

  /**
   * What a pattern asks care for.
   *
   * @param longest the longest spell of it that is offered, in weeks
   */
  public static List<Caution> of(Pattern pattern, Pattern normal, Quantity longest) {
    List<Caution> cautions = new ArrayList<>();
    Quantity hours = pattern.hoursPerWeek();
    if (hours.compareTo(LONG_WEEK_HOURS) > 0) {
      cautions.add(LONG_WEEK);
    }
    if (hours.compareTo(VERY_LONG_WEEK_HOURS) >= 0) {
      cautions.add(VERY_LONG_WEEK);
    }
    if (pattern.hoursPerDay().compareTo(LONG_DAY_HOURS) >= 0) {
      cautions.add(LONG_DAYS);
    }
    if (pattern.daysPerWeek().compareTo(ALL_DAYS) >= 0) {
      cautions.add(NO_REST_DAY);
    }
    if (hours.compareTo(normal.hoursPerWeek()) > 0 && longest.compareTo(LONG_SPELL_WEEKS) > 0) {
      cautions.add(LONG_SPELL);
    }
    if (pattern.crewFactor().compareTo(Quantity.ONE) > 0) {
      cautions.add(LATE_SHIFT);
    }
    return List.copyOf(cautions);
  }
}
