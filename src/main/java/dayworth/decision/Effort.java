package dayworth.decision;

import java.util.OptionalLong;
import java.util.function.BooleanSupplier;

/**
 * How long to look for proofs where choices or money are not convex.
 *
 * @param nodes relaxations that are solved for each finish on average before the rest is left with
 *     a gap; empty for the usual number
 * @param isOver whether to stop before that; asked of somebody who has a clock
 */
public record Effort(OptionalLong nodes, BooleanSupplier isOver) {

  /** Counted in nodes alone, so that results are the same on every machine. */
  public static final Effort USUAL = new Effort(OptionalLong.empty(), () -> false);

  private static final long MOST = 10_000;
  private static final long LEAST = 20;

  /** A relaxation takes about as long as the square of the number of activities. */
  private static final long NODES_TIMES_SQUARE = 20_000_000;

  /** Relaxations for each finish of a case. */
  long nodesFor(Case of) {
    long size = Math.max(1, of.network().size());
    return nodes.orElse(Math.max(LEAST, Math.min(MOST, NODES_TIMES_SQUARE / (size * size))));
  }
}
