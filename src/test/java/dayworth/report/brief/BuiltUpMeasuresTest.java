package dayworth.report.brief;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.buildup.ExtraCost;
import dayworth.buildup.Way;
import dayworth.decision.BriefAnswer;
import dayworth.decision.MeetAnswer.Bought;
import dayworth.network.Measure;
import dayworth.network.Plan;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.page.Table;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** What a brief says about measures that were built up from labour. */
class BuiltUpMeasuresTest {

  private static BriefAnswer answer;
  private static List<Part> parts;

  @BeforeAll
  static void ask() {
    answer = Briefs.of(Path.of("cases", "ferry-berth"));
    parts = new BuiltUpMeasures(answer, new Words(answer), new Numbering()).parts();
  }

  private static List<Bought> builtUp() {
    return answer.chosen().bought().stream().filter(one -> way(one).isPresent()).toList();
  }

  private static Optional<Way> way(Bought one) {
    if (one.measure() == Plan.NO_MEASURE) {
      return Optional.empty();
    }
    Measure measure = answer.of().network().measures().get(one.measure());
    return answer
        .of()
        .buildUp()
        .of(one.activity())
        .flatMap(
            built -> built.ways().stream().filter(w -> w.name().equals(measure.name())).findAny());
  }

  private static List<Table> tables() {
    return parts.stream()
        .filter(Part.Sheet.class::isInstance)
        .map(part -> ((Part.Sheet) part).table())
        .toList();
  }

  @Test
  void eachHasItsLinesAndTheSumIsWhatThePlanPays() {
    List<Bought> bought = builtUp();
    assertFalse(bought.isEmpty(), "the demo uses measures that were built up");
    assertEquals(bought.size(), tables().size());
    Words words = new Words(answer);
    for (int i = 0; i < bought.size(); i++) {
      ExtraCost extra = way(bought.get(i)).orElseThrow().spell().extra();
      List<String> amounts =
          tables().get(i).rows().stream().map(row -> row.cells().get(2).text()).toList();
      assertEquals(
          List.of(
              words.money(extra.premium()),
              words.money(extra.lostOutput()),
              words.money(extra.extraHours()),
              words.money(extra.supervision()),
              words.money(extra.once()),
              words.money(bought.get(i).cost())),
          amounts);
    }
  }

  @Test
  void everyLossHasItsSource() {
    List<Part.Statement> said = new ArrayList<>();
    for (Part part : parts) {
      if (part instanceof Part.Statements statements) {
        said.addAll(statements.statements());
      }
    }
    List<Part.Statement> losses =
        said.stream().filter(one -> one.text().startsWith("Output lost: ")).toList();
    assertEquals(builtUp().size(), losses.size());
    for (Part.Statement loss : losses) {
      assertTrue(loss.source().contains("demo assumption: invented for this case"), loss.source());
    }
  }

  @Test
  void longWeeksAndLateShiftsAskForCare() {
    String cautions =
        String.join(
            " ",
            parts.stream()
                .filter(Part.Caution.class::isInstance)
                .map(part -> ((Part.Caution) part).text())
                .toList());
    boolean longWeek =
        builtUp().stream()
            .map(one -> way(one).orElseThrow().spell().pattern().hoursPerWeek().toDouble())
            .anyMatch(hours -> hours > 48);
    assertTrue(longWeek, "the demo's plan has a week of more than 48 hours");
    assertTrue(cautions.contains("more than 48"), cautions);
  }

  @Test
  void whatIsGivenAsOneSumIsNamed() {
    String gaps =
        String.join(
            " ",
            parts.stream()
                .filter(Part.Gap.class::isInstance)
                .map(part -> ((Part.Gap) part).text())
                .toList());
    for (Bought one : answer.chosen().bought()) {
      boolean asOneSum = one.measure() != Plan.NO_MEASURE && way(one).isEmpty();
      String id = answer.of().network().activity(one.activity()).id();
      assertEquals(asOneSum, gaps.contains(id), id + " in " + gaps);
    }
  }
}
