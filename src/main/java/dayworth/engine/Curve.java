package dayworth.engine;

import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.List;

/**
 * The exact least direct cost for every project duration: convex and piecewise linear, from the
 * shortest finish at which the cost is least to the shortest finish that is possible.
 *
 * @param network what the curve is of
 * @param longest the first breakpoint's duration, ticks
 * @param firstPlan the cheapest plan of all that changes least from all normal
 * @param firstCost its exact direct cost
 * @param steps one for each piece, from long to short; empty if nothing can be bought
 * @param obstacles the chain that stops the project from being shorter than the last breakpoint
 */
public record Curve(
    Network network,
    long longest,
    Plan firstPlan,
    Money firstCost,
    List<Step> steps,
    List<Obstacle> obstacles) {

  public Curve {
    steps = List.copyOf(steps);
    obstacles = List.copyOf(obstacles);
  }

  public long shortest() {
    return steps.isEmpty() ? longest : steps.get(steps.size() - 1).to();
  }

  /**
   * The least direct cost of finishing within {@code duration} ticks.
   *
   * @throws IllegalArgumentException if it is shorter than {@link #shortest}
   */
  public Money costAt(long duration) {
    Money cost = firstCost;
    for (Step step : steps) {
      if (duration >= step.from()) {
        return cost;
      }
      if (duration >= step.to()) {
        return cost.plus(step.pricePerTick().times(step.from() - duration));
      }
      cost = cost.plus(step.extra());
    }
    if (duration < shortest()) {
      throw new IllegalArgumentException("the project cannot finish within " + duration + " ticks");
    }
    return cost;
  }

  /** The plan at the breakpoint where {@code stepsTaken} steps have been taken. */
  public Plan planAfter(int stepsTaken) {
    long[] durations = firstPlan.toArray();
    for (Step step : steps.subList(0, stepsTaken)) {
      for (Change change : step.changes()) {
        durations[change.activity()] -= change.shortened();
      }
    }
    return Plan.of(durations);
  }
}
