package dayworth.network;

import dayworth.value.Money;
import dayworth.value.MoneySum;
import java.util.Arrays;

/**
 * How long each activity takes, in ticks, by its index in the network; and, where it matters, when
 * it starts. Immutable.
 */
public final class Plan {

  private static final long[] ANY_TIME = {};

  private final long[] durations;

  /** Ticks after the project's start; empty if the plan leaves open when activities start. */
  private final long[] starts;

  private Plan(long[] durations, long[] starts) {
    this.durations = durations;
    this.starts = starts;
  }

  public static Plan of(long[] durations) {
    return new Plan(durations.clone(), ANY_TIME);
  }

  /** A plan that says when each activity starts. */
  public static Plan scheduled(long[] durations, long[] starts) {
    if (durations.length != starts.length) {
      throw new IllegalArgumentException("as many starts as durations");
    }
    return new Plan(durations.clone(), starts.clone());
  }

  public static Plan allNormal(Network network) {
    return new Plan(network.activities().stream().mapToLong(Activity::normal).toArray(), ANY_TIME);
  }

  public static Plan allCrash(Network network) {
    return new Plan(network.activities().stream().mapToLong(Activity::crash).toArray(), ANY_TIME);
  }

  public int size() {
    return durations.length;
  }

  public long duration(int activity) {
    return durations[activity];
  }

  /** Whether the plan says when each activity starts. */
  public boolean isScheduled() {
    return starts.length == durations.length;
  }

  /**
   * When an activity starts, in ticks after the project's start.
   *
   * @throws IllegalStateException if the plan leaves it open
   */
  public long start(int activity) {
    if (!isScheduled()) {
      throw new IllegalStateException("the plan leaves open when activities start");
    }
    return starts[activity];
  }

  /** When a moment comes, in ticks after the project's start; only of a scheduled plan. */
  public long time(Moment moment) {
    if (moment.isProjectStart()) {
      return 0;
    }
    long start = start(moment.activity());
    return moment.isFinish() ? start + durations[moment.activity()] : start;
  }

  /** The ticks of a span that cost money; only of a scheduled plan. */
  public long charged(Span span) {
    return Math.max(0, time(span.to()) - time(span.from()) - span.free());
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

  /**
   * The same durations and the same cost of spans, with each activity as early as these allow; only
   * of a scheduled plan.
   */
  public Plan earliest(Network network) {
    return EarliestStarts.of(network, this);
  }

  /** The exact cost of all spans; zero without them. */
  public Money spanCost(Network network) {
    MoneySum sum = new MoneySum();
    for (Span span : network.spans()) {
      sum.add(span.rate(), charged(span), 1);
    }
    return sum.total();
  }

  /** Direct cost and spans together: what a curve makes least. */
  public Money cost(Network network) {
    return directCost(network).plus(spanCost(network));
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Plan plan
        && Arrays.equals(durations, plan.durations)
        && Arrays.equals(starts, plan.starts);
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
