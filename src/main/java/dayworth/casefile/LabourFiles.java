package dayworth.casefile;

import dayworth.buildup.OutputLoss;
import dayworth.buildup.Pattern;
import dayworth.buildup.PayLadder;
import dayworth.value.Quantity;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What labour.csv, patterns.csv, pay.csv and output_loss.csv say together.
 *
 * @param rows of labour.csv
 * @param patterns the normal one first; without one nothing can be built up
 */
record LabourFiles(List<LabourRow> rows, List<Pattern> patterns) {

  /** The texts of the files other than labour.csv. */
  record Texts(Optional<String> patterns, Optional<String> pay, Optional<String> losses) {}

  /**
   * Reads them; all faults are reported.
   *
   * @param factor what all losses are multiplied by
   */
  static LabourFiles read(
      LabourTable labour, ActivityIds ids, Texts texts, Quantity factor, Findings findings) {
    Optional<List<PatternRow>> rows = PatternTable.read(texts.patterns(), findings);
    PatternNames names = new PatternNames(rows, findings);
    Map<String, PayLadder> pay = PayTable.read(names, texts.pay(), findings);
    Map<String, OutputLoss> losses = LossTable.read(names, factor, texts.losses(), findings);
    rows.ifPresent(all -> warnOfSilence(all, pay, losses, findings));
    checkTogether(labour, texts, findings);
    List<Pattern> patterns = new ArrayList<>();
    for (PatternRow row : rows.orElse(List.of())) {
      row.pattern(
              pay.getOrDefault(row.name(), PayLadder.STRAIGHT),
              losses.getOrDefault(row.name(), OutputLoss.NONE))
          .ifPresent(patterns::add);
    }
    return new LabourFiles(labour.rows(ids), patterns);
  }

  private static void checkTogether(LabourTable labour, Texts texts, Findings findings) {
    if (labour.isThere() && texts.patterns().isEmpty()) {
      String right = PatternTable.FILE + " with a row for the normal pattern";
      findings.problem(
          Place.whole(LabourTable.FILE).notice("tells nothing without patterns", "", right));
    }
    if (!labour.isThere()) {
      warnOfIdle(PatternTable.FILE, texts.patterns(), findings);
      warnOfIdle(PayTable.FILE, texts.pay(), findings);
      warnOfIdle(LossTable.FILE, texts.losses(), findings);
    }
  }

  private static void warnOfIdle(String file, Optional<String> text, Findings findings) {
    if (text.isPresent()) {
      String right = "it is used with " + LabourTable.FILE;
      findings.warning(Place.whole(file).notice("changes nothing", "", right));
    }
  }

  /** What is not said is taken as nothing, which it seldom is. */
  private static void warnOfSilence(
      List<PatternRow> rows,
      Map<String, PayLadder> pay,
      Map<String, OutputLoss> losses,
      Findings findings) {
    for (PatternRow row : rows.subList(Math.min(1, rows.size()), rows.size())) {
      Place place = row.place("pattern");
      if (!losses.containsKey(row.name())) {
        String right = "rows in " + LossTable.FILE + "; without them no output is lost";
        findings.warning(place.notice("no loss of output is given", row.name(), right));
      }
      if (!pay.containsKey(row.name()) && row.isLongerThan(rows.get(0))) {
        String right = "rows in " + PayTable.FILE + "; without them all hours are straight time";
        findings.warning(place.notice("no pay for the longer hours is given", row.name(), right));
      }
      warnOfIdleSteps(row, pay.getOrDefault(row.name(), PayLadder.STRAIGHT), findings);
    }
  }

  private static void warnOfIdleSteps(PatternRow row, PayLadder ladder, Findings findings) {
    if (row.hoursPerWeek().value().isEmpty()) {
      return;
    }
    Quantity hours = Quantity.of(row.hoursPerWeek().value().get());
    for (PayLadder.Step step : ladder.steps()) {
      if (step.aboveHours().compareTo(hours) >= 0) {
        String wrong =
            "its pay above "
                + step.aboveHours()
                    .rounded(NumberCell.MOST_DECIMALS, RoundingMode.HALF_UP)
                    .toPlainString()
                + " hours is never reached";
        String right = "less in " + PayTable.FILE + ", or more here";
        findings.warning(
            row.place("hours_per_week").notice(wrong, row.hoursPerWeek().text(), right));
      }
    }
  }
}
