package dayworth.testing;

import dayworth.decision.Status;
import dayworth.decision.Status.Finished;
import dayworth.decision.Status.InProgress;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.value.Money;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import java.util.TreeMap;

/**
 * Every choice of whole durations of what remains of a tiny network, timed with the true times of
 * what has happened, below zero, by relaxing all inequalities until nothing moves. It shares no
 * method with the program, and knows nothing of a network that is to go.
 */
public final class StatusBruteForce {

  private final Network planned;
  private final List<Status> statuses;

  /** The duration of what remains of each activity. */
  private final long[] duration;

  private final TreeMap<Long, Money> cheapest = new TreeMap<>();

  private StatusBruteForce(Network planned, List<Status> statuses) {
    this.planned = planned;
    this.statuses = statuses;
    this.duration = new long[planned.size()];
  }

  /** The least cost to go of each finish that some choice has. */
  public static Map<Long, Money> leastCosts(Network planned, List<Status> statuses) {
    StatusBruteForce force = new StatusBruteForce(planned, statuses);
    force.choose(0, Money.ZERO);
    return force.cheapest;
  }

  /** How many choices there are. */
  public static double choices(Network planned, List<Status> statuses) {
    StatusBruteForce force = new StatusBruteForce(planned, statuses);
    double choices = 1;
    for (int i = 0; i < planned.size(); i++) {
      choices *= force.longest(i) - force.shortest(i) + 1;
    }
    return choices;
  }

  private long longest(int i) {
    Status status = statuses.get(i);
    if (status instanceof Finished) {
      return 0;
    }
    return status instanceof InProgress rest ? rest.remaining() : planned.activity(i).normal();
  }

  /** In proportion to the whole, rounded up to a tick, where nothing else is said. */
  private long shortest(int i) {
    Activity activity = planned.activity(i);
    if (!(statuses.get(i) instanceof InProgress rest)) {
      return statuses.get(i) instanceof Finished ? 0 : activity.crash();
    }
    if (rest.crash().isPresent()) {
      return rest.crash().get().duration();
    }
    long shortest = 0;
    while (shortest * activity.normal() < rest.remaining() * activity.crash()) {
      shortest++;
    }
    return shortest;
  }

  private Money cost(int i, long chosen) {
    Activity activity = planned.activity(i);
    if (statuses.get(i) instanceof Finished) {
      return Money.ZERO;
    }
    long shortened = longest(i) - chosen;
    Money normal = activity.normalCost();
    if (statuses.get(i) instanceof InProgress rest) {
      normal = normal.times(rest.remaining()).dividedBy(activity.normal());
      if (rest.crash().isPresent()) {
        Money extra = rest.crash().get().cost().plus(normal.negate());
        long most = rest.remaining() - rest.crash().get().duration();
        return shortened == 0 ? normal : normal.plus(extra.times(shortened).dividedBy(most));
      }
    }
    long most = activity.normal() - activity.crash();
    Money extra = activity.crashCost().plus(activity.normalCost().negate());
    return most == 0 ? normal : normal.plus(extra.times(shortened).dividedBy(most));
  }

  private void choose(int i, Money cost) {
    if (i == planned.size()) {
      cheapest.merge(finish(), cost, Money::min);
      return;
    }
    for (long d = shortest(i); d <= longest(i); d++) {
      duration[i] = d;
      choose(i + 1, cost.plus(cost(i, d)));
    }
  }

  private long finish() {
    // When what remains begins; of finished work, when it was finished.
    long[] begin = new long[planned.size()];
    for (int i = 0; i < begin.length; i++) {
      Activity activity = planned.activity(i);
      if (statuses.get(i) instanceof Finished done) {
        begin[i] = done.finish();
      } else if (!(statuses.get(i) instanceof InProgress)) {
        long waits = activity.notFinishedBefore() - duration[i];
        begin[i] = Math.max(activity.notBefore(), waits);
      }
    }
    boolean moved = true;
    while (moved) {
      moved = false;
      for (Link link : planned.links()) {
        int to = link.successor();
        OptionalLong least = least(link, begin);
        if (least.isPresent() && begin[to] < least.getAsLong()) {
          begin[to] = least.getAsLong();
          moved = true;
        }
      }
    }
    long finish = 0;
    for (int i = 0; i < begin.length; i++) {
      finish = Math.max(finish, begin[i] + duration[i]);
    }
    return finish;
  }

  /** The least time at which what remains of a link's successor begins; none for finished work. */
  private OptionalLong least(Link link, long[] begin) {
    if (statuses.get(link.successor()) instanceof Finished) {
      return OptionalLong.empty();
    }
    int from = link.predecessor();
    long event = begin[from] + duration[from];
    if (link.relation().fromStart()) {
      event =
          statuses.get(from) instanceof InProgress rest
              ? rest.start()
              : statuses.get(from) instanceof Finished done ? done.start() : begin[from];
    }
    long bound = event + link.lag();
    return OptionalLong.of(link.relation().toStart() ? bound : bound - duration[link.successor()]);
  }
}
