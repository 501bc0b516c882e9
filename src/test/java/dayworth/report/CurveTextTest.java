package dayworth.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Per;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.decision.Case;
import dayworth.decision.CurveAnswer;
import dayworth.decision.CurveQuestion;
import dayworth.decision.FinishTooEarly;
import dayworth.decision.Notice;
import dayworth.decision.TimeUnit;
import dayworth.decision.Watcher;
import dayworth.engine.Curve;
import dayworth.engine.Obstacle;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.value.DayLength;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;

/** Every figure is worked by hand at {@link SeriesAnswer}. */
class CurveTextTest {

  /** Extra direct is above 160. Worth of a day: 25, and 10 more before day 9. Waste: 235 - 230. */
  @Test
  void theAnswerComesFirstAndItsRowIsMarked() {
    assertEquals(
        """
        Least total: finish in 8 working days, 20 better than as planned.                        EUR

                            days  extra direct  time-related  damages  total
          as planned          10             0           250       10    260
        > least total          8            40           200        0    240
          contract finish      9            20           225        0    245
          shortest             7            70           175        0    245
          crash everything     7            75           175        0    250
            5 of it is wasted: it reaches the same 7 days
          160 of direct cost as planned is the same in every row and is left out.

          What the next days cost, and what they are worth
            days     price     worth   shortened
            10 to 8     20  25 to 35   A
            -------- least total: no other finish is cheaper -------------------------------
            8 to 7      30        25   =B

          7 days is the shortest: every activity of A =B is at its shortest.

          Proved: 4 of 4 finishes. The linear programme agrees at 1 breakpoint and 1 point between
          them; largest difference 0.00.
        """,
        String.join("\n", CurveText.lines(SeriesAnswer.answer(), Style.PLAIN, 200)) + "\n");
  }

  /** Day 10 is Friday 18, day 9 Thursday 17, day 8 Wednesday 16, day 7 Tuesday 15 September. */
  @Test
  void datesStandBesideTheDurations() {
    List<String> lines = CurveText.lines(SeriesAnswer.answer(SeriesAnswer.DATED), Style.PLAIN, 94);
    assertEquals(
        """
        Least total: finish on Wed 16 Sep 2026 (8 working days), 20 better than as planned.      EUR

                            days  finish      extra direct  time-related  damages  total
          as planned          10  Fri 18 Sep             0           250       10    260
        > least total          8  Wed 16 Sep            40           200        0    240
          contract finish      9  Thu 17 Sep            20           225        0    245
          shortest             7  Tue 15 Sep            70           175        0    245
          crash everything     7  Tue 15 Sep            75           175        0    250""",
        String.join("\n", lines.subList(0, 8)));
    List<String> narrow = CurveText.lines(SeriesAnswer.answer(SeriesAnswer.DATED), Style.PLAIN, 24);
    assertTrue(narrow.contains("  No room for: finish,"), narrow.toString());
  }

  /** 2 + 16 + 2 + 4 + 2 + 12 = 38 columns; 2 + 12 more for time-related make 52, above 50. */
  @Test
  void aNarrowTerminalLosesTheLastColumnsAndTheirNamesAreSaid() {
    List<String> lines = CurveText.lines(SeriesAnswer.answer(), Style.PLAIN, 50);
    assertTrue(lines.contains("  No room for: time-related, damages, total"), lines.toString());
    assertTrue(lines.stream().skip(1).allMatch(line -> line.length() <= 50), lines.toString());
  }

  /** By hand: 3 + 4 - 3 + 3 = 7. */
  @Test
  void aChainThatRunsBackwardsIsShownAsItsSum() {
    CurveAnswer plain = SeriesAnswer.answer();
    Curve curve =
        new Curve(
            plain.curve().network(),
            10,
            plain.curve().firstPlan(),
            plain.curve().firstCost(),
            plain.curve().steps(),
            List.of(
                new Obstacle.NotBefore(0, 3),
                new Obstacle.AtShortest(0, 4),
                new Obstacle.CannotBeLonger(2, -3),
                new Obstacle.AtShortest(1, 3)));
    CurveAnswer stopped =
        new CurveAnswer(
            plain.of(),
            curve,
            plain.asPlanned(),
            plain.rows(),
            List.of(plain.rows().get(2), plain.rows().get(3)),
            plain.steps(),
            plain.atContract(),
            plain.crashEverything(),
            plain.asked(),
            plain.provedRows(),
            plain.unproved(),
            plain.isCut(),
            plain.crossCheck(),
            plain.relaxed(),
            plain.evidence());
    List<String> lines = CurveText.lines(stopped, Style.PLAIN, 94);
    assertTrue(
        lines.contains(
            "  7 days is the shortest: 3 + A 4 - C 3 + =B 3 = 7: A may not start before 3; C cannot be"),
        lines.toString());
    assertTrue(lines.contains("  longer than 3."), lines.toString());
    assertTrue(
        lines.contains(
            "  2 finishes share the least total; the longest is 8 days, the shortest 7 days."),
        lines.toString());
  }

  /**
   * Two shifts a day, 10 a shift, 15 a calendar day: 6 shifts 100 + 45, 5: 110 + 45, 4: 120 + 30,
   * 3: 130 + 30, 2: 140 + 15. From day to day the total only rises: 145, 150, 155.
   */
  @Test
  void aTotalThatTurnsWithinADayIsNotSpokenOf() throws FinishTooEarly {
    WorkingCalendar calendar =
        WorkingCalendar.of(
            LocalDate.parse("2026-09-07"),
            EnumSet.allOf(DayOfWeek.class),
            List.of(),
            new DayLength(2, 1));
    Case of =
        new Case(
            "shifts",
            "",
            "",
            TimeUnit.SHIFT,
            new Network(
                TimeScale.WHOLE,
                List.of(Activity.compressible("A", 6, Money.of(100), 2, Money.of(140))),
                List.of()),
            new Terms(
                TimeScale.WHOLE,
                Optional.of(calendar),
                new TimeRelated(Money.of(15), Per.CALENDAR_DAY),
                Money.ZERO,
                Optional.empty(),
                Damages.NONE,
                Bonus.NONE),
            List.of(),
            List.of());
    CurveAnswer answer = CurveQuestion.ask(of, OptionalLong.empty(), 0, Watcher.NONE);
    assertEquals(
        List.of("145.00", "155.00", "150.00", "160.00", "155.00"),
        answer.rows().stream().map(row -> row.total().toPlainString()).toList());
    String text = String.join("\n", CurveText.lines(answer, Style.PLAIN, 94));
    assertTrue(
        text.startsWith("Least total: finish on Wed 9 Sep 2026 (6 shifts), as planned."), text);
    assertFalse(text.contains("also turns"), text);
  }

  @Test
  void boldIsOnlyWhereATerminalTakesIt() {
    assertEquals(Style.BOLD, Style.of(true, Map.of("TERM", "xterm")));
    assertEquals(Style.PLAIN, Style.of(true, Map.of("TERM", "dumb")));
    assertEquals(Style.PLAIN, Style.of(true, Map.of("NO_COLOR", "1")));
    assertEquals(Style.PLAIN, Style.of(false, Map.of()));
  }

  @Test
  void problemsSayWhereWhatFoundAndRight() {
    Notice wrong =
        new Notice(
            "activities.csv", 4, "predecessors", "W11 is no activity", "W11", "nearest is W1");
    assertEquals(
        """
        Nothing was computed: 1 problem in 1 file.

          activities.csv:4 predecessors       W11 is no activity
                                              found "W11"; nearest is W1

          output/x is as it was.""",
        String.join("\n", NoticeText.problems(List.of(wrong), "output/x", Style.PLAIN)));
  }

  @Test
  void picturesAreCounted() {
    assertEquals(
        List.of("  Written: output/x (curve, result, 2 pictures)"),
        CurveText.written(
            "output/x", List.of("curve.csv", "result.json", "charts/a.svg", "charts/b.svg"), 94));
  }
}
