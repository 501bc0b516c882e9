package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;
import static dayworth.engine.stepping.EventNetwork.BEGIN;
import static dayworth.engine.stepping.EventNetwork.END;

import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.SlopeScale;
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
 * <p><b>Method.</b> What is cheaper than normal is taken first; then the project's finish is
 * squeezed towards its start ({@link Squeeze}). Every length at which the price changes is a
 * breakpoint; the flow that has run is the price, the minimum cut what is compressed and, where it
 * is crossed backwards, relaxed (Phillips and Dessouky 1977, "Solving the project time/cost
 * tradeoff problem using the minimal cut concept", Management Science 24). Where several plans are
 * equally cheap, {@link TieRule} chooses.
 *
 * <p><b>Invariant.</b> At each breakpoint the plan and the flow are of equal value, so neither can
 * be better. <b>Limits.</b> Slopes must fit one scale ({@link #scaleFor}).
 */
public final class Stepping {

  private Stepping() {}

  /** A scale for the slopes of a network; empty if its amounts are too large to be exact. */
  public static Optional<SlopeScale> scaleFor(Network network) {
    List<Activity> open = network.activities().stream().filter(Activity::isCompressible).toList();
    return SlopeScale.fit(
        open.stream().map(activity -> activity.slope().max(activity.slope().negate())).toList(),
        open.stream().mapToLong(Activity::mostShortening).toArray());
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
    Squeeze squeeze = squeezeCheaper(events);
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
    Squeeze squeeze = squeezeCheaper(events);
    CurveRecorder recorder = new CurveRecorder(events, squeeze, PieceWitness.NONE);
    Squeeze.End end = squeeze.run(BEGIN, END, UNLIMITED, duration, recorder);
    if (end == Squeeze.End.HELD) {
      throw new IllegalArgumentException("no plan finishes within " + duration + " ticks");
    }
    return recorder.planHere();
  }

  /** Breakpoints and prices alone, without plans: what a benchmark of the method measures. */
  public static Prices prices(Network network, SlopeScale scale) {
    EventNetwork events = EventNetwork.of(network, scale);
    Squeeze squeeze = squeezeCheaper(events);
    Prices prices = new Prices(scale);
    squeeze.run(BEGIN, END, UNLIMITED, -1, prices);
    return prices;
  }

  /** Takes what costs less crashed than normal, as far as the network lets it. */
  private static Squeeze squeezeCheaper(EventNetwork events) {
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
    return squeeze;
  }
}
