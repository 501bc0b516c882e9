package dayworth.casefile;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;

/**
 * What the dates of a status must be beside each other. Rest days are allowed: work on them began
 * with the next working day, or was done with the last one.
 */
final class ProgressDates {

  private static final String DATA_DATE = "data_date";

  private final TermsTable terms;
  private final Findings findings;

  private ProgressDates(TermsTable terms, Findings findings) {
    this.terms = terms;
    this.findings = findings;
  }

  /**
   * Reports dates that cannot be.
   *
   * @param isThere whether there is a progress.csv
   */
  static void check(List<ProgressRow> rows, boolean isThere, TermsTable terms, Findings findings) {
    ProgressDates dates = new ProgressDates(terms, findings);
    dates.checkDataDate(isThere);
    rows.forEach(dates::check);
  }

  private void checkDataDate(boolean isThere) {
    if (isThere && !terms.isGiven(DATA_DATE)) {
      String right = "a row for data_date in " + TermsTable.FILE + ": the day of the status";
      findings.problem(Place.whole(ProgressTable.FILE).notice("needs a data_date", "", right));
    }
    if (!isThere && terms.dataDate().isPresent()) {
      String right = "a " + ProgressTable.FILE + ", if work has started";
      findings.warning(terms.at(DATA_DATE).notice("nothing counts as started", "", right));
    }
    terms
        .dataDate()
        .ifPresent(date -> checkNotBeforeStart(terms.at(DATA_DATE), date, date.toString()));
  }

  private void check(ProgressRow row) {
    Optional<LocalDate> started = row.started().value();
    Optional<LocalDate> finished = row.finished().value();
    if (row.finished().given() && !row.started().given()) {
      findings.problem(
          row.place(ProgressTable.STARTED)
              .notice("blank beside a finished date", "", "the date on which it started"));
    }
    started.ifPresent(
        date -> {
          checkNotAfterStatus(row, ProgressTable.STARTED, date);
          checkNotBeforeStart(row.place(ProgressTable.STARTED), date, date.toString());
        });
    finished.ifPresent(date -> checkNotAfterStatus(row, ProgressTable.FINISHED, date));
    if (started.isPresent() && finished.isPresent() && finished.get().isBefore(started.get())) {
      findings.problem(
          row.place(ProgressTable.FINISHED)
              .notice(
                  "finished before it started",
                  finished.get().toString(),
                  "on " + started.get() + " or later"));
    }
  }

  private void checkNotAfterStatus(ProgressRow row, String column, LocalDate date) {
    terms
        .dataDate()
        .filter(date::isAfter)
        .ifPresent(
            status ->
                findings.problem(
                    row.place(column)
                        .notice(
                            "after the data_date",
                            date.toString(),
                            "on " + status + " or before; blank if it is still to come")));
  }

  private void checkNotBeforeStart(Place place, LocalDate date, String found) {
    terms
        .startDate()
        .filter(date::isBefore)
        .ifPresent(
            start ->
                findings.problem(
                    place.notice(
                        "before the start_date",
                        found,
                        "on " + start + ", the start_date, or later")));
  }
}
