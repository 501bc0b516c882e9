package dayworth.report.brief.svg;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The label face of the page, Barlow Semi Condensed, in one weight: how wide words are. The widths
 * are those of the embedded files with tabular figures; a letter that they do not have counts as
 * wide as the widest.
 */
public enum Face {
  REGULAR(1),
  MEDIUM(2),
  SEMIBOLD(3);

  private static final String WIDTHS = "/dayworth/report/brief/label-widths.csv";
  private static final double PER_EM = 1000;
  private static final double UNKNOWN = 1000;

  private final int column;
  private final Map<Integer, Integer> widths = new HashMap<>();

  Face(int column) {
    this.column = column;
  }

  private void load() {
    try (InputStream file = Face.class.getResourceAsStream(WIDTHS);
        BufferedReader lines =
            new BufferedReader(new InputStreamReader(file, StandardCharsets.US_ASCII))) {
      lines
          .lines()
          .skip(1)
          .map(line -> line.split(",", -1))
          .forEach(
              cells -> widths.put(Integer.parseInt(cells[0], 16), Integer.parseInt(cells[column])));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Pixels at a size in pixels. */
  public double width(String text, double size) {
    synchronized (widths) {
      if (widths.isEmpty()) {
        load();
      }
      double sum = 0;
      for (int i = 0; i < text.length(); i = text.offsetByCodePoints(i, 1)) {
        Integer width = widths.get(text.codePointAt(i));
        sum += width == null ? UNKNOWN : width;
      }
      return sum * size / PER_EM;
    }
  }

  /** The text, or as much of its beginning as fits with an ellipsis. */
  public String fit(String text, double size, double room) {
    if (width(text, size) <= room) {
      return text;
    }
    int end = text.length();
    while (end > 0 && width(text.substring(0, end).strip() + "…", size) > room) {
      end = text.offsetByCodePoints(end, -1);
    }
    return end == 0 ? "" : text.substring(0, end).strip() + "…";
  }

  /**
   * The text on at most so many lines, broken between words; what has no room ends in an ellipsis.
   */
  public List<String> wrap(String text, double size, double room, int most) {
    List<String> lines = new ArrayList<>();
    String line = "";
    for (String word : text.split(" ", -1)) {
      String longer = line.isEmpty() ? word : line + " " + word;
      if (line.isEmpty() || width(longer, size) <= room || lines.size() == most - 1) {
        line = longer;
      } else {
        lines.add(fit(line, size, room));
        line = word;
      }
    }
    lines.add(fit(line, size, room));
    return lines;
  }
}
