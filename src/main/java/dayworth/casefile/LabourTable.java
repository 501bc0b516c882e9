package dayworth.casefile;

import dayworth.buildup.Labour;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Reads labour.csv: what activities take at the normal pattern. */
final class LabourTable {

  static final String FILE = "labour.csv";

  private static final String ACTIVITY = "activity";

  private static final List<Column> COLUMNS =
      List.of(
          Column.needed(ACTIVITY),
          Column.needed("labour_hours").withNumbers(),
          Column.needed("crew").withNumbers(),
          Column.needed("rate").withNumbers(),
          Column.optional("other_cost").withNumbers());

  private final boolean isThere;
  private final Optional<Table> table;
  private final Set<String> named = new HashSet<>();
  private final Findings findings;

  private LabourTable(boolean isThere, Optional<Table> table, Findings findings) {
    this.isThere = isThere;
    this.table = table;
    this.findings = findings;
    table.ifPresent(csv -> csv.rows().forEach(row -> named.add(csv.text(row, ACTIVITY))));
    table.ifPresent(csv -> csv.misfits().forEach(row -> named.add(csv.text(row, ACTIVITY))));
  }

  /** Takes the file apart; its rows are read once the activities are known. */
  static LabourTable of(Optional<String> text, Findings findings) {
    Optional<Table> table = text.flatMap(csv -> Table.of(FILE, csv, COLUMNS, findings));
    return new LabourTable(text.isPresent(), table, findings);
  }

  boolean isThere() {
    return isThere;
  }

  /**
   * Whether an activity's normal duration and cost may be left to its labour. Where it cannot be
   * told whose labour is given, that has been reported.
   */
  boolean mayGive(String id) {
    boolean isTold = table.filter(csv -> csv.has(ACTIVITY)).isPresent();
    return isThere && (!isTold || named.contains(id));
  }

  /** The rows that can be used; all faults are reported. */
  List<LabourRow> rows(ActivityIds ids) {
    Map<Integer, Integer> lineByActivity = new HashMap<>();
    List<LabourRow> rows = new ArrayList<>();
    table.ifPresent(
        csv -> csv.rows().forEach(row -> row(csv, row, ids, lineByActivity).ifPresent(rows::add)));
    return rows;
  }

  private Optional<LabourRow> row(
      Table csv, Row row, ActivityIds ids, Map<Integer, Integer> lineByActivity) {
    Optional<Integer> activity = ids.index(csv, row, ACTIVITY);
    Optional<Integer> earlier =
        activity.map(index -> lineByActivity.putIfAbsent(index, row.line()));
    if (earlier.isPresent()) {
      String right = "line " + earlier.get() + " has it";
      findings.problem(
          csv.place(row, ACTIVITY)
              .notice("a second row of this activity", csv.text(row, ACTIVITY), right));
    }
    Cell<BigDecimal> hours = csv.needed(row, "labour_hours", NumberCell.LABOUR_HOURS, findings);
    Cell<BigDecimal> crew = csv.needed(row, "crew", NumberCell.CREW, findings);
    Cell<BigDecimal> rate = csv.needed(row, "rate", MoneyCell.AMOUNT, findings);
    Cell<BigDecimal> other = csv.cell(row, "other_cost", MoneyCell.AMOUNT, findings);
    boolean whole =
        hours.value().isPresent() && crew.value().isPresent() && rate.value().isPresent();
    if (activity.isEmpty() || earlier.isPresent() || !whole) {
      return Optional.empty();
    }
    Labour labour =
        new Labour(
            Quantity.of(hours.value().get()),
            Quantity.of(crew.value().get()),
            Money.of(rate.value().get()),
            Money.of(other.value().orElse(BigDecimal.ZERO)));
    return Optional.of(new LabourRow(row.line(), activity.get(), labour));
  }
}
