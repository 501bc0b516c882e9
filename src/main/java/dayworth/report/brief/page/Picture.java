package dayworth.report.brief.page;

import java.util.List;

/**
 * A picture as SVG with real text, drawn for a broad page and, where it can be, for a narrow one.
 *
 * @param name such as Figure 1
 * @param caption what it shows
 * @param description its figures in words
 * @param drawings what is shown; the first alone where a page has no style
 */
public record Picture(String name, String caption, String description, List<Drawn> drawings) {

  public Picture {
    drawings = List.copyOf(drawings);
  }

  /** A drawing and where it is used. */
  public record Drawn(Use use, String svg) {}

  /** Where a drawing is used. */
  public enum Use {
    ALWAYS("net"),
    BROAD("wide"),
    NARROW("narrow"),
    /** On paper alone; the words are those of another. */
    PAPER("paper");

    private final String style;

    Use(String style) {
      this.style = style;
    }

    /** The name of its class in the page's style. */
    public String style() {
      return style;
    }
  }
}
