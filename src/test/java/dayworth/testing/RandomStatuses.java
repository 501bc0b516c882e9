package dayworth.testing;

import dayworth.decision.Progress;
import dayworth.decision.Status;
import dayworth.decision.Status.Crash;
import dayworth.decision.Status.Finished;
import dayworth.decision.Status.InProgress;
import dayworth.decision.Status.NotStarted;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.value.Money;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;

/**
 * How far a network is, drawn from a seed without regard to its logic, so that much of it is out of
 * sequence. Times are whole ticks.
 */
public final class RandomStatuses {

  private static final LocalDate DATA_DATE = LocalDate.of(2027, 7, 16);

  private final Random random;

  private RandomStatuses(long seed) {
    this.random = new Random(seed);
  }

  /** A status for each activity; those that take no time are never in progress. */
  public static Progress of(Network network, long seed) {
    RandomStatuses drawn = new RandomStatuses(seed);
    List<Status> statuses = new ArrayList<>();
    network.activities().forEach(activity -> statuses.add(drawn.status(activity)));
    return new Progress(DATA_DATE, statuses);
  }

  private Status status(Activity activity) {
    int draw = random.nextInt(10);
    if (draw < 4) {
      return new NotStarted();
    }
    long start = -random.nextInt(15);
    LocalDate since = DATA_DATE.plusDays(start);
    if (draw < 6 || activity.normal() == 0) {
      long finish = start + random.nextInt((int) -start + 1);
      return new Finished(since, DATA_DATE.plusDays(finish), start, finish);
    }
    long remaining = random.nextInt((int) activity.normal() + 3);
    return new InProgress(since, start, remaining, crash(remaining));
  }

  private Optional<Crash> crash(long remaining) {
    if (remaining == 0 || random.nextInt(3) > 0) {
      return Optional.empty();
    }
    long shortest = random.nextInt((int) remaining);
    return Optional.of(new Crash(shortest, Money.of(random.nextInt(1500))));
  }
}
