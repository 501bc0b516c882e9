package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.network.Activity;
import dayworth.value.Money;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** How files may be written: byte order mark, line ends, quotes, semicolons, decimal marks. */
class CsvRulesTest {

  @TempDir private Path folder;

  private CaseOnDisk activities(String text) throws IOException {
    return new CaseOnDisk(folder).with("activities.csv", text);
  }

  private void expect(String text, String... problems) throws IOException {
    assertEquals(List.of(problems), activities(text).problems());
  }

  @Test
  void aByteOrderMarkAndCrlfAreServed() throws IOException {
    activities("\uFEFFid,normal_duration,normal_cost\r\nA,5,100\r\nB,6,100\r\n");
    assertEquals("B", new CaseOnDisk(folder).sound().network().activity(1).id());
    expect(
        "\uFEFFid,normal_duration,normal_cost\r\nA,5,100\r\nB,x,100\r\n",
        "activities.csv:3 normal_duration | not a number | x"
            + " | digits only, with a point before decimals");
  }

  @Test
  void quotedCellsMayHoldSeparatorsQuotesAndLineBreaks() throws IOException {
    activities("id,name,normal_duration,normal_cost\nA,\"Walls, \"\"high\"\"\nand low\",5,100\n");
    assertEquals(
        "Walls, \"high\"\nand low", new CaseOnDisk(folder).sound().network().activity(0).name());
  }

  @Test
  void aLineIsCountedWhereItsRowBegins() throws IOException {
    expect(
        "\n\nid,name,normal_duration,normal_cost\nA,\"Walls\r\nhigh\nlow\",x,100\n\nB,Roof,y,1\n",
        "activities.csv:4 normal_duration | not a number | x"
            + " | digits only, with a point before decimals",
        "activities.csv:8 normal_duration | not a number | y"
            + " | digits only, with a point before decimals");
  }

  @Test
  void aQuoteThatDoesNotEndIsOneProblemWhereItBegins() throws IOException {
    String right = "close it with a quote before the next cell; write a quote within as two";
    new CaseOnDisk(folder).with("links.csv", "predecessor,successor,relation\nA,B,FS\n");
    expect(
        "id,name,normal_duration,normal_cost\nA,\"Walls,5,100\nB,Roof,5,100\n",
        "activities.csv:2 | a quoted cell does not end |  | " + right);
    expect(
        "id,name,normal_duration,normal_cost\nA,Walls,5,100\nB,\"Roof\" high,5,100\n",
        "activities.csv:3 | a quoted cell does not end |  | " + right);
  }

  @Test
  void anEmptyFileAndAHeaderAloneAreNoCase() throws IOException {
    expect("", "activities.csv | empty |  | a header row and rows below it");
    expect(
        "id,normal_duration,normal_cost\n",
        "activities.csv | no activity | a header only | a row for each");
  }

  @Test
  void tabsAreNotServed() throws IOException {
    expect(
        "id\tnormal_duration\tnormal_cost\nA\t5\t100\n",
        "activities.csv:1 | cells are separated by tabs | id normal_duration normal_cost"
            + " | separate them by commas");
  }

  @Test
  void aFileOfSemicolonsMayHaveDecimalCommas() throws IOException {
    activities("id;normal_duration;normal_cost;predecessors\nA;5,5;1234,50;\nB;6;100;\"A\"\n")
        .with("links.csv", "predecessor;successor;relation;lag\nA;B;SS;2,5\n")
        .with("terms.csv", "term;value\ntitle;1.5\nfixed_cost;10\ntime_related_cost;3900,5\n");
    Activity first = new CaseOnDisk(folder).sound().network().activity(0);
    assertEquals(55, first.normal());
    assertEquals(Money.of(new BigDecimal("1234.5")), first.normalCost());
    assertEquals(25, new CaseOnDisk(folder).sound().network().link(1).lag());
    assertEquals(
        Money.of(new BigDecimal("3900.5")),
        new CaseOnDisk(folder).sound().terms().timeRelated().rate());
  }

  @Test
  void aFileOfSemicolonsMayHaveDecimalPoints() throws IOException {
    activities("id;normal_duration;normal_cost\nA;5.5;100.25\n");
    assertEquals(55, new CaseOnDisk(folder).sound().network().activity(0).normal());
  }

  @Test
  void oneFileHasOneDecimalMark() throws IOException {
    expect(
        "id;normal_duration;normal_cost\nA;5;10\nB;5,5;100.25\nC;1;1.234,50\n",
        "activities.csv:3 normal_cost | two decimal marks in one file | 100.25"
            + " | one mark for the whole file; line 3 has a comma",
        "activities.csv:4 normal_cost | not a number | 1.234,50 | write 1234,50");
    new CaseOnDisk(folder)
        .with("activities.csv", CaseOnDisk.ONE_ACTIVITY)
        .with("terms.csv", "term;value\nfixed_cost;3.5\ntime_related_cost;3900,5\n");
    assertEquals(
        List.of(
            "terms.csv:3 time_related_cost | two decimal marks in one file | 3900,5"
                + " | one mark for the whole file; line 2 has a point"),
        new CaseOnDisk(folder).problems());
  }

  @Test
  void moneyWithThreeDigitsAfterItsMarkMayBeThousands() throws IOException {
    expect(
        "id;normal_duration;normal_cost\nA;5,125;1,200\n",
        "activities.csv:2 normal_cost | the comma may be a thousands mark | 1,200"
            + " | write 1200 or 1,2000");
  }

  @Test
  void inAFileOfCommasThreeDecimalsAreDecimals() throws IOException {
    expect("id,normal_duration,normal_cost\nA,5,1.200\n");
  }

  @Test
  void badBytesAreAProblemOfTheirLine() throws IOException {
    byte[] latin =
        "id,name,normal_duration,normal_cost\nA,Dig,5,100\nB,Br\u00fccke,5,100\n"
            .getBytes(StandardCharsets.ISO_8859_1);
    new CaseOnDisk(folder)
        .with("activities.csv", latin)
        .with("links.csv", "predecessor,successor,relation\nA,B,FS\n");
    assertEquals(
        List.of("activities.csv:3 | not UTF-8 |  | save it as UTF-8"),
        new CaseOnDisk(folder).problems());
  }
}
