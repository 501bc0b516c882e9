package dayworth.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.command.RealJar.Run;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** {@code meet} with the real jar; the proof sheet is added up from the file alone. */
class MeetCommandTest {

  @TempDir private Path folder;
  private RealJar jar;

  @BeforeEach
  void thereIsAJar() {
    jar = new RealJar(folder);
  }

  /**
   * Weeks, by hand from the case: FLUE 100 a week, PLAN 400; as planned 19, FLUE's week makes 18,
   * half a week of PLAN 17.5: 100 + 200.
   */
  @Test
  void aDurationIsMetWithItsTable() throws IOException, InterruptedException {
    Run run = jar.run("meet", RealJar.demo("starter"), "--in", "17.5");
    assertEquals(0, run.status(), run.err());
    String first = "17.5 weeks can be met for 300 of extra direct cost, and for no less.";
    assertTrue(run.out().startsWith(first), run.out());
    assertTrue(run.out().contains("The last week costs 400."), run.out());
    Path output = folder.resolve("output").resolve("starter");
    for (String file :
        List.of(
            "curve.csv",
            "steps.csv",
            "plan.csv",
            "crosscheck.csv",
            "proof.csv",
            "result.json",
            "charts/curve.png",
            "charts/price.svg")) {
      assertTrue(Files.size(output.resolve(file)) > 0, file);
    }
    // 66,000 as planned
    assertAddsUp(output.resolve("proof.csv"), new BigDecimal("66300"));
    Run json = jar.run("meet", RealJar.demo("starter"), "--in", "17.5", "--json", "--no-pictures");
    assertEquals(Files.readString(output.resolve("result.json")), json.out());
    assertFalse(Files.exists(output.resolve("charts")));
    assertTrue(json.out().contains("\"command\" : \"meet\""), json.out());
    // another plan's proof would mislead beside a new plan.csv
    jar.run("curve", RealJar.demo("starter"), "--no-pictures");
    assertFalse(Files.exists(output.resolve("proof.csv")));
  }

  @Test
  void theSheetsOfTheDemoCasesAddUp() throws IOException, InterruptedException {
    String core = RealJar.demo("ferry-berth-core");
    for (String[] wish :
        new String[][] {{"--in", "176"}, {"--in", "158"}, {"--in", "170.25"}, {"--in", "500"}}) {
      Run run = jar.run("meet", core, wish[0], wish[1], "--no-pictures", "--crosscheck", "none");
      assertEquals(0, run.status(), run.err());
      assertBalances(folder.resolve("output").resolve("ferry-berth-core").resolve("proof.csv"));
    }
  }

  /**
   * A 10 days for 900 to 7 for 1,000: a third of 100 a day has no last digit. 8 days cost 66.666..
   * more, and 60 buys 1.8 days: 60 / 33.33.. = 1.8.
   */
  @Test
  void aPriceWithoutLastDigitIsCutAndTheRestIsSaid() throws IOException, InterruptedException {
    Path thirds = aDatedCase("thirds", "A,10,900,7,1000");
    Run run = jar.run("meet", thirds.toString(), "--in", "8", "--no-pictures");
    assertEquals(0, run.status(), run.err());
    assertTrue(said(run).contains("of which rounding 0.000001)"), run.out());
    assertBalances(folder.resolve("output").resolve("thirds").resolve("proof.csv"));
    run = jar.run("meet", thirds.toString(), "--within", "60", "--no-pictures");
    assertTrue(
        run.out().startsWith("60 buys 1.8 days: finish on Thu 17 Sep 2026 (8.2 working days)."),
        run.out());
  }

  /**
   * Ten days from Monday 7 September end on Friday 18; Sunday 13 is a rest day, Friday 11 before.
   */
  @Test
  void aRestDayMeansTheWorkingDayBefore() throws IOException, InterruptedException {
    Path dated = aDatedCase("dated", "A,10,900,4,1500");
    Run run = jar.run("meet", dated.toString(), "--by", "2026-09-13", "--no-pictures");
    assertEquals(0, run.status(), run.err());
    assertTrue(
        said(run).startsWith("Sun 13 Sep 2026 can be met for 500 of extra direct cost"), run.out());
    assertTrue(said(run).contains("finish on Fri 11 Sep 2026, the working day before"), run.out());
    run = jar.run("meet", dated.toString(), "--by", "2026-09-09");
    assertEquals(1, run.status());
    assertTrue(
        run.err()
            .startsWith(
                "Wed 9 Sep 2026 cannot be had. The nearest is 4 days, Thu 10 Sep 2026.\n\n"
                    + "  4 days is the shortest: A is at its shortest."),
        run.err());
    run = jar.run("meet", dated.toString(), "--by", "2026-09-06");
    assertEquals(1, run.status());
    assertTrue(run.err().contains("No working day of the project comes by then."), run.err());
    run = jar.run("meet", dated.toString(), "--by", "2026-09-18", "--no-pictures");
    assertTrue(run.out().startsWith("Fri 18 Sep 2026 is met as planned: nothing"), run.out());
  }

  @Test
  void wrongUsageIsToldWithoutATrace() throws IOException, InterruptedException {
    String starter = RealJar.demo("starter");
    for (String[] wrong :
        new String[][] {
          {"one of", "meet", starter},
          {"CASE", "meet", "--in", "17"},
          {"exclusive", "meet", starter, "--in", "17", "--within", "5"},
          {"is not a number", "meet", starter, "--in", "x"},
          {"is not a number", "meet", starter, "--within", "1e9"},
          {"0 or more", "meet", starter, "--in", "-1"},
          {"3 decimals", "meet", starter, "--in", "17.1234"},
          {"0 or more", "meet", starter, "--within", "-1"},
          {"4 decimals", "meet", starter, "--within", "1.00001"},
          {"is not a date", "meet", starter, "--by", "7.9.2026"},
          {"no day", "meet", starter, "--by", "2026-09-31"},
          {"start_date", "meet", starter, "--by", "2026-09-30"},
          {"no such", "meet", "nowhere", "--in", "3"}
        }) {
      Run run = jar.run(List.of(wrong).subList(1, wrong.length).toArray(String[]::new));
      assertEquals(2, run.status(), String.join(" ", wrong));
      assertTrue(run.err().contains(wrong[0]), wrong[0] + " in " + run.err());
      assertFalse(run.err().contains("Exception"), run.err());
    }
    assertFalse(Files.exists(folder.resolve("output")));
  }

  /** The answer without its line breaks. */
  private static String said(Run run) {
    return run.out().replaceAll("\\s+", " ");
  }

  /** One activity, from Monday 7 September 2026. */
  private Path aDatedCase(String name, String row) throws IOException {
    Path made = Files.createDirectory(folder.resolve(name));
    String header = "id,normal_duration,normal_cost,crash_duration,crash_cost";
    Files.write(made.resolve("activities.csv"), List.of(header, row));
    Files.write(made.resolve("terms.csv"), List.of("term,value", "start_date,2026-09-07"));
    return made;
  }

  private static void assertAddsUp(Path sheet, BigDecimal total) throws IOException {
    assertEquals(0, total.compareTo(sum(rows(sheet), "plan_cost")));
    assertBalances(sheet);
  }

  /** Both columns, length x flow, what each event takes and gives: from the file alone. */
  private static void assertBalances(Path sheet) throws IOException {
    List<CSVRecord> rows = rows(sheet);
    assertEquals(0, sum(rows, "plan_cost").compareTo(sum(rows, "bound")));
    Map<String, BigDecimal> left = new TreeMap<>();
    for (CSVRecord row : rows) {
      if (!row.get("flow").isEmpty()) {
        BigDecimal flow = new BigDecimal(row.get("flow"));
        BigDecimal bound = new BigDecimal(row.get("length")).multiply(flow);
        assertEquals(0, bound.compareTo(new BigDecimal(row.get("bound"))), row.toString());
        assertTrue(flow.signum() >= 0, row.toString());
        if (!row.get("capacity").isEmpty()) {
          assertTrue(flow.compareTo(new BigDecimal(row.get("capacity"))) <= 0, row.toString());
        }
        left.merge(row.get("event_from"), flow.negate(), BigDecimal::add);
        left.merge(row.get("event_to"), flow, BigDecimal::add);
      }
    }
    List<String> unbalanced = new ArrayList<>();
    left.forEach(
        (event, rest) -> unbalanced.addAll(rest.signum() == 0 ? List.of() : List.of(event)));
    assertEquals(List.of(), unbalanced);
  }

  private static List<CSVRecord> rows(Path sheet) throws IOException {
    try (CSVParser parser =
        CSVParser.parse(
            sheet,
            StandardCharsets.UTF_8,
            CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).get())) {
      return parser.getRecords();
    }
  }

  private static BigDecimal sum(List<CSVRecord> rows, String column) {
    return rows.stream()
        .map(row -> row.get(column))
        .filter(cell -> !cell.isEmpty())
        .map(BigDecimal::new)
        .reduce(BigDecimal.ZERO, BigDecimal::add);
  }
}
