package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.contract.Per;
import dayworth.contract.RunningCost;
import dayworth.network.Moment;
import dayworth.value.Money;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Each rule for running.csv. */
class RunningRulesTest {

  private static final String HEADER = "name,from_activity,to_activity,rate,per\n";
  private static final String DATED = "start_date,2027-03-01\n";

  @TempDir private Path folder;

  /** W1 before W2 and W3 beside them, then W4, 5 days each; rows of terms and of running costs. */
  private CaseOnDisk disk(String terms, String running) throws IOException {
    return new CaseOnDisk(folder)
        .with(
            "activities.csv",
            """
            id,normal_duration,normal_cost,predecessors
            W1,5,100,
            W2,5,100,W1
            W3,5,100,
            W4,5,100,W2;W3
            """)
        .with("terms.csv", "term,value\ncurrency,EUR\n" + terms)
        .with("running.csv", HEADER + running);
  }

  private void expect(String terms, String running, String... problems) throws IOException {
    assertEquals(List.of(problems), disk(terms, running).problems());
  }

  @Test
  void itRunsFromAStartToAFinishPerUnitIfNothingIsSaid() throws IOException {
    assertEquals(
        List.of(
            new RunningCost("Crane", Moment.startOf(0), Moment.finishOf(1), Money.of(7), Per.UNIT),
            new RunningCost("Mast", Moment.startOf(1), Moment.finishOf(1), Money.of(9), Per.WEEK)),
        disk(DATED, "Crane,W1,W2,7,\nMast,W2,W2,9,week\n").sound().momentMoney().running());
  }

  @Test
  void anUnknownActivityIsNamedWithTheNearest() throws IOException {
    expect(
        "",
        "Crane,W11,crane,7,\n",
        "running.csv:2 from_activity | W11 is no activity | W11 | nearest is W1",
        "running.csv:2 to_activity | crane is no activity | crane | an id of activities.csv");
  }

  @Test
  void aNameStandsOnce() throws IOException {
    expect(
        "",
        "Crane,W1,W2,7,\nCrane,W2,W2,7,\n",
        "running.csv:3 name | a second cost of this name | Crane | line 2 has it");
  }

  @Test
  void allButPerIsNeeded() throws IOException {
    expect(
        "",
        ",W1,W2,7,\nMast,,W2,7,\nPump,W1,,7,\nShed,W1,W2,,\n",
        "running.csv:2 name | blank |  | this cell is needed",
        "running.csv:3 from_activity | blank |  | this cell is needed",
        "running.csv:4 to_activity | blank |  | this cell is needed",
        "running.csv:5 rate | blank |  | this cell is needed");
  }

  @Test
  void moneyByTheDateNeedsDates() throws IOException {
    expect(
        "",
        "Crane,W1,W2,7,week\n",
        "running.csv:2 per | week needs dates | week"
            + " | a row for start_date in terms.csv, or unit");
  }

  @Test
  void aRateIsMoney() throws IOException {
    expect(
        "",
        "Crane,W1,W2,-7,\nMast,W1,W2,0.00001,\nPump,W1,W2,1e3,month\n",
        "running.csv:2 rate | negative | -7 | 0 or more",
        "running.csv:3 rate | too many decimals | 0.00001 | money has at most 4 decimals",
        "running.csv:4 per | no such word | month | one of unit, calendar_day, week",
        "running.csv:4 rate | not a number | 1e3 | write 1000");
  }

  @Test
  void aRateOfZeroChangesNothing() throws IOException {
    CaseOnDisk disk = disk("", "Crane,W1,W2,0,\n");
    assertEquals(
        List.of("running.csv:2 rate | changes nothing | 0 | more than 0"), disk.warnings());
    assertEquals(List.of(), disk.sound().momentMoney().running());
  }

  @Test
  void aCostMayEndBeforeItBeginsButThatIsDoubtful() throws IOException {
    String right = " | a link, unless the cost may end before it begins; it is then nothing";
    assertEquals(
        List.of(
            "running.csv:3 to_activity | no chain leads from W2 to W1 | " + right,
            "running.csv:4 to_activity | no chain leads from W1 to W3 | " + right),
        disk("", "Crane,W1,W2,7,\nMast,W2,W1,7,\nPump,W1,W3,7,\n").warnings());
  }

  @Test
  void hireDuringOneActivityIsFine() throws IOException {
    assertEquals(List.of(), disk("", "Crane,W1,W1,7,\n").warnings());
  }

  /** W1 started: both costs run from the data date; no chain need lead anywhere any more. */
  @Test
  void aCostThatHasBegunRunsFromTheDataDate() throws IOException {
    CaseOnDisk disk =
        disk(DATED + "data_date,2027-03-03\n", "Crane,W1,W2,7,\nPump,W1,W3,7,\n")
            .with("progress.csv", "activity,started,remaining_duration\nW1,2027-03-01,2\n");
    assertEquals(List.of(), disk.warnings());
    assertEquals(
        List.of(
            new RunningCost(
                "Crane", Moment.PROJECT_START, Moment.finishOf(1), Money.of(7), Per.UNIT),
            new RunningCost(
                "Pump", Moment.PROJECT_START, Moment.finishOf(2), Money.of(7), Per.UNIT)),
        disk.sound().momentMoney().running());
  }

  @Test
  void aCostThatIsOverIsNoCostToGo() throws IOException {
    CaseOnDisk disk =
        disk(DATED + "data_date,2027-03-08\n", "Crane,W1,W1,7,\nPump,W2,W1,7,\n")
            .with("progress.csv", "activity,started,finished\nW1,2027-03-01,2027-03-05\n");
    assertEquals(List.of(), disk.sound().momentMoney().running());
  }

  /** A span of 10^12 a unit beside slopes of ten-thousandths over 250,000 units has no scale. */
  @Test
  void ratesThatCannotBeExactAreRefused() throws IOException {
    for (String per : List.of("unit", "calendar_day", "week")) {
      disk(DATED, "Crane,W1,W1,1000000000000," + per + "\n")
          .with(
              "activities.csv",
              """
                id,normal_duration,normal_cost,crash_duration,crash_cost
                W1,250000.001,0,1,0.07
                """);
      assertEquals(
          List.of(
              "running.csv | the costs are too far apart to be exact | "
                  + " | smaller or rounder rates and costs"),
          new CaseOnDisk(folder).problems(),
          per);
    }
  }
}
