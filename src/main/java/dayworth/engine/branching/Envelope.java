package dayworth.engine.branching;

import dayworth.network.Moment;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.value.Money;
import dayworth.value.MoneySum;
import java.util.ArrayList;
import java.util.List;

/**
 * The largest convex money that is nowhere above a charge's part within a window, as a fixed amount
 * and spans from or to the project's start.
 *
 * <p>Its corners are those of the lower convex hull of the points (Andrew 1979, "Another efficient
 * algorithm for convex hulls in two dimensions"). On the cheap side of the window it stays at the
 * end's amount, which is no more than what the window's own times cost; beyond the dear side each
 * tick costs {@code fence}, so that no cheaper plan is lost and none gains by leaving the window.
 *
 * @param fixed the amount at the cheap end
 * @param spans what is added for coming later, or earlier
 */
public record Envelope(Money fixed, List<Span> spans) {

  private record Corner(long time, Money money) {}

  /**
   * The envelopes of a charge's parts.
   *
   * @param fence money per tick beyond the dear side, above every slope within
   * @param grain what slopes within are rounded down to
   */
  static List<Envelope> of(Charge charge, List<Window> windows, Money fence, SlopeGrain grain) {
    List<Charge.Part> parts = charge.within(windows);
    List<Envelope> envelopes = new ArrayList<>();
    for (int k = 0; k < parts.size(); k++) {
      List<Corner> hull = hull(parts.get(k), charge.rises(k), charge.points(k, windows.get(k)));
      Moment moment = charge.moments().get(k);
      envelopes.add(
          new Envelope(
              hull.get(0).money(),
              spans(hull, moment, charge.rises(k), slopes(hull, fence, grain), charge.name())));
    }
    return envelopes;
  }

  /** What it adds to the cost of a plan. */
  Money at(Plan plan) {
    MoneySum sum = new MoneySum().add(fixed);
    spans.forEach(span -> sum.add(span.rate(), plan.charged(span), 1));
    return sum.total();
  }

  /** From the cheap side to the dear one. */
  private static List<Corner> hull(Charge.Part part, boolean rises, long[] points) {
    List<Corner> hull = new ArrayList<>();
    for (int i = 0; i < points.length; i++) {
      long time = rises ? points[i] : points[points.length - 1 - i];
      Corner next = new Corner(time, part.at(time));
      while (hull.size() >= 2 && isAbove(hull, next)) {
        hull.remove(hull.size() - 1);
      }
      hull.add(next);
    }
    return hull;
  }

  /** The slope from each corner on. */
  private static List<Money> slopes(List<Corner> hull, Money fence, SlopeGrain grain) {
    List<Money> slopes = new ArrayList<>();
    for (int i = 0; i + 1 < hull.size(); i++) {
      slopes.add(grain.roundedDown(slope(hull.get(i), hull.get(i + 1))));
    }
    slopes.add(fence);
    return slopes;
  }

  private static List<Span> spans(
      List<Corner> hull, Moment moment, boolean rises, List<Money> slopes, String name) {
    List<Span> spans = new ArrayList<>();
    Money slope = Money.ZERO;
    for (int i = 0; i < hull.size(); i++) {
      Money rate = slopes.get(i).minus(slope);
      if (rate.signum() > 0) {
        spans.add(span(moment, rises, hull.get(i).time(), rate, name));
      }
      slope = slopes.get(i);
    }
    return spans;
  }

  /** Whether the last corner is on or above the line from the one before it to the next. */
  private static boolean isAbove(List<Corner> hull, Corner next) {
    Corner last = hull.get(hull.size() - 1);
    Corner before = hull.get(hull.size() - 2);
    return slope(before, last).compareTo(slope(last, next)) >= 0;
  }

  private static Money slope(Corner one, Corner other) {
    return other.money().minus(one.money()).dividedBy(Math.abs(other.time() - one.time()));
  }

  private static Span span(Moment moment, boolean rises, long time, Money rate, String name) {
    return rises
        ? new Span(name, Moment.PROJECT_START, moment, time, rate)
        : new Span(name, moment, Moment.PROJECT_START, -time, rate);
  }
}
