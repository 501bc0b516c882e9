package dayworth.casefile;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * The records of a CSV text (RFC 4180), the header first; blank ones are left out.
 *
 * @param semicolons whether cells are separated by semicolons rather than commas
 * @param rows with their first lines
 */
record CsvText(boolean semicolons, List<Row> rows) {

  /** Takes the text apart; after a fault that hides where cells end, no row is trusted. */
  static CsvText parse(String file, String text, Findings findings) {
    String header = text.lines().filter(line -> !line.isBlank()).findFirst().orElse("");
    boolean semicolons = count(header, ';') > count(header, ',');
    if (!semicolons && header.indexOf('\t') >= 0 && header.indexOf(',') < 0) {
      findings.problem(
          new Place(file, 1, "")
              .notice("cells are separated by tabs", header, "separate them by commas"));
      return new CsvText(false, List.of());
    }
    return new CsvText(semicolons, records(file, text, semicolons ? ';' : ',', findings));
  }

  private static List<Row> records(String file, String text, char separator, Findings findings) {
    CSVFormat format =
        CSVFormat.RFC4180.builder().setDelimiter(separator).setIgnoreEmptyLines(false).get();
    List<Row> rows = new ArrayList<>();
    long line = 1;
    try (CSVParser parser = CSVParser.builder().setCharSequence(text).setFormat(format).get()) {
      Iterator<CSVRecord> records = parser.iterator();
      while (records.hasNext()) {
        Row row = row(Math.toIntExact(line), records.next());
        if (!row.isBlank()) {
          rows.add(row);
        }
        line = parser.getCurrentLineNumber() + 1;
      }
      return rows;
    } catch (UncheckedIOException | IOException e) {
      findings.problem(
          new Place(file, Math.toIntExact(line), "")
              .notice(
                  "a quoted cell does not end",
                  "",
                  "close it with a quote before the next cell; write a quote within as two"));
      return List.of();
    }
  }

  private static Row row(int line, CSVRecord values) {
    String[] cells = values.values();
    for (int i = 0; i < cells.length; i++) {
      cells[i] = cells[i].strip();
    }
    return new Row(line, List.of(cells));
  }

  private static long count(String text, char wanted) {
    return text.chars().filter(c -> c == wanted).count();
  }
}
