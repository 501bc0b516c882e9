package dayworth.report;

import dayworth.decision.Fault;
import java.util.ArrayList;
import java.util.List;

/** The short answer of {@code dayworth verify}. */
public final class VerifyText {

  private static final int MOST_FAULTS = 12;

  private VerifyText() {}

  /** What was checked of a result that holds, and what was not. */
  public static List<String> holds(Verification verification, String result, Style style) {
    List<String> lines = new ArrayList<>();
    boolean all = verification.unchecked().isEmpty();
    String name = Wording.safe(result);
    lines.add(style.bold(name + (all ? " holds." : " holds, as far as it can be checked.")));
    block(lines, "Checked", verification.checked());
    block(lines, "Not checked", verification.unchecked());
    return lines;
  }

  private static void block(List<String> lines, String title, List<String> items) {
    if (!items.isEmpty()) {
      lines.add("");
      lines.add(Wording.INDENT + title);
      items.forEach(item -> lines.addAll(Wording.wrap(item, "    ", CurveText.WIDEST)));
    }
  }

  /** The first faults, each with its place, what was found and what would be right. */
  public static List<String> faults(List<Fault> faults, String result, Style style) {
    List<String> lines = new ArrayList<>();
    String count = Wording.count(faults.size(), "fault", "faults");
    lines.add(style.bold(Wording.safe(result) + " does not hold: " + count + "."));
    lines.add("");
    for (Fault fault : faults.subList(0, Math.min(MOST_FAULTS, faults.size()))) {
      lines.add(Wording.INDENT + Wording.safe(fault.place()));
      String detail = "found " + fault.found() + "; right is " + fault.right();
      lines.addAll(Wording.wrap(Wording.safe(detail), "      ", CurveText.WIDEST));
    }
    if (faults.size() > MOST_FAULTS) {
      lines.add(Wording.INDENT + "and " + (faults.size() - MOST_FAULTS) + " more");
    }
    return lines;
  }
}
