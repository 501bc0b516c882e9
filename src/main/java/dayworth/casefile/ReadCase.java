package dayworth.casefile;

import dayworth.network.Network;
import java.util.List;

/**
 * A case without problems, with the places its parts come from.
 *
 * @param activities those of the network, in its order
 * @param links likewise
 */
record ReadCase(
    Network network, List<ActivityRow> activities, List<LinkRow> links, TermsTable terms) {

  Place place(int activity, String column) {
    return new Place(ActivityTable.FILE, activities.get(activity).line(), column);
  }
}
