package dayworth.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.command.RealJar.Run;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Runs the real jar in an empty folder, as a user would. */
class ProgramTest {

  @TempDir private Path folder;

  private RealJar jar;

  @BeforeEach
  void thereIsAJar() {
    jar = new RealJar(folder);
  }

  private Run run(String... arguments) throws IOException, InterruptedException {
    return jar.run(arguments);
  }

  private static String demo(String name) {
    return RealJar.demo(name);
  }

  /** 16 weeks, 74,800 in all: computed outside this program. */
  @Test
  void curveAnswersAndLeavesItsTables() throws IOException, InterruptedException {
    Run run = run("curve", demo("starter"));
    assertEquals(0, run.status(), run.err());
    assertTrue(run.out().startsWith("Least total: finish in 16 weeks"), run.out());
    Path output = folder.resolve("output").resolve("starter");
    List<String> rows = Files.readAllLines(output.resolve("curve.csv"));
    assertEquals(
        "duration,finish_date,direct_cost,running_cost,time_related_cost,fixed_cost,damages,bonus,"
            + "total_cost,price_per_unit,breakpoint",
        rows.get(0));
    // 16 weeks: direct 67,300, time 16 x 500 = 8,000, bonus 1 week x 500; 74,800 in all
    assertTrue(
        rows.contains("16,,67300.00,0.00,8000.00,0.00,0.00,500.00,74800.00,1400.00,yes"),
        rows.toString());
    for (String file : List.of("steps.csv", "plan.csv", "crosscheck.csv", "result.json")) {
      assertTrue(Files.size(output.resolve(file)) > 0, file);
    }
  }

  /**
   * The dates are worked at the case's own test; with cents there would be no room for the total.
   * K3 takes no time: Tuesday 26 October ends day 156, and K4 starts on the 27th.
   */
  @Test
  void aCaseWithDatesIsAnsweredInDates() throws IOException, InterruptedException {
    Path dated = Path.of("src", "test", "resources", "demo", "ferry-berth-dated");
    Run run = run("curve", dated.toAbsolutePath().toString());
    assertEquals(0, run.status(), run.err());
    assertTrue(
        run.out()
            .startsWith(
                "Least total: finish on Thu 18 Nov 2027 (173 days), 204,978.57 better than as planned."),
        run.out());
    assertTrue(
        run.out()
            .contains(
                "> least total        173  Thu 18 Nov        68,950       693,643        0"
                    + "  -12,500    750,093"),
        run.out());
    assertTrue(run.out().contains("rounded to whole ones"), run.out());
    assertTrue(run.out().lines().allMatch(line -> line.length() <= 94), run.out());
    Path output = folder.resolve("output").resolve("ferry-berth-dated");
    String plan = Files.readString(output.resolve("plan.csv"));
    assertTrue(plan.contains(",0,,0,0.00,156,156,2027-10-26,2027-10-26,"), plan);
    assertTrue(plan.contains("cycle,12,,0,0.00,156,168,2027-10-27,2027-11-11,"), plan);
  }

  @Test
  void thePlanOfAnotherFinishCanBeAsked() throws IOException, InterruptedException {
    Run run = run("curve", demo("starter"), "--at", "17.5", "--out", "here");
    assertEquals(0, run.status(), run.err());
    List<String> rows = Files.readAllLines(folder.resolve("here").resolve("plan.csv"));
    // from 18 to 17 weeks PLAN is shortened; half a week of it is half of 400
    assertTrue(
        rows.stream().anyMatch(row -> row.startsWith("PLAN,Drawings and permits,5.5,,0.5,200.00,")),
        rows.toString());
  }

  @Test
  void aFinishThatCannotBeHadIsNoAnswer() throws IOException, InterruptedException {
    Run run = run("curve", demo("starter"), "--at", "11");
    assertEquals(1, run.status());
    assertTrue(run.err().contains("12"), run.err());
    assertFalse(Files.exists(folder.resolve("output")));
  }

  @Test
  void checkTellsTheFacts() throws IOException, InterruptedException {
    Run run = run("check", demo("starter"));
    assertEquals(0, run.status(), run.err());
    assertTrue(run.out().contains("One chain is critical: PLAN FLUE BASE FIRE"), run.out());
    assertFalse(Files.exists(folder.resolve("output")));
  }

  @Test
  void problemsStopEverythingAndLeaveResultsAsTheyWere() throws IOException, InterruptedException {
    Path draft = Files.createDirectory(folder.resolve("draft"));
    Files.writeString(
        draft.resolve("activities.csv"),
        "id,normal_duration,normal_cost,predecessors\nA,5,100,\nB,x,100,A;C\n");
    Path output = Files.createDirectories(folder.resolve("output").resolve("draft"));
    Files.writeString(output.resolve("curve.csv"), "as it was");
    Run run = run("curve", "draft");
    assertEquals(2, run.status());
    assertTrue(run.err().contains("activities.csv:3 normal_duration"), run.err());
    assertTrue(run.err().contains("activities.csv:3 predecessors"), run.err());
    assertEquals("", run.out());
    assertEquals("as it was", Files.readString(output.resolve("curve.csv")));
  }

  @Test
  void wrongUsageIsToldWithoutATrace() throws IOException, InterruptedException {
    for (String[] wrong :
        new String[][] {
          {},
          {"curve"},
          {"curv", "x"},
          {"curve", "nowhere"},
          {"curve", demo("starter"), "--at", "x"},
          {"curve", demo("starter"), "--crosscheck", "some"},
          {"check", "--out"}
        }) {
      Run run = run(wrong);
      assertEquals(2, run.status(), String.join(" ", wrong));
      assertFalse(run.err().contains("\tat "), run.err());
      assertFalse(run.err().isBlank());
    }
  }

  @Test
  void aResultForProgramsCanBePrinted() throws IOException, InterruptedException {
    Run run = run("curve", demo("starter"), "--json");
    assertEquals(0, run.status(), run.err());
    assertEquals(
        Files.readString(folder.resolve("output").resolve("starter").resolve("result.json")),
        run.out());
  }

  @Test
  void picturesComeWithTheTablesAndGoWithoutThem() throws IOException, InterruptedException {
    Run with = run("curve", demo("starter"), "--out", "here");
    assertEquals(0, with.status(), with.err());
    Path charts = folder.resolve("here").resolve("charts");
    for (String name : List.of("curve", "price", "compression-map")) {
      assertTrue(Files.size(charts.resolve(name + ".png")) > 0, name);
      assertTrue(Files.readString(charts.resolve(name + ".svg")).contains("16"), name);
    }
    assertTrue(with.out().contains("6 pictures"), with.out());
    Run without = run("curve", demo("starter"), "--out", "here", "--no-pictures");
    assertEquals(0, without.status(), without.err());
    assertFalse(Files.exists(charts));
    assertFalse(without.out().contains("pictures"), without.out());
  }
}
