package dayworth.report;

import dayworth.value.Money;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.regex.Pattern;
import org.apache.commons.csv.CSVFormat;

/** CSV text: commas, point decimals, line feeds, and no cell that a spreadsheet would run. */
final class CsvText {

  /** A cell that is not known or does not apply. */
  static final String BLANK = "";

  private static final CSVFormat FORMAT =
      CSVFormat.RFC4180.builder().setRecordSeparator('\n').get();
  private static final Pattern NUMBER = Pattern.compile("[+-]?[0-9]+(\\.[0-9]+)?");
  private static final String RUN_BY_A_SPREADSHEET = "=+-@\t\r\n";

  private final StringBuilder text = new StringBuilder();
  private final int columns;

  CsvText(String... header) {
    columns = header.length;
    row(header);
  }

  /** Adds a row; each cell is kept text where it would be run as a formula. */
  void row(String... cells) {
    if (cells.length != columns) {
      throw new IllegalArgumentException(
          "a row of " + cells.length + " cells under " + columns + " columns");
    }
    try {
      FORMAT.printRecord(text, List.of(cells).stream().map(CsvText::asText).toArray());
    } catch (IOException impossible) {
      throw new UncheckedIOException(impossible);
    }
  }

  private static String asText(String cell) {
    boolean run =
        !cell.isEmpty()
            && RUN_BY_A_SPREADSHEET.indexOf(cell.charAt(0)) >= 0
            && !NUMBER.matcher(cell).matches();
    return run ? "'" + cell : cell;
  }

  /** Money as a cell: rounded half up to 2 decimals. */
  static String money(Money amount) {
    return amount.cents().toPlainString();
  }

  static String yesNo(boolean yes) {
    return yes ? "yes" : "no";
  }

  @Override
  public String toString() {
    return text.toString();
  }
}
