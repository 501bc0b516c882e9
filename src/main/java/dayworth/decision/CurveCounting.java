package dayworth.decision;

import dayworth.contract.Due;
import dayworth.contract.FinishCost;
import dayworth.contract.Terms;
import dayworth.engine.Curve;
import dayworth.engine.Flow;
import dayworth.engine.Step;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.NavigableMap;
import java.util.NavigableSet;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.Function;
import java.util.function.UnaryOperator;

/**
 * Counts all that an answer tells from a curve and its plans. It computes no plan and knows none of
 * the ways to one, so that what they found and what somebody claims is counted alike.
 */
final class CurveCounting {

  private final Case of;
  private final Network network;
  private final Terms terms;
  private final Curve curve;
  private final Function<SortedSet<Long>, List<Plan>> plans;
  private final UnaryOperator<Plan> schedule;
  private final NavigableMap<Long, Plan> counted = new TreeMap<>();

  /**
   * What is to be counted.
   *
   * @param plans the cheapest plan of each of several finishes, which are given from long to short
   * @param schedule when activities of given durations start; the plan as it is where no money
   *     hangs on that
   */
  CurveCounting(
      Case of,
      Curve curve,
      Function<SortedSet<Long>, List<Plan>> plans,
      UnaryOperator<Plan> schedule) {
    this.of = of;
    this.network = of.network();
    this.terms = of.terms();
    this.curve = curve;
    this.plans = plans;
    this.schedule = schedule;
  }

  /**
   * The answer.
   *
   * @param at ticks of the plan asked for; empty for the least total
   */
  CurveAnswer answer(
      OptionalLong at,
      List<Unproved> unproved,
      CrossCheck crossCheck,
      long slopeUnits,
      Optional<List<List<Flow.Entry>>> flows,
      boolean isCut,
      Optional<Curve> relaxed) {
    NavigableSet<Long> durations = durations(of, curve.longest(), curve.shortest());
    curve.steps().forEach(step -> durations.add(step.to()));
    List<Finish> rows = finishes(durations.descendingSet());
    List<Finish> least = least(rows);
    long asked = at.orElse(least.get(0).duration());
    Plan plan = plans(new TreeSet<>(List.of(asked))).get(0);
    Plan asPlanned = schedule.apply(Plan.allNormal(network));
    Plan crashEverything = schedule.apply(of.everythingShortest());
    Optional<Finish> atContract =
        terms
            .contractFinish()
            .map(Due::ticks)
            .filter(due -> due >= curve.shortest())
            .map(this::finish);
    return new CurveAnswer(
        of,
        curve,
        earliest(asPlanned),
        rows,
        least,
        steps(),
        atContract,
        earliest(crashEverything),
        new CurveAnswer.AskedPlan(finish(asked), Timing.by(network, plan, asked)),
        rows.size() - unproved.size(),
        unproved,
        isCut,
        crossCheck,
        relaxed,
        new Evidence(slopeUnits, flows, counted, asPlanned, crashEverything));
  }

  /**
   * Each whole unit, each end of a working day and each bend of the money, and both ends. Between
   * two neighbours all money is linear or, where it goes by the date, the same from just above the
   * one to the other; so with the curve's breakpoints no finish between them costs less in all.
   */
  static NavigableSet<Long> durations(Case of, long longest, long shortest) {
    TreeSet<Long> durations = new TreeSet<>(List.of(longest, shortest));
    long unit = of.network().scale().ticksPerUnit();
    for (long whole = longest / unit * unit; whole >= shortest; whole -= unit) {
      durations.add(whole);
    }
    of.terms()
        .calendar()
        .map(calendar -> calendar.endsOfDays(shortest, longest))
        .ifPresent(durations::addAll);
    durations.addAll(of.terms().bends().subSet(shortest, longest));
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
    if (of.isPlain()) {
      return durations.stream()
          .map(duration -> finish(duration, curve.costAt(duration), Money.ZERO, terms.at(duration)))
          .toList();
    }
    List<Finish> finishes = new ArrayList<>();
    Iterator<Plan> plans = plans(durations).iterator();
    for (long duration : durations) {
      Finish priceless = PlanCost.of(of, plans.next(), duration);
      finishes.add(finish(duration, priceless.direct(), priceless.running(), priceless.other()));
    }
    return finishes;
  }

  /** A finish has one plan, whatever is told of it. */
  private List<Plan> plans(SortedSet<Long> durations) {
    if (!counted.navigableKeySet().containsAll(durations)) {
      Iterator<Plan> each = plans.apply(durations).iterator();
      durations.forEach(duration -> counted.putIfAbsent(duration, each.next()));
    }
    return durations.stream().map(counted::get).toList();
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
  private Finish earliest(Plan plan) {
    return PlanCost.of(of, plan, Timing.earliest(network, plan).finish());
  }

  private List<StepFacts> steps() {
    List<StepFacts> facts = new ArrayList<>();
    Timing before = Timing.by(network, curve.firstPlan(), curve.longest());
    for (int k = 0; k < curve.steps().size(); k++) {
      Step step = curve.steps().get(k);
      Timing after = Timing.by(network, curve.planAfter(k + 1), step.to());
      facts.add(
          new StepFacts(
              step,
              PlanChange.between(network, before.plan(), after.plan()),
              of.criticalCount(after),
              newlyCritical(before, after)));
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
