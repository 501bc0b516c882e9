package dayworth.decision;

import dayworth.contract.Due;
import dayworth.contract.FinishCost;
import dayworth.contract.MomentMoney;
import dayworth.contract.Terms;
import dayworth.engine.Curve;
import dayworth.engine.Step;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.NavigableSet;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.SortedSet;
import java.util.TreeSet;

/** What does each finish cost, and which costs least in all? */
public final class CurveQuestion {

  private final Case of;
  private final Network network;
  private final Terms terms;
  private final MomentMoney money;
  private final Watcher watcher;
  private final CheapestPlans cheapest;
  private final Curve curve;

  private CurveQuestion(Case of, OptionalLong at, Watcher watcher) throws FinishTooEarly {
    this.of = of;
    this.watcher = watcher;
    this.network = of.network();
    this.terms = of.terms();
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
    return new CurveQuestion(of, at, watcher).answer(at, crossChecks);
  }

  private CheapestPlans cheapest(OptionalLong at) throws FinishTooEarly {
    Network priced = of.pricedNetwork();
    if (money.charges().isEmpty()) {
      ConvexPlans convex = new ConvexPlans(priced, watcher);
      requirePossible(convex.curve(), at);
      return convex;
    }
    Curve bare = new ConvexPlans(network, watcher).curve();
    requirePossible(bare, at);
    return new BranchedPlans(
        priced,
        money.charges(),
        bare,
        (longest, shortest) -> {
          NavigableSet<Long> durations = durations(longest, shortest);
          at.ifPresent(asked -> durations.add(Math.min(asked, longest)));
          return durations.descendingSet();
        },
        watcher);
  }

  private void requirePossible(Curve possible, OptionalLong at) throws FinishTooEarly {
    if (at.isPresent() && at.getAsLong() < possible.shortest()) {
      throw new FinishTooEarly(of, possible, at.getAsLong());
    }
    ProofChecker.stops(network, possible.obstacles(), possible.shortest())
        .ifPresent(
            refuted -> {
              throw new ProofFailed(refuted.where(), refuted.why());
            });
  }

  private CurveAnswer answer(OptionalLong at, long crossChecks) {
    NavigableSet<Long> durations = durations(curve.longest(), curve.shortest());
    curve.steps().forEach(step -> durations.add(step.to()));
    List<Finish> rows = finishes(durations.descendingSet());
    List<Finish> least = least(rows);
    long asked = at.orElse(least.get(0).duration());
    Plan plan = plans(new TreeSet<>(List.of(asked))).get(0);
    return new CurveAnswer(
        of,
        curve,
        of(Plan.allNormal(network)),
        rows,
        least,
        steps(),
        terms
            .contractFinish()
            .map(Due::ticks)
            .filter(due -> due >= curve.shortest())
            .map(this::finish),
        of(Plan.allCrash(network)),
        new CurveAnswer.AskedPlan(finish(asked), Timing.by(network, plan, asked)),
        rows.size() - cheapest.unproved().size(),
        cheapest.unproved(),
        cheapest.crossCheck(crossChecks, watcher));
  }

  /**
   * Each whole unit, each end of a working day and each bend of the money, and both ends. Between
   * two neighbours all money is linear or, where it goes by the date, the same from just above the
   * one to the other; so with the curve's breakpoints no finish between them costs less in all.
   */
  private NavigableSet<Long> durations(long longest, long shortest) {
    TreeSet<Long> durations = new TreeSet<>(List.of(longest, shortest));
    long unit = network.scale().ticksPerUnit();
    for (long whole = longest / unit * unit; whole >= shortest; whole -= unit) {
      durations.add(whole);
    }
    terms
        .calendar()
        .map(calendar -> calendar.endsOfDays(shortest, longest))
        .ifPresent(durations::addAll);
    durations.addAll(terms.bends().subSet(shortest, longest));
    return durations;
  }

  private static List<Finish> least(List<Finish> rows) {
    BigDecimal least = rows.stream().map(Finish::total).min(BigDecimal::compareTo).orElseThrow();
    return rows.stream().filter(row -> row.total().compareTo(least) == 0).toList();
  }

  /** The cheapest finish within a duration; longer than the curve's first it needs no more. */
  private Finish finish(long duration) {
    return finishes(new TreeSet<>(List.of(duration))).get(0);
  }

  private List<Finish> finishes(SortedSet<Long> durations) {
    if (money.isNone()) {
      return durations.stream()
          .map(duration -> finish(duration, curve.costAt(duration), Money.ZERO, terms.at(duration)))
          .toList();
    }
    List<Finish> finishes = new ArrayList<>();
    Iterator<Plan> plans = cheapest.plans(durations).iterator();
    for (long duration : durations) {
      Finish counted = PlanCost.of(of, plans.next(), duration);
      finishes.add(finish(duration, counted.direct(), counted.running(), counted.other()));
    }
    return finishes;
  }

  private List<Plan> plans(SortedSet<Long> durations) {
    return money.isNone()
        ? durations.stream().map(duration -> Stepping.planWithin(network, duration)).toList()
        : cheapest.plans(durations);
  }

  private Finish finish(long duration, Money direct, Money running, FinishCost other) {
    boolean breakpoint = duration == curve.longest();
    Optional<Money> price = Optional.empty();
    for (Step step : curve.steps()) {
      breakpoint |= duration == step.to();
      if (duration > step.to() && duration <= step.from()) {
        price = Optional.of(step.pricePerTick().times(network.scale().ticksPerUnit()));
      }
    }
    return new Finish(duration, direct, running, other, price, breakpoint);
  }

  /** What given durations cost when all is done as early as that allows. */
  private Finish of(Plan durations) {
    long finish = Timing.earliest(network, durations).finish();
    return PlanCost.of(of, GivenDurations.schedule(of, durations), finish);
  }

  private List<StepFacts> steps() {
    List<StepFacts> facts = new ArrayList<>();
    Timing before = Timing.by(network, curve.firstPlan(), curve.longest());
    for (int k = 0; k < curve.steps().size(); k++) {
      Step step = curve.steps().get(k);
      Timing after = Timing.by(network, curve.planAfter(k + 1), step.to());
      facts.add(new StepFacts(step, of.criticalCount(after), newlyCritical(before, after)));
      before = after;
    }
    return facts;
  }

  private List<Integer> newlyCritical(Timing before, Timing after) {
    List<Integer> newly = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      if (of.isCritical(after, i) && !before.isCritical(i)) {
        newly.add(i);
      }
    }
    return newly;
  }
}
