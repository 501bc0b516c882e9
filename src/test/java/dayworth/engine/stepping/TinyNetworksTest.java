package dayworth.engine.stepping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.testing.BruteForce;
import dayworth.testing.RandomNetworks;
import dayworth.testing.RandomNetworks.Kind;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;

/** Curves of tiny networks against every choice of durations, and laws of changed networks. */
class TinyNetworksTest {

  private static final int NETWORKS = 400;
  private static final long MOST_CHOICES = 20_000;

  /** Origin: enumeration. With whole data a whole plan is cheapest at every whole finish. */
  @Test
  void noChoiceOfWholeDurationsIsCheaperAtAnyFinish() {
    int compared = 0;
    for (long seed = 0; seed < NETWORKS; seed++) {
      Network network = RandomNetworks.of(seed, Kind.WHOLE, 2, 6);
      if (choices(network) > MOST_CHOICES) {
        continue;
      }
      compared++;
      TreeMap<Long, Money> least = new TreeMap<>(BruteForce.leastCosts(network));
      Curve curve = Stepping.curve(network, PieceWitness.NONE);
      assertEquals(least.firstKey(), curve.shortest(), "seed " + seed);
      Money best = least.firstEntry().getValue();
      for (long finish = curve.shortest(); finish <= curve.longest(); finish++) {
        best = best.min(least.getOrDefault(finish, best));
        assertEquals(best, curve.costAt(finish), "seed " + seed + " at " + finish);
      }
      Money ever = least.values().stream().reduce(Money::min).orElseThrow();
      assertEquals(ever, curve.costAt(curve.longest()), "seed " + seed);
    }
    assertTrue(compared > NETWORKS / 2, compared + " networks were small enough");
  }

  private static double choices(Network network) {
    return network.activities().stream()
        .mapToDouble(activity -> activity.mostShortening() + 1.0)
        .reduce(1, (a, b) -> a * b);
  }

  @Test
  void costsTimesSevenGiveTheCurveTimesSeven() {
    for (long seed = 0; seed < NETWORKS; seed++) {
      Network network = RandomNetworks.of(seed);
      List<Activity> dearer =
          network.activities().stream().map(TinyNetworksTest::sevenTimes).toList();
      Curve plain = Stepping.curve(network, PieceWitness.NONE);
      Curve scaled =
          Stepping.curve(new Network(network.scale(), dearer, network.links()), PieceWitness.NONE);
      assertEquals(plain.longest(), scaled.longest(), "seed " + seed);
      assertEquals(plain.shortest(), scaled.shortest(), "seed " + seed);
      for (long at = plain.shortest(); at <= plain.longest(); at += step(plain)) {
        assertEquals(plain.costAt(at).times(7), scaled.costAt(at), "seed " + seed + " at " + at);
      }
    }
  }

  private static Activity sevenTimes(Activity a) {
    return new Activity(
        a.id(),
        a.name(),
        a.group(),
        a.normal(),
        a.crash(),
        a.normalCost().times(7),
        a.crashCost().times(7),
        a.notBefore(),
        a.notFinishedBefore());
  }

  @Test
  void aLinkThatOthersImplyChangesNothing() {
    for (long seed = 0; seed < NETWORKS; seed++) {
      Network network = RandomNetworks.of(seed);
      List<Link> links = new ArrayList<>(network.links());
      for (Link first : network.links()) {
        for (Link second : network.links()) {
          if (first.successor() == second.predecessor()
              && !first.relation().fromStart()
              && first.relation().toStart()
              && second.equals(Link.finishToStart(second.predecessor(), second.successor()))) {
            links.add(
                new Link(first.predecessor(), second.successor(), first.relation(), first.lag()));
          }
        }
      }
      Curve plain = Stepping.curve(network, PieceWitness.NONE);
      Curve more =
          Stepping.curve(
              new Network(network.scale(), network.activities(), links), PieceWitness.NONE);
      assertEquals(plain.longest(), more.longest(), "seed " + seed);
      assertEquals(plain.shortest(), more.shortest(), "seed " + seed);
      for (long at = plain.shortest(); at <= plain.longest(); at += step(plain)) {
        assertEquals(plain.costAt(at), more.costAt(at), "seed " + seed + " at " + at);
      }
    }
  }

  private static long step(Curve curve) {
    return Math.max(1, (curve.longest() - curve.shortest()) / 25);
  }
}
