package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import dayworth.casefile.CaseReader;
import dayworth.casefile.Reading;
import dayworth.engine.Change;
import dayworth.value.TimeScale;
import java.io.IOException;
import java.io.InputStream;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalLong;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The demo cases against tables that were computed outside this program (two linear-programming
 * codes and an exact flow method agreed on them).
 */
class DemoCasesTest {

  @ParameterizedTest
  @ValueSource(strings = {"starter", "ferry-berth-core", "outage"})
  void everyBreakpointCostsWhatTheTableSays(String name) throws IOException, FinishTooEarly {
    CurveAnswer answer = answer(name);
    List<String> found =
        answer.rows().stream()
            .filter(Finish::breakpoint)
            .map(row -> units(answer, row.duration()) + "," + row.direct().cents())
            .toList();
    assertEquals(rows(name, "expected.csv"), found);
  }

  /** One cheapest plan that relaxes least; prices and numbers of critical activities are unique. */
  @ParameterizedTest
  @ValueSource(strings = {"starter", "ferry-berth-core", "outage"})
  void everyStepHasThePriceAndTheRelaxationsOfTheTable(String name)
      throws IOException, FinishTooEarly {
    CurveAnswer answer = answer(name);
    List<String> expected =
        rows(name, "expected-steps.csv").stream()
            .map(row -> row.split(",", -1))
            .map(cells -> String.join(",", cells[0], cells[1], cells[2], relaxed(cells[3])))
            .toList();
    List<String> found =
        answer.steps().stream()
            .map(StepFacts::step)
            .map(
                step ->
                    String.join(
                        ",",
                        units(answer, step.from()),
                        units(answer, step.to()),
                        step.pricePerTick()
                            .times(answer.of().network().scale().ticksPerUnit())
                            .cents()
                            .toPlainString(),
                        step.changes().stream()
                            .filter(Change::isRelaxation)
                            .map(change -> relaxed(answer, change))
                            .collect(Collectors.joining("; "))))
            .toList();
    assertEquals(expected, found);
  }

  private static String relaxed(String changes) {
    return List.of(changes.split("; ", -1)).stream()
        .filter(change -> change.startsWith("relax"))
        .collect(Collectors.joining("; "));
  }

  private static String relaxed(CurveAnswer answer, Change change) {
    String id = answer.curve().network().activity(change.activity()).id();
    return "relax " + id + " by " + units(answer, -change.shortened());
  }

  @ParameterizedTest
  @CsvSource({"starter,16,74800", "ferry-berth-core,173,7799650", "outage,327,5294450"})
  void theLeastTotalIsWhereItShouldBe(String name, long duration, BigDecimal total)
      throws IOException, FinishTooEarly {
    CurveAnswer answer = answer(name);
    assertEquals(1, answer.least().size());
    assertEquals(String.valueOf(duration), units(answer, answer.leastTotal().duration()));
    assertEquals(0, total.compareTo(answer.leastTotal().total()));
  }

  /**
   * With its sections and running costs; change of the total from 120 working days to go on. The
   * table was computed outside this program.
   */
  @Test
  void theFerryBerthUnderWayChangesAsTheTableSays() throws IOException, FinishTooEarly {
    CurveAnswer answer = answer("ferry-berth-status");
    List<Finish> rows = answer.rows().stream().filter(row -> row.duration() <= 120).toList();
    BigDecimal first = rows.get(0).total();
    List<String> found =
        rows.stream()
            .map(
                row -> row.duration() + "," + date(answer, row) + "," + row.total().subtract(first))
            .toList();
    assertEquals(rows("ferry-berth-status", "expected-change.csv"), found);
    assertEquals(List.of(), answer.unproved());
  }

  private static String date(CurveAnswer answer, Finish row) {
    return answer.of().terms().calendar().orElseThrow().finishDate(row.duration()).toString();
  }

  private static String units(CurveAnswer answer, long ticks) {
    return answer.of().network().scale().text(ticks);
  }

  private static CurveAnswer answer(String name) throws FinishTooEarly {
    Reading reading = CaseReader.read(Path.of("cases", name), TimeScale.WHOLE);
    Case of = assertInstanceOf(Reading.Sound.class, reading).of();
    return CurveQuestion.ask(of, OptionalLong.empty(), Long.MAX_VALUE, Watcher.NONE);
  }

  private static List<String> rows(String name, String file) throws IOException {
    try (InputStream in = DemoCasesTest.class.getResourceAsStream("/demo/" + name + "/" + file)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8).lines().skip(1).toList();
    }
  }
}
