package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.decision.BuildUpAnswer;
import dayworth.decision.Case;
import dayworth.report.BuildUpFiles;
import dayworth.report.BuildUpText;
import dayworth.report.Style;
import dayworth.value.TimeScale;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Whatever the files of labour hold, they are read or refused, and what is sound can be told. */
class LabourFuzzTest {

  private static final int CASES = 600;

  private static final List<String> SPLICES =
      List.of(
          ",",
          ";",
          "\"",
          "\n",
          "\r\n",
          "-",
          ".",
          "0",
          "999999",
          "1e9",
          "\u00fc",
          "\uFEFF",
          "normal",
          "long days",
          "A",
          " ",
          "\u0000",
          "=1+1",
          "0.999999",
          "168",
          "520",
          "100",
          "0.000001");

  private static final List<String> NUMBERS =
      List.of("", "0", "1", "2", "7", "9", "12", "99", "0.5");

  private static final Map<String, String> FILES =
      Map.of(
          "activities.csv", LabourOnDisk.ACTIVITIES,
          "labour.csv", LabourOnDisk.LABOUR,
          "patterns.csv", LabourOnDisk.PATTERNS,
          "pay.csv", LabourOnDisk.PAY,
          "output_loss.csv", LabourOnDisk.LOSS);

  @TempDir private Path folder;

  @Test
  void changedFilesAreReadOrRefused() throws IOException {
    List<String> names = FILES.keySet().stream().sorted().toList();
    int sound = 0;
    for (int seed = 0; seed < CASES; seed++) {
      Random random = new Random(seed);
      LabourOnDisk disk = new LabourOnDisk(folder);
      for (int k = 1 + random.nextInt(2); k > 0; k--) {
        String name = names.get(random.nextInt(names.size()));
        disk.with(name, changed(FILES.get(name), random));
      }
      if (isSound(seed)) {
        sound++;
        canBeTold(disk.disk().sound(), seed);
      }
    }
    assertTrue(sound > CASES / 20, "too few cases are sound: " + sound);
    assertTrue(sound < CASES - CASES / 20, "too few are refused: " + sound);
  }

  /** Mostly another number in the place of one, which may be right; else something put in. */
  private static String changed(String text, Random random) {
    int at = random.nextInt(text.length());
    if (random.nextInt(4) > 0) {
      int digit = at;
      while (digit < text.length() && !Character.isDigit(text.charAt(digit))) {
        digit++;
      }
      int end = Math.min(text.length(), digit + 1);
      String number = NUMBERS.get(random.nextInt(NUMBERS.size()));
      return text.substring(0, Math.min(digit, text.length())) + number + text.substring(end);
    }
    int end = Math.min(text.length(), at + random.nextInt(4));
    String splice = SPLICES.get(random.nextInt(SPLICES.size()));
    return text.substring(0, at) + splice + text.substring(end);
  }

  private boolean isSound(int seed) {
    try {
      return CaseReader.read(folder, TimeScale.WHOLE) instanceof Reading.Sound;
    } catch (RuntimeException thrown) {
      throw new AssertionError("seed " + seed, thrown);
    }
  }

  private static void canBeTold(Case of, int seed) {
    try {
      BuildUpAnswer answer = new BuildUpAnswer(of, OptionalInt.empty());
      if (answer.all().activities().isEmpty()) {
        assertFalse(BuildUpText.nothing(of).isEmpty());
        return;
      }
      assertFalse(BuildUpText.lines(answer, Style.PLAIN, 80).isEmpty());
      int first = answer.all().activities().get(0).activity();
      BuildUpAnswer one = new BuildUpAnswer(of, OptionalInt.of(first));
      assertFalse(BuildUpText.lines(one, Style.PLAIN, 80).isEmpty());
      assertFalse(BuildUpFiles.of(answer, "test").isEmpty());
    } catch (RuntimeException thrown) {
      throw new AssertionError("seed " + seed, thrown);
    }
  }
}
