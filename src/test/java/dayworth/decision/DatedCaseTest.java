package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.casefile.CaseReader;
import dayworth.casefile.Reading;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.io.IOException;
import java.math.BigDecimal;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;

/**
 * The ferry berth with its dates and contract, without what runs, sections, measures and labour.
 *
 * <p>By hand: from Monday 15 March 2027, holidays on 26 and 29 March, 6 and 17 May, 13 August, 4
 * October, 24, 27 and 31 December, and one on a Saturday. Time costs 19,500 a week, being late
 * 5,000 a calendar day after 2 days up to 150,000, being early brings 2,500 a calendar day for 14
 * days, up to 30,000; the contract finish is 23 November. Direct costs are those of the linear
 * core, which another linear-programming code found.
 */
class DatedCaseTest {

  private static final String DATED = "/demo/ferry-berth-dated";

  private static Path resource(String name) {
    try {
      return Path.of(DatedCaseTest.class.getResource(name).toURI());
    } catch (URISyntaxException impossible) {
      throw new IllegalStateException(impossible);
    }
  }

  private static CurveAnswer answer() throws FinishTooEarly {
    Reading reading = CaseReader.read(resource(DATED), TimeScale.WHOLE);
    Case of = assertInstanceOf(Reading.Sound.class, reading).of();
    return CurveQuestion.ask(of, OptionalLong.empty(), 10, Watcher.NONE);
  }

  private static Finish row(CurveAnswer answer, long duration) {
    return answer.rows().stream()
        .filter(row -> row.duration() == duration)
        .findFirst()
        .orElseThrow();
  }

  private static void expect(Finish row, String timeRelated, String damages, String bonus) {
    assertEquals(new BigDecimal(timeRelated), row.other().timeRelated().cents());
    assertEquals(new BigDecimal(damages), row.other().damages().cents());
    assertEquals(new BigDecimal(bonus), row.other().bonus().cents());
  }

  @Test
  void everyFinishHasTheDateThatTheMakersOfTheCaseCounted() throws IOException, FinishTooEarly {
    WorkingCalendar calendar = answer().of().terms().calendar().orElseThrow();
    List<String> lines = Files.readAllLines(resource(DATED + "/expected-dates.csv"));
    for (String line : lines.subList(1, lines.size())) {
      String[] cells = line.split(",", -1);
      LocalDate found = calendar.finishDate(Long.parseLong(cells[0]));
      assertEquals(LocalDate.parse(cells[1]), found, line);
    }
    assertEquals(38, lines.size());
  }

  /** 6 September 2027 is a Monday; 120 working days come before it. */
  @Test
  void theTideDateHoldsTheFinish() throws FinishTooEarly {
    CurveAnswer answer = answer();
    int floatIn = answer.of().network().indexOf("I1").orElseThrow();
    assertEquals(120, answer.of().network().activity(floatIn).notBefore());
    // I1 3, I2 4, H2 9, K1 11, K4 12 and K5's last 5: 120 + 44
    assertEquals(164, answer.curve().shortest());
    assertTrue(
        answer.of().warnings().stream()
            .noneMatch(warning -> warning.column().equals("not_before")));
  }

  /**
   * 199 days: 28 December, day 289 from the start: 289 / 7 x 19,500 = 805,071.43; 35 - 2 = 33 days
   * of damages, 165,000, capped. 198: 23 December, 284 days; 28 days, 140,000. So the last working
   * day is five calendar days, and 13,928.57 + 10,000.
   */
  @Test
  void asPlannedItEndsInsideTheYearEndClosure() throws FinishTooEarly {
    expect(answer().asPlanned(), "805071.43", "150000.00", "0.00");
    expect(row(answer(), 198), "791142.86", "140000.00", "0.00");
    assertEquals(0, new BigDecimal("8021571.43").compareTo(answer().asPlanned().total()));
  }

  /**
   * 176 days: 23 November, 254 days: 707,571.43. 178: Thursday 25, 256 days, within the grace. 179:
   * Friday 26, 257 days, 1 day of damages. 180: Monday 29, 4 days.
   */
  @Test
  void aDaySavedAfterTheWeekendIsThree() throws FinishTooEarly {
    CurveAnswer answer = answer();
    expect(row(answer, 176), "707571.43", "0.00", "0.00");
    expect(row(answer, 178), "713142.86", "0.00", "0.00");
    expect(row(answer, 179), "715928.57", "5000.00", "0.00");
    expect(row(answer, 180), "724285.71", "20000.00", "0.00");
  }

  /**
   * 173 days: 18 November, 249 days: 693,642.86; 5 days early: 12,500. 164: 5 November, 236 days;
   * 18 days early: 14 count, 35,000, capped.
   */
  @Test
  void theLeastTotalIsEarly() throws FinishTooEarly {
    CurveAnswer answer = answer();
    expect(row(answer, 173), "693642.86", "0.00", "12500.00");
    expect(row(answer, 164), "657428.57", "0.00", "30000.00");
    // 6,825,450 + 693,642.86 + 310,000 - 12,500
    assertEquals(0, new BigDecimal("7816592.86").compareTo(row(answer, 173).total()));
    assertEquals(List.of(173L), answer.least().stream().map(Finish::duration).toList());
  }

  @Test
  void directCostsAreThoseOfTheCore() throws IOException, FinishTooEarly {
    Map<Long, BigDecimal> core = new HashMap<>();
    for (String line :
        Files.readAllLines(resource("/demo/ferry-berth-core/expected.csv")).stream()
            .skip(1)
            .toList()) {
      String[] cells = line.split(",", -1);
      core.put(Long.parseLong(cells[0]), new BigDecimal(cells[1]));
    }
    List<Long> compared = new ArrayList<>();
    for (Finish row : answer().rows()) {
      if (core.containsKey(row.duration())) {
        assertEquals(core.get(row.duration()), row.direct().cents());
        compared.add(row.duration());
      }
    }
    assertEquals(16, compared.size());
  }
}
