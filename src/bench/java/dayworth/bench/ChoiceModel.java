package dayworth.bench;

import com.google.ortools.Loader;
import com.google.ortools.sat.BoolVar;
import com.google.ortools.sat.CpModel;
import com.google.ortools.sat.CpSolver;
import com.google.ortools.sat.IntVar;
import com.google.ortools.sat.LinearExpr;
import com.google.ortools.sat.LinearExprBuilder;
import dayworth.engine.Ways;
import dayworth.network.Link;
import dayworth.network.Network;
import java.util.ArrayList;
import java.util.List;

/** The same choice for OR-Tools CP-SAT, with one worker. */
final class ChoiceModel {

  private ChoiceModel() {}

  /**
   * What CP-SAT found.
   *
   * @param cost of the best plan
   * @param bound that no plan is below
   */
  record Found(double cost, double bound, double seconds) {}

  static Found solve(Network network, long deadline, double seconds) {
    Loader.loadNativeLibraries();
    Ways ways = Ways.of(network);
    CpModel model = new CpModel();
    LinearExprBuilder cost = LinearExpr.newBuilder();
    IntVar[] starts = new IntVar[network.size()];
    LinearExpr[] finishes = new LinearExpr[network.size()];
    for (int i = 0; i < network.size(); i++) {
      starts[i] = model.newIntVar(0, deadline, "s" + i);
      LinearExprBuilder finish = LinearExpr.newBuilder().add(starts[i]);
      List<BoolVar> taken = new ArrayList<>();
      for (int w = ways.first(i); w < ways.first(i) + ways.count(i); w++) {
        BoolVar way = model.newBoolVar("x" + w);
        taken.add(way);
        finish.addTerm(way, ways.get(w).duration());
        cost.addTerm(way, ways.get(w).cost().cents().longValueExact());
      }
      model.addExactlyOne(taken.toArray(BoolVar[]::new));
      finishes[i] = finish.build();
      model.addLessOrEqual(finishes[i], deadline);
    }
    for (Link link : network.links()) {
      model.addGreaterOrEqual(
          starts[link.successor()],
          LinearExpr.newBuilder().add(finishes[link.predecessor()]).add(link.lag()).build());
    }
    model.minimize(cost);
    CpSolver solver = new CpSolver();
    solver.getParameters().setNumWorkers(1).setMaxTimeInSeconds(seconds);
    solver.solve(model);
    return new Found(solver.objectiveValue(), solver.bestObjectiveBound(), solver.wallTime());
  }
}
