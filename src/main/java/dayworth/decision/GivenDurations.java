package dayworth.decision;

import dayworth.contract.MomentMoney;
import dayworth.contract.RunningCost;
import dayworth.contract.Section;
import dayworth.engine.branching.Branching;
import dayworth.network.Activity;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.network.Timing;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * When activities start if their durations are given: the whole and each section at their earliest
 * finish, and among such plans the one with the least running cost.
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
    MomentMoney running =
        new MomentMoney(
            network.scale(), of.terms().calendar(), List.of(), of.momentMoney().running());
    Timing earliest = Timing.earliest(network, durations);
    List<Span> spans = new ArrayList<>(running.spans());
    Money fence = fence(all.running(), earliest.finish());
    for (Section section : all.sections()) {
      long finish = earliest.earlyFinish(section.activity());
      Moment moment = Moment.finishOf(section.activity());
      spans.add(new Span(section.name(), Moment.PROJECT_START, moment, finish, fence));
    }
    List<Activity> fixed =
        IntStream.range(0, network.size())
            .mapToObj(i -> lasting(network.activity(i), durations.duration(i)))
            .toList();
    return Branching.solve(
            new Network(network.scale(), fixed, network.links(), spans),
            running.charges(),
            new long[] {earliest.finish()},
            PROBLEMS)
        .get(0)
        .plan();
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

  /** A tick of any section outweighs all running cost. */
  private static Money fence(List<RunningCost> running, long finish) {
    Money sum = Money.of(1);
    for (RunningCost cost : running) {
      sum = sum.plus(cost.rate().times(finish + 1));
    }
    return sum;
  }
}
