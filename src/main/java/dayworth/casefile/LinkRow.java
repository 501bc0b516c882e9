package dayworth.casefile;

import dayworth.network.Relation;
import java.math.BigDecimal;

/**
 * A link between two activities that exist, and where it stands.
 *
 * @param predecessor index of a row of activities.csv
 * @param successor likewise
 * @param lag in time units
 */
record LinkRow(Place place, int predecessor, int successor, Relation relation, BigDecimal lag) {}
