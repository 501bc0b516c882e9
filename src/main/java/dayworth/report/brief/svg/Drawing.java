package dayworth.report.brief.svg;

import dayworth.report.brief.page.Escape;
import java.util.Locale;

/**
 * A drawing that is being made; every mark has a class of the page's style and no colour of its
 * own.
 */
public final class Drawing {

  private final double width;
  private final double height;
  private final StringBuilder body = new StringBuilder();

  /** An empty sheet. */
  public Drawing(double width, double height) {
    this.width = width;
    this.height = height;
  }

  /** Where a word begins. */
  public enum Anchor {
    START(""),
    MIDDLE(" text-anchor=\"middle\""),
    END(" text-anchor=\"end\"");

    private final String attribute;

    Anchor(String attribute) {
      this.attribute = attribute;
    }
  }

  public void line(String style, double x1, double y1, double x2, double y2) {
    body.append("<line x1=\"").append(n(x1)).append("\" y1=\"").append(n(y1));
    body.append("\" x2=\"").append(n(x2)).append("\" y2=\"").append(n(y2));
    body.append("\" class=\"").append(style).append("\"/>");
  }

  public void box(String style, double x, double y, double w, double h) {
    if (w <= 0 || h <= 0) {
      return;
    }
    body.append("<rect x=\"").append(n(x)).append("\" y=\"").append(n(y));
    body.append("\" width=\"").append(n(w)).append("\" height=\"").append(n(h));
    body.append("\" class=\"").append(style).append("\"/>");
  }

  public void dot(String style, double x, double y, double r) {
    body.append("<circle cx=\"").append(n(x)).append("\" cy=\"").append(n(y));
    body.append("\" r=\"").append(n(r)).append("\" class=\"").append(style).append("\"/>");
  }

  /** A line through points as they are written in a path; empty ones are left out. */
  public void path(String style, CharSequence points) {
    if (points.length() > 0) {
      body.append("<path d=\"").append(points).append("\" class=\"").append(style).append("\"/>");
    }
  }

  public void text(String style, Anchor anchor, double x, double y, String text) {
    if (text.isEmpty()) {
      return;
    }
    body.append("<text x=\"").append(n(x)).append("\" y=\"").append(n(y)).append('"');
    if (!style.isEmpty()) {
      body.append(" class=\"").append(style).append('"');
    }
    body.append(anchor.attribute).append('>').append(Escape.html(text)).append("</text>");
  }

  /**
   * Begins a group.
   *
   * @param attributes each with a blank before it, values escaped
   */
  public void open(String attributes) {
    body.append("<g").append(attributes).append('>');
  }

  /** Begins a sheet within the sheet, which can be shown elsewhere by its id. */
  public void openSheet(String id) {
    body.append("<svg id=\"").append(id).append("\">");
  }

  public void closeSheet() {
    body.append("</svg>");
  }

  public void close() {
    body.append("</g>");
  }

  /** The marks alone. */
  public String marks() {
    return body.toString();
  }

  /** The whole drawing. */
  public String svg() {
    return "<svg viewBox=\"0 0 " + n(width) + " " + n(height) + "\">" + body + "</svg>";
  }

  /** A number with at most one decimal. */
  public static String n(double number) {
    String text = String.format(Locale.ROOT, "%.1f", number);
    text = text.endsWith(".0") ? text.substring(0, text.length() - 2) : text;
    return text.equals("-0") ? "0" : text;
  }
}
