package dayworth.engine.proof;

import dayworth.engine.Obstacle;
import dayworth.engine.proof.Verdict.Refuted;
import dayworth.network.Link;
import dayworth.network.Network;
import java.util.List;
import java.util.Optional;

/**
 * Walks a chain of obstacles from the project start to its finish.
 *
 * <p>Each term bounds a difference of event times in every plan there is: an activity's finish
 * comes at least its crash duration after its start, its start at least minus its normal duration
 * after its finish, a link's second event at least its lag after its first, a start at least the
 * not-before time, and a finish at least the not-finished-before time, after the project start. If
 * each term begins at the event where the one before it ended, the sum bounds the project's
 * duration. Between two terms a link without a lag may go unnamed, for it adds nothing, and so may
 * the step from the project start to an activity's start.
 */
final class StoppingChain {

  /** A start or a finish, or the project start. */
  private record Event(int activity, boolean isStart) {
    static final Event PROJECT_START = new Event(-1, true);
  }

  /** A term as what it says: {@code to} comes at least {@code ticks} after {@code from}. */
  private record Term(String place, Event from, Event to, long ticks) {}

  private final Network network;

  StoppingChain(Network network) {
    this.network = network;
  }

  Optional<Refuted> fault(List<Obstacle> obstacles, long shortest) {
    Event here = Event.PROJECT_START;
    WideSum sum = new WideSum();
    for (Obstacle obstacle : obstacles) {
      Optional<Term> known = term(obstacle);
      if (known.isEmpty()) {
        return refuted(Place.PROJECT, "has nothing that is meant by " + obstacle);
      }
      Term term = known.get();
      if (obstacle.ticks() != term.ticks()) {
        return refuted(term.place(), "adds " + obstacle.ticks() + " ticks; " + term.ticks());
      }
      if (!connects(here, term.from())) {
        return refuted(term.place(), "does not follow from the term before it in the chain");
      }
      here = term.to();
      sum.addProduct(1, term.ticks());
    }
    return end(here, sum, shortest);
  }

  private Optional<Refuted> end(Event here, WideSum sum, long shortest) {
    if (here.isStart() && !here.equals(Event.PROJECT_START)) {
      return refuted(
          Place.activity(network, here.activity()), "ends the chain at its start; at a finish");
    }
    return sum.total().bitLength() < Long.SIZE && sum.total().longValueExact() == shortest
        ? Optional.empty()
        : refuted(Place.PROJECT, "chain adds up to " + sum.total() + ", not " + shortest);
  }

  private Optional<Term> term(Obstacle obstacle) {
    if (obstacle instanceof Obstacle.Lag lag) {
      return lag.link() < 0 || lag.link() >= network.links().size()
          ? Optional.empty()
          : Optional.of(linkTerm(lag.link()));
    }
    if (obstacle instanceof Obstacle.AtShortest shortest) {
      return isKnown(shortest.activity()) ? Optional.of(forwards(shortest)) : Optional.empty();
    }
    if (obstacle instanceof Obstacle.CannotBeLonger longest) {
      return isKnown(longest.activity()) ? Optional.of(backwards(longest)) : Optional.empty();
    }
    if (obstacle instanceof Obstacle.NotFinishedBefore wait) {
      return isKnown(wait.activity()) ? Optional.of(toFinish(wait.activity())) : Optional.empty();
    }
    Obstacle.NotBefore wait = (Obstacle.NotBefore) obstacle;
    return isKnown(wait.activity()) ? Optional.of(toStart(wait.activity())) : Optional.empty();
  }

  private Term linkTerm(int index) {
    Link link = network.link(index);
    return new Term(Place.link(network, index), from(link), to(link), link.lag());
  }

  private Term forwards(Obstacle.AtShortest obstacle) {
    int i = obstacle.activity();
    long crash = network.activity(i).crash();
    return new Term(Place.activity(network, i), start(i), finish(i), crash);
  }

  private Term backwards(Obstacle.CannotBeLonger obstacle) {
    int i = obstacle.activity();
    long normal = network.activity(i).normal();
    return new Term(Place.activity(network, i), finish(i), start(i), -normal);
  }

  private Term toStart(int i) {
    long earliest = network.activity(i).notBefore();
    return new Term(Place.activity(network, i), Event.PROJECT_START, start(i), earliest);
  }

  private Term toFinish(int i) {
    long earliest = network.activity(i).notFinishedBefore();
    return new Term(Place.activity(network, i), Event.PROJECT_START, finish(i), earliest);
  }

  private boolean connects(Event here, Event next) {
    if (here.equals(next)) {
      return true;
    }
    if (here.equals(Event.PROJECT_START)) {
      return next.isStart();
    }
    for (int k = 0; k < network.linksOutOf(here.activity()); k++) {
      Link link = network.link(network.linkOutOf(here.activity(), k));
      if (link.lag() == 0 && from(link).equals(here) && to(link).equals(next)) {
        return true;
      }
    }
    return false;
  }

  private boolean isKnown(int activity) {
    return activity >= 0 && activity < network.size();
  }

  private static Event from(Link link) {
    return new Event(link.predecessor(), link.relation().fromStart());
  }

  private static Event to(Link link) {
    return new Event(link.successor(), link.relation().toStart());
  }

  private static Event start(int activity) {
    return new Event(activity, true);
  }

  private static Event finish(int activity) {
    return new Event(activity, false);
  }

  private static Optional<Refuted> refuted(String where, String why) {
    return Optional.of(new Refuted(where, why));
  }
}
