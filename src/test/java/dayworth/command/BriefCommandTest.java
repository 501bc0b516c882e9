package dayworth.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** {@code dayworth brief} as it is used. */
class BriefCommandTest {

  private static final Path FERRY =
      Path.of("src", "test", "resources", "brief", "ferry-landing").toAbsolutePath();

  @TempDir private Path folder;

  @Test
  void itWritesOnePageAndSaysWhatItArguesFor() throws IOException, InterruptedException {
    RealJar.Run run = new RealJar(folder).run("brief", RealJar.demo("starter"));
    assertEquals(0, run.status(), run.err());
    assertTrue(
        run.out().startsWith("The brief argues for a finish in 16 weeks: 2,100 better"), run.out());
    Path page = folder.resolve("output/starter/brief.html");
    assertTrue(Files.readString(page).startsWith("<!DOCTYPE html>"));
    assertTrue(
        run.out().contains("Written: " + Path.of("output", "starter", "brief.html")), run.out());
  }

  @Test
  void asMarkdownItLeavesThePageAlone() throws IOException, InterruptedException {
    RealJar jar = new RealJar(folder);
    jar.run("brief", RealJar.demo("starter"), "--out", "here", "--quiet");
    String page = Files.readString(folder.resolve("here/brief.html"));
    RealJar.Run run =
        jar.run("brief", RealJar.demo("starter"), "--as", "md", "--out", "here", "--quiet");
    assertEquals(0, run.status(), run.err());
    assertEquals("", run.out());
    assertEquals(page, Files.readString(folder.resolve("here/brief.html")));
    assertTrue(Files.readString(folder.resolve("here/brief.md")).startsWith("# A pottery"));
  }

  @Test
  void thePlanIsChosenByUnitsOrDate() throws IOException, InterruptedException {
    RealJar jar = new RealJar(folder);
    RealJar.Run units = jar.run("brief", FERRY.toString(), "--plan", "53");
    RealJar.Run date = jar.run("brief", FERRY.toString(), "--plan", "2026-11-18");
    RealJar.Run least = jar.run("brief", FERRY.toString(), "--plan", "least");
    assertTrue(units.out().contains("Wed 18 Nov 2026: 45,550 better"), units.out());
    assertEquals(units.out(), date.out());
    assertTrue(least.out().contains("Fri 20 Nov 2026: 50,690 better"), least.out());
  }

  @Test
  void aFinishThatNoPlanMeetsIsNoAnswer() throws IOException, InterruptedException {
    RealJar.Run run = new RealJar(folder).run("brief", FERRY.toString(), "--plan", "40");
    assertEquals(1, run.status());
    assertTrue(run.err().contains("48"), run.err());
    assertFalse(Files.exists(folder.resolve("output")));
  }

  @Test
  void wrongUsageIsToldWithWhatWouldBeRight() throws IOException, InterruptedException {
    RealJar jar = new RealJar(folder);
    RealJar.Run word = jar.run("brief", FERRY.toString(), "--plan", "soon");
    assertEquals(2, word.status());
    assertTrue(
        word.err().contains("such as 17.5, a date such as 2026-09-07, or least"), word.err());
    RealJar.Run date = jar.run("brief", RealJar.demo("starter"), "--plan", "2026-09-07");
    assertEquals(2, date.status());
    assertTrue(date.err().contains("--plan DATE wants a case with dates"), date.err());
    RealJar.Run form = jar.run("brief", FERRY.toString(), "--as", "pdf");
    assertEquals(2, form.status());
    assertTrue(form.err().contains("html, md"), form.err());
  }
}
