package dayworth.decision;

import dayworth.engine.Flow;
import dayworth.engine.proof.ProofSheet;
import dayworth.network.Network;
import java.math.BigDecimal;
import java.util.List;

/**
 * What proves a plan, for a spreadsheet: one block where all money is convex; otherwise a block for
 * the plan's cost and one for each final branch, whose bounds are none of them below it.
 *
 * @param flow what the one block is written from; empty where there are branches
 */
public record PlanProof(List<Block> blocks, List<Flow.Entry> flow) {

  public PlanProof {
    blocks = List.copyOf(blocks);
    flow = List.copyOf(flow);
  }

  /**
   * Rows that belong together.
   *
   * @param branch 1 where there is only one; "plan" for the cost of the plan beside branches
   * @param network what the rows' arcs are of
   */
  public record Block(String branch, Network network, ProofSheet sheet) {}

  /** What the plan costs. */
  public BigDecimal planCost() {
    return blocks.get(0).sheet().planCost();
  }

  /** What no plan costs less than: the least bound of any branch. */
  public BigDecimal bound() {
    return branches().stream()
        .map(block -> block.sheet().bound())
        .min(BigDecimal::compareTo)
        .orElseThrow();
  }

  /** How many branches were needed. */
  public int branchCount() {
    return branches().size();
  }

  /** The most that was lost by writing decimals in any branch. */
  public BigDecimal rounding() {
    return branches().stream()
        .map(block -> block.sheet().rounding())
        .reduce(BigDecimal.ZERO, BigDecimal::max);
  }

  private List<Block> branches() {
    return blocks.size() == 1 ? blocks : blocks.subList(1, blocks.size());
  }
}
