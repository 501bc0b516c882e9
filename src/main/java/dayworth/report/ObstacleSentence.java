package dayworth.report;

import dayworth.decision.Case;
import dayworth.engine.Curve;

/** Why the project cannot be shorter, as one sentence. */
public final class ObstacleSentence {

  private ObstacleSentence() {}

  public static String of(Case of, Curve curve) {
    return new ObstacleText(of, curve).sentence();
  }
}
