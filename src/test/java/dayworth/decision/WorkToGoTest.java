package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.decision.Status.Crash;
import dayworth.decision.Status.Finished;
import dayworth.decision.Status.InProgress;
import dayworth.decision.Status.NotStarted;
import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.engine.linear.Answer;
import dayworth.engine.linear.LinearProgramme;
import dayworth.engine.proof.FlowBound;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.proof.Verdict;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Relation;
import dayworth.network.Span;
import dayworth.testing.RandomNetworks;
import dayworth.testing.RandomNetworks.Kind;
import dayworth.testing.RandomStatuses;
import dayworth.testing.StatusBruteForce;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.time.LocalDate;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;

/** What a status leaves of a network: by hand, and against every choice there is. */
class WorkToGoTest {

  private static final int NETWORKS = 3_000;
  private static final long MOST_CHOICES = 5_000;
  private static final LocalDate DAY = LocalDate.of(2027, 7, 16);
  private static final Status TO_COME = new NotStarted();

  private static Status finished(long start, long finish) {
    return new Finished(DAY, DAY, start, finish);
  }

  private static Status started(long start, long remaining) {
    return new InProgress(DAY, start, remaining, Optional.empty());
  }

  private static Activity tenDays(String id) {
    return Activity.compressible(id, 10, Money.of(1_000), 6, Money.of(1_400));
  }

  private static WorkToGo work(List<Activity> activities, List<Link> links, List<Status> statuses) {
    Network planned = new Network(TimeScale.WHOLE, activities, links);
    return WorkToGo.of(planned, Optional.of(new Progress(DAY, statuses)));
  }

  /**
   * By hand: of 10 days at 1,000, 5 remain: 500. Of the 4 that could be taken out 2 are left, at
   * 100 each.
   */
  @Test
  void whatRemainsIsCompressedInProportionAndAtTheSameSlope() {
    Activity rest =
        work(List.of(tenDays("A")), List.of(), List.of(started(-7, 5))).network().activity(0);
    assertEquals(new Activity("A", "", "", 5, 3, Money.of(500), Money.of(700), 0), rest);
  }

  /** 4 of 10 days remain: 400. 6/10 of them are 2.4, so 3 days are the shortest on whole ticks. */
  @Test
  void aShortestDurationBetweenTwoTicksIsRoundedUp() {
    Activity rest =
        work(List.of(tenDays("A")), List.of(), List.of(started(-7, 4))).network().activity(0);
    assertEquals(new Activity("A", "", "", 4, 3, Money.of(400), Money.of(500), 0), rest);
  }

  @Test
  void whatTheStatusSaysOfTheRestHolds() {
    Status status = new InProgress(DAY, -7, 5, Optional.of(new Crash(1, Money.of(900))));
    Activity rest = work(List.of(tenDays("A")), List.of(), List.of(status)).network().activity(0);
    assertEquals(new Activity("A", "", "", 5, 1, Money.of(500), Money.of(900), 0), rest);
  }

  /**
   * By hand: A was finished at -5, begun at -10; B began at -4 and has 5 days left. A to C, FS 8:
   * not before 3. B to D, SS 7: not before 3. B to E, SF 9: not finished before 5. A to F, FF 7:
   * not finished before 2; A to F, SS 1: past. B to G, FF 1 is still to come.
   */
  @Test
  void linksFromWhatHasHappenedBecomeEarliestTimes() {
    WorkToGo work =
        work(
            List.of("A", "B", "C", "D", "E", "F", "G").stream().map(WorkToGoTest::tenDays).toList(),
            List.of(
                new Link(0, 2, Relation.FS, 8),
                new Link(1, 3, Relation.SS, 7),
                new Link(1, 4, Relation.SF, 9),
                new Link(0, 5, Relation.FF, 7),
                new Link(0, 5, Relation.SS, 1),
                new Link(1, 6, Relation.FF, 1)),
            List.of(
                finished(-10, -5), started(-4, 5), TO_COME, TO_COME, TO_COME, TO_COME, TO_COME));
    Network network = work.network();
    assertEquals(List.of(5), work.links());
    assertEquals(List.of(new Link(1, 6, Relation.FF, 1)), network.links());
    assertEquals(List.of(0L, 0L, 3L, 3L, 0L, 0L, 0L), all(network, Activity::notBefore));
    assertEquals(List.of(0L, 0L, 0L, 0L, 5L, 2L, 0L), all(network, Activity::notFinishedBefore));
    assertEquals(Activity.fixed("A", 0, Money.ZERO), network.activity(0));
  }

  private static List<Long> all(
      Network network, java.util.function.Function<Activity, Long> property) {
    return network.activities().stream().map(property).toList();
  }

  /** By hand: what remains of B waits for A's 10 days, though B has begun; then 5: 15. */
  @Test
  void workBegunOutOfSequenceGoesOnWhenItsPredecessorIsDone() {
    Network network =
        work(
                List.of(tenDays("A"), tenDays("B"), tenDays("C")),
                List.of(Link.finishToStart(0, 1), Link.finishToStart(1, 2)),
                List.of(TO_COME, started(-2, 5), finished(-1, 0)))
            .network();
    assertEquals(List.of(Link.finishToStart(0, 1)), network.links());
    assertEquals(15, Stepping.curve(network, PieceWitness.NONE).longest());
  }

  /**
   * By hand: a hire from A, begun at -4, to C's finish costs from now on. One with 6 free ticks has
   * 2 left. One from the finished B to the start of A is over. A section keeps what is free.
   */
  @Test
  void moneyThatRunsFromWhatHasHappenedRunsFromNow() {
    Money rate = Money.of(100);
    Network planned =
        new Network(
            TimeScale.WHOLE,
            List.of(tenDays("A"), tenDays("B"), tenDays("C")),
            List.of(),
            List.of(
                new Span("hire", Moment.startOf(0), Moment.finishOf(2), 0, rate),
                new Span("free", Moment.startOf(0), Moment.finishOf(2), 6, rate),
                new Span("over", Moment.finishOf(1), Moment.startOf(0), 0, rate),
                new Span("to come", Moment.startOf(2), Moment.finishOf(0), 0, rate),
                new Span("section", Moment.PROJECT_START, Moment.finishOf(2), 9, rate)));
    List<Status> statuses = List.of(started(-4, 5), finished(-9, -3), TO_COME);
    Moment now = Moment.PROJECT_START;
    assertEquals(
        List.of(
            new Span("hire", now, Moment.finishOf(2), 0, rate),
            new Span("free", now, Moment.finishOf(2), 2, rate),
            new Span("to come", Moment.startOf(2), Moment.finishOf(0), 0, rate),
            new Span("section", now, Moment.finishOf(2), 9, rate)),
        WorkToGo.of(planned, Optional.of(new Progress(DAY, statuses))).network().spans());
  }

  /** A law: where nothing has started, all is to go. */
  @Test
  void withoutProgressTheNetworkIsThePlannedOne() {
    for (long seed = 0; seed < 200; seed++) {
      Network planned = RandomNetworks.of(seed, Kind.WITH_SPANS, 2, 20);
      List<Status> none = Collections.nCopies(planned.size(), TO_COME);
      Network toGo = WorkToGo.of(planned, Optional.of(new Progress(DAY, none))).network();
      assertEquals(planned.activities(), toGo.activities(), "seed " + seed);
      assertEquals(planned.links(), toGo.links(), "seed " + seed);
      assertEquals(planned.spans(), toGo.spans(), "seed " + seed);
    }
  }

  /** Origin: enumeration, with true times below zero. */
  @Test
  void noChoiceOfWholeDurationsIsCheaperAtAnyFinish() {
    int compared = 0;
    for (long seed = 0; seed < NETWORKS; seed++) {
      Network planned = RandomNetworks.of(seed, Kind.WHOLE, 2, 7);
      Progress progress = RandomStatuses.of(planned, seed);
      if (StatusBruteForce.choices(planned, progress.statuses()) > MOST_CHOICES) {
        continue;
      }
      compared++;
      TreeMap<Long, Money> least =
          new TreeMap<>(StatusBruteForce.leastCosts(planned, progress.statuses()));
      Network network = WorkToGo.of(planned, Optional.of(progress)).network();
      Curve curve = Stepping.curve(network, PieceWitness.NONE);
      assertEquals(least.firstKey(), curve.shortest(), "seed " + seed);
      Money best = least.firstEntry().getValue();
      for (long finish = curve.shortest(); finish <= curve.longest(); finish++) {
        best = best.min(least.getOrDefault(finish, best));
        assertEquals(best, curve.costAt(finish), "seed " + seed + " at " + finish);
      }
      Money ever = least.values().stream().reduce(Money::min).orElseThrow();
      assertEquals(ever, curve.firstCost(), "seed " + seed);
    }
    assertTrue(compared > NETWORKS / 2, compared + " networks were small enough");
  }

  /** The second way and the checker, on what statuses leave of larger networks. */
  @Test
  void whatIsToGoIsProvedAndTheLinearProgrammeAgrees() {
    for (long seed = 0; seed < 300; seed++) {
      Network planned = RandomNetworks.of(seed, Kind.WHOLE, 5, 40);
      Progress progress = RandomStatuses.of(planned, seed);
      Network network = WorkToGo.of(planned, Optional.of(progress)).network();
      ProofChecker checker = new ProofChecker(network);
      String which = "seed " + seed;
      Curve curve =
          Stepping.curve(
              network,
              (from, fromPlan, to, toPlan, flow) -> {
                FlowBound bound = checker.bound(flow);
                Money cost = toPlan.directCost(network);
                assertInstanceOf(
                    Verdict.Proved.class, checker.check(toPlan, to, bound, cost), which);
              });
      assertEquals(
          Optional.empty(),
          ProofChecker.stops(network, curve.obstacles(), curve.shortest()),
          which);
      assertEquals(
          new Answer.Least(curve.costAt(curve.shortest()).cents()),
          new LinearProgramme(network).at(curve.shortest()),
          which);
    }
  }
}
