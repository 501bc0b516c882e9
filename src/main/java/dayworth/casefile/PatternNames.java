package dayworth.casefile;

import java.util.List;
import java.util.Optional;

/** Finds patterns by the names that other files call them. */
final class PatternNames {

  private final List<String> names;

  /** Otherwise no name can be told right from wrong. */
  private final boolean areKnown;

  private final Nearest nearest;
  private final Findings findings;

  /**
   * The names of a case.
   *
   * @param rows empty where they could not be read
   */
  PatternNames(Optional<List<PatternRow>> rows, Findings findings) {
    areKnown = rows.isPresent();
    names = rows.orElse(List.of()).stream().map(PatternRow::name).toList();
    nearest = new Nearest(names);
    this.findings = findings;
  }

  /** The pattern that a cell names; empty if it names none, which is reported. */
  Optional<String> name(Table table, Row row) {
    Cell<String> cell = table.needed(row, "pattern", (text, style) -> text, findings);
    if (areKnown && cell.given() && !names.contains(cell.text())) {
      String right = nearest.hint(cell.text(), "a pattern of " + PatternTable.FILE);
      String wrong = cell.text() + " is no pattern";
      findings.problem(table.place(row, "pattern").notice(wrong, cell.text(), right));
      return Optional.empty();
    }
    return cell.value().filter(name -> areKnown);
  }

  boolean isNormal(String name) {
    return !names.isEmpty() && names.get(0).equals(name);
  }
}
