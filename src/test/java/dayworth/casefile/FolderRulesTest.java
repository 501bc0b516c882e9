package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.decision.InputFile;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The folder itself, the names in it, and all problems together. */
class FolderRulesTest {

  @TempDir private Path folder;

  private CaseOnDisk oneActivity() throws IOException {
    return new CaseOnDisk(folder).with("activities.csv", CaseOnDisk.ONE_ACTIVITY);
  }

  @Test
  void aFolderThatIsNotThereIsOneProblem() {
    Path missing = folder.resolve("harbour");
    List<String> problems = new CaseOnDisk(missing).problems();
    assertEquals(1, problems.size());
    assertEquals("harbour | no such folder", problems.get(0).substring(0, 24));
  }

  @Test
  void aCaseNeedsActivities() throws IOException {
    new CaseOnDisk(folder).with("links.csv", "predecessor,successor,relation\nA,B,FS\n");
    assertEquals(
        List.of("activities.csv | is not there |  | a case needs this file"),
        new CaseOnDisk(folder).problems());
  }

  @Test
  void aFolderInPlaceOfAFileCannotBeRead() throws IOException {
    Files.createDirectory(folder.resolve("activities.csv"));
    assertEquals(
        List.of("activities.csv | cannot be read |  | a file one may read"),
        new CaseOnDisk(folder).problems());
  }

  @Test
  void otherFilesAreLeftAlone() throws IOException {
    oneActivity()
        .with("ranges.csv", "x")
        .with("README.txt", "x")
        .with("sketch.pdf", "x")
        .with("x.csv", "x");
    assertEquals(List.of(), new CaseOnDisk(folder).warnings());
  }

  @Test
  void aNameThatIsNearlyAKnownOneIsAWarning() throws IOException {
    oneActivity().with("link.csv", "x").with("Terms.CSV", "x").with("range.csv", "x");
    assertEquals(
        List.of(
            "Terms.CSV | is left alone |  | perhaps meant as terms.csv",
            "link.csv | is left alone |  | perhaps meant as links.csv",
            "range.csv | is left alone |  | perhaps meant as ranges.csv"),
        new CaseOnDisk(folder).warnings());
  }

  @Test
  void everyProblemOfEveryFileIsReportedInOrder() throws IOException {
    new CaseOnDisk(folder)
        .with("terms.csv", "term,value\ndamage_rate,5\n")
        .with("links.csv", "predecessor,successor,relation\nA,B,FX\n")
        .with(
            "activities.csv",
            """
            id,normal_duration,normal_cost,crash_duration,crash_cost,predecessors
            A,5,x,6,100,
            B,y,100,,,AA
            """)
        .with("pay.csv", "pattern,above_hours,multiplier\nlong days,200,1.5\n");
    assertEquals(
        List.of(
            "activities.csv:2 crash_duration | longer than the normal duration | 6"
                + " | at most 5, the normal duration",
            "activities.csv:2 normal_cost | not a number | x"
                + " | digits only, with a point before decimals",
            "activities.csv:3 normal_duration | not a number | y"
                + " | digits only, with a point before decimals",
            "activities.csv:3 predecessors | AA is no activity | AA | nearest is A",
            "links.csv:2 relation | no such relation | FX | one of FS, SS, FF, SF",
            "pay.csv:2 above_hours | too large | 200"
                + " | 0 or more, at most 168, the hours of a week",
            "terms.csv:2 term | no such term | damage_rate | nearest is damages_rate"),
        new CaseOnDisk(folder).problems());
  }

  /** The digest of the three letters abc: FIPS 180-2, appendix B.1. */
  @Test
  void theDigestIsOfTheBytesAsTheyLie() throws IOException {
    CaseFolder files =
        new CaseFolder(oneActivity().with("terms.csv", "abc").folder(), new Findings());
    assertEquals("abc", files.text("terms.csv").orElseThrow());
    assertEquals(
        List.of(
            new InputFile(
                "terms.csv", "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad")),
        files.inputs());
  }
}
