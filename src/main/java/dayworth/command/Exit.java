package dayworth.command;

/** Exit statuses. */
final class Exit {

  static final int DONE = 0;

  /** The question has no answer, or a check failed. */
  static final int NO_ANSWER = 1;

  static final int BAD_INPUT = 2;
  static final int INTERNAL = 3;

  private Exit() {}
}
