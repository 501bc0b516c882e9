package dayworth.testing;

import com.google.ortools.Loader;
import com.google.ortools.linearsolver.MPConstraint;
import com.google.ortools.linearsolver.MPObjective;
import com.google.ortools.linearsolver.MPSolver;
import com.google.ortools.linearsolver.MPVariable;
import dayworth.engine.Flow;
import dayworth.engine.Flow.Over;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.value.SlopeScale;
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
  private final MPConstraint[] works;
  private final MPConstraint[] ends;
  private final MPConstraint[] links;
  private final MPConstraint[] earliestFinishes;

  private OutsideSolver(Network network, double deadline) {
    this.network = network;
    this.starts = new MPVariable[network.size()];
    this.finishes = new MPVariable[network.size()];
    this.works = new MPConstraint[network.size()];
    this.ends = new MPConstraint[network.size()];
    this.links = new MPConstraint[network.links().size()];
    this.earliestFinishes = new MPConstraint[network.size()];
    this.projectFinish = solver.makeNumVar(0, deadline, "finish");
    for (int i = 0; i < network.size(); i++) {
      Activity activity = network.activity(i);
      starts[i] = solver.makeNumVar((double) activity.notBefore(), MPSolver.infinity(), "s" + i);
      finishes[i] = solver.makeNumVar(-MPSolver.infinity(), MPSolver.infinity(), "f" + i);
      works[i] =
          require(starts[i], finishes[i], (double) activity.crash(), (double) activity.normal());
      earliestFinishes[i] =
          solver.makeConstraint((double) activity.notFinishedBefore(), MPSolver.infinity());
      earliestFinishes[i].setCoefficient(finishes[i], 1);
      ends[i] = require(finishes[i], projectFinish, 0, MPSolver.infinity());
    }
    for (int j = 0; j < links.length; j++) {
      Link link = network.link(j);
      MPVariable[] from = link.relation().fromStart() ? starts : finishes;
      MPVariable[] to = link.relation().toStart() ? starts : finishes;
      links[j] =
          require(
              from[link.predecessor()],
              to[link.successor()],
              (double) link.lag(),
              MPSolver.infinity());
    }
  }

  /**
   * The least cost of finishing within a deadline.
   *
   * @param deadline ticks
   * @return positive infinity if no plan meets it
   */
  public static double leastCost(Network network, long deadline) {
    if (deadline < 0) {
      return Double.POSITIVE_INFINITY;
    }
    OutsideSolver outside = new OutsideSolver(network, (double) deadline);
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

  /**
   * GLOP's own plan and dual values at a deadline that can be met.
   *
   * @param scale on which the dual values are whole; coarse enough for a double to tell them apart
   */
  public static OutsideProof proof(Network network, long deadline, SlopeScale scale) {
    OutsideSolver outside = new OutsideSolver(network, (double) deadline);
    outside.setDirectCost();
    if (outside.solver.solve() != MPSolver.ResultStatus.OPTIMAL) {
      throw new IllegalStateException("GLOP finds no plan by " + deadline);
    }
    Flow flow = new Flow(scale, network);
    long[] durations = new long[network.size()];
    for (int i = 0; i < durations.length; i++) {
      Activity activity = network.activity(i);
      durations[i] =
          Math.round(outside.finishes[i].solutionValue() - outside.starts[i].solutionValue());
      double price = activity.slope().toDouble() + outside.works[i].dualValue();
      OutsideProof.spread(activity, i, scaled(price, scale), flow);
      flow.set(Over.FROM_PROJECT, i, scaled(outside.starts[i].reducedCost(), scale));
      long fromProject = scaled(outside.earliestFinishes[i].dualValue(), scale);
      flow.set(Over.FROM_PROJECT_TO_FINISH, i, fromProject);
      flow.set(Over.TO_PROJECT, i, scaled(outside.ends[i].dualValue(), scale));
    }
    for (int j = 0; j < outside.links.length; j++) {
      flow.set(Over.LINK, j, scaled(outside.links[j].dualValue(), scale));
    }
    outside.solver.delete();
    return new OutsideProof(Plan.of(durations), flow);
  }

  private static long scaled(double price, SlopeScale scale) {
    return Math.round(price * scale.perUnit());
  }

  /** Minimises Σ slope × (normal − duration) + Σ rate × what each span is charged for. */
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
    for (Span span : network.spans()) {
      MPVariable charged = solver.makeNumVar(0, MPSolver.infinity(), "span");
      MPConstraint row = solver.makeConstraint((double) -span.free(), MPSolver.infinity());
      row.setCoefficient(charged, 1);
      addMoment(row, span.to(), -1);
      addMoment(row, span.from(), 1);
      objective.setCoefficient(charged, span.rate().toDouble());
    }
    objective.setMinimization();
    return fixed;
  }

  private void addMoment(MPConstraint row, Moment moment, double factor) {
    if (!moment.isProjectStart()) {
      MPVariable event = (moment.isFinish() ? finishes : starts)[moment.activity()];
      row.setCoefficient(event, factor);
    }
  }

  private MPConstraint require(MPVariable from, MPVariable to, double least, double most) {
    MPConstraint row = solver.makeConstraint(least, most);
    row.setCoefficient(to, 1);
    row.setCoefficient(from, -1);
    return row;
  }
}
