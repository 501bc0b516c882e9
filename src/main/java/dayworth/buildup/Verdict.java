package dayworth.buildup;

/** Whether a way to do an activity is worth offering. */
public sealed interface Verdict {

  /** No other way is at least as quick and as cheap. */
  record Measure() implements Verdict {}

  /**
   * Another way is at least as quick and at least as cheap.
   *
   * @param by its name
   */
  record Dominated(String by) implements Verdict {}

  /** It is cheaper than the normal way, and takes longer: it buys no time. */
  record Slower() implements Verdict {}

  default boolean isMeasure() {
    return this instanceof Measure;
  }
}
