package dayworth.report.brief;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.report.brief.svg.Face;
import dayworth.report.brief.svg.Hatch;
import java.util.List;
import java.util.Random;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** Widths, hatches and the ruler of the network, by laws. */
class DrawingPartsTest {

  @Test
  void figuresAreEquallyWide() {
    for (Face face : Face.values()) {
      for (char digit = '1'; digit <= '9'; digit++) {
        assertEquals(face.width("0", 13), face.width(String.valueOf(digit), 13), 1e-9);
      }
    }
  }

  @Test
  void whatIsFittedFits() {
    Random random = new Random(3);
    for (int i = 0; i < 500; i++) {
      String text = "Fabricate the linkspan and ship it".substring(0, 1 + random.nextInt(34));
      double room = 10 + random.nextInt(120);
      assertTrue(Face.MEDIUM.width(Face.MEDIUM.fit(text, 13, room), 13) <= room, text);
      for (String line : Face.MEDIUM.wrap(text, 13, room, 2)) {
        assertTrue(Face.MEDIUM.width(line, 13) <= room, text);
      }
    }
  }

  @Test
  void hatchesStayInTheirBox() {
    Pattern number = Pattern.compile("([ML])(-?[0-9.]+) (-?[0-9.]+)");
    for (String path :
        List.of(Hatch.falling(13, 27, 40, 17, 7), Hatch.rising(13, 27, 40, 17, 8.5))) {
      Matcher points = number.matcher(path);
      int found = 0;
      while (points.find()) {
        double x = Double.parseDouble(points.group(2));
        double y = Double.parseDouble(points.group(3));
        assertTrue(x >= 12.9 && x <= 53.1 && y >= 26.9 && y <= 44.1, x + " " + y);
        found++;
      }
      assertTrue(found >= 8, path);
    }
  }

  /** Later times stand further right, and every box has its room. */
  @Test
  void theRulerKeepsTheOrderOfTimesAndTheRoomOfBoxes() {
    for (long seed = 0; seed < 200; seed++) {
      Random random = new Random(seed);
      int boxes = 1 + random.nextInt(12);
      long[] start = new long[boxes];
      long[] duration = new long[boxes];
      double[] least = new double[boxes];
      long finish = 1;
      for (int b = 0; b < boxes; b++) {
        start[b] = random.nextInt(60);
        duration[b] = 1L + random.nextInt(20);
        least[b] = 20 + random.nextInt(60);
        finish = Math.max(finish, start[b] + duration[b]);
      }
      NetworkFrame frame = new NetworkFrame(finish, start, start, start, duration);
      TimeRuler ruler = new TimeRuler(frame, least, 3);
      double before = -1;
      for (long time = 0; time <= finish + 5; time++) {
        assertTrue(ruler.x(time) > before, "seed " + seed + ", time " + time);
        before = ruler.x(time);
      }
      for (int b = 0; b < boxes; b++) {
        double room = ruler.x(frame.end(b)) - ruler.x(frame.start(b));
        assertTrue(room >= least[b] - 1e-9, "seed " + seed + ", box " + b);
      }
    }
  }
}
