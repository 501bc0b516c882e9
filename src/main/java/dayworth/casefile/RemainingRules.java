package dayworth.casefile;

import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;

/** What may remain of an activity that has not started, is in progress, or is finished. */
final class RemainingRules {

  private final Table table;
  private final List<ActivityRow> activities;
  private final Findings findings;
  private final CrashRules crashRules;
  private boolean remainingIsNeeded;

  RemainingRules(Table table, List<ActivityRow> activities, Findings findings) {
    this.table = table;
    this.activities = activities;
    this.findings = findings;
    this.crashRules = CrashRules.ofProgress(table, findings);
  }

  /** Checks one row. */
  void check(Row row, ProgressRow read) {
    if (read.finished().given()) {
      String right = "blank, or no date under finished";
      if (read.remaining().value().filter(rest -> rest.signum() > 0).isPresent()) {
        refuse(row, ProgressTable.REMAINING, read.remaining(), "finished work has a rest", right);
      }
      refuseCrash(row, read, "finished work has a rest", right);
    } else if (!read.started().given()) {
      String wrong = "a rest of work that has not started";
      String right = "the date under started, or blank: then it is as in " + ActivityTable.FILE;
      refuse(row, ProgressTable.REMAINING, read.remaining(), wrong, right);
      refuseCrash(row, read, wrong, right);
    } else {
      checkRest(row, read, activities.get(read.activity()));
    }
  }

  /** Says once, at the header, which columns are used without another that they need. */
  void reportMissingColumns() {
    crashRules.reportMissingColumn();
    if (remainingIsNeeded && !table.header().isThereOrMisspelt(ProgressTable.REMAINING)) {
      findings.problem(
          table
              .header()
              .place(ProgressTable.REMAINING)
              .notice("missing column", "", "it is needed for work in progress"));
    }
  }

  private void refuseCrash(Row row, ProgressRow read, String wrong, String right) {
    refuse(row, ProgressTable.CRASH_DURATION, read.crash(), wrong, right);
    refuse(row, ProgressTable.CRASH_COST, read.crashCost(), wrong, right);
  }

  private void refuse(Row row, String column, Cell<?> cell, String wrong, String right) {
    if (cell.value().isPresent()) {
      findings.problem(table.place(row, column).notice(wrong, cell.text(), right));
    }
  }

  private void checkRest(Row row, ProgressRow read, ActivityRow whole) {
    remainingIsNeeded = true;
    if (whole.normal().filter(normal -> normal.signum() == 0).isPresent()) {
      String right = "its date under finished too; it takes no time";
      findings.problem(
          table.place(row, ProgressTable.FINISHED).notice("a milestone in progress", "", right));
      return;
    }
    if (table.has(ProgressTable.REMAINING) && !read.remaining().given()) {
      String right = "how long the rest takes, or the date under finished";
      findings.problem(
          table.place(row, ProgressTable.REMAINING).notice("blank for started work", "", right));
    }
    warnOfOverrun(row, read, whole);
    crashRules.check(row, read.remaining(), costToGo(read, whole), read.crash(), read.crashCost());
  }

  private void warnOfOverrun(Row row, ProgressRow read, ActivityRow whole) {
    if (read.remaining().value().isPresent()
        && whole.normal().isPresent()
        && read.remaining().value().get().compareTo(whole.normal().get()) > 0) {
      String right = "its cost to go is more than its normal cost, in proportion";
      String wrong = "more than the normal duration, " + whole.normal().get().toPlainString();
      findings.warning(
          table.place(row, ProgressTable.REMAINING).notice(wrong, read.remaining().text(), right));
    }
  }

  /** As a cell, to the cent: what a crash cost at the remaining duration would have to be. */
  private static Cell<BigDecimal> costToGo(ProgressRow read, ActivityRow whole) {
    Optional<BigDecimal> cents =
        read.remaining()
            .value()
            .filter(rest -> whole.normal().isPresent() && whole.normalCost().isPresent())
            .map(rest -> costToGo(rest, whole).cents());
    return new Cell<>(cents.map(BigDecimal::toPlainString).orElse(""), cents);
  }

  private static Money costToGo(BigDecimal rest, ActivityRow whole) {
    Money share = Money.fraction(inFinest(rest), inFinest(whole.normal().orElseThrow()));
    return Money.of(whole.normalCost().orElseThrow()).times(share);
  }

  private static BigInteger inFinest(BigDecimal units) {
    return units.movePointRight(TimeScale.MOST_DECIMALS).toBigIntegerExact();
  }
}
