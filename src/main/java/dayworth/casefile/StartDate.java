package dayworth.casefile;

import dayworth.value.WorkingCalendar;
import java.time.LocalDate;

/** Warns of a start_date that is a rest day or a holiday. */
final class StartDate {

  private StartDate() {}

  static void report(ReadCase read, Findings findings) {
    read.calendar().ifPresent(calendar -> report(calendar, read.terms(), findings));
  }

  private static void report(WorkingCalendar calendar, TermsTable terms, Findings findings) {
    LocalDate start = calendar.startDate();
    if (!calendar.isWorked(start)) {
      String wrong =
          calendar.weekdays().contains(start.getDayOfWeek()) ? "a holiday" : "a rest day";
      String right = "work begins on " + WorkingDays.named(calendar.firstWorkingDay());
      findings.warning(terms.at("start_date").notice(wrong, WorkingDays.named(start), right));
    }
  }
}
