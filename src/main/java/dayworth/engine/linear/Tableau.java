package dayworth.engine.linear;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.ojalgo.optimisation.Expression;
import org.ojalgo.optimisation.ExpressionsBasedModel;
import org.ojalgo.optimisation.IntermediateSolver;
import org.ojalgo.optimisation.Optimisation;
import org.ojalgo.optimisation.Variable;

/**
 * The programme's rows and columns in ojAlgo's terms, and its solver, which starts each deadline
 * from the basis of the last.
 *
 * <p>Times are in ticks divided by a power of two that brings them below about a million: the
 * division is exact and a tick stays far above ojAlgo's tolerance. Weights are slopes as fractions
 * of the steepest. Presolvers are left out, so that what is solved is what is written here.
 */
final class Tableau {

  private static final int BITS_OF_TIME = 20;

  private final Network network;
  private final double ticksPerUnit;
  private final ExpressionsBasedModel model;
  private final List<Variable> starts = new ArrayList<>();
  private final List<Optional<Variable>> shortenings = new ArrayList<>();
  private final Variable deadline;
  private IntermediateSolver solver;
  private Optimisation.Result result;

  Tableau(Network network, double steepest) {
    this.network = network;
    this.ticksPerUnit = Math.scalb(1.0, Math.max(0, bitsOfTime() - BITS_OF_TIME));
    Optimisation.Environment environment = Optimisation.newEnvironment();
    environment.clearPresolvers();
    this.model = environment.newModel();
    for (Activity activity : network.activities()) {
      starts.add(model.addVariable().lower(scaled(activity.notBefore())));
      shortenings.add(shortening(activity, steepest));
    }
    this.deadline = model.addVariable().lower(0);
    network.links().forEach(this::addLink);
    network.spans().forEach(span -> addSpan(span, steepest));
    for (int i = 0; i < network.size(); i++) {
      if (!isFollowed(i)) {
        addFinish(i);
      }
      if (network.activity(i).notFinishedBefore() > 0) {
        addEarliestFinish(i);
      }
    }
    this.solver = newSolver();
    this.result = Optimisation.Result.of(Optimisation.State.UNEXPLORED);
  }

  /** Solves one deadline, starting from the last solution. */
  Optimisation.State solve(long deadlineTicks) {
    deadline.upper(scaled(deadlineTicks));
    solver.update(deadline);
    result = solver.solve(null);
    return result.getState();
  }

  /** Forgets the last solution. */
  void restart() {
    solver.dispose();
    solver = newSolver();
  }

  /** The start of an activity in the last solution, in ticks that need not be whole. */
  double start(int activity) {
    return ticks(starts.get(activity));
  }

  /** The shortening of an activity in the last solution, in ticks that need not be whole. */
  double shortening(int activity) {
    return shortenings.get(activity).map(this::ticks).orElse(0.0);
  }

  private IntermediateSolver newSolver() {
    return model.prepare(Optimisation.Sense.MIN, prepared -> new IntermediateSolver(prepared) {});
  }

  private Optional<Variable> shortening(Activity activity, double steepest) {
    if (!activity.isCompressible()) {
      return Optional.empty();
    }
    Variable shortening = model.addVariable().lower(0).upper(scaled(activity.mostShortening()));
    if (activity.slope().signum() != 0) {
      shortening.weight(activity.slope().toDouble() / steepest);
    }
    return Optional.of(shortening);
  }

  private void addLink(Link link) {
    boolean fromStart = link.relation().fromStart();
    boolean toStart = link.relation().toStart();
    long least = link.lag();
    least += fromStart ? 0 : network.activity(link.predecessor()).normal();
    least -= toStart ? 0 : network.activity(link.successor()).normal();
    Expression row = model.addExpression().lower(scaled(least));
    row.set(starts.get(link.successor()), 1).set(starts.get(link.predecessor()), -1);
    if (!fromStart) {
      shortenings.get(link.predecessor()).ifPresent(y -> row.set(y, 1));
    }
    if (!toStart) {
      shortenings.get(link.successor()).ifPresent(y -> row.set(y, -1));
    }
  }

  /** charged − later moment + earlier moment ≥ −free. */
  private void addSpan(Span span, double steepest) {
    Variable charged = model.addVariable().lower(0).weight(span.rate().toDouble() / steepest);
    long least = normalOffset(span.to()) - normalOffset(span.from()) - span.free();
    Expression row = model.addExpression().lower(scaled(least));
    row.set(charged, 1);
    addMoment(row, span.to(), -1);
    addMoment(row, span.from(), 1);
  }

  /** How long after its activity's start a moment comes while nothing is shortened. */
  private long normalOffset(Moment moment) {
    return moment.isFinish() ? network.activity(moment.activity()).normal() : 0;
  }

  /** Both moments of a span may be of one activity, so factors are added up. */
  private void addMoment(Expression row, Moment moment, int factor) {
    if (!moment.isProjectStart()) {
      row.add(starts.get(moment.activity()), factor);
      if (moment.isFinish()) {
        shortenings.get(moment.activity()).ifPresent(y -> row.add(y, -factor));
      }
    }
  }

  /** deadline − (start + normal − shortening) ≥ 0. */
  private void addFinish(int activity) {
    Expression row = model.addExpression().lower(scaled(network.activity(activity).normal()));
    row.set(deadline, 1).set(starts.get(activity), -1);
    shortenings.get(activity).ifPresent(y -> row.set(y, 1));
  }

  /** start + normal − shortening ≥ the not-finished-before time. */
  private void addEarliestFinish(int activity) {
    long least =
        network.activity(activity).notFinishedBefore() - network.activity(activity).normal();
    Expression row = model.addExpression().lower(scaled(least));
    row.set(starts.get(activity), 1);
    shortenings.get(activity).ifPresent(y -> row.set(y, -1));
  }

  /** Whether another activity's finish comes no earlier than this one's because of a link. */
  private boolean isFollowed(int activity) {
    for (int k = 0; k < network.linksOutOf(activity); k++) {
      Link link = network.link(network.linkOutOf(activity, k));
      if (!link.relation().fromStart() && link.lag() >= 0) {
        return true;
      }
    }
    return false;
  }

  private double ticks(Variable variable) {
    return result.doubleValue(model.indexOf(variable)) * ticksPerUnit;
  }

  private double scaled(long ticks) {
    return ticks / ticksPerUnit;
  }

  /** Of the longest that the project can be said to take. */
  private int bitsOfTime() {
    long longest = 0;
    for (Activity activity : network.activities()) {
      longest = Math.max(longest, Math.max(activity.notBefore(), activity.notFinishedBefore()));
    }
    for (Activity activity : network.activities()) {
      longest += activity.normal();
    }
    for (Link link : network.links()) {
      longest += Math.max(0, link.lag());
    }
    return Long.SIZE - Long.numberOfLeadingZeros(longest);
  }
}
