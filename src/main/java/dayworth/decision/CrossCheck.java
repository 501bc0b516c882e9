package dayworth.decision;

import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.List;

/**
 * The curve compared with the linear programme.
 *
 * @param comparisons longest duration first
 * @param atBreakpoints how many of them are at breakpoints
 * @param ofPoints how many points a full comparison would have
 * @param unanswered where the linear programme was asked and gave no answer to rely on
 */
public record CrossCheck(
    List<Comparison> comparisons, int atBreakpoints, int ofPoints, List<Unanswered> unanswered) {

  public CrossCheck {
    comparisons = List.copyOf(comparisons);
    unanswered = List.copyOf(unanswered);
  }

  /** How many comparisons are inside a piece, between two breakpoints. */
  public int between() {
    return comparisons.size() - atBreakpoints;
  }

  /** The largest difference, rounded to cents; zero without comparisons. */
  public BigDecimal largestDifference() {
    return comparisons.stream()
        .map(Comparison::difference)
        .reduce(BigDecimal.ZERO.setScale(2), BigDecimal::max);
  }

  /**
   * One deadline, both ways.
   *
   * @param duration ticks
   * @param stepping the exact direct cost found by stepping
   * @param linear the direct cost found by the linear programme, rounded to cents
   */
  public record Comparison(long duration, Money stepping, BigDecimal linear) {

    /** The absolute difference in cents. */
    public BigDecimal difference() {
      return stepping.cents().subtract(linear).abs();
    }
  }

  /**
   * A deadline that could not be compared, which is no disagreement.
   *
   * @param duration ticks
   * @param reason for people
   */
  public record Unanswered(long duration, String reason) {}
}
