package dayworth.engine.branching;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.ortools.Loader;
import com.google.ortools.sat.CpModel;
import com.google.ortools.sat.CpSolver;
import com.google.ortools.sat.CpSolverStatus;
import com.google.ortools.sat.IntVar;
import com.google.ortools.sat.LinearExpr;
import com.google.ortools.sat.LinearExprBuilder;
import dayworth.engine.PieceWitness;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Relation;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
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
    CpModel model = new CpModel();
    IntVar[] starts = new IntVar[network.size()];
    IntVar[] finishes = new IntVar[network.size()];
    LinearExprBuilder cost = LinearExpr.newBuilder();
    for (int i = 0; i < network.size(); i++) {
      Activity activity = network.activity(i);
      starts[i] = model.newIntVar(activity.notBefore(), deadline, "s" + i);
      finishes[i] = model.newIntVar(0, deadline, "f" + i);
      LinearExpr work =
          LinearExpr.weightedSum(new IntVar[] {finishes[i], starts[i]}, new long[] {1, -1});
      model.addLinearConstraint(work, activity.crash(), activity.normal());
      long slope = activity.slope().cents().longValueExact();
      cost.add(activity.normalCost().cents().longValueExact() + slope * activity.normal());
      cost.addTerm(finishes[i], -slope).addTerm(starts[i], slope);
    }
    for (Link link : network.links()) {
      IntVar from = (link.relation().fromStart() ? starts : finishes)[link.predecessor()];
      IntVar to = (link.relation().toStart() ? starts : finishes)[link.successor()];
      model.addGreaterOrEqual(
          LinearExpr.weightedSum(new IntVar[] {to, from}, new long[] {1, -1}), link.lag());
    }
    for (Charge charge : charges) {
      cost.add(money(model, charge, starts, finishes));
    }
    model.minimize(cost);
    CpSolver solver = new CpSolver();
    solver.getParameters().setNumWorkers(1);
    assertEquals(CpSolverStatus.OPTIMAL, solver.solve(model));
    return Math.round(solver.objectiveValue());
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
