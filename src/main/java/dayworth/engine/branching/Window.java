package dayworth.engine.branching;

/**
 * When a moment may come, in ticks after the project's start; both ends included.
 *
 * @param least at least 0
 */
public record Window(long least, long most) {

  public Window {
    if (least > most) {
      throw new IllegalArgumentException("a window ends before it begins");
    }
  }

  boolean holds(long time) {
    return least <= time && time <= most;
  }

  /** What is left of it after a time, that time not included. */
  Window after(long time) {
    return new Window(time + 1, most);
  }

  /** What is left of it up to a time, that time included. */
  Window upTo(long time) {
    return new Window(least, time);
  }
}
