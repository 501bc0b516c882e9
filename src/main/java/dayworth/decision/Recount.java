package dayworth.decision;

import dayworth.contract.MomentMoney;
import dayworth.contract.Section;
import dayworth.decision.ClaimedCurve.ClaimedStep;
import dayworth.engine.Change;
import dayworth.engine.Curve;
import dayworth.engine.Flow;
import dayworth.engine.Step;
import dayworth.engine.branching.Branching;
import dayworth.engine.proof.FlowBound;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.proof.Verdict;
import dayworth.engine.proof.Verdict.Refuted;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.network.Timing;
import dayworth.value.Money;
import dayworth.value.MoneySum;
import dayworth.value.SlopeScale;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.NavigableMap;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.IntStream;

/**
 * Recounts a claimed curve from the case: which plans it names and what they cost, whether its
 * flows prove them, and whether its chain stops the project. What it answers is what the result
 * ought to tell, given that the claims hold. Where one flow cannot prove a finish, all that could
 * be cheaper than the claimed plan is searched once more, each bound counted from its flow.
 */
public final class Recount {

  /** Ties may be broken another way. */
  private static final long SEARCH_AGAIN = 4;

  private static final BigDecimal MOST_DIFFERENCE = new BigDecimal("0.01");

  private final Case of;
  private final Network network;
  private final Network priced;
  private final MomentMoney money;
  private final ClaimedCurve claim;
  private final ProofChecker checker;
  private final SlopeScale scale;

  private Recount(Case of, ClaimedCurve claim) {
    this.of = of;
    this.network = of.network();
    this.priced = of.pricedNetwork();
    this.money = of.momentMoney();
    this.claim = claim;
    this.checker = new ProofChecker(priced);
    this.scale = new SlopeScale(claim.slopeUnits(), isExact());
  }

  /**
   * What the result ought to tell.
   *
   * @throws ClaimRefuted if a claim does not hold
   */
  public static CurveAnswer curve(Case of, ClaimedCurve claim) throws ClaimRefuted {
    return new Recount(of, claim).curve();
  }

  /**
   * The same for a wish.
   *
   * @param flow that proves the plan; empty where money is not convex
   * @throws ClaimRefuted if a claim does not hold
   */
  public static MeetAnswer meet(Case of, ClaimedCurve claim, Wish wish, List<Flow.Entry> flow)
      throws ClaimRefuted {
    return new Recount(of, claim).meet(wish, flow);
  }

  /** Whether the result must carry the flows: even full ones would have few enough entries. */
  public static boolean mustCarryFlows(Case of, ClaimedCurve claim) {
    int perActivity = Flow.Over.values().length - 2;
    long most =
        (long) perActivity * of.network().size()
            + of.network().links().size()
            + of.momentMoney().spans().size();
    return of.isConvex() && most * (claim.steps().size() + 1) <= Evidence.MOST_ENTRIES;
  }

  private MeetAnswer meet(Wish wish, List<Flow.Entry> flow) throws ClaimRefuted {
    CurveAnswer answer = curve();
    long finish = MeetQuestion.finish(answer, wish);
    require(claim.asked() == finish, "plan.duration", text(claim.asked()), text(finish));
    Plan plan = answer.asked().timing().plan();
    if (!of.isConvex()) {
      return MeetQuestion.answer(wish, answer, PlanProving.paid(of, plan));
    }
    Flow proving = Flow.of(scale, priced, flow);
    prove("proof_flow", plan, finish, checker.bound(proving));
    return MeetQuestion.answer(
        wish, answer, PlanProving.convex(priced, plan, finish, money.fixed(), proving));
  }

  private CurveAnswer curve() throws ClaimRefuted {
    requireSteps();
    requirePlans();
    Curve curve = recounted();
    boolean isStoppedByWays = network.hasChoices() && claim.obstacles().isEmpty();
    Optional<Refuted> free =
        isStoppedByWays
            ? Optional.empty()
            : ProofChecker.stops(of.boundingNetwork(), claim.obstacles(), curve.shortest());
    require("shortest.stopped_by", free);
    require(
        claim.flows().isPresent() || !mustCarryFlows(of, claim),
        "evidence.flows",
        "none",
        "a flow for each piece of the curve");
    if (claim.flows().isPresent()) {
      requireFlows(curve, claim.flows().get());
    }
    if (of.isPlain()) {
      Plan asked = planFor(claim.asked());
      Money least = curve.costAt(claim.asked());
      require(
          asked.directCost(network).equals(least),
          "plan.activities",
          "durations that cost " + asked.directCost(network).cents(),
          "a plan of " + least.cents());
    }
    CurveCounting counting =
        new CurveCounting(
            of, curve, durations -> durations.stream().map(this::known).toList(), this::scheduled);
    long unit = network.scale().ticksPerUnit();
    require(
        (curve.longest() - curve.shortest()) / unit <= claim.rows(),
        "curve",
        claim.rows() + " finishes",
        "one for each unit from " + text(curve.longest()) + " to " + text(curve.shortest()));
    requireRowPlans(curve);
    require(
        !of.isConvex() || claim.relaxations() == 0,
        "evidence.relaxations",
        String.valueOf(claim.relaxations()),
        "0, as nothing was branched on");
    if (isSearched(of, claim.relaxations())) {
      requireNoneCheaper(curve);
    }
    return counting.answer(
        OptionalLong.of(claim.asked()),
        of.isConvex() ? List.of() : unproved(),
        crossCheck(curve),
        claim.slopeUnits(),
        claim.flows(),
        claim.relaxations(),
        claim.isCut(),
        Optional.empty());
  }

  private void requireSteps() throws ClaimRefuted {
    long from = claim.longest();
    for (int k = 0; k < claim.steps().size(); k++) {
      ClaimedStep step = claim.steps().get(k);
      String place = "steps[" + k + "]";
      require(step.from() == from, place + ".from_duration", text(step.from()), text(from));
      require(step.to() < from, place + ".to_duration", text(step.to()), "less than " + text(from));
      from = step.to();
    }
    int breakpoints = of.isPlain() ? 1 : claim.steps().size() + 1;
    require(
        claim.breakpoints().size() == breakpoints,
        "evidence.breakpoint_plans",
        claim.breakpoints().size() + " plans",
        breakpoints + ", one for each breakpoint");
  }

  private void requirePlans() throws ClaimRefuted {
    for (int k = 0; k < claim.breakpoints().size(); k++) {
      long finish = k == 0 ? claim.longest() : claim.steps().get(k - 1).to();
      String place = "evidence.breakpoint_plans[" + k + "]";
      require(place, ProofChecker.possible(network, claim.breakpoints().get(k), finish));
      if (k > 0 && !network.hasChoices()) {
        long[] changed = after(claim.breakpoints().get(k - 1).toArray(), claim.steps().get(k - 1));
        require(
            Arrays.equals(changed, claim.breakpoints().get(k).toArray()),
            "steps[" + (k - 1) + "].changes",
            "other changes",
            "what is between evidence.breakpoint_plans[" + (k - 1) + "] and the next");
      }
    }
    for (Map.Entry<Long, Plan> entry : claim.plans().entrySet()) {
      String place = "evidence.plans, the one of " + text(entry.getKey());
      require(place, ProofChecker.possible(network, entry.getValue(), entry.getKey()));
    }
    requireGiven("evidence.as_planned", claim.asPlanned(), Plan.allNormal(network));
    requireGiven("evidence.crash_everything", claim.crashEverything(), of.everythingShortest());
  }

  private void requireGiven(String place, Plan plan, Plan durations) throws ClaimRefuted {
    require(
        sameWays(plan, durations), place + ".durations", "other durations", "those of the case");
    if (money.isNone()) {
      return;
    }
    Timing earliest = Timing.earliest(network, durations);
    require(place, ProofChecker.possible(network, plan, earliest.finish()));
    for (Section section : money.sections()) {
      int i = section.activity();
      require(
          plan.start(i) == earliest.earlyStart(i),
          place + ".starts." + network.activity(i).id(),
          text(plan.start(i)),
          text(earliest.earlyStart(i)));
    }
  }

  private static boolean sameWays(Plan one, Plan other) {
    return IntStream.range(0, one.size())
        .allMatch(i -> one.duration(i) == other.duration(i) && one.measure(i) == other.measure(i));
  }

  private static long[] after(long[] durations, ClaimedStep step) {
    step.changes().forEach(change -> durations[change.activity()] -= change.shortened());
    return durations;
  }

  private Curve recounted() throws ClaimRefuted {
    List<Step> steps = new ArrayList<>();
    Plan first = claim.breakpoints().get(0);
    Plan before = first;
    for (int k = 0; k < claim.steps().size(); k++) {
      ClaimedStep step = claim.steps().get(k);
      Money extra;
      if (of.isPlain()) {
        MoneySum sum = new MoneySum();
        for (Change change : step.changes()) {
          sum.add(network.activity(change.activity()).slope(), change.shortened(), 1);
        }
        extra = sum.total();
      } else {
        Plan next = claim.breakpoints().get(k + 1);
        extra = cost(next).minus(cost(before));
        before = next;
      }
      List<Change> changes =
          network.hasChoices() ? changes(claim.breakpoints(), k) : step.changes();
      steps.add(new Step(step.from(), step.to(), extra, changes));
    }
    Curve curve =
        new Curve(
            priced,
            claim.longest(),
            first,
            cost(first),
            steps,
            claim.obstacles(),
            of.isPlain() ? List.of() : claim.breakpoints());
    for (int k = 1; k <= steps.size(); k++) {
      long finish = steps.get(k - 1).to();
      String place = "steps[" + (k - 1) + "].changes";
      require(place, ProofChecker.possible(network, curve.planAfter(k), finish));
    }
    return curve;
  }

  /** What is between the plans of a step's two ends. */
  private static List<Change> changes(List<Plan> breakpoints, int step) {
    Plan before = breakpoints.get(step);
    Plan after = breakpoints.get(step + 1);
    return IntStream.range(0, before.size())
        .filter(i -> before.duration(i) != after.duration(i))
        .mapToObj(i -> new Change(i, before.duration(i) - after.duration(i)))
        .toList();
  }

  /** Direct cost, spans and charges. */
  private Money cost(Plan plan) {
    if (of.isPlain()) {
      return plan.directCost(network);
    }
    MoneySum sum = new MoneySum().add(plan.cost(priced));
    money
        .charges()
        .forEach(
            charge ->
                sum.add(charge.at(charge.moments().stream().mapToLong(plan::time).toArray())));
    return sum.total();
  }

  private void requireFlows(Curve curve, List<List<Flow.Entry>> flows) throws ClaimRefuted {
    require(
        of.isConvex() && flows.size() == curve.steps().size() + 1,
        "evidence.flows",
        flows.size() + " flows",
        "one for the longest finish and one for each step");
    for (int k = 0; k < flows.size(); k++) {
      String place = "evidence.flows[" + k + "]";
      FlowBound bound = checker.bound(Flow.of(scale, priced, flows.get(k)));
      long from = k == 0 ? Long.MAX_VALUE : curve.steps().get(k - 1).from();
      long to = k == 0 ? curve.longest() : curve.steps().get(k - 1).to();
      prove(place, curve.planAfter(k), to, bound);
      if (k == 0) {
        // A finish that no later one undercuts has a price of nothing.
        require(bound.pricePerTick().isZero(), place, "a price of time", "none at the first row");
      } else {
        prove(place, curve.planAfter(k - 1), from, bound);
        require(
            curve.steps().get(k - 1).extra().signum() > 0,
            "steps[" + (k - 1) + "]",
            "no extra cost",
            "a step that costs something");
      }
      for (Map.Entry<Long, Plan> entry : claim.plans().subMap(to, from).entrySet()) {
        prove(
            "evidence.plans, the one of " + text(entry.getKey()),
            entry.getValue(),
            entry.getKey(),
            bound);
      }
    }
  }

  private void prove(String place, Plan plan, long finish, FlowBound bound) throws ClaimRefuted {
    if (checker.check(plan, finish, bound, cost(plan)) instanceof Verdict.Refuted refuted) {
      throw new ClaimRefuted(place, refuted.where() + " " + refuted.why(), "a flow that proves it");
    }
  }

  private void requireRowPlans(Curve curve) throws ClaimRefuted {
    TreeSet<Long> needed = new TreeSet<>();
    needed.add(claim.asked());
    if (!of.isPlain()) {
      needed.addAll(CurveCounting.durations(of, curve.longest(), curve.shortest()));
      curve.steps().forEach(step -> needed.add(step.to()));
      of.terms()
          .contractFinish()
          .filter(due -> due.ticks() >= curve.shortest())
          .ifPresent(due -> needed.add(due.ticks()));
    }
    for (long finish : needed) {
      planFor(finish);
    }
  }

  /** Whether all that could be cheaper than a claimed plan is searched once more. */
  public static boolean isSearched(Case of, long relaxations) {
    return !of.isConvex() && relaxations >= 0 && relaxations <= Evidence.MOST_RELAXATIONS;
  }

  /** A search that knows the claimed plans needs no more relaxations than the one that did not. */
  private void requireNoneCheaper(Curve curve) throws ClaimRefuted {
    NavigableMap<Long, Plan> proved = new TreeMap<>();
    for (long finish : CurveCounting.durations(of, curve.longest(), curve.shortest())) {
      proved.put(finish, planFor(finish));
    }
    claim.unproved().forEach(gap -> proved.remove(gap.duration()));
    if (proved.containsKey(curve.longest())) {
      long asPlanned = Timing.earliest(network, Plan.allNormal(network)).finish();
      proved.put(BranchedPlans.far(curve.longest(), asPlanned), planFor(curve.longest()));
    }
    long[] durations = proved.descendingKeySet().stream().mapToLong(Long::longValue).toArray();
    if (durations.length == 0) {
      return;
    }
    Branching.Doubts doubts =
        Branching.doubts(
            priced,
            money.charges(),
            durations,
            List.copyOf(proved.descendingMap().values()),
            SEARCH_AGAIN * (claim.relaxations() + durations.length));
    for (long finish : doubts.cheaper()) {
      throw new ClaimRefuted(
          "evidence.plans, the one of " + text(finish),
          "a plan that can be bettered",
          "the cheapest");
    }
    for (long finish : doubts.open()) {
      throw new ClaimRefuted(
          "proof.unproved", "not the finish " + text(finish), "it, as its proof needs more");
    }
  }

  private Plan planFor(long finish) throws ClaimRefuted {
    require(
        claim.plans().containsKey(finish), "evidence.plans", "no plan for " + text(finish), "one");
    return known(finish);
  }

  private Plan known(long finish) {
    return claim.plans().get(finish);
  }

  private Plan scheduled(Plan durations) {
    if (money.isNone()) {
      return durations;
    }
    return sameWays(durations, claim.asPlanned()) ? claim.asPlanned() : claim.crashEverything();
  }

  private List<Unproved> unproved() throws ClaimRefuted {
    List<Unproved> recounted = new ArrayList<>();
    for (Unproved gap : claim.unproved()) {
      recounted.add(new Unproved(gap.duration(), cost(planFor(gap.duration())), gap.bound()));
    }
    return recounted;
  }

  /** What stepping costs is counted; what the linear programme found is taken, within rounding. */
  private CrossCheck crossCheck(Curve curve) throws ClaimRefuted {
    if (!of.isConvex()) {
      return claim.crossCheck();
    }
    TreeSet<Long> breakpoints = new TreeSet<>(List.of(curve.longest()));
    TreeSet<Long> points = new TreeSet<>(breakpoints);
    for (Step step : curve.steps()) {
      breakpoints.add(step.to());
      points.add(step.to());
      points.add(step.to() + step.ticks() / 2);
    }
    List<CrossCheck.Comparison> comparisons = new ArrayList<>();
    int atBreakpoints = 0;
    for (CrossCheck.Comparison claimed : claim.crossCheck().comparisons()) {
      String place = "crosscheck.points, the one of " + text(claimed.duration());
      require(points.contains(claimed.duration()), place, "this finish", "a point of the curve");
      CrossCheck.Comparison comparison =
          new CrossCheck.Comparison(
              claimed.duration(), curve.costAt(claimed.duration()), claimed.linear());
      require(
          comparison.difference().compareTo(MOST_DIFFERENCE) <= 0,
          place + ": lp_cost",
          claimed.linear().toString(),
          comparison.stepping().cents().toString());
      comparisons.add(comparison);
      atBreakpoints += breakpoints.contains(claimed.duration()) ? 1 : 0;
    }
    return new CrossCheck(
        comparisons, atBreakpoints, points.size(), claim.crossCheck().unanswered());
  }

  /** Whether every slope and rate is a whole number of units, so that none is rounded. */
  private boolean isExact() {
    BigInteger units = BigInteger.valueOf(Math.max(1, claim.slopeUnits()));
    return priced.activities().stream().map(Activity::slope).allMatch(slope -> fits(slope, units))
        && priced.spans().stream().map(Span::rate).allMatch(rate -> fits(rate, units));
  }

  private static boolean fits(Money slope, BigInteger units) {
    return units.mod(slope.denominator()).signum() == 0;
  }

  private String text(long ticks) {
    return network.scale().text(ticks);
  }

  private static void require(String place, Optional<Refuted> fault) throws ClaimRefuted {
    if (fault.isPresent()) {
      throw new ClaimRefuted(
          place, fault.get().where() + " " + fault.get().why(), "what the case allows");
    }
  }

  private static void require(boolean holds, String place, String found, String right)
      throws ClaimRefuted {
    if (!holds) {
      throw new ClaimRefuted(place, found, right);
    }
  }
}
