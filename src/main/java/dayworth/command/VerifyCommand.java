package dayworth.command;

import dayworth.casefile.CaseReader;
import dayworth.casefile.Reading;
import dayworth.decision.Fault;
import dayworth.report.NoResult;
import dayworth.report.NoticeText;
import dayworth.report.ResultFile;
import dayworth.report.Verification;
import dayworth.report.VerifyText;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code dayworth verify}. */
@Command(
    name = "verify",
    description = "Recheck a result against its case, with the checker alone.",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class)
final class VerifyCommand implements Callable<Integer> {

  private static final String FILE = "result.json";

  @Spec private CommandSpec spec;

  @Parameters(paramLabel = "RESULT", description = "A result.json, or the folder that holds it.")
  private Path result;

  @Option(
      names = "--case",
      paramLabel = "FOLDER",
      description = "The case folder; cases/<name> or <name> if not given.")
  private Optional<Path> folder = Optional.empty();

  @Option(names = "--quiet", description = "Print no answer, only faults.")
  private boolean quiet;

  @Override
  public Integer call() {
    Path file = Files.isDirectory(result) ? result.resolve(FILE) : result;
    try {
      ResultFile read = ResultFile.read(Files.readAllBytes(file));
      Optional<Path> known = folder.or(() -> caseOf(read.caseName()));
      if (known.isEmpty() || !Files.isDirectory(known.get())) {
        return refuse(noCase(read.caseName()));
      }
      return verify(read, file, known.get());
    } catch (NoResult none) {
      return refuse(file + " is no result that can be verified: " + none.getMessage() + ".");
    } catch (IOException unread) {
      return refuse(file + " cannot be read; name a result.json or the folder that holds it.");
    }
  }

  private int verify(ResultFile read, Path file, Path known) {
    List<Fault> changed = read.inputFaults(CaseReader.inputs(known));
    if (!changed.isEmpty()) {
      CaseCommand.print(
          spec.commandLine().getErr(),
          VerifyText.faults(changed, file.toString(), CaseCommand.style()));
      spec.commandLine()
          .getErr()
          .println("\n  Its figures were not recounted: they belong to other input.");
      return Exit.NO_ANSWER;
    }
    Reading reading = CaseReader.read(known, read.scale(), read.lossFactor());
    if (reading instanceof Reading.Unsound unsound) {
      CaseCommand.print(
          spec.commandLine().getErr(),
          NoticeText.problems(unsound.problems(), file.toString(), CaseCommand.style()));
      return Exit.BAD_INPUT;
    }
    return tell(read.verify(((Reading.Sound) reading).of()), file);
  }

  private int tell(Verification verification, Path file) {
    if (!verification.faults().isEmpty()) {
      CaseCommand.print(
          spec.commandLine().getErr(),
          VerifyText.faults(verification.faults(), file.toString(), CaseCommand.style()));
      return Exit.NO_ANSWER;
    }
    if (!quiet) {
      CaseCommand.print(
          spec.commandLine().getOut(),
          VerifyText.holds(verification, file.toString(), CaseCommand.style()));
    }
    return Exit.DONE;
  }

  private Optional<Path> caseOf(String name) {
    if (!isPlain(name)) {
      return Optional.empty();
    }
    return List.of(Path.of("cases", name), Path.of(name)).stream()
        .filter(Files::isDirectory)
        .findFirst();
  }

  /** The name comes from the file: it may name a folder here and lead nowhere else. */
  private static boolean isPlain(String name) {
    return !name.isBlank() && !name.startsWith(".") && name.matches("[^/\\\\:*?\"<>|\\p{Cntrl}]+");
  }

  private String noCase(String name) {
    return folder
        .map(given -> given + " is no folder; name the case folder with --case.")
        .orElseGet(
            () ->
                "The case of this result is "
                    + name.replaceAll("\\p{Cntrl}", "?")
                    + ", and neither cases nor this folder has it; name it with --case FOLDER.");
  }

  private int refuse(String why) {
    spec.commandLine().getErr().println("dayworth: " + why);
    return Exit.BAD_INPUT;
  }
}
