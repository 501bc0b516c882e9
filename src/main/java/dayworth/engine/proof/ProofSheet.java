package dayworth.engine.proof;

import dayworth.engine.Flow;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The proof of one plan, arc by arc, in decimals that a spreadsheet adds up: what the plan pays on
 * each arc, and what the flow on it bounds. The two totals are equal, so no plan that finishes as
 * early costs less (see {@link ProofChecker} for why).
 *
 * <p>Flows are written exactly where they have at most {@value #FEWEST_DECIMALS} decimals.
 * Otherwise they are cut to decimals cycle by cycle ({@link DecimalFlow}), so that as much runs
 * into every event as out of it in the written digits too; what that loses is less than half a cent
 * and stands in a last row of its own.
 *
 * @param rows fixed money first, then activities, links, spans, and the price of time
 */
public record ProofSheet(List<Row> rows) {

  private static final int FEWEST_DECIMALS = 6;
  private static final int MOST_DECIMALS = 24;

  /** What rounding may come to in all. */
  private static final BigDecimal HALF_A_CENT = new BigDecimal("0.005");

  public ProofSheet {
    rows = List.copyOf(rows);
  }

  /**
   * A line of the sheet; money in currency units, time in time units.
   *
   * @param arc where it runs; empty for money that hangs on no arc
   * @param activity index of the activity whose money it is; -1 for none
   * @param name of what else the money is for; empty for an activity or an arc
   * @param length time units
   * @param flow money per time unit
   * @param capacity the most that may flow; empty where there is no limit
   * @param planCost what the plan pays
   * @param bound length × flow, or the fixed money itself
   */
  public record Row(
      Kind kind,
      Optional<Arc> arc,
      int activity,
      String name,
      Optional<BigDecimal> length,
      Optional<BigDecimal> flow,
      Optional<BigDecimal> capacity,
      Optional<BigDecimal> planCost,
      Optional<BigDecimal> bound) {}

  /** What a row is about. */
  public enum Kind {
    /** What an activity costs the cheapest way it can be done. */
    FIXED,
    /** Other money of the plan: sections and running costs. */
    OTHER,
    /** An arc of the network. */
    ARC,
    /** What is lost by writing decimals. */
    ROUNDING
  }

  /**
   * The sheet of a plan that a flow proves.
   *
   * @param finish ticks within which the plan finishes
   * @throws IllegalArgumentException if the two do not prove each other
   */
  public static ProofSheet of(Network network, Plan plan, long finish, Flow flow) {
    return of(network, plan, finish, flow, Money.ZERO);
  }

  /**
   * The same with money that every plan pays alike.
   *
   * @throws IllegalArgumentException if the two do not prove each other
   */
  public static ProofSheet of(Network network, Plan plan, long finish, Flow flow, Money alike) {
    List<Arc> arcs = Arcs.of(network, finish, flow);
    for (int decimals = FEWEST_DECIMALS; decimals <= MOST_DECIMALS; decimals += 3) {
      Writer writer = new Writer(network, Optional.of(plan), decimals);
      List<Row> rows = writer.rows(arcs, flow);
      if (!alike.isZero()) {
        Optional<BigDecimal> cost = Optional.of(writer.number(alike, RoundingMode.CEILING));
        rows.add(0, money(Kind.FIXED, -1, "", cost, cost));
      }
      BigDecimal gap = sum(rows, Row::planCost).subtract(sum(rows, Row::bound));
      if (gap.signum() >= 0 && gap.compareTo(HALF_A_CENT) < 0) {
        if (gap.signum() > 0) {
          rows.add(
              money(Kind.ROUNDING, -1, "", Optional.empty(), Optional.of(DecimalFlow.plain(gap))));
        }
        return new ProofSheet(rows);
      }
    }
    throw new IllegalArgumentException("the plan and the flow do not prove each other");
  }

  /**
   * What a flow bounds alone, with money that every plan pays alike.
   *
   * @param finish ticks within which the plans finish
   * @throws IllegalArgumentException if the flow is none
   */
  public static ProofSheet ofBound(Network network, long finish, Flow flow, Money alike) {
    FlowBound counted = new ProofChecker(network).bound(flow);
    if (counted.fault().isPresent()) {
      throw new IllegalArgumentException("no flow: " + counted.fault().get());
    }
    BigDecimal exact = counted.at(finish).plus(alike).rounded(MOST_DECIMALS, RoundingMode.FLOOR);
    List<Arc> arcs = Arcs.of(network, finish, flow);
    for (int decimals = FEWEST_DECIMALS; decimals <= MOST_DECIMALS; decimals += 3) {
      Writer writer = new Writer(network, Optional.empty(), decimals);
      List<Row> rows = writer.rows(arcs, flow);
      if (!alike.isZero()) {
        Optional<BigDecimal> cost = Optional.of(writer.number(alike, RoundingMode.FLOOR));
        rows.add(0, money(Kind.FIXED, -1, "", Optional.empty(), cost));
      }
      BigDecimal lost = exact.subtract(sum(rows, Row::bound));
      if (lost.abs().compareTo(HALF_A_CENT) < 0) {
        return new ProofSheet(rows);
      }
    }
    throw new IllegalArgumentException("the flow cannot be written in decimals");
  }

  /** What a plan pays alone, with nothing that bounds it. */
  public static ProofSheet ofPlan(Network network, Plan plan, Map<String, Money> other) {
    Writer writer = new Writer(network, Optional.of(plan), FEWEST_DECIMALS);
    List<Row> rows = new ArrayList<>();
    for (int i = 0; i < network.size(); i++) {
      Money cost = plan.costOf(network, i);
      if (!cost.isZero()) {
        BigDecimal number = writer.number(cost, RoundingMode.HALF_UP);
        rows.add(money(Kind.FIXED, i, "", Optional.of(number), Optional.empty()));
      }
    }
    other.forEach(
        (name, cost) ->
            rows.add(
                money(
                    Kind.OTHER,
                    -1,
                    name,
                    Optional.of(writer.number(cost, RoundingMode.HALF_UP)),
                    Optional.empty())));
    return new ProofSheet(rows);
  }

  /** The total of the column that the plan pays. */
  public BigDecimal planCost() {
    return sum(rows, Row::planCost);
  }

  /** The total of the column that the flow bounds; equal to the other. */
  public BigDecimal bound() {
    return sum(rows, Row::bound);
  }

  /** What was lost by writing decimals; zero where everything is exact. */
  public BigDecimal rounding() {
    return rows.stream()
        .filter(row -> row.kind() == Kind.ROUNDING)
        .map(row -> row.bound().orElseThrow())
        .reduce(BigDecimal.ZERO, BigDecimal::add);
  }

  private interface Column {
    Optional<BigDecimal> of(Row row);
  }

  private static BigDecimal sum(List<Row> rows, Column column) {
    return rows.stream()
        .map(row -> column.of(row).orElse(BigDecimal.ZERO))
        .reduce(BigDecimal.ZERO, BigDecimal::add);
  }

  private static Row money(
      Kind kind,
      int activity,
      String name,
      Optional<BigDecimal> planCost,
      Optional<BigDecimal> bound) {
    return new Row(
        kind,
        Optional.empty(),
        activity,
        name,
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        planCost,
        bound);
  }

  /** Writes the rows with a number of decimals. */
  private record Writer(Network network, Optional<Plan> plan, int decimals) {

    List<Row> rows(List<Arc> arcs, Flow flow) {
      List<Row> rows = new ArrayList<>();
      for (int i = 0; i < network.size(); i++) {
        Activity activity = network.activity(i);
        Money least = activity.normalCost().min(activity.crashCost());
        if (!least.isZero()) {
          Optional<BigDecimal> cost = Optional.of(number(least, RoundingMode.CEILING));
          rows.add(money(Kind.FIXED, i, "", plan.isPresent() ? cost : Optional.empty(), cost));
        }
      }
      List<BigDecimal> amounts = DecimalFlow.of(arcs, network, flow.scale().perUnit(), decimals);
      for (int k = 0; k < arcs.size(); k++) {
        Row row = row(arcs.get(k), amounts.get(k));
        if (row.flow().orElseThrow().signum() != 0 || row.planCost().isPresent()) {
          rows.add(row);
        }
      }
      return rows;
    }

    private Row row(Arc arc, BigDecimal amount) {
      BigDecimal length = network.scale().units(arc.length());
      Money paid = paid(arc);
      return new Row(
          Kind.ARC,
          Optional.of(arc),
          arc.over().isOfActivity() ? arc.index() : -1,
          "",
          Optional.of(length),
          Optional.of(amount),
          arc.capacity().map(most -> number(perUnit(most), RoundingMode.FLOOR)),
          paid.isZero() ? Optional.empty() : Optional.of(number(paid, RoundingMode.CEILING)),
          Optional.of(DecimalFlow.plain(length.multiply(amount))));
    }

    /** What the plan pays where it falls short of an arc that has a price. */
    private Money paid(Arc arc) {
      if (plan.isEmpty()) {
        return Money.ZERO;
      }
      Plan of = plan.get();
      return switch (arc.over()) {
        case SLOPE, BACK_OVER_CRASH -> {
          Activity activity = network.activity(arc.index());
          long from = arc.over() == Arc.Over.SLOPE ? activity.normal() : activity.crash();
          yield activity.slope().times(from - of.duration(arc.index()));
        }
        case SPAN -> {
          Span span = network.spans().get(arc.index());
          yield span.rate().times(of.charged(span));
        }
        default -> Money.ZERO;
      };
    }

    private Money perUnit(Money perTick) {
      return perTick.times(network.scale().ticksPerUnit());
    }

    private BigDecimal number(Money amount, RoundingMode mode) {
      return DecimalFlow.plain(amount.rounded(decimals, mode));
    }
  }
}
