package dayworth.engine.stepping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.engine.Step;
import dayworth.engine.proof.FlowBound;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.proof.Verdict;
import dayworth.network.Network;
import dayworth.testing.OutsideSolver;
import dayworth.testing.RandomNetworks;
import dayworth.value.Money;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Laws that every curve keeps, on seeded random networks; a failure names its seed. */
class SteppingLawsTest {

  private static final int NETWORKS = 2_000;

  @Test
  void everyPieceIsProvedAtBothItsEndsAndTheLastChainHolds() {
    for (long seed = 0; seed < NETWORKS; seed++) {
      Network network = RandomNetworks.of(seed);
      ProofChecker checker = new ProofChecker(network);
      String which = "seed " + seed;
      Curve curve =
          Stepping.curve(
              network,
              (from, fromPlan, to, toPlan, flow) -> {
                FlowBound bound = checker.bound(flow);
                assertInstanceOf(
                    Verdict.Proved.class,
                    checker.check(fromPlan, from, bound, fromPlan.directCost(network)),
                    which);
                assertInstanceOf(
                    Verdict.Proved.class,
                    checker.check(toPlan, to, bound, toPlan.directCost(network)),
                    which);
              });
      assertEquals(
          Optional.empty(),
          ProofChecker.stops(network, curve.obstacles(), curve.shortest()),
          which);
    }
  }

  /** Origin of the costs: OR-Tools GLOP on a model of its own. */
  @Test
  void costsAgreeWithAnOutsideSolverAtEveryBreakpointAndTheCurveIsConvex() {
    for (long seed = 0; seed < NETWORKS; seed++) {
      Network network = RandomNetworks.of(seed);
      Curve curve = Stepping.curve(network, PieceWitness.NONE);
      Money price = Money.of(-1);
      agrees(network, curve, curve.longest(), seed);
      for (Step step : curve.steps()) {
        agrees(network, curve, step.to(), seed);
        assertTrue(step.pricePerTick().compareTo(price) >= 0, "prices rise, seed " + seed);
        price = step.pricePerTick();
      }
      assertEquals(curve.shortest(), OutsideSolver.shortest(network).orElseThrow(), "seed " + seed);
    }
  }

  private static void agrees(Network network, Curve curve, long duration, long seed) {
    double outside = OutsideSolver.leastCost(network, duration);
    double inside = curve.costAt(duration).toDouble();
    assertEquals(
        outside, inside, 0.005 + 1e-9 * Math.abs(inside), "seed " + seed + " at " + duration);
  }
}
