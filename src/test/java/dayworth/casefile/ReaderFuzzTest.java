package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Network;
import dayworth.value.TimeScale;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The reader answers whatever the bytes are, and what it calls sound can be computed. */
class ReaderFuzzTest {

  private static final Path CASE = Path.of("cases", "ferry-berth-core");
  private static final List<String> FILES = List.of("activities.csv", "links.csv", "terms.csv");
  private static final int CASES = 2000;

  /** What hurts readers of tables most often. */
  private static final List<String> SPLICES =
      List.of(
          ",", ";", "\"", "\"\"", "\n", "\r\n", "\r", "\t", "-", ".", "0", "999999", "1e9",
          "\u00fc", "\uFEFF", "A3", "FS", "id", " ", "\u0000", "=1+1");

  @TempDir private Path folder;

  @Test
  void theReaderNeverThrowsAndSoundCasesCanBeComputed() throws IOException {
    int sound = 0;
    for (int seed = 0; seed < CASES; seed++) {
      Random random = new Random(seed);
      for (String file : FILES) {
        byte[] bytes = Files.readAllBytes(CASE.resolve(file));
        Files.write(folder.resolve(file), changed(bytes, random));
      }
      sound += isSound(seed) ? 1 : 0;
    }
    assertTrue(sound > CASES / 20, "the changes leave too few cases sound: " + sound);
    assertTrue(sound < CASES - CASES / 20, "the changes break too few cases: " + sound);
  }

  private boolean isSound(int seed) {
    try {
      Reading reading = CaseReader.read(folder, TimeScale.WHOLE);
      if (reading instanceof Reading.Sound sound) {
        Network network = sound.of().network();
        Curve curve = Stepping.curve(network, PieceWitness.NONE);
        assertTrue(curve.shortest() >= 0, "seed " + seed);
        return true;
      }
      return false;
    } catch (RuntimeException e) {
      throw new AssertionError("seed " + seed, e);
    }
  }

  private static byte[] changed(byte[] bytes, Random random) {
    byte[] text = bytes;
    int changes = random.nextInt(3);
    for (int k = 0; k < changes; k++) {
      int at = random.nextInt(text.length + 1);
      text =
          switch (random.nextInt(5)) {
            case 0 -> spliced(text, at, at, new byte[] {(byte) random.nextInt(256)});
            case 1 -> spliced(text, at, Math.min(text.length, at + 1), new byte[0]);
            case 2 ->
                spliced(text, at, Math.min(text.length, at + random.nextInt(40)), new byte[0]);
            case 3 -> spliced(text, at, Math.min(text.length, at + 1), digit(random));
            default -> spliced(text, at, at, splice(random));
          };
    }
    return text;
  }

  private static byte[] digit(Random random) {
    return new byte[] {(byte) ('0' + random.nextInt(10))};
  }

  private static byte[] splice(Random random) {
    return SPLICES.get(random.nextInt(SPLICES.size())).getBytes(StandardCharsets.UTF_8);
  }

  private static byte[] spliced(byte[] text, int from, int to, byte[] instead) {
    byte[] joined = new byte[from + instead.length + text.length - to];
    System.arraycopy(text, 0, joined, 0, from);
    System.arraycopy(instead, 0, joined, from, instead.length);
    System.arraycopy(text, to, joined, from + instead.length, text.length - to);
    return joined;
  }
}
