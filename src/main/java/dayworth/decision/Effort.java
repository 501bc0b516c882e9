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

  private static final long MOST_PER_FINISH = 10_000;

  /** A relaxation takes about as long as the square of the number of activities. */
  private static final long NODES_TIMES_SQUARE = 1_000_000_000;

  /**
   * Relaxations for all finishes of a case together.
   *
   * @param finishes how many there are
   */
  long nodesFor(Case of, int finishes) {
    if (nodes.isPresent()) {
      return Math.multiplyExact(nodes.getAsLong(), finishes);
    }
    long size = Math.max(1, of.network().size());
    long usual = NODES_TIMES_SQUARE / (size * size);
    return Math.max(finishes, Math.min(MOST_PER_FINISH * finishes, usual));
  }
}
