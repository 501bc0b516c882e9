package dayworth.engine.stepping;

import dayworth.engine.Change;
import dayworth.engine.Curve;
import dayworth.engine.Obstacle;
import dayworth.engine.PieceWitness;
import dayworth.engine.Step;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.value.MoneySum;
import java.util.ArrayList;
import java.util.List;

/** Turns the lengths at which a squeeze changes its price into breakpoints, plans and steps. */
final class CurveRecorder implements Squeeze.Listener {

  private final EventNetwork events;
  private final Squeeze squeeze;
  private final PieceWitness witness;
  private final TieRule ties;
  private final List<Step> steps = new ArrayList<>();

  /** The plans of the breakpoints, where spans make their starts matter. */
  private final List<Plan> scheduled = new ArrayList<>();

  private long longest;
  private long last;
  private Plan firstPlan;
  private Plan plan;

  CurveRecorder(EventNetwork events, Squeeze squeeze, PieceWitness witness) {
    this.events = events;
    this.squeeze = squeeze;
    this.witness = witness;
    this.ties = new TieRule(events);
    this.plan = Plan.allNormal(events.network);
    this.firstPlan = plan;
  }

  @Override
  public void arrived(long length) {
    Plan before = plan;
    plan = ties.choose(squeeze, before);
    if (!events.network.spans().isEmpty()) {
      scheduled.add(plan);
    }
    if (squeeze.sent() == 0) {
      firstPlan = plan;
      longest = length;
      tell(length, plan, length);
    } else {
      steps.add(step(last, length, before));
      tell(last, before, length);
    }
    last = length;
  }

  @Override
  public void priced(long length, long price) {}

  /** The plan to report where the squeeze stands now. */
  Plan planHere() {
    return ties.choose(squeeze, plan);
  }

  Curve curve(List<Obstacle> obstacles) {
    return new Curve(
        events.network,
        longest,
        firstPlan,
        firstPlan.cost(events.network),
        steps,
        obstacles,
        scheduled);
  }

  private void tell(long from, Plan fromPlan, long to) {
    if (witness != PieceWitness.NONE) {
      witness.piece(from, fromPlan, to, plan, events.flow());
    }
  }

  private Step step(long from, long to, Plan before) {
    Network network = events.network;
    List<Change> changes = new ArrayList<>();
    MoneySum extra = new MoneySum();
    for (int i = 0; i < network.size(); i++) {
      long shortened = before.duration(i) - plan.duration(i);
      if (shortened != 0) {
        Activity activity = network.activity(i);
        changes.add(new Change(i, shortened));
        extra.add(activity.crashExtra(), shortened, activity.mostShortening());
      }
    }
    for (Span span : network.spans()) {
      extra.add(span.rate(), plan.charged(span) - before.charged(span), 1);
    }
    return new Step(from, to, extra.total(), changes);
  }
}
