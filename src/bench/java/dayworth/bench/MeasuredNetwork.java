package dayworth.bench;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Measure;
import dayworth.network.Measures;
import dayworth.network.Network;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.Random;

/**
 * Networks in which every activity has four measures beside its normal way, each shorter and dearer
 * than the one before, with prices that neither rise nor fall evenly.
 *
 * <p>Activities follow one to three of those that lie up to a width before them, so that about as
 * many chains as the width run beside each other.
 */
final class MeasuredNetwork {

  private static final int MEASURES = 4;

  private MeasuredNetwork() {}

  /** The network of a size; always the same one. */
  static Network of(int size) {
    Random random = new Random(20_264L + size);
    int width = Math.max(4, (int) Math.round(Math.sqrt(size)));
    List<Activity> activities = new ArrayList<>();
    List<Link> links = new ArrayList<>();
    List<Measure> measures = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      long normal = 10L + random.nextInt(31);
      long cost = 1_000L * (5 + random.nextInt(46));
      activities.add(Activity.fixed("A" + i, normal, Money.of(cost)));
      addMeasures(i, normal, cost, random, measures);
      for (int count = Math.min(i, 1 + random.nextInt(3)); count > 0; count--) {
        Link link = Link.finishToStart(i - 1 - random.nextInt(Math.min(i, width)), i);
        if (!links.contains(link)) {
          links.add(link);
        }
      }
    }
    return new Network(
        TimeScale.WHOLE, activities, links, List.of(), new Measures(measures, List.of()));
  }

  private static void addMeasures(
      int i, long normal, long cost, Random random, List<Measure> measures) {
    long duration = normal;
    long dearer = cost;
    for (int m = 1; m <= MEASURES && duration > 2; m++) {
      long shorter = 1L + random.nextInt(Math.max(1, (int) (duration / 5)));
      duration -= shorter;
      dearer += 10L * (5 + random.nextInt(90)) * shorter;
      measures.add(
          new Measure(i, "way " + m, duration, Money.of(dearer), OptionalInt.empty(), false, ""));
    }
  }
}
