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
                        start, terms.workingDays(), holidays, dayLength(terms, scale)))
            .map(calendar -> terms.dataDate().map(calendar::after).orElse(calendar)));
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

  /** The first tick on or after a moment at which work may start; 0 if that has passed. */
  long start(Moment moment) {
    return Math.max(
        0,
        moment
            .date()
            .map(this::startedOn)
            .orElseGet(() -> counted(scale.ticks(moment.units().orElseThrow()))));
  }

  /** Ticks from the start as ticks from when time counts. */
  private long counted(long fromStart) {
    return calendar.map(dates -> dates.counted(fromStart)).orElse(fromStart);
  }

  /** When work began that started on a date; a rest day is the morning of the next working day. */
  long startedOn(LocalDate date) {
    return calendar.orElseThrow().morningOf(date);
  }

  /** When work was done that finished on a date; a rest day is the end of the last working day. */
  long finishedOn(LocalDate date) {
    return calendar.orElseThrow().endOf(date);
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
