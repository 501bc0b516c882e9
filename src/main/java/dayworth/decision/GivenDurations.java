package dayworth.decision;

import dayworth.contract.MomentMoney;
import dayworth.contract.Section;
import dayworth.engine.branching.Branching;
import dayworth.network.Activity;
import dayworth.network.Measures;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;

/**
 * When activities start if their durations are given: the whole and each section at their earliest
 * finish, and among such plans the one with the least running cost.
 *
 * <p>What holds a section at its earliest finish is work after it that fills the time until the
 * whole must be finished.
 */
final class GivenDurations {

  /** Convex problems for the one finish. */
  private static final long PROBLEMS = 20_000;

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
    HeldSections held =
        new HeldSections(network.withActivities(fixed, Measures.NONE).withSpans(running.spans()));
    for (Section section : all.sections()) {
      held.with(section, earliest.finish() - earliest.earlyFinish(section.activity()));
    }
    Network lasting = held.network();
    Plan solved =
        Branching.solve(lasting, running.charges(), new long[] {earliest.finish()}, PROBLEMS)
            .get(0)
            .plan();
    return held.ofBase(Timing.earliest(lasting, solved).scheduled()).withMeasuresOf(durations);
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
