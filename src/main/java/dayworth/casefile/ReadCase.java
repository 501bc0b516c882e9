package dayworth.casefile;

import dayworth.decision.WorkToGo;
import dayworth.engine.Ways;
import dayworth.network.Network;
import dayworth.value.WorkingCalendar;
import java.util.List;
import java.util.Optional;

/**
 * A case without problems, with the places its parts come from.
 *
 * @param work what is to go
 * @param activities those of the network, in its order
 * @param links those of the network, in its order
 * @param logic all links, also those of what has happened
 * @param progress the rows of the status
 * @param sections the rows of sections.csv
 * @param calendar empty where there is no start_date
 */
record ReadCase(
    WorkToGo work,
    List<ActivityRow> activities,
    List<LinkRow> links,
    List<LinkRow> logic,
    List<ProgressRow> progress,
    List<SectionRow> sections,
    TermsTable terms,
    Optional<WorkingCalendar> calendar) {

  private static final int MOST_NAMED = 6;

  /** Of the work to go. */
  Network network() {
    return work.network();
  }

  /** The same where each activity takes any duration that its ways bound. */
  Network reachable() {
    return Ways.reachable(network());
  }

  Place place(int activity, String column) {
    return new Place(ActivityTable.FILE, activities.get(activity).line(), column);
  }

  /** The ids of a chain; of a long one only where it begins and ends. */
  String named(List<Integer> chain) {
    List<String> ids = chain.stream().map(i -> activities.get(i).id()).toList();
    int size = ids.size();
    return size <= MOST_NAMED
        ? String.join(", ", ids)
        : String.join(", ", ids.subList(0, 2))
            + ", and "
            + (size - MOST_NAMED + 2)
            + " more to "
            + String.join(", ", ids.subList(size - 2, size));
  }
}
