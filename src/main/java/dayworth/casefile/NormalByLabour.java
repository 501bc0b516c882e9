package dayworth.casefile;

import dayworth.buildup.BuildUp;
import dayworth.buildup.Building;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;

/**
 * What activities take the normal way where their labour tells it. What is stated is kept; if it
 * differs from the labour by more than a twentieth it is doubtful.
 */
final class NormalByLabour {

  private static final BigDecimal PERCENT = BigDecimal.valueOf(100);
  private static final int MOST_PERCENT = 5;

  private final Building building;
  private final Findings findings;

  private NormalByLabour(Building building, Findings findings) {
    this.building = building;
    this.findings = findings;
  }

  /** The activities, each with a normal duration and cost where its labour tells them. */
  static List<ActivityRow> fill(
      List<ActivityRow> activities, List<LabourRow> labour, Building building, Findings findings) {
    NormalByLabour normals = new NormalByLabour(building, findings);
    List<ActivityRow> filled = new ArrayList<>(activities);
    labour.forEach(
        row -> filled.set(row.activity(), normals.filled(activities.get(row.activity()), row)));
    return filled;
  }

  private ActivityRow filled(ActivityRow stated, LabourRow row) {
    Quantity units = building.normalUnits(row.labour());
    Money cost = building.normalCost(row.labour());
    if (units.compareTo(Quantity.of(TimeCell.MOST)) > 0) {
      String right =
          "fewer labour_hours or a bigger crew: at most " + TimeCell.MOST + " time units";
      findings.problem(row.place("labour_hours").notice("takes too long", "", right));
      return stated;
    }
    stated
        .normal()
        .ifPresent(
            given ->
                compare(stated, "normal_duration", given, units.rounded(3, RoundingMode.CEILING)));
    stated.normalCost().ifPresent(given -> compare(stated, "normal_cost", given, cost.cents()));
    ActivityRow filled =
        stated.withNormal(
            stated.normal().orElseGet(() -> BuildUp.SCALE.units(Building.roundedUp(units))),
            stated
                .normalCost()
                .orElseGet(() -> cost.rounded(MoneyCell.MOST_DECIMALS, RoundingMode.HALF_UP)));
    checkCrash(stated, filled);
    return filled;
  }

  private void compare(ActivityRow row, String column, BigDecimal stated, BigDecimal sum) {
    if (column.equals("normal_duration") && stated.signum() == 0) {
      String right = "more than 0 or blank, or no row in " + LabourTable.FILE;
      findings.problem(place(row, column).notice("a milestone takes no labour", "0", right));
      return;
    }
    BigDecimal most = sum.multiply(BigDecimal.valueOf(MOST_PERCENT));
    BigDecimal difference = stated.subtract(sum).abs();
    if (difference.multiply(PERCENT).compareTo(most) > 0) {
      String wrong = "differs from its labour by more than " + MOST_PERCENT + " %";
      String right = "the labour comes to " + sum.toPlainString() + "; what is stated is kept";
      findings.warning(place(row, column).notice(wrong, stated.toPlainString(), right));
    }
  }

  /** Of what is stated it is checked when it is read. */
  private void checkCrash(ActivityRow stated, ActivityRow row) {
    BigDecimal normal = row.normal().orElseThrow();
    String given = normal.toPlainString() + ", the normal duration by its labour";
    int longer = row.crash().map(crash -> crash.compareTo(normal)).orElse(-1);
    if (longer > 0 && stated.normal().isEmpty()) {
      findings.problem(
          place(row, "crash_duration")
              .notice(
                  "longer than the normal duration",
                  row.crash().orElseThrow().toPlainString(),
                  "at most " + given));
    } else if (longer == 0
        && (stated.normal().isEmpty() || stated.normalCost().isEmpty())
        && row.crashCost()
            .filter(cost -> cost.compareTo(row.normalCost().orElseThrow()) != 0)
            .isPresent()) {
      findings.problem(
          place(row, "crash_cost")
              .notice(
                  "another cost for the same duration",
                  row.crashCost().orElseThrow().toPlainString(),
                  Money.of(row.normalCost().orElseThrow()).cents() + " by its labour"));
    }
  }

  private static Place place(ActivityRow row, String column) {
    return new Place(ActivityTable.FILE, row.line(), column);
  }
}
