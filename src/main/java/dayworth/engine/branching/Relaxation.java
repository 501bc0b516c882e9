package dayworth.engine.branching;

import dayworth.engine.measures.HullNetwork;
import dayworth.engine.measures.Opening;
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
 * @param network with the envelopes as spans, and with all its measures
 * @param envelopes for each charge one for each of its moments
 * @param opening what may be used
 * @param convex the same network where each activity may take any duration at the cost of the lower
 *     hull of its ways; the network itself where every activity has its line alone
 */
public record Relaxation(
    Network network, List<List<Envelope>> envelopes, Opening opening, Network convex) {

  static Relaxation of(Network network, List<List<Envelope>> envelopes, Opening opening) {
    List<Span> spans = new ArrayList<>(network.spans());
    envelopes.forEach(ofCharge -> ofCharge.forEach(envelope -> spans.addAll(envelope.spans())));
    Network spanned = network.withSpans(spans);
    Network convex = opening.ways().isPlain() ? spanned : HullNetwork.of(spanned, opening);
    return new Relaxation(spanned, envelopes, opening, convex);
  }

  /** What a plan costs here: no more than in truth if it lies in the branch. */
  public Money cost(Plan plan) {
    return plan.cost(convex).plus(fixed());
  }

  /** What is added to the cost of the convex network. */
  public Money fixed() {
    return fixedByCharges().plus(opening.paid());
  }

  /** The part of it that belongs to charges. */
  Money fixedByCharges() {
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
