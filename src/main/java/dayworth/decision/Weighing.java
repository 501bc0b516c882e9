package dayworth.decision;

import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;

/**
 * The choices under one contract finish, and how far the best of them holds.
 *
 * @param curve every finish
 * @param choices as it stands first
 * @param byDamages empty where no damages are agreed
 * @param byTimeRelated which finish is best at which rate of time-related cost
 * @param byCompression which finish is best at which multiple of the estimated cost of shortening
 * @param wrongRates what the least total would cost too much at other damages rates
 */
public record Weighing(
    CurveAnswer curve,
    List<Choice> choices,
    Optional<BestByRate> byDamages,
    BestByRate byTimeRelated,
    BestByRate byCompression,
    List<WrongRate> wrongRates) {

  public Weighing {
    choices = List.copyOf(choices);
    wrongRates = List.copyOf(wrongRates);
  }

  /** The plan as it stands. */
  public Finish asItStands() {
    return curve.asPlanned();
  }

  /** The choice that costs least. */
  public Finish best() {
    return curve.leastTotal();
  }

  /** How much less a finish costs than the plan as it stands; below zero if it costs more. */
  public BigDecimal saved(Finish finish) {
    return asItStands().total().subtract(finish.total());
  }

  /** The total of a finish if shortening cost so many times what it was estimated to cost. */
  public Money totalAt(Finish finish, Money multiple) {
    Money extra = finish.direct().minus(asItStands().direct());
    return finish.spent().plus(finish.other().sum()).plus(extra.times(multiple.minus(Money.of(1))));
  }

  /**
   * What the least total costs if the damages rate is another than the case says.
   *
   * @param rate what it really is
   * @param best the finish that is best then
   * @param tooMuch how much dearer the least total at the case's rate is then
   */
  public record WrongRate(Money rate, Finish best, Money tooMuch) {}
}
