package dayworth.report.picture;

import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import dayworth.engine.Curve;
import java.math.BigDecimal;
import java.util.Optional;

/**
 * The parts of a finish's money as the pictures show them: without the direct cost that the curve's
 * first row has, and without fixed cost, both of which are in every finish alike.
 */
final class Amounts {

  private final BigDecimal firstDirect;
  private final BigDecimal fixed;
  private final Optional<Curve> relaxed;

  Amounts(CurveAnswer answer) {
    Finish first = answer.rows().get(0);
    firstDirect = first.direct().cents();
    fixed = first.other().fixed().cents();
    relaxed = answer.relaxed();
  }

  /** Direct cost above that of the first row. */
  BigDecimal extraDirect(Finish finish) {
    return finish.direct().cents().subtract(firstDirect);
  }

  /** The same of what direct cost is at least; nothing where that is not known. */
  BigDecimal leastExtraDirect(Finish finish) {
    return relaxed
        .map(
            curve ->
                curve
                    .costAt(Math.max(curve.shortest(), finish.duration()))
                    .cents()
                    .subtract(firstDirect))
        .orElse(BigDecimal.ZERO);
  }

  BigDecimal timeRelated(Finish finish) {
    return finish.other().timeRelated().cents().add(finish.running().cents());
  }

  BigDecimal damages(Finish finish) {
    return finish.other().damages().cents();
  }

  /** Money that comes in is below zero. */
  BigDecimal bonus(Finish finish) {
    return finish.other().bonus().cents().negate();
  }

  /** All the money that depends on the finish. */
  BigDecimal total(Finish finish) {
    return finish.total().subtract(leftOut());
  }

  /** What every finish has in common. */
  BigDecimal leftOut() {
    return firstDirect.add(fixed);
  }

  boolean hasFixed() {
    return fixed.signum() != 0;
  }
}
