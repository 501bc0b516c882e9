package dayworth.casefile;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.Way;
import dayworth.network.Measure;
import dayworth.network.MeasurePackage;
import dayworth.network.Measures;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.OptionalInt;
import java.util.Set;

/** Makes the measures of a network from the rows of measures.csv and from the build-up. */
final class CaseMeasures {

  private CaseMeasures() {}

  /**
   * Those of the rows in their order, then those that are built up, by activity, pattern and weeks;
   * what is dominated or buys no time is left out of these.
   *
   * @param scale at least as fine as every duration
   */
  static Measures of(
      List<MeasureRow> rows,
      PackageTable packages,
      BuildUp buildUp,
      TimeScale scale,
      Findings findings) {
    List<Measure> measures = new ArrayList<>();
    rows.forEach(row -> measures.add(measure(row, scale)));
    for (ActivityBuildUp built : buildUp.activities()) {
      built.measures().forEach(way -> measures.add(measure(built, way, scale)));
    }
    checkNames(rows, buildUp, findings);
    return new Measures(
        measures,
        packages.rows().stream()
            .map(row -> new MeasurePackage(row.name(), Money.of(row.cost())))
            .toList());
  }

  private static Measure measure(MeasureRow row, TimeScale scale) {
    return new Measure(
        row.activity(),
        row.measure(),
        scale.ticks(row.duration()),
        Money.of(row.cost()),
        row.inPackage(),
        row.ofRemaining(),
        row.note());
  }

  private static Measure measure(ActivityBuildUp built, Way way, TimeScale scale) {
    return new Measure(
        built.activity(),
        way.name(),
        scale.ticks(BuildUp.SCALE.units(way.duration())),
        way.cost(),
        OptionalInt.empty(),
        built.ofRemaining(),
        way.spell().pattern().note());
  }

  private static void checkNames(List<MeasureRow> rows, BuildUp buildUp, Findings findings) {
    Set<List<Object>> built = new HashSet<>();
    for (ActivityBuildUp activity : buildUp.activities()) {
      activity.ways().forEach(way -> built.add(List.of(activity.activity(), way.name())));
    }
    for (MeasureRow row : rows) {
      if (built.contains(List.of(row.activity(), row.measure()))) {
        String right = "another name, or no row for it in " + LabourTable.FILE;
        findings.problem(
            row.place("measure")
                .notice("its labour is built up to one of this name", row.measure(), right));
      }
    }
  }
}
