package dayworth.casefile;

import dayworth.network.Link;
import dayworth.network.Network;
import java.util.ArrayDeque;
import java.util.BitSet;
import java.util.Deque;
import java.util.List;

/** Warns of sections and running costs that are possible but doubtful. */
final class SectionDoubts {

  private SectionDoubts() {}

  static void report(
      List<SectionRow> sections,
      List<RunningRow> running,
      List<ProgressRow> progress,
      TermsTable terms,
      CaseCalendar times,
      Network network,
      Findings findings) {
    sections.forEach(row -> warnOfTwoCharges(row, terms, times, findings));
    running.stream()
        .filter(row -> !hasBegun(row, progress))
        .forEach(row -> warnOfNoChain(row, network, findings));
  }

  /** A day of lateness would be charged twice. */
  private static void warnOfTwoCharges(
      SectionRow row, TermsTable terms, CaseCalendar times, Findings findings) {
    boolean bothCharge =
        row.damagesRate().value().filter(rate -> rate.signum() > 0).isPresent()
            && terms.amount("damages_rate").signum() > 0;
    terms
        .moment("contract_finish")
        .filter(
            contract -> bothCharge && times.due(contract).ticks() == times.due(row.due()).ticks())
        .ifPresent(
            contract ->
                findings.warning(
                    row.place("due")
                        .notice(
                            "due with the whole, and both charge damages",
                            "",
                            "one of the two, unless the contract says both")));
  }

  /** It then runs on whatever leads where. */
  private static boolean hasBegun(RunningRow row, List<ProgressRow> progress) {
    return progress.stream()
        .anyMatch(status -> status.activity() == row.from() && status.started().given());
  }

  private static void warnOfNoChain(RunningRow row, Network network, Findings findings) {
    if (row.from() != row.to() && !leads(network, row.from(), row.to())) {
      findings.warning(
          row.place("to_activity")
              .notice(
                  "no chain leads from "
                      + network.activity(row.from()).id()
                      + " to "
                      + network.activity(row.to()).id(),
                  "",
                  "a link, unless the cost may end before it begins; it is then nothing"));
    }
  }

  private static boolean leads(Network network, int from, int to) {
    BitSet seen = new BitSet(network.size());
    Deque<Integer> open = new ArrayDeque<>(List.of(from));
    while (!open.isEmpty()) {
      int here = open.remove();
      for (int k = 0; k < network.linksOutOf(here); k++) {
        Link link = network.link(network.linkOutOf(here, k));
        if (link.successor() == to) {
          return true;
        }
        if (!seen.get(link.successor())) {
          seen.set(link.successor());
          open.add(link.successor());
        }
      }
    }
    return false;
  }
}
