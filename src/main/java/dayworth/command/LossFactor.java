package dayworth.command;

import dayworth.buildup.BuildUp;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.util.Optional;
import picocli.CommandLine;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** The option that scales all losses of output, for every question that uses labour. */
final class LossFactor {

  /** As many as results write, so that they name exactly what they were computed with. */
  private static final int MOST_DECIMALS = 6;

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
    Quantity factor = given.map(Quantity::of).orElse(Quantity.ONE);
    if (factor.signum() < 0 || factor.compareTo(BuildUp.MOST_LOSS_FACTOR) > 0) {
      throw wrong("wants 0 or more, at most " + BuildUp.MOST_LOSS_FACTOR);
    }
    if (given.filter(text -> text.stripTrailingZeros().scale() > MOST_DECIMALS).isPresent()) {
      throw wrong("wants at most " + MOST_DECIMALS + " decimals");
    }
    return factor;
  }

  /** Refuses a factor that would change nothing: nobody may take the answer for another one. */
  void requireLabour(BuildUp buildUp) {
    if (buildUp.isNone() && !value().equals(Quantity.ONE)) {
      throw wrong("wants a case with losses to multiply: this one has no labour");
    }
  }

  private CommandLine.ParameterException wrong(String why) {
    return new CommandLine.ParameterException(spec.commandLine(), "--loss-factor " + why);
  }
}
