package dayworth.command;

import dayworth.casefile.StarterCase;
import dayworth.casefile.StarterRefused;
import dayworth.report.BeginText;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code dayworth begin}. */
@Command(
    name = "begin",
    description = "Write a small case with an explanation of its files, to start your own from.",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class)
final class BeginCommand implements Callable<Integer> {

  @Spec private CommandSpec spec;

  @Parameters(paramLabel = "FOLDER", description = "The new case folder; it may exist if empty.")
  private Path folder;

  @Option(names = "--quiet", description = "Print no answer, only problems.")
  private boolean quiet;

  @Override
  public Integer call() {
    try {
      List<Path> files = StarterCase.write(folder);
      if (!quiet) {
        say(files);
      }
      return Exit.DONE;
    } catch (StarterRefused refused) {
      spec.commandLine().getErr().println("dayworth: " + refused.getMessage());
      return Exit.BAD_INPUT;
    }
  }

  private void say(List<Path> files) {
    PrintWriter out = spec.commandLine().getOut();
    List<String> names = files.stream().map(Path::toString).toList();
    BeginText.lines(folder.toString(), names, CaseCommand.style()).forEach(out::println);
  }
}
