package dayworth.decision;

import dayworth.contract.MomentMoney;
import dayworth.engine.Flow;
import dayworth.engine.branching.Branching;
import dayworth.engine.branching.ChargedMoney;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.proof.ProofSheet;
import dayworth.engine.proof.Verdict;
import dayworth.engine.stepping.Descent;
import dayworth.network.MeasurePackage;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Writes what proves the plan of one finish. */
final class PlanProving {

  /** Convex problems for the one finish. */
  private static final long PROBLEMS = 20_000;

  private PlanProving() {}

  /**
   * The proof.
   *
   * @param plan the cheapest that finishes within {@code finish}
   * @throws ProofFailed if it is not
   */
  static PlanProof of(Case of, Plan plan, long finish) {
    return of.isConvex()
        ? convex(of.pricedNetwork(), plan, finish, of.momentMoney().fixed())
        : branched(of, plan, finish);
  }

  private static PlanProof convex(Network network, Plan plan, long finish, Money alike) {
    Descent descent = new Descent(network);
    descent.within(finish, plan);
    if (new ProofChecker(network).check(plan, finish, descent.flow(), plan.cost(network))
        instanceof Verdict.Refuted refuted) {
      throw new ProofFailed(
          "the plan for " + network.scale().text(finish) + ", " + refuted.where(), refuted.why());
    }
    return convex(network, plan, finish, alike, descent.flow());
  }

  /** The proof by a flow that stood up to its check. */
  static PlanProof convex(Network network, Plan plan, long finish, Money alike, Flow flow) {
    ProofSheet sheet = ProofSheet.of(network, plan, finish, flow, alike);
    return new PlanProof(List.of(new PlanProof.Block("1", network, sheet)), flow.entries());
  }

  private static PlanProof branched(Case of, Plan plan, long finish) {
    Network priced = of.pricedNetwork();
    MomentMoney money = of.momentMoney();
    Branching.Proof proof =
        Branching.prove(priced, money.charges(), finish, PROBLEMS)
            .orElseThrow(
                () ->
                    new ProofFailed(
                        "the plan for " + priced.scale().text(finish),
                        "more than " + PROBLEMS + " branches are needed"));
    Money cost = ChargedMoney.cost(priced, money.charges(), plan);
    if (!cost.equals(proof.point().cost())) {
      throw new ProofFailed(
          "the plan for " + priced.scale().text(finish),
          "costs " + cost.cents() + ", and another " + proof.point().cost().cents());
    }
    List<PlanProof.Block> blocks = new ArrayList<>(paid(of, plan).blocks());
    for (Branching.Leaf leaf : proof.leaves()) {
      Money alike = leaf.fixed().plus(money.fixed());
      ProofSheet sheet = ProofSheet.ofBound(leaf.network(), finish, leaf.flow(), alike);
      blocks.add(new PlanProof.Block(String.valueOf(blocks.size()), leaf.network(), sheet));
    }
    return new PlanProof(blocks, List.of());
  }

  /** The first block alone where money is not convex: what the plan pays. */
  static PlanProof paid(Case of, Plan plan) {
    ProofSheet paid = ProofSheet.ofPlan(of.network(), plan, other(of, plan));
    return new PlanProof(List.of(new PlanProof.Block("plan", of.network(), paid)), List.of());
  }

  private static Map<String, Money> other(Case of, Plan plan) {
    MomentMoney money = of.momentMoney();
    Map<String, Money> other = new LinkedHashMap<>();
    for (int index : plan.packages(of.network())) {
      MeasurePackage paid = of.network().measures().packages().get(index);
      other.put(paid.name(), paid.cost());
    }
    money.running().forEach(cost -> other.put(cost.name(), money.of(cost, plan)));
    money
        .sections()
        .forEach(
            section ->
                other.put(
                    section.name(),
                    money.damagesOf(section, plan).minus(money.bonusOf(section, plan))));
    return other;
  }
}
