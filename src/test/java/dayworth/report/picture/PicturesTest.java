package dayworth.report.picture;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.decision.CurveAnswer;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.w3c.dom.Document;
import org.w3c.dom.NodeList;
import org.xml.sax.SAXException;

class PicturesTest {

  private static final int SMALLEST = 11;

  @ParameterizedTest
  @ValueSource(strings = {"starter", "ferry-berth-core", "outage"})
  void wordsOfTheDemosDoNotOverlap(String name) {
    requireTidy(name, Answers.ofDemo(name));
  }

  @Test
  void wordsOfDrawnCasesDoNotOverlap() {
    for (long seed = 1; seed <= 150; seed++) {
      requireTidy("seed " + seed, Answers.ofSeed(seed));
    }
  }

  private static void requireTidy(String which, CurveAnswer answer) {
    Pictures.drawn(answer)
        .forEach((name, picture) -> requireTidy(which + ", " + name, picture, written(picture)));
  }

  private static void requireTidy(String which, Picture picture, List<Sheet.Written> written) {
    Box paper = new Box(0, 0, picture.width(), picture.height());
    for (int i = 0; i < written.size(); i++) {
      Sheet.Written one = written.get(i);
      assertTrue(paper.holds(one.box()), () -> which + ": beyond the paper: " + one);
      assertTrue(one.type().size() >= SMALLEST, () -> which + ": too small: " + one);
      for (Sheet.Written other : written.subList(i + 1, written.size())) {
        assertFalse(
            one.box().overlaps(other.box()), () -> which + ": " + one + " overlaps " + other);
      }
    }
  }

  private static List<Sheet.Written> written(Picture picture) {
    BufferedImage image =
        new BufferedImage(picture.width(), picture.height(), BufferedImage.TYPE_INT_RGB);
    Graphics2D graphics = image.createGraphics();
    Sheet sheet = new Sheet(graphics);
    picture.paint(sheet);
    graphics.dispose();
    return sheet.written();
  }

  /** One finish, one amount: 8 days late at 10. The axis of money has that and zero. */
  @Test
  void aSingleFinishThatCostsSomethingIsDrawn() throws IOException {
    Network network =
        new Network(TimeScale.WHOLE, List.of(Activity.fixed("A", 10, Money.ZERO)), List.of());
    Terms terms =
        new Terms(
            TimeScale.WHOLE,
            Optional.empty(),
            TimeRelated.NONE,
            Money.ZERO,
            Optional.of(Due.at(2)),
            Damages.perUnit(Money.of(10), BigDecimal.ZERO, Optional.empty()),
            Bonus.NONE);
    Map<String, byte[]> files =
        Pictures.of(Answers.ask(Answers.of("one", "", "EUR", network, terms)));
    assertTrue(texts(files, "curve").contains("total EUR 80"), texts(files, "curve").toString());
  }

  /** By hand: 120 days cost 637,500 and 99 days 521,507.14 of money that depends on the finish. */
  @Test
  void aStatusIsToldAndWhatIsFinishedIsLeftOut() throws IOException {
    Map<String, byte[]> files = Pictures.of(Answers.ofStatus());
    List<String> curve = texts(files, "curve");
    assertTrue(
        curve.contains(
            "Finishing in 99 working days costs least: EUR 115,993 less than as it stands"),
        curve.toString());
    assertTrue(curve.contains("As it stands"), curve.toString());
    String map = String.join(" ", texts(files, "compression-map"));
    assertTrue(map.contains("of 33 activities"), map);
    assertTrue(map.contains("work to go after 2027-07-16"), map);
    assertFalse(map.contains("A1 Marine works permit"), map);
  }

  /**
   * From the demo's table, which was computed outside this program: least total 8,800 at 16 weeks,
   * as planned 10,900 at 19, contract 9,000 at 17, shortest 11,100 at 12; the first price is 100 a
   * week, the one after the least total 1,400, which is worth 500 + 500.
   */
  @Test
  void theWordsCarryTheFigures() throws IOException {
    Map<String, byte[]> files = Pictures.of(Answers.ofDemo("starter"));
    assertEquals(Pictures.NAMES, files.keySet());
    List<String> curve = texts(files, "curve");
    assertTrue(
        curve.containsAll(
            List.of(
                "Finishing in 16 weeks costs least: EUR 2,100 less than as planned",
                "Least total",
                "EUR 8,800",
                "As planned",
                "total EUR 10,900",
                "Contract finish",
                "EUR 9,000",
                "Shortest possible",
                "total EUR 11,100")),
        curve.toString());
    List<String> price = texts(files, "price");
    assertTrue(
        price.containsAll(
            List.of(
                "Buying time pays down to 16 weeks; the next costs 1,400 and is worth 1,000",
                "Stop at the least total, 16 weeks",
                "100",
                "1,400",
                "Damages",
                "700 a week",
                "Bonus")),
        price.toString());
    List<String> map = texts(files, "compression-map");
    assertTrue(
        map.containsAll(
            List.of(
                "At 16 weeks 2 of 6 activities are shortened and 6 are critical",
                "PLAN",
                "900, up to 3",
                "Critical: no float")),
        map.toString());
  }

  @Test
  void filesOfTheSameAnswerAreTheSame() {
    Map<String, byte[]> one = Pictures.of(Answers.ofDemo("ferry-berth-core"));
    Map<String, byte[]> other = Pictures.of(Answers.ofDemo("ferry-berth-core"));
    one.forEach((name, bytes) -> assertArrayEquals(bytes, other.get(name), name));
  }

  @Test
  void aPngIsTwiceAsFineAndShowsThePaper() throws IOException {
    CurveAnswer answer = Answers.ofDemo("starter");
    Map<String, byte[]> files = Pictures.of(answer);
    for (Map.Entry<String, Picture> drawn : Pictures.drawn(answer).entrySet()) {
      byte[] bytes = files.get("charts/" + drawn.getKey() + ".png");
      BufferedImage image = ImageIO.read(new ByteArrayInputStream(bytes));
      assertEquals(2 * drawn.getValue().width(), image.getWidth());
      assertEquals(2 * drawn.getValue().height(), image.getHeight());
      assertEquals(Look.PAPER.getRGB(), image.getRGB(image.getWidth() - 1, image.getHeight() - 1));
    }
  }

  @Test
  void hostileWordsStayWords() throws IOException {
    String hostile =
        "<script>alert(\"x\")</script> & 'q' ]]> \u202Etxt\u0000\u0007\uFFFE\uD800 \u05D0\u05D1";
    Network network =
        new Network(
            TimeScale.WHOLE,
            List.of(
                new Activity(hostile, hostile, hostile, 5, 3, Money.of(10), Money.of(50), 0),
                Activity.compressible("B".repeat(300), 4, Money.of(20), 2, Money.of(90))),
            List.of(Link.finishToStart(0, 1)));
    CurveAnswer answer =
        Answers.ask(
            Answers.of("x", hostile.repeat(5), "<b>", network, Terms.none(TimeScale.WHOLE)));
    Map<String, byte[]> files = Pictures.of(answer);
    for (String name : List.of("curve", "price", "compression-map")) {
      Document document = document(files.get("charts/" + name + ".svg"));
      assertEquals(0, document.getElementsByTagName("script").getLength());
      assertFalse(document.getDocumentElement().getTextContent().contains("\u202E"));
      assertTrue(document.getDocumentElement().getTextContent().contains("<script>"), name);
    }
    requireTidy("hostile", answer);
  }

  @Test
  void aProjectThatCannotBeShortenedHasItsPicturesToo() throws IOException {
    Network network =
        new Network(TimeScale.WHOLE, List.of(Activity.fixed("A", 5, Money.of(100))), List.of());
    CurveAnswer answer =
        Answers.ask(Answers.of("fixed", "", "", network, Terms.none(TimeScale.WHOLE)));
    requireTidy("fixed", answer);
    List<String> price = texts(Pictures.of(answer), "price");
    assertTrue(price.contains("No finish before 5 working days can be bought"), price.toString());
  }

  private static List<String> texts(Map<String, byte[]> files, String name) throws IOException {
    NodeList nodes = document(files.get("charts/" + name + ".svg")).getElementsByTagName("text");
    return java.util.stream.IntStream.range(0, nodes.getLength())
        .mapToObj(i -> nodes.item(i).getTextContent())
        .toList();
  }

  private static Document document(byte[] svg) throws IOException {
    try {
      return DocumentBuilderFactory.newInstance()
          .newDocumentBuilder()
          .parse(new ByteArrayInputStream(svg));
    } catch (ParserConfigurationException | SAXException e) {
      throw new IOException(new String(svg, StandardCharsets.UTF_8), e);
    }
  }
}
