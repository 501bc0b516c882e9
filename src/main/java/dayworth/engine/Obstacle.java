package dayworth.engine;

/**
 * One term of the chain that cannot be made shorter; the terms of a chain add up to the shortest
 * finish.
 */
public sealed interface Obstacle {

  /** Ticks that this term adds to the chain; negative where the chain runs backwards. */
  long ticks();

  /** An activity that is passed forwards and stands at its shortest duration. */
  record AtShortest(int activity, long ticks) implements Obstacle {}

  /**
   * An activity that the chain passes backwards, from its finish to its start: it stands at its
   * normal duration, cannot be longer, and is subtracted.
   */
  record CannotBeLonger(int activity, long ticks) implements Obstacle {}

  /** The lag of a link. */
  record Lag(int link, long ticks) implements Obstacle {}

  /** The chain begins with an activity that may not start earlier. */
  record NotBefore(int activity, long ticks) implements Obstacle {}

  /** The chain begins with an activity that may not finish earlier. */
  record NotFinishedBefore(int activity, long ticks) implements Obstacle {}
}
