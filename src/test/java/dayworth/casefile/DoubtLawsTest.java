package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTimeout;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.decision.Notice;
import dayworth.decision.WorkToGo;
import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Relation;
import dayworth.testing.RandomNetworks;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.time.Duration;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/** What the rules for links and dates say, against other ways to find it, on seeded networks. */
class DoubtLawsTest {

  private static final int SEEDS = 400;

  /** Link j stands in line j, so that a warning's place tells its link. */
  private static ReadCase read(Network network) {
    Findings none = new Findings();
    List<ActivityRow> rows = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      Optional<BigDecimal> blank = Optional.empty();
      rows.add(
          new ActivityRow(
              i,
              network.activity(i).id(),
              "",
              "",
              blank,
              blank,
              blank,
              blank,
              true,
              Optional.empty(),
              List.of()));
    }
    List<LinkRow> links = new ArrayList<>();
    for (int j = 0; j < network.links().size(); j++) {
      Link link = network.link(j);
      links.add(
          new LinkRow(
              new Place("links.csv", j, ""),
              link.predecessor(),
              link.successor(),
              link.relation(),
              network.scale().units(link.lag())));
    }
    return new ReadCase(
        WorkToGo.of(network, Optional.empty()),
        rows,
        links,
        links,
        List.of(),
        List.of(),
        TermsTable.read(Optional.empty(), none),
        Optional.empty());
  }

  private static Set<Integer> implied(Network network) {
    Findings findings = new Findings();
    ImpliedLinks.report(read(network), findings);
    WeakerLinks.report(read(network), findings);
    Set<Integer> lines = new TreeSet<>();
    findings.warnings().stream().map(Notice::line).forEach(lines::add);
    assertEquals(lines.size(), findings.warnings().size(), "a link is warned of once");
    return lines;
  }

  private static Network without(Network network, Set<Integer> gone) {
    List<Link> kept = new ArrayList<>();
    for (int j = 0; j < network.links().size(); j++) {
      if (!gone.contains(j)) {
        kept.add(network.link(j));
      }
    }
    return new Network(network.scale(), network.activities(), kept);
  }

  /** A network drawn from a seed, with plain links thrown in. */
  private static Network drawn(int seed) {
    Network network = RandomNetworks.of(seed, RandomNetworks.Kind.EVERYTHING, 3, 12);
    Random random = new Random(seed);
    List<Link> links = new ArrayList<>(network.links());
    for (int k = 0; k < network.size(); k++) {
      int one = random.nextInt(network.size());
      int other = random.nextInt(network.size());
      if (one < other) {
        int from = network.inOrder(one);
        int to = network.inOrder(other);
        Link link = new Link(from, to, Relation.FS, random.nextInt(4));
        if (!links.contains(link)) {
          links.add(link);
        }
      }
    }
    return new Network(network.scale(), network.activities(), links);
  }

  /** All chains are walked, one after the other. */
  private static boolean isImplied(Network network, int index) {
    Link link = network.link(index);
    for (Link other : network.links()) {
      if (other.predecessor() == link.predecessor()
          && other.successor() == link.successor()
          && other.relation() == link.relation()
          && other.lag() > link.lag()) {
        return true;
      }
    }
    return link.relation() == Relation.FS
        && link.lag() >= 0
        && longest(network, link.predecessor(), link, 0, 0) >= link.lag();
  }

  private static long longest(Network network, int from, Link link, int links, long length) {
    if (from == link.successor()) {
      return links >= 2 ? length : -1;
    }
    long longest = -1;
    long finish = links == 0 ? 0 : length + network.activity(from).crash();
    for (Link next : network.links()) {
      if (next.predecessor() == from && next.relation() == Relation.FS && next.lag() >= 0) {
        longest =
            Math.max(
                longest, longest(network, next.successor(), link, links + 1, finish + next.lag()));
      }
    }
    return longest;
  }

  @Test
  void aLinkIsImpliedExactlyWhereAWalkOfAllChainsFindsOne() {
    int found = 0;
    for (int seed = 0; seed < SEEDS; seed++) {
      Network network = drawn(seed);
      Set<Integer> expected = new TreeSet<>();
      for (int j = 0; j < network.links().size(); j++) {
        if (isImplied(network, j)) {
          expected.add(j);
        }
      }
      found += expected.size();
      assertEquals(expected, implied(network), "seed " + seed);
    }
    assertTrue(found > SEEDS, "the networks have too few implied links: " + found);
  }

  /** A law: a redundant link changes nothing. */
  @Test
  void takingOutAllImpliedLinksLeavesTheCurveAsItIs() {
    for (int seed = 0; seed < SEEDS; seed++) {
      Network network = drawn(seed);
      Curve with = Stepping.curve(network, PieceWitness.NONE);
      Curve without = Stepping.curve(without(network, implied(network)), PieceWitness.NONE);
      assertEquals(with.longest(), without.longest(), "seed " + seed);
      assertEquals(with.shortest(), without.shortest(), "seed " + seed);
      for (long finish = with.shortest(); finish <= with.longest(); finish++) {
        assertEquals(with.costAt(finish), without.costAt(finish), "seed " + seed);
        finish += (with.longest() - with.shortest()) / 50;
      }
    }
  }

  /** How long the chain's own terms make it: they are tried in every way that joins its ends. */
  private static long longest(Network network, ShortestFinish shortest) {
    List<Integer> chain = shortest.chain();
    long best = Long.MIN_VALUE;
    // by activity of the chain: the longest time to its start and to its finish
    long start = Long.MIN_VALUE / 4;
    long finish = Long.MIN_VALUE / 4;
    for (int k = 0; k < chain.size(); k++) {
      Activity activity = network.activity(chain.get(k));
      long nextStart = k == 0 ? activity.notBefore() : Long.MIN_VALUE / 4;
      long nextFinish = k == 0 ? activity.notFinishedBefore() : Long.MIN_VALUE / 4;
      for (Link link : network.links()) {
        if (k > 0 && link.predecessor() == chain.get(k - 1) && link.successor() == chain.get(k)) {
          long bound = (link.relation().fromStart() ? start : finish) + link.lag();
          nextStart = link.relation().toStart() ? Math.max(nextStart, bound) : nextStart;
          nextFinish = link.relation().toStart() ? nextFinish : Math.max(nextFinish, bound);
        }
      }
      start = Math.max(nextStart, nextFinish - activity.normal());
      finish = Math.max(nextFinish, start + activity.crash());
      best = finish;
    }
    return chain.isEmpty() ? 0 : best;
  }

  /** The other way to the shortest finish is the whole curve. */
  @Test
  void theShortestFinishIsWhereTheCurveEnds() {
    for (int seed = 0; seed < SEEDS; seed++) {
      Network network = drawn(seed);
      ShortestFinish shortest = ShortestFinish.of(network);
      assertEquals(
          Stepping.curve(network, PieceWitness.NONE).shortest(), shortest.ticks(), "seed " + seed);
      assertEquals(shortest.ticks(), longest(network, shortest), "seed " + seed);
      for (int i = 0; i < network.size(); i++) {
        boolean holds = ShortestFinish.with(network, i, 0).ticks() < shortest.ticks();
        assertTrue(!holds || shortest.origin() == i, "seed " + seed + ", activity " + i);
      }
    }
  }

  @Test
  void tenThousandActivitiesTakeNoTimeToSpeakOf() {
    Random random = new Random(1);
    List<Activity> activities = new ArrayList<>();
    Set<Link> links = new LinkedHashSet<>();
    for (int i = 0; i < 10_000; i++) {
      activities.add(Activity.fixed("A" + i, 1 + random.nextInt(9), Money.ZERO));
      for (int k = 0; k < Math.min(i, 4); k++) {
        links.add(Link.finishToStart(random.nextInt(i), i));
      }
    }
    Network network = new Network(TimeScale.WHOLE, activities, List.copyOf(links));
    assertTimeout(Duration.ofSeconds(20), () -> assertTrue(implied(network).size() > 100));
  }
}
