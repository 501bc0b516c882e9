package dayworth.testing;

import dayworth.buildup.OutputLoss;
import dayworth.buildup.Pattern;
import dayworth.buildup.PayLadder;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.util.OptionalInt;
import java.util.stream.Stream;

/** Working patterns for tests, in few words. */
public final class Patterns {

  private Patterns() {}

  /** So many hours and days for the crew as it is, with neither loss nor cost of its own. */
  public static Pattern plain(String name, int hours, int days) {
    return overtime(name, hours, days, PayLadder.STRAIGHT, OutputLoss.NONE);
  }

  /** The same with pay steps and losses. */
  public static Pattern overtime(String name, int hours, int days, PayLadder pay, OutputLoss loss) {
    return new Pattern(
        name,
        Quantity.of(hours),
        Quantity.of(days),
        Quantity.ONE,
        Quantity.ZERO,
        Money.ZERO,
        Money.ZERO,
        OptionalInt.empty(),
        "",
        pay,
        loss);
  }

  /** Losses of the weeks of a spell, from its first. */
  public static OutputLoss loss(String... weeks) {
    return new OutputLoss(
        Stream.of(weeks)
            .map(week -> new OutputLoss.Week(Quantity.of(new BigDecimal(week)), "assumed"))
            .toList());
  }
}
