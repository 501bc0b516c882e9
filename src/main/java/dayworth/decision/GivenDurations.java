package dayworth.decision;

import dayworth.contract.MomentMoney;
import dayworth.contract.Section;
import dayworth.engine.branching.Branching;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * When activities start if their durations are given: the whole and each section at their earliest
 * finish, and among such plans the one with the least running cost.
 *
 * <p>What holds a section at its earliest finish is work after it that fills the time until the
 * whole must be finished.
 */
final class GivenDurations {

  /** Convex problems for the one finish. */
  private static final long PROBLEMS = 2_000;

  private GivenDurations() {}

  /** The plan with its starts; as it is where no money hangs on them. */
  static Plan schedule(Case of, Plan durations) {
    MomentMoney all = of.momentMoney();
    if (all.isNone()) {
      return durations;
    }
    Network network = of.network();
    if (all.running().isEmpty()) {
      return Timing.earliest(network, durations).scheduled();
    }
    Timing earliest = Timing.earliest(network, durations);
    MomentMoney running =
        new MomentMoney(
            network.scale(), of.terms().calendar(), List.of(), of.momentMoney().running());
    List<Activity> fixed = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      fixed.add(lasting(network.activity(i), durations.duration(i)));
    }
    List<Link> links = new ArrayList<>(network.links());
    for (Section section : all.sections()) {
      long after = earliest.finish() - earliest.earlyFinish(section.activity());
      links.add(Link.finishToStart(section.activity(), fixed.size()));
      fixed.add(Activity.fixed("after " + section.name(), after, Money.ZERO));
    }
    Network lasting = new Network(network.scale(), fixed, links, running.spans());
    Plan solved =
        Branching.solve(lasting, running.charges(), new long[] {earliest.finish()}, PROBLEMS)
            .get(0)
            .plan();
    Plan plan = Timing.earliest(lasting, solved).scheduled();
    return Plan.scheduled(
        IntStream.range(0, network.size()).mapToLong(plan::duration).toArray(),
        IntStream.range(0, network.size()).mapToLong(plan::start).toArray());
  }

  private static Activity lasting(Activity activity, long duration) {
    return new Activity(
        activity.id(),
        activity.name(),
        activity.group(),
        duration,
        duration,
        Money.ZERO,
        Money.ZERO,
        activity.notBefore(),
        activity.notFinishedBefore());
  }
}
