package dayworth.engine.proof;

import dayworth.engine.Flow;
import dayworth.engine.Flow.Over;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Relation;
import dayworth.value.Money;
import dayworth.value.SlopeScale;
import dayworth.value.TimeScale;
import java.util.List;
import java.util.function.Consumer;

/**
 * Small networks with two ends of one piece and its flow, worked by hand; the sums stand beside
 * them.
 *
 * @param from the plan and cost at the longer finish
 * @param to at the shorter finish
 */
record HandWorked(String name, Network network, Point from, Point to, Flow flow) {

  record Point(long finish, Plan plan, Money cost) {}

  /** A 4 to 2 at 30, then B 5 to 3 at 50. 300 + 30·4 + 20·2 + 50·5 = 710; 710 − 50·7 = 360. */
  static HandWorked series() {
    Network network =
        network(
            List.of(Link.finishToStart(0, 1)), one("A", 4, 100, 2, 160), one("B", 5, 200, 3, 300));
    return worked(
        "series",
        network,
        point(7, 360, 2, 5),
        point(5, 460, 2, 3),
        flow -> {
          flow.set(Over.FROM_PROJECT, 0, 50);
          flow.set(Over.SLOPE, 0, 30);
          flow.set(Over.CRASH, 0, 20);
          flow.set(Over.LINK, 0, 50);
          flow.set(Over.SLOPE, 1, 50);
          flow.set(Over.TO_PROJECT, 1, 50);
        });
  }

  /** A and B side by side: 300 + 30·4 + 50·4 = 620; 620 − 80·4 = 300 and − 80·3 = 380. */
  static HandWorked parallel() {
    Network network = network(List.of(), one("A", 4, 100, 2, 160), one("B", 4, 200, 3, 250));
    return worked(
        "parallel",
        network,
        point(4, 300, 4, 4),
        point(3, 380, 3, 3),
        flow -> {
          straight(flow, 0, 30);
          straight(flow, 1, 50);
        });
  }

  /**
   * P and U are shortened, R (10 a day) is given back: 30 + 35 − 10 = 55. 3400 + 30·6 + 25·9 + 10·5
   * + 20·9 + 35·5 = 4210; 4210 − 55·14 = 3440 and − 55·13 = 3495.
   */
  static HandWorked bridge() {
    List<Link> links =
        List.of(
            Link.finishToStart(0, 2),
            Link.finishToStart(0, 3),
            Link.finishToStart(1, 4),
            Link.finishToStart(2, 4));
    Network network =
        network(
            links,
            one("P", 6, 600, 3, 690),
            one("Q", 9, 900, 6, 1020),
            one("R", 5, 500, 2, 530),
            one("S", 9, 900, 6, 1050),
            one("U", 5, 500, 2, 605));
    return worked(
        "bridge",
        network,
        point(14, 3440, 5, 9, 4, 9, 5),
        point(13, 3495, 4, 9, 5, 9, 4),
        flow -> {
          set(flow, Over.SLOPE, 30, 25, 10, 20, 35);
          set(flow, Over.LINK, 10, 20, 25, 10);
          set(flow, Over.FROM_PROJECT, 30, 25, 0, 0, 0);
          set(flow, Over.TO_PROJECT, 0, 0, 0, 20, 35);
        });
  }

  /** Finish-to-finish and start-to-start: 2700 + 100·(10 + 2 − 8 + 1 + 9) − 100·T; T 14 and 10. */
  static HandWorked reverse() {
    List<Link> links = List.of(new Link(0, 1, Relation.FF, 2), new Link(1, 2, Relation.SS, 1));
    Network network =
        network(
            links,
            one("A", 10, 1000, 6, 1400),
            one("B", 8, 800, 3, 900),
            one("C", 9, 900, 7, 1200));
    return worked(
        "reverse",
        network,
        point(14, 2700, 10, 8, 9),
        point(10, 3100, 6, 8, 9),
        flow -> {
          set(flow, Over.FROM_PROJECT, 100, 0, 0);
          set(flow, Over.SLOPE, 100, 0, 100);
          set(flow, Over.LINK, 100, 100);
          set(flow, Over.BACK_OVER_NORMAL, 0, 100, 0);
          set(flow, Over.TO_PROJECT, 0, 0, 100);
        });
  }

  /** A, FS 1, B, SS 2, C, SF 6, D, FF 3, E: 100 + 30·(5 + 1 + 2 + 6 + 3) − 30·T; T 17 and 15. */
  static HandWorked allRelations() {
    List<Link> links =
        List.of(
            new Link(0, 1, Relation.FS, 1),
            new Link(1, 2, Relation.SS, 2),
            new Link(2, 3, Relation.SF, 6),
            new Link(3, 4, Relation.FF, 3));
    Network network =
        network(
            links,
            one("A", 5, 100, 3, 160),
            still("B", 1),
            still("C", 1),
            still("D", 1),
            still("E", 2));
    return worked(
        "all relations",
        network,
        point(17, 100, 5, 1, 1, 1, 2),
        point(15, 160, 3, 1, 1, 1, 2),
        flow -> {
          flow.set(Over.FROM_PROJECT, 0, 30);
          flow.set(Over.SLOPE, 0, 30);
          set(flow, Over.LINK, 30, 30, 30, 30);
          flow.set(Over.TO_PROJECT, 4, 30);
        });
  }

  /** Crashing B is cheaper but it is passed backwards: 50 + 10·(5 + 2 − 3 + 1 + 4) − 10·T; 9, 7. */
  static HandWorked crashCheaper() {
    List<Link> links = List.of(new Link(0, 1, Relation.FF, 2), new Link(1, 2, Relation.SS, 1));
    Network network = network(links, still("A", 5), one("B", 8, 100, 3, 50), still("C", 4));
    return worked(
        "crash cheaper",
        network,
        point(9, 50, 5, 3, 4),
        point(7, 70, 5, 5, 4),
        flow -> {
          flow.set(Over.FROM_PROJECT, 0, 10);
          set(flow, Over.CRASH, 10, 0, 10);
          set(flow, Over.LINK, 10, 10);
          flow.set(Over.BACK_OVER_CRASH, 1, 10);
          flow.set(Over.TO_PROJECT, 2, 10);
        });
  }

  static List<HandWorked> all() {
    return List.of(series(), parallel(), bridge(), reverse(), allRelations(), crashCheaper());
  }

  private static void straight(Flow flow, int activity, long amount) {
    flow.set(Over.FROM_PROJECT, activity, amount);
    flow.set(Over.SLOPE, activity, amount);
    flow.set(Over.TO_PROJECT, activity, amount);
  }

  private static void set(Flow flow, Over over, long... amounts) {
    for (int i = 0; i < amounts.length; i++) {
      flow.set(over, i, amounts[i]);
    }
  }

  private static HandWorked worked(
      String name, Network network, Point from, Point to, Consumer<Flow> amounts) {
    Flow flow = new Flow(new SlopeScale(1, true), network);
    amounts.accept(flow);
    return new HandWorked(name, network, from, to, flow);
  }

  private static Network network(List<Link> links, Activity... activities) {
    return new Network(TimeScale.WHOLE, List.of(activities), links);
  }

  private static Point point(long finish, long cost, long... durations) {
    return new Point(finish, Plan.of(durations), Money.of(cost));
  }

  private static Activity one(String id, long normal, long cost, long crash, long crashCost) {
    return Activity.compressible(id, normal, Money.of(cost), crash, Money.of(crashCost));
  }

  private static Activity still(String id, long duration) {
    return Activity.fixed(id, duration, Money.ZERO);
  }
}
