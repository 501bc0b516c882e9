package dayworth.casefile;

import java.util.ArrayList;
import java.util.List;

/** Reads a list of weekdays such as {@code Mon Tue Wed Thu Fri}. */
final class WorkingDays {

  private static final List<String> NAMES =
      List.of("Mon", "Tue", "Wed", "Thu", "Fri", "Sat", "Sun");

  private WorkingDays() {}

  static List<String> parse(String text, NumberStyle style) throws CellFault {
    List<String> days = new ArrayList<>();
    for (String day : text.split("[\\s,;]+", -1)) {
      if (!NAMES.contains(day)) {
        throw new CellFault("no such weekday: " + day, "of " + String.join(" ", NAMES));
      }
      if (days.contains(day)) {
        throw new CellFault("the same weekday twice: " + day, "each weekday once");
      }
      days.add(day);
    }
    return days;
  }
}
