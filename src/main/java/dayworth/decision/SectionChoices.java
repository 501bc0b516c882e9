package dayworth.decision;

import dayworth.contract.Section;
import dayworth.engine.Ways;
import dayworth.engine.branching.Branching;
import dayworth.engine.branching.Point;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * What it costs in all to have a section on time that the least total leaves late.
 *
 * <p>A finish with the section on time costs at least what the same finish costs without that. So
 * the finishes are tried from the cheapest on, until the next one costs more without the section
 * than the best one found costs with it.
 */
final class SectionChoices {

  /** Convex problems for each finish that is tried. */
  private static final long PROBLEMS = 2_000;

  private final Case of;
  private final List<Finish> cheapestFirst;

  private SectionChoices(CurveAnswer curve) {
    this.of = curve.of();
    this.cheapestFirst = curve.rows().stream().sorted(Comparator.comparing(Finish::total)).toList();
  }

  /**
   * A choice for each section that can be had on time and is late at the least total.
   *
   * @param curve its plan asked for is that of the least total
   */
  static List<Choice> of(CurveAnswer curve) {
    SectionChoices choices = new SectionChoices(curve);
    List<Choice> found = new ArrayList<>();
    for (Section section : curve.of().momentMoney().sections()) {
      if (section.done().isEmpty()
          && !isOnTime(section, curve.asked().timing().plan())
          && choices.canBeOnTime(section)) {
        choices
            .proved(section)
            .ifPresent(
                finish -> found.add(new Choice(Choice.Kind.SECTION_DATE, finish, section.name())));
      }
    }
    return found;
  }

  private static boolean isOnTime(Section section, Plan plan) {
    return plan.time(Moment.finishOf(section.activity())) <= section.due().ticks();
  }

  private boolean canBeOnTime(Section section) {
    return Stepping.earliestFinish(Ways.reachable(of.network()), section.activity())
        <= section.due().ticks();
  }

  /** Empty also where the limit on branches leaves open what is cheapest: then none is named. */
  private Optional<Finish> proved(Section section) {
    try {
      return onTime(section);
    } catch (NotProved open) {
      return Optional.empty();
    }
  }

  private static final class NotProved extends RuntimeException {

    private static final long serialVersionUID = 1;
  }

  private Optional<Finish> onTime(Section section) {
    Optional<Finish> best = Optional.empty();
    for (Finish row : cheapestFirst) {
      BigDecimal least = row.total();
      if (best.filter(found -> found.total().compareTo(least) <= 0).isPresent()) {
        return best;
      }
      Optional<Finish> with = onTime(section, row.duration());
      if (with.isPresent()
          && best.filter(found -> found.total().compareTo(with.get().total()) <= 0).isEmpty()) {
        best = with;
      }
    }
    return best;
  }

  /** The cheapest plan for a finish with the section on time; empty if there is none. */
  private Optional<Finish> onTime(Section section, long finish) {
    HeldSections held =
        new HeldSections(of.pricedNetwork())
            .with(section, Math.max(0, finish - section.due().ticks()));
    Network network = held.network();
    if (Stepping.shortest(Ways.reachable(network)) > finish) {
      return Optional.empty();
    }
    List<Point> points =
        Branching.solve(network, of.momentMoney().charges(), new long[] {finish}, PROBLEMS);
    if (points.isEmpty()) {
      throw new NotProved();
    }
    Point point = points.get(0);
    if (!point.isProved()) {
      throw new NotProved();
    }
    Plan plan = point.plan();
    return Optional.of(
        PlanCost.of(of, held.ofBase(Timing.earliest(network, plan).scheduled()), finish));
  }
}
