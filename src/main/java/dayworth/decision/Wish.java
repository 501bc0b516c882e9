package dayworth.decision;

import dayworth.value.Money;
import dayworth.value.WorkingCalendar;
import java.time.LocalDate;
import java.util.OptionalLong;

/** What a plan is wanted for. */
public sealed interface Wish {

  /** The duration that is wished for, in ticks; empty where money is given. */
  default OptionalLong duration() {
    if (this instanceof ByDate by) {
      return OptionalLong.of(by.ticks());
    }
    return this instanceof In in ? OptionalLong.of(in.ticks()) : OptionalLong.empty();
  }

  /**
   * To finish by a date.
   *
   * @param ticks the end of its working day, or of the last one before it; below 0 where there is
   *     none
   */
  record ByDate(LocalDate date, long ticks) implements Wish {

    /** By a date of a calendar. */
    public static ByDate of(LocalDate date, WorkingCalendar calendar) {
      boolean tooEarly = date.isBefore(calendar.firstWorkingDay());
      return new ByDate(date, tooEarly ? -1 : calendar.endOf(date));
    }
  }

  /** To finish within so many ticks. */
  record In(long ticks) implements Wish {}

  /**
   * To finish as early as some money allows.
   *
   * @param most direct and running cost above that of the plan as it stands; at least 0
   */
  record Within(Money most) implements Wish {

    public Within {
      if (most.signum() < 0) {
        throw new IllegalArgumentException("money to spend is at least 0");
      }
    }
  }
}
