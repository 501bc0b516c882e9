package dayworth.engine;

import dayworth.value.Money;

/**
 * One way to do an activity: the normal way, crashed, or by a measure.
 *
 * @param duration ticks
 * @param cost of the whole activity, without what packages cost
 * @param measure index of the measure in the network, or {@link dayworth.network.Plan#NO_MEASURE}
 * @param inPackage index of the package that is paid for with it, or {@link #NO_PACKAGE}
 */
public record Way(long duration, Money cost, int measure, int inPackage) {

  public static final int NO_PACKAGE = -1;
}
