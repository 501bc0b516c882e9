package dayworth.engine.proof;

import dayworth.engine.Flow;
import dayworth.engine.Flow.Over;
import dayworth.engine.proof.Arc.Event;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Span;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Lists the arcs that a flow may run over, with their lengths and limits from the network. */
final class Arcs {

  private final Network network;
  private final Flow flow;
  private final List<Arc> arcs = new ArrayList<>();

  private Arcs(Network network, Flow flow) {
    this.network = network;
    this.flow = flow;
  }

  /**
   * Every arc; the last closes the circle from the project's finish to its start.
   *
   * @param finish ticks within which the project is promised
   */
  static List<Arc> of(Network network, long finish, Flow flow) {
    Arcs all = new Arcs(network, flow);
    for (int i = 0; i < network.size(); i++) {
      all.addActivity(i);
    }
    for (int j = 0; j < network.links().size(); j++) {
      all.addLink(j);
    }
    for (int j = 0; j < network.spans().size(); j++) {
      all.addSpan(j);
    }
    all.addPromise(finish);
    return all.arcs;
  }

  private void addActivity(int i) {
    Activity activity = network.activity(i);
    Event start = new Event(i, false);
    Event finish = new Event(i, true);
    Money slope = activity.slope();
    Money cheaper = slope.negate();
    add(Event.PROJECT_START, start, Over.FROM_PROJECT, i, activity.notBefore(), Optional.empty());
    add(
        Event.PROJECT_START,
        finish,
        Over.FROM_PROJECT_TO_FINISH,
        i,
        activity.notFinishedBefore(),
        Optional.empty());
    if (slope.signum() > 0) {
      add(start, finish, Over.SLOPE, i, activity.normal(), Optional.of(slope));
    } else if (slope.signum() < 0) {
      add(finish, start, Over.BACK_OVER_CRASH, i, -activity.crash(), Optional.of(cheaper));
    }
    add(start, finish, Over.CRASH, i, activity.crash(), Optional.empty());
    add(finish, start, Over.BACK_OVER_NORMAL, i, -activity.normal(), Optional.empty());
    add(finish, Event.PROJECT_FINISH, Over.TO_PROJECT, i, 0, Optional.empty());
  }

  private void addLink(int j) {
    Link link = network.link(j);
    Event from = new Event(link.predecessor(), !link.relation().fromStart());
    Event to = new Event(link.successor(), !link.relation().toStart());
    add(from, to, Over.LINK, j, link.lag(), Optional.empty());
  }

  private void addSpan(int j) {
    Span span = network.spans().get(j);
    add(event(span.to()), event(span.from()), Over.SPAN, j, -span.free(), Optional.of(span.rate()));
  }

  private static Event event(Moment moment) {
    return new Event(moment.activity(), moment.isFinish());
  }

  private void addPromise(long finish) {
    long through = 0;
    for (int i = 0; i < network.size(); i++) {
      through = Math.addExact(through, flow.get(Over.TO_PROJECT, i));
    }
    arcs.add(
        new Arc(
            Event.PROJECT_FINISH,
            Event.PROJECT_START,
            Arc.Over.PROMISE,
            -1,
            -finish,
            through,
            Optional.empty()));
  }

  private void add(
      Event from, Event to, Over over, int index, long length, Optional<Money> capacity) {
    Arc.Over named = Arc.Over.valueOf(over.name());
    arcs.add(new Arc(from, to, named, index, length, flow.get(over, index), capacity));
  }
}
