package dayworth.report.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.decision.CurveAnswer;
import dayworth.decision.CurveQuestion;
import dayworth.decision.FinishTooEarly;
import dayworth.decision.Watcher;
import dayworth.testing.LateDeck;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;

/** By hand on {@link LateDeck}: in 9 days A takes 5 and is late, in 8 days 4 and is on time. */
class SectionMarkTest {

  @Test
  void theCurveMarksFromWhenOnASectionIsOnTime() throws FinishTooEarly {
    CurveAnswer answer =
        CurveQuestion.ask(LateDeck.withRate(10), OptionalLong.empty(), 0, Watcher.NONE);
    assertEquals(
        List.of("deck 8"),
        SectionMark.of(answer).stream()
            .map(mark -> mark.name() + " " + mark.finish().duration())
            .toList());
    String svg = new String(Pictures.of(answer).get("charts/curve.svg"), StandardCharsets.UTF_8);
    assertTrue(svg.contains("on time from 8 working days"), svg);
  }
}
