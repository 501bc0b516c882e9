package dayworth.report;

import dayworth.decision.Notice;
import java.util.ArrayList;
import java.util.List;

/** Problems and warnings for a terminal: where, what is wrong, what was found, what is right. */
public final class NoticeText {

  private static final int LEAST_PLACE_WIDTH = 34;

  private NoticeText() {}

  /**
   * Problems that stop everything.
   *
   * @param untouched the results' folder, as people know it
   */
  public static List<String> problems(List<Notice> problems, String untouched, Style style) {
    long files = problems.stream().map(Notice::file).distinct().count();
    String count = Wording.count(problems.size(), "problem", "problems");
    String in = Wording.count((int) files, "file", "files");
    List<String> lines = new ArrayList<>();
    lines.add(style.bold("Nothing was computed: " + count + " in " + in + "."));
    lines.add("");
    int width =
        problems.stream().mapToInt(p -> p.place().length()).reduce(LEAST_PLACE_WIDTH, Math::max);
    for (Notice problem : problems) {
      String place = Wording.safe(problem.place());
      String gap = " ".repeat(width - place.length() + 2);
      lines.add(Wording.INDENT + place + gap + Wording.safe(problem.wrong()));
      if (!detail(problem).isEmpty()) {
        lines.add(" ".repeat(width + 4) + detail(problem));
      }
    }
    lines.add("");
    lines.add(Wording.INDENT + Wording.safe(untouched) + " is as it was.");
    return lines;
  }

  /** Warnings, each with its place. */
  public static List<String> warnings(List<Notice> warnings, int width) {
    List<String> lines = new ArrayList<>();
    for (Notice warning : warnings) {
      lines.add("  warning  " + Wording.safe(warning.place()));
      String detail = detail(warning);
      String text = Wording.safe(warning.wrong()) + (detail.isEmpty() ? "" : "; " + detail);
      lines.addAll(Wording.wrap(text, "           ", Math.min(width, CurveText.WIDEST)));
    }
    return lines;
  }

  private static String detail(Notice notice) {
    String found = Wording.safe(notice.found());
    String right = Wording.safe(notice.right());
    boolean number = found.matches("-?[0-9]+(\\.[0-9]+)?");
    String what = found.isEmpty() ? "" : "found " + (number ? found : "\"" + found + "\"");
    return what.isEmpty() || right.isEmpty() ? what + right : what + "; " + right;
  }
}
