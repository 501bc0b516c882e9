package dayworth.decision;

import dayworth.engine.Curve;
import dayworth.engine.Step;
import dayworth.engine.linear.Answer;
import dayworth.engine.linear.LinearProgramme;
import dayworth.network.Network;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
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
    for (long duration : spread(List.copyOf(points.descendingSet()), most)) {
      watcher.now("comparing with the linear programme, now at " + network.scale().text(duration));
      Answer answer = programme.at(duration);
      if (answer instanceof Answer.NotSolved silent) {
        unanswered.add(new CrossCheck.Unanswered(duration, silent.reason()));
      } else {
        comparisons.add(compare(network, curve.costAt(duration), answer, duration));
        atBreakpoints += breakpoints.contains(duration) ? 1 : 0;
      }
    }
    return new CrossCheck(comparisons, atBreakpoints, points.size(), unanswered);
  }

  /** At most so many of the items, from first to last. */
  static <T> List<T> spread(List<T> all, long most) {
    if (all.size() <= most) {
      return all;
    }
    Set<Integer> chosen = new TreeSet<>();
    for (long k = 0; k < most; k++) {
      chosen.add((int) (k * (all.size() - 1) / Math.max(1, most - 1)));
    }
    return chosen.stream().map(all::get).toList();
  }

  /**
   * One deadline, both ways.
   *
   * @throws ProofFailed if they differ by more than rounding
   */
  static CrossCheck.Comparison compare(
      Network network, Money stepping, Answer answer, long duration) {
    String where = "the finish at " + network.scale().text(duration);
    if (answer instanceof Answer.Least least) {
      CrossCheck.Comparison comparison =
          new CrossCheck.Comparison(duration, stepping, least.cost());
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
