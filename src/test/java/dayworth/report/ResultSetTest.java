package dayworth.report;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ResultSetTest {

  private static final Set<String> OWNED = Set.of("a.csv", "b.csv", "charts/c.svg");
  private static final Map<String, String> OLD =
      Map.of("a.csv", "old a", "charts/c.svg", "old c", "mine.txt", "mine");
  private static final Map<String, String> NEW =
      Map.of("a.csv", "new a", "b.csv", "new b", "mine.txt", "mine");

  /** Lets so many changes pass and none after that, as if the process had been killed. */
  private static final class Killed implements Disk.Watch {
    private int left;

    Killed(int left) {
      this.left = left;
    }

    @Override
    public void beforeChanging(Path path) throws IOException {
      left--;
      if (left < 0) {
        throw new IOException("killed before " + path.getFileName());
      }
    }
  }

  private static Map<String, byte[]> files(Map<String, String> texts) {
    Map<String, byte[]> files = new TreeMap<>();
    texts.forEach((name, text) -> files.put(name, text.getBytes(UTF_8)));
    files.remove("mine.txt");
    return files;
  }

  /** What a reader sees, hidden names left out. */
  private static Map<String, String> seen(Path folder) throws IOException {
    Map<String, String> seen = new TreeMap<>();
    try (Stream<Path> all = Files.walk(folder)) {
      for (Path file : all.filter(Files::isRegularFile).toList()) {
        String name = folder.relativize(file).toString().replace('\\', '/');
        if (!name.startsWith(".")) {
          seen.put(name, Files.readString(file));
        }
      }
    }
    return seen;
  }

  private static void layOld(Path folder) throws IOException, ResultsNotWritten {
    Files.createDirectories(folder);
    Files.writeString(folder.resolve("mine.txt"), "mine");
    ResultSet.replace(folder, files(OLD), OWNED);
    assertEquals(OLD, seen(folder));
  }

  @Test
  void replacesItsFilesAndLeavesOthersAlone(@TempDir Path folder) throws Exception {
    layOld(folder);
    ResultSet.replace(folder, files(NEW), OWNED);
    assertEquals(NEW, seen(folder));
    try (Stream<Path> left = Files.list(folder)) {
      assertEquals(3, left.count(), "nothing hidden and no empty folder stays");
    }
  }

  @Test
  void killedAnywhereItIsWhollyOldOrAfterTheNextRunsRecoveryWhollyNew(@TempDir Path root)
      throws Exception {
    int after = 0;
    int old = 0;
    int completed = 0;
    for (boolean done = false; !done; after++) {
      Path folder = root.resolve("k" + after);
      layOld(folder);
      done = runsThrough(folder, new Killed(after));
      boolean journal = Files.exists(folder.resolve(".dayworth-journal"));
      if (!journal) {
        assertTrue(Set.of(OLD, NEW).contains(seen(folder)), "mixed after " + after);
      }
      old += !journal && seen(folder).equals(OLD) ? 1 : 0;
      completed += journal ? 1 : 0;
      Map<String, String> expected = journal ? NEW : Map.copyOf(seen(folder));
      // The next run is stopped by a folder in its way, once it has finished the earlier one.
      Files.createDirectory(folder.resolve("in-the-way.csv"));
      assertThrows(
          ResultsNotWritten.class,
          () -> ResultSet.replace(folder, Map.of("in-the-way.csv", new byte[0]), Set.of()));
      assertEquals(expected, seen(folder), "killed after " + after);
    }
    assertTrue(old > 2 && completed > 2, old + " old, " + completed + " rolled forward");
  }

  private static boolean runsThrough(Path folder, Killed killed) {
    try {
      ResultSet.replace(folder, files(NEW), OWNED, killed);
      return true;
    } catch (ResultsNotWritten stopped) {
      return false;
    }
  }

  @Test
  void twoRunsAtOnceAreRefused(@TempDir Path folder) throws Exception {
    FolderLock held = FolderLock.on(folder.resolve(".dayworth-lock")).orElseThrow();
    ResultsNotWritten refused =
        assertThrows(ResultsNotWritten.class, () -> ResultSet.replace(folder, files(NEW), OWNED));
    assertTrue(refused.getMessage().startsWith("Another run is writing to "));
    held.close();
    ResultSet.replace(folder, files(NEW), OWNED);
  }

  @Test
  void aTargetThatIsAFileIsSaidPlainly(@TempDir Path folder) throws Exception {
    Path file = Files.writeString(folder.resolve("x"), "x");
    ResultsNotWritten refused =
        assertThrows(ResultsNotWritten.class, () -> ResultSet.replace(file, files(NEW), OWNED));
    assertTrue(refused.getMessage().contains("is a file, not a folder"), refused.getMessage());
  }

  @Test
  void aJournalCannotReachOutOfTheFolder() {
    assertThrows(IOException.class, () -> SwapJournal.of("remove ../other\nend\n".getBytes(UTF_8)));
  }
}
