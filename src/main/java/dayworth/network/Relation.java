package dayworth.network;

/** Which event of the successor waits for which event of the predecessor. */
public enum Relation {
  /** Finish to start: the successor starts at least the lag after the predecessor finishes. */
  FS(false, true),
  /** Start to start. */
  SS(true, true),
  /** Finish to finish. */
  FF(false, false),
  /** Start to finish. */
  SF(true, false);

  private final boolean fromStart;
  private final boolean toStart;

  Relation(boolean fromStart, boolean toStart) {
    this.fromStart = fromStart;
    this.toStart = toStart;
  }

  /** Whether the link leaves the predecessor's start (otherwise its finish). */
  public boolean fromStart() {
    return fromStart;
  }

  /** Whether the link binds the successor's start (otherwise its finish). */
  public boolean toStart() {
    return toStart;
  }
}
