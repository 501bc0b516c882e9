package dayworth.report.brief;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.decision.BriefAnswer;
import dayworth.report.CurveFiles;
import dayworth.report.brief.page.Document;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.page.Section;
import dayworth.report.brief.page.Table;
import java.io.IOException;
import java.io.StringReader;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The figures of the brief are those of the files. */
class BriefFiguresTest {

  private static List<CSVRecord> csv(BriefAnswer answer, String name) throws IOException {
    String text =
        new String(CurveFiles.of(answer.chosen(), "test").get(name), StandardCharsets.UTF_8);
    return CSVFormat.RFC4180
        .builder()
        .setHeader()
        .setSkipHeaderRecord(true)
        .get()
        .parse(new StringReader(text))
        .getRecords();
  }

  private static Table table(Document document, String section, String head) {
    return document.sections().stream()
        .filter(one -> one.id().equals(section))
        .flatMap(one -> tables(one.parts()))
        .filter(table -> table.columns().stream().anyMatch(column -> column.head().equals(head)))
        .findFirst()
        .orElseThrow();
  }

  private static Stream<Table> tables(List<Part> parts) {
    return parts.stream()
        .flatMap(
            part -> {
              if (part instanceof Part.Sheet sheet) {
                return Stream.of(sheet.table());
              }
              if (part instanceof Part.Drawn drawn) {
                return Stream.of(drawn.table());
              }
              return part instanceof Part.Beside beside ? tables(beside.main()) : Stream.empty();
            });
  }

  /** An amount as the brief writes it. */
  private static BigDecimal amount(String text) {
    String figures = text.replaceAll("[^0-9.−]", "");
    return new BigDecimal(figures.replace("−", "-")).setScale(2);
  }

  private static String cell(Table table, Table.Row row, String head) {
    for (int c = 0; c < table.columns().size(); c++) {
      if (table.columns().get(c).head().equals(head)) {
        return row.cells().get(c).text();
      }
    }
    throw new AssertionError("no column " + head);
  }

  @ParameterizedTest
  @ValueSource(strings = {"ferry-berth-core", "ferry-berth-status", "outage", "starter"})
  void everyFinishHasTheMoneyOfItsRow(String name) throws IOException {
    BriefAnswer answer = Briefs.of(Path.of("cases", name));
    Table all = table(new Brief(answer).document(), "proof", "Total");
    List<CSVRecord> rows = csv(answer, "curve.csv");
    Outcome outcome = new Outcome(answer);
    BigDecimal planned = answer.curve().asPlanned().direct().cents();
    int compared = 0;
    for (Table.Row row : all.rows()) {
      String duration = row.cells().get(0).text().replace(",", "");
      CSVRecord of =
          rows.stream().filter(r -> r.get("duration").equals(duration)).findFirst().orElseThrow();
      assertEquals(
          new BigDecimal(of.get("direct_cost")).subtract(planned),
          amount(cell(all, row, "Extra direct")),
          duration);
      assertEquals(
          new BigDecimal(of.get("total_cost")).subtract(outcome.sameForAll()),
          amount(cell(all, row, "Total")),
          duration);
      for (String[] pair :
          new String[][] {
            {"time_related_cost", "Time-related"},
            {"running_cost", "Running"},
            {"damages", "Damages"}
          }) {
        if (all.columns().stream().anyMatch(column -> column.head().equals(pair[1]))) {
          assertEquals(new BigDecimal(of.get(pair[0])), amount(cell(all, row, pair[1])), duration);
        }
      }
      compared++;
    }
    assertEquals(answer.states().size(), compared);
    assertTrue(compared > 5, "finishes are compared");
  }

  @ParameterizedTest
  @ValueSource(strings = {"ferry-berth-core", "ferry-berth-status", "outage", "starter"})
  void whatIsBoughtCostsWhatThePlanSays(String name) throws IOException {
    BriefAnswer answer = Briefs.of(Path.of("cases", name));
    Table bought = table(new Brief(answer).document(), "bought", "On the chains");
    List<String> told = new ArrayList<>();
    BigDecimal sum = BigDecimal.ZERO;
    for (CSVRecord row : csv(answer, "plan.csv")) {
      BigDecimal extra = new BigDecimal(row.get("extra_cost"));
      if (new BigDecimal(row.get("units_compressed")).signum() > 0) {
        told.add(row.get("id") + " " + extra);
      }
      sum = sum.add(extra);
    }
    List<String> said =
        bought.rows().stream()
            .filter(row -> row.kind() == Table.Row.Kind.PLAIN)
            .map(
                row ->
                    ((Table.Named) row.cells().get(0)).id()
                        + " "
                        + amount(cell(bought, row, "Cost")))
            .toList();
    assertEquals(told, said);
    Table.Row total = bought.rows().get(bought.rows().size() - 1);
    assertEquals(sum.setScale(2), amount(cell(bought, total, "Cost")));
  }

  @Test
  void stepsCostWhatTheirFileSays() throws IOException {
    BriefAnswer answer = Briefs.of(Briefs.FERRY_LANDING);
    Table steps = table(new Brief(answer).document(), "bought", "Chains that force it");
    List<CSVRecord> rows = csv(answer, "steps.csv");
    for (Table.Row row : steps.rows()) {
      String[] span = row.cells().get(0).text().split(" to ", -1);
      CSVRecord step =
          rows.stream()
              .filter(
                  one ->
                      new BigDecimal(one.get("from_duration")).compareTo(new BigDecimal(span[0]))
                              >= 0
                          && new BigDecimal(one.get("to_duration"))
                                  .compareTo(new BigDecimal(span[1]))
                              <= 0)
              .findFirst()
              .orElseThrow();
      Table.AddUp sum = (Table.AddUp) row.cells().get(1);
      assertEquals(new BigDecimal(step.get("price_per_unit")), amount(sum.total()));
      assertEquals(
          amount(sum.total()),
          sum.addends().stream()
              .map(one -> amount(one.amount()))
              .reduce(BigDecimal.ZERO.setScale(2), BigDecimal::add),
          "the addends add up");
    }
    assertEquals(6, steps.rows().size());
  }

  /** By hand: 3 × 850 + 1,570 + 3,050 + 4,680 + 2 × 5,530 = 22,910, as the case was drawn. */
  @Test
  void theAnswerOfTheFerryLandingIsTheOneThatWasWorkedByHand() {
    Document document = new Brief(Briefs.of(Briefs.FERRY_LANDING)).document();
    assertEquals(
        "Finish on Friday 20 November 2026, eight working days sooner than the present plan: it"
            + " saves more than three times what it costs.",
        document.headline().text());
    assertEquals("€73,600", document.sum().orElseThrow().from().amount());
    assertEquals("€22,910", document.sum().orElseThrow().less().amount());
    assertEquals("€50,690", document.sum().orElseThrow().leaves().amount());
    Section price =
        document.sections().stream().filter(s -> s.id().equals("price")).findFirst().orElseThrow();
    assertEquals("Eight days cost less than they are worth; the next does not", price.heading());
  }

  @Test
  void bothColumnsOfTheProofSheetMeet() {
    for (String name : new String[] {"ferry-berth-core", "outage", "starter"}) {
      Document document = new Brief(Briefs.of(Path.of("cases", name))).document();
      Table sheet = table(document, "proof", "Must cost at least");
      BigDecimal bound = BigDecimal.ZERO;
      BigDecimal cost = BigDecimal.ZERO;
      for (Table.Row row : sheet.rows().subList(0, sheet.rows().size() - 1)) {
        bound = bound.add(exact(cell(sheet, row, "Must cost at least")));
        cost = cost.add(exact(cell(sheet, row, "Plan costs")));
      }
      Table.Row last = sheet.rows().get(sheet.rows().size() - 1);
      assertEquals(0, bound.compareTo(exact(cell(sheet, last, "Must cost at least"))), name);
      assertEquals(0, cost.compareTo(exact(cell(sheet, last, "Plan costs"))), name);
      assertEquals(0, bound.compareTo(cost), name);
    }
  }

  private static BigDecimal exact(String text) {
    return text.isEmpty()
        ? BigDecimal.ZERO
        : new BigDecimal(text.replace(",", "").replace("−", "-"));
  }
}
