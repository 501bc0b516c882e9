package dayworth.command;

import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Reads a date as case files write it. */
final class DateOption implements ITypeConverter<LocalDate> {

  @Override
  public LocalDate convert(String text) {
    if (!text.matches("\\d{4}-\\d{2}-\\d{2}")) {
      throw new TypeConversionException("'" + text + "' is not a date such as 2026-09-07");
    }
    try {
      return LocalDate.parse(text);
    } catch (DateTimeParseException e) {
      throw new TypeConversionException("'" + text + "' is no day of the calendar");
    }
  }
}
