package dayworth.engine;

import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.value.Money;
import java.util.List;

/**
 * The exact least cost (direct cost and spans) for every project duration: convex and piecewise
 * linear, from the shortest finish at which the cost is least to the shortest finish that is
 * possible.
 *
 * @param network what the curve is of
 * @param longest the first breakpoint's duration, ticks
 * @param firstPlan the cheapest plan of all that changes least from all normal
 * @param firstCost its exact cost
 * @param steps one for each piece, from long to short; empty if nothing can be bought
 * @param obstacles the chain that stops the project from being shorter than the last breakpoint
 * @param scheduled where the network has spans the plan of each breakpoint with its starts; empty
 *     where it has none
 */
public record Curve(
    Network network,
    long longest,
    Plan firstPlan,
    Money firstCost,
    List<Step> steps,
    List<Obstacle> obstacles,
    List<Plan> scheduled) {

  public Curve {
    steps = List.copyOf(steps);
    obstacles = List.copyOf(obstacles);
    scheduled = List.copyOf(scheduled);
  }

  /** A curve of a network without spans. */
  public Curve(
      Network network,
      long longest,
      Plan firstPlan,
      Money firstCost,
      List<Step> steps,
      List<Obstacle> obstacles) {
    this(network, longest, firstPlan, firstCost, steps, obstacles, List.of());
  }

  public long shortest() {
    return steps.isEmpty() ? longest : steps.get(steps.size() - 1).to();
  }

  /**
   * The least cost of finishing within {@code duration} ticks.
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

  /**
   * What a span costs at the finish {@code duration}, exactly: along a piece every part of the cost
   * is straight, as each is convex and their sum is straight.
   */
  public Money spanCostAt(long duration, Span span) {
    int k = 0;
    while (k < steps.size() && steps.get(k).to() > duration) {
      k++;
    }
    long from = scheduled.get(k).charged(span);
    if (k == steps.size() || duration >= steps.get(k).from()) {
      return span.rate().times(from);
    }
    Step step = steps.get(k);
    long change = scheduled.get(k + 1).charged(span) - from;
    return span.rate()
        .times(from)
        .plus(span.rate().times(change).times(step.from() - duration).dividedBy(step.ticks()));
  }

  /** The plan at the breakpoint where {@code stepsTaken} steps have been taken. */
  public Plan planAfter(int stepsTaken) {
    if (!scheduled.isEmpty()) {
      return scheduled.get(stepsTaken);
    }
    long[] durations = firstPlan.toArray();
    for (Step step : steps.subList(0, stepsTaken)) {
      for (Change change : step.changes()) {
        durations[change.activity()] -= change.shortened();
      }
    }
    return Plan.of(durations);
  }
}
