package dayworth.network;

import dayworth.value.Money;
import dayworth.value.MoneySum;
import java.util.Arrays;
import java.util.NavigableSet;
import java.util.TreeSet;

/**
 * How long each activity takes, in ticks, by its index in the network; where it matters, when it
 * starts; and by which measure it is done, if by any. Immutable.
 */
public final class Plan {

  private static final long[] ANY_TIME = {};
  private static final int[] NO_MEASURES = {};

  /** Of an activity that is done its normal way, or compressed along its line. */
  public static final int NO_MEASURE = -1;

  private final long[] durations;

  /** Ticks after the project's start; empty if the plan leaves open when activities start. */
  private final long[] starts;

  /** The measure of each activity, by its index in the network; empty if none is used. */
  private final int[] measures;

  private Plan(long[] durations, long[] starts, int[] measures) {
    this.durations = durations;
    this.starts = starts;
    this.measures = measures;
  }

  public static Plan of(long[] durations) {
    return new Plan(durations.clone(), ANY_TIME, NO_MEASURES);
  }

  /** A plan that says when each activity starts. */
  public static Plan scheduled(long[] durations, long[] starts) {
    if (durations.length != starts.length) {
      throw new IllegalArgumentException("as many starts as durations");
    }
    return new Plan(durations.clone(), starts.clone(), NO_MEASURES);
  }

  /**
   * The same times with these measures in use.
   *
   * @param used for each activity the index of its measure, or {@link #NO_MEASURE}
   */
  public Plan using(int[] used) {
    if (used.length != durations.length) {
      throw new IllegalArgumentException("a measure, or none, for each duration");
    }
    boolean none = Arrays.stream(used).allMatch(m -> m == NO_MEASURE);
    return new Plan(durations, starts, none ? NO_MEASURES : used.clone());
  }

  /** The same times with the measures that another plan uses. */
  public Plan withMeasuresOf(Plan other) {
    return new Plan(durations, starts, other.measures);
  }

  /** The same durations and measures with these starts. */
  public Plan startingAt(long[] newStarts) {
    if (durations.length != newStarts.length) {
      throw new IllegalArgumentException("as many starts as durations");
    }
    return new Plan(durations, newStarts.clone(), measures);
  }

  public static Plan allNormal(Network network) {
    return of(network.activities().stream().mapToLong(Activity::normal).toArray());
  }

  public static Plan allCrash(Network network) {
    return of(network.activities().stream().mapToLong(Activity::crash).toArray());
  }

  public int size() {
    return durations.length;
  }

  public long duration(int activity) {
    return durations[activity];
  }

  /** The index of the measure that an activity is done by, or {@link #NO_MEASURE}. */
  public int measure(int activity) {
    return measures.length == 0 ? NO_MEASURE : measures[activity];
  }

  /** Whether any activity is done by a measure. */
  public boolean usesMeasures() {
    return measures.length > 0;
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

  /** The exact direct cost, counted from the durations, measures and their packages. */
  public Money directCost(Network network) {
    MoneySum sum = new MoneySum();
    for (int i = 0; i < durations.length; i++) {
      addCost(network, i, sum);
    }
    packages(network).forEach(index -> sum.add(network.measures().packages().get(index).cost()));
    return sum.total();
  }

  /** What an activity costs, without the packages that its measure may be in. */
  public Money costOf(Network network, int activity) {
    MoneySum sum = new MoneySum();
    addCost(network, activity, sum);
    return sum.total();
  }

  private void addCost(Network network, int i, MoneySum sum) {
    if (measure(i) != NO_MEASURE) {
      sum.add(network.measures().get(measure(i)).cost());
      return;
    }
    Activity activity = network.activity(i);
    sum.add(activity.normalCost());
    long shortened = activity.normal() - durations[i];
    if (shortened != 0) {
      sum.add(activity.crashExtra(), shortened, activity.mostShortening());
    }
  }

  /** The packages that are paid for, by their index, sorted. */
  public NavigableSet<Integer> packages(Network network) {
    NavigableSet<Integer> paid = new TreeSet<>();
    for (int m : measures) {
      if (m != NO_MEASURE) {
        network.measures().get(m).inPackage().ifPresent(paid::add);
      }
    }
    return paid;
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
        && Arrays.equals(measures, plan.measures)
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
