package dayworth.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.casefile.CaseReader;
import dayworth.casefile.Reading;
import dayworth.decision.Case;
import dayworth.decision.CheckQuestion;
import dayworth.decision.CurveAnswer;
import dayworth.decision.CurveQuestion;
import dayworth.decision.FinishTooEarly;
import dayworth.decision.Watcher;
import dayworth.value.TimeScale;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;

/**
 * How the ferry berth of 16 July 2027 is told. By hand from its files: of 44 activities 11 have a
 * date under finished and 11 more have started; from Monday 19 July on the harbour regatta, harvest
 * day and three days of the year-end closure are holidays on working days.
 */
class StatusReportTest {

  private static final String STATUS =
      "11 finished, 11 in progress at the end of Fri 16 Jul 2027; everything below is of the work"
          + " to go.";

  private static Case read() {
    Path folder = Path.of("src", "test", "resources", "demo", "ferry-berth-status");
    return ((Reading.Sound) CaseReader.read(folder, TimeScale.WHOLE)).of();
  }

  private static CurveAnswer curve() throws FinishTooEarly {
    return CurveQuestion.ask(read(), OptionalLong.empty(), 0, Watcher.NONE);
  }

  private static String joined(List<String> lines) {
    return String.join(" ", lines).replaceAll(" +", " ");
  }

  @Test
  void theFactsAreOfTheWorkToGo() {
    List<String> lines = CheckText.lines(CheckQuestion.ask(read()), Style.PLAIN, 94);
    String text = joined(lines);
    assertTrue(lines.get(0).contains("As it stands: Fri 7 Jan 2028, 45 calendar days late."), text);
    assertTrue(text.contains(STATUS), text);
    assertTrue(text.contains("33 activities to go"), text);
    assertTrue(
        text.contains("120 working days from Mon 19 Jul 2027, Mon to Fri, 5 holidays"), text);
    assertTrue(text.contains("Nothing comes after: M9 K5"), text);
  }

  @Test
  void theAnswerStatesTheStatusBeforeAnyFigureOfIt() throws FinishTooEarly {
    List<String> lines = CurveText.lines(curve(), Style.PLAIN, 94);
    assertTrue(joined(lines.subList(0, 3)).contains(STATUS), lines.toString());
    assertTrue(lines.stream().anyMatch(line -> line.startsWith("  as it stands ")));
    assertFalse(joined(lines).contains("as planned"), lines.toString());
  }

  @Test
  void theResultForProgramsHasIt() throws FinishTooEarly {
    String json = ResultJson.ofCurve(curve(), "1").replaceAll("\\s+", " ");
    assertTrue(
        json.contains(
            "\"status\" : { \"data_date\" : \"2027-07-16\", \"finished\" : 11,"
                + " \"in_progress\" : 11, \"activities\" : [ { \"activity\" : \"A1\","
                + " \"started\" : \"2027-03-15\", \"finished\" : \"2027-05-21\" }"),
        json.substring(0, 900));
    assertTrue(
        json.contains(
            "{ \"activity\" : \"H1\", \"started\" : \"2027-06-04\","
                + " \"remaining_duration\" : 52 }"));
    int plan = json.indexOf("\"plan\" :");
    String first = json.substring(json.indexOf("{ \"id\" : \"A1\"", plan), json.indexOf('}', plan));
    assertEquals(
        "{ \"id\" : \"A1\", \"name\" : \"Marine works permit\", \"duration\" : 0,"
            + " \"measure\" : \"\", \"units_compressed\" : 0, \"extra_cost\" : 0.00,"
            + " \"start_date\" : \"2027-03-15\", \"finish_date\" : \"2027-05-21\","
            + " \"critical\" : false ",
        first);
  }
}
