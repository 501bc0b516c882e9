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

/**
 * {@code --loss-factor} with the real jar, wherever labour is used.
 *
 * <p>By hand: 480 h by 6 at 40 h a week and 40 an hour are 10 days. At F times a loss of 4 % a week
 * of 50 h yields 300 - 12 F hours, and all takes 8.75 + 0.25 F days: 9 at 1, 8.875 at 0.5. It costs
 * 1,200 premium + 480 F + 450 more: 2,130 at 1, 1,890 at 0.5. A day costs 2,000: at 0.5 it pays,
 * 2,250 - 1,890 = 360; it does while F < 850 / 980 = 0.867.
 */
class LossFactorTest {

  private static final String SAID = "All losses of output here are the case's losses times 0.5";

  @TempDir private Path folder;
  private RealJar jar;

  @BeforeEach
  void thereIsACase() throws IOException {
    jar = new RealJar(folder);
    put("activities.csv", "id,normal_duration,normal_cost\nA,,\n");
    put("labour.csv", "activity,labour_hours,crew,rate,other_cost\nA,480,6,40,1000\n");
    put(
        "patterns.csv",
        """
        pattern,hours_per_week,days_per_week,week_cost,weeks_max
        normal,40,5,,
        long days,50,5,450,1
        """);
    put("pay.csv", "pattern,above_hours,multiplier\nlong days,40,1.5\n");
    put("output_loss.csv", "pattern,week,loss,source\nlong days,1,0.04,site diary\n");
    put("terms.csv", "term,value\ntime_related_cost,2000\n");
  }

  private void put(String name, String text) throws IOException {
    Files.writeString(Files.createDirectories(folder.resolve("hand")).resolve(name), text);
  }

  private Path output() {
    return folder.resolve("output").resolve("hand");
  }

  private String result() throws IOException {
    return Files.readString(output().resolve("result.json"));
  }

  private static String words(Run run) {
    return run.out().replaceAll("\\s+", " ");
  }

  @Test
  void everyAnswerNamesTheFactorAndEveryResultTheSources()
      throws IOException, InterruptedException {
    String head =
        "\"loss_factor\" : 0.5, \"loss_sources\" : [ { \"pattern\" : \"long days\", \"sources\" : ["
            + " \"site diary\" ] } ]";
    for (String[] asked :
        new String[][] {
          {"check"},
          {"curve", "--no-pictures"},
          {"meet", "--in", "9", "--no-pictures"},
          {"weigh"},
          {"buildup", "--no-pictures"}
        }) {
      String[] arguments =
          Stream.concat(
                  Stream.of(asked[0], "hand", "--loss-factor", "0.5"), Stream.of(asked).skip(1))
              .toArray(String[]::new);
      Run run = jar.run(arguments);
      assertEquals(0, run.status(), asked[0] + run.err());
      assertTrue(words(run).contains(SAID), run.out());
      assertTrue(run.out().lines().allMatch(line -> line.length() <= 94), run.out());
      if (!asked[0].equals("check")) {
        assertTrue(result().replaceAll("\\s+", " ").contains(head), asked[0]);
      }
    }
    assertTrue(words(jar.run("check", "hand", "--loss-factor", "0.5", "--json")).contains(head));
    assertFalse(jar.run("check", "hand").out().contains("--loss-factor"));
    assertTrue(jar.run("check", "hand", "--json").out().contains("\"loss_factor\" : 1,"));
    assertFalse(
        jar.run("check", RealJar.demo("starter"), "--json").out().contains("\"loss_factor\""));
  }

  @Test
  void theCurveRestsOnTheFactor() throws IOException, InterruptedException {
    Run run = jar.run("curve", "hand", "--loss-factor", "0.5", "--no-pictures");
    assertTrue(
        run.out().startsWith("Least total: finish in 8.875 working days, 360 better"), run.out());
    String said = words(run);
    assertTrue(
        said.contains(
            "extra premium lost output extra hours weekly once A long days 1 week 1,890 1,200 240 0"
                + " 450 0"),
        said);
    assertTrue(said.contains("Output lost: long days 2 %. Source: site diary."), said);
  }

  @Test
  void aResultIsVerifiedAtItsFactor() throws IOException, InterruptedException {
    for (String[] asked : new String[][] {{"curve"}, {"meet", "--in", "9"}}) {
      jar.run(
          Stream.concat(
                  Stream.of(asked[0], "hand", "--loss-factor", "0.5", "--no-pictures"),
                  Stream.of(asked).skip(1))
              .toArray(String[]::new));
      Run held = jar.run("verify", "output/hand");
      assertEquals(0, held.status(), held.err());
      String honest = result();
      for (String other : List.of("0.4", "0.500001")) {
        Files.writeString(
            output().resolve("result.json"),
            honest.replace("\"loss_factor\" : 0.5", "\"loss_factor\" : " + other));
        assertEquals(1, jar.run("verify", "output/hand").status(), other);
      }
      Files.writeString(
          output().resolve("result.json"),
          honest.replace("\"loss_factor\" : 0.5", "\"loss_factor\" : -1"));
      Run refused = jar.run("verify", "output/hand");
      assertEquals(2, refused.status());
      assertTrue(refused.err().contains("loss_factor: found -1; right is 0 to 100"), refused.err());
    }
  }

  @Test
  void whatASpellCostsIsExplained() throws IOException, InterruptedException {
    Run run = jar.run("meet", "hand", "--in", "9", "--no-pictures");
    String said = words(run);
    assertTrue(
        said.contains(
            "A, long days 1 week: 2,130 more than at the normal pattern = 1,200 premium pay + 480"
                + " lost output + 450 supervision by the week. 492 hours are worked for 480 hours"
                + " of output; loss of output 4 %, source: site diary."),
        said);
    assertTrue(said.contains("Caution, long days: 50 hours a week are more than 48"), said);
    assertTrue(said.contains("the competent person decide"), said);
    assertTrue(
        result()
            .replaceAll("\\s+", " ")
            .contains(
                "\"built_up\" : { \"premium\" : 1200.00, \"lost_output\" : 480.00,"
                    + " \"extra_hours\" : 0.00, \"supervision\" : 450.00, \"once_cost\" : 0.00,"
                    + " \"extra_cost\" : 2130.00, \"loss_sources\" : [ \"site diary\" ] }"),
        result());
    String asPlanned = words(jar.run("meet", "hand", "--in", "10", "--no-pictures"));
    assertFalse(asPlanned.contains("Caution"), asPlanned);
  }

  @Test
  void weighTellsWhereTheBestFinishChanges() throws IOException, InterruptedException {
    Run run = jar.run("weigh", "hand");
    assertEquals(0, run.status(), run.err());
    String said = words(run);
    assertTrue(
        said.contains(
            "0 to 0.86 8.75 to 8.965 days 850.00 to 7.20 better than carrying on > 0.87 to 2 10"
                + " days no better than carrying on; this answer: 1"),
        said);
    assertTrue(said.contains("at 11 factors from 0 to 2"), said);
    assertTrue(said.contains("narrowed down by halving to 0.01"), said);
    assertTrue(said.contains("would be missed"), said);
    assertTrue(said.contains("Output lost: long days 4 %. Source: site diary."), said);
    assertTrue(run.out().lines().allMatch(line -> line.length() <= 94), run.out());
    List<String> rows = Files.readAllLines(output().resolve("weigh.csv"));
    assertTrue(
        rows.contains(
            "without,least_total_by_loss_factor,8.965,,,,22262.80,2062.80,0.00,0.00,17930.00,"
                + "2070.00,0.00,0.00,0.00,40192.80,7.20,0.86"),
        rows.toString());
    assertTrue(
        result()
            .replaceAll("\\s+", " ")
            .contains(
                "\"ranges\" : [ { \"from\" : 0, \"to\" : 0.86, \"duration\" : 8.75 }, { \"from\" :"
                    + " 0.87, \"to\" : 2, \"duration\" : 10 } ]"),
        result());
    assertEquals(0, jar.run("verify", "output/hand").status());
  }

  @Test
  void wrongUsageIsToldAndNothingIsTouched() throws IOException, InterruptedException {
    Files.writeString(Files.createDirectories(output()).resolve("weigh.csv"), "as it was");
    for (String[] wrong :
        new String[][] {
          {"--loss-factor wants 0 or more, at most 100", "hand", "-0.1", "check"},
          {"--loss-factor wants 0 or more, at most 100", "hand", "100.5", "curve"},
          {"--loss-factor wants at most 6 decimals", "hand", "0.1234567", "weigh"},
          {"is not a number", "hand", "half", "meet"},
          {"no output is left, all losses times 25", "hand", "25", "weigh"},
          {"this one has no labour", RealJar.demo("starter"), "2", "weigh"}
        }) {
      Run run = jar.run(wrong[3], wrong[1], "--loss-factor", wrong[2]);
      assertEquals(2, run.status(), wrong[3] + " " + wrong[2]);
      assertTrue(run.err().contains(wrong[0]), run.err());
      assertFalse(run.err().contains("\tat "), run.err());
      assertEquals("", run.out());
    }
    assertEquals("as it was", Files.readString(output().resolve("weigh.csv")));
  }
}
