package dayworth.command;

import dayworth.decision.Case;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/**
 * How many points are compared with the linear programme.
 *
 * @param most at most so many
 */
record CrossCheckSize(long most) {

  /** From here on the linear programme's first deadline alone takes longer than the budget. */
  private static final int TOO_LARGE = 1_950;

  /**
   * What about ten seconds allow: a first deadline takes about 1.2 k³ seconds and each further one
   * 0.025 k², k being thousands of activities (measured; see DEVELOPERS.md). Where money is not
   * convex each finish may be a first deadline, as it is another branch's programme.
   */
  static long usual(Case of) {
    int size = of.network().size();
    double k = size / 1000.0;
    double first = 1.2 * k * k * k;
    double further = of.isConvex() ? 0.025 * k * k : first + 0.02;
    return size > TOO_LARGE ? 0 : (long) ((9.5 - first) / further);
  }

  /** Reads the option's value. */
  static final class Parser implements ITypeConverter<CrossCheckSize> {

    @Override
    public CrossCheckSize convert(String text) {
      if (text.equals("all")) {
        return new CrossCheckSize(Long.MAX_VALUE);
      }
      if (text.equals("none")) {
        return new CrossCheckSize(0);
      }
      if (text.matches("\\d{1,9}")) {
        return new CrossCheckSize(Long.parseLong(text));
      }
      throw new TypeConversionException("'" + text + "' is not all, none or a whole number");
    }
  }
}
