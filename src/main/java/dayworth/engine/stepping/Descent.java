package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;
import static dayworth.engine.stepping.EventNetwork.BEGIN;
import static dayworth.engine.stepping.EventNetwork.END;

import dayworth.engine.Flow;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.SlopeScale;
import java.util.Optional;

/**
 * The cheapest plans of a network at durations that are asked one after the other, each no longer
 * than the one before; every one starts from where the last one stands.
 */
public final class Descent {

  private final EventNetwork events;
  private final Squeeze squeeze;
  private final TieRule ties;

  /**
   * Takes what saves money whatever the finish.
   *
   * @throws ArithmeticException if {@link Stepping#scaleFor} is empty
   */
  public Descent(Network network) {
    SlopeScale scale =
        Stepping.scaleFor(network)
            .orElseThrow(() -> new ArithmeticException("the slopes do not fit one scale"));
    events = EventNetwork.of(network, scale);
    squeeze = Stepping.squeezeWhatPays(events);
    ties = new TieRule(events);
  }

  /**
   * The cheapest plan that finishes within a duration, of equally cheap ones the one that changes
   * least against another.
   *
   * @param duration ticks; at most that of the call before
   * @return empty if no plan finishes within it; then none does within a shorter one
   */
  public Optional<Plan> within(long duration, Plan before) {
    return squeeze.run(BEGIN, END, UNLIMITED, duration, Squeeze.Listener.NONE) == Squeeze.End.HELD
        ? Optional.empty()
        : Optional.of(ties.choose(squeeze, before));
  }

  /** The flow that proves the last plan. */
  public Flow flow() {
    return events.flow();
  }
}
