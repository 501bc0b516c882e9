package dayworth.engine.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.engine.Obstacle;
import dayworth.engine.Obstacle.AtShortest;
import dayworth.engine.Obstacle.CannotBeLonger;
import dayworth.engine.Obstacle.Lag;
import dayworth.engine.Obstacle.NotBefore;
import dayworth.engine.Obstacle.NotFinishedBefore;
import dayworth.engine.PieceWitness;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Relation;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class StoppingChainTest {

  private static final Network REVERSE = HandWorked.reverse().network();

  /** By hand: A 6 + 2 − B 8 + 1 + C 7 = 8. */
  private static final List<Obstacle> CHAIN =
      List.of(
          new AtShortest(0, 6),
          new Lag(0, 2),
          new CannotBeLonger(1, -8),
          new Lag(1, 1),
          new AtShortest(2, 7));

  @Test
  void aChainThatPassesAnActivityBackwardsStops() {
    assertEquals(Optional.empty(), ProofChecker.stops(REVERSE, CHAIN, 8));
  }

  @Test
  void anotherSumIsRefuted() {
    assertEquals("project", ProofChecker.stops(REVERSE, CHAIN, 9).orElseThrow().where());
  }

  @Test
  void aTermLeftOutIsRefutedAtTheTermAfterIt() {
    List<String> after =
        List.of("link A to B FF", "activity B", "link B to C SS", "activity C", "activity C");
    for (int left = 0; left < CHAIN.size(); left++) {
      List<Obstacle> obstacles = new ArrayList<>(CHAIN);
      long shortest = 8 - obstacles.remove(left).ticks();
      String where = ProofChecker.stops(REVERSE, obstacles, shortest).orElseThrow().where();
      assertEquals(after.get(left), where, "without term " + left);
    }
  }

  @Test
  void aTickTooManyIsRefutedAtItsTerm() {
    List<Obstacle> obstacles = new ArrayList<>(CHAIN);
    obstacles.set(2, new CannotBeLonger(1, -7));
    assertEquals("activity B", ProofChecker.stops(REVERSE, obstacles, 9).orElseThrow().where());
  }

  @Test
  void aNotBeforeTimeBeginsAChainAndALinkWithoutLagNeedsNoTerm() {
    Money none = Money.ZERO;
    Activity late = new Activity("L", "", "", 3, 3, none, none, 4);
    Network network =
        new Network(
            TimeScale.WHOLE,
            List.of(late, Activity.fixed("M", 2, none), Activity.fixed("N", 5, none)),
            List.of(Link.finishToStart(0, 1)));
    // By hand: not before 4, then 3, then 2, together 9.
    List<Obstacle> obstacles =
        List.of(new NotBefore(0, 4), new AtShortest(0, 3), new AtShortest(1, 2));
    assertEquals(Optional.empty(), ProofChecker.stops(network, obstacles, 9));
    List<Obstacle> apart = List.of(new AtShortest(0, 3), new AtShortest(2, 5));
    assertEquals("activity N", ProofChecker.stops(network, apart, 8).orElseThrow().where());
    assertTrue(ProofChecker.stops(network, List.of(new AtShortest(7, 9)), 9).isPresent());
    List<Obstacle> twice = List.of(new AtShortest(0, 3), new NotBefore(1, 0));
    assertEquals("activity M", ProofChecker.stops(network, twice, 3).orElseThrow().where());
  }

  /** By hand: M is done at 9 at the earliest, begins no later than at 7, so N, SS 1, ends at 13. */
  @Test
  void aFinishThatHasToWaitBeginsAChain() {
    Money none = Money.ZERO;
    Network network =
        new Network(
            TimeScale.WHOLE,
            List.of(
                new Activity("M", "", "", 2, 2, none, none, 0, 9), Activity.fixed("N", 5, none)),
            List.of(new Link(0, 1, Relation.SS, 1)));
    List<Obstacle> obstacles =
        List.of(
            new NotFinishedBefore(0, 9),
            new CannotBeLonger(0, -2),
            new Lag(0, 1),
            new AtShortest(1, 5));
    assertEquals(obstacles, Stepping.curve(network, PieceWitness.NONE).obstacles());
    assertEquals(Optional.empty(), ProofChecker.stops(network, obstacles, 13));
    List<Obstacle> early = List.of(new NotFinishedBefore(0, 8));
    assertEquals("activity M", ProofChecker.stops(network, early, 8).orElseThrow().where());
    assertTrue(ProofChecker.stops(network, List.of(new NotFinishedBefore(7, 9)), 9).isPresent());
  }
}
