package dayworth.report;

import dayworth.decision.BuildUpAnswer;
import java.nio.charset.StandardCharsets;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** The files of {@code dayworth buildup} without its pictures. */
public final class BuildUpFiles {

  private BuildUpFiles() {}

  /**
   * The files' content by their names, in the order in which they are spoken of.
   *
   * @param programVersion stands in result.json
   */
  public static Map<String, byte[]> of(BuildUpAnswer answer, String programVersion) {
    Map<String, byte[]> files = new LinkedHashMap<>();
    files.put("buildup.csv", BuildUpTable.of(answer).getBytes(StandardCharsets.UTF_8));
    files.put(
        "result.json",
        ResultJson.ofBuildUp(answer, programVersion).getBytes(StandardCharsets.UTF_8));
    return Collections.unmodifiableMap(files);
  }
}
