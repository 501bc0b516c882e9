package dayworth.decision;

import dayworth.decision.Status.Crash;
import dayworth.decision.Status.Finished;
import dayworth.decision.Status.InProgress;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Measures;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Span;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;

/**
 * What of a planned network is still to go, as a network of its own whose time begins with the
 * status.
 *
 * <p>What has happened is fixed at 0 or before. A started activity becomes the work that remains of
 * it: contiguous, from an event of its own that comes no earlier than 0 and waits for the
 * predecessors as the activity's start would (so work that began out of sequence goes on only when
 * its predecessors allow it). A link from what has happened becomes an earliest start or finish of
 * its successor; links into finished work say nothing any more and go. A finished activity keeps
 * its index, without links, duration or cost. Money that runs from what has happened runs from 0,
 * and money that ran until then is no cost to go.
 *
 * <p>The cost to go is the normal cost × what remains / normal duration. What remains can be
 * compressed in the same proportion and at the same slope, to a shortest duration that is rounded
 * up to a tick, unless the status says otherwise. O(activities + links).
 */
public final class WorkToGo {

  private static final Money NOTHING = Money.ZERO;

  private final Network planned;
  private final List<Status> statuses;
  private final Network network;

  /** Indices of planned links; the network has no others, in the same order. */
  private final List<Integer> links = new ArrayList<>();

  /** Earliest starts and finishes in ticks that follow from what has happened; 0 for none. */
  private final long[] earliestStart;

  private final long[] earliestFinish;

  private WorkToGo(Network planned, List<Status> statuses) {
    if (statuses.size() != planned.size()) {
      throw new IllegalArgumentException("a status for each activity");
    }
    this.planned = planned;
    this.statuses = statuses;
    this.earliestStart = new long[planned.size()];
    this.earliestFinish = new long[planned.size()];
    for (int j = 0; j < planned.links().size(); j++) {
      take(j);
    }
    List<Activity> activities = new ArrayList<>();
    for (int i = 0; i < planned.size(); i++) {
      activities.add(toGo(i));
    }
    this.network =
        new Network(
            planned.scale(),
            activities,
            links.stream().map(planned::link).toList(),
            planned.spans().stream().flatMap(span -> toGo(span).stream()).toList(),
            measuresToGo());
  }

  /**
   * What is to go.
   *
   * @param planned all work, with earliest times that count from the status
   * @param progress empty where nothing has started
   * @throws IllegalArgumentException if an activity without a normal duration is in progress
   */
  public static WorkToGo of(Network planned, Optional<Progress> progress) {
    List<Status> statuses =
        progress
            .map(Progress::statuses)
            .orElseGet(() -> Collections.nCopies(planned.size(), new Status.NotStarted()));
    return new WorkToGo(planned, statuses);
  }

  public Network network() {
    return network;
  }

  /** The planned link, by its index, that each link of the network is. */
  public List<Integer> links() {
    return List.copyOf(links);
  }

  public Status status(int activity) {
    return statuses.get(activity);
  }

  /** The earliest start in ticks that follows from what has happened; 0 for none. */
  public long earliestStart(int activity) {
    return earliestStart[activity];
  }

  private void take(int index) {
    Link link = planned.link(index);
    int to = link.successor();
    if (statuses.get(to).isFinished()) {
      return;
    }
    OptionalLong happened = time(link.predecessor(), !link.relation().fromStart());
    if (happened.isEmpty()) {
      links.add(index);
      return;
    }
    long[] earliest = link.relation().toStart() ? earliestStart : earliestFinish;
    earliest[to] = Math.max(earliest[to], happened.getAsLong() + link.lag());
  }

  /** When an activity's start or finish has happened; empty if it is to come. */
  private OptionalLong time(int activity, boolean isFinish) {
    Status status = statuses.get(activity);
    if (status instanceof Finished done) {
      return OptionalLong.of(isFinish ? done.finish() : done.start());
    }
    return status instanceof InProgress started && !isFinish
        ? OptionalLong.of(started.start())
        : OptionalLong.empty();
  }

  /** Started work keeps only measures for what remains, finished work none. */
  private Measures measuresToGo() {
    return new Measures(
        planned.measures().list().stream()
            .filter(
                measure ->
                    statuses.get(measure.activity()) instanceof Status.NotStarted
                        || (measure.ofRemaining()
                            && statuses.get(measure.activity()) instanceof InProgress))
            .toList(),
        planned.measures().packages());
  }

  private Activity toGo(int i) {
    Activity whole = planned.activity(i);
    Status status = statuses.get(i);
    if (status instanceof Finished) {
      return new Activity(whole.id(), whole.name(), whole.group(), 0, 0, NOTHING, NOTHING, 0);
    }
    return status instanceof InProgress started
        ? rest(i, whole, started)
        : new Activity(
            whole.id(),
            whole.name(),
            whole.group(),
            whole.normal(),
            whole.crash(),
            whole.normalCost(),
            whole.crashCost(),
            Math.max(whole.notBefore(), earliestStart[i]),
            Math.max(whole.notFinishedBefore(), earliestFinish[i]),
            whole.divisible());
  }

  private Activity rest(int i, Activity whole, InProgress started) {
    long remaining = started.remaining();
    Money cost = costToGo(whole, remaining);
    Crash crash = started.crash().orElseGet(() -> crashInProportion(whole, remaining, cost));
    return new Activity(
        whole.id(),
        whole.name(),
        whole.group(),
        remaining,
        crash.duration(),
        cost,
        crash.duration() == remaining ? cost : crash.cost(),
        earliestStart[i],
        earliestFinish[i],
        whole.divisible());
  }

  /**
   * What the rest of an activity costs the normal way.
   *
   * @param remaining ticks
   */
  public static Money costToGo(Activity whole, long remaining) {
    if (whole.normal() == 0) {
      throw new IllegalArgumentException(whole.id() + " takes no time, so none of it remains");
    }
    return whole.normalCost().times(remaining).dividedBy(whole.normal());
  }

  private static Crash crashInProportion(Activity whole, long remaining, Money cost) {
    long down = Math.multiplyExact(remaining, whole.mostShortening()) / whole.normal();
    return new Crash(remaining - down, cost.plus(whole.slope().times(down)));
  }

  private Optional<Span> toGo(Span span) {
    if (time(span.to()).isPresent()) {
      return Optional.empty();
    }
    OptionalLong begun = time(span.from());
    if (begun.isEmpty()) {
      return Optional.of(span);
    }
    long free = Math.max(0, span.free() + begun.getAsLong());
    return Optional.of(new Span(span.name(), Moment.PROJECT_START, span.to(), free, span.rate()));
  }

  private OptionalLong time(Moment moment) {
    return moment.isProjectStart()
        ? OptionalLong.empty()
        : time(moment.activity(), moment.isFinish());
  }
}
