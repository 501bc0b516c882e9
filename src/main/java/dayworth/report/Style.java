package dayworth.report;

import java.util.Map;

/** Whether lines for a terminal carry codes for bold. */
public enum Style {
  /** No codes at all. */
  PLAIN,
  /** Bold by ANSI codes. */
  BOLD;

  private static final String BOLD_ON = "\u001b[1m";
  private static final String BOLD_OFF = "\u001b[0m";

  /**
   * Bold only where output is a terminal that understands codes and its user did not refuse them.
   *
   * @param environment the variables TERM and NO_COLOR are looked at
   */
  public static Style of(boolean terminal, Map<String, String> environment) {
    boolean dumb = environment.getOrDefault("TERM", "").equals("dumb");
    boolean refused = !environment.getOrDefault("NO_COLOR", "").isEmpty();
    return terminal && !dumb && !refused ? BOLD : PLAIN;
  }

  String bold(String line) {
    return this == BOLD ? BOLD_ON + line + BOLD_OFF : line;
  }
}
