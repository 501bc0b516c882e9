package dayworth.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.command.RealJar.Run;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** {@code buildup} with the real jar. */
class BuildUpCommandTest {

  /** What the README shows. */
  private static final Path KEPT = Path.of("output", "ferry-berth").toAbsolutePath();

  @TempDir private Path folder;
  private RealJar jar;

  @BeforeEach
  void thereIsAJar() {
    jar = new RealJar(folder);
  }

  private Path output(String name) {
    return folder.resolve("output").resolve(name);
  }

  /** 480 h by 6 at 40 h a week: 10 days; long days of 50 h lose 4 %, half as much more above 40. */
  private Path aCase(String name) throws IOException {
    Path made = Files.createDirectories(folder.resolve(name));
    Files.writeString(made.resolve("activities.csv"), "id,normal_duration,normal_cost\nA,,\n");
    Files.writeString(
        made.resolve("labour.csv"),
        "activity,labour_hours,crew,rate,other_cost\nA,480,6,40,1000\n");
    Files.writeString(
        made.resolve("patterns.csv"),
        "pattern,hours_per_week,days_per_week,week_cost\nnormal,40,5,\nlong days,50,5,450\n");
    Files.writeString(
        made.resolve("pay.csv"), "pattern,above_hours,multiplier\nlong days,40,1.5\n");
    Files.writeString(
        made.resolve("output_loss.csv"), "pattern,week,loss,source\nlong days,1,0.04,site diary\n");
    return made;
  }

  /**
   * A week of 6 × 50 h yields 288 h; 192 h at 240 a week are 0.8 weeks, 9 days. Premium 6 × 5 × 40
   * = 1,200, lost 12 h × 40 = 480, 450 by the week. To the end 480 / 288 = 5/3 weeks: 500 h, of
   * which 20 are lost: 800; premium 5/3 × 1,200 = 2,000; 750: 3,550 more, 25/3 days, rounded up.
   */
  @Test
  void everyLineOfTheSumStandsInTheTable() throws IOException, InterruptedException {
    aCase("hand");
    Run run = jar.run("buildup", "hand");
    assertEquals(0, run.status(), run.err());
    assertEquals(
        List.of(
            "activity,pattern,weeks,weeks_after,duration,saved,hours_worked,hours_lost,"
                + "hours_crowded,output_hours,pay,premium,lost_output,extra_hours,supervision,"
                + "once_cost,extra_cost,cost,extra_per_unit_saved,verdict,dominated_by,"
                + "loss_factor,loss_source",
            "A,normal,,,10,0,480,0,0,480,,,,,,,,20200.00,,normal,,,",
            "A,long days,1,0.8,9,1,492,12,0,480,20880.00,1200.00,480.00,0.00,450.00,0.00,2130.00,"
                + "22330.00,2130.00,measure,,1,site diary",
            "A,long days,1.667,0,8.334,1.666,500,20,0,480,22000.00,2000.00,800.00,0.00,750.00,"
                + "0.00,3550.00,23750.00,2130.85,measure,,1,site diary"),
        Files.readAllLines(output("hand").resolve("buildup.csv")));
    assertTrue(
        run.out()
            .startsWith(
                "Working patterns buy time in 1 activity: 2 measures, from 2,130 for each day"),
        run.out());
    String said = run.out().replaceAll("\\s+", " ");
    assertTrue(said.contains("A 10 long days 1 to 1.667 8.334 1.666 3,550 2,131"), said);
    assertTrue(said.contains("Output lost: long days 4 %. Source: site diary."), said);
    assertTrue(said.contains("50 hours a week are more than 48"), said);
    assertTrue(said.contains("61 % higher (Dembe et al. 2005"), said);
    assertTrue(said.contains("the competent person decide"), said);
    assertTrue(run.out().lines().allMatch(line -> line.length() <= 94), run.out());
    for (String name : List.of("result.json", "charts/buildup.png", "charts/buildup.svg")) {
      assertTrue(Files.size(output("hand").resolve(name)) > 0, name);
    }
  }

  /** Of C6 week 8 of long days loses 20 %: 240 h, what a normal week yields. */
  @Test
  void anActivityIsToldLineByLine() throws IOException, InterruptedException {
    Run run = jar.run("buildup", RealJar.demo("ferry-berth"), "--activity", "C6");
    assertEquals(0, run.status(), run.err());
    String said = run.out().replaceAll("\\s+", " ");
    assertTrue(
        said.contains(
            "long days: 50 hours in 5 days, paid 1.5 times above 40 weeks days saved premium"
                + " lost output extra hours weekly once extra per day 1 43 1 1,290 516 0 450 0"
                + " 2,256 2,256"),
        said);
    assertTrue(said.contains("7.9 39.5 4.5 10,191 11,094 0 3,555 0 24,840 no"), said);
    assertTrue(
        said.contains("Not offered: long days 7.9 weeks; long days 7 weeks is as quick"), said);
    assertTrue(said.contains("at 60 hours a week or more the injury hazard was 23 % higher"), said);
    assertTrue(run.out().lines().allMatch(line -> line.length() <= 94), run.out());
    List<String> table = Files.readAllLines(output("ferry-berth").resolve("buildup.csv"));
    assertEquals(Files.readAllLines(KEPT.resolve("buildup.csv")), table);
    assertTrue(table.stream().anyMatch(row -> row.startsWith("H2,two shifts,1.6,0,8,6,768,0,96,")));
  }

  /** Twice the loss: a week yields 276 h; 204 h more are 0.85 weeks: 9.25 days. */
  @Test
  void aLossFactorIsToldAndScalesTheLosses() throws IOException, InterruptedException {
    aCase("hand");
    Run run = jar.run("buildup", "hand", "--loss-factor", "2", "--no-pictures");
    assertEquals(0, run.status(), run.err());
    assertTrue(
        Files.readAllLines(output("hand").resolve("buildup.csv"))
            .get(2)
            .startsWith("A,long days,1,0.85,9.25,0.75,504,24,0,480,"));
    assertTrue(run.out().contains("long days 8 %"), run.out());
    assertTrue(run.out().contains("losses times 2 (--loss-factor)"), run.out());
    assertFalse(Files.exists(output("hand").resolve("charts")));
  }

  @Test
  void theResultIsPrintedOrNothingIs() throws IOException, InterruptedException {
    aCase("hand");
    Run json = jar.run("buildup", "hand", "--json", "--out", "here");
    assertEquals(Files.readString(folder.resolve("here").resolve("result.json")), json.out());
    assertTrue(json.out().contains("\"loss_factor\" : 1"), json.out());
    assertTrue(json.out().contains("\"caution\" : \"long_week\""), json.out());
    assertTrue(json.out().contains("\"lost_output\" : 480.00"), json.out());
    assertEquals("", jar.run("buildup", "hand", "--quiet").out());
  }

  @Test
  void aResultCanBeVerifiedAsFarAsItGoes() throws IOException, InterruptedException {
    Path made = aCase("hand");
    jar.run("buildup", "hand");
    Run held = jar.run("verify", "output/hand");
    assertEquals(0, held.status(), held.err());
    assertTrue(held.out().contains("a result of buildup carries no proof"), held.out());
    Files.writeString(made.resolve("pay.csv"), "pattern,above_hours,multiplier\nlong days,40,2\n");
    Run changed = jar.run("verify", "output/hand");
    assertEquals(1, changed.status());
    assertTrue(changed.err().contains("pay.csv"), changed.err());
  }

  @Test
  void pictureFilesOfAnEarlierRunGoWhereNoneAreWanted() throws IOException, InterruptedException {
    aCase("hand");
    jar.run("buildup", "hand");
    jar.run("buildup", "hand", "--no-pictures");
    assertFalse(Files.exists(output("hand").resolve("charts").resolve("buildup.png")));
  }

  @Test
  void withoutLabourThereIsNoAnswer() throws IOException, InterruptedException {
    Run run = jar.run("buildup", RealJar.demo("starter"));
    assertEquals(1, run.status());
    assertEquals("", run.out());
    assertTrue(run.err().contains("the case has no labour.csv"), run.err());
    assertFalse(Files.exists(output("starter")));
  }

  @Test
  void wrongUsageIsTold() throws IOException, InterruptedException {
    aCase("hand");
    for (String[] wrong :
        new String[][] {
          {"no activity B", "--activity", "B"},
          {"--loss-factor wants 0 or more", "--loss-factor", "-1"},
          {"--loss-factor wants 0 or more", "--loss-factor", "101"},
          {"is not a number", "--loss-factor", "much"},
          {"Unknown option", "--by", "2027-01-01"}
        }) {
      String[] arguments =
          Stream.concat(Stream.of("buildup", "hand"), Stream.of(wrong).skip(1))
              .toArray(String[]::new);
      Run run = jar.run(arguments);
      assertEquals(2, run.status(), String.join(" ", wrong));
      assertTrue(run.err().contains(wrong[0]), run.err());
      assertEquals("", run.out());
    }
    Run milestone = jar.run("buildup", RealJar.demo("ferry-berth"), "--activity", "K3");
    assertEquals(2, milestone.status());
    assertTrue(milestone.err().contains("labour.csv has no row for K3"), milestone.err());
  }

  @Test
  void wrongInputIsToldWithItsPlaceAndNothingIsTouched() throws IOException, InterruptedException {
    Path output = Files.createDirectories(output("bad"));
    Files.writeString(output.resolve("buildup.csv"), "as it was");
    for (String[] wrong :
        new String[][] {
          {"labour.csv:2 labour_hours", "labour.csv", "activity,labour_hours,crew,rate\nA,x,6,40"},
          {"is no activity", "labour.csv", "activity,labour_hours,crew,rate\nAA,480,6,40"},
          {"missing column", "labour.csv", "activity,labour_hours,crew\nA,480,6"},
          {"nearest is labour_hours", "labour.csv", "activity,labor_hours,crew,rate\nA,480,6,40"},
          {"no pattern", "patterns.csv", "pattern,hours_per_week,days_per_week\n"},
          {
            "more than 24 hours",
            "patterns.csv",
            "pattern,hours_per_week,days_per_week\nnormal,40,5\nlong days,130,5"
          },
          {"is no pattern", "pay.csv", "pattern,above_hours,multiplier\nlongdays,40,1.5"},
          {"too small", "pay.csv", "pattern,above_hours,multiplier\nlong days,40,0"},
          {
            "below 1, such as 0.15", "output_loss.csv", "pattern,week,loss,source\nlong days,1,15,x"
          },
          {
            "week before it is missing",
            "output_loss.csv",
            "pattern,week,loss,source\nlong days,3,0.1,x"
          }
        }) {
      Path made = aCase("bad");
      Files.writeString(made.resolve(wrong[1]), wrong[2] + "\n");
      Run run = jar.run("buildup", "bad");
      assertEquals(2, run.status(), String.join(" ", wrong));
      assertTrue(run.err().contains(wrong[0]), wrong[0] + " in " + run.err());
      assertTrue(run.err().contains(wrong[1]), run.err());
      assertFalse(run.err().contains("\tat "), run.err());
      assertEquals("", run.out());
    }
    Run none = jar.run("buildup", aCase("bad").toString(), "--loss-factor", "25");
    assertEquals(2, none.status());
    assertTrue(none.err().contains("no output is left, all losses times 25"), none.err());
    assertEquals("as it was", Files.readString(output.resolve("buildup.csv")));
  }
}
