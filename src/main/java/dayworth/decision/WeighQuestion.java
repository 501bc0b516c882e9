package dayworth.decision;

import dayworth.contract.Extension;
import dayworth.contract.Terms;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;

/** Which finish is the best choice, and how far does that hold? */
public final class WeighQuestion {

  private WeighQuestion() {}

  /**
   * The answer, with every finish proved.
   *
   * @param watcher is told what is being done
   * @throws ProofFailed if a check refutes what was computed
   */
  public static WeighAnswer ask(Case of, Watcher watcher) {
    return ask(of, LossScaling.NONE, Effort.USUAL, watcher);
  }

  /**
   * The same with a stated effort.
   *
   * @param scaling the case under other losses of output
   */
  public static WeighAnswer ask(Case of, LossScaling scaling, Effort effort, Watcher watcher) {
    Weighing granted = weigh(of, effort, watcher);
    Optional<Extension> extension = of.terms().extension();
    return new WeighAnswer(
        granted,
        extension.map(claimed -> weigh(of.dueBy(claimed.due()), effort, watcher)),
        LossSweep.of(granted.curve(), scaling, effort, watcher),
        extension.map(claimed -> ExtensionSweep.of(granted.curve(), claimed)).orElse(List.of()));
  }

  private static Weighing weigh(Case of, Effort effort, Watcher watcher) {
    CurveAnswer curve = curve(of, effort, watcher);
    Terms terms = of.terms();
    boolean hasDamages = terms.contractFinish().isPresent() && !terms.damages().rate().isZero();
    return new Weighing(
        curve,
        choices(curve),
        hasDamages ? Optional.of(BestByRate.byDamages(curve)) : Optional.empty(),
        BestByRate.byTimeRelated(curve),
        BestByRate.byCompression(curve),
        hasDamages ? wrongRates(curve) : List.of());
  }

  private static CurveAnswer curve(Case of, Effort effort, Watcher watcher) {
    try {
      return CurveQuestion.ask(of, OptionalLong.empty(), 0, effort, watcher);
    } catch (FinishTooEarly impossible) {
      throw new IllegalStateException("no finish was asked for", impossible);
    }
  }

  private static List<Choice> choices(CurveAnswer curve) {
    List<Choice> choices = new ArrayList<>();
    choices.add(new Choice(Choice.Kind.AS_IT_STANDS, curve.asPlanned()));
    choices.add(new Choice(Choice.Kind.LEAST_TOTAL, curve.leastTotal()));
    curve
        .atContract()
        .filter(finish -> finish.duration() < curve.asPlanned().duration())
        .ifPresent(finish -> choices.add(new Choice(Choice.Kind.CONTRACT_FINISH, finish)));
    choices.addAll(SectionChoices.of(curve));
    curve.rows().stream()
        .filter(row -> row.other().bonus().signum() > 0)
        .max(
            Comparator.<Finish, Money>comparing(row -> row.other().bonus())
                .thenComparingLong(Finish::duration))
        .ifPresent(finish -> choices.add(new Choice(Choice.Kind.MOST_BONUS, finish)));
    choices.add(new Choice(Choice.Kind.SHORTEST, curve.shortest()));
    return choices;
  }

  /** No damages at all, half the rate and twice. */
  private static List<Weighing.WrongRate> wrongRates(CurveAnswer curve) {
    Terms terms = curve.of().terms();
    Money rate = terms.damages().rate();
    BestByRate best = BestByRate.byDamages(curve);
    return List.of(Money.ZERO, rate.dividedBy(2), rate.times(2)).stream()
        .map(
            other -> {
              Finish then = best.at(other).finish();
              Money tooMuch =
                  totalAt(curve.leastTotal(), terms, other).minus(totalAt(then, terms, other));
              return new Weighing.WrongRate(other, then, tooMuch);
            })
        .toList();
  }

  private static Money totalAt(Finish finish, Terms terms, Money rate) {
    Money charged = terms.damagesCount(finish.duration()).times(rate);
    Money damages = terms.damages().cap().map(charged::min).orElse(charged);
    return finish
        .spent()
        .plus(finish.other().sum())
        .minus(terms.at(finish.duration()).damages())
        .plus(damages);
  }
}
