package dayworth.engine.stepping;

import dayworth.engine.Obstacle;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Relation;
import java.util.ArrayList;
import java.util.List;

/**
 * Tells a path without limit from the project's start to its finish as the chain of activities,
 * lags and dates that it is.
 */
final class HoldingChain {

  private final EventNetwork events;
  private final List<Obstacle> terms = new ArrayList<>();

  /** Where the chain has come to: an activity, and whether it is at its start. */
  private int activity = -1;

  private boolean atStart;

  private HoldingChain(EventNetwork events) {
    this.events = events;
  }

  static List<Obstacle> of(EventNetwork events, List<Integer> halves) {
    HoldingChain chain = new HoldingChain(events);
    int[] arcOf = events.net.arcOfHalf();
    for (int half : halves) {
      chain.pass(arcOf[half]);
    }
    return chain.terms;
  }

  private void pass(int arc) {
    int index = events.index(arc);
    switch (events.over(arc)) {
      case FROM_PROJECT -> begin(index);
      case FROM_PROJECT_TO_FINISH -> beginAtFinish(index);
      case CRASH -> cross(false);
      case BACK_OVER_NORMAL -> cross(true);
      case LINK -> follow(index);
      case TO_PROJECT -> comeTo(false);
      default -> throw new IllegalStateException("a path without limit has no priced arc");
    }
  }

  private void begin(int first) {
    activity = first;
    atStart = true;
    long notBefore = events.network.activity(first).notBefore();
    if (notBefore > 0) {
      terms.add(new Obstacle.NotBefore(first, notBefore));
    }
  }

  private void beginAtFinish(int first) {
    activity = first;
    atStart = false;
    long earliest = events.network.activity(first).notFinishedBefore();
    terms.add(new Obstacle.NotFinishedBefore(first, earliest));
  }

  private void follow(int index) {
    Link link = events.network.link(index);
    comeTo(link.relation().fromStart());
    if (link.lag() != 0 || link.relation() != Relation.FS) {
      terms.add(new Obstacle.Lag(index, link.lag()));
    }
    activity = link.successor();
    atStart = link.relation().toStart();
  }

  /** Crosses an activity of one event, whose duration is part of the next arc's length. */
  private void comeTo(boolean start) {
    if (atStart != start) {
      cross(start);
    }
  }

  private void cross(boolean backwards) {
    Activity crossed = events.network.activity(activity);
    terms.add(
        backwards
            ? new Obstacle.CannotBeLonger(activity, -crossed.normal())
            : new Obstacle.AtShortest(activity, crossed.crash()));
    atStart = backwards;
  }
}
