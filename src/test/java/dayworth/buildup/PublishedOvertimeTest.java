package dayworth.buildup;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.testing.Patterns;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The sum against figures that others published. */
class PublishedOvertimeTest {

  private static final Pattern FORTY = Patterns.plain("normal", 40, 5);
  private static final Quantity DOUBLE = Quantity.of(2);

  private static Quantity quantity(String number) {
    return Quantity.of(new BigDecimal(number));
  }

  private static PayLadder above40(Quantity multiplier) {
    return new PayLadder(List.of(new PayLadder.Step(Quantity.of(40), multiplier)));
  }

  private static Pattern overtime(int hours, int days, String loss) {
    return Patterns.overtime("overtime", hours, days, above40(DOUBLE), Patterns.loss(loss));
  }

  /** A hundred weeks of one worker at 1 an hour, all of it done at a pattern. */
  private static Spell toTheEnd(Pattern pattern) {
    Labour labour = new Labour(Quantity.of(4000), Quantity.ONE, Money.of(1), Money.ZERO);
    List<Spell> spells = new SpellSum(labour, FORTY).spells(pattern, BuildUp.MOST_WEEKS);
    return spells.get(spells.size() - 1);
  }

  /**
   * Howerton 1969, the hidden cost of overtime (Masonry Magazine, July 1969, pages 28 to 31): six
   * ten-hour days at double time with 17 % inefficiency cost (80 paid / 60 worked) / 0.83 = 1.6
   * times straight-time labour, as printed with one decimal.
   */
  @Test
  void sixTensAtDoubleTimeCostOnePointSixTimesTheLabour() {
    Spell spell = toTheEnd(overtime(60, 6, "0.17"));
    Money times = spell.pay().dividedBy(4000);
    assertEquals(new BigDecimal("1.6"), times.rounded(1, RoundingMode.HALF_UP));
    assertEquals(Money.of(80).dividedBy(60).dividedBy(Money.of(new BigDecimal("0.83"))), times);
  }

  /**
   * Business Roundtable, Scheduled Overtime Effect on Construction Projects, Report C-2, November
   * 1980: the 50-hour table, from memory. Productivity of the 50-hour week against a 40-hour one;
   * hours gained over 40; hours lost to the drop; hour cost of overtime operation, which is hours
   * lost and ten premium hours at double time. 0.752 is the table's own 37.6 hours of fifty.
   */
  @ParameterizedTest
  @CsvSource(
      textBlock =
          """
          0.926,  6.3,  3.7, 13.7
          0.900,  5.0,  5.0, 15.0
          0.870,  3.5,  6.5, 16.5
          0.800,  0.0, 10.0, 20.0
          0.752, -2.4, 12.4, 22.4
          0.750, -2.5, 12.5, 22.5
          """)
  void theFiftyHourTableFollowsFromItsProductivities(
      String productivity, String gain, String lost, String cost) {
    String loss = BigDecimal.ONE.subtract(new BigDecimal(productivity)).toPlainString();
    Pattern fifty = overtime(50, 5, loss);
    Labour labour = new Labour(Quantity.of(4000), Quantity.ONE, Money.of(1), Money.ZERO);
    Spell week = new SpellSum(labour, FORTY).spells(fifty, 1).get(0);
    Quantity done = Quantity.of(4000).minus(week.weeksAfter().times(Quantity.of(40)));
    assertEquals(quantity(gain), done.minus(Quantity.of(40)));
    assertEquals(quantity(lost), week.hoursLost());
    assertEquals(Money.of(new BigDecimal(cost)), week.extra().total());
    assertEquals(Money.of(10), week.extra().premium());
    assertEquals(Money.of(new BigDecimal(lost)), week.extra().lostOutput());
  }

  /** US Fair Labor Standards Act: once and a half above 40 hours; 50 h are 55 paid, 60 h 70. */
  @ParameterizedTest
  @CsvSource({"40,40", "45,47.5", "50,55", "60,70", "84,106", "20,20"})
  void federalOvertimeIsOnceAndAHalfAboveForty(String worked, String paid) {
    assertEquals(quantity(paid), above40(quantity("1.5")).paid(quantity(worked)));
  }

  /**
   * Sixty hours by once and a half above 40 and double above 50: 40 + 15 + 20 = 75. By hand: each
   * step ends where the next begins.
   */
  @Test
  void eachStepEndsWhereTheNextBegins() {
    PayLadder ladder =
        new PayLadder(
            List.of(
                new PayLadder.Step(Quantity.of(40), quantity("1.5")),
                new PayLadder.Step(Quantity.of(50), DOUBLE)));
    assertEquals(Quantity.of(75), ladder.paid(Quantity.of(60)));
    assertEquals(quantity("47.5"), ladder.paid(Quantity.of(45)));
  }

  /**
   * With the losses of week 1 to 7 of a 50-hour spell as printed in an estimating handbook (5, 7,
   * 8, 9, 15, 16 and 24 %) a worker gains 7.5, 6.5, 6, 5.5, 2.5, 2 and −2 hours, by hand 50 × (1 −
   * loss) − 40: 30 in six weeks, and 28 in seven, as in five, which cost less. Of a ten-week job
   * the sixth week is the last that saves anything: 0.75 weeks.
   */
  @Test
  void theSixthWeekOfFiftyHoursIsTheLastThatGains() {
    OutputLoss losses = Patterns.loss("0.05", "0.07", "0.08", "0.09", "0.15", "0.16", "0.24");
    Pattern fifty = Patterns.overtime("fifty", 50, 5, above40(quantity("1.5")), losses);
    Labour tenWeeks = new Labour(Quantity.of(400), Quantity.ONE, Money.of(1), Money.ZERO);
    ActivityBuildUp built =
        new Building(Quantity.ONE, List.of(FORTY, fifty))
            .whole(0, tenWeeks, Optional.empty(), Money.of(400));
    assertEquals(6, built.measures().count());
    Way sixth = built.ways().get(5);
    assertEquals(9_250, sixth.duration());
    Way seventh = built.ways().get(6);
    assertEquals(9_300, seventh.duration());
    assertEquals(new Verdict.Dominated("fifty 5 weeks"), seventh.verdict());
  }
}
