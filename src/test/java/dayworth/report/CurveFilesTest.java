package dayworth.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import java.io.IOException;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Every figure is worked by hand at {@link SeriesAnswer}. */
class CurveFilesTest {

  @Test
  void curveHasARowForEachFinishLongestFirst() {
    assertEquals(
        """
        duration,finish_date,direct_cost,running_cost,time_related_cost,fixed_cost,damages,bonus,\
        total_cost,price_per_unit,breakpoint
        10,,160.00,0.00,250.00,0.00,10.00,0.00,420.00,20.00,yes
        9,,180.00,0.00,225.00,0.00,0.00,0.00,405.00,20.00,no
        8,,200.00,0.00,200.00,0.00,0.00,0.00,400.00,30.00,yes
        7,,230.00,0.00,175.00,0.00,0.00,0.00,405.00,,yes
        """,
        CurveTable.of(SeriesAnswer.answer()));
  }

  @Test
  void stepsKeepAnIdThatLooksLikeAFormulaText() {
    assertEquals(
        """
        step,from_duration,to_duration,price_per_unit,activity,change,measure,units,slope,\
        critical_activities,newly_critical
        1,10,8,20.00,A,compress,,2,20.00,2,
        2,8,7,30.00,'=B,compress,,1,30.00,2,
        """,
        StepsTable.of(SeriesAnswer.answer()));
  }

  /** A takes 4, then =B 4: 8 days; C takes 3, so it can slip 8 - 3 = 5. A is 2 shorter: 2 x 20. */
  @Test
  void planHasTheTimesOfTheLeastTotal() {
    assertEquals(
        """
        id,name,duration,measure,units_compressed,extra_cost,start,finish,start_date,finish_date,\
        early_start,early_finish,late_start,late_finish,total_float,free_float,critical
        A,,4,,2,40.00,0,4,,,0,4,0,4,0,0,yes
        '=B,,4,,0,0.00,4,8,,,4,8,4,8,0,0,yes
        C,,3,,0,0.00,0,3,,,0,3,5,8,5,5,no
        """,
        PlanTable.of(SeriesAnswer.answer()));
  }

  /**
   * From Monday 7 September: A takes days 1 to 4, to Thursday 10; =B days 5 to 8, Friday 11 to
   * Wednesday 16; C days 1 to 3, to Wednesday 9.
   */
  @Test
  void rowsHaveDatesWhereTheCaseHas() {
    String plan = PlanTable.of(SeriesAnswer.answer(SeriesAnswer.DATED));
    assertTrue(plan.contains("A,,4,,2,40.00,0,4,2026-09-07,2026-09-10,0,4,"), plan);
    assertTrue(plan.contains("'=B,,4,,0,0.00,4,8,2026-09-11,2026-09-16,4,8,"), plan);
    assertTrue(plan.contains("C,,3,,0,0.00,0,3,2026-09-07,2026-09-09,0,3,"), plan);
    String curve = CurveTable.of(SeriesAnswer.answer(SeriesAnswer.DATED));
    assertTrue(curve.contains("\n9,2026-09-17,180.00,"), curve);
    String json = ResultJson.ofCurve(SeriesAnswer.answer(SeriesAnswer.DATED), "1");
    for (String member :
        List.of(
            "\"time_unit\" : \"day\",\n    \"start_date\" : \"2026-09-07\"",
            "\"duration\" : 10,\n    \"finish_date\" : \"2026-09-18\"",
            "\"due\" : 9,\n    \"due_date\" : \"2026-09-17\"",
            "\"start_date\" : \"2026-09-11\",\n      \"finish_date\" : \"2026-09-16\"")) {
      assertTrue(json.contains(member), member + json);
    }
    assertFalse(ResultJson.ofCurve(SeriesAnswer.answer(), "1").contains("_date"));
  }

  @Test
  void crosscheckStandsBesideTheCurve() {
    assertEquals(
        """
        duration,stepping_cost,lp_cost,difference
        10,160.00,160.00,0.00
        9,180.00,180.00,0.00
        """,
        CrosscheckTable.of(SeriesAnswer.answer()));
  }

  @Test
  void aNegativeNumberStaysANumberAndOtherTextIsKeptText() {
    CsvText csv = new CsvText("a", "b", "c", "d");
    csv.row("-5.00", "-5x", "@x", "one, two");
    assertEquals("a,b,c,d\n-5.00,'-5x,'@x,\"one, two\"\n", csv.toString());
  }

  @Test
  void theJsonResultIsWellFormedAndHoldsTheFigures() throws IOException {
    String json = ResultJson.ofCurve(SeriesAnswer.answer(), "1.2.3");
    try (JsonParser parser = new JsonFactory().createParser(json)) {
      while (parser.nextToken() != null) {
        parser.skipChildren();
      }
    }
    assertTrue(
        json.startsWith("{\n  \"format\" : \"dayworth result\",\n  \"format_version\" : 1,"));
    assertTrue(json.contains("\"total_cost\" : 400.00,"), json);
    assertTrue(json.contains("\"activity\" : \"=B\""), json);
    assertTrue(json.endsWith("}\n"), json);
  }

  @Test
  void theSetHasTheFilesOfTheContract() {
    assertEquals(
        List.of("curve.csv", "steps.csv", "plan.csv", "crosscheck.csv", "result.json"),
        List.copyOf(CurveFiles.of(SeriesAnswer.answer(), "1").keySet()));
  }
}
