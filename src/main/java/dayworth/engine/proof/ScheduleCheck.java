package dayworth.engine.proof;

import dayworth.engine.proof.Verdict.Refuted;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Measure;
import dayworth.network.Network;
import dayworth.network.Plan;
import java.util.Arrays;
import java.util.Optional;

/**
 * Whether a plan can be carried out by a finish: takes the plan's starts or, where it has none,
 * builds the earliest start of every activity in an own pass; then looks at every limit and every
 * link once more.
 */
final class ScheduleCheck {

  private final Network network;
  private final Plan plan;
  private final long[] start;

  private ScheduleCheck(Network network, Plan plan) {
    this.network = network;
    this.plan = plan;
    this.start = new long[network.size()];
  }

  /** What makes the plan impossible; empty if it is possible. */
  static Optional<Refuted> fault(Network network, Plan plan, long finish) {
    if (plan.size() != network.size()) {
      return Optional.of(
          new Refuted(
              Place.PROJECT, plan.size() + " durations for " + network.size() + " activities"));
    }
    if (!network.spans().isEmpty() && !plan.isScheduled()) {
      return Optional.of(
          new Refuted(Place.PROJECT, "no starts, and money depends on them; a start for each"));
    }
    ScheduleCheck check = new ScheduleCheck(network, plan);
    for (int i = 0; i < network.size(); i++) {
      Optional<Refuted> fault = check.wrongDuration(i);
      if (fault.isPresent()) {
        return fault;
      }
    }
    if (plan.isScheduled()) {
      Arrays.setAll(check.start, plan::start);
    } else {
      check.placeEarliest();
    }
    return check.brokenLimit(finish).or(check::brokenLink);
  }

  private Optional<Refuted> wrongDuration(int i) {
    Activity activity = network.activity(i);
    long duration = plan.duration(i);
    if (plan.measure(i) != Plan.NO_MEASURE) {
      Measure measure = network.measures().get(plan.measure(i));
      boolean fits = measure.activity() == i && measure.duration() == duration;
      return fits
          ? Optional.empty()
          : refuted(i, "lasts " + duration + " ticks by " + measure.name(), "what it takes");
    }
    boolean within = duration >= activity.crash() && duration <= activity.normal();
    boolean atAnEnd = duration == activity.crash() || duration == activity.normal();
    return (activity.divisible() ? within : atAnEnd)
        ? Optional.empty()
        : refuted(
            i,
            "lasts " + duration + " ticks",
            activity.crash() + (activity.divisible() ? " to " : " or ") + activity.normal());
  }

  private void placeEarliest() {
    for (int position = 0; position < start.length; position++) {
      int activity = network.inOrder(position);
      long finish = network.activity(activity).notFinishedBefore();
      long earliest =
          Math.max(network.activity(activity).notBefore(), finish - plan.duration(activity));
      for (int k = 0; k < network.linksInto(activity); k++) {
        Link link = network.link(network.linkInto(activity, k));
        long event = from(link) + link.lag();
        long bound = link.relation().toStart() ? event : event - plan.duration(activity);
        earliest = Math.max(earliest, bound);
      }
      start[activity] = earliest;
    }
  }

  private Optional<Refuted> brokenLimit(long finish) {
    for (int i = 0; i < start.length; i++) {
      if (start[i] < network.activity(i).notBefore()) {
        return refuted(i, "starts at " + start[i], "at least " + network.activity(i).notBefore());
      }
      long earliest = network.activity(i).notFinishedBefore();
      if (start[i] + plan.duration(i) < earliest) {
        return refuted(i, "finishes at " + (start[i] + plan.duration(i)), "at least " + earliest);
      }
      if (start[i] + plan.duration(i) > finish) {
        return refuted(i, "finishes at " + (start[i] + plan.duration(i)), "at most " + finish);
      }
    }
    return Optional.empty();
  }

  private Optional<Refuted> brokenLink() {
    for (int j = 0; j < network.links().size(); j++) {
      Link link = network.link(j);
      if (to(link) - from(link) < link.lag()) {
        String why = "leaves " + (to(link) - from(link)) + " ticks; at least " + link.lag();
        return Optional.of(new Refuted(Place.link(network, j), why));
      }
    }
    return Optional.empty();
  }

  private long from(Link link) {
    int activity = link.predecessor();
    return start[activity] + (link.relation().fromStart() ? 0 : plan.duration(activity));
  }

  private long to(Link link) {
    int activity = link.successor();
    return start[activity] + (link.relation().toStart() ? 0 : plan.duration(activity));
  }

  private Optional<Refuted> refuted(int activity, String found, String right) {
    return Optional.of(new Refuted(Place.activity(network, activity), found + "; " + right));
  }
}
