package dayworth.decision;

import dayworth.engine.Change;
import dayworth.engine.Step;
import dayworth.network.Plan;
import java.math.BigInteger;
import java.util.List;

/**
 * Why a step of the curve costs what it costs: the chains that hold the finish where it begins.
 *
 * @param facts the step
 * @param before the plan at its longer end
 * @param after the plan at its shorter end
 * @param chains some of the critical chains there, those first that pass what the step changes
 * @param chainCount how many there are; exact
 */
public record StepReason(
    StepFacts facts, Plan before, Plan after, List<List<Integer>> chains, BigInteger chainCount) {

  public StepReason {
    chains = List.copyOf(chains);
  }

  public Step step() {
    return facts.step();
  }

  /** What is shortened. */
  public List<Change> shortened() {
    return step().changes().stream().filter(change -> !change.isRelaxation()).toList();
  }

  /** What is given back. */
  public List<Change> givenBack() {
    return step().changes().stream().filter(Change::isRelaxation).toList();
  }

  /** Whether all chains are listed. */
  public boolean hasAllChains() {
    return chainCount.equals(BigInteger.valueOf(chains.size()));
  }
}
