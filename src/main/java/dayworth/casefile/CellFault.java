package dayworth.casefile;

/** A cell's text cannot be read as what its column wants. */
final class CellFault extends Exception {

  private static final long serialVersionUID = 1L;

  private final String wrong;
  private final String right;

  /**
   * Says so.
   *
   * @param wrong what is wrong, in a few words without a full stop
   * @param right what would be right
   */
  CellFault(String wrong, String right) {
    super(wrong, null, false, false);
    this.wrong = wrong;
    this.right = right;
  }

  String wrong() {
    return wrong;
  }

  String right() {
    return right;
  }
}
