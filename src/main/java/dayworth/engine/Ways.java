package dayworth.engine;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Measure;
import dayworth.network.Measures;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * All ways to do each activity of a network that can be worth taking, from short to long; those of
 * an activity are numbered, those of all activities too. Immutable.
 *
 * <p>A divisible activity can also take any duration between its crash and its normal way, along a
 * straight line. A way is dominated, and left out, where another is no longer and no dearer and
 * pays for no other package. That a shorter way serves as well as a longer one needs that no link
 * and no earliest time holds the activity's finish: then its start can stay and its finish comes
 * earlier, which breaks nothing and costs nothing. Otherwise only ways of the same duration
 * dominate each other, as a shorter activity can make a project longer (Wiest 1981, "Precedence
 * diagramming method: some unusual characteristics").
 */
public final class Ways {

  /** A measure that is never worth taking. */
  public record Dominated(int measure, Way by) {}

  private final Network network;

  /** The ways of activity i are {@code first[i] .. first[i + 1] - 1}. */
  private final int[] first;

  private final List<Way> all = new ArrayList<>();
  private final List<Dominated> dominated = new ArrayList<>();

  /** Whether any duration between the crash and the normal way can be taken. */
  private final boolean[] hasLine;

  private final boolean[] isChoice;

  private Ways(Network network) {
    this.network = network;
    first = new int[network.size() + 1];
    hasLine = new boolean[network.size()];
    isChoice = new boolean[network.size()];
    boolean[] shorterServes = shorterServes();
    List<List<Integer>> measures = measures();
    for (int i = 0; i < network.size(); i++) {
      add(i, measures.get(i), shorterServes[i]);
      first[i + 1] = all.size();
      isChoice[i] = hasLine[i] ? count(i) > 2 : !isNormalAlone(i);
    }
  }

  public static Ways of(Network network) {
    return new Ways(network);
  }

  /**
   * The network where each activity can take any duration from its shortest way to its longest; it
   * tells what is possible, not what it costs. The network itself where it has no choices.
   */
  public static Network reachable(Network network) {
    if (!network.hasChoices()) {
      return network;
    }
    Ways ways = of(network);
    List<Activity> activities = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      Activity activity = network.activity(i);
      long shortest = ways.get(ways.first(i)).duration();
      long longest = ways.get(ways.first(i) + ways.count(i) - 1).duration();
      activities.add(
          new Activity(
              activity.id(),
              activity.name(),
              activity.group(),
              Math.max(longest, activity.normal()),
              shortest,
              Money.ZERO,
              Money.ZERO,
              activity.notBefore(),
              activity.notFinishedBefore()));
    }
    return network.withActivities(activities, Measures.NONE);
  }

  /** How many ways there are in all. */
  public int count() {
    return all.size();
  }

  public int count(int activity) {
    return first[activity + 1] - first[activity];
  }

  /** The number of an activity's first way; the others follow, from short to long. */
  public int first(int activity) {
    return first[activity];
  }

  /** A way by its number. */
  public Way get(int way) {
    return all.get(way);
  }

  /** Whether any duration between the activity's crash and normal way can be taken. */
  public boolean hasLine(int activity) {
    return hasLine[activity];
  }

  private boolean isNormalAlone(int i) {
    Way only = all.get(first[i]);
    return count(i) == 1
        && only.measure() == Plan.NO_MEASURE
        && only.duration() == network.activity(i).normal();
  }

  /** Whether the activity has other ways than its normal one and its line. */
  public boolean isChoice(int activity) {
    return isChoice[activity];
  }

  /** Whether no activity has. */
  public boolean isPlain() {
    for (boolean choice : isChoice) {
      if (choice) {
        return false;
      }
    }
    return true;
  }

  /** Every activity by its shortest way; of several the cheapest. */
  public Plan shortest() {
    long[] durations = new long[network.size()];
    int[] measures = new int[network.size()];
    for (int i = 0; i < durations.length; i++) {
      durations[i] = all.get(first[i]).duration();
      measures[i] = all.get(first[i]).measure();
    }
    return Plan.of(durations).using(measures);
  }

  /** Measures that are left out, by their index. */
  public List<Dominated> dominated() {
    return List.copyOf(dominated);
  }

  private List<List<Integer>> measures() {
    List<List<Integer>> of = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      of.add(new ArrayList<>());
    }
    for (int m = 0; m < network.measures().list().size(); m++) {
      of.get(network.measures().get(m).activity()).add(m);
    }
    return of;
  }

  private boolean[] shorterServes() {
    boolean[] finishHeld = new boolean[network.size()];
    for (Link link : network.links()) {
      finishHeld[link.successor()] |= !link.relation().toStart();
    }
    boolean[] serves = new boolean[network.size()];
    for (int i = 0; i < serves.length; i++) {
      serves[i] = !finishHeld[i] && network.activity(i).notFinishedBefore() == 0;
    }
    return serves;
  }

  private void add(int i, List<Integer> measures, boolean shorterServes) {
    Activity activity = network.activity(i);
    List<Way> found = new ArrayList<>();
    found.add(plain(activity.normal(), activity.normalCost()));
    if (activity.isCompressible()) {
      found.add(plain(activity.crash(), activity.crashCost()));
    }
    for (int m : measures) {
      Measure measure = network.measures().get(m);
      int inPackage = measure.inPackage().orElse(Way.NO_PACKAGE);
      found.add(new Way(measure.duration(), measure.cost(), m, inPackage));
    }
    boolean line = activity.isCompressible() && activity.divisible();
    if (line && shorterServes) {
      line = found.stream().noneMatch(way -> dominatesLine(way, activity));
    }
    hasLine[i] = line;
    List<Way> kept = new ArrayList<>();
    for (Way way : found) {
      boolean endOfLine = line && way.measure() == Plan.NO_MEASURE;
      Optional<Way> better = better(way, found, shorterServes);
      if (better.isEmpty() && line && !endOfLine) {
        better = onLine(way, activity, shorterServes);
      }
      if (endOfLine || better.isEmpty()) {
        kept.add(way);
      } else if (way.measure() != Plan.NO_MEASURE) {
        dominated.add(new Dominated(way.measure(), better.get()));
      }
    }
    kept.sort(Comparator.comparingLong(Way::duration).thenComparing(Way::cost));
    all.addAll(kept);
  }

  private static Way plain(long duration, Money cost) {
    return new Way(duration, cost, Plan.NO_MEASURE, Way.NO_PACKAGE);
  }

  private static boolean dominatesLine(Way way, Activity activity) {
    return way.measure() != Plan.NO_MEASURE
        && way.inPackage() == Way.NO_PACKAGE
        && way.duration() <= activity.crash()
        && way.cost().compareTo(activity.crashCost()) <= 0
        && way.cost().compareTo(activity.normalCost()) <= 0;
  }

  /** A way that dominates; of two alike the first one does. */
  private static Optional<Way> better(Way way, List<Way> among, boolean shorterServes) {
    boolean before = true;
    for (Way other : among) {
      if (other.equals(way)) {
        before = false;
        continue;
      }
      boolean noLonger =
          shorterServes ? other.duration() <= way.duration() : other.duration() == way.duration();
      boolean noDearer = other.cost().compareTo(way.cost()) <= 0;
      boolean paysNoOther =
          other.inPackage() == Way.NO_PACKAGE || other.inPackage() == way.inPackage();
      boolean alike =
          other.duration() == way.duration()
              && other.cost().equals(way.cost())
              && other.inPackage() == way.inPackage();
      if (noLonger && noDearer && paysNoOther && (!alike || before)) {
        return Optional.of(other);
      }
    }
    return Optional.empty();
  }

  /** The point of the line that dominates a way. */
  private static Optional<Way> onLine(Way way, Activity activity, boolean shorterServes) {
    long longest = Math.min(way.duration(), activity.normal());
    if (longest < activity.crash() || (!shorterServes && way.duration() > activity.normal())) {
      return Optional.empty();
    }
    boolean falls = activity.crashExtra().signum() >= 0;
    long duration = falls || !shorterServes ? longest : activity.crash();
    Money cost = activity.normalCost().plus(activity.slope().times(activity.normal() - duration));
    return cost.compareTo(way.cost()) <= 0 ? Optional.of(plain(duration, cost)) : Optional.empty();
  }
}
