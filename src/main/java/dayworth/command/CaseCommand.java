package dayworth.command;

import dayworth.casefile.CaseReader;
import dayworth.casefile.Reading;
import dayworth.decision.Case;
import dayworth.decision.LossScaling;
import dayworth.decision.ProofFailed;
import dayworth.report.CurveText;
import dayworth.report.NoticeText;
import dayworth.report.ResultSet;
import dayworth.report.ResultsNotWritten;
import dayworth.report.Style;
import dayworth.value.TimeScale;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** What all questions about a case have in common: reading it, its problems, where results go. */
@Command(mixinStandardHelpOptions = true, versionProvider = Version.class)
abstract class CaseCommand implements Callable<Integer> {

  @Spec private CommandSpec spec;

  @Parameters(paramLabel = "CASE", description = "The case folder.")
  private Path folder;

  @Option(
      names = "--out",
      paramLabel = "FOLDER",
      description = "Where results go; output/<case> if not given.")
  private Optional<Path> out = Optional.empty();

  @Option(names = "--json", description = "Print the result instead of the short answer.")
  private boolean json;

  @Option(names = "--quiet", description = "Print no answer, only problems and warnings.")
  private boolean quiet;

  @Mixin private LossFactor lossFactor = new LossFactor();

  /** How fine the time scale must be for the question. */
  abstract TimeScale finest();

  /** The case as it is read with its losses of output multiplied by other factors. */
  final LossScaling otherLosses() {
    return factor ->
        CaseReader.read(folder, finest(), factor) instanceof Reading.Sound sound
            ? Optional.of(sound.of())
            : Optional.empty();
  }

  abstract int answer(Case read) throws ResultsNotWritten;

  @Override
  public Integer call() {
    Reading reading = CaseReader.read(folder, finest(), lossFactor.value());
    if (reading instanceof Reading.Unsound unsound) {
      print(err(), NoticeText.problems(unsound.problems(), target(name()).toString(), style()));
      return Exit.BAD_INPUT;
    }
    Case read = ((Reading.Sound) reading).of();
    lossFactor.requireLabour(read.buildUp());
    if (!read.warnings().isEmpty()) {
      print(err(), NoticeText.warnings(read.warnings(), CurveText.WIDEST));
    }
    try {
      return answer(read);
    } catch (ProofFailed failed) {
      err().println("dayworth: a check failed, so there is no answer. " + failed.getMessage());
      return Exit.NO_ANSWER;
    } catch (ResultsNotWritten failed) {
      err().println("dayworth: " + failed.getMessage());
      return Exit.BAD_INPUT;
    }
  }

  final CommandLine.ParameterException wrongUsage(String why) {
    return new CommandLine.ParameterException(spec.commandLine(), why);
  }

  final void say(List<String> lines, String result) {
    if (json) {
      spec.commandLine().getOut().print(result);
      spec.commandLine().getOut().flush();
    } else if (!quiet) {
      print(spec.commandLine().getOut(), lines);
    }
  }

  final Path write(Map<String, byte[]> files, Set<String> owned) throws ResultsNotWritten {
    Path target = target(name());
    ResultSet.replace(target, files, owned);
    return target;
  }

  final PrintWriter err() {
    return spec.commandLine().getErr();
  }

  /** From JDK 22 on there always is a console; bold then shows in redirected output too. */
  @SuppressWarnings("SystemConsoleNull")
  static boolean isTerminal() {
    return System.console() != null;
  }

  static Style style() {
    return Style.of(isTerminal(), System.getenv());
  }

  private String name() {
    return String.valueOf(folder.toAbsolutePath().normalize().getFileName());
  }

  private Path target(String name) {
    return out.orElse(Path.of("output", name));
  }

  static void print(PrintWriter writer, List<String> lines) {
    lines.forEach(writer::println);
  }
}
