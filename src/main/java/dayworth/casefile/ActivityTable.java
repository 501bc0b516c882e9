package dayworth.casefile;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Predicate;

/** Reads activities.csv. */
final class ActivityTable {

  static final String FILE = "activities.csv";

  private static final List<Column> COLUMNS =
      List.of(
          Column.needed("id"),
          Column.optional("name"),
          Column.optional("group"),
          Column.needed("normal_duration").withNumbers(),
          Column.needed("normal_cost").withNumbers(),
          Column.optional("crash_duration").withNumbers(),
          Column.optional("crash_cost").withNumbers(),
          Column.optional("divisible"),
          Column.optional("predecessors"),
          Column.optional("not_before").withNumbers());

  private final Predicate<String> mayBeBlank;
  private final Findings findings;
  private final Map<String, Integer> lineById = new HashMap<>();
  private final CrashRules crashRules;

  private ActivityTable(Table table, Predicate<String> mayBeBlank, Findings findings) {
    this.mayBeBlank = mayBeBlank;
    this.findings = findings;
    crashRules = CrashRules.ofActivities(table, findings);
  }

  /**
   * The rows; empty where they have no ids that links could name.
   *
   * @param mayBeBlank whether the normal duration and cost of an activity, by its id, may be blank
   */
  static Optional<List<ActivityRow>> read(
      String text, Predicate<String> mayBeBlank, Findings findings) {
    Optional<Table> table = Table.of(FILE, text, COLUMNS, findings);
    if (table.isEmpty()) {
      return Optional.empty();
    }
    List<ActivityRow> rows = new ActivityTable(table.get(), mayBeBlank, findings).rows(table.get());
    if (rows.isEmpty() && table.get().misfits().isEmpty()) {
      findings.problem(Place.whole(FILE).notice("no activity", "a header only", "a row for each"));
    }
    return table.get().has("id") ? Optional.of(rows) : Optional.empty();
  }

  private List<ActivityRow> rows(Table table) {
    List<ActivityRow> rows = new ArrayList<>();
    for (Row row : table.rows()) {
      String id = table.text(row, "id");
      checkId(table, row, id);
      rows.add(row(table, row, id));
    }
    crashRules.reportMissingColumn();
    for (Row misfit : table.misfits()) {
      rows.add(unread(misfit.line(), table.text(misfit, "id")));
    }
    return rows;
  }

  private static ActivityRow unread(int line, String id) {
    return new ActivityRow(
        line,
        id,
        "",
        "",
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        true,
        Optional.empty(),
        List.of());
  }

  private void checkId(Table table, Row row, String id) {
    if (!table.has("id")) {
      return;
    }
    Place place = table.place(row, "id");
    if (id.isEmpty()) {
      findings.problem(place.notice("blank", "", "each activity needs an id"));
    } else if (id.matches("(?s).*[;,\\v].*")) {
      findings.problem(
          place.notice("an id may not hold ; or , or a line break", id, "an id without them"));
    }
    Integer earlier = id.isEmpty() ? null : lineById.putIfAbsent(id, row.line());
    if (earlier != null) {
      findings.problem(
          place.notice(
              "a second activity of this id", id, "another id; line " + earlier + " has it"));
    }
  }

  private ActivityRow row(Table table, Row row, String id) {
    Cell<BigDecimal> normal = normal(table, row, id, "normal_duration", TimeCell.DURATION);
    Cell<BigDecimal> cost = normal(table, row, id, "normal_cost", MoneyCell.AMOUNT);
    Cell<BigDecimal> crash = table.cell(row, "crash_duration", TimeCell.DURATION, findings);
    Cell<BigDecimal> crashCost = table.cell(row, "crash_cost", MoneyCell.AMOUNT, findings);
    Cell<Boolean> divisible = table.cell(row, "divisible", WordCell.YES_OR_NO, findings);
    Cell<Moment> notBefore = table.cell(row, "not_before", Moment.Parser.MOMENT, findings);
    crashRules.check(row, normal, cost, crash, crashCost);
    return new ActivityRow(
        row.line(),
        id,
        table.text(row, "name"),
        table.text(row, "group"),
        normal.value(),
        cost.value(),
        crash.value(),
        crashCost.value(),
        divisible.value().orElse(true),
        notBefore.value(),
        ids(table.text(row, "predecessors")));
  }

  private Cell<BigDecimal> normal(
      Table table, Row row, String id, String column, CellParser<BigDecimal> parser) {
    return mayBeBlank.test(id)
        ? table.cell(row, column, parser, findings)
        : table.needed(row, column, parser, findings);
  }

  private static List<String> ids(String cell) {
    return Arrays.stream(cell.split("[;,]"))
        .map(String::strip)
        .filter(id -> !id.isEmpty())
        .toList();
  }
}
