package dayworth.report;

import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.FinishCost;
import dayworth.contract.Per;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.decision.Case;
import dayworth.decision.CrossCheck;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Evidence;
import dayworth.decision.Finish;
import dayworth.decision.InputFile;
import dayworth.decision.Notice;
import dayworth.decision.PlanChange;
import dayworth.decision.StepFacts;
import dayworth.decision.TimeUnit;
import dayworth.engine.Change;
import dayworth.engine.Curve;
import dayworth.engine.Obstacle;
import dayworth.engine.Step;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.value.DayLength;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.math.BigDecimal;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * An answer worked by hand. A (6 days for 100, 4 for 140: 20 a day) comes before =B (4 for 50, 3
 * for 80: 30 a day); C (3 for 10, 2 for 15: 5 a day) stands alone. Time costs 25 a day, damages are
 * 10 a day after day 9.
 *
 * <p>Direct: 160 at 10 days; A twice: 180 at 9, 200 at 8; =B once: 230 at 7. All crashed: 140 + 80
 * + 15 = 235, also 7 days. Totals: 160 + 250 + 10 = 420, 180 + 225 = 405, 200 + 200 = 400, 230 +
 * 175 = 405.
 */
final class SeriesAnswer {

  static final Network NETWORK =
      new Network(
          TimeScale.WHOLE,
          List.of(
              Activity.compressible("A", 6, Money.of(100), 4, Money.of(140)),
              Activity.compressible("=B", 4, Money.of(50), 3, Money.of(80)),
              Activity.compressible("C", 3, Money.of(10), 2, Money.of(15))),
          List.of(Link.finishToStart(0, 1)));

  /** Without dates. */
  static final Case CASE = aCase(Optional.empty());

  /** The same from Monday 7 September 2026, Monday to Friday; day 9 is Thursday the 17th. */
  static final Case DATED =
      aCase(
          Optional.of(
              WorkingCalendar.of(
                  LocalDate.parse("2026-09-07"),
                  EnumSet.range(DayOfWeek.MONDAY, DayOfWeek.FRIDAY),
                  List.of(),
                  new DayLength(1, 1))));

  private SeriesAnswer() {}

  private static Case aCase(Optional<WorkingCalendar> calendar) {
    Terms terms =
        new Terms(
            TimeScale.WHOLE,
            calendar,
            new TimeRelated(Money.of(25), Per.UNIT),
            Money.ZERO,
            Optional.of(calendar.map(dates -> Due.after(9, dates)).orElse(Due.at(9))),
            Damages.perUnit(Money.of(10), BigDecimal.ZERO, Optional.empty()),
            Bonus.NONE);
    return new Case(
        "series",
        "Two in a row",
        "EUR",
        TimeUnit.DAY,
        NETWORK,
        terms,
        List.of(new Notice("activities.csv", 4, "id", "nothing follows C", "", "link it")),
        List.of(new InputFile("activities.csv", "00ff")));
  }

  static CurveAnswer answer() {
    return answer(CASE);
  }

  private static List<PlanChange> changes(int activity, long shortened, long extra) {
    return List.of(
        new PlanChange(
            activity, PlanChange.Kind.COMPRESS, Plan.NO_MEASURE, shortened, Money.of(extra)));
  }

  static CurveAnswer answer(Case of) {
    Finish ten = finish(10, 160, 250, 10, Optional.of(20L), true);
    Finish nine = finish(9, 180, 225, 0, Optional.of(20L), false);
    Finish eight = finish(8, 200, 200, 0, Optional.of(30L), true);
    Finish seven = finish(7, 230, 175, 0, Optional.empty(), true);
    Step first = new Step(10, 8, Money.of(40), List.of(new Change(0, 2)));
    Step second = new Step(8, 7, Money.of(30), List.of(new Change(1, 1)));
    Plan atEight = Plan.of(new long[] {4, 4, 3});
    return new CurveAnswer(
        of,
        new Curve(
            NETWORK,
            10,
            Plan.allNormal(NETWORK),
            Money.of(160),
            List.of(first, second),
            List.of(new Obstacle.AtShortest(0, 4), new Obstacle.AtShortest(1, 3))),
        ten,
        List.of(ten, nine, eight, seven),
        List.of(eight),
        List.of(
            new StepFacts(first, changes(0, 2, 40), 2, List.of()),
            new StepFacts(second, changes(1, 1, 30), 2, List.of())),
        Optional.of(nine),
        finish(7, 235, 175, 0, Optional.empty(), false),
        new CurveAnswer.AskedPlan(eight, Timing.earliest(NETWORK, atEight)),
        4,
        List.of(),
        false,
        new CrossCheck(
            List.of(
                new CrossCheck.Comparison(10, Money.of(160), new BigDecimal("160.00")),
                new CrossCheck.Comparison(9, Money.of(180), new BigDecimal("180.00"))),
            1,
            2,
            List.of()),
        Optional.empty(),
        new Evidence(
            1,
            Optional.empty(),
            new TreeMap<>(Map.of(8L, atEight)),
            Plan.allNormal(NETWORK),
            Plan.allCrash(NETWORK)));
  }

  private static Finish finish(
      long days, long direct, long time, long damages, Optional<Long> price, boolean bends) {
    return new Finish(
        days,
        Money.of(direct),
        Money.ZERO,
        new FinishCost(Money.of(time), Money.ZERO, Money.of(damages), Money.ZERO),
        price.map(Money::of),
        bends);
  }
}
