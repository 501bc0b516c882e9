package dayworth.casefile;

import dayworth.buildup.Labour;

/**
 * A row of labour.csv that could be read.
 *
 * @param activity index of a row of activities.csv
 */
record LabourRow(int line, int activity, Labour labour) {

  Place place(String column) {
    return new Place(LabourTable.FILE, line, column);
  }
}
