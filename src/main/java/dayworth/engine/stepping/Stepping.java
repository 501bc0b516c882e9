package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;
import static dayworth.engine.stepping.EventNetwork.BEGIN;
import static dayworth.engine.stepping.EventNetwork.END;

import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.value.Money;
import dayworth.value.SlopeScale;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Way 1: the exact curve of least direct cost against duration, by marginal-cost stepping.
 *
 * <p><b>Problem.</b> The least direct cost of finishing within T, for every T down to the shortest
 * possible: a minimum of convex costs of event-time differences, whose dual is a minimum-cost flow
 * (Kelley 1961, "Critical-path planning and scheduling: mathematical basis", Operations Research 9;
 * Fulkerson 1961, "A network flow computation for project cost curves", Management Science 7).
 *
 * <p><b>Method.</b> What pays by itself is done first: what is cheaper than normal is taken, and
 * spans are drawn together as far as that saves money. Then the project's finish is squeezed
 * towards its start ({@link Squeeze}). Every length at which the price changes is a breakpoint; the
 * flow that has run is the price, the minimum cut what is compressed and, where it is crossed
 * backwards, relaxed (Phillips and Dessouky 1977, "Solving the project time/cost tradeoff problem
 * using the minimal cut concept", Management Science 24). Where several plans are equally cheap,
 * {@link TieRule} chooses.
 *
 * <p><b>Invariant.</b> At each breakpoint the plan and the flow are of equal value, so neither can
 * be better. <b>Limits.</b> Slopes must fit one scale ({@link #scaleFor}).
 */
public final class Stepping {

  private Stepping() {}

  /**
   * A scale for the slopes and rates of a network; empty if its amounts are too large to be exact.
   */
  public static Optional<SlopeScale> scaleFor(Network network) {
    List<Money> slopes = new ArrayList<>();
    List<Long> ticks = new ArrayList<>();
    for (Activity activity : network.activities()) {
      if (activity.isCompressible()) {
        slopes.add(activity.slope().max(activity.slope().negate()));
        ticks.add(activity.mostShortening());
      }
    }
    if (!network.spans().isEmpty()) {
      long longest =
          new Reach(network, network.activities().stream().mapToLong(Activity::normal).toArray())
              .longest();
      for (Span span : network.spans()) {
        slopes.add(span.rate());
        ticks.add(longest + Math.abs(span.free()));
      }
    }
    return SlopeScale.fit(slopes, ticks.stream().mapToLong(Long::longValue).toArray());
  }

  /**
   * The curve of a network.
   *
   * @param witness is told every piece with its proof
   * @throws ArithmeticException if {@link #scaleFor} is empty
   */
  public static Curve curve(Network network, PieceWitness witness) {
    SlopeScale scale =
        scaleFor(network)
            .orElseThrow(() -> new ArithmeticException("the slopes do not fit one scale"));
    EventNetwork events = EventNetwork.of(network, scale);
    Squeeze squeeze = squeezeWhatPays(events);
    CurveRecorder recorder = new CurveRecorder(events, squeeze, witness);
    if (squeeze.run(BEGIN, END, UNLIMITED, -1, recorder) != Squeeze.End.HELD) {
      throw new IllegalStateException("nothing holds the project's finish from its start");
    }
    return recorder.curve(HoldingChain.of(events, squeeze.heldBy()));
  }

  /**
   * The cheapest plan that finishes within {@code duration} ticks, chosen as the curve's own plans
   * are; between two breakpoints against the plan of the longer one.
   *
   * @throws IllegalArgumentException if no plan finishes within it
   */
  public static Plan planWithin(Network network, long duration) {
    SlopeScale scale =
        scaleFor(network)
            .orElseThrow(() -> new ArithmeticException("the slopes do not fit one scale"));
    EventNetwork events = EventNetwork.of(network, scale);
    Squeeze squeeze = squeezeWhatPays(events);
    CurveRecorder recorder = new CurveRecorder(events, squeeze, PieceWitness.NONE);
    Squeeze.End end = squeeze.run(BEGIN, END, UNLIMITED, duration, recorder);
    if (end == Squeeze.End.HELD) {
      throw new IllegalArgumentException("no plan finishes within " + duration + " ticks");
    }
    return recorder.planHere();
  }

  /** The shortest that any plan can make the project, ticks. */
  public static long shortest(Network network) {
    return new Reach(network, network.activities().stream().mapToLong(Activity::crash).toArray())
        .longest();
  }

  /** The earliest that any plan can finish an activity, ticks. */
  public static long earliestFinish(Network network, int activity) {
    return new Reach(network, network.activities().stream().mapToLong(Activity::crash).toArray())
        .finishFromBegin(activity);
  }

  /** Breakpoints and prices alone, without plans: what a benchmark of the method measures. */
  public static Prices prices(Network network, SlopeScale scale) {
    EventNetwork events = EventNetwork.of(network, scale);
    Squeeze squeeze = squeezeWhatPays(events);
    Prices prices = new Prices(scale);
    squeeze.run(BEGIN, END, UNLIMITED, -1, prices);
    return prices;
  }

  /** Takes what saves money whatever the finish, as far as the network lets it. */
  static Squeeze squeezeWhatPays(EventNetwork events) {
    Squeeze squeeze = new Squeeze(events.net, events.lateTimes());
    for (int i = 0; i < events.network.size(); i++) {
      int arc = events.has(i) ? events.cheaperArc[i] : -1;
      if (arc >= 0) {
        long saved = -events.slope(i);
        long crash = events.network.activity(i).crash();
        squeeze.run(events.start(i), events.finish(i), saved, crash, Squeeze.Listener.NONE);
        events.net.set(arc, saved, squeeze.sent());
      }
    }
    for (int arc : events.spanArc) {
      if (arc >= 0) {
        long rate = events.rate(events.index(arc));
        int from = events.net.head(arc);
        int to = events.net.tail(arc);
        squeeze.run(from, to, rate, -events.net.length(arc), Squeeze.Listener.NONE);
        events.net.set(arc, rate, squeeze.sent());
      }
    }
    return squeeze;
  }
}
