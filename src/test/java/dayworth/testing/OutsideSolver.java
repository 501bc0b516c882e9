package dayworth.testing;

import com.google.ortools.Loader;
import com.google.ortools.linearsolver.MPConstraint;
import com.google.ortools.linearsolver.MPObjective;
import com.google.ortools.linearsolver.MPSolver;
import com.google.ortools.linearsolver.MPVariable;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import java.util.OptionalLong;

/**
 * OR-Tools' GLOP as a reference: the same question put to a program that nobody here wrote.
 *
 * <p>Written in event times, two variables for each activity, all times in ticks; neither the
 * stepping nor ojAlgo's model looks like it.
 */
public final class OutsideSolver {

  static {
    Loader.loadNativeLibraries();
  }

  private final Network network;
  private final MPSolver solver = MPSolver.createSolver("GLOP");
  private final MPVariable[] starts;
  private final MPVariable[] finishes;
  private final MPVariable projectFinish;

  private OutsideSolver(Network network, double deadline) {
    this.network = network;
    this.starts = new MPVariable[network.size()];
    this.finishes = new MPVariable[network.size()];
    this.projectFinish = solver.makeNumVar(0, deadline, "finish");
    for (int i = 0; i < network.size(); i++) {
      Activity activity = network.activity(i);
      starts[i] = solver.makeNumVar((double) activity.notBefore(), MPSolver.infinity(), "s" + i);
      finishes[i] = solver.makeNumVar(-MPSolver.infinity(), MPSolver.infinity(), "f" + i);
      require(starts[i], finishes[i], (double) activity.crash(), (double) activity.normal());
      require(finishes[i], projectFinish, 0, MPSolver.infinity());
    }
    for (Link link : network.links()) {
      MPVariable[] from = link.relation().fromStart() ? starts : finishes;
      MPVariable[] to = link.relation().toStart() ? starts : finishes;
      require(
          from[link.predecessor()], to[link.successor()], (double) link.lag(), MPSolver.infinity());
    }
  }

  /**
   * The least direct cost of finishing within a deadline.
   *
   * @param deadline ticks
   * @return positive infinity if no plan meets it
   */
  public static double leastCost(Network network, long deadline) {
    OutsideSolver outside = new OutsideSolver(network, deadline);
    double fixed = outside.setDirectCost();
    MPSolver.ResultStatus status = outside.solver.solve();
    double cost =
        switch (status) {
          case OPTIMAL -> fixed + outside.solver.objective().value();
          case INFEASIBLE -> Double.POSITIVE_INFINITY;
          default -> throw new IllegalStateException("GLOP says " + status);
        };
    outside.solver.delete();
    return cost;
  }

  /** The shortest possible project in ticks; empty if GLOP finds none. */
  public static OptionalLong shortest(Network network) {
    OutsideSolver outside = new OutsideSolver(network, MPSolver.infinity());
    outside.solver.objective().setCoefficient(outside.projectFinish, 1);
    outside.solver.objective().setMinimization();
    OptionalLong shortest =
        outside.solver.solve() == MPSolver.ResultStatus.OPTIMAL
            ? OptionalLong.of(Math.round(outside.solver.objective().value()))
            : OptionalLong.empty();
    outside.solver.delete();
    return shortest;
  }

  /** Minimises Σ slope × (normal − duration). */
  private double setDirectCost() {
    MPObjective objective = solver.objective();
    double fixed = 0;
    for (int i = 0; i < network.size(); i++) {
      Activity activity = network.activity(i);
      double slope = activity.slope().toDouble();
      objective.setCoefficient(finishes[i], -slope);
      objective.setCoefficient(starts[i], slope);
      fixed += activity.normalCost().toDouble() + slope * activity.normal();
    }
    objective.setMinimization();
    return fixed;
  }

  private void require(MPVariable from, MPVariable to, double least, double most) {
    MPConstraint row = solver.makeConstraint(least, most);
    row.setCoefficient(to, 1);
    row.setCoefficient(from, -1);
  }
}
