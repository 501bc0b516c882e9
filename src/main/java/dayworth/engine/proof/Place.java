package dayworth.engine.proof;

import dayworth.network.Link;
import dayworth.network.Network;

/** Names for what a check can point at. */
final class Place {

  /** The project as a whole: its start, its finish or its cost. */
  static final String PROJECT = "project";

  private Place() {}

  static String activity(Network network, int activity) {
    return "activity " + network.activity(activity).id();
  }

  static String span(Network network, int index) {
    return "span " + network.spans().get(index).name();
  }

  static String link(Network network, int index) {
    Link link = network.link(index);
    return "link "
        + network.activity(link.predecessor()).id()
        + " to "
        + network.activity(link.successor()).id()
        + " "
        + link.relation();
  }
}
