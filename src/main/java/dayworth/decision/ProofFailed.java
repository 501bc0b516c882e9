package dayworth.decision;

/** A check refuted what was computed: there is no answer, and the message says where. */
public final class ProofFailed extends RuntimeException {

  private static final long serialVersionUID = 1;

  ProofFailed(String where, String why) {
    super(where + ": " + why);
  }
}
