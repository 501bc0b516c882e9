package dayworth.decision;

import dayworth.value.Money;
import java.time.LocalDate;
import java.util.Optional;

/**
 * How far an activity is at the end of the data date. Ticks count working time from then on, so
 * that what has happened lies at 0 or before.
 */
public sealed interface Status {

  /** It has not started. */
  record NotStarted() implements Status {}

  /**
   * It has started and is not finished.
   *
   * @param since the date on which it started
   * @param start the same in ticks, 0 or below
   * @param remaining how long the rest takes the normal way, ticks
   * @param crash how fast the rest can be done; empty where it can be compressed in the same
   *     proportion and at the same slope as the whole
   */
  record InProgress(LocalDate since, long start, long remaining, Optional<Crash> crash)
      implements Status {

    public InProgress {
      if (start > 0
          || remaining < 0
          || crash.filter(rest -> rest.duration() > remaining).isPresent()) {
        throw new IllegalArgumentException("started at 0 or before, and crash <= remaining");
      }
    }
  }

  /**
   * It is done.
   *
   * @param from the date on which it started
   * @param to the date on which it finished
   * @param start the first in ticks, 0 or below
   * @param finish the second in ticks, from {@code start} to 0
   */
  record Finished(LocalDate from, LocalDate to, long start, long finish) implements Status {

    public Finished {
      if (start > finish || finish > 0) {
        throw new IllegalArgumentException("finished at 0 or before, and not before its start");
      }
    }
  }

  /**
   * The fastest way to do the rest of an activity.
   *
   * @param duration ticks
   * @param cost of the rest done so
   */
  record Crash(long duration, Money cost) {}

  /** The date on which it started; empty where it has not. */
  default Optional<LocalDate> started() {
    if (this instanceof InProgress progress) {
      return Optional.of(progress.since());
    }
    return this instanceof Finished done ? Optional.of(done.from()) : Optional.empty();
  }

  default boolean isFinished() {
    return this instanceof Finished;
  }

  default boolean isInProgress() {
    return this instanceof InProgress;
  }
}
