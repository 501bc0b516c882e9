package dayworth.command;

import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Reads a whole number above 0. */
final class CountOption implements ITypeConverter<Long> {

  @Override
  public Long convert(String text) {
    if (!text.matches("0*[1-9]\\d{0,8}")) {
      throw new TypeConversionException("'" + text + "' is not a whole number above 0");
    }
    return Long.valueOf(text);
  }
}
