package dayworth.report;

import java.util.ArrayList;
import java.util.List;

/** Columns for a terminal: as wide as their cells; where there is no room the last are dropped. */
final class TextColumns {

  private final int width;
  private final List<String> headers = new ArrayList<>();
  private final List<Boolean> toTheRight = new ArrayList<>();
  private final List<List<String>> cells = new ArrayList<>();

  TextColumns(int width) {
    this.width = width;
  }

  /** Adds a column; every column has as many cells. */
  void add(String header, boolean right, List<String> column) {
    headers.add(header);
    toTheRight.add(right);
    cells.add(column);
  }

  /** The header and a line for each row, without what is dropped. */
  List<String> lines() {
    int shown = shown();
    List<String> lines = new ArrayList<>();
    lines.add(line(headers, shown));
    for (int row = 0; row < cells.get(0).size(); row++) {
      int at = row;
      lines.add(line(cells.stream().map(column -> column.get(at)).toList(), shown));
    }
    return lines;
  }

  /** The names of the columns that have no room. */
  List<String> dropped() {
    return headers.subList(shown(), headers.size()).stream().map(String::strip).toList();
  }

  private String line(List<String> row, int shown) {
    StringBuilder line = new StringBuilder();
    for (int i = 0; i < shown; i++) {
      String pad = " ".repeat(Math.max(0, columnWidth(i) - row.get(i).length()));
      line.append(i == 0 ? "" : gap(i));
      line.append(toTheRight.get(i) ? pad + row.get(i) : row.get(i) + pad);
    }
    return line.toString().stripTrailing();
  }

  private String gap(int column) {
    return toTheRight.get(column) ? "  " : "   ";
  }

  private int shown() {
    int used = columnWidth(0);
    int shown = 1;
    while (shown < headers.size()) {
      used += gap(shown).length() + columnWidth(shown);
      if (used > width) {
        return shown;
      }
      shown++;
    }
    return shown;
  }

  private int columnWidth(int column) {
    return cells.get(column).stream()
        .mapToInt(String::length)
        .reduce(headers.get(column).length(), Math::max);
  }
}
