package dayworth.casefile;

import dayworth.engine.Way;
import dayworth.engine.Ways;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.List;

/** Warns of measures that can never be worth taking, or that do not apply. */
final class MeasureDoubts {

  private MeasureDoubts() {}

  /**
   * Warns.
   *
   * @param planned its first measures are those of the rows, in their order
   */
  static void report(
      List<MeasureRow> rows, List<ProgressRow> progress, Network planned, Findings findings) {
    for (Ways.Dominated dominated : Ways.of(planned).dominated()) {
      if (dominated.measure() < rows.size()) {
        MeasureRow row = rows.get(dominated.measure());
        String right = named(dominated.by(), planned) + " is no longer and no dearer";
        findings.warning(
            row.place("measure").notice("is left out of the choice", row.measure(), right));
      }
    }
    for (MeasureRow row : rows) {
      progress.stream()
          .filter(status -> status.activity() == row.activity())
          .forEach(status -> reportStarted(row, status, findings));
    }
  }

  private static void reportStarted(MeasureRow row, ProgressRow status, Findings findings) {
    if (status.finished().given()) {
      findings.warning(
          row.place("activity")
              .notice("the activity is finished", row.measure(), "it changes nothing"));
    } else if (status.started().given() && !row.ofRemaining()) {
      String right = "yes, if duration and cost are of the work to go; else it changes nothing";
      findings.warning(
          row.place("remaining").notice("the activity has started", row.measure(), right));
    }
  }

  private static String named(Way way, Network network) {
    String what =
        way.measure() == Plan.NO_MEASURE
            ? "the activity without a measure"
            : network.measures().get(way.measure()).name();
    return what + ", " + network.scale().text(way.duration()) + " for " + text(way.cost()) + ",";
  }

  private static String text(Money cost) {
    return cost.cents().stripTrailingZeros().toPlainString();
  }
}
