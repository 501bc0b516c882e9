package dayworth.buildup;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.testing.RandomBuildUps;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** What holds of every build-up, on seeded ones. A failure names its seed. */
class BuildUpLawsTest {

  private static final int SEEDS = 150;

  /** A build-up as it was drawn. */
  private record Drawn(String seed, Labour labour, List<Pattern> patterns, ActivityBuildUp built) {}

  private static final List<Drawn> ALL = all();

  private static List<Drawn> all() {
    List<Drawn> all = new ArrayList<>();
    for (int seed = 0; seed < SEEDS; seed++) {
      Random random = new Random(seed);
      Labour labour = RandomBuildUps.labour(random);
      List<Pattern> patterns = RandomBuildUps.patterns(random);
      Building building = new Building(Quantity.of(1 + random.nextInt(40)), patterns);
      ActivityBuildUp built =
          building.whole(0, labour, Optional.empty(), building.normalCost(labour));
      all.add(new Drawn("seed " + seed, labour, patterns, built));
    }
    return all;
  }

  @Test
  void theOutputIsTheLabourHoursToTheLastOne() {
    for (Drawn drawn : ALL) {
      for (Way way : drawn.built().ways()) {
        assertEquals(drawn.labour().hours(), way.spell().output(), drawn.seed());
      }
    }
  }

  /** Straight pay of the labour hours, and what is paid above or without output. */
  @Test
  void payAndCostAreTheSumOfTheirLines() {
    for (Drawn drawn : ALL) {
      Pattern normal = drawn.patterns().get(0);
      Quantity hours = drawn.labour().hours();
      Quantity paidOfOne =
          normal.pay().paid(normal.hoursPerWeek()).dividedBy(normal.hoursPerWeek());
      Money normalPay = hours.times(paidOfOne).at(drawn.labour().rate());
      for (Way way : drawn.built().ways()) {
        Spell spell = way.spell();
        ExtraCost extra = spell.extra();
        assertEquals(
            normalPay.plus(extra.premium()).plus(extra.lostOutput()).plus(extra.extraHours()),
            spell.pay(),
            drawn.seed());
        Money weekly =
            spell
                .weeks()
                .at(spell.pattern().weekCost())
                .plus(spell.weeksAfter().at(normal.weekCost()));
        assertEquals(
            spell
                .pay()
                .plus(weekly)
                .plus(spell.pattern().onceCost())
                .plus(drawn.labour().otherCost()),
            way.cost(),
            drawn.seed());
      }
    }
  }

  /** Counted another way: hour by hour of the calendar, a thousandth of a week at a time. */
  @Test
  void aSpellIsAsLongAsWalkingThroughItTakes() {
    for (Drawn drawn : ALL.subList(0, 60)) {
      Pattern normal = drawn.patterns().get(0);
      for (Way way : drawn.built().ways()) {
        Spell spell = way.spell();
        double left = drawn.labour().hours().toDouble();
        int steps = 0;
        while (left > 1e-9) {
          double week = steps / 1000.0;
          boolean within = week < spell.weeks().toDouble() - 1e-9;
          Pattern pattern = within ? spell.pattern() : normal;
          double share =
              pattern.crewHours(drawn.labour()).toDouble()
                  * (1 - pattern.loss().in((int) week + 1).toDouble())
                  * (1 - pattern.crowdingLoss().toDouble());
          left -= share / 1000;
          steps++;
        }
        assertEquals(spell.allWeeks().toDouble(), steps / 1000.0, 0.0021, drawn.seed());
      }
    }
  }

  /** Against every other way and the normal one, by comparing each with each. */
  @Test
  void noDominatedWayIsOfferedAndEveryOtherOneIs() {
    for (Drawn drawn : ALL) {
      List<Way> ways = drawn.built().ways();
      for (int i = 0; i < ways.size(); i++) {
        Way way = ways.get(i);
        boolean dominated = beats(drawn.built().normal(), drawn.built().normalCost(), way, true);
        for (int j = 0; j < ways.size(); j++) {
          Way other = ways.get(j);
          dominated |= j != i && beats(other.duration(), other.cost(), way, j < i);
        }
        boolean slower = way.duration() > drawn.built().normal();
        assertEquals(!dominated && !slower, way.verdict().isMeasure(), drawn.seed() + way);
      }
    }
  }

  private static boolean beats(long duration, Money cost, Way way, boolean isEarlier) {
    int cheaper = cost.compareTo(way.cost());
    boolean equal = duration == way.duration() && cheaper == 0;
    return equal ? isEarlier : duration <= way.duration() && cheaper <= 0;
  }

  @Test
  void whatDominatesIsAnotherWayThatIsOfferedOrTheNormalOne() {
    for (Drawn drawn : ALL) {
      for (Way way : drawn.built().ways()) {
        if (way.verdict() instanceof Verdict.Dominated dominated) {
          assertFalse(dominated.by().equals(way.name()), drawn.seed());
          boolean found =
              dominated.by().equals("normal")
                  || drawn.built().ways().stream()
                      .filter(other -> other.name().equals(dominated.by()))
                      .anyMatch(
                          other ->
                              other.duration() <= way.duration()
                                  && other.cost().compareTo(way.cost()) <= 0);
          assertTrue(found, drawn.seed() + " " + way.name() + " by " + dominated.by());
        }
      }
    }
  }

  @Test
  void namesTellTheWaysApart() {
    for (Drawn drawn : ALL) {
      Set<String> names = new HashSet<>();
      drawn.built().ways().forEach(way -> assertTrue(names.add(way.name()), drawn.seed()));
    }
  }

  /** Twice the hours by twice the crew take the same weeks, and twice the labour's money. */
  @Test
  void twiceTheCrewDoesTwiceTheWorkInTheSameTime() {
    for (Drawn drawn : ALL.subList(0, 100)) {
      Quantity two = Quantity.of(2);
      Labour labour = drawn.labour();
      Labour twice =
          new Labour(
              labour.hours().times(two),
              labour.crew().times(two),
              labour.rate(),
              labour.otherCost());
      for (Pattern pattern : drawn.patterns().subList(1, drawn.patterns().size())) {
        Pattern normal = drawn.patterns().get(0);
        List<Spell> once = new SpellSum(labour, normal).spells(pattern, 40);
        List<Spell> doubled = new SpellSum(twice, normal).spells(pattern, 40);
        assertEquals(once.size(), doubled.size(), drawn.seed());
        for (int i = 0; i < once.size(); i++) {
          assertEquals(once.get(i).allWeeks(), doubled.get(i).allWeeks(), drawn.seed());
          assertEquals(once.get(i).pay().times(2), doubled.get(i).pay(), drawn.seed());
          assertEquals(
              once.get(i).extra().supervision(),
              doubled.get(i).extra().supervision(),
              drawn.seed());
        }
      }
    }
  }
}
