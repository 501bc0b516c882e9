package dayworth.decision;

import dayworth.network.Timing;
import java.math.BigInteger;
import java.util.List;

/**
 * A plan that is argued for, beside everything else that could be done: the answer of {@code
 * dayworth brief}.
 *
 * @param weigh the choices and how far they hold
 * @param chosen the plan that is argued for, with its proof
 * @param states the finishes that a reader is led through, longest first; the chosen one is among
 *     them
 * @param reasons why each step of the curve costs what it costs, longest first
 */
public record BriefAnswer(
    WeighAnswer weigh, MeetAnswer chosen, List<State> states, List<StepReason> reasons) {

  public BriefAnswer {
    states = List.copyOf(states);
    reasons = List.copyOf(reasons);
  }

  public Case of() {
    return weigh.of();
  }

  /** Every finish. */
  public CurveAnswer curve() {
    return weigh.granted().curve();
  }

  /** The finish that is argued for. */
  public Finish finish() {
    return chosen.finish();
  }

  /** Whether no finish costs less in all. */
  public boolean isLeastTotal() {
    return finish().total().compareTo(curve().leastTotal().total()) == 0;
  }

  /** Where the chosen finish stands among the states. */
  public int chosenState() {
    for (int i = 0; i < states.size(); i++) {
      if (states.get(i).finish().duration() == finish().duration()) {
        return i;
      }
    }
    throw new IllegalStateException("the chosen finish is one of the states");
  }

  /**
   * One finish with its cheapest plan.
   *
   * @param chainCount how many critical chains there are; exact
   * @param critical how many activities are critical
   */
  public record State(Finish finish, Timing timing, BigInteger chainCount, int critical) {}
}
