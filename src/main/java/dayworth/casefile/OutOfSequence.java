package dayworth.casefile;

import dayworth.decision.Notice;
import dayworth.decision.Status;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;

/**
 * Warns of work that has begun, or is finished, before the logic allowed it: what it should have
 * waited for is still to come. What remains of it waits for that; if nothing remains the link says
 * nothing any more.
 */
final class OutOfSequence {

  private final ReadCase read;
  private final Timing asItStands;
  private final Findings findings;
  private final Map<Integer, ProgressRow> rows = new HashMap<>();

  /** Two links between the same events are one reason to warn. */
  private final Set<Notice> warned = new HashSet<>();

  private OutOfSequence(ReadCase read, Findings findings) {
    this.read = read;
    this.findings = findings;
    this.asItStands = Timing.earliest(read.network(), Plan.allNormal(read.network()));
    read.progress().forEach(row -> rows.put(row.activity(), row));
  }

  static void report(ReadCase read, Findings findings) {
    if (read.progress().isEmpty()) {
      return;
    }
    OutOfSequence rule = new OutOfSequence(read, findings);
    read.logic().forEach(rule::report);
  }

  private void report(LinkRow link) {
    boolean toStart = link.relation().toStart();
    Status status = read.work().status(link.successor());
    boolean comes = !link.relation().fromStart() ? !isDone(link) : !hasStarted(link);
    boolean happened = status.isFinished() || (toStart && status.isInProgress());
    if (comes && happened && earliest(link) > 0) {
      warn(link, status.isFinished() && !toStart);
    }
  }

  private boolean isDone(LinkRow link) {
    return read.work().status(link.predecessor()).isFinished();
  }

  private boolean hasStarted(LinkRow link) {
    return read.work().status(link.predecessor()).started().isPresent();
  }

  /** The earliest time that the link allows, as the work stands. */
  private long earliest(LinkRow link) {
    int from = link.predecessor();
    long event =
        link.relation().fromStart() ? asItStands.earlyStart(from) : asItStands.earlyFinish(from);
    return event + read.network().scale().ticks(link.lag());
  }

  private void warn(LinkRow link, boolean atFinish) {
    ProgressRow row = rows.get(link.successor());
    String before = read.activities().get(link.predecessor()).id();
    String event = link.relation().fromStart() ? " has started" : " is finished";
    String wrong = (atFinish ? "finished" : "started") + " before " + before + event;
    Cell<?> date = atFinish ? row.finished() : row.started();
    String right =
        row.isInProgress()
            ? "out of sequence: what remains waits for " + before
            : "out of sequence: nothing of it waits for " + before + " any more";
    Place place = row.place(atFinish ? ProgressTable.FINISHED : ProgressTable.STARTED);
    Notice notice = place.notice(wrong, date.text(), right);
    if (warned.add(notice)) {
      findings.warning(notice);
    }
  }
}
