package dayworth.engine.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.engine.Flow;
import dayworth.engine.Flow.Over;
import dayworth.engine.proof.Verdict.Proved;
import dayworth.engine.proof.Verdict.Refuted;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.testing.OutsideProof;
import dayworth.testing.OutsideSolver;
import dayworth.testing.RandomNetworks;
import dayworth.value.Money;
import dayworth.value.SlopeScale;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class ProofCheckerTest {

  private static final Money CENT = Money.of(new BigDecimal("0.01"));

  static List<HandWorked> handWorked() {
    return HandWorked.all();
  }

  @ParameterizedTest
  @MethodSource("handWorked")
  void oneFlowProvesBothEndsOfItsPiece(HandWorked worked) {
    ProofChecker checker = new ProofChecker(worked.network());
    FlowBound bound = checker.bound(worked.flow());
    assertEquals(Optional.empty(), bound.fault());
    for (HandWorked.Point point : List.of(worked.from(), worked.to())) {
      Verdict verdict = checker.check(point.plan(), point.finish(), bound, point.cost());
      assertEquals(new Proved(point.cost(), point.cost()), verdict, worked.name());
    }
  }

  @ParameterizedTest
  @MethodSource("handWorked")
  void oneUnitOfFlowMoreOrLessIsRefutedWhereItIs(HandWorked worked) {
    for (Over over : Over.values()) {
      int count =
          switch (over) {
            case LINK -> worked.network().links().size();
            case SPAN -> worked.network().spans().size();
            default -> worked.network().size();
          };
      for (int index = 0; index < count; index++) {
        for (long unit : new long[] {-1, 1}) {
          long right = worked.flow().get(over, index);
          worked.flow().set(over, index, right + unit);
          Refuted refuted = refuted(worked, worked.to().plan(), worked.to().cost());
          String what = worked.name() + " " + over + " " + index + ": " + refuted;
          assertTrue(places(worked.network(), over, index).contains(refuted.where()), what);
          worked.flow().set(over, index, right);
        }
      }
    }
  }

  /** Round and round the same length: conserved, the bound unchanged, only the limit is broken. */
  @ParameterizedTest
  @MethodSource("handWorked")
  void flowBeyondALimitIsRefutedThoughItIsConserved(HandWorked worked) {
    for (int i = 0; i < worked.network().size(); i++) {
      for (boolean normal : new boolean[] {true, false}) {
        Over limited = normal ? Over.SLOPE : Over.BACK_OVER_CRASH;
        Over unlimited = normal ? Over.BACK_OVER_NORMAL : Over.CRASH;
        long[] right = {worked.flow().get(limited, i), worked.flow().get(unlimited, i)};
        long most = limit(worked.network().activity(i), normal);
        long more = most + 1 - right[0];
        worked.flow().set(limited, i, right[0] + more);
        worked.flow().set(unlimited, i, right[1] + more);
        Refuted refuted = refuted(worked, worked.to().plan(), worked.to().cost());
        assertEquals("activity " + worked.network().activity(i).id(), refuted.where());
        assertTrue(refuted.why().endsWith("carries " + (most + 1) + "; 0 to " + most));
        worked.flow().set(limited, i, right[0]);
        worked.flow().set(unlimited, i, right[1]);
      }
    }
  }

  /** The slopes of the hand-worked networks are whole, and so is their scale. */
  private static long limit(Activity activity, boolean normal) {
    Money slope = normal ? activity.slope() : activity.slope().negate();
    return slope.max(Money.ZERO).numerator().longValueExact();
  }

  @ParameterizedTest
  @MethodSource("handWorked")
  void oneTickOfDurationMoreOrLessIsRefuted(HandWorked worked) {
    for (int i = 0; i < worked.network().size(); i++) {
      for (long tick : new long[] {-1, 1}) {
        long[] durations = worked.to().plan().toArray();
        durations[i] += tick;
        Refuted refuted = refuted(worked, Plan.of(durations), worked.to().cost());
        Activity activity = worked.network().activity(i);
        if (durations[i] < activity.crash() || durations[i] > activity.normal()) {
          assertEquals("activity " + activity.id(), refuted.where(), worked.name());
        }
      }
    }
  }

  @ParameterizedTest
  @MethodSource("handWorked")
  void oneCentOfCostMoreOrLessIsRefuted(HandWorked worked) {
    for (Money claimed : List.of(worked.to().cost().plus(CENT), worked.to().cost().minus(CENT))) {
      assertEquals("project", refuted(worked, worked.to().plan(), claimed).where());
    }
  }

  @ParameterizedTest
  @MethodSource("handWorked")
  void aFinishOneTickEarlierIsRefutedAtAnActivityThatFinishesLater(HandWorked worked) {
    ProofChecker checker = new ProofChecker(worked.network());
    HandWorked.Point point = worked.to();
    Verdict verdict = checker.check(point.plan(), point.finish() - 1, worked.flow(), point.cost());
    assertTrue(assertInstanceOf(Refuted.class, verdict).why().startsWith("finishes at"));
  }

  @Test
  void aDearerPlanIsRefutedThoughItsCostIsCountedRight() {
    HandWorked series = HandWorked.series();
    // By hand: A 3 and B 4 meet 7 for 300 + 30 + 50 = 380; the flow proves 360.
    Refuted refuted = refuted(series, 7, Plan.of(new long[] {3, 4}), Money.of(380));
    assertEquals(new Refuted("project", "costs 380 and the flow proves only 360; equal"), refuted);
  }

  @Test
  void amountsThatOverflowAreRefutedNotWrapped() {
    HandWorked series = HandWorked.series();
    for (Over over : List.of(Over.FROM_PROJECT, Over.BACK_OVER_NORMAL)) {
      series.flow().set(over, 0, Long.MAX_VALUE);
    }
    Refuted refuted = refuted(series, series.to().plan(), series.to().cost());
    assertEquals(new Refuted("activity A", "carries more than can be counted"), refuted);
  }

  /**
   * By hand: a slope of 1/3 is 349525 of 1048576; 3 ticks of it are 1048575, one unit short of the
   * cost of 1. On a scale of 100 it is 33, and 0.99 leaves more than half a cent.
   */
  @Test
  void aRoundedScaleMayLeaveLessThanHalfACentAndAnExactOneNothing() {
    Verdict fine = thirds(new SlopeScale(1 << 20, false));
    assertEquals(new Proved(Money.of(1), Money.of(1048575).dividedBy(1 << 20)), fine);
    assertInstanceOf(Refuted.class, thirds(new SlopeScale(1 << 20, true)));
    assertInstanceOf(Refuted.class, thirds(new SlopeScale(100, false)));
    assertInstanceOf(Refuted.class, thirds(new SlopeScale(-1, true)));
  }

  private static Verdict thirds(SlopeScale scale) {
    Activity activity = Activity.compressible("A", 4, Money.ZERO, 1, Money.of(1));
    Network network = new Network(TimeScale.WHOLE, List.of(activity), List.of());
    Flow flow = new Flow(scale, network);
    for (Over over : List.of(Over.FROM_PROJECT, Over.SLOPE, Over.TO_PROJECT)) {
      flow.set(over, 0, Math.max(0, scale.perUnit() / 3));
    }
    return new ProofChecker(network).check(Plan.allCrash(network), 1, flow, Money.of(1));
  }

  /** Expected: GLOP's plan and dual values, which know nothing of this checker. */
  @Test
  void provesWhatAnOutsideSolverFindsOnRandomNetworks() {
    int proved = 0;
    for (long seed = 1; seed <= 500; seed++) {
      Network network = RandomNetworks.of(seed);
      Optional<SlopeScale> scale = scale(network);
      if (scale.isEmpty() || !scale.get().exact() || scale.get().perUnit() > 1_000_000) {
        continue;
      }
      long shortest = OutsideSolver.shortest(network).orElseThrow();
      long normal = Timing.earliest(network, Plan.allNormal(network)).finish();
      ProofChecker checker = new ProofChecker(network);
      for (long finish : List.of(shortest, (shortest + normal) / 2, normal)) {
        OutsideProof proof = OutsideSolver.proof(network, finish, scale.get());
        Money cost = proof.plan().directCost(network);
        Verdict verdict = checker.check(proof.plan(), finish, proof.flow(), cost);
        assertEquals(new Proved(cost, cost), verdict, "seed " + seed + " at " + finish);
        proved++;
      }
    }
    assertTrue(proved > 150, "only " + proved + " compared");
  }

  private static Optional<SlopeScale> scale(Network network) {
    List<Money> slopes =
        network.activities().stream().map(a -> a.slope().max(a.slope().negate())).toList();
    long[] ticks = network.activities().stream().mapToLong(Activity::mostShortening).toArray();
    return SlopeScale.fit(slopes, ticks);
  }

  private static Refuted refuted(HandWorked worked, Plan plan, Money cost) {
    return refuted(worked, worked.to().finish(), plan, cost);
  }

  private static Refuted refuted(HandWorked worked, long finish, Plan plan, Money cost) {
    Flow flow = worked.flow();
    Verdict verdict = new ProofChecker(worked.network()).check(plan, finish, flow, cost);
    return assertInstanceOf(Refuted.class, verdict, worked.name());
  }

  /** Where a wrong amount can show: at the constraint, or at the events that it joins. */
  private static Set<String> places(Network network, Over over, int index) {
    if (over != Over.LINK) {
      return Set.of("activity " + network.activity(index).id());
    }
    Link link = network.link(index);
    return Set.of(
        Place.link(network, index),
        "activity " + network.activity(link.predecessor()).id(),
        "activity " + network.activity(link.successor()).id());
  }
}
