package dayworth.report;

import dayworth.buildup.Caution;
import dayworth.buildup.Pattern;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * What is said beside a pattern that asks for care, with the published figures and where they are
 * from. Nothing here calls a pattern lawful or safe.
 */
public final class CautionText {

  /** Whose decision it is. */
  public static final String WHO_DECIDES =
      "These are published findings, not a judgement of any pattern. Local working-time rules,"
          + " agreements and the competent person decide what may be worked, and how.";

  private static final String DEMBE = "(Dembe et al. 2005, Occup Environ Med 62:588-597)";

  private CautionText() {}

  /** All that a pattern asks care for; empty where that is nothing. */
  static Optional<String> of(Pattern pattern, List<Caution> cautions) {
    return cautions.isEmpty()
        ? Optional.empty()
        : Optional.of(
            cautions.stream()
                .map(caution -> of(caution, pattern))
                .collect(
                    Collectors.joining(
                        "; ", "Caution, " + Wording.safe(pattern.name()) + ": ", ".")));
  }

  /** What was found, in words that follow a colon. */
  public static String of(Caution caution, Pattern pattern) {
    String hours = WayFigures.number(pattern.hoursPerWeek()).toPlainString();
    return switch (caution) {
      case LONG_WEEK ->
          hours
              + " hours a week are more than 48, the average that Directive 2003/88/EC sets as a"
              + " limit; in jobs with overtime the injury hazard was 61 % higher "
              + DEMBE;
      case VERY_LONG_WEEK ->
          "at 60 hours a week or more the injury hazard was 23 % higher " + DEMBE;
      case LONG_DAYS ->
          "days of "
              + WayFigures.number(pattern.hoursPerDay()).toPlainString()
              + " hours; at 12 hours a day or more the injury hazard was 37 % higher "
              + DEMBE;
      case NO_REST_DAY ->
          "no day of rest; Directive 2003/88/EC sets a weekly rest, and research supports at least"
              + " one free day a week (a review of studies, read at second hand)";
      case LONG_SPELL ->
          "spells of more than four weeks; a 50-hour week was found to yield no more than 40 hours"
              + " after about 7 weeks, a 60-hour week after about 9 (Business Roundtable 1980, read"
              + " at second hand)";
      case LATE_SHIFT ->
          "where the larger crew works late, accident and injury rates were 18 % higher on evening"
              + " shifts and 30 % on night shifts than by day (OSHA's figures, read at second hand)";
    };
  }
}
