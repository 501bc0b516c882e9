package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.Per;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.network.Network;
import dayworth.testing.PublishedExample;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;

/** Published least totals, with all finishes that share them. */
class PublishedTotalsTest {

  /**
   * L. J. Krajewski, L. P. Ritzman, M. K. Malhotra, Operations Management, hospital example (mostly
   * from memory): indirect cost 8,000 a week, penalty 20,000 a week after week 65; 2,624,000 in 69
   * weeks, and least 2,506,200 in 61.
   */
  @Test
  void hospitalCostsLeastInWeekSixtyOne() throws FinishTooEarly {
    Network network = PublishedExample.read("krajewski-hospital").network();
    Damages damages = Damages.perUnit(Money.of(20_000), BigDecimal.ZERO, Optional.empty());
    CurveAnswer answer = ask(network, Money.of(8_000), 65, damages, Bonus.NONE);
    assertEquals(69, answer.asPlanned().duration());
    assertEquals(new BigDecimal("2624000.00"), answer.asPlanned().total());
    assertEquals(
        List.of("61: 2506200.00"),
        answer.least().stream().map(row -> row.duration() + ": " + row.total()).toList());
  }

  /**
   * C. Gueret, C. Prins, M. Sevaux, Applications of Optimization (2002), section 7.1: a bonus of
   * 30,000 for each week before week 64; the largest profit is 87,000, and four finishes share it.
   */
  @Test
  void stadiumEarnsMostAtFourFinishesAlike() throws FinishTooEarly {
    Network network = PublishedExample.read("gueret-stadium").network();
    Bonus bonus = new Bonus(Money.of(30_000), Per.UNIT, Optional.empty(), Optional.empty());
    CurveAnswer answer = ask(network, Money.ZERO, 64, Damages.NONE, bonus);
    assertEquals(
        List.of(57L, 56L, 55L, 54L), answer.least().stream().map(Finish::duration).toList());
    assertEquals(
        new BigDecimal("87000.00"),
        answer.asPlanned().total().subtract(answer.leastTotal().total()));
  }

  private static CurveAnswer ask(
      Network network, Money timeRelated, long due, Damages damages, Bonus bonus)
      throws FinishTooEarly {
    Terms terms =
        new Terms(
            network.scale(),
            Optional.empty(),
            new TimeRelated(timeRelated, Per.UNIT),
            Money.ZERO,
            Optional.of(Due.at(due)),
            damages,
            bonus,
            Optional.empty());
    Case of = new Case("published", "", "", TimeUnit.WEEK, network, terms, List.of(), List.of());
    return CurveQuestion.ask(of, OptionalLong.empty(), Long.MAX_VALUE, Watcher.NONE);
  }
}
