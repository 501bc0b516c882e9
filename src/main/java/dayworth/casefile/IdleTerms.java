package dayworth.casefile;

import dayworth.contract.Per;
import dayworth.decision.TimeUnit;
import java.math.BigDecimal;

/** Warns of terms that change nothing beside the others. */
final class IdleTerms {

  private static final String WRONG = "changes nothing";

  private IdleTerms() {}

  static void report(ReadCase read, Findings findings) {
    TermsTable terms = read.terms();
    String units = "units_per_working_day";
    boolean isOne = terms.amount(units).compareTo(BigDecimal.ONE) == 0;
    if (terms.isGiven(units) && terms.unit() == TimeUnit.DAY && !isOne) {
      warn(terms, units, "a day is one working day; time_unit hour or shift uses it", findings);
    }
    if (terms.isGiven(units) && terms.unit() == TimeUnit.WEEK) {
      int days = terms.workingDays().size();
      String right = "a week is " + days + (days == 1 ? " working day" : " working days");
      warn(terms, units, right, findings);
    }
    boolean due = terms.isGiven("damages_rate") || terms.isGiven("bonus_rate");
    if (terms.isGiven("extension") && !due) {
      warn(terms, "extension", "neither damages nor bonus depend on the contract finish", findings);
    }
    String part = "damages_part_week";
    boolean byWeek =
        terms.per("damages_per").orElse(Per.UNIT) == Per.WEEK
            || read.sections().stream().anyMatch(section -> section.damagesPer() == Per.WEEK);
    if (terms.isGiven(part) && !byWeek) {
      warn(terms, part, "it is for damages_per week", findings);
    }
  }

  private static void warn(TermsTable terms, String term, String right, Findings findings) {
    findings.warning(terms.at(term).notice(WRONG, "", right));
  }
}
