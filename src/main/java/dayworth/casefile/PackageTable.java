package dayworth.casefile;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;

/** Reads packages.csv: costs that are paid once if any measure in the package is used. */
final class PackageTable {

  static final String FILE = "packages.csv";

  private static final List<Column> COLUMNS =
      List.of(Column.needed("package"), Column.needed("cost").withNumbers());

  private final List<PackageRow> rows;

  /** The place in {@link #rows} of each name; -1 where its row has a fault. */
  private final Map<String, Integer> indexByName;

  private final Findings findings;

  private PackageTable(List<PackageRow> rows, Map<String, Integer> indexByName, Findings findings) {
    this.rows = rows;
    this.indexByName = indexByName;
    this.findings = findings;
  }

  /** The packages; all faults are reported. */
  static PackageTable read(Optional<String> text, Findings findings) {
    List<PackageRow> rows = new ArrayList<>();
    Map<String, Integer> indexByName = new LinkedHashMap<>();
    text.flatMap(csv -> Table.of(FILE, csv, COLUMNS, findings))
        .ifPresent(table -> take(table, rows, indexByName, findings));
    return new PackageTable(rows, indexByName, findings);
  }

  private static void take(
      Table table, List<PackageRow> rows, Map<String, Integer> indexByName, Findings findings) {
    Map<String, Integer> lineByName = new LinkedHashMap<>();
    for (Row row : table.rows()) {
      Cell<String> name = table.needed(row, "package", (text, style) -> text, findings);
      Cell<BigDecimal> cost = table.needed(row, "cost", MoneyCell.AMOUNT, findings);
      Integer earlier = name.given() ? lineByName.putIfAbsent(name.text(), row.line()) : null;
      if (earlier != null) {
        findings.problem(
            table
                .place(row, "package")
                .notice(
                    "a second package of this name", name.text(), "line " + earlier + " has it"));
      } else if (name.given()) {
        indexByName.put(name.text(), cost.value().isPresent() ? rows.size() : -1);
        cost.value().ifPresent(amount -> rows.add(new PackageRow(row.line(), name.text(), amount)));
      }
    }
  }

  List<PackageRow> rows() {
    return rows;
  }

  /**
   * The package that a cell of another table names; empty if none, or a fault, which is reported.
   */
  OptionalInt index(Place place, String name) {
    if (name.isEmpty()) {
      return OptionalInt.empty();
    }
    Integer index = indexByName.get(name);
    if (index == null) {
      String right =
          new Nearest(List.copyOf(indexByName.keySet())).hint(name, "a package of " + FILE);
      findings.problem(place.notice(name + " is no package", name, right));
      return OptionalInt.empty();
    }
    return index < 0 ? OptionalInt.empty() : OptionalInt.of(index);
  }

  /** Warns of packages that no measure is in. */
  void reportUnused(List<MeasureRow> measures) {
    for (int index = 0; index < rows.size(); index++) {
      int unused = index;
      if (measures.stream().noneMatch(row -> row.inPackage().equals(OptionalInt.of(unused)))) {
        findings.warning(
            rows.get(index)
                .place("package")
                .notice("no measure is in it", rows.get(index).name(), "it changes nothing"));
      }
    }
  }
}
