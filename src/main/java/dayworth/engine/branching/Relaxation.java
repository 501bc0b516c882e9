package dayworth.engine.branching;

import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.value.Money;
import dayworth.value.MoneySum;
import java.util.ArrayList;
import java.util.List;

/**
 * A branch's convex problem: each charge is replaced by its envelopes, which cost no more.
 *
 * @param network with the envelopes as spans
 * @param envelopes for each charge one for each of its moments
 */
public record Relaxation(Network network, List<List<Envelope>> envelopes) {

  static Relaxation of(Network network, List<List<Envelope>> envelopes) {
    List<Span> spans = new ArrayList<>(network.spans());
    envelopes.forEach(ofCharge -> ofCharge.forEach(envelope -> spans.addAll(envelope.spans())));
    return new Relaxation(network.withSpans(spans), envelopes);
  }

  /** What a plan costs here: no more than in truth if it lies in the branch. */
  public Money cost(Plan plan) {
    return plan.cost(network).plus(fixed());
  }

  /** What is added to the cost of the network. */
  public Money fixed() {
    MoneySum sum = new MoneySum();
    envelopes.forEach(ofCharge -> ofCharge.forEach(envelope -> sum.add(envelope.fixed())));
    return sum.total();
  }

  /** What a charge costs here. */
  Money chargeAt(int charge, Plan plan) {
    MoneySum sum = new MoneySum();
    for (Envelope envelope : envelopes.get(charge)) {
      sum.add(envelope.at(plan));
    }
    return sum.total();
  }
}
