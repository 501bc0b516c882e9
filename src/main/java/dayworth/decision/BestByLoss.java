package dayworth.decision;

import dayworth.value.Quantity;
import dayworth.value.WorkingCalendar;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Which finish costs least in all, if all losses of output are multiplied by a factor.
 *
 * <p>Durations and costs of measures are no straight lines in the factor, so that nothing is exact
 * here but the factors that were tried: at each every finish was computed again. Between two
 * neighbours with one best finish another may be the best, and would be missed.
 *
 * @param now the factor that the answer beside it is for
 * @param isBounded whether no factor above the largest that was tried leaves all weeks some output
 * @param isNarrowed whether every change that was seen is known to {@link LossSweep#STEP}
 * @param tried by their factors, ascending; at least one
 */
public record BestByLoss(Quantity now, boolean isBounded, boolean isNarrowed, List<Tried> tried) {

  /**
   * All finishes at one factor.
   *
   * @param curve of the case with its losses multiplied by the factor
   */
  public record Tried(Quantity factor, CurveAnswer curve) {

    public Finish best() {
      return curve.leastTotal();
    }

    /** How much less the best finish costs than the plan as it stands. */
    public BigDecimal saved() {
      return curve.asPlanned().total().subtract(best().total());
    }

    /** Whether the best finish is of the same day or, without dates, in the same time unit. */
    boolean hasBestOf(Tried other) {
      Optional<WorkingCalendar> calendar = curve.of().terms().calendar();
      return calendar.isPresent()
          ? calendar
              .get()
              .finishDate(best().duration())
              .equals(other.calendar().finishDate(other.best().duration()))
          : wholeUnits().compareTo(other.wholeUnits()) == 0;
    }

    private WorkingCalendar calendar() {
      return curve.of().terms().calendar().orElseThrow();
    }

    private BigDecimal wholeUnits() {
      return curve
          .of()
          .network()
          .scale()
          .units(best().duration())
          .setScale(0, RoundingMode.CEILING);
    }
  }

  /**
   * Neighbouring factors that were tried and have one best finish.
   *
   * @param from the least of them
   * @param to the most of them
   */
  public record Range(Tried from, Tried to) {

    /** Whether a factor lies in it, its ends counted. */
    public boolean holds(Quantity factor) {
      return from.factor().compareTo(factor) <= 0 && factor.compareTo(to.factor()) <= 0;
    }
  }

  public BestByLoss {
    tried = List.copyOf(tried);
  }

  /** From the least factor on; between two of them lies a change. */
  public List<Range> ranges() {
    List<Range> ranges = new ArrayList<>();
    Tried from = tried.get(0);
    for (int i = 0; i < tried.size(); i++) {
      if (i + 1 == tried.size() || !tried.get(i + 1).hasBestOf(from)) {
        ranges.add(new Range(from, tried.get(i)));
        from = tried.get(Math.min(i + 1, tried.size() - 1));
      }
    }
    return ranges;
  }

  /** How many of the factors left a finish without proof. */
  public int unproved() {
    return (int)
        tried.stream()
            .filter(each -> each.curve().provedRows() < each.curve().rows().size())
            .count();
  }
}
