package dayworth.command;

import java.math.BigDecimal;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Reads a number as case files write it: digits, a point before decimals, no exponent. */
final class NumberOption implements ITypeConverter<BigDecimal> {

  @Override
  public BigDecimal convert(String text) {
    if (!text.matches("-?\\d{1,30}(\\.\\d{1,30})?")) {
      throw new TypeConversionException("'" + text + "' is not a number such as 17 or 17.5");
    }
    return new BigDecimal(text);
  }
}
