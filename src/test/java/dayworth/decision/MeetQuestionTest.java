package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.contract.Terms;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Relation;
import dayworth.testing.OutsideSolver;
import dayworth.testing.RandomNetworks;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Random;
import org.junit.jupiter.api.Test;

/**
 * A 5 days to 3 at 20 a day, then B 4 to 2 at 30 a day, beside C 8 to 7 at 5: worked by hand. As
 * planned 9 days. 8 and 7 take A's days at 20; 6 takes B's, and C's two are too few.
 */
class MeetQuestionTest {

  private static final int SEEDS = 200;

  private static final Network NETWORK =
      new Network(
          TimeScale.of(new BigDecimal("0.1")),
          List.of(
              Activity.compressible("A", 50, Money.of(100), 30, Money.of(140)),
              Activity.compressible("B", 40, Money.of(200), 20, Money.of(260)),
              Activity.compressible("C", 80, Money.of(50), 60, Money.of(60))),
          List.of(Link.finishToStart(0, 1)));

  private static Case of(Network network) {
    return new Case(
        "meet", "", "", TimeUnit.DAY, network, Terms.none(network.scale()), List.of(), List.of());
  }

  private static MeetAnswer ask(Wish wish) throws FinishTooEarly {
    return MeetQuestion.ask(of(NETWORK), wish, 0, Watcher.NONE);
  }

  /** 9 to 7: A's two days, 40; C from 8 to 7 for 5. B is not touched. */
  @Test
  void theCheapestPlanForADurationSaysWhatChangesAndWhy() throws FinishTooEarly {
    MeetAnswer answer = ask(new Wish.In(70));
    assertEquals(
        List.of(
            new MeetAnswer.Bought(0, Plan.NO_MEASURE, 20, Money.of(40), List.of(0)),
            new MeetAnswer.Bought(2, Plan.NO_MEASURE, 10, Money.of(5), List.of(1))),
        answer.bought());
    assertEquals(List.of(List.of(0, 1), List.of(2)), answer.chains());
    assertEquals(Money.of(45), answer.extra());
    // from 8 to 7 both chains are level: 20 + 5
    assertEquals(Optional.of(Money.of(25)), answer.lastPrice());
  }

  /** 7.5 days: A 1.5 for 30, C half a day for 2.50. */
  @Test
  void aFinishInsideAPieceIsProvedToo() throws FinishTooEarly {
    MeetAnswer answer = ask(new Wish.In(75));
    assertEquals(Money.of(65).dividedBy(2), answer.extra());
    assertEquals(0, answer.proof().planCost().compareTo(answer.proof().bound()));
    // 100 + 200 + 50 as planned
    assertEquals(0, new BigDecimal("382.5").compareTo(answer.proof().planCost()));
  }

  @Test
  void aFinishThatIsNotNeededBuysNothing() throws FinishTooEarly {
    for (long ticks : new long[] {90, 95, 100_000}) {
      MeetAnswer answer = ask(new Wish.In(ticks));
      assertTrue(answer.isMetAsPlanned());
      assertEquals(90, answer.finish().duration());
      assertEquals(List.of(), answer.bought());
      assertEquals(Optional.empty(), answer.lastPrice());
      assertEquals(Money.ZERO, answer.extra());
    }
  }

  /** The shortest: A 3 and B 2 make 5, but C takes 6. */
  @Test
  void aFinishThatCannotBeHadNamesTheNearest() {
    FinishTooEarly early = assertThrows(FinishTooEarly.class, () -> ask(new Wish.In(59)));
    assertEquals(60, early.curve().shortest());
    assertThrows(FinishTooEarly.class, () -> ask(new Wish.In(-3)));
  }

  /** 9 to 8 costs 20, 8 to 7 costs 25 a day: 32.50 buys a day and a half. Then 35 a day. */
  @Test
  void moneyBuysAsMuchAsItReachesFor() throws FinishTooEarly {
    assertEquals(90, ask(new Wish.Within(Money.ZERO)).finish().duration());
    assertEquals(80, ask(new Wish.Within(Money.of(20))).finish().duration());
    assertEquals(75, ask(new Wish.Within(Money.of(65).dividedBy(2))).finish().duration());
    // 2.49 a tenth of a day short of 2.50: the tick before
    assertEquals(76, ask(new Wish.Within(Money.of(3249).dividedBy(100))).finish().duration());
    // 20 + 25 + 35 = 80 is all that can be bought
    assertEquals(60, ask(new Wish.Within(Money.of(80))).finish().duration());
    assertEquals(60, ask(new Wish.Within(Money.of(1_000_000))).finish().duration());
    assertEquals(61, ask(new Wish.Within(Money.of(79))).finish().duration());
  }

  /** B is passed backwards: A 6, FF 2, back over B 8, SS 1, C 7: A must be shortened alone. */
  @Test
  void aChainThatPassesAnActivityBackwardsIsAChainToo() throws FinishTooEarly {
    Network network =
        new Network(
            TimeScale.WHOLE,
            List.of(
                Activity.compressible("A", 10, Money.of(1000), 6, Money.of(1400)),
                Activity.compressible("B", 8, Money.of(800), 3, Money.of(900)),
                Activity.compressible("C", 9, Money.of(900), 7, Money.of(1200))),
            List.of(new Link(0, 1, Relation.FF, 2), new Link(1, 2, Relation.SS, 1)));
    MeetAnswer answer = MeetQuestion.ask(of(network), new Wish.In(12), 0, Watcher.NONE);
    assertEquals(
        List.of(new MeetAnswer.Bought(0, Plan.NO_MEASURE, 2, Money.of(200), List.of(0))),
        answer.bought());
    assertEquals(List.of(List.of(0, 1, 2)), answer.chains());
  }

  /** Crashing A saves 200 and four days of ten: all that any wish from 15 days on needs. */
  @Test
  void savingMoneyIsNoNeed() throws FinishTooEarly {
    Network network =
        new Network(
            TimeScale.WHOLE,
            List.of(
                Activity.compressible("A", 10, Money.of(1000), 6, Money.of(800)),
                Activity.fixed("B", 5, Money.of(300))),
            List.of(Link.finishToStart(0, 1)));
    MeetAnswer met = MeetQuestion.ask(of(network), new Wish.In(15), 0, Watcher.NONE);
    assertTrue(met.isMetAsPlanned());
    assertEquals(Money.of(-200), met.extra());
    MeetAnswer free = MeetQuestion.ask(of(network), new Wish.Within(Money.ZERO), 0, Watcher.NONE);
    assertEquals(11, free.finish().duration());
    assertFalse(free.isMetAsPlanned());
  }

  @Test
  void randomPlansAreAsCheapAsAnOutsideSolverFinds() throws FinishTooEarly {
    for (int seed = 0; seed < SEEDS; seed++) {
      Network network = RandomNetworks.of(seed, RandomNetworks.Kind.EVERYTHING, 3, 20);
      Random random = new Random(seed);
      CurveAnswer curve = CurveQuestion.ask(of(network), OptionalLong.empty(), 0, Watcher.NONE);
      long reach = curve.curve().longest() - curve.curve().shortest();
      long ticks = curve.curve().shortest() + (long) (random.nextDouble() * (reach + 1));
      MeetAnswer met = MeetQuestion.ask(of(network), new Wish.In(ticks), 0, Watcher.NONE);
      String at = "seed " + seed + ", in " + ticks;
      assertEquals(
          OutsideSolver.leastCost(network, ticks), met.finish().spent().toDouble(), 1e-6, at);
      Money most = Money.of(random.nextInt(600));
      MeetAnswer bought = MeetQuestion.ask(of(network), new Wish.Within(most), 0, Watcher.NONE);
      assertTrue(bought.extra().compareTo(most) <= 0, at);
      long finish = bought.finish().duration();
      if (finish > curve.curve().shortest()) {
        Money planned = bought.curve().asPlanned().spent();
        double sooner = OutsideSolver.leastCost(network, finish - 1) - planned.toDouble();
        assertTrue(sooner > most.toDouble() - 1e-6, at + ": a tick more costs " + sooner);
      }
    }
  }
}
