package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.casefile.CaseReader;
import dayworth.casefile.Reading;
import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Span;
import dayworth.report.PlanTable;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.io.IOException;
import java.io.InputStream;
import java.math.BigDecimal;
import java.net.URISyntaxException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;

/**
 * The ferry berth as it stands on 16 July 2027, without its sections and running costs. Dates and
 * changes of total are those of the table that came with the case, computed outside this program.
 */
class FerryBerthStatusTest {

  private static final String FOLDER = "/demo/ferry-berth-status";

  private static CurveAnswer answer() throws FinishTooEarly {
    try {
      Path folder = Path.of(FerryBerthStatusTest.class.getResource(FOLDER).toURI());
      Reading reading = CaseReader.read(folder, TimeScale.WHOLE);
      Case of = assertInstanceOf(Reading.Sound.class, reading).of();
      return CurveQuestion.ask(of, OptionalLong.empty(), Long.MAX_VALUE, Watcher.NONE);
    } catch (URISyntaxException impossible) {
      throw new IllegalStateException(impossible);
    }
  }

  private static List<String[]> expected() throws IOException {
    try (InputStream in =
        FerryBerthStatusTest.class.getResourceAsStream(FOLDER + "/expected-change.csv")) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8)
          .lines()
          .skip(1)
          .map(line -> line.split(",", -1))
          .toList();
    }
  }

  @Test
  void everyFinishHasTheDateThatTheMakersOfTheCaseCounted() throws IOException, FinishTooEarly {
    CurveAnswer answer = answer();
    List<String[]> rows = expected();
    assertEquals(
        rows.stream().map(cells -> cells[0] + " " + cells[1]).toList(),
        answer.rows().stream()
            .map(
                row ->
                    row.duration()
                        + " "
                        + answer.of().terms().calendar().orElseThrow().finishDate(row.duration()))
            .toList());
    assertEquals("2028-01-07", rows.get(0)[1]);
    assertEquals("2027-12-06", rows.get(21)[1]);
  }

  /**
   * With what else runs in the whole case: the barge from M4's start to M6's finish at 7,400 a day,
   * the crane from C1's start to M8's finish at 1,150, and K3 due on 22 October, 1,500 a calendar
   * day up to 45,000. K3's finish is tried day by day: work of a fixed length after K3 holds it
   * back from the end.
   */
  @Test
  void totalsChangeAsTheTableSays() throws IOException, FinishTooEarly {
    CurveAnswer answer = answer();
    BigDecimal first = leastWithRunning(answer, 120);
    for (String[] cells : expected()) {
      BigDecimal change = leastWithRunning(answer, Long.parseLong(cells[0])).subtract(first);
      assertEquals(new BigDecimal(cells[2]), change, cells[0]);
    }
  }

  private static BigDecimal leastWithRunning(CurveAnswer answer, long finish) {
    Case of = answer.of();
    WorkingCalendar calendar = of.terms().calendar().orElseThrow();
    List<BigDecimal> totals = new ArrayList<>();
    for (long handedOver = 78; handedOver <= finish; handedOver++) {
      Curve curve = Stepping.curve(heldBack(of, finish - handedOver), PieceWitness.NONE);
      if (curve.shortest() <= finish) {
        LocalDate date = calendar.finishDate(handedOver);
        long late = Math.max(0, ChronoUnit.DAYS.between(LocalDate.of(2027, 10, 22), date));
        BigDecimal section = BigDecimal.valueOf(Math.min(45_000, 1_500 * late));
        BigDecimal other = of.terms().at(finish).sum().cents();
        totals.add(curve.costAt(finish).cents().add(other).add(section));
      }
    }
    return totals.stream().min(BigDecimal::compareTo).orElseThrow();
  }

  /** What is to go with what runs, and K3 at least so many days before the end. */
  private static Network heldBack(Case of, long days) {
    Network toGo = of.network();
    List<Activity> activities = new ArrayList<>(toGo.activities());
    activities.add(Activity.fixed("after K3", days, Money.ZERO));
    List<Link> links = new ArrayList<>(toGo.links());
    links.add(Link.finishToStart(index(of, "K3"), toGo.size()));
    return new Network(
        toGo.scale(),
        activities,
        links,
        List.of(runs(of, "M4", "M6", 7_400), runs(of, "C1", "M8", 1_150)));
  }

  private static Span runs(Case of, String from, String to, long rate) {
    Moment start = Moment.startOf(index(of, from));
    return new Span(from, start, Moment.finishOf(index(of, to)), 0, Money.of(rate));
  }

  private static int index(Case of, String id) {
    return of.network().indexOf(id).orElseThrow();
  }

  /**
   * Direct cost to go, by hand. Not started: F4 98,000, F5 24,000, F6 142,000, H2 82,000, M4
   * 92,000, M5 186,000, M6 158,000, M7 196,000, M8 268,000, M9 144,000, C1 248,000, C2 4,000, C5
   * 326,000, E2 112,000, E4 94,000, I1 72,000, I2 186,000, K1 80,000, K2 36,000, K4 58,000, K5
   * 54,000: 2,660,000. The rest of A6 34/85 of 8,000, F2 31/62 of 546,000, F3 28/56 of 387,500, H1
   * 52/78 of 273,000, B1 20/60 of 64,000, M1 8/16 of 252,000, C3 13/26 of 164,000, C4 10/20 of
   * 96,000, C6 12/44 of 214,000, E1 47/105 of 318,000, E3 21/24 of 128,000: 1,241,989.83.
   *
   * <p>120 days: 7 January, 175 days from 17 July on: 175/7 × 19,500 = 487,500; 45 days late, 43 ×
   * 5,000 is capped. 99 days: 6 December, 143 days: 398,357.14; 11 × 5,000.
   */
  @Test
  void moneyToGoIsWhatItsPartsAddUpTo() throws FinishTooEarly {
    CurveAnswer answer = answer();
    Finish asItStands = answer.asPlanned();
    assertEquals(120, asItStands.duration());
    assertEquals(new BigDecimal("3901989.83"), asItStands.direct().cents());
    assertEquals(new BigDecimal("487500.00"), asItStands.other().timeRelated().cents());
    assertEquals(new BigDecimal("150000.00"), asItStands.other().damages().cents());
    Finish shortest = answer.shortest();
    assertEquals(99, shortest.duration());
    assertEquals(new BigDecimal("398357.14"), shortest.other().timeRelated().cents());
    assertEquals(new BigDecimal("55000.00"), shortest.other().damages().cents());
  }

  /**
   * Slopes by hand: K5 10,200 / 6 = 1,700, H2 10,250 / 5 = 2,050, the rest of H1 (203,500 −
   * 182,000) / 10 = 2,150, B1 8,250 / 15 = 550, K1 9,000 / 3 = 3,000, E4 6,000 / 4 = 1,500, C1
   * 23,400 / 9 = 2,600. H1 with B1 2,700, H2 with E4 3,550, H1 with C1 4,750. Of B1 20 of 60 days
   * are left, so 15 of its 45.
   */
  @Test
  void pricesAreThoseOfTheWorkThatIsLeft() throws FinishTooEarly {
    CurveAnswer answer = answer();
    assertEquals(
        List.of(
            "120 to 117 1700.00",
            "117 to 115 2050.00",
            "115 to 111 2700.00",
            "111 to 108 3000.00",
            "108 to 105 3550.00",
            "105 to 99 4750.00"),
        answer.steps().stream()
            .map(facts -> facts.step())
            .map(step -> step.from() + " to " + step.to() + " " + step.pricePerTick().cents())
            .toList());
    Activity bearings = answer.of().network().activity(index(answer.of(), "B1"));
    assertEquals(20, bearings.normal());
    assertEquals(15, bearings.crash());
  }

  @Test
  void workThatBeganOutOfSequenceIsWarnedOf() throws FinishTooEarly {
    List<String> warnings =
        answer().of().warnings().stream()
            .filter(warning -> warning.file().equals("progress.csv"))
            .map(warning -> warning.place() + " " + warning.wrong())
            .toList();
    assertEquals(
        List.of(
            "progress.csv:23 started started before C4 is finished",
            "progress.csv:23 started started before C6 is finished"),
        warnings);
  }

  /** C4 may finish 6 after C3's 13, at 19; then E3's 21: 40, of which nothing has to be hurried. */
  @Test
  void thePlanTellsActualDatesAndWhatIsToCome() throws FinishTooEarly {
    List<String> rows = PlanTable.of(answer()).lines().toList();
    assertEquals("A1,Marine works permit,0,,0,0.00,,,2027-03-15,2027-05-21,,,,,,,no", rows.get(1));
    String cables = rows.stream().filter(row -> row.startsWith("E3,")).findFirst().orElseThrow();
    assertTrue(
        cables.startsWith(
            "E3,Pull and terminate cables (14 km),21,,0,0.00,,40,2027-07-13,2027-09-13,19,40,"),
        cables);
  }

  @Test
  void nothingFinishedIsCriticalOrNamedInTheFacts() throws FinishTooEarly {
    Case of = answer().of();
    CheckAnswer facts = CheckQuestion.ask(of);
    assertEquals(33, of.toGo());
    for (List<Integer> named :
        List.of(facts.openStarts(), facts.openEnds(), facts.nearCritical())) {
      assertTrue(named.stream().allMatch(of::isToGo), named.toString());
    }
    assertTrue(facts.firstChains().stream().flatMap(List::stream).allMatch(of::isToGo));
  }
}
