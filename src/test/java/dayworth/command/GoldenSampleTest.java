package dayworth.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
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
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The results kept in output/ are what the program writes today: tables and the brief byte by byte.
 * Pictures depend on the machine's fonts, so of them only the names are compared.
 */
class GoldenSampleTest {

  /** Beside the curve's results other commands may have kept theirs. */
  @ParameterizedTest
  @ValueSource(strings = {"ferry-berth-core", "ferry-berth"})
  void theKeptResultsAreWhatTheProgramWrites(String name, @TempDir Path folder)
      throws IOException, InterruptedException {
    Path kept = Path.of("output", name);
    Path written = folder.resolve("results");
    run(name, folder, written, "curve");
    run(name, folder, written, "brief");
    assertTrue(files(kept).containsAll(files(written)), "all that is written is kept");
    assertTrue(files(written).size() >= 12, files(written).toString());
    for (String file : files(written)) {
      if (file.endsWith(".csv") || file.endsWith(".json") || file.endsWith(".html")) {
        assertEquals(
            Files.readString(kept.resolve(file)), Files.readString(written.resolve(file)), file);
      }
    }
  }

  private static void run(String name, Path folder, Path written, String command)
      throws IOException, InterruptedException {
    Process process =
        new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-jar",
                Path.of("target", "dayworth.jar").toString(),
                command,
                Path.of("cases", name).toString(),
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
        Stream.of("ferry-berth-core", "ferry-berth")
            .flatMap(name -> files(Path.of("output", name)).stream())
            .filter(name -> !page.contains(name.replaceFirst("\\.(png|svg)$", "")))
            .toList();
    assertEquals(List.of(), untold);
  }

  private static SortedSet<String> files(Path folder) {
    try (Stream<Path> all = Files.walk(folder)) {
      return all.filter(Files::isRegularFile)
          .map(path -> folder.relativize(path).toString().replace('\\', '/'))
          .collect(Collectors.toCollection(TreeSet::new));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
