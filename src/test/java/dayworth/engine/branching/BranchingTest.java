package dayworth.engine.branching;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.ortools.Loader;
import com.google.ortools.sat.BoolVar;
import com.google.ortools.sat.CpModel;
import com.google.ortools.sat.CpSolver;
import com.google.ortools.sat.CpSolverStatus;
import com.google.ortools.sat.IntVar;
import com.google.ortools.sat.LinearExpr;
import com.google.ortools.sat.LinearExprBuilder;
import com.google.ortools.sat.Literal;
import dayworth.engine.PieceWitness;
import dayworth.engine.Ways;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Measure;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Relation;
import dayworth.network.Span;
import dayworth.testing.RandomMeasures;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;

/** Money that is not convex, against OR-Tools CP-SAT on a model of its own. */
class BranchingTest {

  private static final int CASES = 150;
  private static final long UNLIMITED = 1_000_000;
  private static final int HORIZON = 60;
  private static final List<Relation> RELATIONS = List.of(Relation.values());

  /** A table of money by the time of one moment; as a charge, and for CP-SAT. */
  private record Staircase(Moment moment, boolean rising, List<Long> table) implements Charge {

    @Override
    public String name() {
      return "staircase";
    }

    @Override
    public List<Moment> moments() {
      return List.of(moment);
    }

    @Override
    public boolean rises(int k) {
      return rising;
    }

    @Override
    public long[] points(int k, Window window) {
      return LongStream.rangeClosed(window.least(), window.most()).toArray();
    }

    @Override
    public Money at(long[] times) {
      return Money.of(table.get(Math.toIntExact(times[0])));
    }

    @Override
    public List<Part> within(List<Window> windows) {
      return List.of(time -> at(new long[] {time}));
    }
  }

  /** Hire by begun periods between two moments. */
  private record Periods(Moment from, Moment to, long length, long rate) implements Charge {

    @Override
    public String name() {
      return "periods";
    }

    @Override
    public List<Moment> moments() {
      return List.of(from, to);
    }

    @Override
    public boolean rises(int k) {
      return k == 1;
    }

    @Override
    public long[] points(int k, Window window) {
      return LongStream.rangeClosed(window.least(), window.most()).toArray();
    }

    @Override
    public Money at(long[] times) {
      return Money.of(rate * Math.max(0, -Math.floorDiv(times[0] - times[1], length)));
    }

    @Override
    public List<Part> within(List<Window> windows) {
      Window window = windows.get(0);
      if (window.least() == window.most()) {
        return List.of(time -> Money.ZERO, time -> at(new long[] {window.least(), time}));
      }
      return List.of(
          time -> Money.of(-rate * time).dividedBy(length),
          time -> Money.of(rate * time).dividedBy(length));
    }
  }

  @Test
  void costsAgreeWithConstraintProgrammingAtEveryFinish() {
    Loader.loadNativeLibraries();
    int withGap = 0;
    for (long seed = 0; seed < CASES; seed++) {
      Random random = new Random(seed);
      Network network = network(random);
      List<Charge> charges = charges(random, network);
      long shortest = Stepping.curve(network, PieceWitness.NONE).shortest();
      long[] durations = LongStream.rangeClosed(0, 7).map(k -> shortest + 7 - k).toArray();
      for (Point point : Branching.solve(network, charges, durations, UNLIMITED)) {
        String where = "seed " + seed + " at " + point.duration();
        assertTrue(point.isProved(), where);
        assertEquals(point.cost(), ChargedMoney.cost(network, charges, point.plan()), where);
        assertEquals(Money.of(leastCost(network, charges, point.duration())), point.cost(), where);
        withGap += point.branch().equals(Branch.whole(network, charges, durations[0])) ? 0 : 1;
      }
    }
    assertTrue(withGap > CASES, withGap + " points needed more than one branch");
  }

  /** All at once: measures, packages and ways that cannot be split, with spans and charges. */
  @Test
  void measuresAndMoneyOfMomentsTogetherAgreeWithConstraintProgramming() {
    Loader.loadNativeLibraries();
    int usesMeasures = 0;
    int compared = 0;
    for (long seed = 0; seed < CASES; seed++) {
      Random random = new Random(seed);
      Network network = RandomMeasures.with(network(random), seed, 2);
      network = network.withSpans(spans(random, network));
      List<Charge> charges =
          charges(random, network).stream().filter(BranchingTest::rewardsNoLateFinish).toList();
      long shortest = Stepping.shortest(Ways.reachable(network));
      long[] durations = LongStream.rangeClosed(0, 7).map(k -> shortest + 7 - k).toArray();
      List<Point> points = Branching.solve(network, charges, durations, UNLIMITED);
      for (int k = 0; k < durations.length; k++) {
        String where = "seed " + seed + " at " + durations[k];
        OptionalLong least = cheapest(network, charges, durations[k]);
        assertEquals(least.isPresent(), k < points.size(), where);
        if (least.isPresent()) {
          Point point = points.get(k);
          assertEquals(Money.of(least.getAsLong()), point.cost(), where);
          assertTrue(point.isProved(), where);
          assertEquals(point.cost(), ChargedMoney.cost(network, charges, point.plan()), where);
          assertEquals(
              Optional.empty(), ProofChecker.possible(network, point.plan(), durations[k]), where);
          usesMeasures += point.plan().usesMeasures() ? 1 : 0;
          compared++;
        }
      }
    }
    assertTrue(usesMeasures > 100, usesMeasures + " of " + compared + " use measures");
  }

  /** Where a later finish earned money, a longer way could be worth more than a shorter one. */
  private static boolean rewardsNoLateFinish(Charge charge) {
    return IntStream.range(0, charge.moments().size())
        .allMatch(k -> charge.rises(k) || !charge.moments().get(k).isFinish());
  }

  private static List<Span> spans(Random random, Network network) {
    List<Span> spans = new ArrayList<>();
    for (int count = random.nextInt(3); count > 0; count--) {
      Moment to = Moment.finishOf(random.nextInt(network.size()));
      Moment from =
          random.nextBoolean()
              ? Moment.PROJECT_START
              : Moment.startOf(random.nextInt(network.size()));
      spans.add(new Span("span", from, to, random.nextInt(9), Money.of(1 + random.nextInt(40))));
    }
    return spans;
  }

  /**
   * With too few problems allowed a bound and a gap remain, and the bound is not above the truth.
   */
  @Test
  void aLimitLeavesABoundThatHolds() {
    Loader.loadNativeLibraries();
    int open = 0;
    for (long seed = 0; seed < CASES; seed++) {
      Random random = new Random(seed);
      Network network = network(random);
      List<Charge> charges = charges(random, network);
      long shortest = Stepping.curve(network, PieceWitness.NONE).shortest();
      for (Point point : Branching.solve(network, charges, new long[] {shortest + 2}, 3)) {
        Money truth = Money.of(leastCost(network, charges, point.duration()));
        assertTrue(point.bound().compareTo(truth) <= 0, "seed " + seed);
        assertTrue(point.cost().compareTo(truth) >= 0, "seed " + seed);
        open += point.isProved() ? 0 : 1;
      }
    }
    assertTrue(open > 5, open + " stayed open");
  }

  private static Network network(Random random) {
    int size = 2 + random.nextInt(6);
    List<Activity> activities = new ArrayList<>();
    List<Link> links = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      long normal = random.nextInt(7);
      long crash = Math.max(0, normal - random.nextInt(4));
      Money extra = Money.of((normal - crash) * (random.nextInt(30) - 3L));
      activities.add(
          new Activity(
              "A" + i,
              "",
              "",
              normal,
              crash,
              Money.of(200),
              Money.of(200).plus(extra),
              random.nextInt(4) == 0 ? random.nextInt(5) : 0));
      if (i > 0) {
        Relation relation = RELATIONS.get(random.nextInt(4));
        links.add(new Link(random.nextInt(i), i, relation, random.nextInt(5) - 2));
      }
    }
    return new Network(TimeScale.WHOLE, activities, links);
  }

  private static List<Charge> charges(Random random, Network network) {
    List<Charge> charges = new ArrayList<>();
    for (int count = 1 + random.nextInt(3); count > 0; count--) {
      Moment moment = new Moment(random.nextInt(network.size()), random.nextBoolean());
      Moment other = new Moment(random.nextInt(network.size()), random.nextBoolean());
      if (random.nextInt(3) == 0 && !moment.equals(other)) {
        charges.add(new Periods(moment, other, 2 + random.nextInt(4), 10 + random.nextInt(60)));
      } else {
        charges.add(staircase(random, moment));
      }
    }
    return charges;
  }

  private static Staircase staircase(Random random, Moment moment) {
    long[] table = new long[HORIZON];
    boolean rising = random.nextBoolean();
    for (int t = 1; t < HORIZON; t++) {
      int step = random.nextInt(3) == 0 ? random.nextInt(80) : 0;
      table[t] = table[t - 1] + (rising ? step : -step);
    }
    return new Staircase(moment, rising, LongStream.of(table).boxed().toList());
  }

  private static long leastCost(Network network, List<Charge> charges, long deadline) {
    return cheapest(network, charges, deadline).orElseThrow();
  }

  /** The least cost by CP-SAT; empty if no plan finishes in time. */
  private static OptionalLong cheapest(Network network, List<Charge> charges, long deadline) {
    CpModel model = new CpModel();
    IntVar[] starts = new IntVar[network.size()];
    IntVar[] finishes = new IntVar[network.size()];
    LinearExprBuilder cost = LinearExpr.newBuilder();
    BoolVar[] paid = new BoolVar[network.measures().packages().size()];
    for (int p = 0; p < paid.length; p++) {
      paid[p] = model.newBoolVar("p" + p);
      cost.addTerm(paid[p], whole(network.measures().packages().get(p).cost()));
    }
    for (int i = 0; i < network.size(); i++) {
      starts[i] = model.newIntVar(network.activity(i).notBefore(), deadline, "s" + i);
      finishes[i] = model.newIntVar(0, deadline, "f" + i);
      LinearExpr work =
          LinearExpr.weightedSum(new IntVar[] {finishes[i], starts[i]}, new long[] {1, -1});
      cost.add(ways(model, network, i, work, paid));
    }
    for (Link link : network.links()) {
      IntVar from = (link.relation().fromStart() ? starts : finishes)[link.predecessor()];
      IntVar to = (link.relation().toStart() ? starts : finishes)[link.successor()];
      model.addGreaterOrEqual(
          LinearExpr.weightedSum(new IntVar[] {to, from}, new long[] {1, -1}), link.lag());
    }
    for (Span span : network.spans()) {
      IntVar beyond = model.newIntVar(0, deadline, "beyond");
      LinearExprBuilder apart =
          LinearExpr.newBuilder().add(event(span.to(), starts, finishes)).add(-span.free());
      if (!span.from().isProjectStart()) {
        apart.addTerm(event(span.from(), starts, finishes), -1);
      }
      model.addGreaterOrEqual(beyond, apart.build());
      cost.addTerm(beyond, whole(span.rate()));
    }
    for (Charge charge : charges) {
      cost.add(money(model, charge, starts, finishes));
    }
    model.minimize(cost);
    CpSolver solver = new CpSolver();
    solver.getParameters().setNumWorkers(1);
    CpSolverStatus status = solver.solve(model);
    if (status == CpSolverStatus.INFEASIBLE) {
      return OptionalLong.empty();
    }
    assertEquals(CpSolverStatus.OPTIMAL, status);
    return OptionalLong.of(Math.round(solver.objectiveValue()));
  }

  /** What an activity costs: along its line or at an end of it, or by one of its measures. */
  private static IntVar ways(
      CpModel model, Network network, int i, LinearExpr work, BoolVar[] paid) {
    Activity activity = network.activity(i);
    IntVar cost = model.newIntVar(-1_000_000, 1_000_000, "c" + i);
    List<BoolVar> ways = new ArrayList<>();
    long slope = whole(activity.slope());
    BoolVar plain = model.newBoolVar("plain" + i);
    ways.add(plain);
    if (activity.divisible()) {
      model.addLinearConstraint(work, activity.crash(), activity.normal()).onlyEnforceIf(plain);
    } else {
      BoolVar crashed = model.newBoolVar("crashed" + i);
      model
          .addEquality(work, activity.normal())
          .onlyEnforceIf(new Literal[] {plain, crashed.not()});
      model.addEquality(work, activity.crash()).onlyEnforceIf(new Literal[] {plain, crashed});
    }
    model
        .addEquality(
            LinearExpr.newBuilder().add(cost).addTerm(work, slope).build(),
            whole(activity.normalCost()) + slope * activity.normal())
        .onlyEnforceIf(plain);
    for (Measure measure : network.measures().list()) {
      if (measure.activity() == i) {
        BoolVar way = model.newBoolVar("way");
        ways.add(way);
        model.addEquality(work, measure.duration()).onlyEnforceIf(way);
        model.addEquality(cost, whole(measure.cost())).onlyEnforceIf(way);
        measure.inPackage().ifPresent(p -> model.addImplication(way, paid[p]));
      }
    }
    model.addExactlyOne(ways.toArray(BoolVar[]::new));
    return cost;
  }

  private static long whole(Money money) {
    return money.cents().longValueExact();
  }

  private static IntVar money(CpModel model, Charge charge, IntVar[] starts, IntVar[] finishes) {
    IntVar money = model.newIntVar(-1_000_000, 1_000_000, "money");
    if (charge instanceof Staircase stairs) {
      model.addElement(event(stairs.moment(), starts, finishes), toArray(stairs.table()), money);
    } else if (charge instanceof Periods hire) {
      IntVar periods = model.newIntVar(0, HORIZON, "periods");
      LinearExpr span =
          LinearExpr.newBuilder()
              .addTerm(periods, hire.length())
              .addTerm(event(hire.to(), starts, finishes), -1)
              .addTerm(event(hire.from(), starts, finishes), 1)
              .build();
      model.addGreaterOrEqual(span, 0);
      model.addEquality(money, LinearExpr.term(periods, hire.rate()));
    }
    return money;
  }

  private static long[] toArray(List<Long> table) {
    return table.stream().mapToLong(Long::longValue).toArray();
  }

  private static IntVar event(Moment moment, IntVar[] starts, IntVar[] finishes) {
    return (moment.isFinish() ? finishes : starts)[moment.activity()];
  }
}
