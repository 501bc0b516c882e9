package dayworth.casefile;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.Optional;

/**
 * A point in time as a case gives it: a date, or a number of time units after the start.
 *
 * @param units empty where a date is given
 * @param date empty where a number is given
 */
record Moment(Optional<BigDecimal> units, Optional<LocalDate> date) {

  /** Reads either. */
  enum Parser implements CellParser<Moment> {
    MOMENT;

    @Override
    public Moment parse(String text, NumberStyle style) throws CellFault {
      return DateCell.isMeant(text)
          ? new Moment(Optional.empty(), Optional.of(DateCell.DATE.parse(text, style)))
          : new Moment(Optional.of(TimeCell.DURATION.parse(text, style)), Optional.empty());
    }
  }
}
