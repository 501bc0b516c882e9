package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.casefile.CaseReader;
import dayworth.casefile.Reading;
import dayworth.contract.MomentMoney;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.value.Money;
import dayworth.value.Quantity;
import dayworth.value.TimeScale;
import java.io.IOException;
import java.math.RoundingMode;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * By hand: 480 h by 6 at 40 h a week and 40 an hour are 10 days. A week of long days, 50 h, yields
 * 300 - 12 F hours at F times the loss of 4 %; what is left takes 0.75 + 0.05 F normal weeks: 8.75
 * + 0.25 F days. It costs 6 x 10 h x half of 40 = 1,200 premium, 12 F x 40 = 480 F lost output and
 * 450 supervision. At 2,000 a day it pays while 2,000 (1.25 - 0.25 F) > 1,650 + 480 F: while F <
 * 850 / 980 = 0.867. So 0.86 is the last hundredth at which it does.
 */
class LossSweepTest {

  @TempDir private Path folder;

  @BeforeEach
  void thereIsACase() throws IOException {
    put("activities.csv", "id,normal_duration,normal_cost\nA,,\n");
    put("labour.csv", "activity,labour_hours,crew,rate,other_cost\nA,480,6,40,1000\n");
    patterns("1");
    put("pay.csv", "pattern,above_hours,multiplier\nlong days,40,1.5\n");
    loss("0.04");
    put("terms.csv", "term,value\ntime_related_cost,2000\n");
  }

  private void put(String name, String text) throws IOException {
    Files.writeString(folder.resolve(name), text);
  }

  private void patterns(String weeksMax) throws IOException {
    put(
        "patterns.csv",
        "pattern,hours_per_week,days_per_week,week_cost,weeks_max\nnormal,40,5,,\nlong days,50,5,450,"
            + weeksMax
            + "\n");
  }

  private void loss(String share) throws IOException {
    put("output_loss.csv", "pattern,week,loss,source\nlong days,1," + share + ",site diary\n");
  }

  private Optional<Case> read(Quantity factor) {
    return CaseReader.read(folder, TimeScale.WHOLE, factor) instanceof Reading.Sound sound
        ? Optional.of(sound.of())
        : Optional.empty();
  }

  private Optional<BestByLoss> sweep(Quantity now) {
    return WeighQuestion.ask(read(now).orElseThrow(), this::read, Effort.USUAL, Watcher.NONE)
        .byLoss();
  }

  private static List<String> ranges(BestByLoss best) {
    return best.ranges().stream().map(r -> text(r.from()) + " to " + text(r.to())).toList();
  }

  private static String text(BestByLoss.Tried tried) {
    return tried.factor().rounded(2, RoundingMode.HALF_UP)
        + ": "
        + tried.curve().of().network().scale().text(tried.best().duration())
        + ", "
        + tried.saved();
  }

  /** 2,000 x 1.25 - 1,650 = 850; 2,000 x 1.035 - 1,650 - 412.80 = 7.20. */
  @Test
  void theBreakEvenIsFoundToAHundredth() {
    BestByLoss best = sweep(Quantity.ONE).orElseThrow();
    assertEquals(
        List.of("0: 8.75, 850.00 to 0.86: 8.965, 7.20", "0.87: 10, 0.00 to 2: 10, 0.00"),
        ranges(best));
    assertEquals(Quantity.ONE, best.now());
    assertTrue(best.isNarrowed());
    assertFalse(best.isBounded());
    assertEquals(0, best.unproved());
  }

  /** The present factor is one of those that are tried; above 2 it is the last. */
  @Test
  void thePresentFactorCountsToo() {
    BestByLoss best = sweep(Quantity.of(3)).orElseThrow();
    assertEquals(
        List.of("0: 8.75, 850.00 to 0.86: 8.965, 7.20", "0.87: 10, 0.00 to 3: 10, 0.00"),
        ranges(best));
  }

  /** From Monday on every finish after the eighth day and up to the ninth is on one date. */
  @Test
  void finishesOnOneDayCountAsOne() throws IOException {
    put("terms.csv", "term,value\ntime_related_cost,2000\nstart_date,2026-09-07\n");
    assertEquals(
        List.of("0: 8.75, 850.00 to 0.86: 8.965, 7.20", "0.87: 10, 0.00 to 2: 10, 0.00"),
        ranges(sweep(Quantity.ONE).orElseThrow()));
  }

  /**
   * A spell to the end takes 200 / (25 - F) days: 8 without loss, and a part of the ninth with any.
   * Of its 40 / (25 - F) weeks each saves and costs as much as above, so that it pays as long.
   */
  @Test
  void anotherUnitIsAnotherFinish() throws IOException {
    patterns("");
    BestByLoss best = sweep(Quantity.ONE).orElseThrow();
    assertEquals(
        List.of("0 to 0", "0.01 to 0.86", "0.87 to 2"),
        best.ranges().stream()
            .map(
                r ->
                    r.from().factor().rounded(2, RoundingMode.HALF_UP)
                        + " to "
                        + r.to().factor().rounded(2, RoundingMode.HALF_UP))
            .toList());
    assertTrue(best.isNarrowed());
  }

  /** 60 % times 1.67 is more than all; times 1.66 it is 99.6 %. */
  @Test
  void noFactorIsTriedThatLeavesNoOutput() throws IOException {
    loss("0.6");
    BestByLoss best = sweep(Quantity.ONE).orElseThrow();
    assertTrue(best.isBounded());
    List<BestByLoss.Tried> tried = best.tried();
    assertEquals("1.66: 10, 0.00", text(tried.get(tried.size() - 1)));
  }

  @Test
  void withoutALossNothingIsSought() throws IOException {
    Files.delete(folder.resolve("output_loss.csv"));
    assertEquals(Optional.empty(), sweep(Quantity.ONE));
    loss("0");
    assertEquals(Optional.empty(), sweep(Quantity.ONE));
  }

  @Test
  void withoutLabourNothingIsSought() throws IOException {
    for (String name : List.of("labour.csv", "patterns.csv", "pay.csv", "output_loss.csv")) {
      Files.delete(folder.resolve(name));
    }
    put("activities.csv", "id,normal_duration,normal_cost\nA,10,1000\n");
    assertEquals(Optional.empty(), sweep(Quantity.ONE));
  }

  /** A project that takes one day more for each hundredth has another finish at every factor. */
  @Test
  void noMoreFactorsAreTriedThanTheLimit() {
    Case read = read(Quantity.ONE).orElseThrow();
    LossScaling scaling =
        factor -> {
          long days = factor.times(Quantity.of(100)).rounded(0, RoundingMode.HALF_UP).longValue();
          return Optional.of(lasting(read, days + 1));
        };
    BestByLoss best =
        WeighQuestion.ask(lasting(read, 101), scaling, Effort.USUAL, Watcher.NONE)
            .byLoss()
            .orElseThrow();
    assertEquals(LossSweep.MOST + 1, best.tried().size());
    assertFalse(best.isNarrowed());
  }

  private static Case lasting(Case read, long days) {
    TimeScale scale = read.network().scale();
    return new Case(
        "lasting",
        "",
        "",
        TimeUnit.DAY,
        new Network(
            scale,
            List.of(Activity.fixed("A", days * scale.ticksPerUnit(), Money.of(1))),
            List.of()),
        read.terms(),
        MomentMoney.none(scale),
        Optional.empty(),
        read.buildUp(),
        List.of(),
        List.of());
  }
}
