package dayworth.decision;

import java.time.LocalDate;
import java.util.List;

/**
 * How far the work is at the end of the data date.
 *
 * @param dataDate the day at whose end time begins to count
 * @param statuses of all activities, by their index
 */
public record Progress(LocalDate dataDate, List<Status> statuses) {

  public Progress {
    statuses = List.copyOf(statuses);
  }

  /** How many activities are finished. */
  public int finished() {
    return (int) statuses.stream().filter(Status::isFinished).count();
  }

  /** How many have started and are not finished. */
  public int inProgress() {
    return (int) statuses.stream().filter(Status::isInProgress).count();
  }
}
