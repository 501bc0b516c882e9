package dayworth.engine.linear;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.testing.OutsideSolver;
import dayworth.testing.PublishedExample;
import dayworth.testing.RandomNetworks;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LinearProgrammeTest {

  private static final int CASES = Integer.getInteger("dayworth.cases", 300);

  /** Expected: the tables of the examples; their sources are in published/SOURCES.md. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "hillier-reliable",
        "moder-phillips-8",
        "heizer-render-paper",
        "taylor-house",
        "winston-widgetco",
        "gueret-stadium",
        "krajewski-hospital",
        "larson-gray-7",
        "own-bridge-relax",
        "own-reverse-critical"
      })
  void agreesWithPublishedExamples(String name) {
    PublishedExample example = PublishedExample.read(name);
    LinearProgramme programme = new LinearProgramme(example.network());
    assertFalse(example.leastCosts().isEmpty());
    example
        .leastCosts()
        .forEach(
            (duration, cost) ->
                assertEquals(new Answer.Least(cost), programme.at(duration), name + duration));
    long shortest = example.leastCosts().keySet().stream().min(Long::compare).orElseThrow();
    assertEquals(new Answer.Infeasible(), programme.at(shortest - 1));
  }

  @Test
  void agreesWithAnOutsideSolverOnRandomNetworks() {
    for (long seed = 1; seed <= CASES; seed++) {
      Network network = RandomNetworks.of(seed);
      long shortest = OutsideSolver.shortest(network).orElseThrow();
      long normal = Timing.earliest(network, Plan.allNormal(network)).finish();
      LinearProgramme programme = new LinearProgramme(network);
      long step = Math.max(1, (normal - shortest) / 5);
      String where = "seed " + seed;
      for (long deadline = normal; deadline >= shortest; deadline -= step) {
        assertCost(network, deadline, programme.at(deadline), where + " at " + deadline);
      }
      assertEquals(new Answer.Infeasible(), programme.at(shortest - 1), where);
      assertCost(network, shortest, programme.at(shortest), where + " at the shortest");
    }
  }

  @Test
  void losesNoCentBesideNormalCostsOfABillion() {
    Network network =
        series(
            Activity.compressible(
                "A", 3000, money("1000000000000.01"), 1000, money("1000000000000.03")),
            Activity.compressible(
                "B", 2500, money("999999999999.99"), 1500, money("999999999999.99")));
    LinearProgramme programme = new LinearProgramme(network);
    // By hand: B gives 1000 ticks for nothing; 500 of A's 2000 are half a cent, rounded up; all are
    // 2.
    assertEquals(least("2000000000000.00"), programme.at(4500));
    assertEquals(least("2000000000000.01"), programme.at(4000));
    assertEquals(least("2000000000000.02"), programme.at(2500));
    assertEquals(new Answer.Infeasible(), programme.at(2499));
  }

  @Test
  void tellsSlopesApartDownToABillionthOfTheSteepest() {
    LinearProgramme programme = new LinearProgramme(farApart("1000000000.00"));
    // By hand: 4 ticks of A at 1, then 4 of B at 2, then 4 of C at a billion.
    assertEquals(least("4.00"), programme.at(26));
    assertEquals(least("12.00"), programme.at(22));
    assertEquals(least("1000000012.00"), programme.at(21));
  }

  @Test
  void saysSoWhereSlopesAreTooFarApart() {
    LinearProgramme programme = new LinearProgramme(farApart("10000000000.00"));
    assertInstanceOf(Answer.NotSolved.class, programme.at(26));
  }

  /** Expected: OR-Tools' GLOP, whose own error is far below half a cent at these sizes. */
  private static void assertCost(Network network, long deadline, Answer answer, String where) {
    double expected = OutsideSolver.leastCost(network, deadline);
    Answer.Least least = assertInstanceOf(Answer.Least.class, answer, where);
    assertEquals(expected, least.cost().doubleValue(), 0.006, where);
  }

  private static Network farApart(String steepest) {
    return series(
        Activity.compressible("C", 10, Money.ZERO, 6, money(steepest).times(4)),
        Activity.compressible("B", 10, Money.ZERO, 6, Money.of(8)),
        Activity.compressible("A", 10, Money.ZERO, 6, Money.of(4)));
  }

  private static Network series(Activity... activities) {
    List<Link> links =
        IntStream.range(1, activities.length).mapToObj(i -> Link.finishToStart(i - 1, i)).toList();
    return new Network(TimeScale.WHOLE, List.of(activities), links);
  }

  private static Money money(String amount) {
    return Money.of(new BigDecimal(amount));
  }

  private static Answer least(String cost) {
    return new Answer.Least(new BigDecimal(cost));
  }
}
