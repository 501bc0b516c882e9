package dayworth.report;

import dayworth.decision.MeetAnswer;
import dayworth.decision.PlanProof;
import dayworth.engine.proof.Arc;
import dayworth.engine.proof.ProofSheet;
import dayworth.network.Network;
import java.math.BigDecimal;
import java.util.Optional;

/** The text of proof.csv: a plan and the flow that proves it, arc by arc. */
public final class ProofTable {

  private final Network network;

  ProofTable(Network network) {
    this.network = network;
  }

  public static String of(MeetAnswer answer) {
    CsvText csv =
        new CsvText(
            "event_from",
            "event_to",
            "kind",
            "activity",
            "branch",
            "length",
            "flow",
            "capacity",
            "plan_cost",
            "bound");
    answer.proof().blocks().forEach(block -> addBlock(csv, block));
    return csv.toString();
  }

  private static void addBlock(CsvText csv, PlanProof.Block block) {
    ProofTable table = new ProofTable(block.network());
    for (ProofSheet.Row row : block.sheet().rows()) {
      csv.row(
          row.arc().map(arc -> table.event(arc.from())).orElse(CsvText.BLANK),
          row.arc().map(arc -> table.event(arc.to())).orElse(CsvText.BLANK),
          table.kind(row),
          table.owner(row),
          block.branch(),
          cell(row.length()),
          cell(row.flow()),
          cell(row.capacity()),
          cell(row.planCost()),
          cell(row.bound()));
    }
  }

  String event(Arc.Event event) {
    String end = event.isFinish() ? "finish" : "start";
    return event.activity() < 0
        ? "project " + end
        : end + " of " + network.activity(event.activity()).id();
  }

  String kind(ProofSheet.Row row) {
    return switch (row.kind()) {
      case FIXED -> "fixed";
      case OTHER -> "other";
      case ROUNDING -> "rounding";
      case ARC -> kind(row.arc().orElseThrow());
    };
  }

  private String kind(Arc arc) {
    return switch (arc.over()) {
      case SLOPE -> "slope";
      case CRASH -> "not shorter";
      case BACK_OVER_NORMAL -> "not longer";
      case BACK_OVER_CRASH -> "slope back";
      case FROM_PROJECT -> "begin";
      case FROM_PROJECT_TO_FINISH -> "not finished before";
      case TO_PROJECT -> "end";
      case LINK -> "link " + network.link(arc.index()).relation();
      case SPAN -> "running";
      case PROMISE -> "finish";
    };
  }

  /** The activity, or the name of the running cost, whose money a row is about. */
  String owner(ProofSheet.Row row) {
    if (row.activity() >= 0) {
      return network.activity(row.activity()).id();
    }
    if (!row.name().isEmpty()) {
      return row.name();
    }
    return row.arc()
        .filter(arc -> arc.over() == Arc.Over.SPAN)
        .map(arc -> network.spans().get(arc.index()).name())
        .orElse(CsvText.BLANK);
  }

  private static String cell(Optional<BigDecimal> number) {
    return number.map(BigDecimal::toPlainString).orElse(CsvText.BLANK);
  }
}
