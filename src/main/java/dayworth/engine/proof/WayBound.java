package dayworth.engine.proof;

import dayworth.engine.Flow;
import dayworth.engine.Flow.Over;
import dayworth.engine.Way;
import dayworth.engine.Ways;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.network.Span;
import dayworth.value.Money;
import dayworth.value.SlopeScale;
import java.math.BigInteger;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/**
 * What a flow proves where activities are done in one of several ways.
 *
 * <p><b>Why.</b> Let x ≥ 0 run over links, over earliest times and to the project's finish, and
 * back over spans with at most their rate, and let λ of each activity be what it takes in at its
 * start and gives out at its finish. For any plan that finishes within T, with d = f − s, each
 * constraint "event v at least w after event u" gives x(w − (t_v − t_u)) ≤ 0, each span x(w − (t_v
 * − t_u)) ≤ what it costs. Added up, with the flow conserved at every event, the plan costs at
 * least Σ (its ways' cost + λ·d) + Σ w·x − v·T; and that is least when each activity takes the way
 * for which cost + λ·d is least (Lagrangian relaxation; Geoffrion 1974, "Lagrangean relaxation for
 * integer programming"). Between the two ends of a line it is least at an end. Nothing is asked of
 * the hull, the stepping or the durations that led to the flow: any flow proves something.
 *
 * <p>A package that is paid for costs what it costs; one that may be used or not costs each
 * activity that uses it an equal share, in sum no more than it costs. Amounts are whole in a slope
 * scale, rounded down.
 */
public final class WayBound {

  private final Network network;
  private final Ways ways;
  private final SlopeScale scale;

  /** What each way costs, its share of a package included, scaled and rounded down. */
  private final long[] cost;

  private final long[] most;
  private final BigInteger paid;

  /**
   * Prepares for many flows.
   *
   * @param network with all spans that are paid
   * @param open whether a plan may use a way, by its number; others are never counted
   * @param isPaid whether a package is paid for, by its index
   */
  public WayBound(Network network, Ways ways, boolean[] open, boolean[] isPaid, SlopeScale scale) {
    this.network = network;
    this.ways = ways;
    this.scale = scale;
    this.cost = costs(open, isPaid);
    this.most = network.spans().stream().mapToLong(span -> scale.scaled(span.rate())).toArray();
    this.paid =
        IntStream.range(0, isPaid.length)
            .filter(index -> isPaid[index])
            .mapToObj(index -> floor(network.measures().packages().get(index).cost()))
            .reduce(BigInteger.ZERO, BigInteger::add);
  }

  private long[] costs(boolean[] open, boolean[] isPaid) {
    List<Set<Integer>> users =
        Stream.generate(HashSet<Integer>::new)
            .limit(isPaid.length)
            .map(set -> (Set<Integer>) set)
            .toList();
    for (int i = 0; i < network.size(); i++) {
      for (int way = ways.first(i); way < ways.first(i) + ways.count(i); way++) {
        if (open[way] && ways.get(way).inPackage() != Way.NO_PACKAGE) {
          users.get(ways.get(way).inPackage()).add(i);
        }
      }
    }
    long[] costs = new long[ways.count()];
    for (int way = 0; way < costs.length; way++) {
      Money money = ways.get(way).cost();
      int index = ways.get(way).inPackage();
      if (open[way] && index != Way.NO_PACKAGE && !isPaid[index]) {
        Money whole = network.measures().packages().get(index).cost();
        money = money.plus(whole.dividedBy(users.get(index).size()));
      }
      costs[way] = floor(money).longValueExact();
    }
    return costs;
  }

  private BigInteger floor(Money money) {
    BigInteger scaled = money.numerator().multiply(BigInteger.valueOf(scale.perUnit()));
    BigInteger[] parts = scaled.divideAndRemainder(money.denominator());
    return parts[1].signum() < 0 ? parts[0].subtract(BigInteger.ONE) : parts[0];
  }

  /**
   * Counts a flow.
   *
   * @throws IllegalStateException if it is not conserved, negative, or over a limit
   */
  public Proven of(Flow flow) {
    return new Proven(flow);
  }

  /** What one flow proves, for every finish and every choice of ways. */
  public final class Proven {

    private final long[] atStart = new long[network.size()];
    private final long[] atFinish = new long[network.size()];
    private final WideSum lengths = new WideSum();
    private long leaving;
    private long reaching;

    private Proven(Flow flow) {
      if (!flow.scale().equals(scale)) {
        throw new IllegalStateException("another scale");
      }
      for (int j = 0; j < network.links().size(); j++) {
        Link link = network.link(j);
        long amount = amount(flow, Over.LINK, j, Long.MAX_VALUE);
        lengths.addProduct(link.lag(), amount);
        add(link.relation().fromStart() ? atStart : atFinish, link.predecessor(), -amount);
        add(link.relation().toStart() ? atStart : atFinish, link.successor(), amount);
      }
      for (int j = 0; j < network.spans().size(); j++) {
        Span span = network.spans().get(j);
        long amount = amount(flow, Over.SPAN, j, most[j]);
        lengths.addProduct(-span.free(), amount);
        addAt(span.to(), -amount);
        addAt(span.from(), amount);
      }
      for (int i = 0; i < network.size(); i++) {
        addEnds(flow, i);
      }
      requireBalance();
    }

    private void addEnds(Flow flow, int i) {
      long toStart = amount(flow, Over.FROM_PROJECT, i, Long.MAX_VALUE);
      lengths.addProduct(network.activity(i).notBefore(), toStart);
      add(atStart, i, toStart);
      long toFinish = amount(flow, Over.FROM_PROJECT_TO_FINISH, i, Long.MAX_VALUE);
      lengths.addProduct(network.activity(i).notFinishedBefore(), toFinish);
      add(atFinish, i, toFinish);
      leaving = Math.addExact(leaving, Math.addExact(toStart, toFinish));
      long out = amount(flow, Over.TO_PROJECT, i, Long.MAX_VALUE);
      add(atFinish, i, -out);
      reaching = Math.addExact(reaching, out);
    }

    private long amount(Flow flow, Over over, int index, long limit) {
      long amount = flow.get(over, index);
      if (amount < 0 || amount > limit) {
        throw new IllegalStateException(over + " " + index + " carries " + amount);
      }
      return amount;
    }

    private void add(long[] event, int i, long amount) {
      event[i] = Math.addExact(event[i], amount);
    }

    private void addAt(Moment moment, long amount) {
      if (moment.isProjectStart()) {
        leaving = Math.addExact(leaving, -amount);
      } else {
        add(moment.isFinish() ? atFinish : atStart, moment.activity(), amount);
      }
    }

    /**
     * What comes into a start leaves the finish, and what leaves the project reaches its finish.
     */
    private void requireBalance() {
      for (int i = 0; i < network.size(); i++) {
        if (Math.addExact(atStart[i], atFinish[i]) != 0) {
          throw new IllegalStateException("not conserved at " + network.activity(i).id());
        }
      }
      if (leaving != reaching) {
        throw new IllegalStateException(leaving + " leaves and " + reaching + " arrives");
      }
    }

    /**
     * What every plan costs at least that finishes within {@code finish} and uses allowed ways
     * only, in scaled units.
     *
     * @param allowed by the number of a way; for each activity at least one
     */
    public BigInteger atLeast(long finish, boolean[] allowed) {
      WideSum sum = new WideSum();
      for (int i = 0; i < network.size(); i++) {
        int way = best(i, allowed);
        sum.addProduct(1, cost[way]);
        sum.addProduct(atStart[i], ways.get(way).duration());
      }
      sum.addProduct(-reaching, finish);
      return sum.total().add(lengths.total()).add(paid);
    }

    /** What an activity takes in at its start and gives out at its finish, per tick, scaled. */
    public long through(int activity) {
      return atStart[activity];
    }

    /** The allowed way of an activity for which cost and flow × duration are least. */
    public int best(int i, boolean[] allowed) {
      int best = -1;
      for (int way = ways.first(i); way < ways.first(i) + ways.count(i); way++) {
        if (allowed[way] && (best < 0 || excess(i, way, best) < 0)) {
          best = way;
        }
      }
      return best;
    }

    /**
     * By how much one way adds more to the bound than another, scaled; cut to what a long holds.
     */
    public long excess(int i, int way, int other) {
      long ticks = ways.get(way).duration() - ways.get(other).duration();
      long dearer = cost[way] - cost[other];
      long priced = atStart[i] * ticks;
      if (Math.multiplyHigh(atStart[i], ticks) != priced >> (Long.SIZE - 1)) {
        return (atStart[i] < 0) == (ticks < 0) ? Long.MAX_VALUE : Long.MIN_VALUE;
      }
      long sum = dearer + priced;
      boolean overflows = ((dearer ^ sum) & (priced ^ sum)) < 0;
      return overflows ? (priced < 0 ? Long.MIN_VALUE : Long.MAX_VALUE) : sum;
    }
  }
}
