package dayworth.decision;

import dayworth.engine.Curve;

/** A finish was asked for that no plan meets; the curve tells the nearest and what stops it. */
public final class FinishTooEarly extends Exception {

  private static final long serialVersionUID = 1;

  private final transient Case of;
  private final transient Curve curve;
  private final long asked;

  FinishTooEarly(Case of, Curve curve, long asked) {
    super("no plan finishes so early");
    this.of = of;
    this.curve = curve;
    this.asked = asked;
  }

  public Case of() {
    return of;
  }

  public Curve curve() {
    return curve;
  }

  /** The duration that was asked for, ticks. */
  public long asked() {
    return asked;
  }
}
