package dayworth.engine.proof;

import dayworth.engine.Flow;
import dayworth.engine.Flow.Over;
import dayworth.engine.proof.Verdict.Refuted;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Span;
import java.util.Locale;
import java.util.Optional;

/**
 * One pass over a flow: every amount within its limit, as much into every event as out of it, and Σ
 * length × flow added up. The first fault in the order activities, links, events is kept.
 */
final class FlowRecount {

  private final Network network;
  private final FlowLimits limits;
  private final Flow flow;

  /** What is left at each event: in minus out. */
  private final long[] atStart;

  private final long[] atFinish;
  private final WideSum lengths = new WideSum();
  private final WideSum leaving = new WideSum();
  private final WideSum reaching = new WideSum();
  private Optional<Refuted> fault = Optional.empty();

  private FlowRecount(Network network, FlowLimits limits, Flow flow) {
    this.network = network;
    this.limits = limits;
    this.flow = flow;
    this.atStart = new long[network.size()];
    this.atFinish = new long[network.size()];
  }

  static FlowBound of(Network network, FlowLimits limits, Flow flow) {
    FlowRecount recount = new FlowRecount(network, limits, flow);
    if (flow.scale().perUnit() < 1) {
      recount.refute(Place.PROJECT, "flow has no scale: " + flow.scale());
    }
    for (int i = 0; i < network.size(); i++) {
      recount.addActivity(i);
    }
    for (int j = 0; j < network.links().size(); j++) {
      recount.addLink(j);
    }
    for (int j = 0; j < network.spans().size(); j++) {
      recount.addSpan(j);
    }
    recount.balance();
    return new FlowBound(limits, recount.lengths.total(), recount.leaving.total(), recount.fault);
  }

  private void addActivity(int i) {
    Activity activity = network.activity(i);
    long all = Long.MAX_VALUE;
    through(i, Over.SLOPE, activity.normal(), limits.overNormal(i));
    through(i, Over.CRASH, activity.crash(), all);
    back(i, Over.BACK_OVER_NORMAL, activity.normal(), all);
    back(i, Over.BACK_OVER_CRASH, activity.crash(), limits.backOverCrash(i));
    fromProject(i, Over.FROM_PROJECT, activity.notBefore(), atStart);
    fromProject(i, Over.FROM_PROJECT_TO_FINISH, activity.notFinishedBefore(), atFinish);
    long out = amount(i, Over.TO_PROJECT, all);
    if (out != 0) {
      reaching.addProduct(1, out);
      add(atFinish, i, -out);
    }
  }

  private void fromProject(int activity, Over over, long earliest, long[] event) {
    long amount = amount(activity, over, Long.MAX_VALUE);
    if (amount != 0) {
      lengths.addProduct(earliest, amount);
      leaving.addProduct(1, amount);
      add(event, activity, amount);
    }
  }

  private void through(int activity, Over over, long length, long most) {
    long amount = amount(activity, over, most);
    if (amount != 0) {
      lengths.addProduct(length, amount);
      add(atStart, activity, -amount);
      add(atFinish, activity, amount);
    }
  }

  private void back(int activity, Over over, long length, long most) {
    long amount = amount(activity, over, most);
    if (amount != 0) {
      lengths.addProduct(-length, amount);
      add(atFinish, activity, -amount);
      add(atStart, activity, amount);
    }
  }

  private void addLink(int index) {
    long amount = flow.get(Over.LINK, index);
    if (amount < 0) {
      refute(Place.link(network, index), "carries " + amount + "; at least 0");
    } else if (amount > 0) {
      Link link = network.link(index);
      lengths.addProduct(link.lag(), amount);
      add(link.relation().fromStart() ? atStart : atFinish, link.predecessor(), -amount);
      add(link.relation().toStart() ? atStart : atFinish, link.successor(), amount);
    }
  }

  private void addSpan(int index) {
    long amount = flow.get(Over.SPAN, index);
    long most = limits.backOverSpan(index);
    if (amount < 0 || amount > most) {
      refute(Place.span(network, index), "carries " + amount + "; 0 to " + most);
    } else if (amount > 0) {
      Span span = network.spans().get(index);
      lengths.addProduct(-span.free(), amount);
      addAt(span.to(), -amount);
      addAt(span.from(), amount);
    }
  }

  private void addAt(Moment moment, long amount) {
    if (moment.isProjectStart()) {
      leaving.addProduct(-1, amount);
    } else {
      add(moment.isFinish() ? atFinish : atStart, moment.activity(), amount);
    }
  }

  private long amount(int activity, Over over, long most) {
    long amount = flow.get(over, activity);
    if (amount < 0 || amount > most) {
      String range = most == Long.MAX_VALUE ? "at least 0" : "0 to " + most;
      refute(
          Place.activity(network, activity),
          over.name().toLowerCase(Locale.ROOT) + " carries " + amount + "; " + range);
    }
    return amount;
  }

  private void add(long[] event, int activity, long amount) {
    long sum = event[activity] + amount;
    if (((event[activity] ^ sum) & (amount ^ sum)) < 0) {
      refute(Place.activity(network, activity), "carries more than can be counted");
    }
    event[activity] = sum;
  }

  private void balance() {
    for (int i = 0; i < network.size(); i++) {
      requireEmpty(i, "start", atStart[i]);
      requireEmpty(i, "finish", atFinish[i]);
    }
    if (!leaving.total().equals(reaching.total())) {
      refute(
          Place.PROJECT,
          leaving.total() + " leaves its start and " + reaching.total() + " reaches its finish");
    }
  }

  private void requireEmpty(int activity, String event, long left) {
    if (left != 0) {
      refute(
          Place.activity(network, activity),
          "into its " + event + " runs " + left + " more than out of it; equal");
    }
  }

  private void refute(String where, String why) {
    if (fault.isEmpty()) {
      fault = Optional.of(new Refuted(where, why));
    }
  }
}
