package dayworth.casefile;

import java.math.BigDecimal;

/** What a crash duration and its cost must be beside each other and beside what they shorten. */
final class CrashRules {

  private final Table table;
  private final Findings findings;

  /** The column of the crash duration. */
  private final String shortest;

  /** The column of the cost at it. */
  private final String dearest;

  /** What is shortened, in words. */
  private final String shortened;

  private boolean durationGiven;
  private boolean costGiven;

  private CrashRules(
      Table table, String shortest, String dearest, String shortened, Findings findings) {
    this.table = table;
    this.shortest = shortest;
    this.dearest = dearest;
    this.shortened = shortened;
    this.findings = findings;
  }

  /** For whole activities. */
  static CrashRules ofActivities(Table table, Findings findings) {
    return new CrashRules(table, "crash_duration", "crash_cost", "the normal duration", findings);
  }

  /** For what remains of them. */
  static CrashRules ofProgress(Table table, Findings findings) {
    return new CrashRules(
        table,
        ProgressTable.CRASH_DURATION,
        ProgressTable.CRASH_COST,
        "the remaining duration",
        findings);
  }

  /** Checks one row. */
  void check(
      Row row,
      Cell<BigDecimal> normal,
      Cell<BigDecimal> cost,
      Cell<BigDecimal> crash,
      Cell<BigDecimal> crashCost) {
    durationGiven |= crash.given();
    costGiven |= crashCost.given();
    if (table.has(shortest) && table.has(dearest)) {
      checkBothOrNeither(row, crash, crashCost);
    }
    checkAgainstNormal(row, normal, cost, crash, crashCost);
  }

  /** Says once, at the header, that one of the two columns is used without the other. */
  void reportMissingColumn() {
    if (durationGiven && !table.header().isThereOrMisspelt(dearest)) {
      reportMissing(dearest, shortest);
    }
    if (costGiven && !table.header().isThereOrMisspelt(shortest)) {
      reportMissing(shortest, dearest);
    }
  }

  private void reportMissing(String column, String other) {
    findings.problem(
        table.header().place(column).notice("missing column", "", "it is needed beside " + other));
  }

  private void checkBothOrNeither(Row row, Cell<BigDecimal> crash, Cell<BigDecimal> crashCost) {
    if (crash.given() && !crashCost.given()) {
      String right = "the cost at that duration, or neither";
      findings.problem(
          table.place(row, dearest).notice("blank beside a crash duration", "", right));
    }
    if (crashCost.given() && !crash.given()) {
      String right = "the duration at that cost, or neither";
      findings.problem(table.place(row, shortest).notice("blank beside a crash cost", "", right));
    }
  }

  private void checkAgainstNormal(
      Row row,
      Cell<BigDecimal> normal,
      Cell<BigDecimal> cost,
      Cell<BigDecimal> crash,
      Cell<BigDecimal> crashCost) {
    if (normal.value().isEmpty() || crash.value().isEmpty()) {
      return;
    }
    int longer = crash.value().get().compareTo(normal.value().get());
    if (longer > 0) {
      String right = "at most " + normal.text() + ", " + shortened;
      findings.problem(
          table.place(row, shortest).notice("longer than " + shortened, crash.text(), right));
    } else if (longer == 0 && differ(cost, crashCost)) {
      String right = cost.text() + ", or a shorter crash duration";
      findings.problem(
          table
              .place(row, dearest)
              .notice("another cost for the same duration", crashCost.text(), right));
    }
  }

  private static boolean differ(Cell<BigDecimal> one, Cell<BigDecimal> other) {
    return one.value().isPresent()
        && other.value().isPresent()
        && one.value().get().compareTo(other.value().get()) != 0;
  }
}
