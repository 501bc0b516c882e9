package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.decision.StepReason;
import dayworth.network.Activity;
import dayworth.network.Network;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Names for chains: the group that does most of a chain's work, work that several chains share
 * counting less; where that leaves two alike, or there are no groups, a number.
 */
final class ChainNames {

  private final Network network;
  private final Map<List<Integer>, String> names = new HashMap<>();

  ChainNames(BriefAnswer answer, List<StepReason> reasons) {
    this.network = answer.of().network();
    Set<List<Integer>> chains = new LinkedHashSet<>();
    reasons.forEach(reason -> chains.addAll(reason.chains()));
    chains.addAll(answer.chosen().chains());
    Map<Integer, Integer> passing = new HashMap<>();
    chains.forEach(chain -> chain.forEach(i -> passing.merge(i, 1, Integer::sum)));
    Map<String, Integer> used = new HashMap<>();
    for (List<Integer> chain : chains) {
      String group = group(chain, passing);
      int number = used.merge(group, 1, Integer::sum);
      names.put(
          chain, group.isEmpty() ? "chain " + number : number == 1 ? group : group + " " + number);
    }
  }

  private String group(List<Integer> chain, Map<Integer, Integer> passing) {
    Map<String, Double> work = new java.util.TreeMap<>();
    for (int i : chain) {
      Activity one = network.activity(i);
      String group = Words.safe(one.group());
      if (!group.isEmpty()) {
        work.merge(group, one.normal() / (double) passing.get(i), Double::sum);
      }
    }
    return work.entrySet().stream()
        .max(Map.Entry.comparingByValue())
        .map(Map.Entry::getKey)
        .orElse("");
  }

  String of(List<Integer> chain) {
    return names.get(chain);
  }

  /** {@code the Power chain}, {@code chain 2}. */
  String theChain(List<Integer> chain) {
    String name = of(chain);
    return name.startsWith("chain ") ? name : "the " + name + " chain";
  }

  /** Those of some chains that pass an activity. */
  List<String> passing(List<List<Integer>> chains, int activity) {
    List<String> on = new ArrayList<>();
    for (List<Integer> chain : chains) {
      if (chain.contains(activity)) {
        on.add(of(chain));
      }
    }
    return on;
  }
}
