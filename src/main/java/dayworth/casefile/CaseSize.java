package dayworth.casefile;

import dayworth.contract.MomentMoney;
import dayworth.engine.branching.ChargedMoney;
import dayworth.engine.measures.WaySearch;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.util.List;

/** Reports amounts that are too large to be exact, and times beyond what dates can say. */
final class CaseSize {

  private static final String TOO_FAR_APART = "the costs are too far apart to be exact";

  /** No question looks further than so many times the finish of the work as planned. */
  private static final long TIMES_AS_PLANNED = 4;

  private final TermsTable terms;
  private final CaseCalendar times;
  private final Findings findings;

  private CaseSize(TermsTable terms, CaseCalendar times, Findings findings) {
    this.terms = terms;
    this.times = times;
    this.findings = findings;
  }

  static void check(
      Network network,
      MomentMoney money,
      TermsTable terms,
      CaseCalendar times,
      List<SectionRow> sections,
      Findings findings) {
    CaseSize size = new CaseSize(terms, times, findings);
    long asPlanned = Timing.earliest(network, Plan.allNormal(network)).finish();
    size.checkAmounts(network, money, asPlanned);
    size.checkDates(asPlanned);
    sections.forEach(size::checkDue);
  }

  private void checkAmounts(Network network, MomentMoney money, long asPlanned) {
    if (Stepping.scaleFor(network).isEmpty()) {
      tooFarApart(ActivityTable.FILE, "smaller or rounder costs");
      return;
    }
    Network priced = network.withSpans(money.spans());
    if (!WaySearch.fits(priced)) {
      tooFarApart(MeasureTable.FILE, "smaller or rounder costs");
      return;
    }
    if (!ChargedMoney.fits(priced, money.charges(), TIMES_AS_PLANNED * asPlanned)) {
      String file = money.running().isEmpty() ? SectionTable.FILE : RunningTable.FILE;
      tooFarApart(file, "smaller or rounder rates and costs");
    }
  }

  private void tooFarApart(String file, String right) {
    findings.problem(Place.whole(file).notice(TOO_FAR_APART, "", right));
  }

  private void checkDates(long asPlanned) {
    if (times.isBeyondDates(asPlanned)) {
      findings.problem(
          terms
              .at("start_date")
              .notice("the project ends after the year 9999", "", "shorter durations"));
    }
    terms
        .moment("contract_finish")
        .filter(moment -> times.isBeyondDates(times.due(moment).ticks()))
        .ifPresent(
            moment ->
                findings.problem(
                    terms
                        .at("contract_finish")
                        .notice("after the year 9999", "", "an earlier finish")));
    terms
        .moment("contract_finish")
        .map(times::due)
        .ifPresent(due -> ExtensionRule.check(due, terms, times, findings));
  }

  private void checkDue(SectionRow row) {
    if (times.isBeyondDates(times.due(row.due()).ticks())) {
      findings.problem(row.place("due").notice("after the year 9999", "", "an earlier due time"));
    }
  }
}
