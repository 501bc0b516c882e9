package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.network.Measure;
import dayworth.network.MeasurePackage;
import dayworth.network.Measures;
import dayworth.network.Network;
import dayworth.value.Money;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Each rule for measures.csv and packages.csv. */
class MeasureRulesTest {

  private static final String HEADER = "activity,measure,duration,cost,package,note,remaining\n";

  @TempDir private Path folder;

  /** W1 before W2, 5 days each; W2 can be done in 3 for 160. */
  private CaseOnDisk disk(String measures, String packages) throws IOException {
    return new CaseOnDisk(folder)
        .with(
            "activities.csv",
            """
            id,normal_duration,normal_cost,crash_duration,crash_cost,predecessors
            W1,5,100,,,
            W2,5,100,3,160,W1
            """)
        .with("measures.csv", HEADER + measures)
        .with("packages.csv", "package,cost\n" + packages);
  }

  private void expect(String measures, String packages, String... problems) throws IOException {
    assertEquals(List.of(problems), disk(measures, packages).problems());
  }

  @Test
  void aMeasureHasADurationACostAndPerhapsAPackage() throws IOException {
    Network network =
        disk("W1,Second crew,3.5,140,,,\nW1,Nights,2,150.5,NIGHT,two crews,yes\n", "NIGHT,40\n")
            .sound()
            .network();
    assertEquals(
        new Measures(
            List.of(
                new Measure(0, "Second crew", 35, Money.of(140), OptionalInt.empty(), false, ""),
                new Measure(
                    0,
                    "Nights",
                    20,
                    Money.of(301).dividedBy(2),
                    OptionalInt.of(0),
                    true,
                    "two crews")),
            List.of(new MeasurePackage("NIGHT", Money.of(40)))),
        network.measures());
  }

  @Test
  void anActivityThatIsNotDivisibleHasNothingBetween() throws IOException {
    Network network =
        new CaseOnDisk(folder)
            .with(
                "activities.csv",
                """
                id,normal_duration,normal_cost,crash_duration,crash_cost,divisible
                A,5,100,3,160,no
                B,5,100,3,160,yes
                """)
            .sound()
            .network();
    assertFalse(network.activity(0).divisible());
    assertTrue(network.activity(1).divisible());
    assertTrue(network.hasChoices());
  }

  @Test
  void whatIsMissingOrUnknownIsNamed() throws IOException {
    expect(
        "W3,Crew,3,140,,,\n,Crew,3,140,,,\nW1,,3,140,,,\nW1,Crew,,,,,maybe\n",
        "",
        "measures.csv:2 activity | W3 is no activity | W3 | nearest is W1",
        "measures.csv:3 activity | blank |  | this cell is needed",
        "measures.csv:4 measure | blank |  | this cell is needed",
        "measures.csv:5 cost | blank |  | this cell is needed",
        "measures.csv:5 duration | blank |  | this cell is needed",
        "measures.csv:5 remaining | no such choice | maybe | one of yes, no");
  }

  @Test
  void numbersAreInRange() throws IOException {
    expect(
        "W1,Crew,-1,140,,,\nW1,Gang,1.2345,x,,,\n",
        "N,-1\n",
        "measures.csv:2 duration | negative | -1 | 0 or more",
        "measures.csv:3 cost | not a number | x | digits only, with a point before decimals",
        "measures.csv:3 duration | too many decimals | 1.2345 | a time has at most 3 decimals",
        "packages.csv:2 cost | negative | -1 | 0 or more");
  }

  @Test
  void namesAreUniqueWithinAnActivity() throws IOException {
    expect(
        "W1,Crew,3,140,,,\nW2,Crew,3,140,,,\nW1,Crew,2,150,,,\n",
        "N,1\nN,2\n",
        "measures.csv:4 measure | a second measure of this name for the activity | Crew"
            + " | another name; line 2 has it",
        "packages.csv:3 package | a second package of this name | N | line 2 has it");
  }

  @Test
  void aPackageMustBeListed() throws IOException {
    expect(
        "W1,Nights,3,140,NIGHTS,,\n",
        "NIGHT,40\n",
        "measures.csv:2 package | NIGHTS is no package | NIGHTS | nearest is NIGHT");
  }

  @Test
  void aPackageThatNoMeasureIsInIsAWarning() throws IOException {
    assertEquals(
        List.of("packages.csv:2 package | no measure is in it | NIGHT | it changes nothing"),
        disk("W1,Crew,3,140,,,\n", "NIGHT,40\n").warnings());
  }

  /** The line of W2 takes 4 days for 130. */
  @Test
  void aDominatedMeasureIsLeftOutAndNamed() throws IOException {
    assertEquals(
        List.of(
            "measures.csv:3 measure | is left out of the choice | Slow"
                + " | Crew, 3 for 140, is no longer and no dearer",
            "measures.csv:4 measure | is left out of the choice | Half"
                + " | the activity without a measure, 4 for 130, is no longer and no dearer"),
        disk("W1,Crew,3,140,,,\nW1,Slow,4,150,,,\nW2,Half,4,131,,,\n", "").warnings());
  }

  @Test
  void aMeasureOfStartedWorkMustBeOfWhatRemains() throws IOException {
    CaseOnDisk disk =
        disk("W1,Crew,2,70,,,\nW1,Gang,1,80,,,yes\n", "")
            .with("terms.csv", "term,value\nstart_date,2027-03-01\ndata_date,2027-03-02\n")
            .with(
                "progress.csv", "activity,started,finished,remaining_duration\nW1,2027-03-01,,3\n");
    assertEquals(
        List.of(
            "measures.csv:2 remaining | the activity has started | Crew"
                + " | yes, if duration and cost are of the work to go; else it changes nothing"),
        disk.warnings());
    assertEquals(
        List.of("Gang"),
        disk.sound().network().measures().list().stream().map(Measure::name).toList());
  }
}
