package dayworth.casefile;

import java.math.BigDecimal;
import java.time.LocalDate;

/**
 * A row of progress.csv as far as it could be read.
 *
 * @param activity index of a row of activities.csv
 * @param started given where the work has started
 * @param finished given where it is finished
 * @param remaining what is left of started work, in time units
 * @param crash the same at its shortest; with {@code crashCost} or neither
 * @param crashCost what the rest costs then
 */
record ProgressRow(
    int line,
    int activity,
    Cell<LocalDate> started,
    Cell<LocalDate> finished,
    Cell<BigDecimal> remaining,
    Cell<BigDecimal> crash,
    Cell<BigDecimal> crashCost) {

  boolean isInProgress() {
    return started.given() && !finished.given();
  }

  Place place(String column) {
    return new Place(ProgressTable.FILE, line, column);
  }
}
