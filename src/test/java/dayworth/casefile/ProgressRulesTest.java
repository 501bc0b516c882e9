package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Each rule for progress.csv and the data_date. */
class ProgressRulesTest {

  private static final String ACTIVITIES =
      """
      id,normal_duration,normal_cost,crash_duration,crash_cost,predecessors
      DIG,10,1000,6,1400,
      POUR,5,700,,,DIG
      OPEN,0,0,,,POUR
      """;
  private static final String TERMS = "term,value\nstart_date,2027-03-01\n";
  private static final String HEADER =
      "activity,started,finished,remaining_duration,"
          + "remaining_crash_duration,remaining_crash_cost\n";

  @TempDir private Path folder;

  private CaseOnDisk progress(String text) throws IOException {
    return new CaseOnDisk(folder)
        .with("activities.csv", ACTIVITIES)
        .with("terms.csv", TERMS + "data_date,2027-03-12\n")
        .with("progress.csv", text);
  }

  private void expect(String rows, String... problems) throws IOException {
    assertEquals(List.of(problems), progress(HEADER + rows).problems());
  }

  private void expectWarnings(String rows, String... warnings) throws IOException {
    assertEquals(List.of(warnings), progress(HEADER + rows).warnings());
  }

  @Test
  void anActivityMustExist() throws IOException {
    expect(
        "DIGG,2027-03-01,,4,,\n,2027-03-01,,4,,\n",
        "progress.csv:2 activity | DIGG is no activity | DIGG | nearest is DIG",
        "progress.csv:3 activity | blank |  | this cell is needed");
  }

  @Test
  void anActivityStandsOnce() throws IOException {
    expect(
        "DIG,2027-03-01,,4,,\nDIG,2027-03-02,,3,,\n",
        "progress.csv:3 activity | a second row of this activity | DIG | line 2 has it");
  }

  @Test
  void whatIsFinishedHasStarted() throws IOException {
    expect(
        "DIG,,2027-03-05,,,\n",
        "progress.csv:2 started | blank beside a finished date |  | the date on which it started");
    expect(
        "DIG,2027-03-05,2027-03-04,,,\n",
        "progress.csv:2 finished | finished before it started | 2027-03-04"
            + " | on 2027-03-05 or later");
  }

  @Test
  void whatHasHappenedLiesBetweenTheStartAndTheDataDate() throws IOException {
    expect(
        "DIG,2027-02-26,2027-03-13,,,\nPOUR,2027-03-15,,4,,\n",
        "progress.csv:2 finished | after the data_date | 2027-03-13"
            + " | on 2027-03-12 or before; blank if it is still to come",
        "progress.csv:2 started | before the start_date | 2027-02-26"
            + " | on 2027-03-01, the start_date, or later",
        "progress.csv:3 started | after the data_date | 2027-03-15"
            + " | on 2027-03-12 or before; blank if it is still to come");
  }

  @Test
  void aRestIsOfStartedWork() throws IOException {
    String wrong = "a rest of work that has not started";
    String right = "the date under started, or blank: then it is as in activities.csv";
    expect(
        "DIG,,,4,2,900\n",
        "progress.csv:2 remaining_crash_cost | " + wrong + " | 900 | " + right,
        "progress.csv:2 remaining_crash_duration | " + wrong + " | 2 | " + right,
        "progress.csv:2 remaining_duration | " + wrong + " | 4 | " + right);
  }

  @Test
  void finishedWorkHasNoRest() throws IOException {
    String right = "blank, or no date under finished";
    expect(
        "DIG,2027-03-01,2027-03-05,1,0,900\n",
        "progress.csv:2 remaining_crash_cost | finished work has a rest | 900 | " + right,
        "progress.csv:2 remaining_crash_duration | finished work has a rest | 0 | " + right,
        "progress.csv:2 remaining_duration | finished work has a rest | 1 | " + right);
    expect("DIG,2027-03-01,2027-03-05,0,,\n");
  }

  @Test
  void startedWorkHasARest() throws IOException {
    expect(
        "DIG,2027-03-01,,,,\n",
        "progress.csv:2 remaining_duration | blank for started work | "
            + " | how long the rest takes, or the date under finished");
    assertEquals(
        List.of(
            "progress.csv:1 remaining_duration | missing column | "
                + " | it is needed for work in progress"),
        progress("activity,started\nDIG,2027-03-01\n").problems());
    expect(
        "DIG,2027-03-01,,-1,,\n", "progress.csv:2 remaining_duration | negative | -1 | 0 or more");
  }

  @Test
  void aMilestoneIsNeverInProgress() throws IOException {
    expect(
        "OPEN,2027-03-01,,0,,\n",
        "progress.csv:2 finished | a milestone in progress | "
            + " | its date under finished too; it takes no time");
  }

  @Test
  void theTwoCrashColumnsGoTogether() throws IOException {
    expect(
        "DIG,2027-03-01,,4,2,\nPOUR,2027-03-02,,3,,400\n",
        "progress.csv:2 remaining_crash_cost | blank beside a crash duration | "
            + " | the cost at that duration, or neither",
        "progress.csv:3 remaining_crash_duration | blank beside a crash cost | "
            + " | the duration at that cost, or neither");
    assertEquals(
        List.of(
            "progress.csv:1 remaining_crash_cost | missing column | "
                + " | it is needed beside remaining_crash_duration"),
        progress(
                """
                activity,started,remaining_duration,remaining_crash_duration
                DIG,2027-03-01,4,2
                """)
            .problems());
  }

  /** 4 of 10 days at 1,000 are left: 400. */
  @Test
  void theRestIsNotLongerWhenCompressed() throws IOException {
    expect(
        "DIG,2027-03-01,,4,5,900\n",
        "progress.csv:2 remaining_crash_duration | longer than the remaining duration | 5"
            + " | at most 4, the remaining duration");
    expect(
        "DIG,2027-03-01,,4,4,401\n",
        "progress.csv:2 remaining_crash_cost | another cost for the same duration | 401"
            + " | 400.00, or a shorter crash duration");
    expect("DIG,2027-03-01,,4,4,400\n");
  }

  @Test
  void aStatusNeedsItsDate() throws IOException {
    assertEquals(
        List.of(
            "progress.csv | needs a data_date | "
                + " | a row for data_date in terms.csv: the day of the status"),
        progress(HEADER).with("terms.csv", TERMS).problems());
    assertEquals(
        List.of(
            "terms.csv:2 data_date | means nothing without start_date | data_date"
                + " | a row for start_date"),
        progress(HEADER).with("terms.csv", "term,value\ndata_date,2027-03-12\n").problems());
    assertEquals(
        List.of(
            "terms.csv:3 data_date | before the start_date | 2027-02-28"
                + " | on 2027-03-01, the start_date, or later"),
        progress(HEADER).with("terms.csv", TERMS + "data_date,2027-02-28\n").problems());
    expect("");
  }

  @Test
  void ofAFinishedProjectNothingCanBeChanged() throws IOException {
    expect(
        """
        DIG,2027-03-01,2027-03-02,,,
        POUR,2027-03-02,2027-03-03,,,
        OPEN,2027-03-03,2027-03-03,,,
        """,
        "progress.csv | all is finished | "
            + " | work that is to go: of a finished project nothing can be changed");
  }

  @Test
  void aRowThatSaysNothingIsNoFault() throws IOException {
    expectWarnings("DIG,,,,,\n");
  }

  @Test
  void aDataDateWithoutAStatusIsDoubtful() throws IOException {
    CaseOnDisk disk =
        new CaseOnDisk(folder)
            .with("activities.csv", ACTIVITIES)
            .with("terms.csv", TERMS + "data_date,2027-03-12\n");
    assertEquals(
        List.of(
            "terms.csv:3 data_date | nothing counts as started | "
                + " | a progress.csv, if work has started"),
        disk.warnings());
  }

  @Test
  void aRestLongerThanTheWholeIsDoubtful() throws IOException {
    expectWarnings(
        "DIG,2027-03-01,,10.5,,\n",
        "progress.csv:2 remaining_duration | more than the normal duration, 10 | 10.5"
            + " | its cost to go is more than its normal cost, in proportion");
  }

  @Test
  void aStartBeforeANotBeforeIsDoubtful() throws IOException {
    String activities = "id,normal_duration,normal_cost,not_before\nDIG,10,1000,2027-03-03\n";
    progress(HEADER + "DIG,2027-03-02,,4,,\n").with("activities.csv", activities);
    assertEquals(
        List.of(
            "progress.csv:2 started | started before its not_before | 2027-03-02"
                + " | 2027-03-03, its not_before, holds nothing any more"),
        new CaseOnDisk(folder).warnings());
    progress(HEADER + "DIG,2027-03-03,,4,,\n").with("activities.csv", activities);
    assertEquals(List.of(), new CaseOnDisk(folder).warnings());
  }

  @Test
  void aRestThatIsCheaperCompressedIsDoubtful() throws IOException {
    expectWarnings(
        "DIG,2027-03-01,,4,2,399\n",
        "progress.csv:2 remaining_crash_cost | below the cost to go | 399"
            + " | the curve starts from the cheaper way");
  }

  @Test
  void workOutOfSequenceIsDoubtful() throws IOException {
    expectWarnings(
        "POUR,2027-03-10,,3,,\nOPEN,2027-03-12,2027-03-12,,,\n",
        "progress.csv:2 started | started before DIG is finished | 2027-03-10"
            + " | out of sequence: what remains waits for DIG",
        "progress.csv:3 started | started before POUR is finished | 2027-03-12"
            + " | out of sequence: nothing of it waits for POUR any more");
  }

  /** DIG is done at 4 at the earliest; 7 days before that is past, 3 days before it is to come. */
  @Test
  void aLeadThatIsPastIsInSequence() throws IOException {
    String header = "predecessor,successor,relation,lag\n";
    progress(HEADER + "DIG,2027-03-01,,4,,\nPOUR,2027-03-10,,3,,\n")
        .with("activities.csv", ACTIVITIES.replace(",DIG", ","));
    assertEquals(
        List.of(),
        new CaseOnDisk(folder).with("links.csv", header + "DIG,POUR,FS,-7\n").warnings());
    assertEquals(
        List.of(
            "progress.csv:3 started | started before DIG is finished | 2027-03-10"
                + " | out of sequence: what remains waits for DIG"),
        new CaseOnDisk(folder).with("links.csv", header + "DIG,POUR,FS,-3\n").warnings());
  }

  @Test
  void numbersMayHaveACommaWhereSemicolonsSeparate() throws IOException {
    String text = "activity;started;finished;remaining_duration\nDIG;2027-03-01;;2,5\n";
    assertEquals("2.5", rest(progress(text)));
  }

  private static String rest(CaseOnDisk disk) {
    return disk.sound().network().scale().text(disk.sound().network().activity(0).normal());
  }
}
