package dayworth.casefile;

import dayworth.contract.Per;
import java.math.BigDecimal;

/**
 * A row of sections.csv whose activity exists and whose due time could be read.
 *
 * @param activity index of a row of activities.csv
 */
record SectionRow(
    int line,
    String name,
    int activity,
    Moment due,
    Cell<BigDecimal> damagesRate,
    Per damagesPer,
    Cell<BigDecimal> damagesGrace,
    Cell<BigDecimal> damagesCap,
    Cell<BigDecimal> bonusRate,
    Per bonusPer,
    Cell<BigDecimal> bonusCap,
    Cell<BigDecimal> bonusCapUnits) {

  Place place(String column) {
    return new Place(SectionTable.FILE, line, column);
  }
}
