package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Each rule for a row of activities.csv; places are counted by hand. */
class ActivityRulesTest {

  private static final String HEADER =
      "id,name,normal_duration,normal_cost,crash_duration,crash_cost,divisible,not_before\n";

  @TempDir private Path folder;

  private void expect(String rows, String... problems) throws IOException {
    CaseOnDisk disk = new CaseOnDisk(folder).with("activities.csv", HEADER + rows);
    assertEquals(List.of(problems), disk.problems());
  }

  @Test
  void anActivityNeedsAnId() throws IOException {
    expect(",Dig,5,100,,,,\n", "activities.csv:2 id | blank |  | each activity needs an id");
  }

  @Test
  void anIdMayNotHoldASeparator() throws IOException {
    expect(
        "A;B,Dig,5,100,,,,\n\"C\nD\",Dig,5,100,,,,\n",
        "activities.csv:2 id | an id may not hold ; or , or a line break | A;B"
            + " | an id without them",
        "activities.csv:3 id | an id may not hold ; or , or a line break | C D"
            + " | an id without them");
  }

  @Test
  void anIdIsUnique() throws IOException {
    expect(
        "A,Dig,5,100,,,,\nB,Pour,5,100,,,,\nA,Cure,5,100,,,,\n",
        "activities.csv:4 id | a second activity of this id | A | another id; line 2 has it");
  }

  @Test
  void theNormalWayIsNeeded() throws IOException {
    expect(
        "A,Dig,,,,,,\n",
        "activities.csv:2 normal_cost | blank |  | this cell is needed",
        "activities.csv:2 normal_duration | blank |  | this cell is needed");
  }

  @Test
  void aNumberIsPlain() throws IOException {
    expect(
        "A,Dig,five,\"1,234\",,,,\nB,Dig,5,1e3,,,,\nC,Dig,.5,\"128.400,00\",,,,\nD,Dig,5,$3,,,,\n",
        "activities.csv:2 normal_cost | not a number | 1,234 | write 1234 or 1.234",
        "activities.csv:2 normal_duration | not a number | five"
            + " | digits only, with a point before decimals",
        "activities.csv:3 normal_cost | not a number | 1e3 | write 1000",
        "activities.csv:4 normal_cost | not a number | 128.400,00 | write 128400.00",
        "activities.csv:4 normal_duration | not a number | .5 | write 0.5",
        "activities.csv:5 normal_cost | not a number | $3"
            + " | digits only, with a point before decimals");
  }

  @Test
  void nothingIsNegative() throws IOException {
    expect(
        "A,Dig,-5,-1,-2,-3,,-4\n",
        "activities.csv:2 crash_cost | negative | -3 | 0 or more",
        "activities.csv:2 crash_duration | negative | -2 | 0 or more",
        "activities.csv:2 normal_cost | negative | -1 | 0 or more",
        "activities.csv:2 normal_duration | negative | -5 | 0 or more",
        "activities.csv:2 not_before | negative | -4 | 0 or more");
  }

  @Test
  void numbersHaveLimits() throws IOException {
    expect(
        "A,Dig,1000000.001,1000000000000.01,,,,\nB,Dig,1.0001,1.00001,,,,\n",
        "activities.csv:2 normal_cost | too much | 1000000000000.01 | at most 1000000000000",
        "activities.csv:2 normal_duration | too long | 1000000.001"
            + " | at most 1000000 time units",
        "activities.csv:3 normal_cost | too many decimals | 1.00001"
            + " | money has at most 4 decimals",
        "activities.csv:3 normal_duration | too many decimals | 1.0001"
            + " | a time has at most 3 decimals");
  }

  @Test
  void theLimitsThemselvesAreServed() throws IOException {
    expect("A,Dig,1000000,1000000000000,,,,\nB,Dig,1.0010,0.00010,,,yes,\n");
  }

  @Test
  void aCrashDurationIsNoLongerThanTheNormalOne() throws IOException {
    expect(
        "A,Dig,5,100,5.5,120,,\n",
        "activities.csv:2 crash_duration | longer than the normal duration | 5.5"
            + " | at most 5, the normal duration");
  }

  @Test
  void oneDurationHasOneCost() throws IOException {
    expect(
        "A,Dig,5,100,5.0,120,,\nB,Dig,5,100,5,100.00,,\n",
        "activities.csv:2 crash_cost | another cost for the same duration | 120"
            + " | 100, or a shorter crash duration");
  }

  @Test
  void crashCellsStandTogether() throws IOException {
    expect(
        "A,Dig,5,100,3,,,\nB,Dig,5,100,,130,,\n",
        "activities.csv:2 crash_cost | blank beside a crash duration | "
            + " | the cost at that duration, or neither",
        "activities.csv:3 crash_duration | blank beside a crash cost | "
            + " | the duration at that cost, or neither");
  }

  @Test
  void aFaultyCrashCellIsNotCalledBlankToo() throws IOException {
    expect(
        "A,Dig,5,100,3,x,,\n",
        "activities.csv:2 crash_cost | not a number | x"
            + " | digits only, with a point before decimals");
  }

  @Test
  void divisibleIsYesOrNo() throws IOException {
    expect(
        "A,Dig,5,100,3,130,no,\nB,Dig,5,100,3,130,No,\n",
        "activities.csv:3 divisible | no such choice | No | one of yes, no");
  }

  @Test
  void aDateNeedsAStartDate() throws IOException {
    expect(
        "A,Dig,5,100,,,,2027-09-06\n",
        "activities.csv:2 not_before | a date needs a start_date | 2027-09-06"
            + " | a row for start_date in terms.csv, or a number of time units");
  }
}
