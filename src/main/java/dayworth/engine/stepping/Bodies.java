package dayworth.engine.stepping;

import static dayworth.engine.stepping.ArcNetwork.UNLIMITED;
import static dayworth.engine.stepping.EventNetwork.BEGIN;
import static dayworth.engine.stepping.EventNetwork.END;

import dayworth.engine.Flow.Over;

/**
 * Events that no cheapest plan moves against each other are one body.
 *
 * <p>Found by joining the two ends of every arc that the flow makes an equality; the project's
 * start and finish are one body as the length is given.
 */
final class Bodies {

  private final EventNetwork events;
  private final Squeeze squeeze;

  /** Towards the event that stands for the body; itself for that one. */
  private final int[] parent;

  /** The number of each event's body. */
  private final int[] body;

  private int count;

  private Bodies(EventNetwork events, Squeeze squeeze) {
    this.events = events;
    this.squeeze = squeeze;
    int size = events.net.events();
    parent = new int[size];
    body = new int[size];
    for (int v = 0; v < size; v++) {
      parent[v] = v;
    }
  }

  static Bodies of(EventNetwork events, Squeeze squeeze) {
    Bodies bodies = new Bodies(events, squeeze);
    bodies.join(BEGIN, END);
    bodies.joinOverFlow();
    bodies.joinSettled();
    bodies.number();
    return bodies;
  }

  int count() {
    return count;
  }

  int of(int event) {
    return body[event];
  }

  /** How long after one event the other comes where the squeeze stands. */
  long between(int one, int other) {
    return squeeze.time(other) - squeeze.time(one);
  }

  /**
   * Adds the logic between bodies that is not an equality; the time of a body is how far it has
   * moved from where the squeeze stands.
   */
  void addLogic(ArcNetwork.Builder arcs) {
    for (int arc = 0; arc < events.net.arcs(); arc++) {
      int tail = body[events.net.tail(arc)];
      int head = body[events.net.head(arc)];
      if (tail != head) {
        long room = events.net.length(arc) - between(events.net.tail(arc), events.net.head(arc));
        if (isLogic(events.over(arc)) || isEmptySpan(arc)) {
          arcs.add(tail, head, room, UNLIMITED);
        } else if (isFullSpan(arc)) {
          arcs.add(head, tail, -room, UNLIMITED);
        }
      }
    }
  }

  private boolean isEmptySpan(int arc) {
    return events.over(arc) == Over.SPAN && events.net.flow(arc) == 0;
  }

  private boolean isFullSpan(int arc) {
    return events.over(arc) == Over.SPAN && events.net.isFull(arc);
  }

  private boolean isPartlyFullSpan(int arc) {
    return events.over(arc) == Over.SPAN && events.net.flow(arc) > 0 && !events.net.isFull(arc);
  }

  private static boolean isLogic(Over over) {
    return switch (over) {
      case LINK, FROM_PROJECT, FROM_PROJECT_TO_FINISH, TO_PROJECT -> true;
      default -> false;
    };
  }

  private boolean hasFlow(int arc) {
    return arc >= 0 && events.net.flow(arc) > 0;
  }

  /**
   * Whether all cheapest plans give an activity the same duration, whatever its events do: its
   * slope arc has room left, or flow runs over its crash or normal duration.
   */
  private boolean isSettled(int i) {
    ArcNetwork net = events.net;
    return hasFlow(events.crashArc[i])
        || hasFlow(events.stretchArc[i])
        || (events.slopeArc[i] >= 0 && !net.isFull(events.slopeArc[i]))
        || (events.cheaperArc[i] >= 0 && !net.isFull(events.cheaperArc[i]));
  }

  private void joinOverFlow() {
    for (int arc = 0; arc < events.net.arcs(); arc++) {
      if ((isLogic(events.over(arc)) && events.net.flow(arc) > 0) || isPartlyFullSpan(arc)) {
        join(events.net.tail(arc), events.net.head(arc));
      }
    }
  }

  private void joinSettled() {
    for (int i = 0; i < events.network.size(); i++) {
      if (events.has(i) && events.isOpen(i) && isSettled(i)) {
        join(events.start(i), events.finish(i));
      }
    }
  }

  private void join(int one, int other) {
    parent[find(one)] = find(other);
  }

  private int find(int event) {
    int root = event;
    while (parent[root] != root) {
      parent[root] = parent[parent[root]];
      root = parent[root];
    }
    return root;
  }

  private void number() {
    for (int v = 0; v < parent.length; v++) {
      if (parent[v] == v) {
        body[v] = count++;
      }
    }
    for (int v = 0; v < parent.length; v++) {
      body[v] = body[find(v)];
    }
  }
}
