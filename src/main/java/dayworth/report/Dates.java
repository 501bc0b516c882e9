package dayworth.report;

import dayworth.contract.Due;
import dayworth.decision.Case;
import dayworth.decision.Status;
import dayworth.value.WorkingCalendar;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.format.TextStyle;
import java.time.temporal.ChronoUnit;
import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** The dates of a case as files and people read them; all blank where it has none. */
final class Dates {

  /** Within so many months a day and a month are one date. */
  private static final int PLAIN_MONTHS = 11;

  private final Optional<WorkingCalendar> calendar;

  Dates(Case of) {
    calendar = of.terms().calendar();
  }

  boolean areKnown() {
    return calendar.isPresent();
  }

  /** The finish date for a table cell: {@code 2026-12-02}. */
  String finish(long ticks) {
    return calendar.map(dates -> dates.finishDate(ticks).toString()).orElse(CsvText.BLANK);
  }

  /** The start date of work from {@code start} to {@code finish}, for a table cell. */
  String start(long start, long finish) {
    return calendar.map(dates -> dates.startDate(start, finish).toString()).orElse(CsvText.BLANK);
  }

  /** When an activity started or will, for a table cell. */
  String start(Status status, long start, long finish) {
    return status.started().map(LocalDate::toString).orElseGet(() -> start(start, finish));
  }

  /** When an activity was finished or will be, likewise. */
  String finish(Status status, long finish) {
    return status instanceof Status.Finished done ? done.to().toString() : finish(finish);
  }

  /** The finish date in words before or behind other words; empty where there are none. */
  String spokenFinish(String before, long ticks, String after) {
    return calendar.map(dates -> before + spoken(dates.finishDate(ticks)) + after).orElse("");
  }

  /** The date on which work at a time starts, likewise. */
  String spokenStart(String before, long ticks, String after) {
    return calendar.map(dates -> before + spoken(dates.startDate(ticks)) + after).orElse("");
  }

  /** How many calendar days a finish is after a date that is due; empty without dates. */
  Optional<Integer> daysAfter(Due due, long ticks) {
    return due.date()
        .flatMap(
            date ->
                calendar.map(
                    dates -> (int) ChronoUnit.DAYS.between(date, dates.finishDate(ticks))));
  }

  /** Finish dates below each other, without the year where none can be taken for another. */
  List<String> column(Collection<Long> ticks) {
    WorkingCalendar dates = calendar.orElseThrow();
    List<LocalDate> finishes = ticks.stream().map(dates::finishDate).toList();
    LocalDate first = finishes.stream().min(LocalDate::compareTo).orElseThrow();
    LocalDate last = finishes.stream().max(LocalDate::compareTo).orElseThrow();
    boolean plain = last.isBefore(first.plusMonths(PLAIN_MONTHS));
    return finishes.stream()
        .map(date -> plain ? dayAndMonth(date) : dayAndMonth(date) + " " + date.getYear())
        .toList();
  }

  /** {@code Wed 2 Dec 2026}. */
  static String spoken(LocalDate date) {
    return dayAndMonth(date).replace("  ", " ") + " " + date.getYear();
  }

  /** Days of the week: {@code Mon to Fri}, or one by one. */
  static String weekdays(Collection<DayOfWeek> days) {
    List<String> names = days.stream().sorted().map(Dates::name).toList();
    int first = days.stream().mapToInt(DayOfWeek::getValue).min().orElseThrow();
    int last = days.stream().mapToInt(DayOfWeek::getValue).max().orElseThrow();
    boolean inOneRow = last - first + 1 == days.size();
    return inOneRow && days.size() > 2
        ? names.get(0) + " to " + names.get(names.size() - 1)
        : String.join(" ", names);
  }

  private static String dayAndMonth(LocalDate date) {
    String month = date.getMonth().getDisplayName(TextStyle.SHORT, Locale.ENGLISH);
    String day = String.format(Locale.ROOT, "%2d", date.getDayOfMonth());
    return name(date.getDayOfWeek()) + " " + day + " " + month;
  }

  private static String name(DayOfWeek day) {
    return day.getDisplayName(TextStyle.SHORT, Locale.ENGLISH);
  }
}
