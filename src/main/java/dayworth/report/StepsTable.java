package dayworth.report;

import dayworth.decision.CurveAnswer;
import dayworth.decision.PlanChange;
import dayworth.decision.StepFacts;
import dayworth.engine.Step;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.value.TimeScale;
import java.util.Locale;
import java.util.stream.Collectors;

/** The text of steps.csv: a row for each activity that a step changes, in file order. */
public final class StepsTable {

  private StepsTable() {}

  public static String of(CurveAnswer answer) {
    CsvText csv =
        new CsvText(
            "step",
            "from_duration",
            "to_duration",
            "price_per_unit",
            "activity",
            "change",
            "measure",
            "units",
            "slope",
            "critical_activities",
            "newly_critical");
    Network network = answer.of().network();
    for (int i = 0; i < answer.steps().size(); i++) {
      StepFacts facts = answer.steps().get(i);
      for (PlanChange change : facts.changes()) {
        row(csv, i + 1, facts, change, network);
      }
    }
    return csv.toString();
  }

  private static void row(
      CsvText csv, int number, StepFacts facts, PlanChange change, Network network) {
    TimeScale scale = network.scale();
    Step step = facts.step();
    Activity activity = network.activity(change.activity());
    csv.row(
        Integer.toString(number),
        scale.text(step.from()),
        scale.text(step.to()),
        CsvText.money(step.pricePerTick().times(scale.ticksPerUnit())),
        activity.id(),
        word(change),
        MeasureNames.of(network, change.measure()),
        scale.text(Math.abs(change.shortened())),
        change
            .pricePerTick()
            .map(price -> CsvText.money(price.times(scale.ticksPerUnit())))
            .orElse(CsvText.BLANK),
        Integer.toString(facts.criticalAfter()),
        facts.newlyCritical().stream()
            .map(index -> network.activity(index).id())
            .collect(Collectors.joining(";")));
  }

  static String word(PlanChange change) {
    return change.kind().name().toLowerCase(Locale.ROOT);
  }
}
