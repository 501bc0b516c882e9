package dayworth.casefile;

import java.math.BigDecimal;

/** A row of packages.csv that could be read. */
record PackageRow(int line, String name, BigDecimal cost) {

  Place place(String column) {
    return new Place(PackageTable.FILE, line, column);
  }
}
