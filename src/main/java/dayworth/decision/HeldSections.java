package dayworth.decision;

import dayworth.contract.Section;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.LongStream;

/**
 * A network in which sections finish by given times if the project finishes by its own: each is
 * followed by work that takes the rest of the time.
 */
final class HeldSections {

  /** No activity of a case can have an id with a semicolon. */
  private static final String ID = "after; ";

  private final Network base;
  private final List<Activity> activities;
  private final List<Link> links;

  HeldSections(Network base) {
    this.base = base;
    this.activities = new ArrayList<>(base.activities());
    this.links = new ArrayList<>(base.links());
  }

  /**
   * Holds one more section.
   *
   * @param rest ticks from the time by which it must finish to the project's finish, at least 0
   */
  HeldSections with(Section section, long rest) {
    links.add(Link.finishToStart(section.activity(), activities.size()));
    activities.add(Activity.fixed(ID + section.name(), rest, Money.ZERO));
    return this;
  }

  Network network() {
    return new Network(base.scale(), activities, links, base.spans(), base.measures());
  }

  /** The part of a scheduled plan of {@link #network} that is of the given activities. */
  Plan ofBase(Plan plan) {
    int size = base.size();
    return Plan.scheduled(
            LongStream.range(0, size).map(i -> plan.duration((int) i)).toArray(),
            LongStream.range(0, size).map(i -> plan.start((int) i)).toArray())
        .using(IntStream.range(0, size).map(plan::measure).toArray());
  }
}
