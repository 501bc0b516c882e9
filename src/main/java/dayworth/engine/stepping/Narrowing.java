package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;
import static dayworth.engine.stepping.EventNetwork.BEGIN;
import static dayworth.engine.stepping.EventNetwork.END;

import dayworth.engine.Flow;
import dayworth.network.Network;
import dayworth.value.SlopeScale;

/**
 * A cheapest plan for one finish that is kept cheapest while the durations of activities are
 * narrowed.
 *
 * <p>A duration that is too long is a finish too far from its start, one that is too short a start
 * too far from its finish: {@link Squeeze} brings them together at the least price, and the arc
 * that keeps them so carries what was sent. The project's own finish is held the same way, so every
 * change starts from what is known. A state can be kept and gone back to.
 */
public final class Narrowing {

  private final EventNetwork events;
  private final ArcNetwork net;
  private final Squeeze squeeze;
  private final int deadline;

  /** What has run from the project's start to its finish. */
  private long through;

  private long finish = Long.MAX_VALUE;

  /**
   * Takes what saves money whatever the finish.
   *
   * @param scale fits the sum of many times all slopes and rates
   */
  public Narrowing(Network network, SlopeScale scale) {
    events = new EventNetwork(new EventNetworkBuilder(network, scale).withDeadline());
    net = events.net;
    deadline = events.deadlineArc;
    squeeze = Stepping.squeezeWhatPays(events);
    squeeze.settle();
  }

  /** What a plan is made of, to go back to. Immutable. */
  public static final class State {

    private final long[] room;
    private final long[] length;
    private final long[] times;
    private final long through;
    private final long finish;

    private State(Narrowing of) {
      room = of.net.room.clone();
      length = of.net.length.clone();
      times = of.squeeze.times();
      through = of.through;
      finish = of.finish;
    }

    /** The duration within which the project finishes, ticks. */
    public long finish() {
      return finish;
    }
  }

  public State state() {
    return new State(this);
  }

  public void goBackTo(State state) {
    System.arraycopy(state.room, 0, net.room, 0, net.room.length);
    System.arraycopy(state.length, 0, net.length, 0, net.length.length);
    squeeze.goBackTo(state.times);
    through = state.through;
    finish = state.finish;
  }

  /**
   * Makes the project finish within a duration.
   *
   * @param duration ticks; at most that of the call before
   * @return whether any plan does; otherwise only {@link #goBackTo} makes sense
   */
  public boolean comesWithin(long duration) {
    net.set(deadline, 0, 0);
    Squeeze.End end = squeeze.run(BEGIN, END, UNLIMITED, duration, Squeeze.Listener.NONE);
    squeeze.settle();
    through += squeeze.sent();
    finish = duration;
    net.setLength(deadline, -duration);
    net.set(deadline, UNLIMITED, through);
    return end != Squeeze.End.HELD;
  }

  /**
   * Narrows the duration of an activity; limits that are wider than those it has change nothing.
   *
   * @param least ticks
   * @param most ticks, at least {@code least}
   * @return whether any plan keeps the limits; otherwise only {@link #goBackTo} makes sense
   */
  public boolean narrow(int activity, long least, long most) {
    if (!events.isOpen(activity)) {
      return true;
    }
    int start = events.start(activity);
    int end = events.finish(activity);
    return limit(start, end, events.stretchArc[activity], most)
        && limit(end, start, events.crashArc[activity], -least);
  }

  /** Makes {@code to} come at most {@code apart} after {@code from}: what the arc between says. */
  private boolean limit(int from, int to, int arc, long apart) {
    if (apart >= -net.length(arc)) {
      return true;
    }
    if (squeeze.time(to) - squeeze.time(from) > apart) {
      Squeeze.End end = squeeze.run(from, to, UNLIMITED, apart, Squeeze.Listener.NONE);
      squeeze.settle();
      if (end == Squeeze.End.HELD) {
        return false;
      }
      net.set(arc, UNLIMITED, squeeze.sent());
    }
    net.setLength(arc, -apart);
    return true;
  }

  /** The duration of an activity, ticks. */
  public long duration(int activity) {
    return events.isOpen(activity)
        ? squeeze.time(events.finish(activity)) - squeeze.time(events.start(activity))
        : events.network.activity(activity).normal();
  }

  /** When an activity starts, in ticks after the project's start. */
  public long start(int activity) {
    return squeeze.time(events.start(activity)) - squeeze.time(BEGIN);
  }

  /** The flow that bounds the cost from below. */
  public Flow flow() {
    return events.flow();
  }
}
