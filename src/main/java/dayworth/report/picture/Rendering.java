package dayworth.report.picture;

import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import javax.imageio.ImageIO;
import javax.imageio.stream.MemoryCacheImageOutputStream;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.w3c.dom.NodeList;

/** Makes files of a picture. The same picture gives the same bytes. */
final class Rendering {

  private static final String SVG = "http://www.w3.org/2000/svg";
  private static final String DECLARATION = "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n";
  private static final int PIXELS_PER_PIXEL = 2;

  private Rendering() {}

  /** Twice as fine as the picture's own pixels, for print and dense screens. */
  static byte[] png(Picture picture) {
    BufferedImage image =
        new BufferedImage(
            picture.width() * PIXELS_PER_PIXEL,
            picture.height() * PIXELS_PER_PIXEL,
            BufferedImage.TYPE_INT_RGB);
    Graphics2D graphics = image.createGraphics();
    graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    graphics.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    graphics.setRenderingHint(
        RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
    graphics.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    graphics.scale(PIXELS_PER_PIXEL, PIXELS_PER_PIXEL);
    paint(picture, new Sheet(graphics));
    graphics.dispose();
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (MemoryCacheImageOutputStream out = new MemoryCacheImageOutputStream(bytes)) {
      ImageIO.write(image, "png", out);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return bytes.toByteArray();
  }

  /** Words stay words: they can be searched, and are read out with the title and description. */
  static byte[] svg(Picture picture) {
    SVGGeneratorContext context = SVGGeneratorContext.createDefault(document());
    context.setComment(null);
    context.setPrecision(2);
    SVGGraphics2D graphics = new SVGGraphics2D(context, false);
    graphics.setSVGCanvasSize(new Dimension(picture.width(), picture.height()));
    Sheet sheet = new Sheet(graphics);
    paint(picture, sheet);
    Element root = graphics.getRoot();
    anchorTexts(root, sheet.written());
    describe(root, picture);
    try (StringWriter out = new StringWriter()) {
      graphics.stream(root, out, false, false);
      String written = out.toString();
      // Without the document type, which would send some viewers to the net for it.
      String svg = DECLARATION + written.substring(written.indexOf("<svg"));
      return svg.getBytes(StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static void paint(Picture picture, Sheet sheet) {
    sheet.fill(Look.PAPER, new Box(0, 0, picture.width(), picture.height()));
    picture.paint(sheet);
  }

  private static Document document() {
    try {
      return DocumentBuilderFactory.newInstance()
          .newDocumentBuilder()
          .getDOMImplementation()
          .createDocument(SVG, "svg", null);
    } catch (ParserConfigurationException e) {
      throw new IllegalStateException("the Java runtime has no XML", e);
    }
  }

  /** Another machine's font may be narrower: a text that ends at a mark must still end there. */
  private static void anchorTexts(Element root, List<Sheet.Written> written) {
    NodeList texts = root.getElementsByTagNameNS(SVG, "text");
    if (texts.getLength() != written.size()) {
      throw new IllegalStateException(
          written.size() + " texts were written, " + texts.getLength() + " arrived");
    }
    for (int i = 0; i < written.size(); i++) {
      Sheet.Written line = written.get(i);
      if (line.anchor() != Sheet.Anchor.START) {
        Element text = (Element) texts.item(i);
        text.setAttribute("text-anchor", line.anchor() == Sheet.Anchor.END ? "end" : "middle");
        text.setAttribute("x", String.format(Locale.ROOT, "%.2f", line.x()));
      }
    }
  }

  private static void describe(Element root, Picture picture) {
    root.setAttribute("viewBox", "0 0 " + picture.width() + " " + picture.height());
    root.setAttribute("role", "img");
    root.setAttribute("font-family", "sans-serif");
    Node first = root.getFirstChild();
    root.insertBefore(textElement(root, "title", picture.title()), first);
    root.insertBefore(textElement(root, "desc", picture.description()), first);
  }

  private static Element textElement(Element root, String name, String text) {
    Element element = root.getOwnerDocument().createElementNS(SVG, name);
    element.setTextContent(text);
    return element;
  }
}
