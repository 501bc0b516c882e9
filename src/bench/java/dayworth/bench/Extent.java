package dayworth.bench;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;

/**
 * How far a network's curve can reach, by passes alone, without the engine.
 *
 * @param longest earliest finish with every activity normal, ticks
 * @param shortest the longest chain with crash durations forwards and normal durations backwards:
 *     no plan is shorter
 * @param canBecomeCritical how many activities lie on a chain at least {@code shortest} long, all
 *     durations normal; the others never matter to the curve
 */
record Extent(long longest, long shortest, int canBecomeCritical) {

  static Extent of(Network network) {
    Timing normal = Timing.earliest(network, Plan.allNormal(network));
    long shortest = shortest(network);
    int count = 0;
    for (int i = 0; i < network.size(); i++) {
      if (normal.finish() - normal.totalFloat(i) >= shortest) {
        count++;
      }
    }
    return new Extent(normal.finish(), shortest, count);
  }

  /** The finish halfway between the longest and the shortest, ticks. */
  long halfway() {
    return (longest + shortest) / 2;
  }

  private static long shortest(Network network) {
    long[] start = new long[network.size()];
    long[] finish = new long[network.size()];
    long latest = 0;
    for (int position = 0; position < network.size(); position++) {
      int i = network.inOrder(position);
      Activity activity = network.activity(i);
      start[i] = activity.notBefore();
      finish[i] = activity.notFinishedBefore();
      for (int k = 0; k < network.linksInto(i); k++) {
        Link link = network.link(network.linkInto(i, k));
        int before = link.predecessor();
        long bound = link.lag() + (link.relation().fromStart() ? start[before] : finish[before]);
        if (link.relation().toStart()) {
          start[i] = Math.max(start[i], bound);
        } else {
          finish[i] = Math.max(finish[i], bound);
        }
      }
      finish[i] = Math.max(finish[i], start[i] + activity.crash());
      start[i] = Math.max(start[i], finish[i] - activity.normal());
      latest = Math.max(latest, finish[i]);
    }
    return latest;
  }
}
