package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.contract.PartWeek;
import dayworth.contract.Per;
import dayworth.contract.Section;
import dayworth.value.Money;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Each rule for sections.csv. */
class SectionRulesTest {

  private static final String HEADER =
      "section,activity,due,damages_rate,damages_per,damages_grace,damages_cap,"
          + "bonus_rate,bonus_per,bonus_cap,bonus_cap_units\n";
  private static final String DATED = "start_date,2027-03-01\n";

  @TempDir private Path folder;

  /** W1 before W2, 5 days each, and rows of terms and of sections. */
  private CaseOnDisk disk(String terms, String sections) throws IOException {
    return new CaseOnDisk(folder)
        .with(
            "activities.csv",
            "id,normal_duration,normal_cost,predecessors\nW1,5,100,\nW2,5,100,W1\n")
        .with("terms.csv", "term,value\ncurrency,EUR\n" + terms)
        .with("sections.csv", HEADER + sections);
  }

  private void expect(String terms, String sections, String... problems) throws IOException {
    assertEquals(List.of(problems), disk(terms, sections).problems());
  }

  @Test
  void everyColumnIsRead() throws IOException {
    Section section =
        disk(
                DATED + "damages_part_week,whole\n",
                "Quay,W1,2027-03-05,70,week,1.5,900,8,calendar_day,50,4\n")
            .sound()
            .momentMoney()
            .sections()
            .get(0);
    assertEquals("Quay", section.name());
    assertEquals(0, section.activity());
    assertEquals(5, section.due().ticks());
    assertEquals(Optional.of(LocalDate.of(2027, 3, 5)), section.due().date());
    assertEquals(Money.of(70), section.damages().rate());
    assertEquals(Per.WEEK, section.damages().per());
    assertEquals(new BigDecimal("1.5"), section.damages().grace());
    assertEquals(Optional.of(Money.of(900)), section.damages().cap());
    assertEquals(PartWeek.WHOLE, section.damages().partWeek());
    assertEquals(Money.of(8), section.bonus().rate());
    assertEquals(Per.CALENDAR_DAY, section.bonus().per());
    assertEquals(Optional.of(Money.of(50)), section.bonus().cap());
    assertEquals(Optional.of(new BigDecimal("4")), section.bonus().capCount());
  }

  @Test
  void anUnknownActivityIsNamedWithTheNearest() throws IOException {
    expect(
        "",
        "Quay,W11,5,70,,,,,,,\nYard,paving,5,70,,,,,,,\n",
        "sections.csv:2 activity | W11 is no activity | W11 | nearest is W1",
        "sections.csv:3 activity | paving is no activity | paving | an id of activities.csv");
  }

  @Test
  void aNameStandsOnce() throws IOException {
    expect(
        "",
        "Quay,W1,5,70,,,,,,,\nQuay,W2,9,70,,,,,,,\n",
        "sections.csv:3 section | a second section of this name | Quay | line 2 has it");
  }

  @Test
  void oneActivityMayCompleteTwoSections() throws IOException {
    expect("", "Quay,W1,5,70,,,,,,,\nYard,W1,6,70,,,,,,,\n");
  }

  @Test
  void nameActivityAndDueAreNeeded() throws IOException {
    expect(
        "",
        ",W1,5,70,,,,,,,\nYard,,5,70,,,,,,,\nShed,W1,,70,,,,,,,\n",
        "sections.csv:2 section | blank |  | this cell is needed",
        "sections.csv:3 activity | blank |  | this cell is needed",
        "sections.csv:4 due | blank |  | this cell is needed");
  }

  @Test
  void aDueDateNeedsAStartDate() throws IOException {
    expect(
        "",
        "Quay,W1,2027-03-05,70,,,,,,,\n",
        "sections.csv:2 due | a date needs a start_date | 2027-03-05"
            + " | a row for start_date in terms.csv, or a number of time units");
  }

  @Test
  void aDueDateIsNotBeforeTheStartDate() throws IOException {
    expect(
        DATED,
        "Quay,W1,2027-02-28,70,,,,,,,\nYard,W1,2027-03-01,70,,,,,,,\n",
        "sections.csv:2 due | before the start_date | 2027-02-28"
            + " | on 2027-03-01, the start_date, or later");
  }

  /** A million working weeks of one Sunday each are 19,165 years. */
  @Test
  void aDueTimeHasADate() throws IOException {
    expect(
        DATED + "time_unit,week\nworking_days,Sun\n",
        "Quay,W1,1000000,70,,,,,,,\n",
        "sections.csv:2 due | after the year 9999 |  | an earlier due time");
  }

  @Test
  void moneyByTheDateNeedsDates() throws IOException {
    expect(
        "",
        "Quay,W1,5,70,week,,,8,calendar_day,,\n",
        "sections.csv:2 bonus_per | calendar_day needs dates | calendar_day"
            + " | a row for start_date in terms.csv, or unit",
        "sections.csv:2 damages_per | week needs dates | week"
            + " | a row for start_date in terms.csv, or unit");
  }

  @Test
  void graceAndCapsNeedTheirRate() throws IOException {
    expect(
        "",
        "Quay,W1,5,,,1,900,,,,\nYard,W1,5,70,,,,,,50,4\n",
        "sections.csv:2 damages_cap | means nothing without damages_rate | 900 | a damages_rate",
        "sections.csv:2 damages_grace | means nothing without damages_rate | 1 | a damages_rate",
        "sections.csv:3 bonus_cap | means nothing without bonus_rate | 50 | a bonus_rate",
        "sections.csv:3 bonus_cap_units | means nothing without bonus_rate | 4 | a bonus_rate");
  }

  @Test
  void aFaultyRateIsNotCalledMissingToo() throws IOException {
    expect(
        "",
        "Quay,W1,5,-7,,1,,x,,,4\n",
        "sections.csv:2 bonus_rate | not a number | x"
            + " | digits only, with a point before decimals",
        "sections.csv:2 damages_rate | negative | -7 | 0 or more");
  }

  @Test
  void moneyAndTimesKeepWithinTheirLimits() throws IOException {
    expect(
        "",
        "Quay,W1,0.0001,0.00001,month,-1,0,1000000000001,,,1000001\n",
        "sections.csv:2 bonus_cap_units | too long | 1000001 | at most 1000000 time units",
        "sections.csv:2 bonus_rate | too much | 1000000000001 | at most 1000000000000",
        "sections.csv:2 damages_cap | a cap of nothing | 0 | more than 0, or no cap",
        "sections.csv:2 damages_grace | negative | -1 | 0 or more",
        "sections.csv:2 damages_per | no such word | month | one of unit, calendar_day, week",
        "sections.csv:2 damages_rate | too many decimals | 0.00001"
            + " | money has at most 4 decimals",
        "sections.csv:2 due | too many decimals | 0.0001 | a time has at most 3 decimals");
  }

  @Test
  void aSectionWithoutMoneyChangesNothing() throws IOException {
    String nothing = " damages_rate | changes nothing |  | a damages_rate or a bonus_rate above 0";
    assertEquals(
        List.of("sections.csv:2" + nothing, "sections.csv:3" + nothing),
        disk("", "Quay,W1,5,,,,,,,,\nYard,W1,5,0,,,,0,,,\nShed,W1,5,0,,,,1,,,\n").warnings());
  }

  @Test
  void twoChargesForOneDayAreDoubtful() throws IOException {
    String terms = DATED + "contract_finish,2027-03-12\ndamages_rate,9\n";
    String twice =
        "sections.csv:2 due | due with the whole, and both charge damages | "
            + " | one of the two, unless the contract says both";
    String onTheDate = "Quay,W2,2027-03-12,70,,,,,,,\n";
    assertEquals(List.of(twice), disk(terms, onTheDate).warnings());
    assertEquals(List.of(twice), disk(terms, "Quay,W2,10,70,,,,,,,\n").warnings());
    assertEquals(List.of(), disk(terms, "Quay,W1,2027-03-05,70,,,,,,,\n").warnings());
    assertEquals(List.of(), disk(terms, "Quay,W2,2027-03-12,,,,,70,,,\n").warnings());
    assertEquals(List.of(), disk(DATED + "contract_finish,2027-03-12\n", onTheDate).warnings());
  }

  @Test
  void partWeeksAreForSectionsToo() throws IOException {
    String idle = "terms.csv:4 damages_part_week | changes nothing |  | it is for damages_per week";
    String terms = DATED + "damages_part_week,whole\n";
    assertEquals(List.of(), disk(terms, "Quay,W1,5,70,week,,,,,,\n").warnings());
    assertEquals(List.of(idle), disk(terms, "Quay,W1,5,70,calendar_day,,,,,,\n").warnings());
  }

  /** 20 / 8 = 2.5 units after 5: 7500 thousandths, a whole number only on the finest scale. */
  @Test
  void aCapBetweenUnitsIsResolved() throws IOException {
    assertEquals(1000, disk("", "Quay,W1,5,8,,,20,,,,\n").sound().network().scale().ticksPerUnit());
    assertEquals(
        1000, disk("", "Quay,W1,5,8,,,,3,,10,\n").sound().network().scale().ticksPerUnit());
    assertEquals(1, disk("", "Quay,W1,5,8,,,24,,,,\n").sound().network().scale().ticksPerUnit());
    assertEquals(10, disk("", "Quay,W1,4.5,8,,,,,,,\n").sound().network().scale().ticksPerUnit());
    assertEquals(
        100, disk("", "Quay,W1,5,8,,0.25,,,,,\n").sound().network().scale().ticksPerUnit());
  }

  /**
   * The largest amount a calendar day over ten days is exact. Over 10,000 years of thousandths it
   * is not, and is refused.
   */
  @Test
  void amountsThatCannotBeExactAreRefused() throws IOException {
    String dear = "Quay,W1,2027-03-05,1000000000000,calendar_day,,,,,,\n";
    expect(DATED, dear);
    disk(DATED, dear)
        .with(
            "activities.csv",
            """
                id,normal_duration,normal_cost,crash_duration,crash_cost
                W1,250000.001,0,1,0.0007
                """);
    assertEquals(
        List.of(
            "sections.csv | the costs are too far apart to be exact | "
                + " | smaller or rounder rates and costs"),
        new CaseOnDisk(folder).problems());
  }

  @Test
  void problemsOfAllRowsAreReportedTogether() throws IOException {
    assertTrue(disk("", "Quay,X,soon,,,,,,,,\nYard,W1\n").problems().size() >= 3);
  }
}
