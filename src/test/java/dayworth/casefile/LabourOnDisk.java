package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

/** A case with labour that is sound, of which a test changes one file. */
final class LabourOnDisk {

  static final String ACTIVITIES =
      """
      id,normal_duration,normal_cost,predecessors
      A,,,
      B,10,5000,A
      """;

  static final String LABOUR =
      """
      activity,labour_hours,crew,rate,other_cost
      A,480,6,40,1000
      """;

  static final String PATTERNS =
      """
      pattern,hours_per_week,days_per_week,crew_factor,crowding_loss,once_cost,week_cost,weeks_max,note
      normal,40,5,1,0,0,0,,
      long days,50,5,1,0,0,450,10,foreman
      """;

  static final String PAY = "pattern,above_hours,multiplier\nlong days,40,1.5\n";

  static final String LOSS = "pattern,week,loss,source\nlong days,1,0.04,assumed\n";

  private final CaseOnDisk disk;

  LabourOnDisk(Path folder) throws IOException {
    disk =
        new CaseOnDisk(folder)
            .with("activities.csv", ACTIVITIES)
            .with("labour.csv", LABOUR)
            .with("patterns.csv", PATTERNS)
            .with("pay.csv", PAY)
            .with("output_loss.csv", LOSS);
  }

  LabourOnDisk with(String file, String text) throws IOException {
    disk.with(file, text);
    return this;
  }

  CaseOnDisk disk() {
    return disk;
  }

  void expect(String... problems) {
    assertEquals(List.of(problems), disk.problems());
  }

  void expectWarnings(String... warnings) {
    assertEquals(List.of(warnings), disk.warnings());
  }
}
