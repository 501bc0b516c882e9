package dayworth.report;

import dayworth.decision.WeighAnswer;
import java.nio.charset.StandardCharsets;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** The files of {@code dayworth weigh}. */
public final class WeighFiles {

  private WeighFiles() {}

  /**
   * The files' content by their names, in the order in which they are spoken of.
   *
   * @param programVersion stands in result.json
   */
  public static Map<String, byte[]> of(WeighAnswer answer, String programVersion) {
    Map<String, byte[]> files = new LinkedHashMap<>();
    files.put("weigh.csv", WeighTable.of(answer).getBytes(StandardCharsets.UTF_8));
    files.put(
        "result.json", ResultJson.ofWeigh(answer, programVersion).getBytes(StandardCharsets.UTF_8));
    return Collections.unmodifiableMap(files);
  }
}
