package dayworth.report.brief.page;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;

/**
 * A document as one HTML file that needs nothing else: style, fonts, pictures and data lie in it.
 * Without scripts it is a document that stands still; with them a slider leads through the
 * finishes.
 */
public final class HtmlPage {

  private final Document document;
  private final Explorer explorer;
  private final HtmlParts parts;
  private final StringBuilder out = new StringBuilder();

  private HtmlPage(Document document, Explorer explorer) {
    this.document = document;
    this.explorer = explorer;
    this.parts = new HtmlParts(out);
  }

  /**
   * What lets a reader explore.
   *
   * @param bar the slider and its buttons, as HTML
   * @param json the data of every finish, safe within a script element
   * @param style what depends on the pictures
   */
  public record Explorer(String bar, String json, String style) {}

  /** The text of the file. */
  public static String of(Document document, Explorer explorer) {
    HtmlPage page = new HtmlPage(document, explorer);
    page.write();
    return page.out.toString();
  }

  private void write() {
    String script = Assets.text("explorer.js");
    head(script);
    line("<body>");
    line("<a class=\"skip\" href=\"#main\">Skip to the answer</a>");
    line("<div class=\"page\">");
    masthead();
    line("<main id=\"main\">");
    answer();
    facts();
    int number = 0;
    for (Section section : document.sections()) {
      section(section, ++number);
    }
    line("</main>");
    line("<footer class=\"foot\"><p>" + html(document.closing()) + "</p></footer>");
    line("</div>");
    line("<script type=\"application/json\" id=\"states\">" + explorer.json() + "</script>");
    line("<script>" + script + "</script>");
    line("</body>");
    line("</html>");
  }

  private void head(String script) {
    line("<!DOCTYPE html>");
    line("<html lang=\"en-GB\">");
    line("<head>");
    line("<meta charset=\"utf-8\">");
    line("<meta name=\"viewport\" content=\"width=device-width,initial-scale=1\">");
    line(
        "<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none';"
            + " style-src 'unsafe-inline'; font-src data:; script-src 'sha256-"
            + digest(script)
            + "'; base-uri 'none'; form-action 'none'\">");
    line("<title>" + html(document.title()) + "</title>");
    line("<style>" + Assets.fontFaces() + Assets.text("brief.css"));
    line(printFoot() + explorer.style() + "</style>");
    line("</head>");
  }

  /** The foot of a printed page carries the reference; a string of CSS needs escapes of its own. */
  private String printFoot() {
    String reference = document.reference().isEmpty() ? "" : ", " + document.reference();
    return "@media print{@page{@bottom-left{content:"
        + cssString(shortTitle() + reference)
        + ";font:400 8.5pt \"Dayworth Label\",sans-serif;color:#56646F}}}\n";
  }

  private String shortTitle() {
    int colon = document.title().indexOf(": what ");
    return colon < 0 ? document.title() : document.title().substring(0, colon);
  }

  /** An escape takes one space after it along, so it brings one. */
  static String cssString(String text) {
    StringBuilder css = new StringBuilder("\"");
    text.codePoints()
        .forEach(
            c -> {
              boolean plain = (Character.isLetterOrDigit(c) && c < 128) || c == ' ' || c == ',';
              css.append(plain ? Character.toString(c) : String.format("\\%06X ", c));
            });
    return css.append('"').toString();
  }

  private void masthead() {
    line(
        "<header class=\"mast\"><p class=\"what\">"
            + html(document.title())
            + "</p><p class=\"ref\">"
            + html(document.reference())
            + "</p></header>");
  }

  private void answer() {
    Document.Headline head = document.headline();
    line(
        "<h1>"
            + html(head.before())
            + "<em>"
            + html(head.stressed())
            + "</em>"
            + html(head.after())
            + "</h1>");
    document.sum().ifPresent(this::sum);
    line("<div class=\"lede\">");
    document.lede().forEach(text -> line("<p>" + html(text) + "</p>"));
    line("</div>");
  }

  private void sum(Document.Sum sum) {
    line("<div class=\"sum\" role=\"group\" aria-label=\"The answer in three numbers\">");
    addend(sum.from(), "");
    line("<span class=\"op\" role=\"img\" aria-label=\"less\">−</span>");
    addend(sum.less(), "");
    line("<span class=\"op\" role=\"img\" aria-label=\"leaves\">=</span>");
    addend(sum.leaves(), " class=\"res\"");
    line("</div>");
  }

  private void addend(Document.Addend addend, String style) {
    line(
        "<div"
            + style
            + "><b>"
            + html(addend.amount())
            + "</b><span>"
            + html(addend.meaning())
            + "</span></div>");
  }

  private void facts() {
    line("<dl class=\"meta\">");
    for (Document.Fact fact : document.facts()) {
      String style = fact.isKnown() ? "" : " class=\"not\"";
      line(
          "<div><dt>"
              + html(fact.name())
              + "</dt><dd"
              + style
              + ">"
              + html(fact.value())
              + "</dd></div>");
    }
    line("</dl>");
  }

  private void section(Section section, int number) {
    boolean explores = section.layout() == Section.Layout.EXPLORER;
    if (explores) {
      line(explorer.bar());
    }
    String style =
        switch (section.layout()) {
          case PLAIN -> "";
          case BROAD -> " class=\"broad\"";
          case EXPLORER -> " class=\"try\"";
        };
    String id = "s-" + section.id();
    line("");
    line("<section" + style + " aria-labelledby=\"" + id + "\">");
    String heading = html(section.heading());
    line(
        "<h2 id=\""
            + id
            + "\"><span class=\"no\">"
            + number
            + "</span>"
            + (explores
                ? "<span id=\"try-h\">" + heading + "</span>"
                : "<span>" + heading + "</span>")
            + "</h2>");
    section.parts().forEach(parts::write);
    line("</section>");
  }

  private static String digest(String script) {
    try {
      byte[] hash =
          MessageDigest.getInstance("SHA-256").digest(script.getBytes(StandardCharsets.UTF_8));
      return Base64.getEncoder().encodeToString(hash);
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }

  private void line(String text) {
    out.append(text).append('\n');
  }

  private static String html(String text) {
    return Escape.html(text);
  }
}
