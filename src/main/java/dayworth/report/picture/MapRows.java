package dayworth.report.picture;

import dayworth.decision.CurveAnswer;
import dayworth.engine.Ways;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/**
 * The activities that are rows of the compression map, in file order: those that are shortened or
 * critical at some finish; where they are many, the ones of which most is bought.
 *
 * @param shown the rows
 * @param quiet how many are left out because they are never shortened nor critical
 * @param crowded how many are left out because there is no room
 */
record MapRows(List<MapRow> shown, int quiet, int crowded) {

  private static final int MOST = 40;

  MapRows {
    shown = List.copyOf(shown);
  }

  /** Whether some activity is done by a measure in some column. */
  boolean haveMeasures() {
    return shown.stream()
        .anyMatch(row -> IntStream.range(0, row.timings().size()).anyMatch(row::isByMeasure));
  }

  static MapRows of(CurveAnswer answer, List<Timing> timings) {
    Network network = answer.of().network();
    Plan shortest = Ways.of(network).shortest();
    List<MapRow> told = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      Activity activity = network.activity(i);
      MapRow row = new MapRow(i, activity, activity.normal() - shortest.duration(i), timings);
      if (row.isTold() && answer.of().isToGo(i)) {
        told.add(row);
      }
    }
    int quiet = answer.of().toGo() - told.size();
    int crowded = Math.max(0, told.size() - MOST);
    if (crowded > 0) {
      told.sort(
          Comparator.comparingLong(MapRow::mostBought)
              .thenComparingInt(MapRow::criticalColumns)
              .reversed()
              .thenComparingInt(MapRow::index));
      told = new ArrayList<>(told.subList(0, MOST));
      told.sort(Comparator.comparingInt(MapRow::index));
    }
    return new MapRows(told, quiet, crowded);
  }
}
