package dayworth.report;

/** A file that is no result of this program, or of a version that this one does not know. */
public final class NoResult extends Exception {

  private static final long serialVersionUID = 1;

  NoResult(String why) {
    super(why);
  }
}
