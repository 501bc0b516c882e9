package dayworth.decision;

import dayworth.engine.Step;
import dayworth.network.CriticalChains;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Set;

/** What must be told of a plan so that somebody else decides for it or against it? */
public final class BriefQuestion {

  /** So many finishes a reader can be led through. */
  static final int MOST_STATES = 240;

  /** Chains of one step; more than these nobody reads. */
  private static final int MOST_CHAINS = 5;

  private final Case of;
  private final WeighAnswer weigh;
  private final CurveAnswer curve;
  private final MeetAnswer chosen;

  private BriefQuestion(Case of, WeighAnswer weigh, MeetAnswer chosen) {
    this.of = of;
    this.weigh = weigh;
    this.curve = weigh.granted().curve();
    this.chosen = chosen;
  }

  /**
   * The answer, with every finish proved.
   *
   * @param at ticks within which the plan that is argued for finishes; empty for the least total
   * @param watcher is told what is being done
   * @throws ProofFailed if a check refutes what was computed
   * @throws FinishTooEarly if the project cannot finish within {@code at}
   */
  public static BriefAnswer ask(Case of, OptionalLong at, Watcher watcher) throws FinishTooEarly {
    return ask(of, at, Effort.USUAL, watcher);
  }

  /** The same with a stated effort. */
  public static BriefAnswer ask(Case of, OptionalLong at, Effort effort, Watcher watcher)
      throws FinishTooEarly {
    WeighAnswer weigh = WeighQuestion.ask(of, LossScaling.NONE, effort, watcher);
    long finish = at.orElse(weigh.granted().best().duration());
    MeetAnswer chosen = MeetQuestion.ask(of, new Wish.In(finish), 0, effort, watcher);
    watcher.now("writing the brief");
    return new BriefQuestion(of, weigh, chosen).answer();
  }

  private BriefAnswer answer() {
    List<Finish> finishes = finishes();
    List<BriefAnswer.State> states = new ArrayList<>();
    for (Finish finish : finishes) {
      Timing timing = timing(finish.duration());
      states.add(
          new BriefAnswer.State(finish, timing, chains(timing).count(), of.criticalCount(timing)));
    }
    return new BriefAnswer(weigh, chosen, states, reasons());
  }

  /** Those worth showing, the one that is argued for among them; of very many some. */
  private List<Finish> finishes() {
    List<Finish> all = new ArrayList<>(curve.shown().rows());
    long asked = chosen.finish().duration();
    if (all.stream().noneMatch(row -> row.duration() == asked)) {
      all.add(chosen.finish());
    }
    all.sort(Comparator.comparingLong(Finish::duration).reversed());
    if (all.size() <= MOST_STATES) {
      return all;
    }
    Set<Long> named = new HashSet<>(List.of(asked, all.get(0).duration()));
    named.add(curve.shortest().duration());
    named.add(curve.asPlanned().duration());
    named.add(curve.leastTotal().duration());
    curve.atContract().ifPresent(finish -> named.add(finish.duration()));
    int every = (all.size() + MOST_STATES - 1) / MOST_STATES;
    List<Finish> some = new ArrayList<>();
    for (int i = 0; i < all.size(); i++) {
      if (i % every == 0 || named.contains(all.get(i).duration())) {
        some.add(all.get(i));
      }
    }
    return some;
  }

  private Timing timing(long finish) {
    if (finish == chosen.finish().duration()) {
      return chosen.curve().asked().timing();
    }
    Network network = of.network();
    return Optional.ofNullable(curve.evidence().plans().get(finish))
        .map(plan -> Timing.by(network, plan, finish))
        .orElseGet(() -> PlansAlong.at(curve, List.of(finish)).get(0));
  }

  private CriticalChains chains(Timing timing) {
    return CriticalChains.of(of.network(), timing, i -> of.isCritical(timing, i));
  }

  private List<StepReason> reasons() {
    List<StepReason> reasons = new ArrayList<>();
    for (int k = 0; k < curve.steps().size(); k++) {
      StepFacts facts = curve.steps().get(k);
      Step step = facts.step();
      Plan plan = curve.curve().planAfter(k);
      Timing timing = Timing.by(of.network(), plan, step.from());
      CriticalChains chains = chains(timing);
      List<Integer> changed = step.changes().stream().map(change -> change.activity()).toList();
      reasons.add(
          new StepReason(
              facts,
              plan,
              curve.curve().planAfter(k + 1),
              chains.passing(changed, MOST_CHAINS),
              chains.count()));
    }
    return reasons;
  }
}
