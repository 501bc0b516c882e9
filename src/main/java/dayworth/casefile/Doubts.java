package dayworth.casefile;

import dayworth.network.Activity;
import java.util.List;

/** Warns of input that is possible but doubtful. */
final class Doubts {

  private static final List<Doubt> RULES =
      List.of(
          Doubts::cheaperCrashes,
          OpenEnds::report,
          WeakerLinks::report,
          ImpliedLinks::report,
          HoldingDate::report,
          StartDate::report,
          IdleTerms::report);

  private Doubts() {}

  static void report(ReadCase read, Findings findings) {
    RULES.forEach(rule -> rule.report(read, findings));
  }

  private static void cheaperCrashes(ReadCase read, Findings findings) {
    for (int i = 0; i < read.network().size(); i++) {
      Activity activity = read.network().activity(i);
      if (activity.crashExtra().signum() < 0) {
        String found = activity.crashCost().cents().toPlainString();
        String right = "the curve starts from the cheaper way";
        findings.warning(read.place(i, "crash_cost").notice("below the normal cost", found, right));
      }
    }
  }
}
