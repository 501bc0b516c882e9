package dayworth.decision;

/**
 * A finish that may be chosen, and what it is chosen for.
 *
 * @param finish what it costs
 */
public record Choice(Kind kind, Finish finish) {

  /** What a finish is chosen for. */
  public enum Kind {
    /** Every activity its normal way, and whatever damages follow. */
    AS_IT_STANDS,
    /** The longest of the least total. */
    LEAST_TOTAL,
    /** The contract finish, where it can be met and is not met as planned. */
    CONTRACT_FINISH,
    /** The longest finish with the most bonus. */
    MOST_BONUS,
    /** The shortest that is possible. */
    SHORTEST
  }
}
