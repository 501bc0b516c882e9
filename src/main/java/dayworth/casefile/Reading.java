package dayworth.casefile;

import dayworth.decision.Case;
import dayworth.decision.Notice;
import java.util.List;

/** What came of reading a case folder. */
public sealed interface Reading permits Reading.Sound, Reading.Unsound {

  /** The case can be computed; doubtful input stands in its warnings. */
  record Sound(Case of) implements Reading {}

  /**
   * Nothing can be computed.
   *
   * @param problems every problem of every file, sorted by file, line and column; at least one
   * @param warnings doubtful input that was seen on the way, sorted
   */
  record Unsound(List<Notice> problems, List<Notice> warnings) implements Reading {

    public Unsound {
      problems = List.copyOf(problems);
      warnings = List.copyOf(warnings);
      if (problems.isEmpty()) {
        throw new IllegalArgumentException("a case without a problem is sound");
      }
    }
  }
}
