package dayworth.decision;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.buildup.BuildUp;
import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.MomentMoney;
import dayworth.contract.PartWeek;
import dayworth.contract.Per;
import dayworth.contract.RunningCost;
import dayworth.contract.Section;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Relation;
import dayworth.network.Timing;
import dayworth.testing.RandomTerms;
import dayworth.testing.WalkedMoney;
import dayworth.value.DayLength;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.math.BigDecimal;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** Every row of a curve with sections and running costs, by hand and against every plan. */
class SectionCurveTest {

  private static final int CASES = 120;
  private static final List<Per> PERS = List.of(Per.values());
  private static final List<Relation> RELATIONS = List.of(Relation.values());

  /** Beyond every curve of the tiny cases here, and a few ticks more. */
  private static final int HORIZON = 20;

  private static CurveAnswer answer(Network network, Terms terms, MomentMoney money)
      throws FinishTooEarly {
    Case of =
        new Case(
            "drawn",
            "",
            "",
            TimeUnit.DAY,
            network,
            terms,
            money,
            Optional.empty(),
            BuildUp.NONE,
            List.of(),
            List.of());
    return CurveQuestion.ask(of, OptionalLong.empty(), Long.MAX_VALUE, Watcher.NONE);
  }

  private static Activity work(String id, long normal, long crash, long slope) {
    Money extra = Money.of(slope * (normal - crash));
    return new Activity(id, "", "", normal, crash, Money.ZERO, extra, 0);
  }

  private static Finish row(CurveAnswer answer, long duration) {
    return answer.rows().stream()
        .filter(finish -> finish.duration() == duration)
        .findFirst()
        .orElseThrow();
  }

  /**
   * A takes 5, or less at 100 a unit, and is a section due at 3: 150 a unit, at most 180. In time
   * it costs 200; one unit late 100 + 150; two late 180. B lasts 10 and is not hurried.
   */
  @Test
  void aSectionThatIsCheaperLateIsLeftLate() throws FinishTooEarly {
    Network network =
        new Network(
            TimeScale.WHOLE, List.of(work("A", 5, 3, 100), work("B", 10, 10, 0)), List.of());
    Damages damages = Damages.perUnit(Money.of(150), BigDecimal.ZERO, Optional.of(Money.of(180)));
    Section section = new Section("S", 0, Due.at(3), damages, Bonus.NONE);
    MomentMoney money =
        new MomentMoney(TimeScale.WHOLE, Optional.empty(), List.of(section), List.of());
    CurveAnswer answer = answer(network, Terms.none(TimeScale.WHOLE), money);
    Finish only = row(answer, 10);
    assertEquals(List.of(only), answer.rows());
    assertEquals(Money.ZERO, only.direct());
    assertEquals(Money.of(180), only.other().damages());
  }

  /**
   * A (2) and C (10) before D (3). A crane from A's start to D's finish costs 50 a unit: A starts
   * at 8, not at 0, and the crane stays for 5. By the calendar day from Monday, 1 March: the ninth
   * working day is Thursday the 11th, the thirteenth Wednesday the 17th: 7 days.
   */
  @Test
  void aStartIsPutOffToShortenWhatRuns() throws FinishTooEarly {
    Network network =
        new Network(
            TimeScale.WHOLE,
            List.of(work("A", 2, 2, 0), work("C", 10, 10, 0), work("D", 3, 3, 0)),
            List.of(Link.finishToStart(0, 2), Link.finishToStart(1, 2)));
    WorkingCalendar calendar =
        WorkingCalendar.of(
            LocalDate.of(2027, 3, 1),
            EnumSet.range(DayOfWeek.MONDAY, DayOfWeek.FRIDAY),
            Set.of(),
            DayLength.ofUnits(BigDecimal.ONE, TimeScale.WHOLE));
    for (Per per : Per.values()) {
      RunningCost crane =
          new RunningCost("Crane", Moment.startOf(0), Moment.finishOf(2), Money.of(50), per);
      MomentMoney money =
          new MomentMoney(TimeScale.WHOLE, Optional.of(calendar), List.of(), List.of(crane));
      CurveAnswer answer = answer(network, terms(calendar, Terms.none(TimeScale.WHOLE)), money);
      long expected = per == Per.UNIT ? 250 : per == Per.CALENDAR_DAY ? 350 : 50;
      assertEquals(Money.of(expected), row(answer, 13).running(), per.toString());
      assertEquals(Money.of(expected), answer.asPlanned().running(), per.toString());
    }
  }

  private static Terms terms(WorkingCalendar calendar, Terms like) {
    return new Terms(
        like.scale(),
        Optional.of(calendar),
        TimeRelated.NONE,
        Money.ZERO,
        like.contractFinish(),
        like.damages(),
        like.bonus());
  }

  @Test
  void noPlanCostsLessThanItsRow() throws FinishTooEarly {
    int branched = 0;
    int hired = 0;
    for (int seed = 0; seed < CASES; seed++) {
      Random random = new Random(seed);
      RandomTerms drawn = RandomTerms.of(random, TimeScale.WHOLE, 8);
      WorkingCalendar calendar = drawn.terms().calendar().orElseThrow();
      Network network = network(random);
      List<Terms> sections = new ArrayList<>();
      for (int count = random.nextInt(3); count > 0; count--) {
        sections.add(section(random, calendar));
      }
      List<RunningCost> running = running(random, network.size());
      List<Section> read = new ArrayList<>();
      for (int j = 0; j < sections.size(); j++) {
        Terms of = sections.get(j);
        Due due = of.contractFinish().orElseThrow();
        read.add(new Section("S" + j, j, due, of.damages(), of.bonus()));
      }
      MomentMoney money = new MomentMoney(TimeScale.WHOLE, Optional.of(calendar), read, running);
      CurveAnswer answer = answer(network, drawn.terms(), money);
      Money[] least = new EveryPlan(network, drawn, sections, running).least();
      WalkedMoney whole = new WalkedMoney(drawn.terms(), drawn.holidays());
      for (Finish row : answer.rows()) {
        String where = "seed " + seed + " at " + row.duration();
        Money expected = least[Math.toIntExact(row.duration())].plus(whole.sum(row.duration()));
        assertEquals(expected, row.spent().plus(row.other().sum()), where);
      }
      int first = Math.toIntExact(answer.rows().get(0).duration());
      long asPlanned = Timing.earliest(network, Plan.allNormal(network)).finish();
      Money unhurried = least[Math.toIntExact(Math.min(HORIZON, 2 * asPlanned))];
      assertTrue(least[first].compareTo(unhurried) <= 0, "seed " + seed + " at the first row");
      assertEquals(answer.rows().size(), answer.provedRows(), "seed " + seed);
      branched += money.charges().isEmpty() ? 0 : 1;
      hired += running.stream().anyMatch(cost -> cost.per().isByDate()) ? 1 : 0;
    }
    assertTrue(branched > CASES / 3, branched + " are not convex");
    assertTrue(hired > CASES / 4, hired + " have hire by the date");
  }

  private static Network network(Random random) {
    List<Activity> activities = new ArrayList<>();
    List<Link> links = new ArrayList<>();
    for (int i = 0; i < 3; i++) {
      long normal = random.nextInt(4);
      long crash = Math.max(0, normal - random.nextInt(3));
      activities.add(work("A" + i, normal, crash, random.nextInt(60) - 5));
      if (i > 0) {
        Relation relation = RELATIONS.get(random.nextInt(4));
        links.add(new Link(random.nextInt(i), i, relation, random.nextInt(4) - 1));
      }
    }
    return new Network(TimeScale.WHOLE, activities, links);
  }

  /** A section as the terms of a whole, which the clerk understands. */
  private static Terms section(Random random, WorkingCalendar calendar) {
    Terms like = RandomTerms.of(random, TimeScale.WHOLE, 8).terms();
    Due due =
        random.nextBoolean()
            ? Due.on(calendar.startDate().plusDays(random.nextInt(14)), calendar)
            : Due.after(random.nextInt(8), calendar);
    return new Terms(
        TimeScale.WHOLE,
        Optional.of(calendar),
        TimeRelated.NONE,
        Money.ZERO,
        Optional.of(due),
        new Damages(
            like.damages().rate(),
            like.damages().per(),
            like.damages().per() == Per.UNIT
                ? BigDecimal.valueOf(random.nextInt(3))
                : like.damages().grace(),
            like.damages().cap(),
            random.nextBoolean() ? PartWeek.WHOLE : PartWeek.PRO_RATA),
        like.bonus());
  }

  private static List<RunningCost> running(Random random, int size) {
    List<RunningCost> running = new ArrayList<>();
    for (int count = random.nextInt(3); count > 0; count--) {
      Moment from =
          random.nextInt(5) == 0 ? Moment.PROJECT_START : Moment.startOf(random.nextInt(size));
      Moment to = Moment.finishOf(random.nextInt(size));
      Per per = PERS.get(random.nextInt(3));
      running.add(new RunningCost("R" + count, from, to, Money.of(1 + random.nextInt(50)), per));
    }
    return running;
  }

  /** Every choice of whole durations and starts; money is counted by the clerk. */
  private static final class EveryPlan {

    private final Network network;
    private final Money[] leastAt = new Money[HORIZON + 1];
    private final Money[][] sectionAt;
    private final Money[][][] runningAt;
    private final List<RunningCost> running;
    private final long[] starts;
    private final long[] durations;

    EveryPlan(Network network, RandomTerms drawn, List<Terms> sections, List<RunningCost> running) {
      this.network = network;
      this.running = running;
      this.starts = new long[network.size()];
      this.durations = new long[network.size()];
      WalkedMoney dates = new WalkedMoney(drawn.terms(), drawn.holidays());
      sectionAt = new Money[sections.size()][HORIZON + 1];
      for (int j = 0; j < sections.size(); j++) {
        WalkedMoney clerk = new WalkedMoney(sections.get(j), drawn.holidays());
        for (int t = 0; t <= HORIZON; t++) {
          sectionAt[j][t] = clerk.damages(t).minus(clerk.bonus(t));
        }
      }
      runningAt = new Money[running.size()][HORIZON + 1][HORIZON + 1];
      for (int j = 0; j < running.size(); j++) {
        for (int from = 0; from <= HORIZON; from++) {
          for (int to = 0; to <= HORIZON; to++) {
            runningAt[j][from][to] = hire(running.get(j), from, to, dates);
          }
        }
      }
    }

    private static Money hire(RunningCost cost, long from, long to, WalkedMoney dates) {
      if (cost.per() == Per.UNIT) {
        return cost.rate().times(Math.max(0, to - from));
      }
      LocalDate first = cost.from().isProjectStart() ? dates.firstDay() : dates.startDate(from);
      long days = Math.max(0, ChronoUnit.DAYS.between(first, dates.finishDate(to)) + 1);
      long weeks = 0;
      while (weeks * 7 < days) {
        weeks++;
      }
      return cost.rate().times(cost.per() == Per.WEEK ? weeks : days);
    }

    /** The least of all plans that finish within each time; null where there is none. */
    Money[] least() {
      choose(0, Money.ZERO);
      for (int t = 1; t <= HORIZON; t++) {
        if (leastAt[t - 1] != null) {
          leastAt[t] = leastAt[t] == null ? leastAt[t - 1] : leastAt[t].min(leastAt[t - 1]);
        }
      }
      return leastAt;
    }

    private void choose(int i, Money cost) {
      if (i == network.size()) {
        offer(cost);
        return;
      }
      Activity activity = network.activity(i);
      for (long d = activity.crash(); d <= activity.normal(); d++) {
        durations[i] = d;
        Money here = cost.plus(activity.slope().times(activity.normal() - d));
        for (long start = 0; start + d <= HORIZON; start++) {
          starts[i] = start;
          if (keepsLinks(i)) {
            choose(i + 1, here);
          }
        }
      }
    }

    private boolean keepsLinks(int last) {
      for (Link link : network.links()) {
        if (link.successor() == last) {
          long from = starts[link.predecessor()];
          from += link.relation().fromStart() ? 0 : durations[link.predecessor()];
          long to = starts[last] + (link.relation().toStart() ? 0 : durations[last]);
          if (to < from + link.lag()) {
            return false;
          }
        }
      }
      return true;
    }

    private void offer(Money work) {
      long finish = 0;
      for (int i = 0; i < starts.length; i++) {
        finish = Math.max(finish, starts[i] + durations[i]);
      }
      Money cost = work;
      for (int j = 0; j < sectionAt.length; j++) {
        cost = cost.plus(sectionAt[j][time(Moment.finishOf(j))]);
      }
      for (int j = 0; j < running.size(); j++) {
        cost = cost.plus(runningAt[j][time(running.get(j).from())][time(running.get(j).to())]);
      }
      int at = Math.toIntExact(finish);
      leastAt[at] = leastAt[at] == null ? cost : leastAt[at].min(cost);
    }

    private int time(Moment moment) {
      if (moment.isProjectStart()) {
        return 0;
      }
      int i = moment.activity();
      return Math.toIntExact(starts[i] + (moment.isFinish() ? durations[i] : 0));
    }
  }
}
