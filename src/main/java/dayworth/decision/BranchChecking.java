package dayworth.decision;

import dayworth.engine.branching.Branch;
import dayworth.engine.branching.Charge;
import dayworth.engine.branching.ChargedMoney;
import dayworth.engine.branching.Point;
import dayworth.engine.branching.Relaxation;
import dayworth.engine.linear.Answer;
import dayworth.engine.linear.LinearProgramme;
import dayworth.engine.stepping.Descent;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Compares the convex problems of the branches in which the answers were found with the linear
 * programme, each at the finishes that were found in it.
 */
final class BranchChecking {

  private BranchChecking() {}

  /**
   * The comparison; what is compared is the cost of the convex problem.
   *
   * @param most how many points at most
   * @throws ProofFailed if the two differ by more than rounding
   */
  static CrossCheck of(
      Network network, List<Charge> charges, List<Point> points, long most, Watcher watcher) {
    List<Point> sample = most == 0 ? List.of() : CrossChecking.spread(points, most);
    Map<Branch, List<Point>> byBranch = new LinkedHashMap<>();
    for (Point point : sample) {
      byBranch.computeIfAbsent(point.branch(), b -> new ArrayList<>()).add(point);
    }
    Money fence = ChargedMoney.fence(network, charges, points.get(0).duration());
    List<CrossCheck.Comparison> comparisons = new ArrayList<>();
    List<CrossCheck.Unanswered> unanswered = new ArrayList<>();
    byBranch.forEach(
        (branch, found) -> {
          Relaxation relaxation = branch.relaxation(network, charges, fence);
          Descent descent = new Descent(relaxation.convex());
          LinearProgramme programme = new LinearProgramme(relaxation.convex());
          Plan before = Plan.allNormal(relaxation.convex());
          for (Point point : found) {
            watcher.now(
                "comparing with the linear programme, now at "
                    + network.scale().text(point.duration()));
            before = descent.within(point.duration(), before).orElseThrow();
            Money stepping = before.cost(relaxation.convex());
            Answer answer = programme.at(point.duration());
            if (answer instanceof Answer.NotSolved silent) {
              unanswered.add(new CrossCheck.Unanswered(point.duration(), silent.reason()));
            } else {
              comparisons.add(CrossChecking.compare(network, stepping, answer, point.duration()));
            }
          }
        });
    comparisons.sort((one, other) -> Long.compare(other.duration(), one.duration()));
    return new CrossCheck(comparisons, comparisons.size(), points.size(), unanswered);
  }
}
