package dayworth.report;

import java.io.IOException;
import java.util.concurrent.locks.ReentrantLock;

/** Makes the end of the program, as by an interrupt from the keyboard, wait for something short. */
final class EndOfProgram {

  private static final ReentrantLock BUSY = new ReentrantLock();

  /** Something that must not be cut off. */
  @FunctionalInterface
  interface Work {
    void run() throws IOException;
  }

  private EndOfProgram() {}

  /**
   * Does the work; the program does not end by itself before it is done.
   *
   * @throws IOException if the work throws it, or the program is ending already
   */
  static void waitsFor(Work work) throws IOException {
    // The hook keeps the lock: nothing new begins while the program ends.
    Thread hook = new Thread(BUSY::lock, "end of program");
    try {
      Runtime.getRuntime().addShutdownHook(hook);
    } catch (IllegalStateException ending) {
      throw new IOException("the program is being stopped", ending);
    }
    BUSY.lock();
    try {
      work.run();
    } finally {
      BUSY.unlock();
      release(hook);
    }
  }

  private static void release(Thread hook) {
    try {
      Runtime.getRuntime().removeShutdownHook(hook);
    } catch (IllegalStateException ending) {
      // The hook has run or is about to; it has nothing to wait for.
    }
  }
}
