package dayworth.report.brief.page;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Base64;

/** The files that lie beside the program and go into every page. */
final class Assets {

  private static final String FOLDER = "/dayworth/report/brief/";

  private Assets() {}

  /** A text file. */
  static String text(String name) {
    return new String(bytes(name), StandardCharsets.UTF_8);
  }

  /**
   * The faces of the page: Literata for what is read and Barlow Semi Condensed for labels, both
   * under the SIL Open Font License 1.1.
   */
  static String fontFaces() {
    return face("Dayworth Text", 400, "literata-latin-400-normal")
        + face("Dayworth Text", 600, "literata-latin-600-normal")
        + face("Dayworth Label", 400, "barlow-semi-condensed-latin-400-normal")
        + face("Dayworth Label", 500, "barlow-semi-condensed-latin-500-normal")
        + face("Dayworth Label", 600, "barlow-semi-condensed-latin-600-normal");
  }

  private static String face(String family, int weight, String file) {
    String data = Base64.getEncoder().encodeToString(bytes("fonts/" + file + ".woff2"));
    return "@font-face{font-family:\""
        + family
        + "\";font-weight:"
        + weight
        + ";font-style:normal;src:url(data:font/woff2;base64,"
        + data
        + ") format(\"woff2\")}\n";
  }

  private static byte[] bytes(String name) {
    try (InputStream file = Assets.class.getResourceAsStream(FOLDER + name)) {
      if (file == null) {
        throw new IllegalStateException("the program lacks its file " + name);
      }
      return file.readAllBytes();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
