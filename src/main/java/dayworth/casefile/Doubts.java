package dayworth.casefile;

import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.util.List;

/** Warns of input that is possible but doubtful. */
final class Doubts {

  private final Network network;
  private final List<ActivityRow> rows;
  private final Findings findings;

  private Doubts(Network network, List<ActivityRow> rows, Findings findings) {
    this.network = network;
    this.rows = rows;
    this.findings = findings;
  }

  static void report(Network network, List<ActivityRow> rows, TermsTable terms, Findings findings) {
    Doubts doubts = new Doubts(network, rows, findings);
    doubts.cheaperCrashes();
    doubts.openEnds();
    terms
        .place("start_date")
        .ifPresent(
            place ->
                findings.warning(
                    place.notice("dates change nothing yet", "", "results are in time units")));
  }

  private void cheaperCrashes() {
    for (int i = 0; i < network.size(); i++) {
      Activity activity = network.activity(i);
      if (activity.crashExtra().signum() < 0) {
        findings.warning(
            place(i, "crash_cost")
                .notice(
                    "below the normal cost",
                    activity.crashCost().cents().toPlainString(),
                    "the curve starts from the cheaper way"));
      }
    }
  }

  private void openEnds() {
    Timing asPlanned = Timing.earliest(network, Plan.allNormal(network));
    int last = -1;
    for (int end : network.openEnds()) {
      if (last < 0 || asPlanned.earlyFinish(end) >= asPlanned.earlyFinish(last)) {
        last = end;
      }
    }
    for (int end : network.openEnds()) {
      if (end != last) {
        findings.warning(
            place(end, "id")
                .notice(
                    "no successor",
                    network.activity(end).id(),
                    "a link to what waits for it, unless only the project's finish does"));
      }
    }
  }

  private Place place(int activity, String column) {
    return new Place(ActivityTable.FILE, rows.get(activity).line(), column);
  }
}
