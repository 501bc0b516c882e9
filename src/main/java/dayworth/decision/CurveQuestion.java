package dayworth.decision;

import dayworth.contract.Due;
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
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.TreeSet;

/** What does each finish cost, and which costs least in all? */
public final class CurveQuestion {

  private final Case of;
  private final Network network;
  private final Terms terms;
  private final Curve curve;

  private final Watcher watcher;

  private CurveQuestion(Case of, Watcher watcher) {
    this.of = of;
    this.watcher = watcher;
    this.network = of.network();
    this.terms = of.terms();
    this.curve = Stepping.curve(network, new ProvingWitness(network, watcher));
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
    return new CurveQuestion(of, watcher).answer(at, crossChecks);
  }

  private CurveAnswer answer(OptionalLong at, long crossChecks) throws FinishTooEarly {
    if (at.isPresent() && at.getAsLong() < curve.shortest()) {
      throw new FinishTooEarly(of, curve, at.getAsLong());
    }
    ProofChecker.stops(network, curve.obstacles(), curve.shortest())
        .ifPresent(
            refuted -> {
              throw new ProofFailed(refuted.where(), refuted.why());
            });
    List<Finish> rows = rows();
    List<Finish> least = least(rows);
    long asked = at.orElse(least.get(0).duration());
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
        new CurveAnswer.AskedPlan(
            finish(asked), Timing.by(network, Stepping.planWithin(network, asked), asked)),
        rows.size(),
        CrossChecking.of(network, curve, crossChecks, watcher));
  }

  /**
   * A row for each whole unit, each breakpoint, each end of a working day and each bend of the
   * money, longest first. Between two neighbours all money is linear or, where it goes by the date,
   * the same from just above the one to the other; so no finish between them costs less in all.
   */
  private List<Finish> rows() {
    TreeSet<Long> durations = new TreeSet<>();
    durations.add(curve.longest());
    curve.steps().forEach(step -> durations.add(step.to()));
    long unit = network.scale().ticksPerUnit();
    for (long whole = curve.longest() / unit * unit; whole >= curve.shortest(); whole -= unit) {
      durations.add(whole);
    }
    terms
        .calendar()
        .map(calendar -> calendar.endsOfDays(curve.shortest(), curve.longest()))
        .ifPresent(durations::addAll);
    durations.addAll(terms.bends().subSet(curve.shortest(), curve.longest()));
    return durations.descendingSet().stream().map(this::finish).toList();
  }

  private static List<Finish> least(List<Finish> rows) {
    BigDecimal least = rows.stream().map(Finish::total).min(BigDecimal::compareTo).orElseThrow();
    return rows.stream().filter(row -> row.total().compareTo(least) == 0).toList();
  }

  /** The cheapest finish within a duration; longer than the curve's first it needs no more. */
  private Finish finish(long duration) {
    boolean breakpoint = duration == curve.longest();
    Optional<Money> price = Optional.empty();
    for (Step step : curve.steps()) {
      breakpoint |= duration == step.to();
      if (duration > step.to() && duration <= step.from()) {
        price = Optional.of(step.pricePerTick().times(network.scale().ticksPerUnit()));
      }
    }
    return new Finish(
        duration, curve.costAt(duration), Money.ZERO, terms.at(duration), price, breakpoint);
  }

  private Finish of(Plan plan) {
    long finish = Timing.earliest(network, plan).finish();
    return new Finish(
        finish, plan.directCost(network), Money.ZERO, terms.at(finish), Optional.empty(), false);
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
