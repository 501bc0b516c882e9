package dayworth.casefile;

import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.regex.Pattern;

/** Reads a date as ISO 8601 writes it. */
enum DateCell implements CellParser<LocalDate> {
  DATE;

  private static final Pattern ISO = Pattern.compile("\\d{4}-\\d{2}-\\d{2}");

  /** Three numbers with marks between them, in whatever order a country writes them. */
  private static final Pattern SOME_DATE = Pattern.compile("\\d+([-./])\\d+\\1\\d+\\.?");

  /** A slip in the year is likelier than a project outside these. */
  private static final LocalDate FIRST = LocalDate.of(1900, 1, 1);

  private static final LocalDate LAST = LocalDate.of(2999, 12, 31);

  /** Whether a text is meant as a date, right or wrong. */
  static boolean isMeant(String text) {
    return SOME_DATE.matcher(text).matches();
  }

  @Override
  public LocalDate parse(String text, NumberStyle style) throws CellFault {
    if (!ISO.matcher(text).matches()) {
      throw new CellFault("not a date", "year-month-day, such as 2026-09-07");
    }
    LocalDate date;
    try {
      date = LocalDate.parse(text);
    } catch (DateTimeParseException e) {
      throw new CellFault("no such date", "a day that the calendar has");
    }
    if (date.isBefore(FIRST) || date.isAfter(LAST)) {
      throw new CellFault("a date out of range", "from " + FIRST + " to " + LAST);
    }
    return date;
  }
}
