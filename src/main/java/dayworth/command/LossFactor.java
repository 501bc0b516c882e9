package dayworth.command;

import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.util.Optional;
import picocli.CommandLine;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** The option that scales all losses of output, for every question that uses labour. */
final class LossFactor {

  private static final BigDecimal MOST = BigDecimal.valueOf(100);

  @Spec(Spec.Target.MIXEE)
  private CommandSpec spec;

  @Option(
      names = "--loss-factor",
      paramLabel = "F",
      converter = NumberOption.class,
      description = "Multiply all losses of output by this; 1 if not given.")
  private Optional<BigDecimal> given = Optional.empty();

  /** The factor, at least 0. */
  Quantity value() {
    if (given.filter(factor -> factor.signum() < 0 || factor.compareTo(MOST) > 0).isPresent()) {
      throw new CommandLine.ParameterException(
          spec.commandLine(), "--loss-factor wants 0 or more, at most " + MOST);
    }
    return given.map(Quantity::of).orElse(Quantity.ONE);
  }
}
