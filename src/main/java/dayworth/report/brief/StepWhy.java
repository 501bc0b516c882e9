package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.decision.StepReason;
import dayworth.engine.Change;
import dayworth.network.Network;
import dayworth.value.Money;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * Why a step costs what it costs, in sentences for somebody who knows nothing of the method. Each
 * sentence is said only where it was found to be true.
 */
final class StepWhy {

  private static final int MOST_IDS = 6;

  private final Network network;
  private final Words words;
  private final ChainNames names;
  private final List<StepReason> reasons;
  private final boolean isProved;

  StepWhy(BriefAnswer answer, Words words, ChainNames names) {
    this.network = answer.of().network();
    this.words = words;
    this.names = names;
    this.reasons = answer.reasons();
    this.isProved = answer.curve().unproved().isEmpty();
  }

  String of(int k) {
    StepReason reason = reasons.get(k);
    List<String> said = new ArrayList<>();
    if (reason.step().changes().isEmpty() && reason.before().equals(reason.after())) {
      return "Nothing need be bought: the same plan is done in "
          + words.time(reason.step().to())
          + " already.";
    }
    exhausted(k).ifPresent(said::add);
    said.add(held(k, reason));
    if (reason.givenBack().isEmpty()) {
      set(reason).ifPresent(said::add);
    } else {
      givenBack(reason, said);
    }
    return String.join(" ", said);
  }

  /** What was shortened just before and cannot be shortened any more. */
  private Optional<String> exhausted(int k) {
    if (k == 0) {
      return Optional.empty();
    }
    List<Integer> now = reasons.get(k).shortened().stream().map(Change::activity).toList();
    List<Integer> back = reasons.get(k).givenBack().stream().map(Change::activity).toList();
    List<Integer> out =
        reasons.get(k - 1).shortened().stream()
            .map(Change::activity)
            .filter(i -> !now.contains(i) && !back.contains(i))
            .filter(i -> reasons.get(k).before().duration(i) == network.activity(i).crash())
            .toList();
    return out.isEmpty()
        ? Optional.empty()
        : Optional.of(
            ids(out) + (out.size() == 1 ? " is at its shortest." : " are at their shortest."));
  }

  /** Which chains hold the finish, and which of them did not before. */
  private String held(int k, StepReason reason) {
    boolean one = reason.chainCount().equals(BigInteger.ONE);
    List<List<Integer>> joined = joined(k);
    if (one) {
      return "One chain holds the finish." + cheapest(reason);
    }
    if (reason.chainCount().signum() == 0) {
      return "The plan so far is done earlier than " + words.time(reason.step().from()) + ".";
    }
    String all =
        Words.capital(FinishTelling.chainCount(reason.chainCount()))
            + " hold the finish, so "
            + (reason.chainCount().equals(BigInteger.TWO) ? "both" : "all")
            + " must shrink.";
    if (joined.isEmpty() || joined.size() > 2) {
      return all;
    }
    String who = Words.list(joined.stream().map(names::theChain).toList(), 2);
    return Words.capital(who)
        + (joined.size() == 1 ? " is" : " are")
        + " now as long: "
        + all.substring(0, 1).toLowerCase(java.util.Locale.ROOT)
        + all.substring(1);
  }

  /**
   * Only where that activity alone makes the price, and no other of the chain has a lower slope.
   */
  private String cheapest(StepReason reason) {
    if (reason.shortened().size() != 1 || !reason.givenBack().isEmpty()) {
      return "";
    }
    int activity = reason.shortened().get(0).activity();
    Money price = network.activity(activity).slope();
    boolean makesIt =
        price.equals(reason.step().pricePerTick())
            && network.measures().isNone()
            && reason.chains().get(0).stream()
                .filter(i -> reason.before().duration(i) > network.activity(i).crash())
                .allMatch(i -> network.activity(i).slope().compareTo(price) >= 0);
    return makesIt
        ? " Its cheapest " + words.unit() + " is in " + id(reason.shortened().get(0)) + "."
        : "";
  }

  /** Only where all chains are known one can say that some are new. */
  private List<List<Integer>> joined(int k) {
    if (k == 0 || !reasons.get(k).hasAllChains() || !reasons.get(k - 1).hasAllChains()) {
      return List.of();
    }
    Set<List<Integer>> before = new HashSet<>(reasons.get(k - 1).chains());
    return reasons.get(k).chains().stream().filter(chain -> !before.contains(chain)).toList();
  }

  private Optional<String> set(StepReason reason) {
    List<Integer> shortened = reason.shortened().stream().map(Change::activity).toList();
    if (reason.chainCount().equals(BigInteger.ONE) || shortened.isEmpty()) {
      return Optional.empty();
    }
    if (shortened.size() == 1) {
      boolean onAll =
          reason.hasAllChains()
              && reason.chains().stream().allMatch(chain -> chain.contains(shortened.get(0)));
      return onAll
          ? Optional.of(
              ids(shortened)
                  + " lies on "
                  + (reason.chains().size() == 2 ? "both." : "all of them."))
          : Optional.empty();
    }
    return Optional.of(
        ids(shortened)
            + (isProved
                ? " together do it, and nothing else does it for less."
                : " together do it.")
            + common(reason).map(text -> " " + text).orElse(""));
  }

  /** The cheapest activity on every chain, where it is dearer than what is shortened instead. */
  private Optional<String> common(StepReason reason) {
    if (!reason.hasAllChains()) {
      return Optional.empty();
    }
    Money price = reason.step().pricePerTick();
    return reason.chains().get(0).stream()
        .filter(i -> reason.chains().stream().allMatch(chain -> chain.contains(i)))
        .filter(i -> reason.before().duration(i) > network.activity(i).crash())
        .filter(i -> network.measures().of(i).length == 0)
        .min(Comparator.comparing(i -> network.activity(i).slope()))
        .filter(i -> network.activity(i).slope().compareTo(price) > 0)
        .map(
            i ->
                words.capitalUnit()
                    + " of "
                    + Words.id(network.activity(i))
                    + ", which lies on "
                    + (reason.chains().size() == 2 ? "both" : "all")
                    + ", would cost "
                    + words.money(network.activity(i).slope().times(words.ticksPerUnit()))
                    + ".");
  }

  /** A chain that passes several shortened activities would shrink too much. */
  private void givenBack(StepReason reason, List<String> said) {
    List<Integer> shortened = reason.shortened().stream().map(Change::activity).toList();
    said.add(ids(shortened) + (shortened.size() == 1 ? " is" : " are") + " shortened.");
    boolean even =
        reason.step().changes().stream()
            .allMatch(change -> Math.abs(change.shortened()) == reason.step().ticks());
    List<Integer> slack = new ArrayList<>();
    for (Change back : reason.givenBack()) {
      Optional<List<Integer>> chain =
          reason.chains().stream()
              .filter(one -> one.contains(back.activity()))
              .filter(one -> one.stream().filter(shortened::contains).count() >= 2)
              .findFirst();
      if (even && chain.isPresent()) {
        List<Integer> passed = chain.get().stream().filter(shortened::contains).toList();
        said.add(
            Words.capital(names.theChain(chain.get()))
                + " passes "
                + (passed.size() == 2 ? "both " : "")
                + ids(passed)
                + " and would shrink by "
                + Words.number(passed.size())
                + " "
                + words.units()
                + " for each one that is needed: so "
                + id(back)
                + " gets "
                + words.aUnit()
                + " back each time.");
      } else {
        slack.add(back.activity());
      }
    }
    if (!slack.isEmpty()) {
      said.add(
          ids(slack)
              + (slack.size() == 1
                  ? " need not be as short any more and gets time back."
                  : " need not be as short any more and get time back."));
    }
  }

  private String id(Change change) {
    return Words.id(network.activity(change.activity()));
  }

  private String ids(List<Integer> some) {
    return Words.list(
        some.stream().map(i -> network.activity(i)).map(Words::id).toList(), MOST_IDS);
  }
}
