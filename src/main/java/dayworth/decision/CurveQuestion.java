package dayworth.decision;

import dayworth.contract.MomentMoney;
import dayworth.engine.Curve;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Network;
import dayworth.network.Plan;
import java.util.List;
import java.util.NavigableSet;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.SortedSet;

/** What does each finish cost, and which costs least in all? */
public final class CurveQuestion {

  private final Case of;
  private final Network network;
  private final MomentMoney money;
  private final Effort effort;
  private final Watcher watcher;
  private final CheapestPlans cheapest;
  private final Curve curve;

  /** The lower bound of direct cost where there are choices. */
  private Optional<Curve> relaxed = Optional.empty();

  private CurveQuestion(Case of, OptionalLong at, Effort effort, Watcher watcher)
      throws FinishTooEarly {
    this.of = of;
    this.effort = effort;
    this.watcher = watcher;
    this.network = of.network();
    this.money = of.momentMoney();
    this.cheapest = cheapest(at);
    this.curve = cheapest.curve();
  }

  /**
   * The answer, proved.
   *
   * @param at the duration in ticks of the plan asked for; empty for the least total
   * @param crossChecks how many points to compare with the linear programme at most
   * @param watcher is told what is being done
   * @throws ProofFailed if a check refutes what was computed
   * @throws FinishTooEarly if the project cannot finish within {@code at}
   */
  public static CurveAnswer ask(Case of, OptionalLong at, long crossChecks, Watcher watcher)
      throws FinishTooEarly {
    return ask(of, at, crossChecks, Effort.USUAL, watcher);
  }

  /** The same with a stated effort. */
  public static CurveAnswer ask(
      Case of, OptionalLong at, long crossChecks, Effort effort, Watcher watcher)
      throws FinishTooEarly {
    return new CurveQuestion(of, at, effort, watcher).answer(at, crossChecks);
  }

  private CheapestPlans cheapest(OptionalLong at) throws FinishTooEarly {
    Network priced = of.pricedNetwork();
    if (of.isConvex()) {
      ConvexPlans convex = new ConvexPlans(priced, watcher);
      requirePossible(convex.curve(), at);
      return convex;
    }
    Curve bare = new ConvexPlans(of.boundingNetwork(), watcher).curve();
    relaxed = network.hasChoices() ? Optional.of(bare) : Optional.empty();
    requirePossible(bare, at);
    BranchedPlans branched =
        new BranchedPlans(
            priced,
            money.charges(),
            bare,
            finishes -> effort.nodesFor(of, finishes),
            effort.isOver(),
            (longest, shortest) -> {
              NavigableSet<Long> durations = CurveCounting.durations(of, longest, shortest);
              at.ifPresent(asked -> durations.add(Math.min(asked, longest)));
              return durations.descendingSet();
            },
            watcher);
    if (at.isPresent() && at.getAsLong() < branched.curve().shortest()) {
      throw new FinishTooEarly(of, branched.curve(), at.getAsLong());
    }
    return branched;
  }

  private void requirePossible(Curve possible, OptionalLong at) throws FinishTooEarly {
    if (at.isPresent() && at.getAsLong() < possible.shortest()) {
      throw new FinishTooEarly(of, possible, at.getAsLong());
    }
    ProofChecker.stops(of.boundingNetwork(), possible.obstacles(), possible.shortest())
        .ifPresent(
            refuted -> {
              throw new ProofFailed(refuted.where(), refuted.why());
            });
  }

  private CurveAnswer answer(OptionalLong at, long crossChecks) {
    CurveCounting counting =
        new CurveCounting(
            of, curve, this::plans, durations -> GivenDurations.schedule(of, durations));
    return counting.answer(
        at,
        cheapest.unproved(),
        cheapest.crossCheck(crossChecks, watcher),
        Stepping.scaleFor(of.pricedNetwork()).orElseThrow().perUnit(),
        cheapest.flows(),
        cheapest.relaxations(),
        !cheapest.unproved().isEmpty() && effort.isOver().getAsBoolean(),
        relaxed);
  }

  private List<Plan> plans(SortedSet<Long> durations) {
    return of.isPlain()
        ? durations.stream().map(duration -> Stepping.planWithin(network, duration)).toList()
        : cheapest.plans(durations);
  }
}
