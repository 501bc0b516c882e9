package dayworth.testing;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Relation;
import dayworth.network.Span;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;

/**
 * Networks drawn from a seed: the same seed, the same network, on every machine.
 *
 * <p>They are small on purpose and full of what goes wrong: ties of slopes, slopes of zero, crash
 * cheaper than normal, activities that cannot be compressed or take no time, lags below zero, all
 * four relations, times with decimals, starts and finishes that must wait.
 */
public final class RandomNetworks {

  /** What a drawn network may contain. */
  public enum Kind {
    /** Finish-to-start without lags, whole durations, no slope below zero. */
    PLAIN,
    /** All that {@link #EVERYTHING} has, but whole durations, lags and times. */
    WHOLE,
    /** All relations, lags, decimals, earliest starts and finishes, slopes of zero and below. */
    EVERYTHING,
    /** Everything, and up to four spans: hire, sections, or between any two moments. */
    WITH_SPANS
  }

  private static final List<Relation> RELATIONS = List.of(Relation.values());

  private final Random random;
  private final Kind kind;
  private final int ticksPerUnit;

  private RandomNetworks(long seed, Kind kind) {
    this.random = new Random(seed);
    this.kind = kind;
    this.ticksPerUnit =
        kind == Kind.EVERYTHING || kind == Kind.WITH_SPANS
            ? new int[] {1, 10, 100, 1000}[random.nextInt(4)]
            : 1;
  }

  /** Everything that may be, with 3 to 40 activities. */
  public static Network of(long seed) {
    return of(seed, Kind.EVERYTHING, 3, 40);
  }

  /** A network with a number of activities from {@code fewest} to {@code most}. */
  public static Network of(long seed, Kind kind, int fewest, int most) {
    RandomNetworks drawn = new RandomNetworks(seed, kind);
    return drawn.network(fewest + drawn.random.nextInt(most - fewest + 1));
  }

  private Network network(int size) {
    List<Activity> activities = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      activities.add(activity(i));
    }
    int reach = 1 + random.nextInt(size);
    Set<Link> links = new LinkedHashSet<>();
    for (int to = 1; to < size; to++) {
      for (int count = random.nextInt(4); count > 0; count--) {
        links.add(link(Math.max(0, to - 1 - random.nextInt(reach)), to));
      }
    }
    TimeScale scale = new TimeScale(Integer.toString(ticksPerUnit).length() - 1);
    List<Span> spans = new ArrayList<>();
    for (int count = kind == Kind.WITH_SPANS ? 1 + random.nextInt(4) : 0; count > 0; count--) {
      spans.add(span(size));
    }
    return new Network(scale, activities, List.copyOf(links), spans);
  }

  private Span span(int size) {
    Moment to = new Moment(random.nextInt(size), random.nextInt(4) > 0);
    Moment from =
        random.nextInt(3) == 0
            ? Moment.PROJECT_START
            : new Moment(random.nextInt(size), random.nextInt(4) == 0);
    if (from.equals(to)) {
      from = Moment.PROJECT_START;
    }
    if (!from.isProjectStart() && random.nextInt(5) == 0) {
      return new Span("early", from, Moment.PROJECT_START, -time(0, 25), price());
    }
    long free = from.isProjectStart() || random.nextInt(4) == 0 ? time(0, 25) - time(0, 3) : 0;
    return new Span("span", from, to, free, price());
  }

  private Money price() {
    return Money.of(10L * (1 + random.nextInt(6))).dividedBy(ticksPerUnit);
  }

  private Activity activity(int index) {
    String id = "A" + index;
    long normal = time(0, 12);
    long most = Math.min(normal, time(0, 8));
    Money normalCost = Money.of(random.nextInt(1000));
    long notBefore = kind != Kind.PLAIN && random.nextInt(8) == 0 ? time(0, 20) : 0;
    long finish = kind != Kind.PLAIN && random.nextInt(8) == 0 ? time(0, 30) : 0;
    if (most == 0 || random.nextInt(5) == 0) {
      return new Activity(id, "", "", normal, normal, normalCost, normalCost, notBefore, finish);
    }
    Money crashCost = normalCost.plus(extra(most));
    long crash = normal - most;
    return new Activity(id, "", "", normal, crash, normalCost, crashCost, notBefore, finish);
  }

  /** Half of all prices come from a few round ones for each unit, so that many are equal. */
  private Money extra(long ticks) {
    int draw = random.nextInt(10);
    if (kind != Kind.PLAIN && draw == 0) {
      return Money.ZERO;
    }
    if (kind != Kind.PLAIN && draw == 1) {
      return Money.of(-1 - random.nextInt(300));
    }
    return draw < 6
        ? Money.of(10L * (1 + random.nextInt(4))).times(ticks).dividedBy(ticksPerUnit)
        : Money.of(1 + random.nextInt(400));
  }

  private Link link(int from, int to) {
    if (kind == Kind.PLAIN || random.nextInt(2) == 0) {
      return Link.finishToStart(from, to);
    }
    Relation relation = RELATIONS.get(random.nextInt(4));
    return new Link(from, to, relation, time(0, 7) - time(0, 3));
  }

  private long time(int least, int most) {
    return least * (long) ticksPerUnit + random.nextInt((most - least) * ticksPerUnit + 1);
  }
}
