package dayworth.engine.proof;

import dayworth.value.Money;
import java.util.Optional;

/**
 * One arc of a proof: "event {@code to} comes at least {@code length} after event {@code from}".
 *
 * @param over what it stands for
 * @param index of the activity, the link or the span; -1 for the price of time
 * @param length ticks
 * @param flow units of the flow's slope scale
 * @param capacity the most that may flow, money per tick; empty where there is no limit
 */
public record Arc(
    Event from, Event to, Over over, int index, long length, long flow, Optional<Money> capacity) {

  /** What an arc stands for. */
  public enum Over {
    /** An activity at its normal duration: each tick less costs its slope. */
    SLOPE,
    /** An activity that cannot be shorter than its crash duration. */
    CRASH,
    /** An activity that cannot be longer than its normal duration. */
    BACK_OVER_NORMAL,
    /** An activity whose crash is cheaper: each tick above it costs the slope. */
    BACK_OVER_CRASH,
    /** An activity's start, from the project's start on. */
    FROM_PROJECT,
    /** An activity's finish, from the project's start on. */
    FROM_PROJECT_TO_FINISH,
    /** The project's finish, from an activity's finish on. */
    TO_PROJECT,
    /** A link and its lag. */
    LINK,
    /** A running cost, back from its later moment to its earlier one. */
    SPAN,
    /** Back from the project's finish to its start: the duration that is promised. */
    PROMISE;

    boolean isOfActivity() {
      return this != LINK && this != SPAN && this != PROMISE;
    }
  }

  /**
   * The start or the finish of an activity, or of the project.
   *
   * @param activity -1 for the project
   */
  public record Event(int activity, boolean isFinish) {

    static final Event PROJECT_START = new Event(-1, false);
    static final Event PROJECT_FINISH = new Event(-1, true);

    /** A number of its own: the project's are 0 and 1. */
    int number() {
      return 2 * (activity + 1) + (isFinish ? 1 : 0);
    }
  }
}
