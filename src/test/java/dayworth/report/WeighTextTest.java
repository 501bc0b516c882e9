package dayworth.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.decision.FinishTooEarly;
import dayworth.decision.MeetAnswer;
import dayworth.decision.MeetQuestion;
import dayworth.decision.Watcher;
import dayworth.decision.WeighAnswer;
import dayworth.decision.WeighQuestion;
import dayworth.decision.Wish;
import dayworth.value.Money;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The answers of meet and weigh for the case worked by hand at {@link SeriesAnswer}. */
class WeighTextTest {

  /**
   * Time-related: 0 + 10 + 10 q, 20 + 9 q, 40 + 8 q, 70 + 7 q: equal at 10, 20 and 30. Shortening:
   * 260, 225 + 20 x, 200 + 40 x and 175 + 70 x: equal at 25/30, 25/20 and 35/20. With 10 % more 200
   * + 44; 25 % 200 + 50 = 225 + 25; 50 % 225 + 30 = 255 and 200 + 60.
   */
  @Test
  void theChoicesAndHowFarTheyHold() {
    WeighAnswer answer = WeighQuestion.ask(SeriesAnswer.DATED, Watcher.NONE);
    assertEquals(
        """
        Finish on Wed 16 Sep 2026: 20 better than carrying on and paying damages.                EUR

                                 carry on  least total    contract    shortest
          finish               Fri 18 Sep   Wed 16 Sep  Thu 17 Sep  Tue 15 Sep
          working days                 10            8           9           7
          days late                     1      1 early           0     2 early
          extra direct cost             0           40          20          70
          time-related cost           250          200         225         175
          damages                      10            0           0           0
          total                       260          240         245         245
          against carrying on           0          -20         -15         -15

          160 of direct cost as planned is the same in every choice and is left out.

          Whatever the rate of damages, Wed 16 Sep 2026 is best.

          Which finish is best, if time-related cost for a day were
            up to 10   Fri 18 Sep  10 days
            10 to 20   Thu 17 Sep   9 days   contract finish
          > 20 to 30   Wed 16 Sep   8 days   the case says 25
            above 30   Tue 15 Sep   7 days

          Wed 16 Sep 2026 stays best while shortening costs from 16.6 % less to 25 % more than
          estimated.
                       this choice  least then
            10 % more          244         244   Wed 16 Sep  8 days
            25 % more          250         250   Wed 16 Sep  8 days
            50 % more          260         255   Thu 17 Sep  9 days

          It also stays best without damages, and at half or twice their rate.

          Proved: 4 of 4 finishes. The linear programme was not asked.

          Damages, bonus and entitlement depend on the contract and the law that governs it. This is
          not legal advice: read the contract and take advice from a licensed professional.
        """,
        String.join("\n", WeighText.lines(answer, Style.PLAIN, 200)) + "\n");
  }

  /** 2 + 19 + 2 + 10 + 2 + 11 = 46 columns; the contract's 10 and the gap make 58. */
  @Test
  void aNarrowTerminalLosesTheLastChoicesAndTheirNamesAreSaid() {
    WeighAnswer answer = WeighQuestion.ask(SeriesAnswer.DATED, Watcher.NONE);
    List<String> lines = WeighText.lines(answer, Style.PLAIN, 50);
    assertTrue(lines.contains("  No room for: contract, shortest"), lines.toString());
    assertTrue(lines.stream().skip(1).allMatch(line -> line.length() <= 50), lines.toString());
  }

  /**
   * A gives both days at 20, =B its day at 30; C has 4 days of float and stays. On 40 columns the
   * table takes 4 + 3 + 8 + 8 + 7 + 7 = 37, and the chains 11 more.
   */
  @Test
  void whatIsBoughtAndWhy() throws FinishTooEarly {
    MeetAnswer answer =
        MeetQuestion.ask(SeriesAnswer.DATED, new Wish.In(7), Long.MAX_VALUE, Watcher.NONE);
    assertEquals(
        """
        7 days (Tue 15 Sep 2026) can be met for 70 of extra direct cost, and for no less.        EUR

          7 instead of 10 days. The last day costs 30. In all it is 5 dearer than the least total (Wed
          16 Sep 2026).

          Against the plan as it stands
                   days  bought  a day  price   on chain
            A    6 to 4       2     20     40   1
            =B   4 to 3       1     30     30   1
            all               3            70

          1 chain takes 7 days, and 2 of 3 activities are critical:
            1  A =B

          Proved: 4 of 4 finishes. The linear programme agrees at 3 breakpoints and 1 point between
          them; largest difference 0.00.
          Proof sheet: out/proof.csv (plan 230.00, bound 230.00)
        """,
        String.join("\n", MeetText.lines(answer, "out", Style.PLAIN, 200)) + "\n");
    List<String> narrow = MeetText.lines(answer, "out", Style.PLAIN, 40);
    assertTrue(narrow.contains("    No room for: on chain"), narrow.toString());
    assertTrue(narrow.stream().skip(1).allMatch(line -> line.length() <= 40), narrow.toString());
  }

  @Test
  void moneyThatBuysAndMoneyThatDoesNot() throws FinishTooEarly {
    assertTrue(
        first(new Wish.Within(Money.of(45)))
            .startsWith("40 of 45 buys 2 days: finish on Wed 16 Sep 2026 (8 working days)."));
    assertTrue(
        first(new Wish.Within(Money.of(19)))
            .startsWith("19 buys no earlier finish than as planned: finish on Fri 18 Sep 2026"));
    assertTrue(first(new Wish.Within(Money.of(500))).contains(", the shortest possible."));
    assertTrue(
        first(new Wish.In(12)).startsWith("12 days is met as planned: nothing has to be bought."));
  }

  @Test
  void boldIsTheAnswerAndTheRangeOfTheCase() {
    WeighAnswer answer = WeighQuestion.ask(SeriesAnswer.DATED, Watcher.NONE);
    List<String> bold =
        WeighText.lines(answer, Style.BOLD, 94).stream()
            .filter(line -> line.startsWith("\u001b[1m"))
            .toList();
    assertEquals(2, bold.size());
    assertTrue(bold.get(1).contains("> 20 to 30"), bold.get(1));
    assertFalse(WeighText.lines(answer, Style.PLAIN, 94).toString().contains("\u001b"));
  }

  private static String first(Wish wish) throws FinishTooEarly {
    MeetAnswer answer = MeetQuestion.ask(SeriesAnswer.DATED, wish, 0, Watcher.NONE);
    return MeetText.lines(answer, "out", Style.PLAIN, 94).get(0);
  }
}
