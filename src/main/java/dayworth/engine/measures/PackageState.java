package dayworth.engine.measures;

/** What a share of all plans says of a package of measures. */
public enum PackageState {
  /** It may be used or not; each activity that uses it pays a share of its cost. */
  UNDECIDED,
  /** Its cost is paid, so each of its measures may be used. */
  PAID,
  /** None of its measures is used. */
  NOT_USED
}
