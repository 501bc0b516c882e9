package dayworth.network;

/**
 * The earliest start of every activity of a scheduled plan that keeps its durations and lets no
 * span cost more.
 *
 * <p>Every bound says that a start comes at least so much after another: the links, the earliest
 * times, and for each span that its earlier moment comes at most so long before its later one. The
 * least starts that keep all of them are found by passes in topological order until nothing moves
 * (Bellman 1958, "On a routing problem"); the plan itself keeps them, so the passes end. As no
 * start becomes later than the plan's, the project finishes no later. O((activities + links) ×
 * passes), with at most two passes a span and one more.
 */
final class EarliestStarts {

  private final Network network;
  private final Plan plan;
  private final long[] start;
  private boolean isMoved;

  private EarliestStarts(Network network, Plan plan) {
    this.network = network;
    this.plan = plan;
    this.start = new long[network.size()];
  }

  static Plan of(Network network, Plan plan) {
    EarliestStarts starts = new EarliestStarts(network, plan);
    do {
      starts.isMoved = false;
      starts.followLinks();
      starts.holdSpans();
    } while (starts.isMoved);
    return plan.startingAt(starts.start);
  }

  private void followLinks() {
    for (int position = 0; position < start.length; position++) {
      int i = network.inOrder(position);
      moveTo(i, network.activity(i).earliestStart(plan.duration(i)));
      for (int k = 0; k < network.linksInto(i); k++) {
        Link link = network.link(network.linkInto(i, k));
        long apart =
            link.betweenStarts(plan.duration(link.predecessor()), plan.duration(link.successor()));
        moveTo(i, start[link.predecessor()] + apart);
      }
    }
  }

  private void holdSpans() {
    for (Span span : network.spans()) {
      if (!span.from().isProjectStart()) {
        long longest = span.free() + plan.charged(span);
        long least = time(span.to()) - longest;
        moveTo(span.from().activity(), least - offset(span.from()));
      }
    }
  }

  private long time(Moment moment) {
    return moment.isProjectStart() ? 0 : start[moment.activity()] + offset(moment);
  }

  private long offset(Moment moment) {
    return moment.isFinish() ? plan.duration(moment.activity()) : 0;
  }

  private void moveTo(int activity, long least) {
    if (start[activity] < least) {
      start[activity] = least;
      isMoved = true;
    }
  }
}
