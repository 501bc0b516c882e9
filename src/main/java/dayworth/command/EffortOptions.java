package dayworth.command;

import dayworth.decision.Effort;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.concurrent.TimeUnit;
import picocli.CommandLine.Option;

/** How long to look for proofs; shared by the commands that look for plans. */
final class EffortOptions {

  /** More than any clock allows. */
  private static final long UNLIMITED = 1_000_000_000;

  @Option(
      names = "--nodes",
      paramLabel = "N",
      converter = CountOption.class,
      description =
          "Relaxations solved for each finish on average where measures or money need branching.")
  private Optional<Long> nodes = Optional.empty();

  @Option(
      names = "--effort",
      paramLabel = "SECONDS",
      converter = CountOption.class,
      description = "Look for proofs for so long; results then depend on the machine.")
  private Optional<Long> seconds = Optional.empty();

  /** What was asked for, from now on. */
  Effort from() {
    if (seconds.isEmpty()) {
      return new Effort(most(Effort.USUAL.nodes()), () -> false);
    }
    long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(seconds.get());
    return new Effort(most(OptionalLong.of(UNLIMITED)), () -> System.nanoTime() - end > 0);
  }

  private OptionalLong most(OptionalLong otherwise) {
    return nodes.map(OptionalLong::of).orElse(otherwise);
  }
}
