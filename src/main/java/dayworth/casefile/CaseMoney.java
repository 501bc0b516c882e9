package dayworth.casefile;

import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.MomentMoney;
import dayworth.contract.PartWeek;
import dayworth.contract.RunningCost;
import dayworth.contract.Section;
import dayworth.decision.Progress;
import dayworth.decision.Status;
import dayworth.network.Moment;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Makes sections and running costs from their rows and the status: what has finished has its money
 * fixed, what runs already runs from when time counts, and what has run is no cost to go.
 */
final class CaseMoney {

  private final TermsTable terms;
  private final CaseCalendar times;
  private final Optional<Progress> progress;

  private CaseMoney(TermsTable terms, CaseCalendar times, Optional<Progress> progress) {
    this.terms = terms;
    this.times = times;
    this.progress = progress;
  }

  static MomentMoney of(
      List<SectionRow> sections,
      List<RunningRow> running,
      TermsTable terms,
      CaseCalendar times,
      Optional<Progress> progress) {
    CaseMoney money = new CaseMoney(terms, times, progress);
    List<RunningCost> costs = new ArrayList<>();
    running.forEach(row -> money.running(row).ifPresent(costs::add));
    return new MomentMoney(
        times.scale(), times.calendar(), sections.stream().map(money::section).toList(), costs);
  }

  private Section section(SectionRow row) {
    Due due = times.due(row.due());
    return new Section(
        row.name(),
        row.activity(),
        due,
        new Damages(
            money(row.damagesRate()),
            row.damagesPer(),
            row.damagesGrace().value().orElse(BigDecimal.ZERO),
            row.damagesCap().value().map(Money::of),
            terms.partWeek().orElse(PartWeek.PRO_RATA)),
        new Bonus(
            money(row.bonusRate()),
            row.bonusPer(),
            row.bonusCap().value().map(Money::of),
            row.bonusCapUnits().value()),
        finished(row.activity()).map(done -> new Section.Done(done.finish(), done.to())));
  }

  private static Money money(Cell<BigDecimal> rate) {
    return Money.of(rate.value().orElse(BigDecimal.ZERO));
  }

  private Optional<RunningCost> running(RunningRow row) {
    if (finished(row.to()).isPresent()) {
      return Optional.empty();
    }
    boolean hasBegun =
        progress.filter(all -> all.statuses().get(row.from()).started().isPresent()).isPresent();
    return Optional.of(
        new RunningCost(
            row.name(),
            hasBegun ? Moment.PROJECT_START : Moment.startOf(row.from()),
            Moment.finishOf(row.to()),
            Money.of(row.rate()),
            row.per()));
  }

  private Optional<Status.Finished> finished(int activity) {
    return progress
        .map(all -> all.statuses().get(activity))
        .filter(Status.Finished.class::isInstance)
        .map(Status.Finished.class::cast);
  }
}
