package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Per;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;

/**
 * Two activities in series, worked by hand: A 5 days for 100, 3 for 140 (20 a day); B 4 days for
 * 200, 2 for 260 (30 a day). Time costs 25 a day, so A's two days pay and B's do not.
 */
class CurveQuestionTest {

  private static final Case SERIES =
      new Case(
          "series",
          "",
          "EUR",
          TimeUnit.DAY,
          new Network(
              TimeScale.WHOLE,
              List.of(
                  Activity.compressible("A", 5, Money.of(100), 3, Money.of(140)),
                  Activity.compressible("B", 4, Money.of(200), 2, Money.of(260))),
              List.of(Link.finishToStart(0, 1))),
          new Terms(
              TimeScale.WHOLE,
              Optional.empty(),
              new TimeRelated(Money.of(25), Per.UNIT),
              Money.ZERO,
              Optional.empty(),
              Damages.NONE,
              Bonus.NONE),
          List.of(),
          List.of());

  @Test
  void stopsAtTheLeastTotal() throws FinishTooEarly {
    CurveAnswer answer =
        CurveQuestion.ask(SERIES, OptionalLong.empty(), Long.MAX_VALUE, Watcher.NONE);
    // 9 days 300 + 225 = 525; 8: 320 + 200 = 520; 7: 340 + 175 = 515; 6: 370 + 150 = 520;
    // 5: 400 + 125 = 525
    assertEquals(
        List.of("525.00", "520.00", "515.00", "520.00", "525.00"),
        answer.rows().stream().map(row -> row.total().toPlainString()).toList());
    assertEquals(7, answer.leastTotal().duration());
    assertEquals(3, answer.asked().timing().plan().duration(0));
    assertEquals(4, answer.asked().timing().plan().duration(1));
    // breakpoints 9, 7 and 5, and 8 and 6 between them
    assertEquals(5, answer.crossCheck().comparisons().size());
    assertEquals(3, answer.crossCheck().atBreakpoints());
  }

  @Test
  void givesThePlanOfAFinishBetweenTwoBreakpoints() throws FinishTooEarly {
    CurveAnswer answer = CurveQuestion.ask(SERIES, OptionalLong.of(6), 0, Watcher.NONE);
    // A at its shortest, 3; B one of its two days: 3
    assertEquals(3, answer.asked().timing().plan().duration(1));
    assertEquals(0, answer.crossCheck().comparisons().size());
  }
}
