package dayworth.casefile;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;

/**
 * A row of activities.csv as far as it could be read; a value that is missing or faulty is empty.
 *
 * @param divisible whether any duration between the two can be taken
 * @param predecessors ids as they stand in the cell
 */
record ActivityRow(
    int line,
    String id,
    String name,
    String group,
    Optional<BigDecimal> normal,
    Optional<BigDecimal> normalCost,
    Optional<BigDecimal> crash,
    Optional<BigDecimal> crashCost,
    boolean divisible,
    Optional<Moment> notBefore,
    List<String> predecessors) {

  /** The same activity with another normal duration and cost. */
  ActivityRow withNormal(BigDecimal duration, BigDecimal cost) {
    return new ActivityRow(
        line,
        id,
        name,
        group,
        Optional.of(duration),
        Optional.of(cost),
        crash,
        crashCost,
        divisible,
        notBefore,
        predecessors);
  }
}
