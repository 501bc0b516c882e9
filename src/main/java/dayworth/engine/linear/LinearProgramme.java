package dayworth.engine.linear;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import dayworth.value.MoneySum;
import dayworth.value.TimeScale;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import org.ojalgo.optimisation.Optimisation;

/**
 * The least cost of finishing by a deadline, as a linear programme for ojAlgo.
 *
 * <p>Written from the activities and links themselves (Kelley 1961, "Critical-path planning and
 * scheduling: mathematical basis"). Variables: the start s of each activity, at least its
 * not-before time, and the shortening y of each compressible one, from 0 to normal − crash; its
 * finish is s + normal − y, so work is contiguous and never stretched; a row keeps it from being
 * before a not-finished-before time. One row for each link: successor's event − predecessor's event
 * ≥ lag. One row for each finish ≤ deadline, except where a link with a lag of at least 0 leads
 * from that finish to an event of another activity, whose own finish then comes no earlier. A span
 * has a variable z ≥ 0 for the ticks that it is charged for, and a row z ≥ later moment − earlier
 * moment − free. Least: Σ slope × y + Σ rate × z; slopes may be zero or negative.
 *
 * <p><b>Error.</b> In terms of events the rows are differences of two unknowns, a totally
 * unimodular system, so every corner is a whole number of ticks, and a simplex solver answers with
 * a corner. Its starts and shortenings are rounded to ticks, checked against every rule in whole
 * numbers, and the cost is counted exactly from them. What remains floating point is the choice of
 * the corner: a plan is possible and its cost exact, but where prices differ by less than the
 * solver's tolerance (a fraction of the steepest slope) it may be a dearer one. Seen: no difference
 * from an outside solver with slopes up to {@value #FINEST} of the steepest. Where one is flatter
 * than that the programme says that it is not solved, rather than answer with money that might be
 * too much.
 *
 * <p><b>Cost.</b> The tableau is dense: rows × columns numbers of 8 bytes, 0.25 GB for 2,000
 * activities. The first deadline is solved from nothing, later ones from the basis of the last.
 * Measured on one core with about two links an activity, k thousand activities: 0.5 s to load
 * ojAlgo, 1.2 k³ s for the first deadline and 0.025 k² s for each further one.
 *
 * <p>Not safe for use by several threads.
 */
public final class LinearProgramme {

  /** The flattest slope, as a fraction of the steepest, that the solver is trusted with. */
  static final double FINEST = 1e-9;

  private final Network network;
  private final Tableau tableau;
  private final boolean tooFarApart;

  public LinearProgramme(Network network) {
    this.network = network;
    double[] slopes =
        DoubleStream.concat(
                network.activities().stream()
                    .mapToDouble(activity -> Math.abs(activity.slope().toDouble())),
                network.spans().stream().mapToDouble(span -> span.rate().toDouble()))
            .filter(slope -> slope > 0)
            .sorted()
            .toArray();
    double steepest = slopes.length == 0 ? 1 : slopes[slopes.length - 1];
    this.tooFarApart = slopes.length > 0 && slopes[0] < FINEST * steepest;
    this.tableau = new Tableau(network, steepest);
  }

  /**
   * Loads the solver by having it solve a programme of one activity. Otherwise the first programme
   * does it, which takes some tenths of a second.
   */
  public static void load() {
    Activity activity = Activity.compressible("A", 2, Money.ZERO, 1, Money.of(1));
    new LinearProgramme(new Network(TimeScale.WHOLE, List.of(activity), List.of())).at(1);
  }

  /**
   * The least cost of finishing within a deadline.
   *
   * @param deadlineTicks ticks after the project start
   */
  public Answer at(long deadlineTicks) {
    if (deadlineTicks < 0) {
      return new Answer.Infeasible();
    }
    if (tooFarApart) {
      return new Answer.NotSolved("the cost slopes are too far apart for floating point");
    }
    Answer answer = read(tableau.solve(deadlineTicks), deadlineTicks);
    if (answer instanceof Answer.Least) {
      return answer;
    }
    tableau.restart();
    Answer fresh = read(tableau.solve(deadlineTicks), deadlineTicks);
    tableau.restart();
    return fresh;
  }

  private Answer read(Optimisation.State state, long deadline) {
    if (state == Optimisation.State.INFEASIBLE) {
      return new Answer.Infeasible();
    }
    if (state != Optimisation.State.OPTIMAL) {
      return new Answer.NotSolved("the solver stopped in the state " + state);
    }
    long[] starts = new long[network.size()];
    long[] finishes = new long[network.size()];
    MoneySum cost = new MoneySum();
    for (int i = 0; i < network.size(); i++) {
      Activity activity = network.activity(i);
      long shortening = Math.round(tableau.shortening(i));
      starts[i] = Math.round(tableau.start(i));
      finishes[i] = starts[i] + activity.normal() - shortening;
      if (!isAllowed(activity, starts[i], finishes[i], deadline)) {
        return new Answer.NotSolved("the solver's answer breaks a limit of " + activity.id());
      }
      cost.add(activity.normalCost()).add(activity.slope(), shortening, 1);
    }
    if (!network.links().stream().allMatch(link -> holds(link, starts, finishes))) {
      return new Answer.NotSolved("the solver's answer breaks a link");
    }
    Plan plan = Plan.scheduled(durations(starts, finishes), starts);
    return new Answer.Least(cost.add(plan.spanCost(network)).total().cents());
  }

  private static long[] durations(long[] starts, long[] finishes) {
    long[] durations = new long[starts.length];
    Arrays.setAll(durations, i -> finishes[i] - starts[i]);
    return durations;
  }

  private static boolean isAllowed(Activity activity, long start, long finish, long deadline) {
    long duration = finish - start;
    return start >= activity.notBefore()
        && duration >= activity.crash()
        && duration <= activity.normal()
        && finish >= activity.notFinishedBefore()
        && finish <= deadline;
  }

  private static boolean holds(Link link, long[] starts, long[] finishes) {
    long from = (link.relation().fromStart() ? starts : finishes)[link.predecessor()];
    long to = (link.relation().toStart() ? starts : finishes)[link.successor()];
    return to - from >= link.lag();
  }
}
