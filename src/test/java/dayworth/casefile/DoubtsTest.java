package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Each warning where it holds, and none where it does not; all sums by hand. */
class DoubtsTest {

  private static final String HEADER =
      "id,normal_duration,normal_cost,crash_duration,crash_cost,predecessors,not_before\n";
  private static final String LINKS = "predecessor,successor,relation,lag\n";

  @TempDir private Path folder;

  private CaseOnDisk activities(String rows) throws IOException {
    return new CaseOnDisk(folder).with("activities.csv", HEADER + rows);
  }

  private void expect(String rows, String... warnings) throws IOException {
    assertEquals(List.of(warnings), activities(rows).warnings());
  }

  @Test
  void aCrashCostBelowTheNormalCost() throws IOException {
    expect(
        "A,5,100,3,90.5,,\nB,5,100,3,100,A,\n",
        "activities.csv:2 crash_cost | below the normal cost | 90.50"
            + " | the curve starts from the cheaper way");
  }

  @Test
  void anActivityThatNothingWaitsForBesidesTheLast() throws IOException {
    expect(
        "A,5,100,,,,\nB,4,100,,,A,\nC,5,100,,,A,\n",
        "activities.csv:3 id | no successor | B"
            + " | a link to what waits for it, unless only the project's finish does");
  }

  @Test
  void aLinkThatAChainImplies() throws IOException {
    expect(
        "A,5,100,,,,\nB,4,100,,,A,\nC,5,100,,,A;B,\n",
        "activities.csv:4 predecessors | implied by other links | A before C"
            + " | it can go: the chain A, B, C says as much");
  }

  /** B takes at least 2 of its 4, so the chain A, B, C with a lag of 3 is 5 long. */
  @Test
  void aLagIsMeasuredAgainstTheShortestChain() throws IOException {
    String rows = "A,5,100,,,,\nB,4,100,2,120,A,\nC,5,100,,,,\n";
    String chain = "B,C,FS,3\n";
    assertEquals(
        List.of(
            "links.csv:3 | implied by other links | A before C"
                + " | it can go: the chain A, B, C says as much"),
        activities(rows).with("links.csv", LINKS + chain + "A,C,FS,5\n").warnings());
    assertEquals(
        List.of(), activities(rows).with("links.csv", LINKS + chain + "A,C,FS,5.001\n").warnings());
  }

  @Test
  void otherRelationsAndNegativeLagsImplyNothing() throws IOException {
    String rows = "A,5,100,,,,\nB,4,100,,,,\nC,5,100,,,A,\n";
    for (String chain :
        List.of("A,B,SS,9\nB,C,FS,0\n", "A,B,FS,0\nB,C,FF,9\n", "A,B,FS,-1\nB,C,FS,0\n")) {
      assertEquals(List.of(), activities(rows).with("links.csv", LINKS + chain).warnings(), chain);
    }
  }

  @Test
  void aWeakerLinkOfTheSameKind() throws IOException {
    assertEquals(
        List.of(
            "activities.csv:3 predecessors | implied by another link | A before B"
                + " | it can go: the same link with lag 2 says more",
            "links.csv:3 | implied by another link | A before B"
                + " | it can go: the same link with lag 4 says more"),
        activities("A,5,100,,,,\nB,4,100,,,A,\n")
            .with("links.csv", LINKS + "A,B,FS,2\nA,B,SS,3\nA,B,SS,4\n")
            .warnings());
  }

  @Test
  void aLongChainIsNamedByItsEnds() throws IOException {
    expect(
        "A,1,1,,,,\nB,1,1,,,A,\nC,1,1,,,B,\nD,1,1,,,C,\nE,1,1,,,D,\nF,1,1,,,E,\nG,1,1,,,A;F,\n",
        "activities.csv:8 predecessors | implied by other links | A before G"
            + " | it can go: the chain A, B, and 3 more to F, G says as much");
  }

  /** Planned: B from 10 to 15. Shortest: A to 3, B still from 10 to 15. Without: 3 + 5 = 8. */
  @Test
  void aNotBeforeThatMakesCompressionWorthless() throws IOException {
    expect(
        "A,5,100,3,120,,\nB,5,100,,,A,10\n",
        "activities.csv:3 not_before | compression gains nothing | 10"
            + " | with it no finish is shorter than 15, as planned; without it 8; the chain: B");
  }

  @Test
  void aNotBeforeThatLeavesSomethingToGainIsNotDoubtful() throws IOException {
    // B can be compressed: 10 + 4 = 14 is shorter than the planned 15
    expect("A,5,100,3,120,,\nB,5,100,4,120,A,10\n");
    // A is planned to end at 5, after B's 4: the planned 10 can become 4 + 5 = 9
    expect("A,5,100,3,120,,\nB,5,100,,,A,4\n");
    // nothing can be compressed
    expect("A,5,100,,,,\nB,5,100,,,A,10\n");
    // C takes 15 whatever B does
    expect("A,5,100,3,120,,\nB,5,100,,,A,10\nC,15,100,,,,\nD,0,0,,,B;C,\n");
  }

  /**
   * From Monday 7 September: B waits for Monday 21 (day 10) and takes 5 days to Friday 25; without
   * it A takes 3 days at least and B 5 more: Wednesday 16.
   */
  @Test
  void aDateThatMakesCompressionWorthlessIsToldInDates() throws IOException {
    CaseOnDisk disk =
        activities("A,5,100,3,120,,\nB,5,100,,,A,2026-09-19\nC,0,0,,,B,\n")
            .with("terms.csv", "term,value\nstart_date,2026-09-07\n");
    assertEquals(
        List.of(
            "activities.csv:3 not_before | compression gains nothing | Sat 2026-09-19"
                + " | with it no finish is before Fri 2026-09-25, as planned; without it"
                + " Wed 2026-09-16; the chain: B"),
        disk.warnings());
  }

  @Test
  void aStartDateOnARestDayOrAHoliday() throws IOException {
    CaseOnDisk disk = activities("A,5,100,,,,\n");
    // 1 May 2027 is a Saturday, the Monday after it 3 May
    assertEquals(
        List.of(
            "terms.csv:2 start_date | a rest day | Sat 2027-05-01"
                + " | work begins on Mon 2027-05-03"),
        disk.with("terms.csv", "term,value\nstart_date,2027-05-01\n").warnings());
    assertEquals(
        List.of(),
        disk.with("terms.csv", "term,value\nstart_date,2027-05-01\nworking_days,Fri Sat\n")
            .warnings());
    assertEquals(
        List.of(), disk.with("terms.csv", "term,value\nstart_date,2027-05-03\n").warnings());
    assertEquals(
        List.of(
            "terms.csv:2 start_date | a holiday | Mon 2027-05-03"
                + " | work begins on Tue 2027-05-04"),
        disk.with("holidays.csv", "date,name\n2027-05-03,Bank holiday\n").warnings());
  }

  @Test
  void termsThatChangeNothingBesideTheOthers() throws IOException {
    CaseOnDisk disk = activities("A,5,100,,,,\n");
    assertEquals(
        List.of(
            "terms.csv:3 units_per_working_day | changes nothing | "
                + " | a week is 5 working days"),
        disk.with("terms.csv", "term,value\ntime_unit,week\nunits_per_working_day,0.2\n")
            .warnings());
    assertEquals(
        List.of(
            "terms.csv:2 units_per_working_day | changes nothing | "
                + " | a day is one working day; time_unit hour or shift uses it",
            "terms.csv:3 damages_part_week | changes nothing |  | it is for damages_per week"),
        disk.with("terms.csv", "term,value\nunits_per_working_day,8\ndamages_part_week,whole\n")
            .warnings());
    assertEquals(
        List.of("holidays.csv | changes nothing |  | a row for start_date in terms.csv"),
        disk.with("terms.csv", "term,value\nunits_per_working_day,1\n")
            .with("holidays.csv", "date\n2027-05-03\n")
            .warnings());
  }

  /**
   * What the makers of the demo cases put into them on purpose. V1, S7, K4 implies V1 before K4
   * too; the longest such chain is named: C3, K2 and K3 take at least 16 + 36 + 14 hours, S7 takes
   * 12.
   */
  @Test
  void theDemoCasesAreDoubtfulOnlyWhereTheyAreMeantToBe() {
    assertEquals(List.of(), new CaseOnDisk(Path.of("cases", "starter")).warnings());
    assertEquals(
        List.of(
            "activities.csv:28 id | no successor | M9"
                + " | a link to what waits for it, unless only the project's finish does",
            "activities.csv:40 predecessors | implied by other links | F6 before I2"
                + " | it can go: the chain F6, I1, I2 says as much"),
        new CaseOnDisk(Path.of("cases", "ferry-berth-core")).warnings());
    assertEquals(
        List.of(
            "activities.csv:71 predecessors | implied by other links | V1 before K4"
                + " | it can go: the chain V1, C3, K2, K3, K4 says as much"),
        new CaseOnDisk(Path.of("cases", "outage")).warnings());
  }
}
