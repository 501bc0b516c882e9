package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.network.Network;
import dayworth.testing.RandomNetworks;
import dayworth.testing.RandomTerms;
import dayworth.testing.WalkedMoney;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.List;
import java.util.OptionalLong;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** The total with dates is a staircase: its least is sought at every tick and must be a row. */
class StaircaseTest {

  private static final int SEEDS = 250;

  private static Money total(Finish row) {
    return row.direct().plus(row.other().sum());
  }

  @Test
  void noTickBetweenTwoRowsCostsLessAndEveryRowCostsWhatAWalkFinds() throws FinishTooEarly {
    int turning = 0;
    for (int seed = 0; seed < SEEDS; seed++) {
      Network network = RandomNetworks.of(seed, RandomNetworks.Kind.EVERYTHING, 3, 12);
      RandomTerms drawn = RandomTerms.of(new Random(seed), network.scale(), 20);
      Case of =
          new Case("drawn", "", "", TimeUnit.DAY, network, drawn.terms(), List.of(), List.of());
      CurveAnswer answer = CurveQuestion.ask(of, OptionalLong.empty(), 0, Watcher.NONE);
      WalkedMoney walked = new WalkedMoney(drawn.terms(), drawn.holidays());
      long shortest = answer.curve().shortest();
      long longest = answer.curve().longest();
      long stride = Math.max(1, (longest - shortest) / 400);
      Money least = null;
      for (long tick = longest; tick >= shortest; tick -= stride) {
        Money here = answer.curve().costAt(tick).plus(walked.sum(tick));
        least = least == null ? here : least.min(here);
      }
      Money leastRow = answer.rows().stream().map(StaircaseTest::total).reduce(Money::min).get();
      String at = "seed " + seed + ", " + drawn.terms();
      assertTrue(leastRow.compareTo(least) <= 0, at + ": " + leastRow + " above " + least);
      for (Finish row : answer.rows()) {
        assertEquals(
            answer.curve().costAt(row.duration()).plus(walked.sum(row.duration())),
            total(row),
            at + ", row " + row.duration());
      }
      BigDecimal cents =
          answer.rows().stream().map(Finish::total).reduce(BigDecimal::min).orElseThrow();
      assertEquals(
          answer.rows().stream().filter(row -> row.total().compareTo(cents) == 0).toList(),
          answer.least(),
          at);
      turning += turns(answer.rows()) > 1 ? 1 : 0;
    }
    assertTrue(turning > SEEDS / 10, "too few totals turn more than once: " + turning);
  }

  /** How often the total stops falling. */
  private static int turns(List<Finish> rows) {
    int turns = 0;
    for (int i = 1; i + 1 < rows.size(); i++) {
      Money here = total(rows.get(i));
      boolean falls = here.compareTo(total(rows.get(i - 1))) < 0;
      turns += falls && total(rows.get(i + 1)).compareTo(here) > 0 ? 1 : 0;
    }
    return turns;
  }
}
