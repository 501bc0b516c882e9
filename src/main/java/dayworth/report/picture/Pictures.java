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

  /** The curve as PNG and SVG; the name of each file is relative to the folder of results. */
  public static Map<String, byte[]> of(CurveAnswer answer) {
    Layout layout = Layout.of(units(answer));
    Map<String, Picture> pictures = new LinkedHashMap<>();
    pictures.put("curve", new CurvePicture(answer, layout));
    pictures.put("price", new PricePicture(answer, layout));
    pictures.put("compression-map", new CompressionMap(answer, layout));
    Map<String, CompletableFuture<byte[]>> making = new LinkedHashMap<>();
    pictures.forEach(
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

  private static double units(CurveAnswer answer) {
    long ticks = answer.rows().get(0).duration() - answer.shortest().duration();
    return answer.of().network().scale().units(ticks).doubleValue();
  }
}
