package dayworth.decision;

import dayworth.buildup.BuildUp;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.NavigableMap;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.TreeMap;

/**
 * Seeks the factors on the losses of output at which another finish becomes the best.
 *
 * <p>All finishes are computed again at a few factors; where two neighbours have another best
 * finish the factor between them is tried, the widest gap first, until it is no wider than {@link
 * #STEP} (bisection). Two changes between neighbours that have one best finish are not seen.
 *
 * <p>The cost is one curve for each factor, of which no more than {@link #MOST} are tried.
 */
public final class LossSweep {

  /** How closely a change is sought. */
  public static final Quantity STEP = Quantity.of(new BigDecimal("0.01"));

  /** How many factors are tried, the present one not counted. */
  public static final int MOST = 16;

  private static final int DECIMALS = 2;
  private static final Quantity TWO = Quantity.of(2);
  private static final List<Quantity> FIRST =
      List.of(
          Quantity.ZERO,
          Quantity.of(new BigDecimal("0.5")),
          Quantity.ONE,
          Quantity.of(new BigDecimal("1.5")),
          TWO);

  private final LossScaling scaling;
  private final Effort effort;
  private final Watcher watcher;
  private final Quantity now;
  private final NavigableMap<Quantity, BestByLoss.Tried> tried = new TreeMap<>();

  private LossSweep(CurveAnswer present, LossScaling scaling, Effort effort, Watcher watcher) {
    this.scaling = scaling;
    this.effort = effort;
    this.watcher = watcher;
    this.now = present.of().buildUp().lossFactor();
    tried.put(now, new BestByLoss.Tried(now, present));
  }

  /**
   * The best finish by the factor, from 0 to 2 or to the present factor if that is more; empty
   * where no labour is to go, or no loss is there to be multiplied.
   *
   * @param present every finish at the present factor
   */
  static Optional<BestByLoss> of(
      CurveAnswer present, LossScaling scaling, Effort effort, Watcher watcher) {
    boolean any =
        !present.of().buildUp().activities().isEmpty()
            && scaling.at(Quantity.ONE).filter(as -> losesOutput(as.buildUp())).isPresent();
    return any
        ? Optional.of(new LossSweep(present, scaling, effort, watcher).sweep())
        : Optional.empty();
  }

  private static boolean losesOutput(BuildUp buildUp) {
    return buildUp.bought().stream()
        .flatMap(pattern -> pattern.loss().weeks().stream())
        .anyMatch(week -> week.loss().signum() != 0);
  }

  private BestByLoss sweep() {
    Quantity wanted = now.max(TWO);
    Quantity most = scaling.at(wanted).isPresent() ? wanted : largest(wanted);
    List<Quantity> first = new ArrayList<>(FIRST);
    first.add(most);
    first.removeIf(factor -> factor.compareTo(most) > 0);
    boolean isDone = first.stream().allMatch(this::isTried);
    Optional<Quantity> next = between();
    while (isDone && next.isPresent()) {
      isDone = tried.size() <= MOST && isTried(next.get());
      next = between();
    }
    return new BestByLoss(now, most.compareTo(wanted) < 0, isDone, List.copyOf(tried.values()));
  }

  /** The largest factor below one that leaves nothing that still leaves something, to a step. */
  private Quantity largest(Quantity none) {
    Quantity some = now;
    Quantity above = none;
    while (above.minus(some).compareTo(STEP) > 0) {
      Quantity middle = middle(some, above);
      if (scaling.at(middle).isPresent()) {
        some = middle;
      } else {
        above = middle;
      }
    }
    return some;
  }

  /** What lies between the two neighbours furthest apart that have another best finish. */
  private Optional<Quantity> between() {
    Optional<Quantity> next = Optional.empty();
    Quantity widest = STEP;
    Map.Entry<Quantity, BestByLoss.Tried> last = tried.firstEntry();
    for (Map.Entry<Quantity, BestByLoss.Tried> each :
        tried.tailMap(last.getKey(), false).entrySet()) {
      Quantity gap = each.getKey().minus(last.getKey());
      if (gap.compareTo(widest) > 0 && !each.getValue().hasBestOf(last.getValue())) {
        widest = gap;
        next = Optional.of(middle(last.getKey(), each.getKey()));
      }
      last = each;
    }
    return next;
  }

  /** Of two decimals; it lies between the two, for they are more than a step apart. */
  private static Quantity middle(Quantity low, Quantity high) {
    return Quantity.of(low.plus(high).dividedBy(TWO).rounded(DECIMALS, RoundingMode.HALF_UP));
  }

  /** Whether all finishes are known at a factor, after trying it; not once the time is over. */
  private boolean isTried(Quantity factor) {
    if (tried.containsKey(factor)) {
      return true;
    }
    if (effort.isOver().getAsBoolean()) {
      return false;
    }
    watcher.now(
        "all finishes again with losses times " + factor.rounded(DECIMALS, RoundingMode.HALF_UP));
    Optional<CurveAnswer> curve = scaling.at(factor).map(this::curve);
    curve.ifPresent(all -> tried.put(factor, new BestByLoss.Tried(factor, all)));
    return curve.isPresent();
  }

  private CurveAnswer curve(Case of) {
    try {
      return CurveQuestion.ask(of, OptionalLong.empty(), 0, effort, watcher);
    } catch (FinishTooEarly impossible) {
      throw new IllegalStateException("no finish was asked for", impossible);
    }
  }
}
