package dayworth.casefile;

import dayworth.contract.Per;
import dayworth.decision.TimeUnit;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;

/** How fine the time scale of a case must be. */
final class Resolution {

  private static final TimeScale FINEST = new TimeScale(TimeScale.MOST_DECIMALS);

  private Resolution() {}

  /**
   * The coarsest scale on which every time of the case is whole; the finest where a cap in money is
   * reached within a unit, where a working day is no decimal part of a week, or where what remains
   * can be compressed to no decimal part of a unit.
   */
  static TimeScale of(
      List<ActivityRow> activities,
      List<LinkRow> links,
      TermsTable terms,
      List<ProgressRow> progress,
      List<SectionRow> sections,
      List<MeasureRow> measures) {
    TimeScale scale = ofTerms(terms);
    for (MeasureRow row : measures) {
      scale = scale.and(TimeScale.of(row.duration()));
    }
    for (SectionRow row : sections) {
      scale = scale.and(ofSection(row));
    }
    for (ActivityRow row : activities) {
      scale =
          scale
              .and(of(row.normal()))
              .and(of(row.crash()))
              .and(of(row.notBefore().flatMap(Moment::units)));
    }
    for (LinkRow row : links) {
      scale = scale.and(TimeScale.of(row.lag()));
    }
    for (ProgressRow row : progress) {
      scale = scale.and(of(row.remaining().value())).and(of(row.crash().value()));
      scale = scale.and(ofProportion(row, activities.get(row.activity())));
    }
    return scale;
  }

  /** Whether the crash duration of what remains, in proportion to the whole, is exact. */
  private static TimeScale ofProportion(ProgressRow row, ActivityRow whole) {
    if (!row.isInProgress() || row.crash().given() || whole.crash().isEmpty()) {
      return TimeScale.WHOLE;
    }
    BigDecimal product = row.remaining().value().orElseThrow().multiply(whole.crash().get());
    BigDecimal[] parts =
        product
            .movePointRight(TimeScale.MOST_DECIMALS)
            .divideAndRemainder(whole.normal().orElseThrow());
    return parts[1].signum() == 0
        ? TimeScale.of(parts[0].movePointLeft(TimeScale.MOST_DECIMALS))
        : FINEST;
  }

  private static TimeScale ofTerms(TermsTable terms) {
    TimeScale scale = of(terms.moment("contract_finish").flatMap(Moment::units));
    if (isPerUnit(terms, "damages_per")) {
      scale = scale.and(of(terms.number("damages_grace")));
      scale = scale.and(ofCap(terms.number("damages_cap"), terms.number("damages_rate")));
    }
    if (isPerUnit(terms, "bonus_per")) {
      scale = scale.and(of(terms.number("bonus_cap_units")));
      scale = scale.and(ofCap(terms.number("bonus_cap"), terms.number("bonus_rate")));
    }
    boolean countsDays = terms.startDate().isPresent() || terms.isGiven("extension");
    return countsDays ? scale.and(ofWorkingDay(terms)) : scale;
  }

  private static TimeScale ofSection(SectionRow row) {
    TimeScale scale = of(row.due().units());
    if (row.damagesPer() == Per.UNIT) {
      scale = scale.and(of(row.damagesGrace().value()));
      scale = scale.and(ofCap(row.damagesCap().value(), row.damagesRate().value()));
    }
    if (row.bonusPer() == Per.UNIT) {
      scale = scale.and(of(row.bonusCapUnits().value()));
      scale = scale.and(ofCap(row.bonusCap().value(), row.bonusRate().value()));
    }
    return scale;
  }

  private static boolean isPerUnit(TermsTable terms, String term) {
    return terms.per(term).orElse(Per.UNIT) == Per.UNIT;
  }

  private static TimeScale of(Optional<BigDecimal> units) {
    return units.map(TimeScale::of).orElse(TimeScale.WHOLE);
  }

  /** Whether the cap is reached at a whole unit. */
  private static TimeScale ofCap(Optional<BigDecimal> cap, Optional<BigDecimal> rate) {
    boolean whole =
        cap.isEmpty()
            || rate.filter(per -> per.signum() > 0).isEmpty()
            || cap.get().remainder(rate.get()).signum() == 0;
    return whole ? TimeScale.WHOLE : FINEST;
  }

  private static TimeScale ofWorkingDay(TermsTable terms) {
    if (terms.unit() == TimeUnit.WEEK) {
      return switch (terms.workingDays().size()) {
        case 1 -> TimeScale.WHOLE;
        case 2, 5 -> new TimeScale(1);
        case 4 -> new TimeScale(2);
        default -> FINEST;
      };
    }
    return terms.unit() == TimeUnit.DAY
        ? TimeScale.WHOLE
        : of(terms.number("units_per_working_day"));
  }
}
