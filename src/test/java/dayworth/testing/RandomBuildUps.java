package dayworth.testing;

import dayworth.buildup.Labour;
import dayworth.buildup.OutputLoss;
import dayworth.buildup.Pattern;
import dayworth.buildup.PayLadder;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.Random;
import java.util.TreeSet;

/** Labour and patterns drawn from a seed: losses that rise, fall and gain, ladders, part crews. */
public final class RandomBuildUps {

  private static final int MOST_PATTERNS = 4;

  private RandomBuildUps() {}

  public static Labour labour(Random random) {
    return new Labour(
        decimal(random, 1, 900, 1),
        decimal(random, 1, 12, random.nextInt(2)),
        Money.of(BigDecimal.valueOf(random.nextInt(9000), 2)),
        Money.of(random.nextInt(100_000)));
  }

  /** The normal pattern, then up to four that may be bought. */
  public static List<Pattern> patterns(Random random) {
    Pattern plain = Patterns.plain("normal", 35 + random.nextInt(11), 5);
    List<Pattern> patterns = new ArrayList<>();
    patterns.add(
        new Pattern(
            plain.name(),
            plain.hoursPerWeek(),
            plain.daysPerWeek(),
            plain.crewFactor(),
            plain.crowdingLoss(),
            Money.ZERO,
            Money.of(random.nextInt(2) * 300L),
            OptionalInt.empty(),
            "",
            random.nextBoolean() ? PayLadder.STRAIGHT : ladder(random),
            OutputLoss.NONE));
    for (int k = 1 + random.nextInt(MOST_PATTERNS); k > 0; k--) {
      patterns.add(bought(random, "pattern " + k));
    }
    return patterns;
  }

  private static Pattern bought(Random random, String name) {
    int days = 1 + random.nextInt(7);
    return new Pattern(
        name,
        decimal(random, days * 4, days * 14, 1),
        Quantity.of(days),
        decimal(random, 1, 3, random.nextInt(3)),
        random.nextBoolean()
            ? Quantity.ZERO
            : Quantity.of(BigDecimal.valueOf(random.nextInt(60), 2)),
        Money.of(random.nextInt(3) * 500L),
        Money.of(random.nextInt(3) * 400L),
        random.nextBoolean() ? OptionalInt.empty() : OptionalInt.of(1 + random.nextInt(12)),
        "",
        ladder(random),
        loss(random));
  }

  private static PayLadder ladder(Random random) {
    TreeSet<Integer> hours = new TreeSet<>();
    for (int k = random.nextInt(4); k > 0; k--) {
      hours.add(random.nextInt(60));
    }
    return new PayLadder(
        hours.stream()
            .map(above -> new PayLadder.Step(Quantity.of(above), decimal(random, 1, 3, 2)))
            .toList());
  }

  private static OutputLoss loss(Random random) {
    List<OutputLoss.Week> weeks = new ArrayList<>();
    for (int k = random.nextInt(12); k > 0; k--) {
      BigDecimal share = BigDecimal.valueOf(random.nextInt(80) - 10L, 2);
      weeks.add(new OutputLoss.Week(Quantity.of(share), "drawn"));
    }
    return new OutputLoss(weeks);
  }

  /** From {@code least} up to {@code most} units, in steps of so many decimals. */
  private static Quantity decimal(Random random, int least, int most, int decimals) {
    int steps = (int) Math.pow(10, decimals);
    long drawn = least * (long) steps + random.nextInt((most - least) * steps + 1);
    return Quantity.of(BigDecimal.valueOf(drawn, decimals));
  }
}
