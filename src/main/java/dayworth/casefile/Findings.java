package dayworth.casefile;

import dayworth.decision.Notice;
import java.util.ArrayList;
import java.util.List;

/** Gathers what the rules find, in any order. */
final class Findings {

  private final List<Notice> problems = new ArrayList<>();
  private final List<Notice> warnings = new ArrayList<>();

  void problem(Notice problem) {
    problems.add(problem);
  }

  void warning(Notice warning) {
    warnings.add(warning);
  }

  boolean hasProblems() {
    return !problems.isEmpty();
  }

  List<Notice> problems() {
    return problems.stream().sorted().toList();
  }

  List<Notice> warnings() {
    return warnings.stream().sorted().toList();
  }
}
