package dayworth.decision;

import dayworth.network.Plan;
import dayworth.value.Money;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;

/**
 * The cheapest plan for a wish, with its proof: the answer of {@code dayworth meet}.
 *
 * @param wish what was wanted
 * @param curve every finish; the plan asked for is the one that meets the wish
 * @param bought what is done another way than in the plan as it stands, in file order
 * @param packages the packages of measures that are paid for, by their index
 * @param chains critical chains that together pass what was bought, as far as room is for them; all
 *     critical chains if these are few
 * @param chainCount how many critical chains there are; exact
 * @param lastPrice what the last unit bought costs, per unit; empty if none is
 * @param proof the plan and a flow, arc by arc
 */
public record MeetAnswer(
    Wish wish,
    CurveAnswer curve,
    List<Bought> bought,
    List<Integer> packages,
    List<List<Integer>> chains,
    BigInteger chainCount,
    Optional<Money> lastPrice,
    PlanProof proof) {

  public MeetAnswer {
    bought = List.copyOf(bought);
    packages = List.copyOf(packages);
    chains = List.copyOf(chains);
  }

  public Case of() {
    return curve.of();
  }

  /** The finish that meets the wish. */
  public Finish finish() {
    return curve.asked().finish();
  }

  /**
   * Whether the plan as it stands meets the wish; of money, whether none buys an earlier finish.
   */
  public boolean isMetAsPlanned() {
    return wish.duration().orElse(finish().duration()) >= curve.asPlanned().duration();
  }

  /** Direct and running cost above that of the plan as it stands; below zero if money is saved. */
  public Money extra() {
    return finish().spent().minus(curve.asPlanned().spent());
  }

  /**
   * An activity that is shortened or done by a measure.
   *
   * @param activity index in the network
   * @param measure by which it is done, by its index, or {@link Plan#NO_MEASURE}
   * @param ticks how much is taken out of its normal duration
   * @param cost what all of it costs, without packages; below zero where it saves money
   * @param onChains which of the answer's chains pass it, by their index
   */
  public record Bought(int activity, int measure, long ticks, Money cost, List<Integer> onChains) {

    public Bought {
      onChains = List.copyOf(onChains);
    }

    /** The price of a tick; empty where none is taken out. */
    public Optional<Money> pricePerTick() {
      return ticks == 0 ? Optional.empty() : Optional.of(cost.dividedBy(ticks));
    }
  }
}
