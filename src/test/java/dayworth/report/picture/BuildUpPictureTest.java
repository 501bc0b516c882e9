package dayworth.report.picture;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.buildup.Labour;
import dayworth.buildup.OutputLoss;
import dayworth.buildup.Pattern;
import dayworth.buildup.PayLadder;
import dayworth.decision.BuildUpAnswer;
import dayworth.testing.BuiltCase;
import dayworth.testing.Patterns;
import dayworth.testing.RandomBuildUps;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

class BuildUpPictureTest {

  private static final Pattern NORMAL = Patterns.plain("normal", 40, 5);

  /** 40 of 50 hours are left after a fifth is lost: nothing is gained. */
  private static final Pattern USELESS =
      Patterns.overtime("fifty", 50, 5, PayLadder.STRAIGHT, Patterns.loss("0.2"));

  private static Labour labour(int hours) {
    return new Labour(Quantity.of(hours), Quantity.of(4), Money.of(50), Money.ZERO);
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

  private static void requireTidy(String which, BuildUpAnswer answer) {
    Picture picture = new BuildUpPicture(answer);
    Box paper = new Box(0, 0, picture.width(), picture.height());
    List<Sheet.Written> all = written(picture);
    for (int i = 0; i < all.size(); i++) {
      Sheet.Written one = all.get(i);
      assertTrue(paper.holds(one.box()), () -> which + ": beyond the paper: " + one);
      for (Sheet.Written other : all.subList(i + 1, all.size())) {
        assertFalse(
            one.box().overlaps(other.box()), () -> which + ": " + one + " overlaps " + other);
      }
    }
  }

  @Test
  void wordsOfDrawnBuildUpsDoNotOverlap() {
    for (int seed = 1; seed <= 80; seed++) {
      Random random = new Random(seed);
      List<Pattern> patterns = RandomBuildUps.patterns(random);
      Labour[] labours =
          Stream.generate(() -> RandomBuildUps.labour(random)).limit(3).toArray(Labour[]::new);
      requireTidy("seed " + seed, BuiltCase.of(patterns, labours));
    }
  }

  /**
   * By hand: 400 h by 4 at 40 h are 2.5 weeks; both 1 and 2 weeks and 2.5 of fifty gain nothing.
   */
  @Test
  void theTitleSaysHowManySpellsGainNothing() {
    String svg = svg(BuiltCase.of(List.of(NORMAL, USELESS), labour(400)));
    assertTrue(svg.contains("3 of 3 spells gain nothing"), svg);
    assertTrue(svg.contains("fifty"), svg);
    assertTrue(svg.contains("400 h, a crew of 4"), svg);
  }

  @Test
  void everyActivityBeyondADozenIsLeftOutAndCounted() {
    Labour[] many = Stream.generate(() -> labour(400)).limit(15).toArray(Labour[]::new);
    String svg = svg(BuiltCase.of(List.of(NORMAL, USELESS), many));
    assertTrue(svg.contains("3 activities are left out"), svg);
  }

  @Test
  void hostileWordsStayWords() {
    String hostile = "<script>alert(\"x\")</script> & \u202Etxt\u0000 ]]> ".repeat(4);
    Pattern named = Patterns.overtime(hostile, 50, 5, PayLadder.STRAIGHT, OutputLoss.NONE);
    BuildUpAnswer answer = BuiltCase.of(hostile, hostile, List.of(NORMAL, named), labour(300));
    String svg = svg(answer);
    assertFalse(svg.contains("<script>"), svg);
    assertFalse(svg.contains("\u202E"), svg);
    requireTidy("hostile", answer);
  }

  @Test
  void filesOfTheSameAnswerAreTheSame() {
    BuildUpAnswer answer = BuiltCase.of(List.of(NORMAL, USELESS), labour(400));
    Map<String, byte[]> one = BuildUpPictures.of(answer);
    Map<String, byte[]> other = BuildUpPictures.of(answer);
    assertEquals(BuildUpPictures.NAMES, one.keySet());
    one.forEach((name, bytes) -> assertArrayEquals(bytes, other.get(name), name));
  }

  private static String svg(BuildUpAnswer answer) {
    return new String(BuildUpPictures.of(answer).get("charts/buildup.svg"), StandardCharsets.UTF_8);
  }
}
