package dayworth.casefile;

import dayworth.contract.Per;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Reads running.csv: costs that run from the start of one activity to the finish of another. */
final class RunningTable {

  static final String FILE = "running.csv";

  private static final List<Column> COLUMNS =
      List.of(
          Column.needed("name"),
          Column.needed("from_activity"),
          Column.needed("to_activity"),
          Column.needed("rate").withNumbers(),
          Column.optional("per"));

  private RunningTable() {}

  /** The rows that can be used; all faults are reported. */
  static List<RunningRow> read(
      ActivityIds ids, TermsTable terms, Optional<String> text, Findings findings) {
    return text.flatMap(csv -> Table.of(FILE, csv, COLUMNS, findings))
        .map(table -> rows(table, ids, terms, findings))
        .orElse(List.of());
  }

  private static List<RunningRow> rows(
      Table table, ActivityIds ids, TermsTable terms, Findings findings) {
    List<RunningRow> rows = new ArrayList<>();
    Map<String, Integer> lineByName = new HashMap<>();
    for (Row row : table.rows()) {
      Cell<String> name = table.needed(row, "name", (text, style) -> text, findings);
      Integer earlier = name.given() ? lineByName.putIfAbsent(name.text(), row.line()) : null;
      if (earlier != null) {
        findings.problem(
            table
                .place(row, "name")
                .notice("a second cost of this name", name.text(), "line " + earlier + " has it"));
      }
      Optional<Integer> from = ids.index(table, row, "from_activity");
      Optional<Integer> to = ids.index(table, row, "to_activity");
      Cell<BigDecimal> rate = table.needed(row, "rate", MoneyCell.AMOUNT, findings);
      Cell<Per> cell = table.cell(row, "per", TermCells.PER, findings);
      Per per = PerRule.check(table.place(row, "per"), cell, terms, findings);
      if (rate.value().filter(amount -> amount.signum() == 0).isPresent()) {
        findings.warning(table.place(row, "rate").notice("changes nothing", "0", "more than 0"));
      } else if (from.isPresent() && to.isPresent() && rate.value().isPresent()) {
        rows.add(
            new RunningRow(row.line(), name.text(), from.get(), to.get(), rate.value().get(), per));
      }
    }
    return rows;
  }
}
