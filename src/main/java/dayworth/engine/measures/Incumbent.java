package dayworth.engine.measures;

import dayworth.network.Plan;
import java.math.BigInteger;

/** The best plan that is known of a finish. */
public interface Incumbent {

  /** From which bound on, in scaled units, a share of the plans can hold no better one. */
  BigInteger closedFrom();

  /**
   * Offers a plan.
   *
   * @param plan says when activities start where money hangs on that; whether it keeps the finish
   *     is to be looked at
   */
  void offer(Plan plan);
}
