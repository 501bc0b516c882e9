package dayworth.casefile;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.Set;
import java.util.TreeSet;

/** Which column stands where in a file. */
final class Header {

  private final String file;
  private final int line;
  private final int width;
  private final Map<String, Integer> indexByName = new HashMap<>();
  private final Set<String> probablyMeant = new TreeSet<>();

  private Header(String file, Row row) {
    this.file = file;
    this.line = row.line();
    this.width = row.cells().size();
  }

  /** Reads the header row; faults are reported, and what is known can be used. */
  static Header of(String file, Row row, List<Column> known, Findings findings) {
    Header header = new Header(file, row);
    List<String> names = known.stream().map(Column::name).toList();
    Nearest nearest = new Nearest(names);
    for (int i = 0; i < header.width; i++) {
      String name = row.cells().get(i);
      if (name.isEmpty()) {
        String right = "a name, or no cell " + (i + 1) + " in every row";
        findings.problem(header.place("").notice("a column without a name", "", right));
      } else if (!names.contains(name)) {
        nearest.to(name).ifPresent(header.probablyMeant::add);
        String right = nearest.hint(name, "one of " + String.join(", ", names));
        findings.problem(header.place(name).notice("no such column", name, right));
      } else if (header.indexByName.putIfAbsent(name, i) != null) {
        findings.problem(
            header.place(name).notice("a second column of this name", name, "take one out"));
      }
    }
    header.reportMissing(known, findings);
    return header;
  }

  /** A needed column whose misspelt name was reported is not reported as missing too. */
  private void reportMissing(List<Column> known, Findings findings) {
    List<Column> missing = new ArrayList<>(known);
    missing.removeIf(column -> !column.needed() || isThereOrMisspelt(column.name()));
    for (Column column : missing) {
      findings.problem(place(column.name()).notice("missing column", "", "the file needs it"));
    }
  }

  boolean has(String column) {
    return indexByName.containsKey(column);
  }

  /** Whether the column is there, or one whose name was reported as a misspelling of it. */
  boolean isThereOrMisspelt(String column) {
    return has(column) || probablyMeant.contains(column);
  }

  OptionalInt indexOf(String column) {
    Integer index = indexByName.get(column);
    return index == null ? OptionalInt.empty() : OptionalInt.of(index);
  }

  int width() {
    return width;
  }

  Place place(String column) {
    return new Place(file, line, column);
  }
}
