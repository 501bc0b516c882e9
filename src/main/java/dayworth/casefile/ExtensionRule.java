package dayworth.casefile;

import dayworth.contract.Due;
import java.time.LocalDate;
import java.util.Optional;

/** An extension of time leads to a later contract finish, within the years that dates have. */
final class ExtensionRule {

  private ExtensionRule() {}

  static void check(Due due, TermsTable terms, CaseCalendar times, Findings findings) {
    Optional<Moment> extension = terms.moment("extension");
    Optional<LocalDate> date = extension.flatMap(Moment::date);
    if (date.isPresent() && !date.get().isAfter(due.date().orElseThrow())) {
      findings.problem(
          terms
              .at("extension")
              .notice(
                  "not after the contract finish",
                  date.get().toString(),
                  "a date after " + due.date().orElseThrow()));
    } else if (extension
        .filter(moment -> times.isBeyondDates(times.extension(moment, due, terms).due().ticks()))
        .isPresent()) {
      findings.problem(
          terms.at("extension").notice("after the year 9999", "", "a shorter extension"));
    }
  }
}
