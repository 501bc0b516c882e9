package dayworth.casefile;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A CSV file with its columns found.
 *
 * @param rows those with as many cells as the header
 * @param misfits the other rows, which have been reported; no cell of theirs can be trusted
 */
record Table(String file, Header header, NumberStyle style, List<Row> rows, List<Row> misfits) {

  /** Takes a file's text apart; empty where there is no header to go by. */
  static Optional<Table> of(String file, String text, List<Column> known, Findings findings) {
    if (text.isBlank()) {
      findings.problem(Place.whole(file).notice("empty", "", "a header row and rows below it"));
      return Optional.empty();
    }
    CsvText csv = CsvText.parse(file, text, findings);
    if (csv.rows().isEmpty()) {
      return Optional.empty();
    }
    Header header = Header.of(file, csv.rows().get(0), known, findings);
    List<Row> rows = new ArrayList<>();
    List<Row> misfits = new ArrayList<>();
    for (Row row : csv.rows().subList(1, csv.rows().size())) {
      (row.cells().size() == header.width() ? rows : misfits).add(row);
    }
    misfits.forEach(row -> reportMisfit(file, row, header.width(), findings));
    return Optional.of(new Table(file, header, style(csv, header, known, rows), rows, misfits));
  }

  private static void reportMisfit(String file, Row row, int width, Findings findings) {
    int cells = row.cells().size();
    findings.problem(
        new Place(file, row.line(), "")
            .notice(
                cells > width ? "too many cells" : "too few cells",
                cells + (cells == 1 ? " cell" : " cells"),
                width + ", as in the header"));
  }

  private static NumberStyle style(CsvText csv, Header header, List<Column> known, List<Row> rows) {
    List<Integer> numbers = new ArrayList<>();
    known.stream()
        .filter(Column::number)
        .forEach(column -> header.indexOf(column.name()).ifPresent(numbers::add));
    return csv.semicolons() ? NumberStyle.ofSemicolons(rows, numbers) : NumberStyle.PLAIN;
  }

  boolean has(String column) {
    return header.has(column);
  }

  /** The text in a row; empty where there is no such column or the row is too short. */
  String text(Row row, String column) {
    return header.indexOf(column).stream().boxed().findFirst().flatMap(row::text).orElse("");
  }

  Place place(Row row, String column) {
    return new Place(file, row.line(), column);
  }

  /** Reads a cell; a fault is reported. */
  <T> Cell<T> cell(Row row, String column, CellParser<T> parser, Findings findings) {
    String text = text(row, column);
    if (text.isEmpty()) {
      return new Cell<>("", Optional.empty());
    }
    try {
      return new Cell<>(text, Optional.of(parser.parse(text, style)));
    } catch (CellFault fault) {
      findings.problem(place(row, column).notice(fault.wrong(), text, fault.right()));
      return new Cell<>(text, Optional.empty());
    }
  }

  /** Reads a cell that must be given where its column is. */
  <T> Cell<T> needed(Row row, String column, CellParser<T> parser, Findings findings) {
    Cell<T> cell = cell(row, column, parser, findings);
    if (has(column) && !cell.given()) {
      findings.problem(place(row, column).notice("blank", "", "this cell is needed"));
    }
    return cell;
  }
}
