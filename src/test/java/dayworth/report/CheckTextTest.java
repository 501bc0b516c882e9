package dayworth.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.decision.Case;
import dayworth.decision.CheckAnswer;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.math.BigInteger;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The network is that of {@link SeriesAnswer}; A and =B take 6 + 4 = 10, C 3, so C floats by 7. */
class CheckTextTest {

  private static CheckAnswer answer(BigInteger chains) {
    return answer(SeriesAnswer.CASE, chains);
  }

  private static CheckAnswer answer(Case of, BigInteger chains) {
    return new CheckAnswer(
        of,
        Timing.earliest(SeriesAnswer.NETWORK, Plan.allNormal(SeriesAnswer.NETWORK)),
        7,
        chains,
        List.of(List.of(0, 1)),
        List.of(2),
        List.of(0, 2),
        List.of(1, 2),
        List.of(new CheckAnswer.NeverCritical(2, 3)));
  }

  @Test
  void factsFollowTheAnswer() {
    assertEquals(
        """
        The case is sound, with 1 warning and 1 note. As planned: 10 working days, 1 day late.

          3 activities, 3 can be shortened; 1 link
          No finish is shorter than 7 days
          One chain is critical: A =B
          The others have 7 days of float
          Least float: C 7
          Nothing comes before: A C
          Nothing comes after: =B C""",
        String.join("\n", CheckText.lines(answer(BigInteger.ONE), Style.PLAIN, 94)));
  }

  /** Ten days from Monday 7 are over on Friday 18, a day after Thursday 17. */
  @Test
  void datesStandBesideDurations() {
    List<String> lines =
        CheckText.lines(answer(SeriesAnswer.DATED, BigInteger.ONE), Style.PLAIN, 94);
    assertEquals(
        """
        The case is sound, with 1 warning and 1 note. As planned: Fri 18 Sep 2026, 1 calendar day \
        late.

          3 activities, 3 can be shortened; 1 link
          10 working days from Mon 7 Sep 2026, Mon to Fri, no holidays
          No finish is shorter than 7 days (Tue 15 Sep 2026)""",
        String.join("\n", lines.subList(0, 5)));
  }

  @Test
  void hugeCountsOfChainsAreGrouped() {
    List<String> lines = CheckText.lines(answer(BigInteger.TEN.pow(9)), Style.PLAIN, 94);
    assertEquals(
        List.of("  1,000,000,000 chains are critical:", "    A =B", "    and 999,999,999 more"),
        lines.subList(4, 7));
  }

  @Test
  void aNoteSaysWhoseCompressionGainsNothing() {
    assertEquals(
        """
          note  activities.csv crash_duration
                C can never become critical: the longest chain through it takes 3 days as planned, and
                no finish is shorter than 7. Shortening it gains nothing.
        """,
        String.join("\n", CheckText.notes(answer(BigInteger.ONE), 94)).indent(0));
  }
}
