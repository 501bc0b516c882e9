package dayworth.contract;

/** How damages per week count a week that is not full. */
public enum PartWeek {
  /** A day is the seventh of a week. */
  PRO_RATA,
  /** A begun week is a whole one; weeks begin when the grace ends. */
  WHOLE
}
