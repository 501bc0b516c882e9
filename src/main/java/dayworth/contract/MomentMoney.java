package dayworth.contract;

import dayworth.engine.branching.Charge;
import dayworth.network.Plan;
import dayworth.network.Span;
import dayworth.value.Money;
import dayworth.value.MoneySum;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Money that hangs on when single activities start and finish: sections and running costs. What is
 * convex goes to the engine as spans, the rest as charges.
 */
public final class MomentMoney {

  private final List<Section> sections;
  private final List<RunningCost> running;
  private final Counting counting;
  private final List<Span> spans = new ArrayList<>();
  private final List<Charge> charges = new ArrayList<>();
  private final Money fixed;

  /**
   * Joins sections and running costs.
   *
   * @param calendar needed where money goes by the date
   */
  public MomentMoney(
      TimeScale scale,
      Optional<WorkingCalendar> calendar,
      List<Section> sections,
      List<RunningCost> running) {
    this.sections = List.copyOf(sections);
    this.running = List.copyOf(running);
    this.counting = new Counting(scale, calendar);
    MoneySum always = new MoneySum();
    for (Section section : sections) {
      if (section.done().isPresent()) {
        continue;
      }
      Optional<LinearSection> linear = LinearSection.of(section, counting);
      linear.ifPresentOrElse(
          convex -> {
            spans.addAll(convex.spans());
            always.add(convex.fixed());
          },
          () -> charges.add(new SectionCharge(section, counting)));
    }
    for (RunningCost cost : running) {
      if (cost.per() == Per.UNIT) {
        spans.add(new Span(cost.name(), cost.from(), cost.to(), 0, counting.perTick(cost.rate())));
      } else {
        charges.add(new Hire(cost, calendar.orElseThrow()));
      }
    }
    fixed = always.total();
  }

  /** No such money. */
  public static MomentMoney none(TimeScale scale) {
    return new MomentMoney(scale, Optional.empty(), List.of(), List.of());
  }

  public List<Section> sections() {
    return sections;
  }

  public List<RunningCost> running() {
    return running;
  }

  public boolean isNone() {
    return sections.isEmpty() && running.isEmpty();
  }

  /** What is convex. */
  public List<Span> spans() {
    return List.copyOf(spans);
  }

  /** What is not. */
  public List<Charge> charges() {
    return List.copyOf(charges);
  }

  /** What is to be added to spans and charges for the true sum; zero or, for bonuses, below. */
  public Money fixed() {
    return fixed;
  }

  /** The running costs of a plan that says when activities start. */
  public Money runningOf(Plan plan) {
    return sum(running.stream().map(cost -> of(cost, plan)).toList());
  }

  /** What one running cost comes to. */
  public Money of(RunningCost cost, Plan plan) {
    if (cost.per() == Per.UNIT) {
      long span = plan.time(cost.to()) - plan.time(cost.from());
      return counting.perTick(cost.rate()).times(Math.max(0, span));
    }
    Hire hire = new Hire(cost, counting.calendar().orElseThrow());
    return hire.at(hire.moments().stream().mapToLong(plan::time).toArray());
  }

  /** The damages of all sections. */
  public Money damagesOf(Plan plan) {
    return sum(sections.stream().map(section -> damagesOf(section, plan)).toList());
  }

  /** The damages of one section. */
  public Money damagesOf(Section section, Plan plan) {
    Damages damages = section.damages();
    return section
        .done()
        .map(done -> counting.lateness(section.due(), done, damages.per()))
        .map(damages::forLateness)
        .orElseGet(() -> damages.at(finish(section, plan), section.due(), counting));
  }

  /** The bonuses of all sections. */
  public Money bonusOf(Plan plan) {
    return sum(sections.stream().map(section -> bonusOf(section, plan)).toList());
  }

  /** The bonus of one section. */
  public Money bonusOf(Section section, Plan plan) {
    Bonus bonus = section.bonus();
    return section
        .done()
        .map(done -> counting.lateness(section.due(), done, bonus.per()).negate())
        .map(bonus::forEarliness)
        .orElseGet(() -> bonus.at(finish(section, plan), section.due(), counting));
  }

  private static long finish(Section section, Plan plan) {
    return plan.start(section.activity()) + plan.duration(section.activity());
  }

  private static Money sum(List<Money> amounts) {
    MoneySum sum = new MoneySum();
    amounts.forEach(sum::add);
    return sum.total();
  }
}
