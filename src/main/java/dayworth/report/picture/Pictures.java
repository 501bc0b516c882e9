package dayworth.report.picture;

import dayworth.decision.CurveAnswer;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.CompletableFuture;

/** The pictures of an answer as files. */
public final class Pictures {

  /** Every name that a picture may have. */
  public static final Set<String> NAMES =
      Set.of(
          "charts/curve.png",
          "charts/curve.svg",
          "charts/price.png",
          "charts/price.svg",
          "charts/compression-map.png",
          "charts/compression-map.svg");

  private Pictures() {}

  /**
   * The curve, the prices and the compression map, each as PNG and SVG, by names relative to the
   * folder of results: {@link #NAMES}. Each file is made by itself, so that all processors of the
   * machine have work.
   */
  public static Map<String, byte[]> of(CurveAnswer answer) {
    Map<String, CompletableFuture<byte[]>> making = new LinkedHashMap<>();
    drawn(answer)
        .forEach(
            (name, picture) -> {
              making.put(
                  "charts/" + name + ".png",
                  CompletableFuture.supplyAsync(() -> Rendering.png(picture)));
              making.put(
                  "charts/" + name + ".svg",
                  CompletableFuture.supplyAsync(() -> Rendering.svg(picture)));
            });
    Map<String, byte[]> files = new LinkedHashMap<>();
    making.forEach((name, bytes) -> files.put(name, bytes.join()));
    return files;
  }

  static Map<String, Picture> drawn(CurveAnswer whole) {
    CurveAnswer answer = whole.shown();
    Layout layout = Layout.of(units(answer));
    Map<String, Picture> pictures = new LinkedHashMap<>();
    pictures.put("curve", new CurvePicture(answer, layout));
    pictures.put("price", new PricePicture(answer, layout));
    pictures.put("compression-map", new CompressionMap(answer, layout));
    return pictures;
  }

  private static double units(CurveAnswer answer) {
    long ticks = answer.rows().get(0).duration() - answer.shortest().duration();
    return answer.of().network().scale().units(ticks).doubleValue();
  }
}
