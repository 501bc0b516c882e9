package dayworth.buildup;

import dayworth.value.Money;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * Builds up the ways to do the activities of one case.
 *
 * <p>Weeks become time units of the case by how many of them a week has. Where an activity has a
 * stated duration and cost they stand for the normal way: its other durations are the same share of
 * the stated one as they are of the sum's, and its other costs are the stated one and what the
 * spell costs more.
 */
public final class Building {

  private final Quantity unitsPerWeek;
  private final Pattern normal;
  private final List<Pattern> bought;

  /**
   * For a case.
   *
   * @param unitsPerWeek how many time units the working days of a calendar week are
   * @param patterns the normal one first
   */
  public Building(Quantity unitsPerWeek, List<Pattern> patterns) {
    this.unitsPerWeek = unitsPerWeek;
    this.normal = patterns.get(0);
    this.bought = patterns.subList(1, patterns.size());
  }

  /** How long work takes at the normal pattern, in time units, not rounded. */
  public Quantity normalUnits(Labour labour) {
    return new SpellSum(labour, normal).normalWeeks().times(unitsPerWeek);
  }

  /** What work costs at the normal pattern. */
  public Money normalCost(Labour labour) {
    return new SpellSum(labour, normal).normalCost();
  }

  /**
   * The ways to do one activity.
   *
   * @param labour what is to be done
   * @param stated its normal duration in time units; empty if nothing but the labour tells it
   * @param cost its normal cost, stated or not
   */
  public ActivityBuildUp whole(int activity, Labour labour, Optional<Quantity> stated, Money cost) {
    return build(activity, false, labour, stated.orElseGet(() -> normalUnits(labour)), cost);
  }

  /**
   * The ways to do what is left of one activity.
   *
   * @param left what is left of its labour
   * @param remaining its duration in time units
   * @param cost of what is left
   */
  public ActivityBuildUp rest(int activity, Labour left, Quantity remaining, Money cost) {
    return build(activity, true, left, remaining, cost);
  }

  private ActivityBuildUp build(
      int activity, boolean ofRemaining, Labour labour, Quantity units, Money cost) {
    SpellSum sum = new SpellSum(labour, normal);
    Quantity unitsOfAWeek = units.dividedBy(sum.normalWeeks());
    List<Way> ways = new ArrayList<>();
    for (Pattern pattern : bought) {
      for (Spell spell : sum.spells(pattern, BuildUp.MOST_WEEKS)) {
        long duration = roundedUp(spell.allWeeks().times(unitsOfAWeek));
        ways.add(new Way(spell, duration, cost.plus(spell.extra().total()), new Verdict.Measure()));
      }
    }
    return new ActivityBuildUp(
        activity,
        ofRemaining,
        labour,
        roundedUp(units),
        cost,
        judged(ways, roundedUp(units), cost));
  }

  /** A number of time units in thousandths of one, rounded up. */
  public static long roundedUp(Quantity units) {
    BigDecimal rounded = units.rounded(BuildUp.SCALE.decimals(), RoundingMode.CEILING);
    return BuildUp.SCALE.ticks(rounded);
  }

  /**
   * A way that a shorter spell of its own pattern dominates is shown beside that one: it is what a
   * planner can do about it.
   */
  private List<Way> judged(List<Way> ways, long duration, Money cost) {
    Contest.Entry asNormal = new Contest.Entry(normal.name(), duration, cost);
    Contest all = contest(ways, asNormal);
    List<Way> judged = new ArrayList<>();
    for (List<Way> ofPattern :
        ways.stream()
            .collect(Collectors.groupingBy(way -> bought.indexOf(way.spell().pattern())))
            .values()) {
      Contest own = contest(ofPattern, asNormal);
      for (Way way : ofPattern) {
        Optional<String> by = own.dominatorOf(entry(way)).or(() -> all.dominatorOf(entry(way)));
        judged.add(new Way(way.spell(), way.duration(), way.cost(), verdict(way, duration, by)));
      }
    }
    return judged;
  }

  private static Verdict verdict(Way way, long normal, Optional<String> dominator) {
    if (dominator.isPresent()) {
      return new Verdict.Dominated(dominator.get());
    }
    return way.duration() > normal ? new Verdict.Slower() : new Verdict.Measure();
  }

  private static Contest contest(List<Way> ways, Contest.Entry normal) {
    List<Contest.Entry> entries = new ArrayList<>(List.of(normal));
    ways.forEach(way -> entries.add(entry(way)));
    return new Contest(entries);
  }

  private static Contest.Entry entry(Way way) {
    return new Contest.Entry(way.name(), way.duration(), way.cost());
  }
}
