package dayworth.engine.branching;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.engine.proof.ProofChecker;
import dayworth.network.Network;
import dayworth.testing.BruteForce;
import dayworth.testing.RandomMeasures;
import dayworth.testing.RandomNetworks;
import dayworth.value.Money;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;

/** The whole front of networks with measures and packages against every choice of ways. */
class WaysTest {

  private static final int CASES = 400;
  private static final long UNLIMITED = 1_000_000;

  @Test
  void everyFinishCostsTheLeastOfAllChoices() {
    for (long seed = 0; seed < CASES; seed++) {
      Network plain = RandomNetworks.of(seed, RandomNetworks.Kind.WHOLE, 2, 5);
      Network network = RandomMeasures.with(plain, seed, 3);
      Map<Long, Money> forced = BruteForce.leastCosts(network);
      long longest = forced.keySet().stream().max(Long::compare).orElseThrow();
      long shortest = forced.keySet().stream().min(Long::compare).orElseThrow();
      long[] durations =
          LongStream.rangeClosed(0, longest - shortest).map(k -> longest - k).toArray();
      List<Point> points = Branching.solve(network, List.of(), durations, UNLIMITED);
      assertEquals(durations.length, points.size(), "seed " + seed);
      for (Point point : points) {
        Money least =
            forced.entrySet().stream()
                .filter(entry -> entry.getKey() <= point.duration())
                .map(Map.Entry::getValue)
                .min(Money::compareTo)
                .orElseThrow();
        String where = "seed " + seed + " at " + point.duration();
        assertEquals(least, point.cost(), where);
        assertTrue(point.isProved(), where);
        assertEquals(least, point.plan().directCost(network), where);
        assertEquals(
            Optional.empty(),
            ProofChecker.possible(network, point.plan(), point.duration()),
            where);
      }
    }
  }
}
