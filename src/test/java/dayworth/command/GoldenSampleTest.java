package dayworth.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.concurrent.TimeUnit;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The results kept in output/ are what the program writes today: tables and the brief byte by byte.
 * Pictures depend on the machine's fonts, so of them only the names are compared.
 */
class GoldenSampleTest {

  private static final Path KEPT = Path.of("output", "ferry-berth-core");

  @Test
  void theKeptResultsAreWhatTheProgramWrites(@TempDir Path folder)
      throws IOException, InterruptedException {
    Path written = folder.resolve("results");
    run(folder, written, "curve");
    run(folder, written, "brief");
    assertEquals(files(KEPT), files(written));
    for (String name : files(KEPT)) {
      if (name.endsWith(".csv") || name.endsWith(".json") || name.endsWith(".html")) {
        assertEquals(
            Files.readString(KEPT.resolve(name)), Files.readString(written.resolve(name)), name);
      }
    }
  }

  private static void run(Path folder, Path written, String command)
      throws IOException, InterruptedException {
    Process process =
        new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-jar",
                Path.of("target", "dayworth.jar").toString(),
                command,
                Path.of("cases", "ferry-berth-core").toString(),
                "--quiet",
                "--out",
                written.toString())
            .redirectErrorStream(true)
            .redirectOutput(folder.resolve("said.txt").toFile())
            .start();
    assertTrue(process.waitFor(2, TimeUnit.MINUTES), "the program ends");
    assertEquals(0, process.exitValue(), Files.readString(folder.resolve("said.txt")));
  }

  @Test
  void thePageTellsOfEveryFile() throws IOException {
    String page = Files.readString(Path.of("output", "README.md"));
    List<String> untold =
        files(KEPT).stream()
            .filter(name -> !page.contains(name.replaceFirst("\\.(png|svg)$", "")))
            .toList();
    assertEquals(List.of(), untold);
  }

  private static SortedSet<String> files(Path folder) throws IOException {
    try (Stream<Path> all = Files.walk(folder)) {
      return all.filter(Files::isRegularFile)
          .map(path -> folder.relativize(path).toString().replace('\\', '/'))
          .collect(Collectors.toCollection(TreeSet::new));
    }
  }
}
