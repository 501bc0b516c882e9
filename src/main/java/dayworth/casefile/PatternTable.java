package dayworth.casefile;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Reads patterns.csv: the normal working pattern and those that may be bought. */
final class PatternTable {

  static final String FILE = "patterns.csv";

  private static final List<Column> COLUMNS =
      List.of(
          Column.needed("pattern"),
          Column.needed("hours_per_week").withNumbers(),
          Column.needed("days_per_week").withNumbers(),
          Column.optional("crew_factor").withNumbers(),
          Column.optional("crowding_loss").withNumbers(),
          Column.optional("once_cost").withNumbers(),
          Column.optional("week_cost").withNumbers(),
          Column.optional("weeks_max").withNumbers(),
          Column.optional("note"));

  private static final BigDecimal HOURS_OF_A_DAY = BigDecimal.valueOf(24);

  private final Table table;
  private final Findings findings;
  private final Map<String, Integer> lineByName = new HashMap<>();

  private PatternTable(Table table, Findings findings) {
    this.table = table;
    this.findings = findings;
  }

  /** The rows, the normal pattern first; empty where they have no names that others could name. */
  static Optional<List<PatternRow>> read(Optional<String> text, Findings findings) {
    Optional<Table> table = text.flatMap(csv -> Table.of(FILE, csv, COLUMNS, findings));
    return table
        .map(csv -> new PatternTable(csv, findings).rows())
        .filter(rows -> table.get().has("pattern") && table.get().misfits().isEmpty());
  }

  private List<PatternRow> rows() {
    List<PatternRow> rows = new ArrayList<>();
    table.rows().forEach(row -> rows.add(row(row)));
    if (rows.isEmpty() && table.misfits().isEmpty()) {
      String right = "a row for the normal pattern, then one for each that may be bought";
      findings.problem(Place.whole(FILE).notice("no pattern", "a header only", right));
    } else if (!rows.isEmpty()) {
      checkNormal(rows.get(0));
    }
    if (rows.size() == 1 && table.misfits().isEmpty()) {
      String right = "a row for each pattern that may be bought, below the normal one";
      findings.warning(Place.whole(FILE).notice("nothing can be bought", "one row", right));
    }
    return rows;
  }

  private PatternRow row(Row row) {
    Cell<String> name = table.needed(row, "pattern", (text, style) -> text, findings);
    name.value().ifPresent(given -> checkName(row, given));
    PatternRow read =
        new PatternRow(
            row.line(),
            name.text(),
            table.needed(row, "hours_per_week", NumberCell.HOURS_PER_WEEK, findings),
            table.needed(row, "days_per_week", NumberCell.DAYS_PER_WEEK, findings),
            table.cell(row, "crew_factor", NumberCell.FACTOR, findings),
            table.cell(row, "crowding_loss", NumberCell.SHARE, findings),
            table.cell(row, "once_cost", MoneyCell.AMOUNT, findings),
            table.cell(row, "week_cost", MoneyCell.AMOUNT, findings),
            table.cell(row, "weeks_max", WeekCell.WEEKS, findings),
            table.text(row, "note"));
    checkDay(read);
    return read;
  }

  private void checkName(Row row, String name) {
    Integer earlier = lineByName.putIfAbsent(name, row.line());
    if (earlier != null) {
      String right = "another name; line " + earlier + " has it";
      findings.problem(
          table.place(row, "pattern").notice("a second pattern of this name", name, right));
    }
  }

  private void checkDay(PatternRow row) {
    Optional<BigDecimal> most = row.daysPerWeek().value().map(HOURS_OF_A_DAY::multiply);
    Optional<BigDecimal> hours = row.hoursPerWeek().value();
    if (most.isPresent() && hours.filter(all -> all.compareTo(most.get()) > 0).isPresent()) {
      String right =
          "at most " + most.get().stripTrailingZeros().toPlainString() + " on those days";
      findings.problem(
          row.place("hours_per_week")
              .notice("a day would have more than 24 hours", row.hoursPerWeek().text(), right));
    }
  }

  /** What labour.csv says is said of the normal pattern, so that nothing is left to change it. */
  private void checkNormal(PatternRow row) {
    requireOfNormal(row, "crew_factor", row.crewFactor(), BigDecimal.ONE, "crew in labour.csv");
    String hours = "labour_hours in labour.csv";
    requireOfNormal(row, "crowding_loss", row.crowdingLoss(), BigDecimal.ZERO, hours);
    String cost = "other_cost in labour.csv";
    requireOfNormal(row, "once_cost", row.onceCost(), BigDecimal.ZERO, cost);
    if (row.weeksMax().given()) {
      String right = "blank: it lasts as long as the work";
      findings.problem(
          row.place("weeks_max")
              .notice("the first row is the normal pattern", row.weeksMax().text(), right));
    }
  }

  private void requireOfNormal(
      PatternRow row, String column, Cell<BigDecimal> cell, BigDecimal wanted, String holds) {
    if (cell.value().filter(value -> value.compareTo(wanted) != 0).isPresent()) {
      String right = wanted + " or blank; " + holds + " holds it";
      findings.problem(
          row.place(column).notice("the first row is the normal pattern", cell.text(), right));
    }
  }
}
