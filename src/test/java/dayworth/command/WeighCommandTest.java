package dayworth.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.command.RealJar.Run;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** {@code weigh} with the real jar. */
class WeighCommandTest {

  private static final List<String> ONE_ACTIVITY =
      List.of("id,normal_duration,normal_cost,crash_duration,crash_cost", "A,10,1000,6,1400");

  @TempDir private Path folder;
  private RealJar jar;

  @BeforeEach
  void thereIsAJar() {
    jar = new RealJar(folder);
  }

  private Path aCase(String name, String... terms) throws IOException {
    Path made = Files.createDirectories(folder.resolve(name));
    Files.write(made.resolve("activities.csv"), ONE_ACTIVITY);
    List<String> rows = new ArrayList<>(List.of("term,value"));
    rows.addAll(List.of(terms));
    Files.write(made.resolve("terms.csv"), rows);
    return made;
  }

  /**
   * Weeks: 66,000 as planned, 500 a week, damages 700 a week after 17, bonus 500 a week. 19: 9,500
   * + 1,400 = 10,900. 16: 1,300 + 8,000 - 500 = 8,800. Outside this program: 74,800 at 16 in all.
   */
  @Test
  void theStartersChoicesAreWeighed() throws IOException, InterruptedException {
    Run run = jar.run("weigh", RealJar.demo("starter"));
    assertEquals(0, run.status(), run.err());
    assertTrue(
        run.out()
            .startsWith("Finish in 16 weeks: 2,100 better than carrying on and paying damages."),
        run.out());
    Path output = folder.resolve("output").resolve("starter");
    List<String> rows = Files.readAllLines(output.resolve("weigh.csv"));
    assertEquals(
        "extension,choice,duration,finish_date,late,late_calendar_days,direct_cost,"
            + "extra_direct_cost,running_cost,running_cost_saved,time_related_cost,"
            + "time_related_cost_saved,fixed_cost,damages,bonus,total_cost,"
            + "saved_against_as_it_stands,loss_factor",
        rows.get(0));
    assertEquals(
        "without,as_it_stands,19,,2,,66000.00,0.00,0.00,0.00,9500.00,0.00,0.00,1400.00,0.00,"
            + "76900.00,0.00,",
        rows.get(1));
    assertEquals(
        "without,least_total,16,,-1,,67300.00,1300.00,0.00,0.00,8000.00,1500.00,0.00,0.00,500.00,"
            + "74800.00,2100.00,",
        rows.get(2));
    Run json = jar.run("weigh", RealJar.demo("starter"), "--json");
    assertEquals(Files.readString(output.resolve("result.json")), json.out());
  }

  /**
   * From Monday 7 September, ten days to Friday 18; due Wednesday 16; 90 a calendar day, 100 a day
   * for shortening. Friday is 2 late: 180; Thursday 100 + 90 = 190; Wednesday 200. Two days of
   * extension lead to Friday: nothing is late.
   */
  @Test
  void aClaimedExtensionIsShownBeside() throws IOException, InterruptedException {
    Path dated =
        aCase(
            "dated",
            "start_date,2026-09-07",
            "contract_finish,2026-09-16",
            "damages_rate,90",
            "damages_per,calendar_day",
            "extension,2");
    Run run = jar.run("weigh", dated.toString());
    assertEquals(0, run.status(), run.err());
    assertTrue(run.out().startsWith("Carry on as planned: no other finish is cheaper."), run.out());
    String said = run.out().replaceAll("\\s+", " ");
    assertTrue(said.contains("damages 180 0 0 total 180 200 400"), said);
    assertTrue(said.contains("Were the extension to Fri 18 Sep 2026 granted"), said);
    assertTrue(said.contains("up to 100 Fri 18 Sep 10 days the case says 90"), said);
    assertTrue(said.contains("not legal advice"), said);
    assertTrue(run.out().lines().allMatch(line -> line.length() <= 94), run.out());
    List<String> rows =
        Files.readAllLines(folder.resolve("output").resolve("dated").resolve("weigh.csv"));
    assertTrue(
        rows.stream().anyMatch(row -> row.startsWith("with,as_it_stands,10,2026-09-18,0,0,")));
  }

  @Test
  void wrongInputIsToldWithItsPlaceAndNothingIsTouched() throws IOException, InterruptedException {
    Path output = Files.createDirectories(folder.resolve("output").resolve("bad"));
    Files.writeString(output.resolve("weigh.csv"), "as it was");
    for (String[] wrong :
        new String[][] {
          {"means nothing without contract_finish", "extension,5"},
          {"not a whole number of working days", "contract_finish,8", "extension,0"},
          {"not a whole number of working days", "contract_finish,8", "extension,2.5"},
          {"negative", "contract_finish,8", "extension,-3"},
          {"not a number", "contract_finish,8", "extension,soon"},
          {"a date needs a start_date", "contract_finish,8", "extension,2026-10-01"},
          {
            "not after the contract finish",
            "start_date,2026-09-07",
            "contract_finish,2026-09-16",
            "extension,2026-09-16"
          },
          {"nearest is extension", "contract_finish,8", "extention,5"},
          {"calendar_day needs dates", "contract_finish,8", "damages_per,calendar_day"},
          {"a second row of this term", "contract_finish,8", "extension,5", "extension,6"}
        }) {
      aCase("bad", List.of(wrong).subList(1, wrong.length).toArray(String[]::new));
      Run run = jar.run("weigh", "bad");
      assertEquals(2, run.status(), String.join(" ", wrong));
      assertTrue(run.err().contains(wrong[0]), wrong[0] + " in " + run.err());
      assertTrue(run.err().contains("terms.csv:"), run.err());
      assertFalse(run.err().contains("\tat "), run.err());
      assertEquals("", run.out());
    }
    assertEquals("as it was", Files.readString(output.resolve("weigh.csv")));
    assertEquals(2, jar.run("weigh").status());
    assertEquals(2, jar.run("weigh", "bad", "--by", "2026-10-01").status());
  }
}
