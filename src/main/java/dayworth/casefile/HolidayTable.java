package dayworth.casefile;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;

/** Reads holidays.csv: days not worked. A day may stand there twice, and on a rest day. */
final class HolidayTable {

  static final String FILE = "holidays.csv";

  private static final List<Column> COLUMNS =
      List.of(Column.needed("date"), Column.optional("name"));

  private HolidayTable() {}

  static List<LocalDate> read(Optional<String> text, Findings findings) {
    return text.flatMap(csv -> Table.of(FILE, csv, COLUMNS, findings))
        .map(table -> dates(table, findings))
        .orElse(List.of());
  }

  private static List<LocalDate> dates(Table table, Findings findings) {
    return table.rows().stream()
        .map(row -> table.needed(row, "date", DateCell.DATE, findings))
        .flatMap(cell -> cell.value().stream())
        .toList();
  }
}
