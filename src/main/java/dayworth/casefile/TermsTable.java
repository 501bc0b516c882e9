package dayworth.casefile;

import dayworth.contract.PartWeek;
import dayworth.contract.Per;
import dayworth.decision.TimeUnit;
import java.math.BigDecimal;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Reads terms.csv: each term with its own parser. */
final class TermsTable {

  static final String FILE = "terms.csv";

  private static final List<Column> COLUMNS =
      List.of(Column.needed("term"), Column.needed("value"));

  private static final WordCell<Per> PER =
      WordCell.<Per>of("word")
          .with("unit", Per.UNIT)
          .with("calendar_day", Per.CALENDAR_DAY)
          .with("week", Per.WEEK);

  private static final Map<String, CellParser<?>> PARSERS =
      Map.ofEntries(
          Map.entry("title", (text, style) -> text),
          Map.entry("currency", (text, style) -> text),
          Map.entry(
              "time_unit",
              WordCell.<TimeUnit>of("time unit")
                  .with("day", TimeUnit.DAY)
                  .with("week", TimeUnit.WEEK)
                  .with("hour", TimeUnit.HOUR)
                  .with("shift", TimeUnit.SHIFT)),
          Map.entry("units_per_working_day", TimeCell.DURATION),
          Map.entry("start_date", DateCell.DATE),
          Map.entry("working_days", (CellParser<WorkingDays>) WorkingDays::parse),
          Map.entry("time_related_cost", MoneyCell.AMOUNT),
          Map.entry("time_related_per", PER),
          Map.entry("fixed_cost", MoneyCell.AMOUNT),
          Map.entry("contract_finish", Moment.Parser.MOMENT),
          Map.entry("extension", Moment.Parser.MOMENT),
          Map.entry("damages_rate", MoneyCell.AMOUNT),
          Map.entry("damages_per", PER),
          Map.entry(
              "damages_part_week",
              WordCell.<PartWeek>of("word")
                  .with("pro_rata", PartWeek.PRO_RATA)
                  .with("whole", PartWeek.WHOLE)),
          Map.entry("damages_grace", TimeCell.DURATION),
          Map.entry("damages_cap", MoneyCell.ABOVE_ZERO),
          Map.entry("bonus_rate", MoneyCell.AMOUNT),
          Map.entry("bonus_per", PER),
          Map.entry("bonus_cap", MoneyCell.ABOVE_ZERO),
          Map.entry("bonus_cap_units", TimeCell.DURATION));

  private static final Set<String> NOT_YET =
      Set.of(
          "data_date",
          "basis",
          "prepared_for",
          "prepared_by",
          "reference",
          "valid_until",
          "on_cost_percent",
          "proposal_cost");

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

  Optional<Moment> moment(String term) {
    return Optional.ofNullable((Moment) values.get(term));
  }

  /** The first day of the project. */
  Optional<LocalDate> startDate() {
    return Optional.ofNullable((LocalDate) values.get("start_date"));
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
    Nearest nearest = new Nearest(known());
    NumberStyle style = style(table);
    for (Row row : table.rows()) {
      String term = table.text(row, "term");
      Place place = new Place(FILE, row.line(), term);
      if (term.isEmpty()) {
        findings.problem(
            new Place(FILE, row.line(), "term").notice("blank", "", "each row needs a term"));
      } else if (NOT_YET.contains(term)) {
        findings.problem(place.notice("this term is not served yet", term, "take the row out"));
      } else if (!PARSERS.containsKey(term)) {
        String right = nearest.hint(term, "one of " + String.join(", ", known()));
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
        table.rows().stream().filter(row -> isNumber(table.text(row, "term"))).toList();
    return table.style().semicolons()
        ? NumberStyle.ofSemicolons(
            numbers, table.header().indexOf("value").stream().boxed().toList())
        : NumberStyle.PLAIN;
  }

  private static boolean isNumber(String term) {
    CellParser<?> parser = PARSERS.get(term);
    return parser instanceof MoneyCell
        || parser instanceof TimeCell
        || parser instanceof Moment.Parser;
  }

  private void addValue(String term, String text, NumberStyle style) {
    if (text.isEmpty()) {
      return;
    }
    given.add(term);
    try {
      values.put(term, PARSERS.get(term).parse(text, style));
    } catch (CellFault fault) {
      findings.problem(places.get(term).notice(fault.wrong(), text, fault.right()));
    }
  }

  private static List<String> known() {
    List<String> known = new ArrayList<>(PARSERS.keySet());
    known.addAll(NOT_YET);
    known.sort(null);
    return known;
  }

  private void requireTogether() {
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
