package dayworth.report.brief;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import dayworth.decision.BriefAnswer;
import dayworth.report.brief.page.Document;
import dayworth.report.brief.page.Escape;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.page.Section;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What the brief says, whatever the case has or lacks. */
class BriefTextTest {

  @TempDir private Path folder;

  private Path write(String file, String text) throws IOException {
    Files.writeString(folder.resolve(file), text);
    return folder;
  }

  private static Document document(BriefAnswer answer) {
    return new Brief(answer).document();
  }

  private static List<String> said(Document document) {
    List<String> all = new ArrayList<>(document.lede());
    document.facts().forEach(fact -> all.add(fact.value()));
    for (Section section : document.sections()) {
      all.add(section.heading());
      section.parts().forEach(part -> collect(part, all));
    }
    all.add(document.closing());
    return all;
  }

  private static void collect(Part part, List<String> all) {
    if (part instanceof Part.Prose prose) {
      all.addAll(prose.paragraphs());
    } else if (part instanceof Part.Notes notes) {
      all.addAll(notes.paragraphs());
    } else if (part instanceof Part.Beside beside) {
      beside.main().forEach(one -> collect(one, all));
      collect(beside.remark(), all);
    } else if (part instanceof Part.Remark remark) {
      remark.parts().forEach(one -> collect(one, all));
    } else if (part instanceof Part.Statements statements) {
      statements.statements().forEach(one -> all.add(one.text()));
    } else if (part instanceof Part.Gap gap) {
      all.add(gap.title());
      all.add(gap.text());
    } else if (part instanceof Part.Caution caution) {
      all.add(caution.text());
    } else if (part instanceof Part.Claim claim) {
      all.add(claim.text());
    } else if (part instanceof Part.Sheet sheet) {
      all.add(sheet.table().caption());
    }
  }

  private static String all(Document document) {
    return document.headline().text() + "\n" + String.join("\n", said(document));
  }

  @Test
  void bothFormsCarryTheSameText() {
    BriefAnswer answer = Briefs.of(Briefs.FERRY_LANDING);
    String html = Briefs.html(answer);
    String markdown = Briefs.markdown(answer).replaceAll("\\\\([\\\\`*_\\[\\]<>|#=~+.)-])", "$1");
    List<String> said = said(document(answer));
    assertTrue(said.size() > 60, "much is said: " + said.size());
    for (String text : said) {
      assertTrue(html.contains(Escape.html(text)), text);
      assertTrue(markdown.contains(text), text);
    }
  }

  @Test
  void whatTheCaseLacksIsNamed() throws IOException {
    write("activities.csv", "id,normal_duration,normal_cost\nA,5,100\nB,0,0\n");
    String said = all(document(Briefs.of(folder)));
    for (String missing :
        new String[] {
          "not stated",
          "Not in the case: the basis, whom it is for, who wrote it, its reference, until when it is"
              + " open and what is wanted of the reader.",
          "The case has no data date",
          "Not in the case: what the client must do.",
          "No assumptions of its own are stated",
          "The case names no time-related cost, damages or bonus",
          "No dates are told.",
          "Nothing is bought"
        }) {
      assertTrue(said.contains(missing), missing + " in:\n" + said);
    }
    assertTrue(
        said.startsWith(
            "Carry on and finish in 5 working days: nothing in the case makes an earlier finish worth"
                + " its cost."),
        said);
  }

  @Test
  void whatTheCaseSaysStandsInIt() throws IOException {
    for (String file : new String[] {"activities.csv", "links.csv"}) {
      write(file, Files.readString(Briefs.FERRY_LANDING.resolve(file)));
    }
    write(
        "terms.csv",
        Files.readString(Briefs.FERRY_LANDING.resolve("terms.csv"))
            + "\nbasis,own recovery\nprepared_for,The board\nprepared_by,The builder\n"
            + "reference,HS-1\nvalid_until,2026-09-18\non_cost_percent,10\nproposal_cost,1800\n"
            + "extension,3\n");
    write(
        "notes.md",
        """
        # What is asked
        Agree by return.
        # What we need
        - The berth closed
        # Assumptions
        - Dry weather
        """);
    Document document = document(Briefs.of(folder));
    String said = all(document);
    for (String text :
        new String[] {
          "The board",
          "The builder",
          "Own recovery",
          "Friday 18 September 2026",
          "Agree by return.",
          "The berth closed",
          "Dry weather",
          "An extension of time to Monday 23 November 2026 is claimed",
          "From cost to price"
        }) {
      assertTrue(said.contains(text), text + " in:\n" + said);
    }
    assertFalse(said.contains("Not in the case: the basis"), said);
    assertEquals("HS-1", document.reference());
    // By hand: 22,910 + 10 % of it, 2,291, + 1,800 = 27,001.
    assertTrue(Briefs.html(Briefs.of(folder)).contains("€27,001"), "the price");
  }

  @Test
  void aPlanThatIsNotTheCheapestIsNotCalledSo() {
    Document document = document(Briefs.at(Briefs.FERRY_LANDING, 53));
    // By hand, from the drawn case: 195,950 at 53 days and 190,810 at 55: 5,140 more.
    assertTrue(
        document.lede().get(0).contains("this finish costs €5,140 more in all"),
        document.lede().toString());
    assertTrue(
        document.headline().text().startsWith("Finish on Wednesday 18 November 2026, ten working"),
        document.headline().text());
  }

  @Test
  void reasonsAreThoseOfTheChains() {
    String html = Briefs.html(Briefs.of(Briefs.FERRY_LANDING));
    for (String reason :
        new String[] {
          "One chain holds the finish. Its cheapest day is in S2.",
          "The Power chain is now as long: two chains hold the finish, so both must shrink. S2 and P2"
              + " together do it, and nothing else does it for less. A day of P3, which lies on both,"
              + " would cost €3,900.",
          "The Power chain passes both H2 and P3 and would shrink by two days for each one that is"
              + " needed: so P2 gets a day back each time.",
          "A day is worth €7,100 here, less than its price: not bought."
        }) {
      assertTrue(html.contains(reason), reason);
    }
  }

  @Test
  void cautionsStandInEveryBrief() throws IOException {
    write("activities.csv", "id,normal_duration,normal_cost\nA,5,100\n");
    String said = all(document(Briefs.of(folder)));
    assertTrue(said.contains("This is not legal advice: read the contract"), said);
    assertTrue(said.contains("this page calls no pattern lawful or safe"), said);
  }

  @Test
  void aPageOfFiftyActivitiesStaysBelowOneMegabyte() throws IOException {
    StringBuilder rows =
        new StringBuilder(
            "id,name,group,normal_duration,normal_cost,crash_duration,crash_cost,predecessors\n");
    for (int i = 0; i < 50; i++) {
      String after = i < 5 ? "" : "A" + (i - 5) + (i % 3 == 0 ? ";A" + (i - 4) : "");
      rows.append(
          "A%d,Work on part %d of the hall,Trade %d,%d,%d,%d,%d,%s%n"
              .formatted(i, i, i % 5, 10 + i % 7, 9000 + i, 4 + i % 3, 20000 + 700 * i, after));
    }
    write("activities.csv", rows.toString());
    write(
        "terms.csv",
        """
        term,value
        time_related_cost,4000
        start_date,2027-01-11
        contract_finish,2027-06-01
        damages_rate,900
        damages_per,calendar_day
        """);
    BriefAnswer answer = Briefs.of(folder);
    assertTrue(answer.states().size() > 40, "finishes: " + answer.states().size());
    int size = Briefs.html(answer).getBytes(StandardCharsets.UTF_8).length;
    assertTrue(size < 1_000_000, "bytes: " + size);
  }

  @Test
  void theSameAnswerGivesTheSameBytes() {
    assertEquals(
        Briefs.html(Briefs.of(Briefs.FERRY_LANDING)), Briefs.html(Briefs.of(Briefs.FERRY_LANDING)));
  }

  @Test
  void theDataCannotEndItsScript() throws IOException {
    write(
        "activities.csv",
        """
        id,name,normal_duration,normal_cost
        </script>,<!--<script>alert(1)//,5,100
        "a""b'&",%s,4,100
        """
            .formatted("x\u2028y\u2029z\u202Eend"));
    String html = Briefs.html(Briefs.of(folder));
    int begin = html.indexOf("id=\"states\">") + "id=\"states\">".length();
    String json = html.substring(begin, html.indexOf("</script>", begin));
    assertFalse(json.contains("<"), "no tag begins in the data");
    assertFalse(html.contains("\u202E"), "nothing turns the direction of reading");
    assertFalse(json.contains("\u2028"), "no line of a script ends in the data");
    List<String> texts = new ArrayList<>();
    try (JsonParser parser = new JsonFactory().createParser(json)) {
      while (parser.nextToken() != null) {
        if (parser.currentToken().isScalarValue()) {
          texts.add(parser.getText());
        }
      }
    }
    assertTrue(texts.contains("</script>"), "the id is what it was");
    assertTrue(texts.contains("<!--<script>alert(1)//"), "so is the name");
    assertTrue(texts.contains("a\"b'&"), "and quotes stay quotes");
  }

  @Test
  void aNameThatReadsFromTheRightIsSetApart() {
    assertEquals("\u2068\u05D0\u05D1\u2069", Words.safe("\u202E\u05D0\u05D1"));
    assertEquals("a b", Words.safe("a\u202E\tb"));
  }
}
