package dayworth.decision;

import dayworth.value.Quantity;
import java.util.Optional;

/** Supplies one case under other losses of output. */
@FunctionalInterface
public interface LossScaling {

  /** For a case that is not read again, whose losses are what they are. */
  LossScaling NONE = factor -> Optional.empty();

  /**
   * The case with all its losses of output multiplied.
   *
   * @param factor 0 or more
   * @return empty if there is none: a week would yield nothing, or work would never end
   */
  Optional<Case> at(Quantity factor);
}
