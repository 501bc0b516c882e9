package dayworth.engine.linear;

import java.math.BigDecimal;

/** What the linear programme says of one deadline. */
public sealed interface Answer {

  /**
   * The least direct cost.
   *
   * @param directCost counted exactly from a plan that meets the deadline, rounded to cents
   */
  record Least(BigDecimal directCost) implements Answer {}

  /** No plan finishes by the deadline. */
  record Infeasible() implements Answer {}

  /**
   * No answer that can be relied on.
   *
   * @param reason for people
   */
  record NotSolved(String reason) implements Answer {}
}
