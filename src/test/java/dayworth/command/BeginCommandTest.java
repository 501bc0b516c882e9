package dayworth.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import picocli.CommandLine;

/** {@code dayworth begin} as it is parsed and answered. */
class BeginCommandTest {

  @TempDir private Path folder;

  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();

  private int run(String... arguments) {
    return new CommandLine(new Dayworth())
        .setOut(new PrintWriter(out, true))
        .setErr(new PrintWriter(err, true))
        .execute(arguments);
  }

  @Test
  void whatIsBegunCanBeCheckedAtOnce() {
    String bridge = folder.resolve("bridge").toString();
    assertEquals(0, run("begin", bridge), err.toString());
    assertTrue(out.toString().contains(bridge + " holds a small case."), out.toString());
    assertTrue(out.toString().contains("Next: dayworth check " + bridge), out.toString());
    assertEquals(0, run("check", bridge), err.toString());
    assertTrue(out.toString().contains("11 activities"), out.toString());
  }

  @Test
  void quietSaysNothing() {
    assertEquals(0, run("begin", "--quiet", folder.resolve("bridge").toString()));
    assertEquals("", out.toString() + err);
  }

  @Test
  void aFolderInUseIsRefusedWithStatusTwo() throws IOException {
    Files.writeString(folder.resolve("mine.txt"), "mine");
    assertEquals(2, run("begin", folder.toString()));
    assertEquals("", out.toString());
    assertEquals(
        "dayworth: " + folder + " is there and is not empty; name a new folder.",
        err.toString().strip());
  }
}
