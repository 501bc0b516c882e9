package dayworth.decision;

import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.engine.Step;
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
    return ask(of, wish, crossChecks, Effort.USUAL, watcher);
  }

  /** The same with a stated effort. */
  public static MeetAnswer ask(Case of, Wish wish, long crossChecks, Effort effort, Watcher watcher)
      throws FinishTooEarly {
    watcher.now("looking for the cheapest plan");
    long finish = finish(of, wish, effort, watcher);
    CurveAnswer answer =
        CurveQuestion.ask(of, OptionalLong.of(finish), crossChecks, effort, watcher);
    watcher.now("writing the proof sheet");
    return answer(wish, answer, PlanProving.of(of, answer.asked().timing().plan(), finish));
  }

  /** Counts the answer from the plan asked for and its proof. */
  static MeetAnswer answer(Wish wish, CurveAnswer answer, PlanProof proof) {
    Case of = answer.of();
    Timing timing = answer.asked().timing();
    List<Integer> shortened = shortened(of.network(), timing.plan());
    CriticalChains critical =
        CriticalChains.of(of.network(), timing, i -> of.isCritical(timing, i));
    List<List<Integer>> chains = critical.passing(shortened, MOST_CHAINS);
    return new MeetAnswer(
        wish,
        answer,
        shortened.stream().map(i -> bought(of.network(), i, timing, chains)).toList(),
        List.copyOf(timing.plan().packages(of.network())),
        chains,
        critical.count(),
        lastPrice(answer.curve(), timing.finish()),
        proof);
  }

  /** When to finish; where time is wished for, no later than money gains by waiting. */
  private static long finish(Case of, Wish wish, Effort effort, Watcher watcher)
      throws FinishTooEarly {
    return of.isPlain()
        ? finish(of, Stepping.curve(of.network(), PieceWitness.NONE), wish)
        : finishByRows(CurveQuestion.ask(of, wish.duration(), 0, effort, watcher), wish);
  }

  /** When to finish, by a curve that is known. */
  static long finish(CurveAnswer answer, Wish wish) {
    return answer.of().isPlain()
        ? finish(answer.of(), answer.curve(), wish)
        : finishByRows(answer, wish);
  }

  private static long finish(Case of, Curve curve, Wish wish) {
    return wish instanceof Wish.Within within
        ? earliestFor(
            curve, Plan.allNormal(of.network()).directCost(of.network()).plus(within.most()))
        : Math.min(curve.longest(), wish.duration().orElseThrow());
  }

  private static long finishByRows(CurveAnswer answer, Wish wish) {
    return wish instanceof Wish.Within within
        ? earliestFor(answer, answer.asPlanned().spent().plus(within.most()))
        : Math.min(answer.rows().get(0).duration(), wish.duration().orElseThrow());
  }

  /** The shortest finish that spends no more; the longest one where all do. */
  private static long earliestFor(CurveAnswer answer, Money most) {
    return answer.rows().stream()
        .filter(row -> row.spent().compareTo(most) <= 0)
        .mapToLong(Finish::duration)
        .min()
        .orElse(answer.rows().get(0).duration());
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

  private static List<Integer> shortened(Network network, Plan plan) {
    return IntStream.range(0, network.size())
        .filter(
            i ->
                plan.duration(i) < network.activity(i).normal()
                    || plan.measure(i) != Plan.NO_MEASURE)
        .boxed()
        .toList();
  }

  private static MeetAnswer.Bought bought(
      Network network, int index, Timing timing, List<List<Integer>> chains) {
    Plan plan = timing.plan();
    Activity activity = network.activity(index);
    long ticks = activity.normal() - plan.duration(index);
    Money cost = plan.costOf(network, index).minus(activity.normalCost());
    List<Integer> on = new ArrayList<>();
    for (int c = 0; c < chains.size(); c++) {
      if (chains.get(c).contains(index)) {
        on.add(c);
      }
    }
    return new MeetAnswer.Bought(index, plan.measure(index), ticks, cost, on);
  }
}
