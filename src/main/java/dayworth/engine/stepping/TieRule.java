package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;

import dayworth.network.Activity;
import dayworth.network.Plan;
import java.util.Arrays;

/**
 * Chooses among the cheapest plans of one length: the one that relaxes least against the plan
 * before, then the one that changes the fewest ticks, then, in file order, the one in which each
 * activity is brought back to its duration before as far as those settled earlier allow.
 *
 * <p>By complementary slackness the cheapest plans at a length are themselves a network of
 * differences: an unlimited arc with flow is an equality; so is a priced one partly full; one that
 * is empty holds its length, one that is full holds at most its length. Events tied by equalities
 * are one body. If every activity whose duration is not settled lies within one body there is one
 * cheapest plan; otherwise the bodies are the events of a second network whose money is the amount
 * relaxed and then the ticks changed, and {@link Squeeze} is run on it.
 */
final class TieRule {

  private final EventNetwork events;

  TieRule(EventNetwork events) {
    this.events = events;
  }

  /**
   * The plan to report; with spans it says when activities start.
   *
   * @param squeeze stands at the length in question
   * @param before the plan before
   */
  Plan choose(Squeeze squeeze, Plan before) {
    Bodies bodies = Bodies.of(events, squeeze);
    long[] durations = events.durations(squeeze);
    int[] open = open(bodies);
    boolean isSettled =
        open.length == 0 || Arrays.stream(open).allMatch(i -> durations[i] == before.duration(i));
    long[] moved = isSettled ? new long[bodies.count()] : settle(open, bodies, before);
    for (int i : open) {
      durations[i] += moved[bodies.of(events.finish(i))] - moved[bodies.of(events.start(i))];
    }
    if (events.network.spans().isEmpty()) {
      return Plan.of(durations);
    }
    long[] starts = events.starts(squeeze);
    for (int i = 0; i < starts.length; i++) {
      starts[i] += moved[bodies.of(events.start(i))] - moved[bodies.of(EventNetwork.BEGIN)];
    }
    return Plan.scheduled(durations, starts).earliest(events.network);
  }

  /** The plan that the squeeze stands at, without a choice; with spans it says when work starts. */
  Plan any(Squeeze squeeze) {
    long[] durations = events.durations(squeeze);
    return events.network.spans().isEmpty()
        ? Plan.of(durations)
        : Plan.scheduled(durations, events.starts(squeeze)).earliest(events.network);
  }

  /** The activities whose duration differs among the cheapest plans. */
  private int[] open(Bodies bodies) {
    int[] open = new int[events.network.size()];
    int count = 0;
    for (int i = 0; i < open.length; i++) {
      if (events.has(i)
          && events.isOpen(i)
          && bodies.of(events.start(i)) != bodies.of(events.finish(i))) {
        open[count++] = i;
      }
    }
    return Arrays.copyOf(open, count);
  }

  /** How far each body moves from where the squeeze stands. */
  private long[] settle(int[] open, Bodies bodies, Plan before) {
    long relaxing = priceOfRelaxing(open);
    ArcNetwork.Builder arcs = new ArcNetwork.Builder();
    int[] relaxArc = new int[open.length];
    int[] compressArc = new int[open.length];
    for (int k = 0; k < open.length; k++) {
      int i = open[k];
      int start = bodies.of(events.start(i));
      int finish = bodies.of(events.finish(i));
      Activity activity = events.network.activity(i);
      long apart = bodies.between(events.start(i), events.finish(i));
      arcs.add(start, finish, activity.crash() - apart, UNLIMITED);
      arcs.add(finish, start, apart - activity.normal(), UNLIMITED);
      relaxArc[k] = arcs.add(finish, start, apart - before.duration(i), 0);
      compressArc[k] = arcs.add(start, finish, before.duration(i) - apart, 0);
    }
    bodies.addLogic(arcs);
    ArcNetwork net = arcs.build(bodies.count());
    Squeeze choice = new Squeeze(net, new long[bodies.count()]);
    for (int k = 0; k < open.length; k++) {
      int start = bodies.of(events.start(open[k]));
      int finish = bodies.of(events.finish(open[k]));
      long wanted =
          before.duration(open[k]) - bodies.between(events.start(open[k]), events.finish(open[k]));
      choice.run(start, finish, relaxing, wanted, Squeeze.Listener.NONE);
      net.set(relaxArc[k], relaxing, choice.sent());
      choice.run(finish, start, 1, -wanted, Squeeze.Listener.NONE);
      net.set(compressArc[k], 1, choice.sent());
    }
    choice.settle();
    long[] moved = new long[bodies.count()];
    Arrays.setAll(moved, choice::time);
    return moved;
  }

  /** One tick relaxed outweighs all ticks that can change, as far as the sums stay whole. */
  private long priceOfRelaxing(int[] open) {
    long sum = 1;
    for (int i : open) {
      sum = Math.addExact(sum, events.network.activity(i).mostShortening());
    }
    return Math.min(sum, Long.MAX_VALUE / (4L * open.length));
  }
}
