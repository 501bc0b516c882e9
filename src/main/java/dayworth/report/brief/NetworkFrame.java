package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.network.Timing;
import java.util.List;

/**
 * The times of the boxes at one finish, in ticks, by their order in the picture.
 *
 * @param finish of the project
 * @param start where each stands
 * @param early its early start
 * @param late its late start
 * @param duration how long it takes
 */
record NetworkFrame(long finish, long[] start, long[] early, long[] late, long[] duration) {

  static NetworkFrame of(BriefAnswer.State state, List<Integer> shown) {
    Timing timing = state.timing();
    return new NetworkFrame(
        timing.finish(),
        shown.stream().mapToLong(timing::start).toArray(),
        shown.stream().mapToLong(timing::earlyStart).toArray(),
        shown.stream().mapToLong(timing::lateStart).toArray(),
        shown.stream().mapToLong(i -> timing.plan().duration(i)).toArray());
  }

  long end(int box) {
    return start[box] + duration[box];
  }

  boolean isCritical(int box) {
    return early[box] == late[box];
  }
}
