package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.network.Link;
import dayworth.network.Relation;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Each rule for links, whether they stand in activities.csv or in links.csv. */
class LinkRulesTest {

  private static final String HEADER = "predecessor,successor,relation,lag\n";

  @TempDir private Path folder;

  /** Activities W1, W2, W3 and W4 in lines 2 to 5, with these predecessors. */
  private CaseOnDisk activities(String... predecessors) throws IOException {
    StringBuilder text = new StringBuilder("id,normal_duration,normal_cost,predecessors\n");
    for (int i = 0; i < 4; i++) {
      String cell = i < predecessors.length ? predecessors[i] : "";
      text.append("W").append(i + 1).append(",5,100,\"").append(cell).append("\"\n");
    }
    return new CaseOnDisk(folder).with("activities.csv", text.toString());
  }

  private void expect(String links, String... problems) throws IOException {
    assertEquals(List.of(problems), activities().with("links.csv", HEADER + links).problems());
  }

  @Test
  void predecessorsAreSeparatedBySemicolonOrComma() throws IOException {
    assertEquals(
        List.of(
            Link.finishToStart(0, 2),
            Link.finishToStart(1, 2),
            Link.finishToStart(0, 3),
            Link.finishToStart(1, 3)),
        activities("", "", "W1; W2", "W1,W2,").sound().network().links());
  }

  @Test
  void linksHaveARelationAndALagOfEitherSign() throws IOException {
    CaseOnDisk disk =
        activities().with("links.csv", HEADER + "W1,W2,FS,-2\nW1,W3,SS,\nW1,W4,FF,3\nW2,W3,SF,0\n");
    assertEquals(
        List.of(
            new Link(0, 1, Relation.FS, -2),
            new Link(0, 2, Relation.SS, 0),
            new Link(0, 3, Relation.FF, 3),
            new Link(1, 2, Relation.SF, 0)),
        disk.sound().network().links());
  }

  @Test
  void anUnknownPredecessorIsNamedWithTheNearest() throws IOException {
    assertEquals(
        List.of(
            "activities.csv:4 predecessors | W11 is no activity | W11 | nearest is W1",
            "activities.csv:5 predecessors | paving is no activity | paving"
                + " | an id of activities.csv"),
        activities("", "", "W11", "paving").problems());
  }

  @Test
  void anActivityInAFaultyRowIsNotUnknown() throws IOException {
    new CaseOnDisk(folder)
        .with(
            "activities.csv",
            "id,normal_duration,normal_cost,predecessors\nA,5\nB,5,100,A\nC,x,100,B\n");
    assertEquals(
        List.of(
            "activities.csv:2 | too few cells | 2 cells | 4, as in the header",
            "activities.csv:4 normal_duration | not a number | x"
                + " | digits only, with a point before decimals"),
        new CaseOnDisk(folder).problems());
  }

  @Test
  void bothEndsAndTheRelationAreNeeded() throws IOException {
    expect(
        ",W2,FS,\nW1,,FS,\nW1,W2,,\n",
        "links.csv:2 predecessor | blank |  | this cell is needed",
        "links.csv:3 successor | blank |  | this cell is needed",
        "links.csv:4 relation | blank |  | this cell is needed");
  }

  @Test
  void bothEndsAreActivities() throws IOException {
    expect(
        "W1,W22,FS,\nX,W2,FS,\n",
        "links.csv:2 successor | W22 is no activity | W22 | nearest is W2",
        "links.csv:3 predecessor | X is no activity | X | an id of activities.csv");
  }

  @Test
  void aRelationIsOneOfFour() throws IOException {
    expect(
        "W1,W2,FX,\nW1,W3,fs,\n",
        "links.csv:2 relation | no such relation | FX | one of FS, SS, FF, SF",
        "links.csv:3 relation | no such relation | fs | one of FS, SS, FF, SF");
  }

  @Test
  void aLagIsANumberWithinItsLimits() throws IOException {
    expect(
        "W1,W2,FS,2d\nW1,W3,FS,-1000001\nW1,W4,FS,0.0001\n",
        "links.csv:2 lag | not a number | 2d | digits only, with a point before decimals",
        "links.csv:3 lag | too long | -1000001 | at most 1000000 time units",
        "links.csv:4 lag | too many decimals | 0.0001 | a time has at most 3 decimals");
  }

  @Test
  void nothingIsLinkedToItself() throws IOException {
    assertEquals(
        List.of(
            "activities.csv:3 predecessors | linked to itself | W2 | another activity",
            "links.csv:2 | linked to itself | W1 | another activity"),
        activities("", "W2").with("links.csv", HEADER + "W1,W1,SS,3\n").problems());
  }

  @Test
  void aLinkStandsOnce() throws IOException {
    assertEquals(
        List.of(
            "activities.csv:3 predecessors | the same link a second time | W1 before W2 | take one out",
            "links.csv:2 | the same link a second time | W1 before W2 | take one out"),
        activities("", "W1;W1").with("links.csv", HEADER + "W1,W2,FS,0.0\n").problems());
  }

  @Test
  void aLoopIsShownAsAChain() throws IOException {
    assertEquals(
        List.of(
            "links.csv:2 | a loop: W1, W2, W3, W1 | W3 before W1 | take out one of the 3 links"),
        activities("", "W1", "W2").with("links.csv", HEADER + "W3,W1,SF,-100\n").problems());
  }

  @Test
  void everyLoopIsShown() throws IOException {
    assertEquals(
        List.of(
            "activities.csv:2 predecessors | a loop: W1, W2, W1 | W2 before W1"
                + " | take out one of the 2 links",
            "activities.csv:4 predecessors | a loop: W3, W4, W3 | W4 before W3"
                + " | take out one of the 2 links"),
        activities("W2", "W1", "W4", "W3").problems());
  }

  @Test
  void anEmptyFileIsAProblemAndAHeaderAloneIsNot() throws IOException {
    assertEquals(
        List.of("links.csv | empty |  | a header row and rows below it"),
        activities().with("links.csv", "\n \n").problems());
    assertEquals(List.of(), activities().with("links.csv", HEADER).problems());
  }
}
