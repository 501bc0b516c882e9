package dayworth.casefile;

import dayworth.decision.Progress;
import dayworth.decision.Status;
import dayworth.value.Money;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;

/** Makes the statuses of all activities from the rows of progress.csv. */
final class CaseProgress {

  private CaseProgress() {}

  /**
   * The statuses.
   *
   * @return empty where there is no data date
   */
  static Optional<Progress> of(
      List<ActivityRow> activities, List<ProgressRow> rows, TermsTable terms, CaseCalendar times) {
    return terms.dataDate().map(date -> new Progress(date, statuses(activities, rows, times)));
  }

  private static List<Status> statuses(
      List<ActivityRow> activities, List<ProgressRow> rows, CaseCalendar times) {
    List<Status> statuses =
        new ArrayList<>(Collections.nCopies(activities.size(), new Status.NotStarted()));
    for (ProgressRow row : rows) {
      if (row.started().given()) {
        statuses.set(row.activity(), status(row, activities.get(row.activity()), times));
      }
    }
    return statuses;
  }

  private static Status status(ProgressRow row, ActivityRow whole, CaseCalendar times) {
    LocalDate started = row.started().value().orElseThrow();
    if (row.isInProgress()) {
      return new Status.InProgress(
          started,
          times.startedOn(started),
          times.scale().ticks(row.remaining().value().orElseThrow()),
          crash(row, times));
    }
    LocalDate finished = row.finished().value().orElseThrow();
    long finish = times.finishedOn(finished);
    // A milestone takes no time: both its events are at its finish. On a rest day where a working
    // day is no whole number of ticks the morning can be a tick after the evening.
    boolean takesTime = whole.normal().orElseThrow().signum() > 0;
    long start = takesTime ? Math.min(times.startedOn(started), finish) : finish;
    return new Status.Finished(started, finished, start, finish);
  }

  private static Optional<Status.Crash> crash(ProgressRow row, CaseCalendar times) {
    return row.crash()
        .value()
        .map(
            shortest ->
                new Status.Crash(
                    times.scale().ticks(shortest),
                    Money.of(row.crashCost().value().orElseThrow())));
  }
}
