package dayworth.casefile;

import dayworth.contract.Per;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Reads sections.csv: parts of the work with a due time and money of their own. */
final class SectionTable {

  static final String FILE = "sections.csv";

  private static final List<Column> COLUMNS =
      List.of(
          Column.needed("section"),
          Column.needed("activity"),
          Column.needed("due").withNumbers(),
          Column.optional("damages_rate").withNumbers(),
          Column.optional("damages_per"),
          Column.optional("damages_grace").withNumbers(),
          Column.optional("damages_cap").withNumbers(),
          Column.optional("bonus_rate").withNumbers(),
          Column.optional("bonus_per"),
          Column.optional("bonus_cap").withNumbers(),
          Column.optional("bonus_cap_units").withNumbers());

  private final Table table;
  private final ActivityIds ids;
  private final TermsTable terms;
  private final Findings findings;
  private final Map<String, Integer> lineByName = new HashMap<>();

  private SectionTable(Table table, ActivityIds ids, TermsTable terms, Findings findings) {
    this.table = table;
    this.ids = ids;
    this.terms = terms;
    this.findings = findings;
  }

  /** The rows that can be used; all faults are reported. */
  static List<SectionRow> read(
      ActivityIds ids, TermsTable terms, Optional<String> text, Findings findings) {
    return text.flatMap(csv -> Table.of(FILE, csv, COLUMNS, findings))
        .map(table -> new SectionTable(table, ids, terms, findings).rows())
        .orElse(List.of());
  }

  private List<SectionRow> rows() {
    List<SectionRow> rows = new ArrayList<>();
    for (Row row : table.rows()) {
      Cell<String> name = table.needed(row, "section", (text, style) -> text, findings);
      name.value().ifPresent(section -> checkName(row, section));
      Optional<Integer> activity = ids.index(table, row, "activity");
      Cell<Moment> due = table.needed(row, "due", Moment.Parser.MOMENT, findings);
      due.value().ifPresent(moment -> checkDue(row, moment));
      SectionRow read =
          new SectionRow(
              row.line(),
              name.text(),
              activity.orElse(-1),
              due.value().orElse(new Moment(Optional.of(BigDecimal.ZERO), Optional.empty())),
              table.cell(row, "damages_rate", MoneyCell.AMOUNT, findings),
              per(row, "damages_per"),
              table.cell(row, "damages_grace", TimeCell.DURATION, findings),
              table.cell(row, "damages_cap", MoneyCell.ABOVE_ZERO, findings),
              table.cell(row, "bonus_rate", MoneyCell.AMOUNT, findings),
              per(row, "bonus_per"),
              table.cell(row, "bonus_cap", MoneyCell.ABOVE_ZERO, findings),
              table.cell(row, "bonus_cap_units", TimeCell.DURATION, findings));
      checkTogether(read);
      if (activity.isPresent() && due.value().isPresent()) {
        rows.add(read);
      }
    }
    return rows;
  }

  private void checkName(Row row, String name) {
    Integer earlier = lineByName.putIfAbsent(name, row.line());
    if (earlier != null) {
      findings.problem(
          table
              .place(row, "section")
              .notice("a second section of this name", name, "line " + earlier + " has it"));
    }
  }

  private void checkDue(Row row, Moment due) {
    Optional<LocalDate> date = due.date();
    Place place = table.place(row, "due");
    if (date.isPresent() && !terms.isGiven("start_date")) {
      String right = "a row for start_date in " + TermsTable.FILE + ", or a number of time units";
      findings.problem(place.notice("a date needs a start_date", date.get().toString(), right));
    } else if (date.isPresent()
        && terms.startDate().filter(start -> date.get().isBefore(start)).isPresent()) {
      String right = "on " + terms.startDate().orElseThrow() + ", the start_date, or later";
      findings.problem(place.notice("before the start_date", date.get().toString(), right));
    }
  }

  private Per per(Row row, String column) {
    Cell<Per> per = table.cell(row, column, TermCells.PER, findings);
    return PerRule.check(table.place(row, column), per, terms, findings);
  }

  private void checkTogether(SectionRow row) {
    require(row, row.damagesGrace(), "damages_grace", row.damagesRate(), "damages_rate");
    require(row, row.damagesCap(), "damages_cap", row.damagesRate(), "damages_rate");
    require(row, row.bonusCap(), "bonus_cap", row.bonusRate(), "bonus_rate");
    require(row, row.bonusCapUnits(), "bonus_cap_units", row.bonusRate(), "bonus_rate");
    if (isNothing(row.damagesRate()) && isNothing(row.bonusRate())) {
      findings.warning(
          row.place("damages_rate")
              .notice("changes nothing", "", "a damages_rate or a bonus_rate above 0"));
    }
  }

  private static boolean isNothing(Cell<BigDecimal> rate) {
    return !rate.given() || rate.value().filter(amount -> amount.signum() == 0).isPresent();
  }

  private void require(
      SectionRow row, Cell<?> cell, String column, Cell<?> other, String otherColumn) {
    if (cell.given() && !other.given()) {
      findings.problem(
          row.place(column)
              .notice("means nothing without " + otherColumn, cell.text(), "a " + otherColumn));
    }
  }
}
