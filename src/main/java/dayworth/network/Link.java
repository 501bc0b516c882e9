package dayworth.network;

/**
 * The successor's event comes at least {@code lag} ticks after the predecessor's.
 *
 * @param predecessor index of an activity
 * @param successor index of another activity
 * @param lag ticks; may be negative
 */
public record Link(int predecessor, int successor, Relation relation, long lag) {

  /** A plain finish-to-start link. */
  public static Link finishToStart(int predecessor, int successor) {
    return new Link(predecessor, successor, Relation.FS, 0);
  }

  /**
   * The least difference of start times, given both durations (the work is contiguous).
   *
   * @return how long after the predecessor's start the successor's start must come, in ticks
   */
  public long betweenStarts(long predecessorDuration, long successorDuration) {
    long from = relation.fromStart() ? 0 : predecessorDuration;
    long to = relation.toStart() ? 0 : successorDuration;
    return from + lag - to;
  }
}
