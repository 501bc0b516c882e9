package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.PartWeek;
import dayworth.contract.Per;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.decision.Basis;
import dayworth.decision.Case;
import dayworth.decision.Notes;
import dayworth.decision.Submission;
import dayworth.decision.TimeUnit;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

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

  @Test
  void termsOfTheBriefAreReadAsTheyStand() throws IOException {
    Submission read =
        terms(
                """
                basis,under protest
                prepared_for,The harbour board
                prepared_by,The builder
                reference,HB-7
                valid_until,2026-09-18
                on_cost_percent,12.5
                proposal_cost,1800
                """)
            .sound()
            .submission();
    assertEquals(Optional.of(Basis.UNDER_PROTEST), read.basis());
    assertEquals("The harbour board", read.preparedFor());
    assertEquals("The builder", read.preparedBy());
    assertEquals("HB-7", read.reference());
    assertEquals(Optional.of(LocalDate.of(2026, 9, 18)), read.validUntil());
    assertEquals(Optional.of(new BigDecimal("12.5")), read.onCostPercent());
    assertEquals(Optional.of(Money.of(1800)), read.proposalCost());
    assertEquals(Notes.NONE, read.notes());
  }

  @Test
  void aFaultyTermOfTheBriefIsPlacedAtItsTerm() throws IOException {
    expect(
        """
        basis,goodwill
        valid_until,soon
        on_cost_percent,-3
        proposal_cost,much
        """,
        "terms.csv:2 basis | no such basis | goodwill"
            + " | one of mitigation, own recovery, agreed, directed, under protest",
        "terms.csv:3 valid_until | not a date | soon | year-month-day, such as 2026-09-07",
        "terms.csv:4 on_cost_percent | negative | -3 | 0 or more",
        "terms.csv:5 proposal_cost | not a number | much | digits only, with a point before"
            + " decimals");
    expect(
        "on_cost_percent,12 %\n",
        "terms.csv:2 on_cost_percent | a per cent sign | 12 % | write 12");
    expect(
        "on_cost_percent,1000.1\n",
        "terms.csv:2 on_cost_percent | too much | 1000.1 | at most 1000");
    expect(
        "on_cost_percent,0.00001\n",
        "terms.csv:2 on_cost_percent | too many decimals | 0.00001"
            + " | a percentage has at most 4 decimals");
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
  void aDateNeedsAStartDate() throws IOException {
    expect(
        "contract_finish,2027-11-23\n",
        "terms.csv:2 contract_finish | a date needs a start_date | 2027-11-23"
            + " | a row for start_date in terms.csv, or a number of time units");
    expect("contract_finish,2027-11-23\nstart_date,2027-11-23\n");
    expect(
        "contract_finish,2027-11-23\nstart_date,soon\n",
        "terms.csv:3 start_date | not a date | soon | year-month-day, such as 2026-09-07");
  }

  @Test
  void moneyByTheDateNeedsAStartDate() throws IOException {
    expect(
        "time_related_per,week\ndamages_per,calendar_day\nbonus_per,month\n",
        "terms.csv:2 time_related_per | week needs dates | week"
            + " | a row for start_date in terms.csv, or unit",
        "terms.csv:3 damages_per | calendar_day needs dates | calendar_day"
            + " | a row for start_date in terms.csv, or unit",
        "terms.csv:4 bonus_per | no such word | month | one of unit, calendar_day, week");
    expect("time_related_per,week\nbonus_per,calendar_day\nstart_date,2026-09-07\n");
    expect(
        "damages_part_week,half\n",
        "terms.csv:2 damages_part_week | no such word | half | one of pro_rata, whole");
  }

  @Test
  void theContractFinishIsNotBeforeTheStart() throws IOException {
    expect(
        "start_date,2026-09-07\ncontract_finish,2026-09-04\n",
        "terms.csv:3 contract_finish | before the start_date | 2026-09-04"
            + " | on 2026-09-07, the start_date, or later");
  }

  @Test
  void aDateIsInOneOfElevenCenturies() throws IOException {
    expect(
        "start_date,0207-03-15\n",
        "terms.csv:2 start_date | a date out of range | 0207-03-15"
            + " | from 1900-01-01 to 2999-12-31");
    expect(
        "start_date,2026-09-07\ncontract_finish,7.9.2027\n",
        "terms.csv:3 contract_finish | not a date | 7.9.2027"
            + " | year-month-day, such as 2026-09-07");
  }

  @Test
  void aProjectEndsBeforeTheYearTenThousand() throws IOException {
    terms("start_date,2990-01-06\ncontract_finish,1000000\ntime_unit,week\n")
        .with("activities.csv", "id,normal_duration,normal_cost\nA,999999,100\n");
    assertEquals(
        List.of(
            "terms.csv:2 start_date | the project ends after the year 9999 |  | shorter durations",
            "terms.csv:3 contract_finish | after the year 9999 |  | an earlier finish"),
        new CaseOnDisk(folder).problems());
  }

  @Test
  void datesAndMoneyByTheDateAreReadAsTheyStand() throws IOException {
    Terms contract =
        terms(
                """
                start_date,2026-09-07
                working_days,Mon Tue Wed Thu
                contract_finish,2026-09-18
                time_related_cost,700
                time_related_per,week
                damages_rate,30
                damages_per,week
                damages_part_week,whole
                damages_grace,1.5
                bonus_rate,20
                bonus_per,calendar_day
                bonus_cap_units,3.5
                """)
            .with("holidays.csv", "date,name\n2026-09-08,Regatta\n2026-09-08,Feast\n")
            .sound()
            .terms();
    WorkingCalendar calendar = contract.calendar().orElseThrow();
    assertEquals(1, calendar.holidaysThatCount());
    // Mon 7, Wed 9, Thu 10, Mon 14 to Thu 17 are 7 working days; Friday 18 is a rest day
    assertEquals(
        Optional.of(new Due(7, Optional.of(LocalDate.parse("2026-09-18")))),
        contract.contractFinish());
    assertEquals(new TimeRelated(Money.of(700), Per.WEEK), contract.timeRelated());
    assertEquals(
        new Damages(
            Money.of(30), Per.WEEK, new BigDecimal("1.5"), Optional.empty(), PartWeek.WHOLE),
        contract.damages());
    assertEquals(
        new Bonus(
            Money.of(20), Per.CALENDAR_DAY, Optional.empty(), Optional.of(new BigDecimal("3.5"))),
        contract.bonus());
    assertEquals(TimeScale.WHOLE, contract.scale(), "counts of days are no times");
  }

  @Test
  void aWorkingDayIsWholeTicks() throws IOException {
    String start = "start_date,2026-09-07\n";
    assertEquals(0, terms(start).sound().network().scale().decimals());
    assertEquals(1, terms(start + "time_unit,week\n").sound().network().scale().decimals());
    assertEquals(
        1,
        terms(start + "time_unit,hour\nunits_per_working_day,7.5\n")
            .sound()
            .network()
            .scale()
            .decimals());
    assertEquals(
        0,
        terms("time_unit,hour\nunits_per_working_day,7.5\n").sound().network().scale().decimals());
  }

  @Test
  void holidaysAreDates() throws IOException {
    terms("start_date,2026-09-07\n")
        .with("holidays.csv", "date,name\n2026-13-01,x\n,y\n24 Dec,z\n");
    assertEquals(
        List.of(
            "holidays.csv:2 date | no such date | 2026-13-01 | a day that the calendar has",
            "holidays.csv:3 date | blank |  | this cell is needed",
            "holidays.csv:4 date | not a date | 24 Dec | year-month-day, such as 2026-09-07"),
        new CaseOnDisk(folder).problems());
    new CaseOnDisk(folder).with("holidays.csv", "name,day\nx,2026-12-24\n");
    assertEquals(
        List.of(
            "holidays.csv:1 date | missing column |  | the file needs it",
            "holidays.csv:1 day | no such column | day | one of date, name"),
        new CaseOnDisk(folder).problems());
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

  @Test
  void anExtensionIsWholeWorkingDaysOrALaterDate() throws IOException {
    expect(
        "extension,5\n",
        "terms.csv:2 extension | means nothing without contract_finish | extension"
            + " | a row for contract_finish");
    for (String days : List.of("0", "1.5")) {
      expect(
          "contract_finish,4\nextension," + days + "\n",
          "terms.csv:3 extension | not a whole number of working days | "
              + days
              + " | 1 or more, or a date");
    }
    expect(
        "contract_finish,4\nextension,-1\n", "terms.csv:3 extension | negative | -1 | 0 or more");
    expect(
        "contract_finish,4\nextension,2026-10-01\n",
        "terms.csv:3 extension | a date needs a start_date | 2026-10-01"
            + " | a row for start_date in terms.csv, or a number of working days");
    expect(
        "start_date,2026-09-07\ncontract_finish,2026-10-02\nextension,2026-10-02\n",
        "terms.csv:4 extension | not after the contract finish | 2026-10-02"
            + " | a date after 2026-10-02");
    // day 4 is Thursday 10 September
    expect(
        "start_date,2026-09-07\ncontract_finish,4\nextension,2026-09-09\n",
        "terms.csv:4 extension | not after the contract finish | 2026-09-09"
            + " | a date after 2026-09-10");
    terms("time_unit,week\nstart_date,2026-09-07\nextension,1000000\ncontract_finish,400000\n");
    assertEquals(
        List.of("terms.csv:4 extension | after the year 9999 |  | a shorter extension"),
        new CaseOnDisk(folder).problems());
  }

  @Test
  void anExtensionMovesTheContractFinish() throws IOException {
    // in days, in hours of which 8 are a day, in weeks of 5 days
    assertEquals(Due.at(9), extended("contract_finish,4\nextension,5\n"));
    String hours = "time_unit,hour\nunits_per_working_day,8\n";
    assertEquals(Due.at(44), extended("contract_finish,4\nextension,5\n" + hours));
    // a tenth of a week is a tick: 4 weeks and 3 of 5 days
    assertEquals(Due.at(46), extended("contract_finish,4\nextension,3\ntime_unit,week\n"));
    String start = "start_date,2026-09-07\ndamages_rate,1\n";
    // Saturday 12: five days done; 2 more end on Tuesday 15, the seventh
    assertEquals(
        new Due(7, Optional.of(LocalDate.parse("2026-09-15"))),
        extended(start + "contract_finish,2026-09-12\nextension,2\n"));
    // Sunday 20: ten days
    assertEquals(
        new Due(10, Optional.of(LocalDate.parse("2026-09-20"))),
        extended(start + "contract_finish,2026-09-12\nextension,2026-09-20\n"));
  }

  private Due extended(String rows) throws IOException {
    return terms(rows).sound().terms().extension().orElseThrow().due();
  }

  @Test
  void anExtensionThatMovesNoMoneyIsDoubtful() throws IOException {
    assertEquals(
        List.of(
            "terms.csv:3 extension | changes nothing | "
                + " | neither damages nor bonus depend on the contract finish"),
        terms("contract_finish,4\nextension,5\n").warnings());
    assertEquals(List.of(), terms("contract_finish,4\nextension,5\ndamages_rate,3\n").warnings());
  }
}
