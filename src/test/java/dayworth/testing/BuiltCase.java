package dayworth.testing;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.Building;
import dayworth.buildup.Labour;
import dayworth.buildup.Pattern;
import dayworth.contract.MomentMoney;
import dayworth.contract.Terms;
import dayworth.decision.BuildUpAnswer;
import dayworth.decision.Case;
import dayworth.decision.TimeUnit;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;

/** Answers of the build-up without a case on disk. */
public final class BuiltCase {

  private BuiltCase() {}

  /** Activities of these labours, named by their numbers, in days of a five-day week. */
  public static BuildUpAnswer of(List<Pattern> patterns, Labour... labours) {
    return of("built", "Work ", patterns, labours);
  }

  /**
   * The same.
   *
   * @param title of the case
   * @param name before the number of each activity, which is its name and its id
   */
  public static BuildUpAnswer of(
      String title, String name, List<Pattern> patterns, Labour... labours) {
    Building building = new Building(Quantity.of(5), patterns);
    List<Activity> activities = new ArrayList<>();
    List<ActivityBuildUp> built = new ArrayList<>();
    for (int i = 0; i < labours.length; i++) {
      Money cost = building.normalCost(labours[i]);
      built.add(building.whole(i, labours[i], Optional.empty(), cost));
      long normal = built.get(i).normal();
      activities.add(new Activity(name + i, name + i, "", normal, normal, cost, cost, 0));
    }
    Case of =
        new Case(
            "built",
            title,
            "EUR",
            TimeUnit.DAY,
            new Network(BuildUp.SCALE, activities, List.of()),
            Terms.none(BuildUp.SCALE),
            MomentMoney.none(BuildUp.SCALE),
            Optional.empty(),
            new BuildUp(Quantity.ONE, patterns, built),
            List.of(),
            List.of());
    return new BuildUpAnswer(of, OptionalInt.empty());
  }
}
