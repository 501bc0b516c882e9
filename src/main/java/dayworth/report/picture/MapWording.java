package dayworth.report.picture;

import dayworth.decision.CurveAnswer;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Timing;
import dayworth.value.TimeScale;
import java.util.ArrayList;
import java.util.List;

/** What the compression map says in words. */
final class MapWording {

  private final CurveAnswer answer;
  private final Words words;
  private final MapColumns columns;
  private final List<Timing> timings;
  private final MapRows rows;

  MapWording(
      CurveAnswer answer, Words words, MapColumns columns, List<Timing> timings, MapRows rows) {
    this.answer = answer;
    this.words = words;
    this.columns = columns;
    this.timings = timings;
    this.rows = rows;
  }

  String title() {
    Network network = answer.of().network();
    Timing least = timings.get(columns.finishes().indexOf(answer.leastTotal().duration()));
    int shortened = 0;
    for (int i = 0; i < network.size(); i++) {
      shortened += least.plan().duration(i) < network.activity(i).normal() ? 1 : 0;
    }
    return "At "
        + words.time(least.finish())
        + " "
        + Words.count(shortened, "of", "of")
        + " "
        + Words.count(answer.of().toGo(), "activity", "activities")
        + (shortened == 1 ? " is" : " are")
        + " shortened and "
        + Words.count(answer.of().criticalCount(least), "is", "are")
        + " critical";
  }

  String note() {
    List<String> said = new ArrayList<>(List.of(words.project() + "."));
    String many = words.units();
    String first = many.substring(0, 1).toUpperCase(java.util.Locale.ROOT) + many.substring(1);
    said.add(first + " bought from each activity, for every finish.");
    if (!columns.areWholeUnits()) {
      said.add(
          columns.areAll()
              ? "Each column is a finish where the price changes."
              : "Columns are finishes where the price changes, those too close together left out.");
    }
    if (rows.quiet() > 0) {
      said.add(
          Words.count(rows.quiet(), "activity is", "activities are")
              + " never shortened nor critical, and left out.");
    }
    if (rows.crowded() > 0) {
      said.add(
          Words.count(rows.crowded(), "activity", "activities")
              + " of which less is bought are left out for want of room: see steps.csv.");
    }
    return String.join(" ", said) + words.amountsIn();
  }

  String description() {
    List<String> said = new ArrayList<>();
    for (MapRow row : rows.shown()) {
      List<String> bought = new ArrayList<>();
      for (int column = 0; column < columns.count(); column++) {
        if (row.changes(column)) {
          bought.add(
              words.figure(row.bought(column))
                  + " at "
                  + words.figure(columns.finishes().get(column)));
        }
      }
      if (!bought.isEmpty()) {
        said.add(name(row.activity()) + ": " + String.join(", ", bought) + ".");
      }
    }
    return "Rows are activities, columns are finishes, the longest on the left. How many "
        + words.units()
        + " are bought, where that changes. "
        + String.join(" ", said);
  }

  /** What a unit of it costs and how much there is to buy. */
  String price(MapRow row) {
    Activity activity = row.activity();
    TimeScale scale = answer.of().network().scale();
    int measures = answer.of().network().measures().of(row.index()).length;
    if (measures > 0) {
      return Words.count(measures, "measure", "measures")
          + (row.most() > 0 ? ", up to " + words.figure(row.most()) : "");
    }
    if (!activity.isCompressible()) {
      return "cannot be shortened";
    }
    if (!activity.divisible()) {
      return words.amount(activity.crashExtra().cents())
          + " for all "
          + words.figure(activity.mostShortening());
    }
    return words.amount(activity.slope().times(scale.ticksPerUnit()).cents())
        + ", up to "
        + words.figure(activity.mostShortening());
  }

  static String name(Activity activity) {
    String name = Words.safe(activity.name());
    return Words.safe(activity.id()) + (name.isEmpty() ? "" : " " + name);
  }
}
