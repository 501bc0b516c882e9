package dayworth.decision;

import dayworth.contract.FinishCost;
import dayworth.engine.Curve;
import dayworth.network.Timing;
import dayworth.value.Money;
import java.util.List;
import java.util.Optional;

/**
 * What the finish costs, for every finish: the answer of {@code dayworth curve}.
 *
 * @param of the case
 * @param curve the exact curve of direct cost
 * @param asPlanned every activity its normal way; may be longer or dearer than the first row
 * @param rows the finishes of curve.csv, longest first
 * @param least the rows with the least total, longest first; never empty
 * @param steps one for each piece of the curve
 * @param atContract the cheapest way to finish by the contract finish; empty where there is none or
 *     it cannot be met
 * @param crashEverything every activity at its shortest; its direct cost is rarely worth it
 * @param asked the plan asked for: the longest of the least total, or another
 * @param provedRows how many rows the checker proved to be cheapest
 * @param unproved the rest, each with what is known of it; empty where all money is convex
 * @param isCut whether the search for proofs was ended by the clock
 * @param crossCheck the linear programme's agreement
 * @param relaxed what direct cost would be at least if every measure could be taken in part, for
 *     every finish; empty where there are no choices
 * @param evidence what rechecks it
 */
public record CurveAnswer(
    Case of,
    Curve curve,
    Finish asPlanned,
    List<Finish> rows,
    List<Finish> least,
    List<StepFacts> steps,
    Optional<Finish> atContract,
    Finish crashEverything,
    AskedPlan asked,
    int provedRows,
    List<Unproved> unproved,
    boolean isCut,
    CrossCheck crossCheck,
    Optional<Curve> relaxed,
    Evidence evidence) {

  public CurveAnswer {
    rows = List.copyOf(rows);
    least = List.copyOf(least);
    steps = List.copyOf(steps);
    unproved = List.copyOf(unproved);
  }

  /**
   * The latest finish that is worth showing: later than the plan as it stands only if that costs
   * least in all. Waiting even longer may save hire, but nobody asks for it.
   */
  public long latestShown() {
    return Math.max(asPlanned.duration(), leastTotal().duration());
  }

  /** The same answer with the rows that are worth showing. */
  public CurveAnswer shown() {
    List<Finish> some = rows.stream().filter(row -> row.duration() <= latestShown()).toList();
    return new CurveAnswer(
        of,
        curve,
        asPlanned,
        some,
        least,
        steps,
        atContract,
        crashEverything,
        asked,
        provedRows,
        unproved,
        isCut,
        crossCheck,
        relaxed,
        evidence);
  }

  /** What a finish is worth: money that hangs on the project's finish alone, without sections. */
  public FinishCost whole(Finish finish) {
    return of.terms().at(finish.duration());
  }

  /** What a finish costs: direct and running cost and section money; its slope is the price. */
  public Money priced(Finish finish) {
    return finish.spent().plus(finish.other().sum()).minus(whole(finish).sum());
  }

  /** The longest of the finishes with the least total. */
  public Finish leastTotal() {
    return least.get(0);
  }

  public Finish shortest() {
    return rows.get(rows.size() - 1);
  }

  /**
   * A plan with its times.
   *
   * @param finish what it costs
   * @param timing its durations and times
   */
  public record AskedPlan(Finish finish, Timing timing) {}
}
