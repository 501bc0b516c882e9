package dayworth.casefile;

import dayworth.contract.Per;
import java.math.BigDecimal;

/**
 * A row of running.csv that could be read.
 *
 * @param from index of the activity with whose start it begins
 * @param to index of the activity with whose finish it ends
 */
record RunningRow(int line, String name, int from, int to, BigDecimal rate, Per per) {

  Place place(String column) {
    return new Place(RunningTable.FILE, line, column);
  }
}
