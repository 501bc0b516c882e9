package dayworth.decision;

import dayworth.engine.Step;
import java.util.List;

/**
 * A step of the curve and what becomes critical by it.
 *
 * @param changes what it does to each activity, in file order
 * @param criticalAfter how many activities are critical at the step's shorter end
 * @param newlyCritical the activities that are critical there and were not at its longer end, in
 *     file order
 */
public record StepFacts(
    Step step, List<PlanChange> changes, int criticalAfter, List<Integer> newlyCritical) {

  public StepFacts {
    changes = List.copyOf(changes);
    newlyCritical = List.copyOf(newlyCritical);
  }
}
