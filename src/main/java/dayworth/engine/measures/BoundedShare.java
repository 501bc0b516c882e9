package dayworth.engine.measures;

import dayworth.engine.Flow;
import dayworth.engine.Flow.Over;
import dayworth.engine.Ways;
import dayworth.engine.proof.WayBound;
import dayworth.network.Activity;
import dayworth.network.Measures;
import dayworth.network.Network;
import java.util.ArrayList;
import java.util.List;

/**
 * A share of the plans with what bounds it: every activity takes the allowed way that is best at
 * the prices of a flow, and any other allowed way would cost more at these prices.
 *
 * @param network where each activity has that one way
 * @param flow on it
 */
public record BoundedShare(Network network, Flow flow) {

  static BoundedShare of(
      Network network, Opening opening, WayBound.Proven proven, boolean[] allowed, Flow found) {
    Ways ways = opening.ways();
    List<Activity> activities = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      Activity whole = network.activity(i);
      int way = proven.best(i, allowed);
      activities.add(
          new Activity(
              whole.id(),
              whole.name(),
              whole.group(),
              ways.get(way).duration(),
              ways.get(way).duration(),
              opening.cost(way),
              opening.cost(way),
              whole.notBefore(),
              whole.notFinishedBefore()));
    }
    Network settled = network.withActivities(activities, Measures.NONE);
    return new BoundedShare(settled, through(settled, proven, found));
  }

  /** The same flow, with all that passes an activity on its one duration. */
  private static Flow through(Network settled, WayBound.Proven proven, Flow found) {
    Flow flow = new Flow(found.scale(), settled);
    for (Over over : List.of(Over.FROM_PROJECT, Over.FROM_PROJECT_TO_FINISH, Over.TO_PROJECT)) {
      for (int i = 0; i < settled.size(); i++) {
        flow.set(over, i, found.get(over, i));
      }
    }
    for (int j = 0; j < settled.links().size(); j++) {
      flow.set(Over.LINK, j, found.get(Over.LINK, j));
    }
    for (int j = 0; j < settled.spans().size(); j++) {
      flow.set(Over.SPAN, j, found.get(Over.SPAN, j));
    }
    for (int i = 0; i < settled.size(); i++) {
      long through = proven.through(i);
      flow.set(through > 0 ? Over.CRASH : Over.BACK_OVER_NORMAL, i, Math.abs(through));
    }
    return flow;
  }
}
