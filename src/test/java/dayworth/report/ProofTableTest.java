package dayworth.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.contract.Terms;
import dayworth.decision.Case;
import dayworth.decision.FinishTooEarly;
import dayworth.decision.MeetAnswer;
import dayworth.decision.MeetQuestion;
import dayworth.decision.TimeUnit;
import dayworth.decision.Watcher;
import dayworth.decision.Wish;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.testing.RandomNetworks;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.io.IOException;
import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;

/** The proof sheet read back from its text and recounted with nothing else. */
class ProofTableTest {

  private static final int SEEDS = 200;
  private static final BigDecimal HALF_A_CENT = new BigDecimal("0.005");

  private static MeetAnswer ask(Network network, Wish wish) throws FinishTooEarly {
    Terms terms = Terms.none(network.scale());
    Case of = new Case("sheet", "", "", TimeUnit.DAY, network, terms, List.of(), List.of());
    return MeetQuestion.ask(of, wish, 0, Watcher.NONE);
  }

  /**
   * A 6 to 4 at 20 a day before =B 4 to 3 at 30, by hand; at 9 A gives one day. 150 + 20; 20 x 6 +
   * 20 x 4 over =B's normal - 20 x 9 = 20.
   */
  @Test
  void theRowsOfASmallSheet() throws FinishTooEarly {
    Network network =
        new Network(
            TimeScale.WHOLE,
            List.of(
                Activity.compressible("A", 6, Money.of(100), 4, Money.of(140)),
                Activity.compressible("=B", 4, Money.of(50), 3, Money.of(80))),
            List.of(Link.finishToStart(0, 1)));
    assertEquals(
        """
        event_from,event_to,kind,activity,branch,length,flow,capacity,plan_cost,bound
        "",,fixed,A,1,,,,100,100
        "",,fixed,'=B,1,,,,50,50
        project start,start of A,begin,A,1,0,20,,,0
        start of A,finish of A,slope,A,1,6,20,20,20,120
        start of =B,finish of =B,slope,'=B,1,4,20,30,,80
        finish of =B,project finish,end,'=B,1,0,20,,,0
        finish of A,start of =B,link FS,,1,0,20,,,0
        project finish,project start,finish,,1,-9,20,,,-180
        """,
        ProofTable.of(ask(network, new Wish.In(9))));
  }

  @Test
  void everySheetIsRecountedFromItsTextAlone() throws FinishTooEarly, IOException {
    int rounded = 0;
    for (int seed = 0; seed < SEEDS; seed++) {
      Network network = RandomNetworks.of(seed, RandomNetworks.Kind.EVERYTHING, 3, 25);
      MeetAnswer answer = ask(network, new Wish.Within(Money.of(seed % 7 * 40L)));
      List<CSVRecord> rows = rows(ProofTable.of(answer));
      String at = "seed " + seed;
      BigDecimal plan = sum(rows, "plan_cost");
      assertEquals(0, plan.compareTo(sum(rows, "bound")), at);
      BigDecimal off = plan.subtract(answer.finish().spent().cents()).abs();
      assertTrue(off.compareTo(HALF_A_CENT.multiply(BigDecimal.valueOf(2))) <= 0, at + ": " + off);
      Map<String, BigDecimal> left = new TreeMap<>();
      for (CSVRecord row : rows) {
        rounded += row.get("kind").equals("rounding") ? 1 : 0;
        recount(row, left, at);
      }
      left.forEach((event, rest) -> assertEquals(0, rest.signum(), at + ", " + event));
    }
    assertTrue(rounded > SEEDS / 10, "too few are rounded: " + rounded);
  }

  private static void recount(CSVRecord row, Map<String, BigDecimal> left, String at) {
    if (row.get("flow").isEmpty()) {
      if (row.get("kind").equals("rounding")) {
        assertTrue(new BigDecimal(row.get("bound")).compareTo(HALF_A_CENT) < 0, at);
      } else {
        assertEquals(row.get("plan_cost"), row.get("bound"), at);
      }
      return;
    }
    BigDecimal flow = new BigDecimal(row.get("flow"));
    BigDecimal bound = new BigDecimal(row.get("length")).multiply(flow);
    assertEquals(0, bound.compareTo(new BigDecimal(row.get("bound"))), at + row);
    boolean within =
        row.get("capacity").isEmpty() || flow.compareTo(new BigDecimal(row.get("capacity"))) <= 0;
    assertTrue(flow.signum() >= 0 && within, at + row);
    left.merge(row.get("event_from"), flow.negate(), BigDecimal::add);
    left.merge(row.get("event_to"), flow, BigDecimal::add);
  }

  private static List<CSVRecord> rows(String text) throws IOException {
    try (CSVParser parser =
        CSVParser.parse(
            text, CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).get())) {
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
