package dayworth.engine.branching;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.ortools.Loader;
import com.google.ortools.sat.BoolVar;
import com.google.ortools.sat.CpModel;
import com.google.ortools.sat.CpSolver;
import com.google.ortools.sat.CpSolverStatus;
import com.google.ortools.sat.IntVar;
import com.google.ortools.sat.LinearExpr;
import com.google.ortools.sat.LinearExprBuilder;
import dayworth.engine.Ways;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Measure;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.testing.RandomMeasures;
import dayworth.testing.RandomNetworks;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;

/** Networks of up to 40 activities with measures against OR-Tools CP-SAT on a model of its own. */
class LargerWaysTest {

  private static final int CASES = 30;
  private static final long CENTS = 1_000;

  @Test
  void costsAgreeWithConstraintProgramming() {
    Loader.loadNativeLibraries();
    int compared = 0;
    for (long seed = 0; seed < CASES; seed++) {
      Network plain = RandomNetworks.of(seed, RandomNetworks.Kind.PLAIN, 15, 40);
      Network network = RandomMeasures.with(plain, seed, 3);
      long longest = Timing.earliest(network, Plan.allNormal(network)).finish();
      long shortest = Timing.earliest(network, Ways.of(network).shortest()).finish();
      long[] durations =
          LongStream.rangeClosed(0, 3)
              .map(k -> longest - k * (longest - shortest) / 3)
              .distinct()
              .toArray();
      for (Point point : Branching.solve(network, List.of(), durations, 200_000)) {
        String where = "seed " + seed + " at " + point.duration();
        assertTrue(point.isProved(), where);
        double found = point.cost().toDouble();
        assertEquals(leastCost(network, point.duration()), found, 0.05, where);
        compared++;
      }
    }
    assertTrue(compared >= 2 * CASES, compared + " compared");
  }

  /** Durations on a line are whole at an optimum, as everything else in the model is. */
  private static double leastCost(Network network, long deadline) {
    CpModel model = new CpModel();
    IntVar[] starts = new IntVar[network.size()];
    IntVar[] durations = new IntVar[network.size()];
    LinearExprBuilder cost = LinearExpr.newBuilder();
    BoolVar[] paid = new BoolVar[network.measures().packages().size()];
    for (int p = 0; p < paid.length; p++) {
      paid[p] = model.newBoolVar("p" + p);
      cost.addTerm(paid[p], scaled(network.measures().packages().get(p).cost()));
    }
    for (int i = 0; i < network.size(); i++) {
      Activity activity = network.activity(i);
      starts[i] = model.newIntVar(activity.notBefore(), deadline, "s" + i);
      durations[i] = model.newIntVar(0, deadline, "d" + i);
      List<BoolVar> ways = new ArrayList<>();
      for (long d = activity.crash(); d <= activity.normal(); d++) {
        if (activity.divisible() || d == activity.crash() || d == activity.normal()) {
          Money money = activity.normalCost().plus(activity.slope().times(activity.normal() - d));
          ways.add(way(model, durations[i], d, money, cost));
        }
      }
      for (Measure measure : network.measures().list()) {
        if (measure.activity() == i) {
          BoolVar way = way(model, durations[i], measure.duration(), measure.cost(), cost);
          measure.inPackage().ifPresent(p -> model.addImplication(way, paid[p]));
          ways.add(way);
        }
      }
      model.addExactlyOne(ways.toArray(BoolVar[]::new));
      model.addLessOrEqual(LinearExpr.sum(new IntVar[] {starts[i], durations[i]}), deadline);
    }
    for (Link link : network.links()) {
      int from = link.predecessor();
      model.addGreaterOrEqual(
          LinearExpr.weightedSum(
              new IntVar[] {starts[link.successor()], starts[from], durations[from]},
              new long[] {1, -1, -1}),
          link.lag());
    }
    model.minimize(cost);
    CpSolver solver = new CpSolver();
    solver.getParameters().setNumWorkers(1);
    assertEquals(CpSolverStatus.OPTIMAL, solver.solve(model));
    return solver.objectiveValue() / CENTS;
  }

  private static BoolVar way(
      CpModel model, IntVar duration, long ticks, Money money, LinearExprBuilder cost) {
    BoolVar way = model.newBoolVar("way");
    model.addEquality(duration, ticks).onlyEnforceIf(way);
    cost.addTerm(way, scaled(money));
    return way;
  }

  private static long scaled(Money money) {
    return Math.round(money.toDouble() * CENTS);
  }
}
