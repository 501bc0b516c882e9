package dayworth.command;

import dayworth.decision.Watcher;
import java.io.PrintWriter;
import java.util.Locale;
import java.util.Timer;
import java.util.TimerTask;

/**
 * One line on a terminal that tells what a run is doing, once it takes longer than two seconds; it
 * is wiped out before the answer.
 */
final class ProgressLine implements Watcher, AutoCloseable {

  private static final long PATIENCE = 2_000;
  private static final long PACE = 500;
  private static final String WIPE = "\r\u001b[K";

  private final PrintWriter err;
  private final Timer timer = new Timer("progress", true);
  private final long started = System.nanoTime();
  private volatile String doing = "reading";
  private boolean shown;

  private ProgressLine(PrintWriter err) {
    this.err = err;
  }

  /** Starts to wait; on anything but a terminal nothing is ever shown. */
  static ProgressLine start(PrintWriter err, boolean terminal) {
    ProgressLine line = new ProgressLine(err);
    if (terminal) {
      TimerTask show =
          new TimerTask() {
            @Override
            public void run() {
              line.show();
            }
          };
      line.timer.schedule(show, PATIENCE, PACE);
    }
    return line;
  }

  @Override
  public void now(String what) {
    doing = what;
  }

  private synchronized void show() {
    long seconds = (System.nanoTime() - started) / 1_000_000_000;
    err.print(WIPE + String.format(Locale.ROOT, "  %d s: %s", seconds, doing));
    err.flush();
    shown = true;
  }

  @Override
  public synchronized void close() {
    timer.cancel();
    if (shown) {
      err.print(WIPE);
      err.flush();
    }
  }
}
