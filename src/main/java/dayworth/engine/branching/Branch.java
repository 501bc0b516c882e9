package dayworth.engine.branching;

import dayworth.engine.Ways;
import dayworth.engine.measures.Opening;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A share of all plans: those whose moments come within given windows and that use what is open.
 * Immutable.
 *
 * @param windows for each charge one for each of its moments
 */
public record Branch(List<List<Window>> windows, Opening opening) {

  public Branch {
    windows = windows.stream().map(List::copyOf).toList();
  }

  /** All plans that finish within a duration. */
  static Branch whole(Network network, List<Charge> charges, long duration) {
    return new Branch(
        charges.stream()
            .map(charge -> charge.moments().stream().map(m -> new Window(0, duration)).toList())
            .toList(),
        Opening.all(network, Ways.of(network)));
  }

  /**
   * The convex problem of this branch. Where the slopes of its envelopes do not fit one scale, they
   * are rounded down to what {@link SlopeGrain} allows: the envelopes stay below their charges.
   *
   * @param fence money per tick outside the windows
   */
  public Relaxation relaxation(Network network, List<Charge> charges, Money fence) {
    Relaxation exact = relaxation(network, charges, fence, SlopeGrain.NONE);
    return Stepping.scaleFor(exact.convex()).isPresent()
        ? exact
        : relaxation(network, charges, fence, SlopeGrain.within(windows));
  }

  private Relaxation relaxation(
      Network network, List<Charge> charges, Money fence, SlopeGrain grain) {
    List<List<Envelope>> envelopes = new ArrayList<>();
    for (int j = 0; j < charges.size(); j++) {
      envelopes.add(Envelope.of(charges.get(j), windows.get(j), fence, grain));
    }
    return Relaxation.of(network, envelopes, opening);
  }

  /** The two halves of this branch; together they are all of it. */
  List<Branch> halves(Split split) {
    Window window = windows.get(split.charge()).get(split.moment());
    return List.of(
        with(split, new Window(window.least(), split.last())),
        with(split, new Window(split.last() + 1, window.most())));
  }

  /** The same windows with each of several openings. */
  List<Branch> with(List<Opening> openings) {
    return openings.stream().map(other -> new Branch(windows, other)).toList();
  }

  private Branch with(Split split, Window window) {
    List<List<Window>> changed = new ArrayList<>(windows);
    List<Window> ofCharge = new ArrayList<>(changed.get(split.charge()));
    ofCharge.set(split.moment(), window);
    changed.set(split.charge(), ofCharge);
    return new Branch(changed, opening);
  }

  /**
   * Where to split so that a charge's envelopes come closer to its money at a plan: the moment that
   * makes the greatest difference within its window. Empty if each of its windows is a point.
   */
  Optional<Split> splitFor(int j, Charge charge, Plan plan) {
    Optional<Split> best = Optional.empty();
    Money most = Money.of(-1);
    for (int k = 0; k < charge.moments().size(); k++) {
      Window window = windows.get(j).get(k);
      Money difference = difference(charge, plan, k, window);
      if (window.least() < window.most() && difference.compareTo(most) > 0) {
        most = difference;
        long time = plan.time(charge.moments().get(k));
        best = Optional.of(new Split(j, k, lastOfFirst(charge, k, window, time)));
      }
    }
    return best;
  }

  private static Money difference(Charge charge, Plan plan, int k, Window window) {
    long[] times = charge.moments().stream().mapToLong(plan::time).toArray();
    times[k] = window.least();
    Money atLeast = charge.at(times);
    times[k] = window.most();
    Money difference = charge.at(times).minus(atLeast);
    return difference.signum() < 0 ? difference.negate() : difference;
  }

  /** The plan's time comes into one half, with the next point on its dear side at that end. */
  private static long lastOfFirst(Charge charge, int k, Window window, long time) {
    long[] points = charge.points(k, window);
    if (charge.rises(k)) {
      int i = 0;
      while (i < points.length - 2 && points[i] < time) {
        i++;
      }
      return points[i];
    }
    int i = points.length - 1;
    while (i > 1 && points[i] > time) {
      i--;
    }
    return points[i] - 1;
  }

  /**
   * Where a branch is split.
   *
   * @param last the last time in the first half
   */
  record Split(int charge, int moment, long last) {}
}
