package dayworth.network;

import dayworth.value.Money;
import dayworth.value.MoneySum;
import java.util.Arrays;

/** How long each activity takes, in ticks, by its index in the network. Immutable. */
public final class Plan {

  private final long[] durations;

  private Plan(long[] durations) {
    this.durations = durations;
  }

  public static Plan of(long[] durations) {
    return new Plan(durations.clone());
  }

  public static Plan allNormal(Network network) {
    return new Plan(network.activities().stream().mapToLong(Activity::normal).toArray());
  }

  public static Plan allCrash(Network network) {
    return new Plan(network.activities().stream().mapToLong(Activity::crash).toArray());
  }

  public int size() {
    return durations.length;
  }

  public long duration(int activity) {
    return durations[activity];
  }

  public long[] toArray() {
    return durations.clone();
  }

  /** The exact direct cost, counted from the durations. */
  public Money directCost(Network network) {
    MoneySum sum = new MoneySum();
    for (int i = 0; i < durations.length; i++) {
      Activity activity = network.activity(i);
      sum.add(activity.normalCost());
      long shortened = activity.normal() - durations[i];
      if (shortened != 0) {
        sum.add(activity.crashExtra(), shortened, activity.mostShortening());
      }
    }
    return sum.total();
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Plan plan && Arrays.equals(durations, plan.durations);
  }

  @Override
  public int hashCode() {
    return Arrays.hashCode(durations);
  }

  @Override
  public String toString() {
    return Arrays.toString(durations);
  }
}
