package dayworth.casefile;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Reads progress.csv: how far each activity is at the end of the data date. */
final class ProgressTable {

  static final String FILE = "progress.csv";
  static final String STARTED = "started";
  static final String FINISHED = "finished";
  static final String REMAINING = "remaining_duration";
  static final String CRASH_DURATION = "remaining_crash_duration";
  static final String CRASH_COST = "remaining_crash_cost";

  private static final List<Column> COLUMNS =
      List.of(
          Column.needed("activity"),
          Column.optional(STARTED),
          Column.optional(FINISHED),
          Column.optional(REMAINING).withNumbers(),
          Column.optional(CRASH_DURATION).withNumbers(),
          Column.optional(CRASH_COST).withNumbers());

  private final List<ActivityRow> activities;

  private final ActivityIds ids;
  private final Findings findings;
  private final Map<Integer, Integer> lineByActivity = new HashMap<>();

  private ProgressTable(Optional<List<ActivityRow>> known, Findings findings) {
    activities = known.orElse(List.of());
    ids = new ActivityIds(known, findings);
    this.findings = findings;
  }

  /**
   * The rows whose activity exists, each activity once; all faults are reported.
   *
   * @param known the activities; empty where their ids could not be read
   */
  static List<ProgressRow> read(
      Optional<List<ActivityRow>> known, Optional<String> text, Findings findings) {
    return text.flatMap(csv -> Table.of(FILE, csv, COLUMNS, findings))
        .map(table -> new ProgressTable(known, findings).rows(table))
        .orElse(List.of());
  }

  private List<ProgressRow> rows(Table table) {
    RemainingRules rules = new RemainingRules(table, activities, findings);
    List<ProgressRow> rows = new ArrayList<>();
    for (Row row : table.rows()) {
      Optional<Integer> activity =
          ids.index(table, row, "activity").filter(index -> isFirst(table, row, index));
      ProgressRow read = row(table, row, activity.orElse(-1));
      if (activity.isPresent()) {
        rules.check(row, read);
        rows.add(read);
      }
    }
    rules.reportMissingColumns();
    return rows;
  }

  private boolean isFirst(Table table, Row row, int activity) {
    Integer earlier = lineByActivity.putIfAbsent(activity, row.line());
    if (earlier != null) {
      String id = activities.get(activity).id();
      String right = "line " + earlier + " has it";
      findings.problem(
          table.place(row, "activity").notice("a second row of this activity", id, right));
    }
    return earlier == null;
  }

  private ProgressRow row(Table table, Row row, int activity) {
    return new ProgressRow(
        row.line(),
        activity,
        table.cell(row, STARTED, DateCell.DATE, findings),
        table.cell(row, FINISHED, DateCell.DATE, findings),
        table.cell(row, REMAINING, TimeCell.DURATION, findings),
        table.cell(row, CRASH_DURATION, TimeCell.DURATION, findings),
        table.cell(row, CRASH_COST, MoneyCell.AMOUNT, findings));
  }
}
