package dayworth.report.brief.page;

/** Text for HTML, SVG and Markdown, in which nothing is obeyed. */
public final class Escape {

  private Escape() {}

  /** For HTML and SVG, in text and in quoted attributes. */
  public static String html(String text) {
    StringBuilder escaped = new StringBuilder(text.length() + 16);
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      switch (c) {
        case '&' -> escaped.append("&amp;");
        case '<' -> escaped.append("&lt;");
        case '>' -> escaped.append("&gt;");
        case '"' -> escaped.append("&quot;");
        case '\'' -> escaped.append("&#39;");
        default -> escaped.append(c);
      }
    }
    return escaped.toString();
  }

  /** For Markdown, also within the cells of a table. */
  static String markdown(String text) {
    StringBuilder escaped = new StringBuilder(text.length() + 16);
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if ("\\`*_[]<>|#".indexOf(c) >= 0) {
        escaped.append('\\');
      }
      escaped.append(c);
    }
    String line = escaped.toString();
    return line.matches("(?s)([-+~=]|\\d+[.)]).*") ? "\\" + line : line;
  }
}
