package dayworth.report;

import dayworth.network.Network;
import dayworth.network.Plan;

/** What measures are called in tables. */
final class MeasureNames {

  private MeasureNames() {}

  /** The name of a measure by its index; blank for none. */
  static String of(Network network, int measure) {
    return measure == Plan.NO_MEASURE ? CsvText.BLANK : network.measures().get(measure).name();
  }
}
