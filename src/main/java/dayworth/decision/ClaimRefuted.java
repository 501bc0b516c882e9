package dayworth.decision;

/** A claim on which others rest does not hold, so that these cannot be recounted. */
public final class ClaimRefuted extends Exception {

  private static final long serialVersionUID = 1;

  private final transient Fault fault;

  public ClaimRefuted(String place, String found, String right) {
    super(place + ": found " + found + "; " + right);
    this.fault = new Fault(place, found, right);
  }

  public Fault fault() {
    return fault;
  }
}
