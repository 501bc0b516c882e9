package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.Extension;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.testing.RandomNetworks;
import dayworth.testing.RandomTerms;
import dayworth.testing.WalkedMoney;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import java.util.Random;
import java.util.Set;
import java.util.function.Function;
import org.junit.jupiter.api.Test;

/**
 * Break-evens of random cases: at their ends, between them and at random rates no finish at all
 * costs less than the one they name, by a walk over ticks and calendar days.
 */
class BreakEvenTest {

  private static final int SEEDS = 200;

  private final Random random = new Random(7);

  private record Drawn(Case of, CurveAnswer answer, Set<LocalDate> holidays, String at) {}

  private static Drawn drawn(int seed) throws FinishTooEarly {
    Network network = RandomNetworks.of(seed, RandomNetworks.Kind.EVERYTHING, 3, 10);
    RandomTerms terms = RandomTerms.of(new Random(seed), network.scale(), 20);
    Case of = new Case("drawn", "", "", TimeUnit.DAY, network, terms.terms(), List.of(), List.of());
    CurveAnswer answer = CurveQuestion.ask(of, OptionalLong.empty(), 0, Watcher.NONE);
    return new Drawn(of, answer, terms.holidays(), "seed " + seed + ", " + terms.terms());
  }

  @Test
  void noFinishIsCheaperThanTheOneNamedForADamagesRate() throws FinishTooEarly {
    int many = 0;
    int capped = 0;
    for (int seed = 0; seed < SEEDS; seed++) {
      Drawn drawn = drawn(seed);
      if (drawn.of().terms().damages().rate().isZero()) {
        continue;
      }
      BestByRate best = BestByRate.byDamages(drawn.answer());
      checkRates(drawn, best, rate -> atDamages(drawn.of().terms(), rate));
      many += best.ranges().size() > 2 ? 1 : 0;
      capped += best.ranges().stream().anyMatch(BestByRate.Range::isCapped) ? 1 : 0;
    }
    assertTrue(many > 10 && capped > 10, "too few turn: " + many + ", " + capped);
  }

  @Test
  void noFinishIsCheaperThanTheOneNamedForATimeRelatedRate() throws FinishTooEarly {
    int many = 0;
    for (int seed = 0; seed < SEEDS; seed++) {
      Drawn drawn = drawn(seed);
      BestByRate best = BestByRate.byTimeRelated(drawn.answer());
      checkRates(drawn, best, rate -> atTimeRelated(drawn.of().terms(), rate));
      many += best.ranges().size() > 2 ? 1 : 0;
    }
    assertTrue(many > SEEDS / 3, "too few turn: " + many);
  }

  /** Every slope times the multiple is another network: its own curve says what is cheapest. */
  @Test
  void noFinishIsCheaperThanTheOneNamedForACostOfShortening() throws FinishTooEarly {
    for (int seed = 0; seed < SEEDS; seed++) {
      Drawn drawn = drawn(seed);
      BestByRate best = BestByRate.byCompression(drawn.answer());
      assertGapless(best, drawn.at());
      for (Money multiple : numbers(best)) {
        if (multiple.isZero()) {
          continue;
        }
        Case scaled = scaled(drawn.of(), multiple);
        CurveAnswer anew = CurveQuestion.ask(scaled, OptionalLong.empty(), 0, Watcher.NONE);
        Money least = anew.rows().stream().map(BreakEvenTest::total).reduce(Money::min).get();
        Finish named = best.at(multiple).finish();
        Money planned = drawn.answer().asPlanned().direct();
        Money direct = planned.plus(named.direct().minus(planned).times(multiple));
        assertEquals(
            least, direct.plus(named.other().sum()), drawn.at() + ", multiple " + multiple);
      }
    }
  }

  private void checkRates(Drawn drawn, BestByRate best, Function<Money, Terms> terms) {
    assertGapless(best, drawn.at());
    for (Money rate : numbers(best)) {
      Terms then = terms.apply(rate);
      WalkedMoney walked = new WalkedMoney(then, drawn.holidays());
      Money named = totalAt(drawn.answer(), walked, best.at(rate).finish().duration());
      long longest = drawn.answer().curve().longest();
      long shortest = drawn.answer().curve().shortest();
      long stride = Math.max(1, (longest - shortest) / 60);
      for (long tick = longest; tick >= shortest; tick -= stride) {
        Money here = totalAt(drawn.answer(), walked, tick);
        assertTrue(
            named.compareTo(here) <= 0,
            drawn.at() + ", rate " + rate + ": " + named + " above " + here + " at " + tick);
      }
      for (Finish row : drawn.answer().rows()) {
        assertTrue(
            named.compareTo(totalAt(drawn.answer(), walked, row.duration())) <= 0,
            drawn.at() + ", rate " + rate + ", row " + row.duration());
      }
    }
  }

  /** The ends, the middles, beyond the last end, and random ones. */
  private List<Money> numbers(BestByRate best) {
    List<Money> numbers = new ArrayList<>(List.of(Money.of(random.nextInt(100))));
    for (BestByRate.Range range : best.ranges()) {
      numbers.add(range.from());
      Money to = range.to().orElse(range.from().times(2).plus(Money.of(1)));
      numbers.add(range.from().plus(to).dividedBy(2));
    }
    return numbers;
  }

  private static void assertGapless(BestByRate best, String at) {
    Money end = Money.ZERO;
    for (int i = 0; i < best.ranges().size(); i++) {
      BestByRate.Range range = best.ranges().get(i);
      assertEquals(end, range.from(), at);
      assertEquals(i == best.ranges().size() - 1, range.to().isEmpty(), at);
      end = range.to().orElse(end);
      assertTrue(range.to().isEmpty() || end.compareTo(range.from()) > 0, at);
    }
  }

  private static Money totalAt(CurveAnswer answer, WalkedMoney walked, long tick) {
    return answer.curve().costAt(tick).plus(walked.sum(tick));
  }

  private static Money total(Finish row) {
    return row.spent().plus(row.other().sum());
  }

  private static Terms atDamages(Terms terms, Money rate) {
    Damages as = terms.damages();
    return new Terms(
        terms.scale(),
        terms.calendar(),
        terms.timeRelated(),
        terms.fixedCost(),
        terms.contractFinish(),
        new Damages(rate, as.per(), as.grace(), as.cap(), as.partWeek()),
        terms.bonus());
  }

  private static Terms atTimeRelated(Terms terms, Money rate) {
    return new Terms(
        terms.scale(),
        terms.calendar(),
        new TimeRelated(rate, terms.timeRelated().per()),
        terms.fixedCost(),
        terms.contractFinish(),
        terms.damages(),
        terms.bonus());
  }

  private static Case scaled(Case of, Money multiple) {
    Network network = of.network();
    Network dearer =
        new Network(
            network.scale(),
            network.activities().stream()
                .map(
                    a ->
                        new Activity(
                            a.id(),
                            a.name(),
                            a.group(),
                            a.normal(),
                            a.crash(),
                            a.normalCost(),
                            a.normalCost().plus(a.crashExtra().times(multiple)),
                            a.notBefore(),
                            a.notFinishedBefore()))
                .toList(),
            network.links());
    return new Case(of.name(), "", "", of.unit(), dearer, of.terms(), List.of(), List.of());
  }

  /** What each extension makes best is what a case with that contract finish has as its least. */
  @Test
  void theSweepOverExtensionsFindsWhatEachContractFinishFinds() throws FinishTooEarly {
    int turning = 0;
    for (int seed = 0; seed < SEEDS; seed++) {
      Drawn drawn = drawn(seed);
      Terms terms = drawn.of().terms();
      if (terms.contractFinish().isEmpty()) {
        continue;
      }
      Due due = terms.contractFinish().get();
      Extension claimed = new Extension(due, terms.calendar().orElseThrow().dayLength());
      List<WeighAnswer.ByExtension> sweep = ExtensionSweep.of(drawn.answer(), claimed);
      turning += sweep.size() > 1 ? 1 : 0;
      for (long days = 0; days <= 25; days += 1 + days / 5) {
        Due moved = days == 0 ? due : due.later(days, claimed.day(), terms.calendar());
        Case then = drawn.of().dueBy(moved);
        CurveAnswer anew = CurveQuestion.ask(then, OptionalLong.empty(), 0, Watcher.NONE);
        Finish named = at(sweep, days);
        Money total =
            anew.curve().costAt(named.duration()).plus(then.terms().at(named.duration()).sum());
        // totals are compared in cents, part by part
        BigDecimal above = total.cents().subtract(anew.leastTotal().total()).abs();
        assertTrue(
            above.compareTo(new BigDecimal("0.03")) <= 0,
            drawn.at() + ", extended by " + days + ": " + above);
      }
    }
    assertTrue(turning > SEEDS / 5, "too few extensions turn the choice: " + turning);
  }

  private static Finish at(List<WeighAnswer.ByExtension> sweep, long days) {
    return sweep.stream()
        .filter(e -> e.from() <= days && e.to().orElse(Long.MAX_VALUE) >= days)
        .findFirst()
        .orElseThrow()
        .best();
  }
}
