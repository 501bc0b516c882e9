package dayworth.report.brief.page;

import java.util.List;

/**
 * A finding and what supports it.
 *
 * @param id for links within the document
 * @param heading the finding
 * @param parts what supports it
 * @param layout how much room it needs
 */
public record Section(String id, String heading, List<Part> parts, Layout layout) {

  public Section {
    parts = List.copyOf(parts);
  }

  /** A section as wide as the others. */
  public Section(String id, String heading, List<Part> parts) {
    this(id, heading, parts, Layout.PLAIN);
  }

  /** How a section is laid out. */
  public enum Layout {
    PLAIN,
    /** On paper it has a broad page of its own. */
    BROAD,
    /** Its heading and figures follow the slider, which stands before it. */
    EXPLORER
  }
}
