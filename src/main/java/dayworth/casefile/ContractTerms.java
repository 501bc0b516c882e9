package dayworth.casefile;

import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.PartWeek;
import dayworth.contract.Per;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.value.Money;
import java.util.Optional;

/** Makes the terms of the contract from the rows of terms.csv. */
final class ContractTerms {

  private ContractTerms() {}

  static Terms of(TermsTable terms, CaseCalendar times) {
    Optional<Due> contractFinish = terms.moment("contract_finish").map(times::due);
    return new Terms(
        times.scale(),
        times.calendar(),
        new TimeRelated(money(terms, "time_related_cost"), per(terms, "time_related_per")),
        money(terms, "fixed_cost"),
        contractFinish,
        new Damages(
            money(terms, "damages_rate"),
            per(terms, "damages_per"),
            terms.amount("damages_grace"),
            terms.number("damages_cap").map(Money::of),
            terms.partWeek().orElse(PartWeek.PRO_RATA)),
        new Bonus(
            money(terms, "bonus_rate"),
            per(terms, "bonus_per"),
            terms.number("bonus_cap").map(Money::of),
            terms.number("bonus_cap_units")),
        terms
            .moment("extension")
            .map(moment -> times.extension(moment, contractFinish.orElseThrow(), terms)));
  }

  private static Money money(TermsTable terms, String term) {
    return Money.of(terms.amount(term));
  }

  private static Per per(TermsTable terms, String term) {
    return terms.per(term).orElse(Per.UNIT);
  }
}
