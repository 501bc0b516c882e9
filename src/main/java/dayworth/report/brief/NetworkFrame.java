package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.network.Timing;
import java.util.List;

/** The times of the boxes at one finish, in ticks, by their order in the picture. */
final class NetworkFrame {

  private final long finish;
  private final long[] start;
  private final long[] early;
  private final long[] late;
  private final long[] duration;

  /**
   * Times of boxes.
   *
   * @param finish of the project
   * @param start where each stands
   * @param early its early start
   * @param late its late start
   * @param duration how long it takes
   */
  NetworkFrame(long finish, long[] start, long[] early, long[] late, long[] duration) {
    this.finish = finish;
    this.start = start.clone();
    this.early = early.clone();
    this.late = late.clone();
    this.duration = duration.clone();
  }

  static NetworkFrame of(BriefAnswer.State state, List<Integer> shown) {
    Timing timing = state.timing();
    return new NetworkFrame(
        timing.finish(),
        shown.stream().mapToLong(timing::start).toArray(),
        shown.stream().mapToLong(timing::earlyStart).toArray(),
        shown.stream().mapToLong(timing::lateStart).toArray(),
        shown.stream().mapToLong(i -> timing.plan().duration(i)).toArray());
  }

  int boxes() {
    return start.length;
  }

  long finish() {
    return finish;
  }

  long start(int box) {
    return start[box];
  }

  long end(int box) {
    return start[box] + duration[box];
  }

  long early(int box) {
    return early[box];
  }

  long late(int box) {
    return late[box];
  }

  long duration(int box) {
    return duration[box];
  }

  boolean isCritical(int box) {
    return early[box] == late[box];
  }
}
