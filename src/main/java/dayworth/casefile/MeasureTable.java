package dayworth.casefile;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;

/** Reads measures.csv: named ways to do an activity, taken wholly or not at all. */
final class MeasureTable {

  static final String FILE = "measures.csv";

  private static final List<Column> COLUMNS =
      List.of(
          Column.needed("activity"),
          Column.needed("measure"),
          Column.needed("duration").withNumbers(),
          Column.needed("cost").withNumbers(),
          Column.optional("package"),
          Column.optional("note"),
          Column.optional("remaining"));

  private MeasureTable() {}

  /** The rows that can be used; all faults are reported. */
  static List<MeasureRow> read(
      ActivityIds ids, PackageTable packages, Optional<String> text, Findings findings) {
    return text.flatMap(csv -> Table.of(FILE, csv, COLUMNS, findings))
        .map(table -> rows(table, ids, packages, findings))
        .orElse(List.of());
  }

  private static List<MeasureRow> rows(
      Table table, ActivityIds ids, PackageTable packages, Findings findings) {
    List<MeasureRow> rows = new ArrayList<>();
    Map<List<Object>, Integer> lineByName = new HashMap<>();
    for (Row row : table.rows()) {
      Optional<Integer> activity = ids.index(table, row, "activity");
      Cell<String> name = table.needed(row, "measure", (text, style) -> text, findings);
      Cell<BigDecimal> duration = table.needed(row, "duration", TimeCell.DURATION, findings);
      Cell<BigDecimal> cost = table.needed(row, "cost", MoneyCell.AMOUNT, findings);
      OptionalInt inPackage =
          packages.index(table.place(row, "package"), table.text(row, "package"));
      Cell<Boolean> remaining = table.cell(row, "remaining", WordCell.YES_OR_NO, findings);
      if (activity.isPresent() && name.given()) {
        Integer earlier = lineByName.putIfAbsent(List.of(activity.get(), name.text()), row.line());
        if (earlier != null) {
          String right = "another name; line " + earlier + " has it";
          findings.problem(
              table
                  .place(row, "measure")
                  .notice("a second measure of this name for the activity", name.text(), right));
        }
      }
      if (activity.isPresent() && duration.value().isPresent() && cost.value().isPresent()) {
        rows.add(
            new MeasureRow(
                row.line(),
                activity.get(),
                name.text(),
                duration.value().get(),
                cost.value().get(),
                inPackage,
                remaining.value().orElse(false),
                table.text(row, "note")));
      }
    }
    return rows;
  }
}
