package dayworth.report.picture;

import dayworth.network.Activity;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.util.List;

/**
 * What happens to one activity from the longest finish to the shortest.
 *
 * @param index in the network
 * @param activity itself
 * @param most ticks that it can be shorter than normal, along its line or by a measure
 * @param timings the plans of the columns
 */
record MapRow(int index, Activity activity, long most, List<Timing> timings) {

  /** Ticks that the activity is shorter than normal. */
  long bought(int column) {
    return activity.normal() - timings.get(column).plan().duration(index);
  }

  /** Whether it is done by a measure. */
  boolean isByMeasure(int column) {
    return timings.get(column).plan().measure(index) != Plan.NO_MEASURE;
  }

  boolean isCritical(int column) {
    return timings.get(column).isCritical(index);
  }

  boolean isAtShortest(int column) {
    return most > 0 && bought(column) == most;
  }

  /** Whether less is bought than at the next longer finish. */
  boolean isRelaxed(int column) {
    return column > 0 && bought(column) < bought(column - 1);
  }

  boolean changes(int column) {
    return column == 0 ? bought(0) > 0 : bought(column) != bought(column - 1);
  }

  long mostBought() {
    long most = 0;
    for (int column = 0; column < timings.size(); column++) {
      most = Math.max(most, bought(column));
    }
    return most;
  }

  int criticalColumns() {
    int count = 0;
    for (int column = 0; column < timings.size(); column++) {
      count += isCritical(column) ? 1 : 0;
    }
    return count;
  }

  /** Whether anything can be seen of it besides float. */
  boolean isTold() {
    return mostBought() > 0 || criticalColumns() > 0 || isEverByMeasure();
  }

  private boolean isEverByMeasure() {
    for (int column = 0; column < timings.size(); column++) {
      if (isByMeasure(column)) {
        return true;
      }
    }
    return false;
  }

  /** 0 for hardly compressed to {@code tones} - 1 for as far as it will go. */
  int tone(int column, int tones) {
    double share = bought(column) / (double) most;
    return Math.max(0, (int) Math.ceil(share * tones) - 1);
  }
}
