package dayworth.testing;

import dayworth.network.Activity;
import dayworth.network.Measure;
import dayworth.network.MeasurePackage;
import dayworth.network.Measures;
import dayworth.network.Network;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.Random;

/**
 * Measures, packages and activities that are not divisible for a network that was drawn: the same
 * seed, the same measures. Some are dominated, some longer than normal, some of equal duration.
 */
public final class RandomMeasures {

  private RandomMeasures() {}

  /** The network with up to {@code most} measures for each activity. */
  public static Network with(Network network, long seed, int most) {
    Random random = new Random(seed);
    List<MeasurePackage> packages = new ArrayList<>();
    for (int count = random.nextInt(3); count > 0; count--) {
      packages.add(new MeasurePackage("P" + count, Money.of(random.nextInt(300))));
    }
    List<Activity> activities = new ArrayList<>();
    List<Measure> measures = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      Activity activity = network.activity(i);
      activities.add(random.nextInt(3) == 0 ? indivisible(activity) : activity);
      for (int count = random.nextInt(most + 1); count > 0; count--) {
        boolean shared = !packages.isEmpty() && random.nextInt(3) == 0;
        long shorter = random.nextInt((int) Math.min(9, activity.normal() + 2)) - 1L;
        measures.add(
            new Measure(
                i,
                "M" + count,
                activity.normal() - shorter,
                activity
                    .normalCost()
                    .plus(Money.of(Math.max(0, shorter * 40 + random.nextInt(120)))),
                shared ? OptionalInt.of(random.nextInt(packages.size())) : OptionalInt.empty(),
                false,
                ""));
      }
    }
    return network.withActivities(activities, new Measures(measures, packages));
  }

  private static Activity indivisible(Activity activity) {
    return new Activity(
        activity.id(),
        activity.name(),
        activity.group(),
        activity.normal(),
        activity.crash(),
        activity.normalCost(),
        activity.crashCost(),
        activity.notBefore(),
        activity.notFinishedBefore(),
        false);
  }
}
