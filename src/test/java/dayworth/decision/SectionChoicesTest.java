package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.testing.LateDeck;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;

/** What it costs to have a section on time, by hand on {@link LateDeck}. */
class SectionChoicesTest {

  /**
   * Left late: 9 days, 9 x 1 + damages 1 x 10 = 19, the least. On time A takes 4 days for 20 more:
   * 9 + 20 = 29 in 9 days, 8 + 20 = 28 in 8, which is the cheapest.
   */
  @Test
  void namesTheCheapestFinishInAllWithTheSectionOnTime() {
    Weighing weighing = WeighQuestion.ask(LateDeck.withRate(10), Watcher.NONE).granted();
    assertEquals("19.00", weighing.best().total().toPlainString());
    Choice choice =
        weighing.choices().stream()
            .filter(c -> c.kind() == Choice.Kind.SECTION_DATE)
            .findFirst()
            .orElseThrow();
    assertEquals("deck", choice.section());
    assertEquals(8, choice.finish().duration());
    assertEquals("28.00", choice.finish().total().toPlainString());
  }

  /** Damages of 30 a day are dearer than a day of A: the least total has the section on time. */
  @Test
  void namesNoneThatTheLeastTotalHasOnTime() {
    Weighing weighing = WeighQuestion.ask(LateDeck.withRate(30), Watcher.NONE).granted();
    assertEquals(
        0, weighing.choices().stream().filter(c -> c.kind() == Choice.Kind.SECTION_DATE).count());
  }

  /**
   * Hire at 5 a day from X to Y's finish, no link between: in 10 days X starts on day 8, 2 x 5; in
   * 12 days it starts when Y is done and costs nothing. Nobody asks for 12 where a day costs 100.
   */
  @Test
  void finishesLaterThanAsPlannedAreInTheRowsAndNotShown() throws FinishTooEarly {
    CurveAnswer answer =
        CurveQuestion.ask(LateDeck.idleCrane(), OptionalLong.empty(), 0, Watcher.NONE);
    assertEquals(12, answer.rows().get(0).duration());
    assertEquals(10, answer.latestShown());
    assertEquals(10, answer.shown().rows().get(0).duration());
    assertEquals("1010.00", answer.leastTotal().total().toPlainString());
  }
}
