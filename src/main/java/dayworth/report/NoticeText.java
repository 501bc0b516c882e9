package dayworth.report;

import dayworth.decision.Notice;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Problems and warnings for a terminal: where, what is wrong, what was found, what is right. */
public final class NoticeText {

  private static final int LEAST_PLACE_WIDTH = 34;
  private static final int MOST_ALIKE = 5;

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
        String indent = " ".repeat(width + 4);
        int widest = Math.max(CurveText.WIDEST, indent.length() + LEAST_PLACE_WIDTH);
        lines.addAll(Wording.wrap(detail(problem), indent, widest));
      }
    }
    lines.add("");
    lines.add(Wording.INDENT + Wording.safe(untouched) + " is as it was.");
    return lines;
  }

  /** Warnings, each with its place; of many alike only the first few, and how many more. */
  public static List<String> warnings(List<Notice> warnings, int width) {
    Map<String, Integer> alike = new TreeMap<>();
    List<String> lines = new ArrayList<>();
    for (Notice warning : warnings) {
      if (alike.merge(warning.wrong(), 1, Integer::sum) <= MOST_ALIKE) {
        lines.addAll(warning(warning, width));
      }
    }
    alike.forEach(
        (wrong, count) -> {
          if (count > MOST_ALIKE) {
            String more = Wording.count(count - MOST_ALIKE, "more", "more");
            lines.add("  warning  " + more + " like this: " + Wording.safe(wrong));
            lines.add("           all of them are in result.json");
          }
        });
    return lines;
  }

  private static List<String> warning(Notice warning, int width) {
    List<String> lines = new ArrayList<>();
    lines.add("  warning  " + Wording.safe(warning.place()));
    String detail = detail(warning);
    String text = Wording.safe(warning.wrong()) + (detail.isEmpty() ? "" : "; " + detail);
    lines.addAll(Wording.wrap(text, "           ", Math.min(width, CurveText.WIDEST)));
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
