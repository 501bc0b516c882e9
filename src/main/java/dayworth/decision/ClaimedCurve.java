package dayworth.decision;

import dayworth.engine.Change;
import dayworth.engine.Flow;
import dayworth.engine.Obstacle;
import dayworth.network.Plan;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;

/**
 * What a result claims and all else in it follows from. Every time is in ticks.
 *
 * @param longest the first breakpoint
 * @param rows how many finishes it tells of
 * @param steps from long to short
 * @param breakpoints the plans of all breakpoints where money hangs on starts, else of the first
 * @param obstacles the chain that makes the shortest finish the shortest
 * @param slopeUnits how many units of flow make one money unit per tick
 * @param flows for each piece; empty if the result carries none
 * @param plans by their finish
 * @param asPlanned with its starts where money hangs on them
 * @param crashEverything likewise
 * @param asked the finish of the plan asked for
 * @param unproved taken as it is
 * @param isCut likewise
 * @param crossCheck what the linear programme is said to have found
 */
public record ClaimedCurve(
    long longest,
    int rows,
    List<ClaimedStep> steps,
    List<Plan> breakpoints,
    List<Obstacle> obstacles,
    long slopeUnits,
    Optional<List<List<Flow.Entry>>> flows,
    SortedMap<Long, Plan> plans,
    Plan asPlanned,
    Plan crashEverything,
    long asked,
    List<Unproved> unproved,
    boolean isCut,
    CrossCheck crossCheck) {

  /** A step without its price. */
  public record ClaimedStep(long from, long to, List<Change> changes) {}
}
