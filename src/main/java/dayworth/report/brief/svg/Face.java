package dayworth.report.brief.svg;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

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

  Face(int column) {
    this.column = column;
  }

  /** The widths of all faces, read when they are first needed. */
  private static final class Widths {

    private static final Map<Integer, String[]> ALL = read();

    private static Map<Integer, String[]> read() {
      try (InputStream file = Face.class.getResourceAsStream(WIDTHS);
          BufferedReader lines =
              new BufferedReader(new InputStreamReader(file, StandardCharsets.US_ASCII))) {
        return lines
            .lines()
            .skip(1)
            .map(line -> line.split(",", -1))
            .collect(
                Collectors.toUnmodifiableMap(
                    cells -> Integer.parseInt(cells[0], 16), cells -> cells));
      } catch (IOException e) {
        throw new UncheckedIOException(e);
      }
    }
  }

  /** Pixels at a size in pixels. */
  public double width(String text, double size) {
    double sum =
        text.codePoints()
            .mapToDouble(
                c ->
                    Widths.ALL.containsKey(c)
                        ? Double.parseDouble(Widths.ALL.get(c)[column])
                        : UNKNOWN)
            .sum();
    return sum * size / PER_EM;
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
