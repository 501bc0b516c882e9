package dayworth.casefile;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.Way;
import dayworth.network.Measure;
import dayworth.value.TimeScale;
import java.util.List;
import java.util.OptionalInt;

/** The measures that a build-up offers, as a network has them. */
final class BuiltMeasures {

  private BuiltMeasures() {}

  /**
   * By activity, pattern and weeks; what is dominated or buys no time is left out.
   *
   * @param scale at least as fine as every duration of the build-up
   */
  static List<Measure> of(BuildUp buildUp, TimeScale scale) {
    return buildUp.activities().stream()
        .flatMap(built -> built.measures().map(way -> measure(built, way, scale)))
        .toList();
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
}
