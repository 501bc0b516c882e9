package dayworth.decision;

/** What a duration of one means. */
public enum TimeUnit {
  DAY("day"),
  WEEK("week"),
  HOUR("hour"),
  SHIFT("shift");

  private final String word;

  TimeUnit(String word) {
    this.word = word;
  }

  /** The unit's name as it stands in a case, for one of it. */
  public String word() {
    return word;
  }
}
