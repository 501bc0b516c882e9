package dayworth.command;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;

/** Runs the real jar in a folder, as a user would. */
final class RealJar {

  private static final Path JAR = Path.of("target", "dayworth.jar").toAbsolutePath();
  private static final Path CASES = Path.of("cases").toAbsolutePath();

  private final Path folder;

  RealJar(Path folder) {
    assertTrue(Files.exists(JAR), "the tests run after the jar is built: mvn verify");
    this.folder = folder;
  }

  /** What a run left behind. */
  record Run(int status, String out, String err) {}

  Run run(String... arguments) throws IOException, InterruptedException {
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.add("-jar");
    command.add(JAR.toString());
    command.addAll(List.of(arguments));
    Path out = folder.resolve("out.txt");
    Path err = folder.resolve("err.txt");
    Process process =
        new ProcessBuilder(command)
            .directory(folder.toFile())
            .redirectOutput(out.toFile())
            .redirectError(err.toFile())
            .start();
    assertTrue(process.waitFor(2, TimeUnit.MINUTES), "the program ends");
    return new Run(
        process.exitValue(),
        Files.readString(out, StandardCharsets.UTF_8),
        Files.readString(err, StandardCharsets.UTF_8));
  }

  /** The path of a demo case. */
  static String demo(String name) {
    return CASES.resolve(name).toString();
  }
}
