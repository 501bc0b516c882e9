package dayworth.casefile;

import java.math.BigDecimal;
import java.util.OptionalInt;

/**
 * A row of measures.csv that could be read.
 *
 * @param activity index
 * @param inPackage index of its package; empty for none
 * @param ofRemaining whether duration and cost are of the work to go
 */
record MeasureRow(
    int line,
    int activity,
    String measure,
    BigDecimal duration,
    BigDecimal cost,
    OptionalInt inPackage,
    boolean ofRemaining,
    String note) {

  Place place(String column) {
    return new Place(MeasureTable.FILE, line, column);
  }
}
