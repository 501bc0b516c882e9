package dayworth.report.brief;

import dayworth.casefile.CaseReader;
import dayworth.casefile.Reading;
import dayworth.decision.BriefAnswer;
import dayworth.decision.BriefQuestion;
import dayworth.decision.Case;
import dayworth.decision.FinishTooEarly;
import dayworth.decision.Watcher;
import dayworth.value.TimeScale;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.OptionalLong;

/** Answers for briefs. */
final class Briefs {

  /** The ferry landing, a case that was drawn by hand before the program could. */
  static final Path FERRY_LANDING = Path.of("src", "test", "resources", "brief", "ferry-landing");

  private Briefs() {}

  static Case read(Path folder) {
    Reading reading = CaseReader.read(folder, TimeScale.WHOLE);
    if (reading instanceof Reading.Sound sound) {
      return sound.of();
    }
    throw new AssertionError(((Reading.Unsound) reading).problems().toString());
  }

  static BriefAnswer of(Path folder) {
    return of(folder, OptionalLong.empty());
  }

  static BriefAnswer at(Path folder, long ticks) {
    return of(folder, OptionalLong.of(ticks));
  }

  private static BriefAnswer of(Path folder, OptionalLong at) {
    try {
      return BriefQuestion.ask(read(folder), at, Watcher.NONE);
    } catch (FinishTooEarly impossible) {
      throw new AssertionError(impossible);
    }
  }

  static String html(BriefAnswer answer) {
    return new String(Brief.html(answer).get("brief.html"), StandardCharsets.UTF_8);
  }

  static String markdown(BriefAnswer answer) {
    return new String(Brief.markdown(answer).get("brief.md"), StandardCharsets.UTF_8);
  }
}
