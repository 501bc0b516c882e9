package dayworth.casefile;

import dayworth.network.Activity;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;

/** Warns of input that is possible but doubtful. */
final class Doubts {

  private static final List<Doubt> RULES =
      List.of(
          Doubts::cheaperCrashes,
          OpenEnds::report,
          WeakerLinks::report,
          ImpliedLinks::report,
          HoldingDate::report,
          OutOfSequence::report,
          Doubts::startsBeforeNotBefore,
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
        warnOfCheaperCrash(read, i, findings);
      }
    }
  }

  private static void startsBeforeNotBefore(ReadCase read, Findings findings) {
    for (ProgressRow row : read.progress()) {
      Optional<LocalDate> notBefore =
          read.activities().get(row.activity()).notBefore().flatMap(Moment::date);
      if (row.started().value().isPresent()
          && notBefore.filter(row.started().value().get()::isBefore).isPresent()) {
        String right = notBefore.get() + ", its not_before, holds nothing any more";
        findings.warning(
            row.place(ProgressTable.STARTED)
                .notice("started before its not_before", row.started().text(), right));
      }
    }
  }

  private static void warnOfCheaperCrash(ReadCase read, int activity, Findings findings) {
    String right = "the curve starts from the cheaper way";
    Optional<ProgressRow> rest =
        read.progress().stream()
            .filter(row -> row.activity() == activity && row.crashCost().given())
            .findFirst();
    findings.warning(
        rest.map(
                row ->
                    row.place(ProgressTable.CRASH_COST)
                        .notice("below the cost to go", row.crashCost().text(), right))
            .orElseGet(
                () ->
                    read.place(activity, "crash_cost")
                        .notice("below the normal cost", wholeCrashCost(read, activity), right)));
  }

  private static String wholeCrashCost(ReadCase read, int activity) {
    BigDecimal cost = read.activities().get(activity).crashCost().orElseThrow();
    return Money.of(cost).cents().toPlainString();
  }
}
