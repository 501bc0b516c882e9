package dayworth.casefile;

import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;

/** Warns of activities that nothing waits for, besides the last one of the plan. */
final class OpenEnds {

  private OpenEnds() {}

  static void report(ReadCase read, Findings findings) {
    Network network = read.network();
    int last = last(network);
    for (int end : network.openEnds()) {
      if (end != last) {
        String right = "a link to what waits for it, unless only the project's finish does";
        findings.warning(
            read.place(end, "id").notice("no successor", network.activity(end).id(), right));
      }
    }
  }

  /** The one that ends the project as planned; of several the last in the file. */
  private static int last(Network network) {
    Timing asPlanned = Timing.earliest(network, Plan.allNormal(network));
    int last = -1;
    for (int end : network.openEnds()) {
      if (last < 0 || asPlanned.earlyFinish(end) >= asPlanned.earlyFinish(last)) {
        last = end;
      }
    }
    return last;
  }
}
