package dayworth.decision;

import dayworth.engine.Flow;
import dayworth.network.Plan;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * What somebody else needs to recheck a curve without computing it.
 *
 * @param slopeUnits how many units of flow make one money unit per tick
 * @param flows for each piece of the curve the flow that proves it, the first one of the longest
 *     finish; empty if they have more than {@link #MOST_ENTRIES} entries, or where money is not
 *     convex
 * @param relaxations how many convex problems were solved by branching: as many are enough to
 *     search once more for a cheaper plan
 * @param plans the plans that were counted, by their finish in ticks: the first, the one asked for
 *     and, where money hangs on when activities start, that of every row
 * @param asPlanned every activity its normal way, with its starts where money hangs on them
 * @param crashEverything every activity at its shortest, likewise
 */
public record Evidence(
    long slopeUnits,
    Optional<List<List<Flow.Entry>>> flows,
    long relaxations,
    SortedMap<Long, Plan> plans,
    Plan asPlanned,
    Plan crashEverything) {

  /** So many entries the flows may have together: some megabytes of text. */
  public static final int MOST_ENTRIES = 200_000;

  /** Where more were solved a result is not searched once more. */
  public static final long MOST_RELAXATIONS = 2_000_000;

  public Evidence {
    plans = Collections.unmodifiableSortedMap(new TreeMap<>(plans));
  }
}
