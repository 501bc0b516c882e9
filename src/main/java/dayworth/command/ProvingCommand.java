package dayworth.command;

import dayworth.decision.Case;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Effort;
import dayworth.engine.linear.LinearProgramme;
import dayworth.report.ResultsNotWritten;
import dayworth.report.picture.Pictures;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** What questions have in common that compute the curve, compare it and draw it. */
abstract class ProvingCommand extends CaseCommand {

  /** Longer than any project that a case may hold. */
  private static final BigDecimal MOST_UNITS = BigDecimal.valueOf(1_000_000_000);

  @Option(
      names = "--crosscheck",
      paramLabel = "all|none|N",
      description = "How many points to compare with the linear programme.",
      converter = CrossCheckSize.Parser.class)
  private Optional<CrossCheckSize> crosscheck = Optional.empty();

  @Option(names = "--no-pictures", description = "Write no pictures, only tables.")
  private boolean noPictures;

  @Mixin private EffortOptions effort = new EffortOptions();

  /** How long to look for proofs, from now on. */
  final Effort effort() {
    return effort.from();
  }

  /** The solver's classes take longer to load than a case to read, and there is a second core. */
  @Override
  public Integer call() {
    if (crosscheck.map(CrossCheckSize::most).orElse(1L) > 0) {
      Thread loading = new Thread(LinearProgramme::load, "loading the solver");
      loading.setDaemon(true);
      loading.start();
    }
    return super.call();
  }

  /** How many points to compare with the linear programme at most. */
  final long crossChecks(Case read) {
    return crosscheck.map(CrossCheckSize::most).orElseGet(() -> CrossCheckSize.usual(read));
  }

  /** The scale that a duration given as an option needs. */
  final TimeScale scaleOf(String option, BigDecimal units) {
    if (units.signum() < 0) {
      throw wrongUsage(option + " wants a duration of 0 or more");
    }
    if (units.stripTrailingZeros().scale() > TimeScale.MOST_DECIMALS) {
      throw wrongUsage(option + " wants at most 3 decimals");
    }
    if (units.compareTo(MOST_UNITS) > 0) {
      throw wrongUsage(option + " wants at most " + MOST_UNITS);
    }
    return TimeScale.of(units);
  }

  /**
   * Writes tables and pictures as one set.
   *
   * @return the names of what was written, and where
   */
  final Written write(CurveAnswer answer, Map<String, byte[]> tables, Set<String> others)
      throws ResultsNotWritten {
    Map<String, byte[]> files = new LinkedHashMap<>(tables);
    Set<String> owned = new LinkedHashSet<>(files.keySet());
    owned.addAll(Pictures.NAMES);
    owned.addAll(others);
    if (!noPictures) {
      files.putAll(Pictures.of(answer));
    }
    return new Written(write(files, owned), files.keySet());
  }

  /** What was written where. */
  record Written(Path folder, Set<String> names) {}
}
