package dayworth.decision;

import dayworth.engine.Curve;
import dayworth.engine.Step;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.proof.ProofSheet;
import dayworth.engine.proof.Verdict;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Activity;
import dayworth.network.CriticalChains;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.value.Money;
import java.math.BigInteger;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.stream.IntStream;

/** What is the cheapest plan for a date, a duration or some money? */
public final class MeetQuestion {

  private static final int MOST_CHAINS = 6;

  private MeetQuestion() {}

  /**
   * The answer, proved.
   *
   * @param crossChecks how many points to compare with the linear programme at most
   * @param watcher is told what is being done
   * @throws ProofFailed if a check refutes what was computed
   * @throws FinishTooEarly if the project cannot finish as early as wished
   */
  public static MeetAnswer ask(Case of, Wish wish, long crossChecks, Watcher watcher)
      throws FinishTooEarly {
    Network network = of.network();
    watcher.now("looking for the cheapest plan");
    Money most = most(network, wish);
    FlowCatcher catcher = new FlowCatcher(network, wish, most);
    Curve curve = Stepping.curve(network, catcher);
    long finish =
        wish.duration().isPresent()
            ? Math.min(curve.longest(), wish.duration().getAsLong())
            : earliestFor(curve, most);
    CurveAnswer answer = CurveQuestion.ask(of, OptionalLong.of(finish), crossChecks, watcher);
    Timing timing = answer.asked().timing();
    requireProved(network, timing.plan(), finish, catcher, answer.asked().finish().spent());
    List<Integer> shortened = shortened(network, timing.plan());
    CriticalChains critical = CriticalChains.of(network, timing);
    List<List<Integer>> chains = critical.passing(shortened, MOST_CHAINS);
    return new MeetAnswer(
        wish,
        answer,
        shortened.stream().map(i -> bought(network.activity(i), i, timing, chains)).toList(),
        chains,
        critical.count(),
        lastPrice(curve, finish),
        ProofSheet.of(network, timing.plan(), finish, catcher.flow()));
  }

  /** What direct and running cost may come to in all; nothing where time is wished for. */
  private static Money most(Network network, Wish wish) {
    return wish instanceof Wish.Within within
        ? Plan.allNormal(network).directCost(network).plus(within.most())
        : Money.ZERO;
  }

  /** The first tick whose plan on the curve costs no more than there is to spend. */
  private static long earliestFor(Curve curve, Money most) {
    Money cost = curve.firstCost();
    for (Step step : curve.steps()) {
      Money after = cost.plus(step.extra());
      if (after.compareTo(most) > 0) {
        BigInteger affordable =
            most.minus(cost)
                .dividedBy(step.pricePerTick())
                .rounded(0, RoundingMode.FLOOR)
                .toBigIntegerExact();
        return step.from() - Math.max(0, affordable.longValueExact());
      }
      cost = after;
    }
    return curve.shortest();
  }

  private static Optional<Money> lastPrice(Curve curve, long finish) {
    return curve.steps().stream()
        .filter(step -> step.to() <= finish && finish < step.from())
        .map(step -> step.pricePerTick().times(curve.network().scale().ticksPerUnit()))
        .findFirst();
  }

  private static void requireProved(
      Network network, Plan plan, long finish, FlowCatcher catcher, Money claimed) {
    if (new ProofChecker(network).check(plan, finish, catcher.flow(), claimed)
        instanceof Verdict.Refuted refuted) {
      throw new ProofFailed(
          "the plan for " + network.scale().text(finish) + ", " + refuted.where(), refuted.why());
    }
  }

  private static List<Integer> shortened(Network network, Plan plan) {
    return IntStream.range(0, network.size())
        .filter(i -> plan.duration(i) < network.activity(i).normal())
        .boxed()
        .toList();
  }

  private static MeetAnswer.Bought bought(
      Activity activity, int index, Timing timing, List<List<Integer>> chains) {
    long ticks = activity.normal() - timing.plan().duration(index);
    List<Integer> on = new ArrayList<>();
    for (int c = 0; c < chains.size(); c++) {
      if (chains.get(c).contains(index)) {
        on.add(c);
      }
    }
    return new MeetAnswer.Bought(index, ticks, activity.slope().times(ticks), on);
  }
}
