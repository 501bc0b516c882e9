package dayworth.decision;

import dayworth.engine.Ways;
import dayworth.engine.stepping.Stepping;
import dayworth.network.CriticalChains;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/** What are the facts of the network? */
public final class CheckQuestion {

  private static final int FIRST_CHAINS = 3;
  private static final int NEAREST = 5;

  private CheckQuestion() {}

  /** The answer; the shortest finish is that of the exact curve. */
  public static CheckAnswer ask(Case of) {
    Network network = of.network();
    Timing asPlanned = Timing.earliest(network, Plan.allNormal(network));
    CriticalChains chains = CriticalChains.of(network, asPlanned, i -> of.isCritical(asPlanned, i));
    long shortest = Stepping.shortest(Ways.reachable(network));
    return new CheckAnswer(
        of,
        asPlanned,
        shortest,
        chains.count(),
        chains.first(FIRST_CHAINS),
        nearCritical(of, asPlanned),
        toGo(of, network.openStarts()),
        toGo(of, network.openEnds()),
        neverCritical(network, asPlanned, shortest));
  }

  private static List<Integer> toGo(Case of, List<Integer> activities) {
    return activities.stream().filter(of::isToGo).toList();
  }

  private static List<Integer> nearCritical(Case of, Timing asPlanned) {
    return IntStream.range(0, of.network().size())
        .filter(i -> of.isToGo(i) && !asPlanned.isCritical(i))
        .boxed()
        .sorted(Comparator.comparingLong(asPlanned::totalFloat))
        .limit(NEAREST)
        .toList();
  }

  private static List<CheckAnswer.NeverCritical> neverCritical(
      Network network, Timing asPlanned, long shortest) {
    List<CheckAnswer.NeverCritical> never = new ArrayList<>();
    Network reachable = Ways.reachable(network);
    for (int i = 0; i < network.size(); i++) {
      long longer = reachable.activity(i).normal() - network.activity(i).normal();
      long through = asPlanned.finish() - asPlanned.totalFloat(i) + longer;
      if (reachable.activity(i).isCompressible() && through < shortest) {
        never.add(new CheckAnswer.NeverCritical(i, through));
      }
    }
    return never;
  }
}
