package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.buildup.BuildUp;
import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.Extension;
import dayworth.contract.MomentMoney;
import dayworth.contract.Per;
import dayworth.contract.Section;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.value.DayLength;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/**
 * A (6 days for 100, 4 for 140: 20 a day) before B (4 for 50, 3 for 80: 30 a day), by hand. Extra
 * direct cost: 0 at 10 days, 20 at 9, 40 at 8, 70 at 7; as planned 150.
 */
class WeighQuestionTest {

  private static final Network NETWORK =
      new Network(
          TimeScale.WHOLE,
          List.of(
              Activity.compressible("A", 6, Money.of(100), 4, Money.of(140)),
              Activity.compressible("B", 4, Money.of(50), 3, Money.of(80))),
          List.of(Link.finishToStart(0, 1)));

  private static WeighAnswer ask(
      long time, long due, Damages damages, Bonus bonus, long extension) {
    Optional<Extension> claimed =
        Optional.of(new Extension(Due.at(due + extension), new DayLength(1, 1)))
            .filter(e -> extension > 0);
    Terms terms =
        new Terms(
            TimeScale.WHOLE,
            Optional.empty(),
            new TimeRelated(Money.of(time), Per.UNIT),
            Money.of(1_000),
            Optional.of(Due.at(due)),
            damages,
            bonus,
            claimed);
    Case of = new Case("weigh", "", "", TimeUnit.DAY, NETWORK, terms, List.of(), List.of());
    return WeighQuestion.ask(of, Watcher.NONE);
  }

  private static Damages damages(long rate, long cap) {
    Optional<Money> most = Optional.of(Money.of(cap)).filter(amount -> cap > 0);
    return Damages.perUnit(Money.of(rate), BigDecimal.ZERO, most);
  }

  private static List<String> ranges(BestByRate best) {
    return best.ranges().stream()
        .map(
            range ->
                range.from()
                    + " to "
                    + range.to().map(Money::toString).orElse("ever")
                    + ": "
                    + range.finish().duration()
                    + (range.isCapped() ? " capped" : ""))
        .toList();
  }

  /** 0 + 250 + 10 = 260 at 10; 20 + 225 = 245 at 9; 40 + 200 = 240 at 8; 70 + 175 = 245 at 7. */
  @Test
  void theChoicesStandSideBySide() {
    Weighing weighing = ask(25, 9, damages(10, 0), Bonus.NONE, 0).granted();
    assertEquals(
        List.of(
            "AS_IT_STANDS 10 0.00",
            "LEAST_TOTAL 8 20.00",
            "CONTRACT_FINISH 9 15.00",
            "SHORTEST 7 15.00"),
        weighing.choices().stream()
            .map(c -> c.kind() + " " + c.finish().duration() + " " + weighing.saved(c.finish()))
            .toList());
  }

  /** 10 + 10 q, 20 + 9 q, 40 + 8 q, 70 + 7 q: equal at 10, 20 and 30. */
  @Test
  void theTimeRelatedRateTurnsTheChoice() {
    Weighing weighing = ask(25, 9, damages(10, 0), Bonus.NONE, 0).granted();
    assertEquals(
        List.of("0 to 10: 10", "10 to 20: 9", "20 to 30: 8", "30 to ever: 7"),
        ranges(weighing.byTimeRelated()));
    assertEquals(8, weighing.byTimeRelated().present().finish().duration());
  }

  /** 260 + 0 x, 225 + 20 x, 200 + 40 x, 175 + 70 x: equal at 35/20, 25/20 and 25/30. */
  @Test
  void theCostOfShorteningTurnsTheChoice() {
    Weighing weighing = ask(25, 9, damages(10, 0), Bonus.NONE, 0).granted();
    assertEquals(
        List.of("0 to 5/6: 7", "5/6 to 5/4: 8", "5/4 to 7/4: 9", "7/4 to ever: 10"),
        ranges(weighing.byCompression()));
    // 1,000 fixed, 150 as planned, 40 x 1.5, 200
    assertEquals(Money.of(1_410), weighing.totalAt(weighing.best(), Money.of(3).dividedBy(2)));
  }

  /** 150 + 3 r, 155 + 2 r and 160 + r are all 165 at 5; 160 + r is 175 at 15. */
  @Test
  void theDamagesRateTurnsTheChoice() {
    Weighing weighing = ask(15, 7, damages(8, 0), Bonus.NONE, 0).granted();
    assertEquals(
        List.of("0 to 5: 10", "5 to 15: 8", "15 to ever: 7"),
        ranges(weighing.byDamages().orElseThrow()));
    assertEquals(8, weighing.best().duration());
    // at 0: 160 instead of 150; at 4: 164 instead of 162; at 16: 176 instead of 175
    assertEquals(
        List.of("0 10 10", "4 10 2", "16 7 1"),
        weighing.wrongRates().stream()
            .map(w -> w.rate() + " " + w.best().duration() + " " + w.tooMuch())
            .toList());
  }

  /** Capped at 20, ten days cost 150 + 20 = 170 at most: less than 160 + r from 10 on. */
  @Test
  void aCapBringsBackTheLateFinish() {
    Weighing weighing = ask(15, 7, damages(8, 20), Bonus.NONE, 0).granted();
    assertEquals(
        List.of("0 to 5: 10", "5 to 10: 8", "10 to ever: 10 capped"),
        ranges(weighing.byDamages().orElseThrow()));
    // Capped at 12 they cost 162 at most, from 4 on, and nothing else is ever best.
    Weighing low = ask(15, 7, damages(8, 12), Bonus.NONE, 0).granted();
    assertEquals(
        List.of("0 to 4: 10", "4 to ever: 10 capped"), ranges(low.byDamages().orElseThrow()));
  }

  /** A bonus of 50 a day for at most two days: all of it at 8, for less than at 7. */
  @Test
  void theMostBonusIsTheLongestFinishThatHasIt() {
    Bonus bonus =
        new Bonus(Money.of(50), Per.UNIT, Optional.empty(), Optional.of(BigDecimal.valueOf(2)));
    Weighing weighing = ask(1, 10, Damages.NONE, bonus, 0).granted();
    assertEquals(
        List.of("AS_IT_STANDS 10", "LEAST_TOTAL 8", "MOST_BONUS 8", "SHORTEST 7"),
        weighing.choices().stream().map(c -> c.kind() + " " + c.finish().duration()).toList());
    assertEquals(Optional.empty(), weighing.byDamages());
  }

  /**
   * Damages 22 a day, time 5, contract finish day 7. Not extended: 10: 50 + 66 = 116; 9: 65 + 44 =
   * 109; 8: 80 + 22 = 102; 7: 105. Each day of extension takes 22 off what is late: with 1: 94, 87,
   * 80, 105; with 2: 72, 65, 80, 105; with 3: 50, 65, 80, 105.
   */
  @Test
  void eachExtensionHasItsBestFinish() {
    WeighAnswer answer = ask(5, 7, damages(22, 0), Bonus.NONE, 2);
    assertEquals(
        List.of("0 to 1: 8", "2 to 2: 9", "3 to ever: 10"),
        answer.byExtension().stream()
            .map(
                e ->
                    e.from()
                        + " to "
                        + e.to().map(Object::toString).orElse("ever")
                        + ": "
                        + e.best().duration())
            .toList());
    assertEquals(8, answer.granted().best().duration());
    Weighing claimed = answer.claimed().orElseThrow();
    assertEquals(9, claimed.best().duration());
    // 72 - 65
    assertEquals(new BigDecimal("7.00"), claimed.saved(claimed.best()));
    assertTrue(ask(5, 7, damages(22, 0), Bonus.NONE, 0).byExtension().isEmpty());
  }

  /**
   * In tenths of a day, A's section due on day 5 at 3 a day, time 5, damages 22 after day 7.5.
   * Extended by 2, to 9.5: 10 days cost 50 + 3 + 11 = 64, 9.5 days 10 + 47.5 + 1.5 = 59, 9 days 20
   * + 45 = 65. By 1, to 8.5: 8.5 days 30 + 42.5 = 72.5, 9 days 20 + 45 + 11 = 76. By 0: 8 days 40 +
   * 40 + 11 = 91, 7.5 days 55 + 37.5 = 92.5. By 3 nothing is late: 10 days 53, 9.5 days 59.
   */
  @Test
  void betweenTwoRowsSectionsCountToo() {
    TimeScale tenths = new TimeScale(1);
    Network network =
        new Network(
            tenths,
            List.of(
                Activity.compressible("A", 60, Money.of(100), 40, Money.of(140)),
                Activity.compressible("B", 40, Money.of(50), 30, Money.of(80))),
            List.of(Link.finishToStart(0, 1)));
    Terms terms =
        new Terms(
            tenths,
            Optional.empty(),
            new TimeRelated(Money.of(5), Per.UNIT),
            Money.ZERO,
            Optional.of(Due.at(75)),
            damages(22, 0),
            Bonus.NONE,
            Optional.of(new Extension(Due.at(95), new DayLength(10, 1))));
    Section deck = new Section("deck", 0, Due.at(50), damages(3, 0), Bonus.NONE);
    MomentMoney money = new MomentMoney(tenths, Optional.empty(), List.of(deck), List.of());
    Case of =
        new Case(
            "deck",
            "",
            "",
            TimeUnit.DAY,
            network,
            terms,
            money,
            Optional.empty(),
            BuildUp.NONE,
            List.of(),
            List.of());
    WeighAnswer answer = WeighQuestion.ask(of, Watcher.NONE);
    assertEquals(
        List.of("80 241.00", "85 222.50", "95 209.00", "100 203.00"),
        answer.byExtension().stream()
            .map(e -> e.best().duration() + " " + e.best().total())
            .toList());
    assertEquals(95, answer.claimed().orElseThrow().best().duration());
  }
}
