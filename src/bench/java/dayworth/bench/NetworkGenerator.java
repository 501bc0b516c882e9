package dayworth.bench;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Relation;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;

/**
 * Made-up networks of any size: the same seed gives the same network. Durations and lags are whole
 * days, costs and slopes whole money; about 70 % of the activities can be compressed, to 50-90 % of
 * their normal duration.
 */
final class NetworkGenerator {

  private static final int MOST_WIDE_DAYS = 20;

  private final SplittableRandom random;
  private final List<Activity> activities = new ArrayList<>();
  private final List<Link> links = new ArrayList<>();

  private NetworkGenerator(long seed) {
    random = new SplittableRandom(seed);
  }

  /**
   * Many chains side by side, nearly equally long: each activity follows one to three of the layer
   * before it, most of them by a plain finish-to-start link, and is followed by at least one.
   *
   * @param size how many activities
   * @param layers how many activities a chain has
   */
  static Network wide(int size, int layers, long seed) {
    NetworkGenerator generator = new NetworkGenerator(seed);
    int firstBefore = 0;
    int firstHere = 0;
    for (int layer = 0; layer < layers; layer++) {
      int firstNext = Math.toIntExact((long) size * (layer + 1) / layers);
      for (int i = firstHere; i < firstNext; i++) {
        generator.addActivity(generator.between(2, MOST_WIDE_DAYS));
        generator.followLayer(i, firstBefore, firstHere);
      }
      generator.leaveNoEndOpen(firstBefore, firstHere, firstNext);
      firstBefore = firstHere;
      firstHere = firstNext;
    }
    return generator.network();
  }

  /**
   * One long chain of overlaps: each activity starts some days after its predecessor's start and
   * finishes some days after its predecessor's finish.
   */
  static Network chain(int size, long seed) {
    NetworkGenerator generator = new NetworkGenerator(seed);
    for (int i = 0; i < size; i++) {
      generator.addActivity(generator.between(2, 8));
      if (i > 0) {
        generator.overlap(i - 1, i);
      }
    }
    return generator.network();
  }

  private Network network() {
    return new Network(TimeScale.WHOLE, activities, links);
  }

  private void addActivity(int normal) {
    String id = "A" + (activities.size() + 1);
    Money normalCost = Money.of(normal * (long) between(200, 2000));
    int crash = Math.max(1, (normal * Math.min(between(50, 90), between(50, 90)) + 50) / 100);
    if (crash == normal || !chance(70)) {
      activities.add(Activity.fixed(id, normal, normalCost));
      return;
    }
    Money extra = Money.of((normal - crash) * (long) slope());
    activities.add(Activity.compressible(id, normal, normalCost, crash, normalCost.plus(extra)));
  }

  /** Cheap ones as often as dear ones, and few alike. */
  private int slope() {
    return chance(50) ? between(20, 999) : between(200, 9_999);
  }

  private void followLayer(int activity, int firstBefore, int firstHere) {
    if (firstBefore == firstHere) {
      return;
    }
    int draw = between(1, 100);
    int wanted = Math.min(draw <= 40 ? 1 : draw <= 85 ? 2 : 3, firstHere - firstBefore);
    List<Integer> taken = new ArrayList<>();
    while (taken.size() < wanted) {
      int predecessor = between(firstBefore, firstHere - 1);
      if (!taken.contains(predecessor)) {
        taken.add(predecessor);
        links.add(anyLink(predecessor, activity));
      }
    }
  }

  /** Links what has no successor in the layer before to any activity of this one. */
  private void leaveNoEndOpen(int firstBefore, int firstHere, int firstNext) {
    boolean[] followed = new boolean[firstHere - firstBefore];
    for (Link link : links) {
      if (link.predecessor() >= firstBefore) {
        followed[link.predecessor() - firstBefore] = true;
      }
    }
    for (int k = 0; k < followed.length; k++) {
      if (!followed[k]) {
        links.add(Link.finishToStart(firstBefore + k, between(firstHere, firstNext - 1)));
      }
    }
  }

  private Link anyLink(int predecessor, int successor) {
    int draw = between(1, 100);
    if (draw <= 80) {
      return Link.finishToStart(predecessor, successor);
    }
    if (draw <= 86) {
      return new Link(predecessor, successor, Relation.FS, between(-3, 3));
    }
    if (draw <= 92) {
      return new Link(predecessor, successor, Relation.SS, between(-2, 6));
    }
    if (draw <= 98) {
      return new Link(predecessor, successor, Relation.FF, between(-2, 6));
    }
    return new Link(predecessor, successor, Relation.SF, between(0, 8));
  }

  private void overlap(int predecessor, int successor) {
    links.add(new Link(predecessor, successor, Relation.SS, between(0, 2)));
    links.add(new Link(predecessor, successor, Relation.FF, between(0, 2)));
  }

  private boolean chance(int percent) {
    return between(1, 100) <= percent;
  }

  private int between(int least, int most) {
    return random.nextInt(least, most + 1);
  }
}
