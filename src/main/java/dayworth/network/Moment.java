package dayworth.network;

/**
 * The start or the finish of an activity, or the start of the project.
 *
 * @param activity index in the network; -1 for the project's start
 * @param isFinish whether it is the activity's finish
 */
public record Moment(int activity, boolean isFinish) {

  /** Time zero. */
  public static final Moment PROJECT_START = new Moment(-1, false);

  public static Moment startOf(int activity) {
    return new Moment(activity, false);
  }

  public static Moment finishOf(int activity) {
    return new Moment(activity, true);
  }

  public boolean isProjectStart() {
    return activity < 0;
  }
}
