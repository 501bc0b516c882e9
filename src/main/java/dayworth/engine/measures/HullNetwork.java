package dayworth.engine.measures;

import dayworth.network.Activity;
import dayworth.network.Measures;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Span;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;

/**
 * The convex problem that bounds the choice of ways from below: each activity may take any duration
 * from its shortest open way to its longest, at the cost of the lower hull of its open ways
 * (Demeulemeester, De Reyck, Foubert, Herroelen and Vanhoucke 1998, "New computational results on
 * the discrete time/cost trade-off problem in project networks").
 *
 * <p>The hull's longest piece is the activity's cost slope; at each corner a span from its finish
 * back to its start adds what a shorter duration costs more. The spans of the network stay first.
 */
public final class HullNetwork {

  private HullNetwork() {}

  /** The problem; what packages that are paid for cost comes on top. */
  public static Network of(Network network, Opening opening) {
    List<Activity> activities = new ArrayList<>();
    List<Span> spans = new ArrayList<>(network.spans());
    for (int i = 0; i < network.size(); i++) {
      int[] hull = opening.hull(i);
      activities.add(activity(network.activity(i), hull, opening));
      addCorners(network.activity(i).id(), i, hull, opening, spans);
    }
    return network.withActivities(activities, Measures.NONE).withSpans(spans);
  }

  private static Activity activity(Activity whole, int[] hull, Opening opening) {
    int last = hull[hull.length - 1];
    long normal = opening.duration(last);
    long crash = opening.duration(hull[0]);
    Money cost = opening.cost(last);
    Money slope = hull.length == 1 ? Money.ZERO : opening.fall(hull[hull.length - 2], last);
    return new Activity(
        whole.id(),
        whole.name(),
        whole.group(),
        normal,
        crash,
        cost,
        cost.plus(slope.times(normal - crash)),
        whole.notBefore(),
        whole.notFinishedBefore());
  }

  private static void addCorners(String id, int i, int[] hull, Opening opening, List<Span> spans) {
    for (int k = hull.length - 2; k > 0; k--) {
      Money more = opening.fall(hull[k - 1], hull[k]).minus(opening.fall(hull[k], hull[k + 1]));
      if (more.signum() > 0) {
        long corner = opening.duration(hull[k]);
        spans.add(new Span(id, Moment.finishOf(i), Moment.startOf(i), -corner, more));
      }
    }
  }
}
