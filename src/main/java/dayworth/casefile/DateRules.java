package dayworth.casefile;

import dayworth.contract.Per;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;

/** What needs a start_date, and what may not come before it. */
final class DateRules {

  private static final String START = "start_date";

  private final TermsTable terms;
  private final Findings findings;

  private DateRules(TermsTable terms, Findings findings) {
    this.terms = terms;
    this.findings = findings;
  }

  /** Reports what lacks a start_date, and warns of holidays that do. */
  static void check(
      List<ActivityRow> activities, List<LocalDate> holidays, TermsTable terms, Findings findings) {
    DateRules rules = new DateRules(terms, findings);
    List.of("time_related_per", "damages_per", "bonus_per").forEach(rules::checkPer);
    rules.checkContractFinish();
    rules.checkExtension();
    activities.forEach(rules::checkNotBefore);
    if (!holidays.isEmpty() && !terms.isGiven(START)) {
      String right = "a row for " + START + " in " + TermsTable.FILE;
      findings.warning(Place.whole(HolidayTable.FILE).notice("changes nothing", "", right));
    }
  }

  private void checkPer(String term) {
    terms
        .per(term)
        .filter(per -> per.isByDate() && !terms.isGiven(START))
        .ifPresent(per -> report(terms.at(term), word(per) + " needs dates", word(per), "or unit"));
  }

  private static String word(Per per) {
    return per == Per.WEEK ? "week" : "calendar_day";
  }

  private void checkContractFinish() {
    Optional<LocalDate> date = terms.moment("contract_finish").flatMap(Moment::date);
    Optional<LocalDate> start = terms.startDate();
    if (date.isPresent() && !terms.isGiven(START)) {
      reportDate(terms.at("contract_finish"), date.get());
    } else if (date.isPresent() && start.isPresent() && date.get().isBefore(start.get())) {
      findings.problem(
          terms
              .at("contract_finish")
              .notice(
                  "before the start_date",
                  date.get().toString(),
                  "on " + start.get() + ", the start_date, or later"));
    }
  }

  private void checkExtension() {
    Optional<Moment> extension = terms.moment("extension");
    extension
        .flatMap(Moment::date)
        .filter(date -> !terms.isGiven(START))
        .ifPresent(date -> reportDate(terms.at("extension"), date, "working days"));
    extension
        .flatMap(Moment::units)
        .filter(days -> days.signum() == 0 || days.stripTrailingZeros().scale() > 0)
        .ifPresent(
            days ->
                findings.problem(
                    terms
                        .at("extension")
                        .notice(
                            "not a whole number of working days",
                            days.toPlainString(),
                            "1 or more, or a date")));
  }

  private void checkNotBefore(ActivityRow row) {
    row.notBefore()
        .flatMap(Moment::date)
        .filter(date -> !terms.isGiven(START))
        .ifPresent(
            date -> reportDate(new Place(ActivityTable.FILE, row.line(), "not_before"), date));
  }

  private void reportDate(Place place, LocalDate date) {
    reportDate(place, date, "time units");
  }

  private void reportDate(Place place, LocalDate date, String counted) {
    report(place, "a date needs a start_date", date.toString(), "or a number of " + counted);
  }

  private void report(Place place, String wrong, String found, String other) {
    String right = "a row for " + START + " in " + TermsTable.FILE + ", " + other;
    findings.problem(place.notice(wrong, found, right));
  }
}
