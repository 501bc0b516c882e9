package dayworth.decision;

import java.util.List;
import java.util.Optional;

/**
 * The choices side by side: the answer of {@code dayworth weigh}.
 *
 * @param granted under the contract finish as it is
 * @param claimed as if the claimed extension of time were granted; empty without one
 * @param byLoss the best finish by what all losses of output are multiplied by, without the
 *     extension; empty where the answer rests on none
 * @param byExtension the best finish for each extension, in working days; empty without a claim
 */
public record WeighAnswer(
    Weighing granted,
    Optional<Weighing> claimed,
    Optional<BestByLoss> byLoss,
    List<ByExtension> byExtension) {

  public WeighAnswer {
    byExtension = List.copyOf(byExtension);
  }

  public Case of() {
    return granted.curve().of();
  }

  /**
   * Extensions for which one finish is best.
   *
   * @param from the least of them, working days
   * @param to the most of them; empty where no longer one changes the choice
   */
  public record ByExtension(long from, Optional<Long> to, Finish best) {}
}
