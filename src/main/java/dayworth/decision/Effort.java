package dayworth.decision;

import java.util.function.BooleanSupplier;

/**
 * How long to look for proofs where choices or money are not convex.
 *
 * @param nodesPerFinish relaxations that are solved for each finish on average, before the rest is
 *     left with a gap
 * @param isOver whether to stop before that; always asked of somebody who has a clock
 */
public record Effort(long nodesPerFinish, BooleanSupplier isOver) {

  /** Counted in nodes alone, so that results are the same on every machine. */
  public static final Effort USUAL = new Effort(5_000, () -> false);
}
