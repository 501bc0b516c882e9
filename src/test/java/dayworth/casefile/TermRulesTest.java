package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.contract.Due;
import dayworth.contract.Terms;
import dayworth.decision.Case;
import dayworth.decision.TimeUnit;
import dayworth.value.Money;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Each rule for terms.csv. */
class TermRulesTest {

  @TempDir private Path folder;

  private CaseOnDisk terms(String rows) throws IOException {
    return new CaseOnDisk(folder)
        .with("activities.csv", CaseOnDisk.ONE_ACTIVITY)
        .with("terms.csv", "term,value\n" + rows);
  }

  private void expect(String rows, String... problems) throws IOException {
    assertEquals(List.of(problems), terms(rows).problems());
  }

  @Test
  void termsAreReadAsTheyStand() throws IOException {
    Case read =
        terms(
                """
                title,A wall
                currency,EUR
                time_unit,week
                time_related_cost,500
                fixed_cost,70.5
                contract_finish,4
                damages_rate,30
                damages_grace,1
                damages_cap,60
                bonus_rate,20
                bonus_cap,40
                bonus_cap_units,3
                """)
            .sound();
    Terms contract = read.terms();
    assertEquals("A wall", read.title());
    assertEquals("EUR", read.currency());
    assertEquals(TimeUnit.WEEK, read.unit());
    assertEquals(Money.of(new BigDecimal("500")), contract.timeRelated().rate());
    assertEquals(Money.of(new BigDecimal("70.5")), contract.fixedCost());
    assertEquals(Optional.of(Due.at(4)), contract.contractFinish());
    assertEquals(Money.of(new BigDecimal("30")), contract.damages().rate());
    assertEquals(BigDecimal.ONE, contract.damages().grace());
    assertEquals(Optional.of(Money.of(new BigDecimal("60"))), contract.damages().cap());
    assertEquals(Money.of(new BigDecimal("20")), contract.bonus().rate());
    assertEquals(Optional.of(Money.of(new BigDecimal("40"))), contract.bonus().cap());
    assertEquals(Optional.of(BigDecimal.valueOf(3)), contract.bonus().capCount());
  }

  @Test
  void anUnknownTermIsNamedWithTheNearest() throws IOException {
    expect(
        "fixed_costs,5\n", "terms.csv:2 term | no such term | fixed_costs | nearest is fixed_cost");
    List<String> problems = terms("weather,5\n").problems();
    assertEquals(1, problems.size());
    assertTrue(
        problems
            .get(0)
            .startsWith("terms.csv:2 term | no such term | weather | one of basis, bonus_cap,"),
        problems.get(0));
  }

  @Test
  void aMisspeltTermIsNotCalledMissingToo() throws IOException {
    expect(
        "damages_rate,5\ncontract_finsh,4\n",
        "terms.csv:3 term | no such term | contract_finsh | nearest is contract_finish");
  }

  @Test
  void aRowHasATerm() throws IOException {
    expect(",5\n", "terms.csv:2 term | blank |  | each row needs a term");
  }

  @Test
  void aMisspeltTermColumnIsOneProblem() throws IOException {
    new CaseOnDisk(folder)
        .with("activities.csv", CaseOnDisk.ONE_ACTIVITY)
        .with("terms.csv", "terms,value\ntitle,A wall\nfixed_cost,5\n");
    assertEquals(
        List.of("terms.csv:1 terms | no such column | terms | nearest is term"),
        new CaseOnDisk(folder).problems());
  }

  @Test
  void aTermStandsOnce() throws IOException {
    expect(
        "title,A wall\ntitle,A gate\n",
        "terms.csv:3 title | a second row of this term | title | line 2 has it");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "data_date",
        "extension",
        "damages_part_week",
        "basis",
        "prepared_for",
        "prepared_by",
        "reference",
        "valid_until",
        "on_cost_percent",
        "proposal_cost"
      })
  void otherTermsAreNotServedYet(String term) throws IOException {
    expect(
        term + ",5\n",
        "terms.csv:2 " + term + " | this term is not served yet | " + term + " | take the row out");
  }

  @Test
  void aFaultyValueIsPlacedAtItsTerm() throws IOException {
    expect(
        """
        time_related_cost,"3,900"
        fixed_cost,-1
        contract_finish,-2
        damages_rate,1.23456
        bonus_rate,x
        damages_grace,0.0001
        """,
        "terms.csv:2 time_related_cost | not a number | 3,900 | write 3900 or 3.900",
        "terms.csv:3 fixed_cost | negative | -1 | 0 or more",
        "terms.csv:4 contract_finish | negative | -2 | 0 or more",
        "terms.csv:5 damages_rate | too many decimals | 1.23456"
            + " | money has at most 4 decimals",
        "terms.csv:6 bonus_rate | not a number | x | digits only, with a point before decimals",
        "terms.csv:7 damages_grace | too many decimals | 0.0001"
            + " | a time has at most 3 decimals");
  }

  @Test
  void aValueWithACommaMustBeQuoted() throws IOException {
    expect(
        "contract_finish,4\ndamages_rate,1,200\ndamages_cap,9000\n",
        "terms.csv:3 | too many cells | 3 cells | 2, as in the header");
  }

  @Test
  void aCapIsAboveZero() throws IOException {
    expect(
        "contract_finish,4\ndamages_rate,5\ndamages_cap,0\nbonus_rate,5\nbonus_cap,0.00\n",
        "terms.csv:4 damages_cap | a cap of nothing | 0 | more than 0, or no cap",
        "terms.csv:6 bonus_cap | a cap of nothing | 0.00 | more than 0, or no cap");
  }

  @Test
  void datesAreNotServedWhereATimeIsWanted() throws IOException {
    expect(
        "contract_finish,2027-11-23\n",
        "terms.csv:2 contract_finish | a date is not served yet | 2027-11-23"
            + " | a number of time units after the start");
  }

  @Test
  void moneyIsPerUnitSoFar() throws IOException {
    expect(
        "time_related_per,week\ndamages_per,calendar_day\nbonus_per,month\n",
        "terms.csv:2 time_related_per | not served yet | week | only unit",
        "terms.csv:3 damages_per | not served yet | calendar_day | only unit",
        "terms.csv:4 bonus_per | no such word | month | one of unit, calendar_day, week");
  }

  @Test
  void aTimeUnitIsOneOfFour() throws IOException {
    expect(
        "time_unit,month\n",
        "terms.csv:2 time_unit | no such time unit | month | one of day, week, hour, shift");
  }

  @Test
  void hoursAndShiftsNeedTheirNumberInADay() throws IOException {
    String right = "how many of them make a working day";
    expect("time_unit,hour\n", "terms.csv:2 time_unit | needs units_per_working_day |  | " + right);
    expect(
        "time_unit,shift\nunits_per_working_day,\n",
        "terms.csv:2 time_unit | needs units_per_working_day |  | " + right);
    expect(
        "time_unit,shift\nunits_per_working_day,0\n",
        "terms.csv:3 units_per_working_day | zero | 0 | more than 0");
    expect("time_unit,shift\nunits_per_working_day,2\n");
  }

  @Test
  void aTermThatBendsAnotherNeedsIt() throws IOException {
    expect(
        "damages_rate,5\nbonus_rate,5\ncontract_finish,\n",
        "terms.csv:2 damages_rate | means nothing without contract_finish | damages_rate"
            + " | a row for contract_finish",
        "terms.csv:3 bonus_rate | means nothing without contract_finish | bonus_rate"
            + " | a row for contract_finish");
    expect(
        "damages_grace,1\ndamages_cap,9\nbonus_cap,9\nbonus_cap_units,2\n",
        "terms.csv:2 damages_grace | means nothing without damages_rate | damages_grace"
            + " | a row for damages_rate",
        "terms.csv:3 damages_cap | means nothing without damages_rate | damages_cap"
            + " | a row for damages_rate",
        "terms.csv:4 bonus_cap | means nothing without bonus_rate | bonus_cap"
            + " | a row for bonus_rate",
        "terms.csv:5 bonus_cap_units | means nothing without bonus_rate | bonus_cap_units"
            + " | a row for bonus_rate");
  }

  @Test
  void aFaultyTermIsNotCalledMissingToo() throws IOException {
    expect(
        "damages_rate,5\ncontract_finish,soon\n",
        "terms.csv:3 contract_finish | not a number | soon"
            + " | digits only, with a point before decimals");
  }

  @Test
  void aStartDateIsADayOfTheCalendar() throws IOException {
    expect(
        "start_date,7.9.2026\n",
        "terms.csv:2 start_date | not a date | 7.9.2026 | year-month-day, such as 2026-09-07");
    expect(
        "start_date,2027-02-29\n",
        "terms.csv:2 start_date | no such date | 2027-02-29 | a day that the calendar has");
  }

  @Test
  void workingDaysAreWeekdays() throws IOException {
    expect(
        "working_days,Mon Tues\n",
        "terms.csv:2 working_days | no such weekday: Tues | Mon Tues"
            + " | of Mon Tue Wed Thu Fri Sat Sun");
    expect(
        "working_days,\"Mon, Tue, Mon\"\n",
        "terms.csv:2 working_days | the same weekday twice: Mon | Mon, Tue, Mon"
            + " | each weekday once");
  }

  @Test
  void anEmptyFileIsAProblem() throws IOException {
    terms("").with("terms.csv", "");
    assertEquals(
        List.of("terms.csv | empty |  | a header row and rows below it"),
        new CaseOnDisk(folder).problems());
  }

  @Test
  void aCapBetweenUnitsIsResolvedAsFarAsDecimalsGo() throws IOException {
    Case read = terms("contract_finish,4\ndamages_rate,8\ndamages_cap,20\n").sound();
    // By hand: 20 / 8 = 2.5 units, reached at 4 + 2.5 = 6.5, or 6500 thousandths.
    assertTrue(read.terms().bends().contains(6500L), read.terms().bends().toString());
  }
}
