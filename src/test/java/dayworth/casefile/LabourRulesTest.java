package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.Labour;
import dayworth.network.Measure;
import dayworth.network.Network;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Each rule for labour.csv, and what labour makes of an activity. */
class LabourRulesTest {

  private static final String HEADER = "activity,labour_hours,crew,rate,other_cost\n";

  @TempDir private Path folder;

  private LabourOnDisk disk() throws IOException {
    return new LabourOnDisk(folder);
  }

  private LabourOnDisk labour(String rows) throws IOException {
    return disk().with("labour.csv", HEADER + rows);
  }

  /** 480 h by 6 at 40 h a week: 2 weeks, 10 days; 480 × 40 + 1,000 = 20,200. */
  @Test
  void blankDurationAndCostAreThoseOfTheLabour() throws IOException {
    Network network = disk().disk().sound().network();
    assertEquals("10", network.scale().text(network.activity(0).normal()));
    assertEquals(Money.of(20_200), network.activity(0).normalCost());
  }

  /**
   * A week of long days: 288 h; 192 h at 240 a week are 0.8 weeks: 9 days. 6 × 5 × 40 = 1,200 more
   * pay, 12 h × 40 = 480 lost, 450. To the end: 480 / 288 = 5/3 weeks, 8.334 days; 5/3 × 2,130 =
   * 3,550.
   */
  @Test
  void spellsBecomeMeasuresOfTheNetwork() throws IOException {
    Network network = disk().disk().sound().network();
    assertEquals(
        List.of(
            new Measure(
                0,
                "long days 1 week",
                9_000,
                Money.of(22_330),
                OptionalInt.empty(),
                false,
                "foreman"),
            new Measure(
                0,
                "long days 1.667 weeks",
                8_334,
                Money.of(23_750),
                OptionalInt.empty(),
                false,
                "foreman")),
        network.measures().list());
  }

  @Test
  void whatIsStatedIsKeptIfItIsNearTheLabour() throws IOException {
    LabourOnDisk stated =
        disk().with("activities.csv", "id,normal_duration,normal_cost\nA,10.5,20000\nB,10,5000\n");
    stated.expectWarnings(
        "activities.csv:3 id | no successor | B"
            + " | a link to what waits for it, unless only the project's finish does");
    ActivityBuildUp built = stated.disk().sound().buildUp().of(0).orElseThrow();
    assertEquals(10_500, built.normal());
    // 9 of 10 days by the labour: 9.45 of 10.5; 2,130 more than 20,000.
    assertEquals(9_450, built.ways().get(0).duration());
    assertEquals(Money.of(22_130), built.ways().get(0).cost());
  }

  @Test
  void aDifferenceOfMoreThanATwentiethIsDoubtful() throws IOException {
    disk()
        .with(
            "activities.csv",
            "id,normal_duration,normal_cost,predecessors\nA,10.501,19100,\nB,10,5000,A\n")
        .expectWarnings(
            "activities.csv:2 normal_cost | differs from its labour by more than 5 % | 19100"
                + " | the labour comes to 20200.00; what is stated is kept",
            "activities.csv:2 normal_duration | differs from its labour by more than 5 % | 10.501"
                + " | the labour comes to 10; what is stated is kept");
  }

  @Test
  void onlyAnActivityWithLabourMayBeBlank() throws IOException {
    disk()
        .with("activities.csv", "id,normal_duration,normal_cost,predecessors\nA,,,\nB,,,A\n")
        .expect(
            "activities.csv:3 normal_cost | blank |  | this cell is needed",
            "activities.csv:3 normal_duration | blank |  | this cell is needed");
  }

  @Test
  void aMilestoneTakesNoLabour() throws IOException {
    disk()
        .with("activities.csv", "id,normal_duration,normal_cost,predecessors\nA,0,,\nB,1,1,A\n")
        .expect(
            "activities.csv:2 normal_duration | a milestone takes no labour | 0"
                + " | more than 0 or blank, or no row in labour.csv");
  }

  @Test
  void crashFiguresAreHeldAgainstTheLabour() throws IOException {
    String header = "id,normal_duration,normal_cost,crash_duration,crash_cost,predecessors\n";
    disk()
        .with("activities.csv", header + "A,,,11,21000,\nB,10,5000,,,A\n")
        .expect(
            "activities.csv:2 crash_duration | longer than the normal duration | 11"
                + " | at most 10, the normal duration by its labour");
    disk()
        .with("activities.csv", header + "A,,,10,21000,\nB,10,5000,,,A\n")
        .expect(
            "activities.csv:2 crash_cost | another cost for the same duration | 21000"
                + " | 20200.00 by its labour");
    disk()
        .with("activities.csv", header + "A,10,,10,21000,\nB,10,5000,,,A\n")
        .expect(
            "activities.csv:2 crash_cost | another cost for the same duration | 21000"
                + " | 20200.00 by its labour");
    disk()
        .with("activities.csv", header + "A,10,,11,21000,\nB,10,5000,,,A\n")
        .expect(
            "activities.csv:2 crash_duration | longer than the normal duration | 11"
                + " | at most 10, the normal duration");
    disk().with("activities.csv", header + "A,,,9,21000,\nB,10,5000,,,A\n").expect();
  }

  @Test
  void anUnknownActivityIsNamedWithTheNearest() throws IOException {
    labour("A,480,6,40,\nBB,480,6,40,\n")
        .expect("labour.csv:3 activity | BB is no activity | BB | nearest is B");
  }

  @Test
  void anActivityHasOneRow() throws IOException {
    labour("A,480,6,40,\nA,240,6,40,\n")
        .expect("labour.csv:3 activity | a second row of this activity | A | line 2 has it");
  }

  @Test
  void hoursCrewAndRateAreNeeded() throws IOException {
    labour("A,,,,\n")
        .expect(
            "labour.csv:2 crew | blank |  | this cell is needed",
            "labour.csv:2 labour_hours | blank |  | this cell is needed",
            "labour.csv:2 rate | blank |  | this cell is needed");
  }

  @Test
  void nothingIsBelowWhatItCanBe() throws IOException {
    labour("A,0,0,-1,-1\n")
        .expect(
            "labour.csv:2 crew | too small | 0 | more than 0, at most 100000 workers",
            "labour.csv:2 labour_hours | too small | 0 | more than 0, at most 1000000000",
            "labour.csv:2 other_cost | negative | -1 | 0 or more",
            "labour.csv:2 rate | negative | -1 | 0 or more");
  }

  @Test
  void workThatTakesTooLongIsRefused() throws IOException {
    labour("A,1000000000,1,40,\n")
        .expect(
            "labour.csv:2 labour_hours | takes too long | "
                + " | fewer labour_hours or a bigger crew: at most 1000000 time units");
  }

  @Test
  void aSpellWithoutAnEndIsRefused() throws IOException {
    labour("A,1000000,6,40,\n")
        .with("patterns.csv", "pattern,hours_per_week,days_per_week\nnormal,40,5\nlong days,50,5\n")
        .expect(
            "labour.csv:2 labour_hours | takes more than 520 weeks | long days"
                + " | a weeks_max for it in patterns.csv");
  }

  @Test
  void aThousandsMarkInHoursIsAskedAbout() throws IOException {
    disk()
        .with("labour.csv", "activity;labour_hours;crew;rate\nA;1.536;6;40\n")
        .expect(
            "labour.csv:2 labour_hours | the point may be a thousands mark | 1.536"
                + " | write 1536 or 1.5360");
  }

  @Test
  void labourNeedsPatterns() throws IOException {
    disk();
    Files.delete(folder.resolve("patterns.csv"));
    Files.delete(folder.resolve("pay.csv"));
    Files.delete(folder.resolve("output_loss.csv"));
    assertEquals(
        List.of(
            "labour.csv | tells nothing without patterns |  | patterns.csv with a row for the"
                + " normal pattern"),
        new CaseOnDisk(folder).problems());
  }

  @Test
  void patternsWithoutLabourChangeNothing() throws IOException {
    disk().with("activities.csv", "id,normal_duration,normal_cost\nA,5,100\n");
    Files.delete(folder.resolve("labour.csv"));
    assertEquals(
        List.of(
            "output_loss.csv | changes nothing |  | it is used with labour.csv",
            "patterns.csv | changes nothing |  | it is used with labour.csv",
            "pay.csv | changes nothing |  | it is used with labour.csv"),
        new CaseOnDisk(folder).warnings());
  }

  /** In weeks 10 days are two; in hours of eight 80; with six working days a week 12 days. */
  @Test
  void aWeekIsTheWorkingDaysOfTheCase() throws IOException {
    assertEquals("2", normal("time_unit,week\n"));
    assertEquals("80", normal("time_unit,hour\nunits_per_working_day,8\n"));
    assertEquals("12", normal("working_days,Mon Tue Wed Thu Fri Sat\n"));
    assertEquals("4", normal("time_unit,shift\nunits_per_working_day,2\nworking_days,Mon\n"));
  }

  private String normal(String terms) throws IOException {
    Network network = disk().with("terms.csv", "term,value\n" + terms).disk().sound().network();
    return network.scale().text(network.activity(0).normal());
  }

  /**
   * Four of ten days are left: 192 of 480 h, 400 of 1,000, and 0.4 × 20,200 = 8,080. Long days do
   * them in 192 / 288 = 2/3 weeks: 3.334 days, for 2/3 × 2,130 = 1,420 more. B is finished.
   */
  @Test
  void workInProgressUsesItsRemainingHours() throws IOException {
    LabourOnDisk started =
        disk()
            .with("labour.csv", LabourOnDisk.LABOUR + "B,480,6,40,\n")
            .with("activities.csv", "id,normal_duration,normal_cost\nA,,\nB,10,19200\nC,1,1\n")
            .with("terms.csv", "term,value\nstart_date,2027-03-01\ndata_date,2027-03-12\n")
            .with(
                "progress.csv",
                """
                activity,started,finished,remaining_duration
                A,2027-03-01,,4
                B,2027-03-01,2027-03-12,
                """);
    ActivityBuildUp built = started.disk().sound().buildUp().of(0).orElseThrow();
    assertEquals(
        new Labour(Quantity.of(192), Quantity.of(6), Money.of(40), Money.of(400)), built.labour());
    assertEquals(4_000, built.normal());
    assertEquals(Money.of(8_080), built.normalCost());
    assertEquals(1, built.ways().size());
    assertEquals(3_334, built.ways().get(0).duration());
    assertEquals(Money.of(9_500), built.ways().get(0).cost());
    assertEquals(Optional.empty(), started.disk().sound().buildUp().of(1));
    Measure measure = started.disk().sound().network().measures().get(0);
    assertEquals("long days 0.667 weeks", measure.name());
    assertEquals(true, measure.ofRemaining());
  }
}
