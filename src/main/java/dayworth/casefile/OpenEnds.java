package dayworth.casefile;

import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.util.List;

/** Warns of activities that nothing waits for, besides the last one of the plan. */
final class OpenEnds {

  private OpenEnds() {}

  static void report(ReadCase read, Findings findings) {
    Network network = read.network();
    List<Integer> ends = toGo(read);
    int last = last(network, ends);
    for (int end : ends) {
      if (end != last) {
        String right = "a link to what waits for it, unless only the project's finish does";
        findings.warning(
            read.place(end, "id").notice("no successor", network.activity(end).id(), right));
      }
    }
  }

  private static List<Integer> toGo(ReadCase read) {
    return read.network().openEnds().stream()
        .filter(end -> !read.work().status(end).isFinished())
        .toList();
  }

  /** The one that ends the project as planned; of several the last in the file. */
  private static int last(Network network, List<Integer> ends) {
    Timing asPlanned = Timing.earliest(network, Plan.allNormal(network));
    int last = -1;
    for (int end : ends) {
      if (last < 0 || asPlanned.earlyFinish(end) >= asPlanned.earlyFinish(last)) {
        last = end;
      }
    }
    return last;
  }
}
