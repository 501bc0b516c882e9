package dayworth.contract;

import dayworth.engine.branching.Charge;
import dayworth.engine.branching.Window;
import dayworth.network.Moment;
import dayworth.value.Money;
import dayworth.value.WorkingCalendar;
import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.stream.LongStream;

/**
 * A running cost by calendar days or begun weeks: both dates count, that on which the first moment
 * begins and that on which the second is over.
 *
 * <p>Hire that runs already counts from the day after the data date, worked or not, and hangs on
 * its end alone. Where the first date is not yet settled a begun week costs at least its share for
 * each day, and that is money for each date by itself; where it is settled the money hangs on the
 * second alone.
 */
final class Hire implements Charge {

  private static final int DAYS_PER_WEEK = 7;

  private final RunningCost cost;
  private final WorkingCalendar calendar;

  Hire(RunningCost cost, WorkingCalendar calendar) {
    this.cost = cost;
    this.calendar = calendar;
  }

  @Override
  public String name() {
    return cost.name();
  }

  @Override
  public List<Moment> moments() {
    return hasBegun() ? List.of(cost.to()) : List.of(cost.from(), cost.to());
  }

  private boolean hasBegun() {
    return cost.from().isProjectStart();
  }

  @Override
  public boolean rises(int k) {
    return k == moments().size() - 1;
  }

  /**
   * The first date changes with the morning of a day, the second after its end. They are the same
   * tick where a working day is a whole number of ticks.
   */
  @Override
  public long[] points(int k, Window window) {
    LongStream inside =
        calendar.endsOfDays(window.least(), window.most()).stream()
            .mapToLong(end -> rises(k) ? end : nextMorning(end))
            .filter(time -> window.least() < time && time < window.most());
    return LongStream.concat(
            LongStream.of(window.least()), LongStream.concat(inside, LongStream.of(window.most())))
        .distinct()
        .toArray();
  }

  private long nextMorning(long endOfDay) {
    return calendar.morningOf(calendar.finishDate(endOfDay).plusDays(1));
  }

  @Override
  public Money at(long[] times) {
    return hasBegun() ? begunUntil(times[0]) : forDays(days(first(times[0]), last(times[1])));
  }

  private Money begunUntil(long time) {
    return forDays(calendar.calendarDaysTo(last(time)));
  }

  @Override
  public List<Part> within(List<Window> windows) {
    if (hasBegun()) {
      return List.of(this::begunUntil);
    }
    LocalDate first = first(windows.get(0).least());
    if (first.equals(first(windows.get(0).most()))) {
      return List.of(time -> Money.ZERO, time -> forDays(days(first, last(time))));
    }
    Money perDay = cost.per() == Per.WEEK ? cost.rate().dividedBy(DAYS_PER_WEEK) : cost.rate();
    return List.of(
        time -> perDay.times(ChronoUnit.DAYS.between(first(time), first)),
        time -> perDay.times(days(first, last(time))));
  }

  /** Both counted; zero or below where the last day is before the first. */
  private static long days(LocalDate first, LocalDate last) {
    return ChronoUnit.DAYS.between(first, last) + 1;
  }

  private Money forDays(long counted) {
    long days = Math.max(0, counted);
    long begunWeeks = (days + DAYS_PER_WEEK - 1) / DAYS_PER_WEEK;
    return cost.rate().times(cost.per() == Per.WEEK ? begunWeeks : days);
  }

  private LocalDate first(long time) {
    return calendar.startDate(time);
  }

  private LocalDate last(long time) {
    return calendar.finishDate(time);
  }
}
