package dayworth.engine.branching;

import dayworth.engine.measures.BoundedShare;
import dayworth.engine.measures.Incumbent;
import dayworth.engine.measures.WaySearch;
import dayworth.engine.proof.ProofChecker;
import dayworth.engine.stepping.Narrowing;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import dayworth.value.Money;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BooleanSupplier;

/**
 * One branch of a network whose activities have ways to choose from: searched by {@link WaySearch}
 * as far as charges and packages cost what the branch says, and otherwise split.
 */
final class WayBranch {

  /** Relaxations for each finish at first, and how many times more each time after. */
  private static final long FIRST_ALLOWANCE = 100;

  private static final long TIMES_MORE = 5;

  private final Network network;
  private final List<Charge> charges;
  private final Branch branch;
  private final Relaxation relaxation;
  private final WaySearch search;
  private final BooleanSupplier isOver;

  /** The split for what is furthest from the truth. */
  private Optional<List<Branch>> halves = Optional.empty();

  /** How far that is. */
  private Money widest = Money.ZERO;

  private long nodes;

  /**
   * A finish that is to be solved.
   *
   * @param best what is known of it
   */
  record Row(long duration, Best best) {}

  WayBranch(
      Network network,
      List<Charge> charges,
      Branch branch,
      Relaxation relaxation,
      BooleanSupplier isOver) {
    this.isOver = isOver;
    this.network = network;
    this.charges = charges;
    this.branch = branch;
    this.relaxation = relaxation;
    this.search =
        new WaySearch(
            relaxation.network(), branch.opening(), !relaxation.network().spans().isEmpty());
  }

  /** How many relaxations were solved. */
  long nodes() {
    return nodes;
  }

  /** The branches into which this one is to be split for the rows that are left. */
  Optional<List<Branch>> halves() {
    return halves;
  }

  /**
   * Solves finishes from long to short. What is not settled with few relaxations is searched again
   * with more, when more is known of its neighbours.
   *
   * @param most how many relaxations are solved at most, beyond one for each finish
   * @return for each finish what the branch's plans cost at least that were not settled; empty if
   *     all are
   */
  List<Optional<Money>> solve(List<Row> rows, long most) {
    List<Search> searches = new ArrayList<>();
    boolean isPossible = true;
    for (Row row : rows) {
      Optional<Narrowing.State> root = isPossible ? search.reach(row.duration()) : Optional.empty();
      isPossible = root.isPresent();
      searches.add(new Search(row, root));
    }
    long allowance = FIRST_ALLOWANCE;
    long searched = nodes;
    do {
      searched = nodes;
      pass(searches, allowance, most);
      allowance *= TIMES_MORE;
    } while (searched < nodes && nodes < most && !isOver.getAsBoolean());
    return searches.stream()
        .map(each -> each.bound.filter(b -> !each.row.best().beats(b)))
        .toList();
  }

  /** Searches what can be searched further once, from the shortest finish on. */
  private void pass(List<Search> searches, long allowance, long most) {
    long waiting = searches.stream().filter(each -> each.isOpen).count();
    for (int k = searches.size() - 1; k >= 0; k--) {
      Search each = searches.get(k);
      if (each.isOpen) {
        each.run(Math.min(allowance, Math.max(1, (most - nodes) / waiting--)));
      }
      if (k > 0) {
        searches.get(k - 1).row.best().offer(each.row.best());
      }
    }
  }

  /** The search for one finish. */
  private final class Search {

    private final Row row;
    private final Optional<Narrowing.State> root;

    /** What plans cost at least that are not settled; empty if all are. */
    private Optional<Money> bound = Optional.empty();

    /** Whether more relaxations can settle more. */
    private boolean isOpen;

    Search(Row row, Optional<Narrowing.State> root) {
      this.row = row;
      this.root = root;
      this.isOpen = root.isPresent();
    }

    void run(long most) {
      Money least = money(search.boundAt(root.orElseThrow()));
      nodes++;
      if (row.best().beats(least)) {
        isOpen = false;
        bound = Optional.empty();
      } else if (isSplitFor(search.planAt(root.orElseThrow()))) {
        isOpen = false;
        bound = Optional.of(least);
      } else {
        WaySearch.Outcome outcome = search.search(root.orElseThrow(), incumbent(row), most, isOver);
        nodes += outcome.nodes();
        outcome.unresolved().ifPresent(WayBranch.this::splitFor);
        bound = outcome.bound().map(WayBranch.this::money);
        isOpen = bound.isPresent() && outcome.unresolved().isEmpty();
      }
    }
  }

  /**
   * Splits the branch for one finish into shares that no cheaper plan is in.
   *
   * @param cost of the plan that is known
   * @param most how many shares are looked at, at most
   * @param shares those that were bounded; not all of them if {@link #halves} is present
   * @return how many were looked at; {@code most} or more if that was not enough
   */
  long splitUp(long duration, Money cost, long most, List<BoundedShare> shares) {
    Optional<Narrowing.State> root = search.reach(duration);
    if (root.isEmpty()) {
      return 1;
    }
    BigInteger closedFrom = scaled(cost.minus(Point.ROUNDING).minus(relaxation.fixedByCharges()));
    if (search.boundAt(root.get()).compareTo(closedFrom) < 0
        && isSplitFor(search.planAt(root.get()))) {
      return 1;
    }
    WaySearch.Outcome outcome = search.splitUp(root.get(), closedFrom, most, shares::add);
    outcome.unresolved().ifPresent(this::splitFor);
    return outcome.nodes();
  }

  /** What comes on top of the shares' networks. */
  Money fixed() {
    return relaxation.fixed();
  }

  private void splitFor(WaySearch.Unresolved left) {
    if (left.line() >= 0 && halves.isEmpty()) {
      halves = Optional.of(branch.with(branch.opening().halvesByLine(left.line())));
    } else {
      isSplitFor(left.plan());
    }
  }

  /** Whether charges or packages cost more at a plan than the branch says. */
  private boolean isSplitFor(Plan plan) {
    boolean any = false;
    for (int j = 0; j < charges.size(); j++) {
      Money gap = ChargedMoney.at(charges.get(j), plan).minus(relaxation.chargeAt(j, plan));
      any |= gap.compareTo(Point.ROUNDING) >= 0;
      if (gap.compareTo(widest) > 0) {
        Optional<Branch.Split> split = branch.splitFor(j, charges.get(j), plan);
        if (split.isPresent()) {
          widest = gap;
          halves = Optional.of(branch.halves(split.get()));
        }
      }
    }
    for (int index = 0; index < network.measures().packages().size(); index++) {
      Money gap = branch.opening().notPaid(index, plan);
      any |= gap.compareTo(Point.ROUNDING) >= 0;
      if (gap.compareTo(widest) > 0) {
        widest = gap;
        halves = Optional.of(branch.with(branch.opening().halvesByPackage(index)));
      }
    }
    return any;
  }

  private Incumbent incumbent(Row row) {
    return new Incumbent() {
      @Override
      public BigInteger closedFrom() {
        return row.best().plan.isEmpty()
            ? BigInteger.ONE.shiftLeft(Long.SIZE * 2)
            : scaled(row.best().cost.minus(Point.ROUNDING).minus(relaxation.fixedByCharges()));
      }

      @Override
      public void offer(Plan plan) {
        WayBranch.this.offer(row, plan);
      }
    };
  }

  private void offer(Row row, Plan plan) {
    if (ProofChecker.possible(network, plan, row.duration()).isPresent()) {
      return;
    }
    Plan timed = plan.isScheduled() ? plan : Timing.earliest(network, plan).scheduled();
    row.best().offer(timed, ChargedMoney.cost(network, charges, timed), branch);
  }

  private Money money(BigInteger scaled) {
    return search.scale().money(scaled).plus(relaxation.fixedByCharges());
  }

  /** Rounded up, so that what reaches it is no less. */
  private BigInteger scaled(Money money) {
    BigInteger scaled = money.numerator().multiply(BigInteger.valueOf(search.scale().perUnit()));
    return scaled.add(money.denominator()).subtract(BigInteger.ONE).divide(money.denominator());
  }
}
