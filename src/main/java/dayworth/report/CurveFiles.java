package dayworth.report;

import dayworth.decision.CurveAnswer;
import java.nio.charset.StandardCharsets;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** The files of {@code dayworth curve} without its pictures. */
public final class CurveFiles {

  private CurveFiles() {}

  /**
   * The files' content by their names, in the order in which they are spoken of.
   *
   * @param programVersion stands in result.json
   */
  public static Map<String, byte[]> of(CurveAnswer answer, String programVersion) {
    Map<String, byte[]> files = new LinkedHashMap<>();
    files.put("curve.csv", bytes(CurveTable.of(answer)));
    files.put("steps.csv", bytes(StepsTable.of(answer)));
    files.put("plan.csv", bytes(PlanTable.of(answer)));
    files.put("crosscheck.csv", bytes(CrosscheckTable.of(answer)));
    files.put("result.json", bytes(ResultJson.ofCurve(answer, programVersion)));
    return Collections.unmodifiableMap(files);
  }

  private static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }
}
