package dayworth.report;

import dayworth.decision.Fault;
import java.util.List;

/**
 * What came of rechecking a result.
 *
 * @param faults in the order in which they were found; empty if it holds
 * @param checked what was recounted, for people
 * @param unchecked what could not be, for people
 */
public record Verification(List<Fault> faults, List<String> checked, List<String> unchecked) {

  public Verification {
    faults = List.copyOf(faults);
    checked = List.copyOf(checked);
    unchecked = List.copyOf(unchecked);
  }
}
