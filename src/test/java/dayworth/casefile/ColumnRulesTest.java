package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Headers: which columns there must be, may be and may not be. */
class ColumnRulesTest {

  private static final String ACTIVITY_COLUMNS =
      "one of id, name, group, normal_duration, normal_cost, crash_duration, crash_cost,"
          + " divisible, predecessors, not_before";

  @TempDir private Path folder;

  private void expect(String activities, String... problems) throws IOException {
    CaseOnDisk disk = new CaseOnDisk(folder).with("activities.csv", activities);
    assertEquals(List.of(problems), disk.problems());
  }

  @Test
  void columnsStandInAnyOrder() throws IOException {
    expect("normal_cost,id,normal_duration\n100,A,5\n");
    assertEquals(5, new CaseOnDisk(folder).sound().network().activity(0).normal());
  }

  @Test
  void anUnknownColumnIsAProblem() throws IOException {
    expect(
        "id,normal_duration,normal_cost,supervisor\nA,5,100,Kim\n",
        "activities.csv:1 supervisor | no such column | supervisor | " + ACTIVITY_COLUMNS);
  }

  @Test
  void aMisspeltColumnIsNamedOnceWithTheNearest() throws IOException {
    expect(
        "id,normal_duration,normal_costs\nA,5,100\nB,5,100\n",
        "activities.csv:1 normal_costs | no such column | normal_costs"
            + " | nearest is normal_cost");
  }

  @Test
  void aMisspeltIdColumnDoesNotMakeEveryPredecessorUnknown() throws IOException {
    new CaseOnDisk(folder).with("links.csv", "predecessor,successor,relation\nA,B,FX\n");
    expect(
        "ID,normal_duration,normal_cost,predecessors\nA,5,100,\nB,5,100,A\n",
        "activities.csv:1 ID | no such column | ID | nearest is id",
        "links.csv:2 relation | no such relation | FX | one of FS, SS, FF, SF");
  }

  @Test
  void aMisspeltCrashColumnDoesNotMakeEveryRowIncomplete() throws IOException {
    expect(
        "id,normal_duration,normal_cost,crash_duration,crash_csot\nA,5,100,3,120\n",
        "activities.csv:1 crash_csot | no such column | crash_csot | nearest is crash_cost");
  }

  @Test
  void aMissingColumnIsAProblemOfTheHeader() throws IOException {
    expect(
        "id,name\nA,Dig\n",
        "activities.csv:1 normal_cost | missing column |  | the file needs it",
        "activities.csv:1 normal_duration | missing column |  | the file needs it");
  }

  @Test
  void oneCrashColumnNeedsTheOther() throws IOException {
    expect(
        "id,normal_duration,normal_cost,crash_duration\nA,5,100,3\nB,5,100,4\n",
        "activities.csv:1 crash_cost | missing column |  | it is needed beside crash_duration");
    expect(
        "id,normal_duration,normal_cost,crash_cost\nA,5,100,130\n",
        "activities.csv:1 crash_duration | missing column |  | it is needed beside crash_cost");
    expect("id,normal_duration,normal_cost,crash_cost\nA,5,100,\n");
  }

  @Test
  void aColumnStandsOnce() throws IOException {
    expect(
        "id,normal_duration,normal_cost,id\nA,5,100,B\n",
        "activities.csv:1 id | a second column of this name | id | take one out");
  }

  @Test
  void aColumnHasAName() throws IOException {
    expect(
        "id,normal_duration,normal_cost,\nA,5,100,\n",
        "activities.csv:1 | a column without a name | " + " | a name, or no cell 4 in every row");
  }

  @Test
  void aRowHasAsManyCellsAsTheHeader() throws IOException {
    expect(
        "id,normal_duration,normal_cost,predecessors\nA,5\nB,5,1,200,A\nC,5,100,A;B\nD\n",
        "activities.csv:2 | too few cells | 2 cells | 4, as in the header",
        "activities.csv:3 | too many cells | 5 cells | 4, as in the header",
        "activities.csv:5 | too few cells | 1 cell | 4, as in the header");
  }
}
