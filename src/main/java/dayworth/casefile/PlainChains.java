package dayworth.casefile;

import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Relation;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;

/**
 * The longest chains of two or more finish-to-start links without negative lags, from one activity
 * at a time; activities between take their crash durations, which no plan goes below.
 *
 * <p>They are laid in topological order, no further than the source's last successor. From all
 * activities: O(activities x (activities + links)) at worst, far less where links are short.
 */
final class PlainChains {

  private static final long UNREACHED = -1;

  private final Network network;
  private final int[] positionOf;

  /** The longest lag of the source's own links to this activity, in ticks. */
  private final long[] directLag;

  /** The longest chain from the source's finish to this activity's start, in ticks. */
  private final long[] length;

  /** The activity before this one on that chain. */
  private final int[] before;

  private int source;
  private int last;
  private List<Integer> direct = List.of();

  PlainChains(Network network) {
    this.network = network;
    positionOf = new int[network.size()];
    for (int position = 0; position < positionOf.length; position++) {
      positionOf[network.inOrder(position)] = position;
    }
    directLag = new long[network.size()];
    length = new long[network.size()];
    before = new int[network.size()];
    Arrays.fill(directLag, UNREACHED);
    Arrays.fill(length, UNREACHED);
  }

  /** Lays the chains from an activity; false if it has too few links to be worth it. */
  boolean layFrom(int activity) {
    clear();
    source = activity;
    last = positionOf[activity];
    direct = plainLinksOutOf(activity);
    if (direct.size() < 2) {
      return false;
    }
    for (int index : direct) {
      Link link = network.link(index);
      last = Math.max(last, positionOf[link.successor()]);
      directLag[link.successor()] = Math.max(directLag[link.successor()], link.lag());
    }
    for (int position = positionOf[source] + 1; position < last; position++) {
      extend(network.inOrder(position));
    }
    return true;
  }

  /** The indices of the plain links out of the source. */
  List<Integer> linksOutOfSource() {
    return direct;
  }

  long longestDirectLag(int successor) {
    return directLag[successor];
  }

  /** How long after the source's finish a chain lets this activity start; negative if none does. */
  long reach(int activity) {
    return length[activity];
  }

  /** The activities of that chain, both ends included. */
  List<Integer> to(int activity) {
    List<Integer> chain = new ArrayList<>(List.of(activity));
    int here = activity;
    do {
      here = before[here];
      chain.add(here);
    } while (length[here] > directLag[here]);
    chain.add(source);
    Collections.reverse(chain);
    return chain;
  }

  private void clear() {
    for (int position = positionOf[source]; position <= last; position++) {
      directLag[network.inOrder(position)] = UNREACHED;
      length[network.inOrder(position)] = UNREACHED;
    }
  }

  private void extend(int activity) {
    long reached = Math.max(length[activity], directLag[activity]);
    if (reached == UNREACHED) {
      return;
    }
    long finish = reached + network.activity(activity).crash();
    for (int k = 0; k < network.linksOutOf(activity); k++) {
      Link link = network.link(network.linkOutOf(activity, k));
      int successor = link.successor();
      if (isPlain(link)
          && positionOf[successor] <= last
          && finish + link.lag() > length[successor]) {
        length[successor] = finish + link.lag();
        before[successor] = activity;
      }
    }
  }

  private List<Integer> plainLinksOutOf(int activity) {
    List<Integer> plain = new ArrayList<>();
    for (int k = 0; k < network.linksOutOf(activity); k++) {
      int link = network.linkOutOf(activity, k);
      if (isPlain(network.link(link))) {
        plain.add(link);
      }
    }
    return plain;
  }

  private static boolean isPlain(Link link) {
    return link.relation() == Relation.FS && link.lag() >= 0;
  }
}
