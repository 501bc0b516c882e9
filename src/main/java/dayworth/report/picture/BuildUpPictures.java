package dayworth.report.picture;

import dayworth.decision.BuildUpAnswer;
import java.util.Map;
import java.util.Set;

/** The picture of a build-up as files. */
public final class BuildUpPictures {

  private static final String PNG = "charts/buildup.png";
  private static final String SVG = "charts/buildup.svg";

  /** Every name that a picture may have. */
  public static final Set<String> NAMES = Set.of(PNG, SVG);

  private BuildUpPictures() {}

  /** The picture as PNG and SVG, by names relative to the folder of results: {@link #NAMES}. */
  public static Map<String, byte[]> of(BuildUpAnswer answer) {
    Picture picture = new BuildUpPicture(answer);
    return Map.of(PNG, Rendering.png(picture), SVG, Rendering.svg(picture));
  }
}
