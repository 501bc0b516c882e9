package dayworth.casefile;

import dayworth.buildup.PayLadder;
import dayworth.buildup.PayLadder.Step;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;

/** Reads pay.csv: what an hour of a worker's week is paid. */
final class PayTable {

  static final String FILE = "pay.csv";

  private static final List<Column> COLUMNS =
      List.of(
          Column.needed("pattern"),
          Column.needed("above_hours").withNumbers(),
          Column.needed("multiplier").withNumbers());

  private final Table table;
  private final PatternNames names;
  private final Findings findings;

  /** Line by hours, by pattern. */
  private final Map<String, SortedMap<BigDecimal, Integer>> lines = new HashMap<>();

  private final Map<String, SortedMap<BigDecimal, BigDecimal>> multipliers = new HashMap<>();

  private PayTable(Table table, PatternNames names, Findings findings) {
    this.table = table;
    this.names = names;
    this.findings = findings;
  }

  /** The ladders by the names of their patterns; all faults are reported. */
  static Map<String, PayLadder> read(PatternNames names, Optional<String> text, Findings findings) {
    return text.flatMap(csv -> Table.of(FILE, csv, COLUMNS, findings))
        .map(table -> new PayTable(table, names, findings).ladders())
        .orElse(Map.of());
  }

  private Map<String, PayLadder> ladders() {
    table.rows().forEach(this::add);
    return multipliers.entrySet().stream()
        .collect(Collectors.toMap(Map.Entry::getKey, entry -> ladder(entry.getValue())));
  }

  private void add(Row row) {
    Optional<String> pattern = names.name(table, row);
    Cell<BigDecimal> above = table.needed(row, "above_hours", NumberCell.ABOVE_HOURS, findings);
    Cell<BigDecimal> multiplier = table.needed(row, "multiplier", NumberCell.FACTOR, findings);
    if (multiplier.value().filter(times -> times.compareTo(BigDecimal.ONE) < 0).isPresent()) {
      findings.warning(
          table
              .place(row, "multiplier")
              .notice("less than straight time", multiplier.text(), "1 or more is usual"));
    }
    if (pattern.isEmpty() || above.value().isEmpty()) {
      return;
    }
    Integer earlier =
        lines
            .computeIfAbsent(pattern.get(), key -> new TreeMap<>())
            .putIfAbsent(above.value().get(), row.line());
    if (earlier != null) {
      String right = "other hours; line " + earlier + " has them";
      findings.problem(
          table
              .place(row, "above_hours")
              .notice("a second row of these hours", above.text(), right));
    }
    multiplier
        .value()
        .ifPresent(
            times ->
                multipliers
                    .computeIfAbsent(pattern.get(), key -> new TreeMap<>())
                    .put(above.value().get(), times));
  }

  private static PayLadder ladder(SortedMap<BigDecimal, BigDecimal> steps) {
    return new PayLadder(
        steps.entrySet().stream()
            .map(step -> new Step(Quantity.of(step.getKey()), Quantity.of(step.getValue())))
            .sorted(Comparator.comparing(Step::aboveHours))
            .toList());
  }
}
