package dayworth.report.picture;

import java.awt.Font;
import java.awt.font.FontRenderContext;
import java.util.ArrayList;
import java.util.List;

/**
 * The sizes and weights of words in pictures, in the plain font of the Java runtime.
 *
 * <p>Words are measured on one and the same scale for both kinds of file, so that a label that has
 * room in one has it in the other.
 */
record Type(Font font) {

  static final Type TITLE = of(Font.BOLD, 17);
  static final Type NOTE = of(Font.PLAIN, 12);
  static final Type LABEL = of(Font.PLAIN, 12);
  static final Type NAME = of(Font.BOLD, 12);
  static final Type AXIS = of(Font.PLAIN, 11);
  static final Type AXIS_NAMED = of(Font.BOLD, 11);

  private static final FontRenderContext SCALE = new FontRenderContext(null, true, true);

  private static Type of(int weight, int size) {
    return new Type(new Font(Font.SANS_SERIF, weight, size));
  }

  int size() {
    return font.getSize();
  }

  /** From one baseline to the next. */
  double leading() {
    return Math.round(font.getSize() * 1.28);
  }

  double width(String text) {
    return text.isEmpty() ? 0 : font.getStringBounds(text, SCALE).getWidth();
  }

  /** The text broken between words into lines of at most {@code width}; a long word is cut. */
  List<String> wrap(String text, double width) {
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder();
    for (String word : text.split(" ", -1)) {
      if (line.length() > 0 && width(line + " " + word) > width) {
        lines.add(fit(line.toString(), width));
        line.setLength(0);
      }
      line.append(line.length() > 0 ? " " : "").append(word);
    }
    lines.add(fit(line.toString(), width));
    return lines;
  }

  /** The text, or as much of its beginning as fits with an ellipsis. */
  String fit(String text, double width) {
    if (width(text) <= width) {
      return text;
    }
    int end = text.length();
    while (end > 0 && width(text.substring(0, end).strip() + "…") > width) {
      end = text.offsetByCodePoints(end, -1);
    }
    return text.substring(0, end).strip() + "…";
  }
}
