package dayworth.casefile;

import dayworth.decision.Case;
import dayworth.decision.Notice;
import dayworth.value.TimeScale;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/** A small case folder that a test writes and reads back. */
final class CaseOnDisk {

  static final String ONE_ACTIVITY =
      """
      id,normal_duration,normal_cost
      A,5,100
      """;

  private final Path folder;

  CaseOnDisk(Path folder) {
    this.folder = folder;
  }

  CaseOnDisk with(String file, String text) throws IOException {
    return with(file, text.getBytes(StandardCharsets.UTF_8));
  }

  CaseOnDisk with(String file, byte[] bytes) throws IOException {
    Files.write(folder.resolve(file), bytes);
    return this;
  }

  Path folder() {
    return folder;
  }

  /** The problems in order, each as {@code place | wrong | found | right}. */
  List<String> problems() {
    Reading reading = CaseReader.read(folder, TimeScale.WHOLE);
    if (reading instanceof Reading.Unsound unsound) {
      return unsound.problems().stream().map(CaseOnDisk::line).toList();
    }
    return List.of();
  }

  /** The case; the test fails with its problems if it is unsound. */
  Case sound() {
    Reading reading = CaseReader.read(folder, TimeScale.WHOLE);
    if (reading instanceof Reading.Sound sound) {
      return sound.of();
    }
    throw new AssertionError("unsound: " + problems());
  }

  /** The warnings of a sound case. */
  List<String> warnings() {
    return sound().warnings().stream().map(CaseOnDisk::line).toList();
  }

  private static String line(Notice notice) {
    return String.join(" | ", notice.place(), notice.wrong(), notice.found(), notice.right());
  }
}
