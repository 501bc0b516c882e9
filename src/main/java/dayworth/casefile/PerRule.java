package dayworth.casefile;

import dayworth.contract.Per;

/** Money by the date needs dates. */
final class PerRule {

  private PerRule() {}

  /** What a rate is per, a unit if nothing is said; without dates the rest is reported. */
  static Per check(Place place, Cell<Per> cell, TermsTable terms, Findings findings) {
    Per per = cell.value().orElse(Per.UNIT);
    if (per.isByDate() && !terms.isGiven("start_date")) {
      String right = "a row for start_date in " + TermsTable.FILE + ", or unit";
      findings.problem(place.notice(cell.text() + " needs dates", cell.text(), right));
    }
    return per;
  }
}
