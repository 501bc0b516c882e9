package dayworth.casefile;

import dayworth.contract.PartWeek;
import dayworth.contract.Per;
import dayworth.decision.Basis;
import dayworth.decision.TimeUnit;
import java.math.BigDecimal;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Reads terms.csv: a row a term. */
final class TermsTable {

  static final String FILE = "terms.csv";

  private static final List<Column> COLUMNS =
      List.of(Column.needed("term"), Column.needed("value"));

  private final Findings findings;
  private final Map<String, Place> places = new HashMap<>();
  private final Map<String, Object> values = new HashMap<>();

  /** Terms with a value, right or wrong, and those that a faulty row was probably meant to give. */
  private final Set<String> given = new HashSet<>();

  private TermsTable(Findings findings) {
    this.findings = findings;
  }

  static TermsTable read(Optional<String> text, Findings findings) {
    TermsTable terms = new TermsTable(findings);
    text.flatMap(csv -> Table.of(FILE, csv, COLUMNS, findings)).ifPresent(terms::addRows);
    terms.requireTogether();
    return terms;
  }

  /** Where a term stands that has a value. */
  Place at(String term) {
    return places.get(term);
  }

  /** Whether a term has a value, right or wrong. */
  boolean isGiven(String term) {
    return given.contains(term);
  }

  /** What a duration of one means. */
  TimeUnit unit() {
    return (TimeUnit) values.getOrDefault("time_unit", TimeUnit.DAY);
  }

  /** What a rate is per. */
  Optional<Per> per(String term) {
    return Optional.ofNullable((Per) values.get(term));
  }

  Optional<PartWeek> partWeek() {
    return Optional.ofNullable((PartWeek) values.get("damages_part_week"));
  }

  Optional<Basis> basis() {
    return Optional.ofNullable((Basis) values.get("basis"));
  }

  /** The last day on which an offer can be accepted. */
  Optional<LocalDate> validUntil() {
    return Optional.ofNullable((LocalDate) values.get("valid_until"));
  }

  Optional<Moment> moment(String term) {
    return Optional.ofNullable((Moment) values.get(term));
  }

  /** The first day of the project. */
  Optional<LocalDate> startDate() {
    return Optional.ofNullable((LocalDate) values.get("start_date"));
  }

  /** The day at whose end time begins to count. */
  Optional<LocalDate> dataDate() {
    return Optional.ofNullable((LocalDate) values.get("data_date"));
  }

  /** The days of the week that are worked; Monday to Friday if nothing else is said. */
  Set<DayOfWeek> workingDays() {
    WorkingDays days = (WorkingDays) values.getOrDefault("working_days", WorkingDays.USUAL);
    return days.days();
  }

  Optional<String> text(String term) {
    return Optional.ofNullable(values.get(term)).map(Object::toString);
  }

  Optional<BigDecimal> number(String term) {
    return Optional.ofNullable((BigDecimal) values.get(term));
  }

  BigDecimal amount(String term) {
    return number(term).orElse(BigDecimal.ZERO);
  }

  private void addRows(Table table) {
    if (!table.has("term")) {
      return;
    }
    table.misfits().forEach(row -> given.add(table.text(row, "term")));
    Nearest nearest = new Nearest(TermCells.names());
    NumberStyle style = style(table);
    for (Row row : table.rows()) {
      String term = table.text(row, "term");
      Place place = new Place(FILE, row.line(), term);
      if (term.isEmpty()) {
        findings.problem(
            new Place(FILE, row.line(), "term").notice("blank", "", "each row needs a term"));
      } else if (!TermCells.isServed(term)) {
        String right = nearest.hint(term, "one of " + String.join(", ", TermCells.names()));
        nearest.to(term).ifPresent(given::add);
        findings.problem(new Place(FILE, row.line(), "term").notice("no such term", term, right));
      } else if (places.putIfAbsent(term, place) != null) {
        findings.problem(
            place.notice(
                "a second row of this term", term, "line " + places.get(term).line() + " has it"));
      } else {
        addValue(term, table.text(row, "value"), style);
      }
    }
  }

  /** Only the values of terms that are numbers show the file's decimal mark. */
  private static NumberStyle style(Table table) {
    List<Row> numbers =
        table.rows().stream().filter(row -> TermCells.isNumber(table.text(row, "term"))).toList();
    return table.style().semicolons()
        ? NumberStyle.ofSemicolons(
            numbers, table.header().indexOf("value").stream().boxed().toList())
        : NumberStyle.PLAIN;
  }

  private void addValue(String term, String text, NumberStyle style) {
    if (text.isEmpty()) {
      return;
    }
    given.add(term);
    try {
      values.put(term, TermCells.parser(term).parse(text, style));
    } catch (CellFault fault) {
      findings.problem(places.get(term).notice(fault.wrong(), text, fault.right()));
    }
  }

  private void requireTogether() {
    require("data_date", "start_date");
    require("damages_rate", "contract_finish");
    require("bonus_rate", "contract_finish");
    require("extension", "contract_finish");
    require("damages_grace", "damages_rate");
    require("damages_cap", "damages_rate");
    require("bonus_cap", "bonus_rate");
    require("bonus_cap_units", "bonus_rate");
    boolean finer = unit() == TimeUnit.HOUR || unit() == TimeUnit.SHIFT;
    if (finer && !given.contains("units_per_working_day")) {
      findings.problem(
          places
              .get("time_unit")
              .notice("needs units_per_working_day", "", "how many of them make a working day"));
    }
    number("units_per_working_day")
        .filter(units -> units.signum() == 0)
        .ifPresent(
            units ->
                findings.problem(
                    places.get("units_per_working_day").notice("zero", "0", "more than 0")));
  }

  private void require(String term, String other) {
    if (values.containsKey(term) && !given.contains(other)) {
      findings.problem(
          places.get(term).notice("means nothing without " + other, term, "a row for " + other));
    }
  }
}
