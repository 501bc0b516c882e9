package dayworth.engine.linear;

import java.math.BigDecimal;

/** What the linear programme says of one deadline. */
public sealed interface Answer {

  /**
   * The least cost: direct cost and spans.
   *
   * @param cost counted exactly from a plan that meets the deadline, rounded to cents
   */
  record Least(BigDecimal cost) implements Answer {}

  /** No plan finishes by the deadline. */
  record Infeasible() implements Answer {}

  /**
   * No answer that can be relied on.
   *
   * @param reason for people
   */
  record NotSolved(String reason) implements Answer {}
}
