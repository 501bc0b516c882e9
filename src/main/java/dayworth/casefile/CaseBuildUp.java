package dayworth.casefile;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.Building;
import dayworth.buildup.Labour;
import dayworth.buildup.Way;
import dayworth.value.Money;
import dayworth.value.Quantity;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.LongStream;

/**
 * Makes the build-up of a case: what spells of other patterns make of its activities with labour.
 */
final class CaseBuildUp {

  private final LabourFiles files;
  private final Optional<Building> building;
  private final Findings findings;

  private CaseBuildUp(LabourFiles files, Optional<Building> building, Findings findings) {
    this.files = files;
    this.building = building;
    this.findings = findings;
  }

  static CaseBuildUp of(LabourFiles files, TermsTable terms, Findings findings) {
    Quantity unitsPerWeek = unitsPerWeek(terms);
    boolean can = !files.patterns().isEmpty() && unitsPerWeek.signum() > 0;
    return new CaseBuildUp(
        files,
        can ? Optional.of(new Building(unitsPerWeek, files.patterns())) : Optional.empty(),
        findings);
  }

  /** The working days of a week in time units; 0 where the terms that tell it are faulty. */
  private static Quantity unitsPerWeek(TermsTable terms) {
    Quantity days = Quantity.of(terms.workingDays().size());
    return switch (terms.unit()) {
      case WEEK -> Quantity.ONE;
      case DAY -> days;
      case HOUR, SHIFT -> days.times(Quantity.of(terms.amount("units_per_working_day")));
    };
  }

  /** The activities, each with a normal duration and cost where its labour tells them. */
  List<ActivityRow> filled(List<ActivityRow> activities) {
    return building
        .map(known -> NormalByLabour.fill(activities, files.rows(), known, findings))
        .orElse(activities);
  }

  /**
   * The build-up of all activities with labour that are not finished; of one in progress of what is
   * left.
   *
   * @param stated the activities as they stand in the file
   * @param filled the same with their normal durations and costs
   */
  BuildUp build(
      List<ActivityRow> stated,
      List<ActivityRow> filled,
      List<ProgressRow> progress,
      Quantity lossFactor) {
    if (building.isEmpty() || files.rows().isEmpty()) {
      return BuildUp.NONE;
    }
    Map<Integer, ProgressRow> progressOf = new HashMap<>();
    progress.forEach(row -> progressOf.put(row.activity(), row));
    List<ActivityBuildUp> built = new ArrayList<>();
    for (LabourRow row : files.rows()) {
      ActivityRow normal = filled.get(row.activity());
      Optional<ProgressRow> status = Optional.ofNullable(progressOf.get(row.activity()));
      Optional<BigDecimal> left =
          status
              .filter(given -> given.started().given())
              .map(
                  given ->
                      given.finished().given()
                          ? BigDecimal.ZERO
                          : given.remaining().value().orElseThrow());
      if (left.isEmpty()) {
        built.add(whole(row, stated.get(row.activity()), normal));
      } else if (left.get().signum() > 0) {
        built.add(rest(row, normal, left.get()));
      }
    }
    built.sort(Comparator.comparingInt(ActivityBuildUp::activity));
    return new BuildUp(lossFactor, files.patterns(), built);
  }

  private ActivityBuildUp whole(LabourRow row, ActivityRow stated, ActivityRow normal) {
    Money cost = Money.of(normal.normalCost().orElseThrow());
    Optional<Quantity> units = stated.normal().map(Quantity::of);
    Labour labour = row.labour();
    return checked(row, building.orElseThrow().whole(row.activity(), labour, units, cost));
  }

  private ActivityBuildUp rest(LabourRow row, ActivityRow normal, BigDecimal left) {
    Quantity remaining = Quantity.of(left);
    Quantity share = remaining.dividedBy(Quantity.of(normal.normal().orElseThrow()));
    Money cost = share.at(Money.of(normal.normalCost().orElseThrow()));
    Labour labour = row.labour().share(share);
    return checked(row, building.orElseThrow().rest(row.activity(), labour, remaining, cost));
  }

  private ActivityBuildUp checked(LabourRow row, ActivityBuildUp built) {
    files.patterns().stream()
        .skip(1)
        .filter(pattern -> pattern.weeksMax().isEmpty())
        .filter(pattern -> !endsWithin(built.ways(pattern)))
        .forEach(
            pattern ->
                findings.problem(
                    row.place("labour_hours")
                        .notice(
                            "takes more than " + BuildUp.MOST_WEEKS + " weeks",
                            pattern.name(),
                            "a weeks_max for it in " + PatternTable.FILE)));
    return built;
  }

  private static boolean endsWithin(List<Way> ways) {
    return ways.get(ways.size() - 1).spell().lastsToTheEnd();
  }

  /** The coarsest scale on which all its durations are whole. */
  static TimeScale scale(BuildUp buildUp) {
    return buildUp.activities().stream()
        .flatMapToLong(CaseBuildUp::durations)
        .mapToObj(duration -> TimeScale.of(BuildUp.SCALE.units(duration)))
        .reduce(TimeScale.WHOLE, TimeScale::and);
  }

  private static LongStream durations(ActivityBuildUp built) {
    return LongStream.concat(
        LongStream.of(built.normal()), built.ways().stream().mapToLong(Way::duration));
  }
}
