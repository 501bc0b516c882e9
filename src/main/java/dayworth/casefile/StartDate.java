package dayworth.casefile;

import java.time.DayOfWeek;
import java.time.LocalDate;
import java.util.Set;

/** Warns of a start_date that is a rest day, and that dates do not appear in results yet. */
final class StartDate {

  private static final String TERM = "start_date";

  private StartDate() {}

  static void report(ReadCase read, Findings findings) {
    TermsTable terms = read.terms();
    if (terms.startDate().isEmpty() || terms.place(TERM).isEmpty()) {
      return;
    }
    Place place = terms.place(TERM).get();
    LocalDate start = terms.startDate().get();
    findings.warning(place.notice("dates change nothing yet", "", "results are in time units"));
    Set<DayOfWeek> worked = terms.workingDays();
    if (!worked.contains(start.getDayOfWeek())) {
      LocalDate first = start;
      while (!worked.contains(first.getDayOfWeek())) {
        first = first.plusDays(1);
      }
      String right = "work begins on " + named(first);
      findings.warning(place.notice("a rest day", named(start), right));
    }
  }

  private static String named(LocalDate date) {
    return WorkingDays.name(date.getDayOfWeek()) + " " + date;
  }
}
