package dayworth.contract;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.testing.RandomTerms;
import dayworth.testing.WalkedMoney;
import dayworth.value.TimeScale;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** The money against a count from day to day, on seeded terms. */
class WalkedMoneyTest {

  private static final int SEEDS = 1500;

  @Test
  void everyAmountIsWhatAWalkFromDayToDayFinds() {
    for (int seed = 0; seed < SEEDS; seed++) {
      Random random = new Random(seed);
      TimeScale scale = new TimeScale(random.nextInt(4));
      RandomTerms drawn = RandomTerms.of(random, scale, 40);
      Terms terms = drawn.terms();
      WalkedMoney walked = new WalkedMoney(terms, drawn.holidays());
      for (int k = 0; k < 30; k++) {
        long finish = random.nextInt((int) (80 * scale.ticksPerUnit()));
        String at = "seed " + seed + ", finish " + finish + ", " + terms;
        FinishCost found = terms.at(finish);
        assertEquals(
            walked.finishDate(finish), terms.calendar().orElseThrow().finishDate(finish), at);
        assertEquals(walked.timeRelated(finish), found.timeRelated(), at);
        assertEquals(walked.damages(finish), found.damages(), at);
        assertEquals(walked.bonus(finish), found.bonus(), at);
      }
    }
  }
}
