package dayworth.buildup;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.testing.Patterns;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Each line of the cost of three spells of the ferry berth, added up by hand beside it. */
class FerryBerthByHandTest {

  private static final Pattern NORMAL = Patterns.plain("normal", 40, 5);

  /** Five tens: once and a half above 40 hours; 450 a week; 4, 4, 6, 8, 12, 16, 18, 20 % lost. */
  private static final Pattern LONG_DAYS =
      new Pattern(
          "long days",
          Quantity.of(50),
          Quantity.of(5),
          Quantity.ONE,
          Quantity.ZERO,
          Money.ZERO,
          Money.of(450),
          OptionalInt.of(10),
          "",
          ladder("40", "1.5"),
          Patterns.loss("0.04", "0.04", "0.06", "0.08", "0.12", "0.16", "0.18", "0.20"));

  /** Twice the crew, an eighth lost to crowding, all hours at 1.12; 4,800 once, 2,600 a week. */
  private static final Pattern TWO_SHIFTS =
      new Pattern(
          "two shifts",
          Quantity.of(40),
          Quantity.of(5),
          Quantity.of(2),
          quantity("0.125"),
          Money.of(4800),
          Money.of(2600),
          OptionalInt.of(12),
          "",
          ladder("0", "1.12"),
          Patterns.loss("0"));

  /** 672 hours, crew of 6: 2.8 weeks, 14 days; 672 × 48 + 49,744 = 82,000. */
  private static final Labour H2 = labour(672, 6, 48, 49_744);

  private static Quantity quantity(String number) {
    return Quantity.of(new BigDecimal(number));
  }

  private static PayLadder ladder(String above, String multiplier) {
    return new PayLadder(List.of(new PayLadder.Step(quantity(above), quantity(multiplier))));
  }

  private static Labour labour(int hours, int crew, int rate, int other) {
    return new Labour(Quantity.of(hours), Quantity.of(crew), Money.of(rate), Money.of(other));
  }

  private static Money money(String amount) {
    return Money.of(new BigDecimal(amount));
  }

  private static ActivityBuildUp built(Labour labour, Pattern... bought) {
    List<Pattern> patterns = Stream.concat(Stream.of(NORMAL), Stream.of(bought)).toList();
    Building building = new Building(Quantity.of(5), patterns);
    return building.whole(0, labour, Optional.empty(), building.normalCost(labour));
  }

  private static Way way(ActivityBuildUp of, String name) {
    return of.ways().stream().filter(way -> way.name().equals(name)).findFirst().orElseThrow();
  }

  /**
   * Two weeks of 6 × 50 h, of which 4 % yield nothing: 24 h × 48 = 1,152. 6 × 10 h × 2 at half the
   * rate more: 120 × 24 = 2,880. 2 × 450 = 900. In all 4,932. 576 of 672 h are done; 96 h at 240 a
   * week are 0.4 weeks: 2.4 weeks, 12 days.
   */
  @Test
  void twoWeeksOfLongDays() {
    Way way = way(built(H2, LONG_DAYS), "long days 2 weeks");
    assertEquals(
        new ExtraCost(money("2880"), money("1152"), Money.ZERO, money("900"), Money.ZERO),
        way.spell().extra());
    assertEquals(money("4932"), way.spell().extra().total());
    assertEquals(12_000, way.duration());
    assertEquals(money("86932"), way.cost());
    assertEquals(quantity("0.4"), way.spell().weeksAfter());
  }

  /** 9 × 10 h × 22 = 1,980; 4 % of 450 h, 18 h × 44 = 792; 450. 34 days become 33. */
  @Test
  void oneWeekOfLongDays() {
    Way way = way(built(labour(2448, 9, 44, 140_288), LONG_DAYS), "long days 1 week");
    assertEquals(
        new ExtraCost(money("1980"), money("792"), Money.ZERO, money("450"), Money.ZERO),
        way.spell().extra());
    assertEquals(money("3222"), way.spell().extra().total());
    assertEquals(33_000, way.duration());
  }

  /**
   * 12 workers × 40 h less an eighth yield 420 h a week: 672 take 1.6 weeks, 768 h. An eighth of
   * them, 96 h × 48 = 4,608; 12 % of 768 h × 48 = 4,423.68; 1.6 × 2,600 = 4,160; 4,800 once: in all
   * 17,991.68, and 8 days.
   */
  @Test
  void twoShiftsToTheEnd() {
    Way way = way(built(H2, TWO_SHIFTS), "two shifts 1.6 weeks");
    assertEquals(
        new ExtraCost(money("4423.68"), Money.ZERO, money("4608"), money("4160"), money("4800")),
        way.spell().extra());
    assertEquals(money("17991.68"), way.spell().extra().total());
    assertEquals(8_000, way.duration());
    assertEquals(quantity("1.6"), way.spell().weeks());
    assertEquals(money("768").times(48).times(money("1.12")), way.spell().pay());
  }

  /**
   * 2,112 hours of a crew of 6, 240 a week: 44 days. In weeks 1 to 7 long days yield 300 h less 4,
   * 4, 6, 8, 12, 16, 18 %: 1,896 h; 216 h at 240 are 0.9 weeks: 39.5 days. Week 8 loses 20 %: 240
   * h, no more than the normal week, and costs more.
   */
  @Test
  void theEighthWeekGainsNothing() {
    ActivityBuildUp c6 = built(labour(2112, 6, 43, 123_184), LONG_DAYS);
    assertEquals(44_000, c6.normal());
    assertEquals(39_500, way(c6, "long days 7 weeks").duration());
    assertEquals(new Verdict.Measure(), way(c6, "long days 7 weeks").verdict());
    Way eighth = way(c6, "long days 7.9 weeks");
    assertEquals(39_500, eighth.duration());
    assertEquals(new Verdict.Dominated("long days 7 weeks"), eighth.verdict());
    assertEquals(7, c6.measures().count());
  }

  /** 14 days by the sum, 28 stated: 12 days become 24. The spell costs 4,932 more either way. */
  @Test
  void aStatedDurationIsKeptAndOthersAreTheSameShareOfIt() {
    Building building = new Building(Quantity.of(5), List.of(NORMAL, LONG_DAYS));
    ActivityBuildUp stated = building.whole(0, H2, Optional.of(Quantity.of(28)), money("100000"));
    assertEquals(28_000, stated.normal());
    Way way = way(stated, "long days 2 weeks");
    assertEquals(24_000, way.duration());
    assertEquals(money("104932"), way.cost());
  }

  /** A third of the work: 224 h, 14/3 days, rounded up to a thousandth. */
  @Test
  void whatIsLeftIsAShareOfTheHours() {
    Quantity third = Quantity.ONE.dividedBy(Quantity.of(3));
    ActivityBuildUp rest = built(H2.share(third), LONG_DAYS);
    assertEquals(4_667, rest.normal());
    assertEquals(Quantity.of(224), rest.labour().hours());
    assertEquals(
        Collections.nCopies(1, "long days 0.778 weeks"),
        rest.ways().stream().map(Way::name).toList());
  }
}
