package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.casefile.CaseReader;
import dayworth.casefile.Reading;
import dayworth.value.TimeScale;
import java.io.IOException;
import java.io.InputStream;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalLong;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/**
 * The whole ferry berth: dates, a section, running costs, measures with a package, and labour whose
 * spells are chosen among the other measures.
 */
class FerryBerthTest {

  /**
   * Where a spell ends in a part week, its days may be counted otherwise: see the table's notes.
   */
  private static final BigDecimal PART_WEEK = BigDecimal.TEN;

  private static CurveAnswer answer;

  @BeforeAll
  static void ask() throws FinishTooEarly {
    Reading reading = CaseReader.read(Path.of("cases", "ferry-berth"), TimeScale.WHOLE);
    Case of = assertInstanceOf(Reading.Sound.class, reading).of();
    answer = CurveQuestion.ask(of, OptionalLong.empty(), 0, Watcher.NONE);
  }

  private static Finish row(int days) {
    long ticks = days * answer.of().network().scale().ticksPerUnit();
    return answer.rows().stream().filter(row -> row.duration() == ticks).findFirst().orElseThrow();
  }

  private static String date(Finish row) {
    return answer.of().terms().calendar().orElseThrow().finishDate(row.duration()).toString();
  }

  /** The table was computed outside this program: two integer solvers agreed on it. */
  @Test
  void everyFinishCostsWhatTheTableSays() throws IOException {
    try (InputStream in =
        FerryBerthTest.class.getResourceAsStream("/demo/ferry-berth/expected-total.csv")) {
      List<String> rows =
          new String(in.readAllBytes(), StandardCharsets.UTF_8).lines().skip(1).toList();
      assertEquals(37, rows.size());
      for (String expected : rows) {
        String[] cells = expected.split(",", -1);
        Finish found = row(Integer.parseInt(cells[0]));
        assertEquals(cells[1], date(found), expected);
        BigDecimal difference = found.total().subtract(new BigDecimal(cells[3])).abs();
        assertTrue(difference.compareTo(PART_WEEK) <= 0, expected + ", found " + found.total());
      }
    }
    assertEquals(List.of(), answer.unproved());
  }

  /** All three added up by hand, to the cent; the first as it stands, all the normal way. */
  @Test
  void threeTotalsAreThoseAddedUpByHand() {
    assertEquals(new BigDecimal("8437821.43"), answer.asPlanned().total());
    assertEquals(new BigDecimal("8211225.43"), row(176).total());
    assertEquals(new BigDecimal("8194970.82"), row(172).total());
    assertEquals("2027-11-17", date(answer.leastTotal()));
    assertEquals(row(172), answer.leastTotal());
  }
}
