package dayworth.decision;

/**
 * A finish that may be chosen, and what it is chosen for.
 *
 * @param finish what it costs
 * @param section the name of the section that is on time; empty for other kinds
 */
public record Choice(Kind kind, Finish finish, String section) {

  /** A choice of the project as a whole. */
  public Choice(Kind kind, Finish finish) {
    this(kind, finish, "");
  }

  /** What a finish is chosen for. */
  public enum Kind {
    /** Every activity its normal way, and whatever damages follow. */
    AS_IT_STANDS,
    /** The longest of the least total. */
    LEAST_TOTAL,
    /** The contract finish, where it can be met and is not met as planned. */
    CONTRACT_FINISH,
    /** The cheapest in all with a section on time that the least total leaves late. */
    SECTION_DATE,
    /** The longest finish with the most bonus. */
    MOST_BONUS,
    /** The shortest that is possible. */
    SHORTEST
  }
}
