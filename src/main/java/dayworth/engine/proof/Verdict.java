package dayworth.engine.proof;

import dayworth.value.Money;

/** What a check of one point comes to. */
public sealed interface Verdict {

  /**
   * The plan is possible, costs what is claimed, and no plan is cheaper.
   *
   * @param cost the exact direct cost, recounted
   * @param bound what every plan that meets the finish costs at least; equal to the cost, or less
   *     than half a cent below it where slopes had to be rounded
   */
  record Proved(Money cost, Money bound) implements Verdict {}

  /**
   * Something does not hold.
   *
   * @param where the activity, link or total that is wrong
   * @param why what was found and what would be right
   */
  record Refuted(String where, String why) implements Verdict {}
}
