package dayworth.contract;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.engine.branching.Charge;
import dayworth.engine.branching.Window;
import dayworth.network.Moment;
import dayworth.testing.RandomTerms;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** What branching relies on: each charge keeps the promises of {@link Charge}. */
class ChargeLawsTest {

  private static final int CASES = 600;

  private static List<Charge> charges(Random random) {
    List<Charge> charges = new ArrayList<>();
    Terms terms = RandomTerms.of(random, new TimeScale(random.nextInt(3)), 20).terms();
    terms
        .contractFinish()
        .map(due -> new Section("S", 0, due, terms.damages(), terms.bonus()))
        .map(section -> new SectionCharge(section, new Counting(terms.scale(), terms.calendar())))
        .ifPresent(charges::add);
    Moment from = random.nextInt(4) == 0 ? Moment.PROJECT_START : Moment.startOf(1);
    Per per = random.nextBoolean() ? Per.CALENDAR_DAY : Per.WEEK;
    RunningCost cost = new RunningCost("H", from, Moment.finishOf(0), Money.of(11), per);
    charges.add(new Hire(cost, terms.calendar().orElseThrow()));
    return charges;
  }

  private static Window window(Random random) {
    int least = random.nextInt(250);
    return new Window(least, least + (random.nextInt(4) == 0 ? 0 : random.nextInt(120)));
  }

  private static List<Window> windows(Random random, Charge charge) {
    return charge.moments().stream().map(moment -> window(random)).toList();
  }

  private static long within(Random random, Window window) {
    return window.least() + random.nextInt(Math.toIntExact(window.most() - window.least()) + 1);
  }

  @Test
  void partsAreNeverAboveTheMoneyAndMeetItAtPoints() {
    for (int seed = 0; seed < CASES; seed++) {
      Random random = new Random(seed);
      for (Charge charge : charges(random)) {
        List<Window> windows = windows(random, charge);
        for (int k = 0; k < 20; k++) {
          long[] times = windows.stream().mapToLong(window -> within(random, window)).toArray();
          String where = "seed " + seed + " " + charge.name() + " " + List.of(times[0]);
          assertTrue(sum(charge, windows, times).compareTo(charge.at(times)) <= 0, where);
          List<Window> points = new ArrayList<>();
          for (long time : times) {
            points.add(new Window(time, time));
          }
          assertEquals(charge.at(times), sum(charge, points, times), where);
        }
      }
    }
  }

  private static Money sum(Charge charge, List<Window> windows, long[] times) {
    List<Charge.Part> parts = charge.within(windows);
    Money sum = Money.ZERO;
    for (int k = 0; k < times.length; k++) {
      sum = sum.plus(parts.get(k).at(times[k]));
    }
    return sum;
  }

  @Test
  void partsRiseOrFallAndAreNowhereBelowTheLineBetweenPoints() {
    for (int seed = 0; seed < CASES; seed++) {
      Random random = new Random(seed);
      for (Charge charge : charges(random)) {
        List<Window> windows = windows(random, charge);
        List<Charge.Part> parts = charge.within(windows);
        for (int k = 0; k < parts.size(); k++) {
          String where = "seed " + seed + " " + charge.name() + " " + k;
          checkPart(charge, parts.get(k), k, windows.get(k), where);
        }
      }
    }
  }

  private static void checkPart(
      Charge charge, Charge.Part part, int k, Window window, String where) {
    long[] points = charge.points(k, window);
    assertEquals(window.least(), points[0], where);
    assertEquals(window.most(), points[points.length - 1], where);
    for (int i = 1; i < points.length; i++) {
      long from = points[i - 1];
      long length = points[i] - from;
      assertTrue(length > 0, where);
      Money first = part.at(from);
      Money rise = part.at(points[i]).minus(first);
      Money before = first;
      for (long time = from; time <= points[i]; time++) {
        Money here = part.at(time);
        Money line = first.plus(rise.times(time - from).dividedBy(length));
        assertTrue(here.compareTo(line) >= 0, where + " below the line at " + time);
        int way = here.compareTo(before);
        assertTrue(charge.rises(k) ? way >= 0 : way <= 0, where + " turns at " + time);
        before = here;
      }
    }
  }
}
