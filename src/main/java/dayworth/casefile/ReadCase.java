package dayworth.casefile;

import dayworth.network.Network;
import dayworth.value.WorkingCalendar;
import java.util.List;
import java.util.Optional;

/**
 * A case without problems, with the places its parts come from.
 *
 * @param activities those of the network, in its order
 * @param links likewise
 * @param calendar empty where there is no start_date
 */
record ReadCase(
    Network network,
    List<ActivityRow> activities,
    List<LinkRow> links,
    TermsTable terms,
    Optional<WorkingCalendar> calendar) {

  private static final int MOST_NAMED = 6;

  Place place(int activity, String column) {
    return new Place(ActivityTable.FILE, activities.get(activity).line(), column);
  }

  /** The ids of a chain; of a long one only where it begins and ends. */
  String named(List<Integer> chain) {
    List<String> ids = chain.stream().map(i -> network.activity(i).id()).toList();
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
