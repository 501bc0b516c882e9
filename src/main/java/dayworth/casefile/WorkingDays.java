package dayworth.casefile;

import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.format.TextStyle;
import java.util.Arrays;
import java.util.Collections;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Set;

/** A list of weekdays such as {@code Mon Tue Wed Thu Fri}. */
record WorkingDays(Set<DayOfWeek> days) {

  /** Monday to Friday. */
  static final WorkingDays USUAL =
      new WorkingDays(EnumSet.range(DayOfWeek.MONDAY, DayOfWeek.FRIDAY));

  private static final Map<String, DayOfWeek> BY_NAME = new LinkedHashMap<>();

  static {
    Arrays.stream(DayOfWeek.values()).forEach(day -> BY_NAME.put(name(day), day));
  }

  WorkingDays {
    days = Collections.unmodifiableSet(EnumSet.copyOf(days));
  }

  /** The weekday's name as it stands in a case. */
  static String name(DayOfWeek day) {
    return day.getDisplayName(TextStyle.SHORT, Locale.ENGLISH);
  }

  /** A date with its weekday, for a message. */
  static String named(LocalDate date) {
    return name(date.getDayOfWeek()) + " " + date;
  }

  static WorkingDays parse(String text, NumberStyle style) throws CellFault {
    Set<DayOfWeek> days = EnumSet.noneOf(DayOfWeek.class);
    for (String name : text.split("[\\s,;]+", -1)) {
      DayOfWeek day = BY_NAME.get(name);
      if (day == null) {
        throw new CellFault("no such weekday: " + name, "of " + String.join(" ", BY_NAME.keySet()));
      }
      if (!days.add(day)) {
        throw new CellFault("the same weekday twice: " + name, "each weekday once");
      }
    }
    return new WorkingDays(days);
  }
}
