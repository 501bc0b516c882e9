package dayworth.casefile;

import dayworth.contract.Due;
import dayworth.contract.Extension;
import dayworth.decision.TimeUnit;
import dayworth.value.DayLength;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;

/**
 * The times of a case in ticks, with or without dates.
 *
 * @param calendar empty where the case has no start_date
 */
record CaseCalendar(TimeScale scale, Optional<WorkingCalendar> calendar) {

  /** No finish may be later: years have four digits. */
  private static final LocalDate LAST = LocalDate.of(9999, 12, 31);

  static CaseCalendar of(TermsTable terms, List<LocalDate> holidays, TimeScale scale) {
    return new CaseCalendar(
        scale,
        terms
            .startDate()
            .map(
                start ->
                    WorkingCalendar.of(
                        start, terms.workingDays(), holidays, dayLength(terms, scale))));
  }

  /** A week is so many working days as the case works in a week without holidays. */
  private static DayLength dayLength(TermsTable terms, TimeScale scale) {
    if (terms.unit() == TimeUnit.WEEK) {
      return DayLength.ofWeek(terms.workingDays().size(), scale);
    }
    return DayLength.ofUnits(
        terms.unit() == TimeUnit.DAY ? BigDecimal.ONE : terms.amount("units_per_working_day"),
        scale);
  }

  /** The first tick on or after a moment at which work may start. */
  long start(Moment moment) {
    return moment
        .date()
        .map(date -> calendar.orElseThrow().morningOf(date))
        .orElseGet(() -> scale.ticks(moment.units().orElseThrow()));
  }

  /** A moment by which something is due. */
  Due due(Moment moment) {
    if (calendar.isEmpty()) {
      return Due.at(scale.ticks(moment.units().orElseThrow()));
    }
    return moment
        .date()
        .map(date -> Due.on(date, calendar.get()))
        .orElseGet(() -> Due.after(scale.ticks(moment.units().orElseThrow()), calendar.get()));
  }

  /** An extension of time: so many working days, or to a date. */
  Extension extension(Moment moment, Due contractFinish, TermsTable terms) {
    DayLength day = dayLength(terms, scale);
    return new Extension(
        moment
            .date()
            .map(date -> Due.on(date, calendar.orElseThrow()))
            .orElseGet(
                () ->
                    contractFinish.later(
                        moment.units().orElseThrow().longValueExact(), day, calendar)),
        day);
  }

  /** Whether a finish is so late that its date would be beyond the year 9999. */
  boolean isBeyondDates(long finish) {
    return calendar.filter(dates -> finish > dates.endOf(LAST)).isPresent();
  }
}
