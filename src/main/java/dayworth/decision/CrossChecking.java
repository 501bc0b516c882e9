package dayworth.decision;

import dayworth.engine.Curve;
import dayworth.engine.Step;
import dayworth.engine.linear.Answer;
import dayworth.engine.linear.LinearProgramme;
import dayworth.network.Network;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.NavigableSet;
import java.util.Set;
import java.util.TreeSet;

/** Compares a curve with the linear programme at breakpoints and inside pieces. */
final class CrossChecking {

  /** What rounding in the linear programme may come to, in money units. */
  private static final BigDecimal ROUNDING = new BigDecimal("0.01");

  private CrossChecking() {}

  /**
   * The comparison.
   *
   * @param most how many points at most; spread evenly where there are more
   * @throws ProofFailed if the two differ by more than rounding
   */
  static CrossCheck of(Network network, Curve curve, long most, Watcher watcher) {
    TreeSet<Long> breakpoints = new TreeSet<>(List.of(curve.longest()));
    TreeSet<Long> points = new TreeSet<>(breakpoints);
    for (Step step : curve.steps()) {
      breakpoints.add(step.to());
      points.add(step.to());
      points.add(step.to() + step.ticks() / 2);
    }
    if (most == 0) {
      return new CrossCheck(List.of(), 0, points.size(), List.of());
    }
    List<CrossCheck.Comparison> comparisons = new ArrayList<>();
    List<CrossCheck.Unanswered> unanswered = new ArrayList<>();
    int atBreakpoints = 0;
    LinearProgramme programme = new LinearProgramme(network);
    for (long duration : spread(points, most)) {
      watcher.now("comparing with the linear programme, now at " + network.scale().text(duration));
      Answer answer = programme.at(duration);
      if (answer instanceof Answer.NotSolved silent) {
        unanswered.add(new CrossCheck.Unanswered(duration, silent.reason()));
      } else {
        comparisons.add(compare(network, curve, answer, duration));
        atBreakpoints += breakpoints.contains(duration) ? 1 : 0;
      }
    }
    return new CrossCheck(comparisons, atBreakpoints, points.size(), unanswered);
  }

  private static List<Long> spread(NavigableSet<Long> points, long most) {
    List<Long> all = new ArrayList<>(points.descendingSet());
    if (all.size() <= most) {
      return all;
    }
    Set<Long> chosen = new TreeSet<>(Comparator.reverseOrder());
    for (long k = 0; k < most; k++) {
      chosen.add(all.get((int) (k * (all.size() - 1) / Math.max(1, most - 1))));
    }
    return List.copyOf(chosen);
  }

  private static CrossCheck.Comparison compare(
      Network network, Curve curve, Answer answer, long duration) {
    String where = "the finish at " + network.scale().text(duration);
    if (answer instanceof Answer.Least least) {
      CrossCheck.Comparison comparison =
          new CrossCheck.Comparison(duration, curve.costAt(duration), least.cost());
      if (comparison.difference().compareTo(ROUNDING) > 0) {
        throw new ProofFailed(
            where,
            "stepping finds "
                + comparison.stepping().cents()
                + ", the linear programme "
                + comparison.linear());
      }
      return comparison;
    }
    throw new ProofFailed(where, "the linear programme finds no plan");
  }
}
