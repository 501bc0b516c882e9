package dayworth.report;

import dayworth.decision.CurveAnswer;
import dayworth.decision.MeetAnswer;
import java.nio.charset.StandardCharsets;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** The files of {@code dayworth curve} and {@code dayworth meet} without their pictures. */
public final class CurveFiles {

  private CurveFiles() {}

  /**
   * The files' content by their names, in the order in which they are spoken of.
   *
   * @param programVersion stands in result.json
   */
  public static Map<String, byte[]> of(CurveAnswer answer, String programVersion) {
    Map<String, byte[]> files = new LinkedHashMap<>();
    addTables(answer, files);
    files.put("result.json", bytes(ResultJson.ofCurve(answer, programVersion)));
    return Collections.unmodifiableMap(files);
  }

  /** The files of {@code dayworth meet} without its pictures, likewise. */
  public static Map<String, byte[]> of(MeetAnswer answer, String programVersion) {
    Map<String, byte[]> files = new LinkedHashMap<>();
    addTables(answer.curve(), files);
    files.put("proof.csv", bytes(ProofTable.of(answer)));
    files.put("result.json", bytes(ResultJson.ofMeet(answer, programVersion)));
    return Collections.unmodifiableMap(files);
  }

  private static void addTables(CurveAnswer answer, Map<String, byte[]> files) {
    files.put("curve.csv", bytes(CurveTable.of(answer)));
    files.put("steps.csv", bytes(StepsTable.of(answer)));
    files.put("plan.csv", bytes(PlanTable.of(answer)));
    files.put("crosscheck.csv", bytes(CrosscheckTable.of(answer)));
  }

  private static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }
}
