package dayworth.command;

import dayworth.decision.Case;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.function.Function;
import picocli.CommandLine;
import picocli.CommandLine.ITypeConverter;

/**
 * The plan that a brief argues for.
 *
 * @param date by when it finishes; empty where something else is said
 * @param units within how many units it finishes; empty likewise. Both empty: the least total
 */
record WhichPlan(Optional<LocalDate> date, Optional<BigDecimal> units) {

  /** Longer than any project that a case may hold. */
  private static final BigDecimal MOST_UNITS = BigDecimal.valueOf(1_000_000_000);

  /** Reads a duration, a date or the word least. */
  static final class Parser implements ITypeConverter<WhichPlan> {

    @Override
    public WhichPlan convert(String text) {
      if (text.equals("least")) {
        return new WhichPlan(Optional.empty(), Optional.empty());
      }
      if (text.matches("\\d+-\\d+-\\d+")) {
        return new WhichPlan(Optional.of(new DateOption().convert(text)), Optional.empty());
      }
      if (!text.matches("\\d{1,30}(\\.\\d{1,30})?")) {
        throw new CommandLine.TypeConversionException(
            "'" + text + "' is not a duration such as 17.5, a date such as 2026-09-07, or least");
      }
      BigDecimal units = new BigDecimal(text);
      if (units.stripTrailingZeros().scale() > TimeScale.MOST_DECIMALS) {
        throw new CommandLine.TypeConversionException("'" + text + "' has more than 3 decimals");
      }
      if (units.compareTo(MOST_UNITS) > 0) {
        throw new CommandLine.TypeConversionException("'" + text + "' is more than " + MOST_UNITS);
      }
      return new WhichPlan(Optional.empty(), Optional.of(units));
    }
  }

  /** The scale that a duration needs. */
  TimeScale scale() {
    return units.map(TimeScale::of).orElse(TimeScale.WHOLE);
  }

  /** Ticks within which the plan finishes; empty for the least total. */
  OptionalLong ticks(Case of, Function<String, CommandLine.ParameterException> wrongUsage) {
    if (date.isPresent()) {
      WorkingCalendar calendar =
          of.terms()
              .calendar()
              .orElseThrow(
                  () ->
                      wrongUsage.apply(
                          "--plan DATE wants a case with dates: a row for start_date in terms.csv,"
                              + " or --plan UNITS"));
      return OptionalLong.of(Math.max(0, calendar.endOf(date.get())));
    }
    return units
        .map(number -> OptionalLong.of(of.network().scale().ticks(number)))
        .orElseGet(OptionalLong::empty);
  }
}
