package dayworth.casefile;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Finds activities by the ids that other files name them by. */
final class ActivityIds {

  private final Map<String, Integer> indexById = new HashMap<>();

  /** Otherwise no id can be told right from wrong. */
  private final boolean areKnown;

  private final Nearest nearest;
  private final Findings findings;

  /**
   * The ids of a case.
   *
   * @param known the activities; empty where their ids could not be read
   */
  ActivityIds(Optional<List<ActivityRow>> known, Findings findings) {
    List<ActivityRow> activities = known.orElse(List.of());
    areKnown = known.isPresent();
    for (int i = 0; i < activities.size(); i++) {
      indexById.putIfAbsent(activities.get(i).id(), i);
    }
    nearest = new Nearest(activities.stream().map(ActivityRow::id).toList());
    this.findings = findings;
  }

  /** The activity's index; an unknown id is reported. */
  Optional<Integer> index(Place place, String id) {
    Optional<Integer> index = Optional.ofNullable(indexById.get(id));
    if (index.isEmpty() && areKnown) {
      String right = nearest.hint(id, "an id of " + ActivityTable.FILE);
      findings.problem(place.notice(id + " is no activity", id, right));
    }
    return index;
  }

  /** The index of the activity that a cell names; empty if it names none, which is reported. */
  Optional<Integer> index(Table table, Row row, String column) {
    return table
        .needed(row, column, (text, style) -> text, findings)
        .value()
        .flatMap(id -> index(table.place(row, column), id));
  }
}
