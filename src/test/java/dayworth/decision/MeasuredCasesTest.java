package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.casefile.CaseReader;
import dayworth.casefile.Reading;
import dayworth.network.Plan;
import dayworth.value.TimeScale;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Fronts of discrete choices, every finish proved; the report names the source of each. */
class MeasuredCasesTest {

  @ParameterizedTest(name = "{0}: {1}")
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          liu-burns-feng-7 | Liu, Burns and Feng 1995, J. Constr. Eng. Manage. 121, 446-454; from memory
          feng-18 | Feng, Liu and Burns 1997, J. Comput. Civ. Eng. 11, 184-189; from memory
          outage-measures | a demo case; two integer solvers agreed on the table
          """)
  void everyFinishCostsWhatTheTableSaysAndIsProved(String name, String source) throws Exception {
    CurveAnswer answer = answer(name);
    Map<String, BigDecimal> found = new TreeMap<>();
    answer.rows().forEach(row -> found.put(units(answer, row.duration()), row.direct().cents()));
    Map<String, BigDecimal> expected = new TreeMap<>();
    for (String row : rows(name)) {
      String[] cells = row.split(",", -1);
      expected.put(cells[0], new BigDecimal(cells[1]).setScale(2));
    }
    assertEquals(expected, found, source);
    assertEquals(List.of(), answer.unproved(), source);
    assertEquals(answer.rows().size(), answer.provedRows());
  }

  /** Feng 1997: with 500 a day, 161,270 at 110 days under the terms of Hegazy 1999; from memory. */
  @Test
  void fengsLeastTotalAtHisIndirectCost() throws Exception {
    CurveAnswer answer = answer("feng-18");
    Finish at = answer.rows().stream().filter(row -> row.duration() == 110).findFirst().get();
    assertEquals(new BigDecimal("161270.00"), at.direct().cents().add(new BigDecimal(110 * 500)));
  }

  /** NOTES of the demo: 333 to 332 hours cost 24,120, the next four 3,000 each. */
  @Test
  void hoursComeInLumps() throws Exception {
    CurveAnswer answer = answer("outage-measures");
    assertEquals(new BigDecimal("24120.00"), price(answer, 333));
    for (long hours = 332; hours > 328; hours--) {
      assertEquals(new BigDecimal("3000.00"), price(answer, hours));
    }
  }

  /** A measure that is quicker and cheaper than the normal way is in use from the first row on. */
  @Test
  void aWayThatSavesMoneyIsTakenAtOnce() throws Exception {
    CurveAnswer answer = answer("outage-measures");
    int t8 = answer.of().network().indexOf("T8").orElseThrow();
    assertTrue(answer.curve().firstPlan().measure(t8) != Plan.NO_MEASURE);
    assertEquals(40, answer.curve().firstPlan().duration(t8));
  }

  private static BigDecimal price(CurveAnswer answer, long duration) {
    return answer.rows().stream()
        .filter(row -> row.duration() == duration)
        .findFirst()
        .flatMap(Finish::pricePerUnit)
        .orElseThrow()
        .cents();
  }

  private static String units(CurveAnswer answer, long ticks) {
    return answer.of().network().scale().text(ticks);
  }

  private static CurveAnswer answer(String name) throws Exception {
    Reading reading = CaseReader.read(folder(name), TimeScale.WHOLE);
    Case of = assertInstanceOf(Reading.Sound.class, reading).of();
    return CurveQuestion.ask(of, OptionalLong.empty(), 0, Watcher.NONE);
  }

  private static List<String> rows(String name) throws IOException {
    List<String> lines = Files.readAllLines(folder(name).resolve("expected.csv"));
    return lines.subList(1, lines.size());
  }

  private static Path folder(String name) {
    return Path.of("src/test/resources/measured", name);
  }
}
