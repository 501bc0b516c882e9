package dayworth.engine.stepping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.engine.Step;
import dayworth.engine.linear.Answer;
import dayworth.engine.linear.LinearProgramme;
import dayworth.engine.proof.FlowBound;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.proof.Verdict;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.testing.OutsideSolver;
import dayworth.testing.RandomNetworks;
import dayworth.testing.RandomNetworks.Kind;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Money that runs between two moments, by hand and on seeded random networks. */
class SpanLawsTest {

  private static final int NETWORKS = 1_000;

  /**
   * By hand: A 4 days and B 6 side by side, then C 1. A crane at 100 a day stands from A's start to
   * C's start. A can wait 2 days for B, so 4 days are paid, not 6. B's shortening (30 a day) by one
   * day brings C forward by one, and A can still wait 1; below 4 days of B the crane's span shrinks
   * only with A (250 a day), so the days from then on cost 30 + 250 - 100.
   */
  @Test
  void aSpanShrinksByStartingLater() {
    Network network =
        new Network(
            TimeScale.WHOLE,
            List.of(
                Activity.compressible("A", 4, Money.ZERO, 2, Money.of(500)),
                Activity.compressible("B", 6, Money.ZERO, 3, Money.of(90)),
                Activity.fixed("C", 1, Money.ZERO)),
            List.of(Link.finishToStart(0, 2), Link.finishToStart(1, 2)),
            List.of(new Span("crane", Moment.startOf(0), Moment.startOf(2), 0, Money.of(100))));
    Curve curve = Stepping.curve(network, PieceWitness.NONE);
    assertEquals(7, curve.longest());
    assertEquals(Money.of(400), curve.firstCost());
    assertEquals(2, curve.firstPlan().start(0));
    assertEquals(
        List.of(Money.of(30), Money.of(180)),
        curve.steps().stream().map(Step::pricePerTick).toList());
    assertEquals(List.of(5L, 4L), curve.steps().stream().map(Step::to).toList());
    assertEquals(Money.of(400), curve.spanCostAt(5, network.spans().get(0)));
    assertEquals(Money.of(300), curve.spanCostAt(4, network.spans().get(0)));
  }

  @Test
  void everyPieceIsProvedAtBothItsEnds() {
    for (long seed = 0; seed < NETWORKS; seed++) {
      Network network = RandomNetworks.of(seed, Kind.WITH_SPANS, 2, 25);
      ProofChecker checker = new ProofChecker(network);
      String which = "seed " + seed;
      Curve curve =
          Stepping.curve(
              network,
              (from, fromPlan, to, toPlan, flow) -> {
                FlowBound bound = checker.bound(flow);
                proved(checker, fromPlan, from, bound, network, which);
                proved(checker, toPlan, to, bound, network, which);
              });
      for (int k = 0; k < curve.steps().size(); k++) {
        long to = curve.steps().get(k).to();
        assertEquals(curve.planAfter(k + 1).cost(network), curve.costAt(to), which);
      }
    }
  }

  private static void proved(
      ProofChecker checker,
      Plan plan,
      long finish,
      FlowBound bound,
      Network network,
      String which) {
    assertInstanceOf(
        Verdict.Proved.class, checker.check(plan, finish, bound, plan.cost(network)), which);
  }

  /** Origin of the costs: OR-Tools GLOP on a model of its own. */
  @Test
  void costsAgreeWithAnOutsideSolverAndPartsAddUp() {
    for (long seed = 0; seed < NETWORKS; seed++) {
      Network network = RandomNetworks.of(seed, Kind.WITH_SPANS, 2, 25);
      Curve curve = Stepping.curve(network, PieceWitness.NONE);
      Money price = Money.of(-1);
      agrees(network, curve, curve.longest(), seed);
      agreesWithAnyFinish(network, curve, seed);
      for (Step step : curve.steps()) {
        agrees(network, curve, step.to(), seed);
        agrees(network, curve, step.to() + step.ticks() / 2, seed);
        assertTrue(step.pricePerTick().compareTo(price) >= 0, "prices rise, seed " + seed);
        price = step.pricePerTick();
      }
    }
  }

  private static void agrees(Network network, Curve curve, long duration, long seed) {
    double outside = OutsideSolver.leastCost(network, duration);
    double inside = curve.costAt(duration).toDouble();
    String where = "seed " + seed + " at " + duration;
    assertEquals(outside, inside, 0.005 + 1e-9 * Math.abs(inside), where);
    Plan plan = Stepping.planWithin(network, duration);
    assertEquals(curve.costAt(duration), plan.cost(network), where);
    for (Span span : network.spans()) {
      assertTrue(curve.spanCostAt(duration, span).signum() >= 0, where);
    }
  }

  /** The curve begins where more time saves nothing. */
  private static void agreesWithAnyFinish(Network network, Curve curve, long seed) {
    double outside = OutsideSolver.leastCost(network, curve.longest() * 4 + 100_000);
    assertEquals(outside, curve.firstCost().toDouble(), 0.005, "seed " + seed);
  }

  @Test
  void theLinearProgrammeAgrees() {
    for (long seed = 0; seed < NETWORKS / 5; seed++) {
      Network network = RandomNetworks.of(seed, Kind.WITH_SPANS, 2, 25);
      Curve curve = Stepping.curve(network, PieceWitness.NONE);
      LinearProgramme programme = new LinearProgramme(network);
      for (Step step : curve.steps()) {
        assertEquals(
            new Answer.Least(curve.costAt(step.to()).cents()),
            programme.at(step.to()),
            "seed " + seed + " at " + step.to());
      }
    }
  }
}
