package dayworth.casefile;

import dayworth.buildup.OutputLoss;
import dayworth.buildup.Pattern;
import dayworth.buildup.PayLadder;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * A row of patterns.csv as far as it could be read.
 *
 * @param name blank or a second one of its kind where that has been reported
 */
record PatternRow(
    int line,
    String name,
    Cell<BigDecimal> hoursPerWeek,
    Cell<BigDecimal> daysPerWeek,
    Cell<BigDecimal> crewFactor,
    Cell<BigDecimal> crowdingLoss,
    Cell<BigDecimal> onceCost,
    Cell<BigDecimal> weekCost,
    Cell<Integer> weeksMax,
    String note) {

  Place place(String column) {
    return new Place(PatternTable.FILE, line, column);
  }

  /** Whether it has more hours than another, as far as both are known. */
  boolean isLongerThan(PatternRow other) {
    Optional<BigDecimal> mine = hoursPerWeek.value();
    Optional<BigDecimal> others = other.hoursPerWeek.value();
    return mine.isPresent() && others.isPresent() && mine.get().compareTo(others.get()) > 0;
  }

  /** The pattern; empty where a value that it needs could not be read. */
  Optional<Pattern> pattern(PayLadder pay, OutputLoss loss) {
    if (hoursPerWeek.value().isEmpty() || daysPerWeek.value().isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        new Pattern(
            name,
            Quantity.of(hoursPerWeek.value().get()),
            Quantity.of(daysPerWeek.value().get()),
            Quantity.of(crewFactor.value().orElse(BigDecimal.ONE)),
            Quantity.of(crowdingLoss.value().orElse(BigDecimal.ZERO)),
            Money.of(onceCost.value().orElse(BigDecimal.ZERO)),
            Money.of(weekCost.value().orElse(BigDecimal.ZERO)),
            weeksMax.value().map(OptionalInt::of).orElseGet(OptionalInt::empty),
            note,
            pay,
            loss));
  }
}
