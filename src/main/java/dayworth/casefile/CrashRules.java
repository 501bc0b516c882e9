package dayworth.casefile;

import java.math.BigDecimal;

/** What crash_duration and crash_cost must be beside each other and beside the normal way. */
final class CrashRules {

  private static final String DURATION = "crash_duration";
  private static final String COST = "crash_cost";

  private final Table table;
  private final Findings findings;
  private boolean durationGiven;
  private boolean costGiven;

  CrashRules(Table table, Findings findings) {
    this.table = table;
    this.findings = findings;
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
    if (table.has(DURATION) && table.has(COST)) {
      checkBothOrNeither(row, crash, crashCost);
    }
    checkAgainstNormal(row, normal, cost, crash, crashCost);
  }

  /** Says once, at the header, that one of the two columns is used without the other. */
  void reportMissingColumn() {
    if (durationGiven && !table.header().isThereOrMisspelt(COST)) {
      reportMissing(COST, DURATION);
    }
    if (costGiven && !table.header().isThereOrMisspelt(DURATION)) {
      reportMissing(DURATION, COST);
    }
  }

  private void reportMissing(String column, String other) {
    findings.problem(
        table.header().place(column).notice("missing column", "", "it is needed beside " + other));
  }

  private void checkBothOrNeither(Row row, Cell<BigDecimal> crash, Cell<BigDecimal> crashCost) {
    if (crash.given() && !crashCost.given()) {
      String right = "the cost at that duration, or neither";
      findings.problem(table.place(row, COST).notice("blank beside a crash duration", "", right));
    }
    if (crashCost.given() && !crash.given()) {
      String right = "the duration at that cost, or neither";
      findings.problem(table.place(row, DURATION).notice("blank beside a crash cost", "", right));
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
      String right = "at most " + normal.text() + ", the normal duration";
      findings.problem(
          table
              .place(row, DURATION)
              .notice("longer than the normal duration", crash.text(), right));
    } else if (longer == 0 && differ(cost, crashCost)) {
      String right = cost.text() + ", or a shorter crash duration";
      findings.problem(
          table
              .place(row, COST)
              .notice("another cost for the same duration", crashCost.text(), right));
    }
  }

  private static boolean differ(Cell<BigDecimal> one, Cell<BigDecimal> other) {
    return one.value().isPresent()
        && other.value().isPresent()
        && one.value().get().compareTo(other.value().get()) != 0;
  }
}
