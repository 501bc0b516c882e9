package dayworth.report;

import java.util.ArrayList;
import java.util.List;

/** The short answer of a case folder that was begun. */
public final class BeginText {

  private BeginText() {}

  /**
   * What is there now, and what to do next.
   *
   * @param folder as the user named it
   * @param files likewise
   */
  public static List<String> lines(String folder, List<String> files, Style style) {
    String name = Wording.safe(folder);
    List<String> lines = new ArrayList<>();
    lines.add(style.bold(name + " holds a small case. Put your own job in its place."));
    lines.add("");
    files.forEach(file -> lines.add(Wording.INDENT + Wording.safe(file)));
    lines.add("");
    lines.add(Wording.INDENT + "README.txt explains every column. Next: dayworth check " + name);
    return lines;
  }
}
