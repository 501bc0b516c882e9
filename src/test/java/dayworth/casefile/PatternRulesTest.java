package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.buildup.BuildUp;
import dayworth.value.Quantity;
import dayworth.value.TimeScale;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Each rule for patterns.csv, pay.csv and output_loss.csv. */
class PatternRulesTest {

  private static final String PATTERNS =
      "pattern,hours_per_week,days_per_week,crew_factor,crowding_loss,once_cost,week_cost,"
          + "weeks_max,note\n";
  private static final String NORMAL = "normal,40,5,,,,,,\n";
  private static final String PAY = "pattern,above_hours,multiplier\n";
  private static final String LOSS = "pattern,week,loss,source\n";

  @TempDir private Path folder;

  private LabourOnDisk patterns(String rows) throws IOException {
    return new LabourOnDisk(folder).with("patterns.csv", PATTERNS + rows);
  }

  private LabourOnDisk pay(String rows) throws IOException {
    return new LabourOnDisk(folder).with("pay.csv", PAY + rows);
  }

  private LabourOnDisk loss(String rows) throws IOException {
    return new LabourOnDisk(folder).with("output_loss.csv", LOSS + rows);
  }

  @Test
  void aPatternHasAName() throws IOException {
    patterns(NORMAL + ",50,5,,,,,,\nlong days,50,5,,,,,,\nlong days,60,6,,,,,,\n")
        .expect(
            "patterns.csv:3 pattern | blank |  | this cell is needed",
            "patterns.csv:5 pattern | a second pattern of this name | long days"
                + " | another name; line 4 has it");
  }

  @Test
  void hoursAndDaysAreThoseOfAWeek() throws IOException {
    patterns(NORMAL + "long days,169,8,,,,,,\nall,,,,,,,,\nno,0,0,,,,,,\n")
        .expect(
            "patterns.csv:3 days_per_week | too large | 8 | more than 0, at most 7",
            "patterns.csv:3 hours_per_week | too large | 169"
                + " | more than 0, at most 168, the hours of a week",
            "patterns.csv:4 days_per_week | blank |  | this cell is needed",
            "patterns.csv:4 hours_per_week | blank |  | this cell is needed",
            "patterns.csv:5 days_per_week | too small | 0 | more than 0, at most 7",
            "patterns.csv:5 hours_per_week | too small | 0"
                + " | more than 0, at most 168, the hours of a week");
  }

  @Test
  void aDayHasTwentyFourHours() throws IOException {
    patterns(NORMAL + "long days,121,5,,,,,,\n")
        .expect(
            "patterns.csv:3 hours_per_week | a day would have more than 24 hours | 121"
                + " | at most 120 on those days");
  }

  @Test
  void theFirstRowIsTheNormalPatternAndHasNothingOfItsOwn() throws IOException {
    patterns("normal,40,5,2,0.1,10,20,3,\nlong days,50,5,,,,,,\n")
        .expect(
            "patterns.csv:2 crew_factor | the first row is the normal pattern | 2"
                + " | 1 or blank; crew in labour.csv holds it",
            "patterns.csv:2 crowding_loss | the first row is the normal pattern | 0.1"
                + " | 0 or blank; labour_hours in labour.csv holds it",
            "patterns.csv:2 once_cost | the first row is the normal pattern | 10"
                + " | 0 or blank; other_cost in labour.csv holds it",
            "patterns.csv:2 weeks_max | the first row is the normal pattern | 3"
                + " | blank: it lasts as long as the work");
  }

  @Test
  void sharesFactorsAndWeeksHaveTheirLimits() throws IOException {
    patterns(NORMAL + "long days,50,5,0,1,-1,-1,0,\nother,50,5,1,12.5,,,2.5,\n")
        .expect(
            "patterns.csv:3 crew_factor | too small | 0 | more than 0, at most 100",
            "patterns.csv:3 crowding_loss | too large | 1"
                + " | 0 or more and below 1, such as 0.15 for 15 %",
            "patterns.csv:3 once_cost | negative | -1 | 0 or more",
            "patterns.csv:3 week_cost | negative | -1 | 0 or more",
            "patterns.csv:3 weeks_max | too small | 0 | a whole number from 1 to 520",
            "patterns.csv:4 crowding_loss | too large | 12.5"
                + " | 0 or more and below 1, such as 0.15 for 15 %",
            "patterns.csv:4 weeks_max | not a whole number | 2.5 | a whole number from 1 to 520");
  }

  @Test
  void withoutAPatternThereIsNoNormalOne() throws IOException {
    new LabourOnDisk(folder)
        .with("patterns.csv", PATTERNS)
        .with("pay.csv", PAY)
        .with("output_loss.csv", LOSS)
        .expect(
            "patterns.csv | no pattern | a header only"
                + " | a row for the normal pattern, then one for each that may be bought");
  }

  @Test
  void theNormalPatternAloneBuysNothing() throws IOException {
    patterns(NORMAL)
        .with("pay.csv", PAY)
        .with("output_loss.csv", LOSS)
        .expectWarnings(
            "patterns.csv | nothing can be bought | one row"
                + " | a row for each pattern that may be bought, below the normal one");
  }

  @Test
  void whatIsNotSaidIsDoubtful() throws IOException {
    patterns(NORMAL + "long days,50,5,,,,,,\n")
        .with("pay.csv", PAY)
        .with("output_loss.csv", LOSS)
        .expectWarnings(
            "patterns.csv:3 pattern | no loss of output is given | long days"
                + " | rows in output_loss.csv; without them no output is lost",
            "patterns.csv:3 pattern | no pay for the longer hours is given | long days"
                + " | rows in pay.csv; without them all hours are straight time");
  }

  @Test
  void aPatternThatIsNamedIsThere() throws IOException {
    pay("long day,40,1.5\n,40,1.5\n")
        .with("output_loss.csv", LOSS + "longdays,1,0.1,x\nhaste,1,0.1,x\n")
        .expect(
            "output_loss.csv:2 pattern | longdays is no pattern | longdays"
                + " | nearest is long days",
            "output_loss.csv:3 pattern | haste is no pattern | haste"
                + " | a pattern of patterns.csv",
            "pay.csv:2 pattern | long day is no pattern | long day | nearest is long days",
            "pay.csv:3 pattern | blank |  | this cell is needed");
  }

  @Test
  void aStepHasItsHoursAndItsMultiplier() throws IOException {
    pay("long days,40,1.5\nlong days,40.0,2\nlong days,-1,0\nlong days,,\n")
        .expect(
            "pay.csv:3 above_hours | a second row of these hours | 40.0"
                + " | other hours; line 2 has them",
            "pay.csv:4 above_hours | negative | -1 | 0 or more, at most 168, the hours of a week",
            "pay.csv:4 multiplier | too small | 0 | more than 0, at most 100",
            "pay.csv:5 above_hours | blank |  | this cell is needed",
            "pay.csv:5 multiplier | blank |  | this cell is needed");
  }

  @Test
  void stepsThatCannotBeMeantAreDoubtful() throws IOException {
    pay("long days,40,0.5\nlong days,50,2\n")
        .expectWarnings(
            "patterns.csv:3 hours_per_week | its pay above 50 hours is never reached | 50"
                + " | less in pay.csv, or more here",
            "pay.csv:2 multiplier | less than straight time | 0.5 | 1 or more is usual");
  }

  @Test
  void aLossIsAShare() throws IOException {
    loss("long days,1,15,x\nlong days,2,,x\nlong days,0,0.1,x\nlong days,3,-1,x\n")
        .expect(
            "output_loss.csv:2 loss | too large | 15 | above -1 and below 1, such as 0.15 for 15 %",
            "output_loss.csv:3 loss | blank |  | this cell is needed",
            "output_loss.csv:4 week | too small | 0 | a whole number from 1 to 520",
            "output_loss.csv:5 loss | negative | -1 | above -1 and below 1, such as 0.15 for 15 %");
  }

  @Test
  void weeksHaveNoGapsAndStandOnce() throws IOException {
    loss("long days,2,0.1,x\nlong days,2,0.1,x\nlong days,4,0.2,x\n")
        .expect(
            "output_loss.csv:2 week | a week before it is missing | 2 | rows from week 1 on",
            "output_loss.csv:3 week | a second row of this week | 2"
                + " | another week; line 2 has it",
            "output_loss.csv:4 week | a week before it is missing | 4 | a row for week 3");
  }

  @Test
  void theNormalPatternLosesNothing() throws IOException {
    loss("normal,1,0.1,x\nlong days,1,0.1,x\n")
        .expect(
            "output_loss.csv:2 pattern | the normal pattern loses nothing | normal"
                + " | no row; labour_hours in labour.csv are those of the normal pattern");
  }

  @Test
  void aLossHasASourceAndIsSeldomAGain() throws IOException {
    loss("long days,1,-0.05,\n")
        .expectWarnings(
            "output_loss.csv:2 loss | a loss below 0 | -0.05 | it is counted as output gained",
            "output_loss.csv:2 source | blank | "
                + " | where the figure is from; a loss without a source is an assumption");
  }

  @Test
  void rowsMayStandInAnyOrder() throws IOException {
    LabourOnDisk mixed = loss("long days,2,0.2,b\nlong days,1,0.1,a\n");
    BuildUp built =
        mixed.with("pay.csv", PAY + "long days,45,2\nlong days,40,1.5\n").disk().sound().buildUp();
    assertEquals(List.of("a", "b"), built.bought().get(0).loss().sources(2));
    // 40 + 5 × 1.5 + 5 × 2
    assertEquals(
        Quantity.of(new BigDecimal("57.5")), built.bought().get(0).pay().paid(Quantity.of(50)));
  }

  @Test
  void aFactorScalesAllLossesAndLeavesSomeOutput() throws IOException {
    loss("long days,1,0.04,x\nlong days,2,0.25,x\n");
    Quantity two = Quantity.of(2);
    Reading.Sound doubled = (Reading.Sound) CaseReader.read(folder, TimeScale.WHOLE, two);
    assertEquals(two, doubled.of().buildUp().lossFactor());
    assertEquals(
        Quantity.of(new BigDecimal("0.5")), doubled.of().buildUp().bought().get(0).loss().in(7));
    Reading.Unsound none =
        (Reading.Unsound) CaseReader.read(folder, TimeScale.WHOLE, Quantity.of(4));
    assertEquals(
        List.of("output_loss.csv:3 loss no output is left, all losses times 4 0.25"),
        none.problems().stream()
            .map(problem -> problem.place() + " " + problem.wrong() + " " + problem.found())
            .toList());
  }
}
