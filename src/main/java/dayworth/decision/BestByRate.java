package dayworth.decision;

import dayworth.contract.Terms;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Which finish costs least in all, for every value of one number that its total is straight in.
 *
 * <p>The total of a finish is straight in a rate: so many times the rate beside what does not
 * depend on it. Under a cap it is straight up to the cap and level from there on, which is the
 * lower of two straight lines; so the least of all totals is the lowest of all these lines, and
 * nothing is sampled.
 *
 * @param now the number as the case has it
 * @param ranges from 0 on, without gaps
 */
public record BestByRate(Money now, List<Range> ranges) {

  public BestByRate {
    ranges = List.copyOf(ranges);
  }

  /**
   * Where one finish is the best.
   *
   * @param to empty where it is so for ever
   * @param isCapped whether its damages are at their cap there
   */
  public record Range(Money from, Optional<Money> to, Finish finish, boolean isCapped) {

    /** Whether a number lies in it, its ends counted. */
    public boolean holds(Money number) {
      return from.compareTo(number) <= 0 && to.filter(end -> end.compareTo(number) < 0).isEmpty();
    }
  }

  /** The first range that holds what the case has. */
  public Range present() {
    return at(now);
  }

  /** The first range that holds a number of at least 0. */
  public Range at(Money number) {
    return ranges.stream().filter(range -> range.holds(number)).findFirst().orElseThrow();
  }

  /**
   * By the damages rate, whatever it is per.
   *
   * @throws IllegalArgumentException if the case has none: then no row stands where grace ends
   */
  static BestByRate byDamages(CurveAnswer answer) {
    Terms terms = answer.of().terms();
    if (terms.damages().rate().isZero()) {
      throw new IllegalArgumentException("the case has no damages rate");
    }
    Lines lines = new Lines();
    for (Finish row : answer.rows()) {
      Money without = total(row).minus(terms.at(row.duration()).damages());
      lines.add(row, without, terms.damagesCount(row.duration()));
    }
    for (Finish row : answer.rows()) {
      Money without = total(row).minus(terms.at(row.duration()).damages());
      if (!terms.damagesCount(row.duration()).isZero()) {
        terms.damages().cap().ifPresent(cap -> lines.addCapped(row, without.plus(cap)));
      }
    }
    return lines.best(terms.damages().rate());
  }

  /** By the rate of time-related cost, whatever it is per. */
  static BestByRate byTimeRelated(CurveAnswer answer) {
    Terms terms = answer.of().terms();
    Lines lines = new Lines();
    for (Finish row : answer.rows()) {
      lines.add(
          row, total(row).minus(row.other().timeRelated()), terms.timeRelatedCount(row.duration()));
    }
    return lines.best(terms.timeRelated().rate());
  }

  /**
   * By what shortening costs, as a multiple of what it was estimated to cost; at any multiple the
   * cheapest plans of each finish stay the same where nothing runs between moments.
   */
  static BestByRate byCompression(CurveAnswer answer) {
    Money asPlanned = answer.asPlanned().direct();
    Lines lines = new Lines();
    for (Finish row : answer.rows()) {
      Money extra = row.direct().minus(asPlanned);
      lines.add(row, total(row).minus(extra), extra);
    }
    return lines.best(Money.of(1));
  }

  private static Money total(Finish row) {
    return row.spent().plus(row.other().sum());
  }

  private static final class Lines {

    private final List<LowestLines.Line> lines = new ArrayList<>();
    private final List<Finish> finishes = new ArrayList<>();
    private int uncapped;

    void add(Finish finish, Money atZero, Money slope) {
      finishes.add(finish);
      lines.add(new LowestLines.Line(atZero, slope));
      uncapped = lines.size();
    }

    void addCapped(Finish finish, Money level) {
      finishes.add(finish);
      lines.add(new LowestLines.Line(level, Money.ZERO));
    }

    BestByRate best(Money now) {
      return new BestByRate(
          now,
          LowestLines.of(lines).stream()
              .map(
                  stretch ->
                      new Range(
                          stretch.from(),
                          stretch.to(),
                          finishes.get(stretch.line()),
                          stretch.line() >= uncapped))
              .toList());
    }
  }
}
