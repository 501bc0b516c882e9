package dayworth.decision;

import dayworth.value.Money;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.Optional;

/**
 * The paper in which a plan is put before a client: who, on what basis, at what price. It changes
 * no plan and no cost.
 *
 * @param basis on which the work is accelerated
 * @param preparedFor whom the paper is for; may be empty
 * @param preparedBy who wrote it; may be empty
 * @param reference by which it is known; may be empty
 * @param validUntil the last day on which the offer can be accepted
 * @param onCostPercent what is added to the extra cost for overheads and profit, in per cent
 * @param proposalCost what writing the proposal costs
 * @param notes what people wrote beside it
 */
public record Submission(
    Optional<Basis> basis,
    String preparedFor,
    String preparedBy,
    String reference,
    Optional<LocalDate> validUntil,
    Optional<BigDecimal> onCostPercent,
    Optional<Money> proposalCost,
    Notes notes) {

  /** Nothing is known of it. */
  public static final Submission NONE =
      new Submission(
          Optional.empty(),
          "",
          "",
          "",
          Optional.empty(),
          Optional.empty(),
          Optional.empty(),
          Notes.NONE);
}
