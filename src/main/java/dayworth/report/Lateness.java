package dayworth.report;

import dayworth.contract.Due;
import dayworth.contract.Per;
import dayworth.decision.Case;
import dayworth.decision.Finish;
import java.math.BigDecimal;
import java.util.Optional;

/** How late finishes are against the contract finish; below zero if they are early. */
final class Lateness {

  private final Case of;
  private final Optional<Due> due;
  private final Dates dates;

  Lateness(Case of) {
    this.of = of;
    this.due = of.terms().contractFinish();
    this.dates = new Dates(of);
  }

  boolean isKnown() {
    return due.isPresent();
  }

  /** Whether people count it in calendar days: dates are known and the damages go by them. */
  boolean isByDate() {
    return dates.areKnown()
        && (of.terms().damages().per().isByDate() || of.terms().damages().rate().isZero());
  }

  /** In time units. */
  Optional<BigDecimal> units(Finish finish) {
    return due.map(by -> of.network().scale().units(finish.duration() - by.ticks()));
  }

  /** In calendar days; empty without dates. */
  Optional<Integer> calendarDays(Finish finish) {
    return due.flatMap(by -> dates.daysAfter(by, finish.duration()));
  }

  /** What people call what is counted. */
  String name() {
    return (isByDate() ? "calendar days" : of.unit().word() + "s") + " late";
  }

  /** {@code 14}, {@code 7 early}. */
  String text(Finish finish) {
    BigDecimal late =
        isByDate()
            ? calendarDays(finish).map(BigDecimal::valueOf).orElseThrow()
            : units(finish).orElseThrow();
    return late.signum() < 0 ? Wording.grouped(late.negate()) + " early" : Wording.grouped(late);
  }

  /** What a rate is for one of. */
  static String one(Case of, Per per) {
    return switch (per) {
      case UNIT -> (of.unit().word().equals("hour") ? "an " : "a ") + of.unit().word();
      case CALENDAR_DAY -> "a calendar day";
      case WEEK -> "a calendar week";
    };
  }
}
