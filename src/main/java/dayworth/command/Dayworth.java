package dayworth.command;

import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** The command itself: without a question it shows what can be asked. */
@Command(
    name = "dayworth",
    description = "What one day of earlier finish costs, what it is worth, and the proof.",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    subcommands = {
      BeginCommand.class,
      CheckCommand.class,
      CurveCommand.class,
      MeetCommand.class,
      WeighCommand.class,
      BriefCommand.class,
      BuildUpCommand.class,
      VerifyCommand.class
    })
final class Dayworth implements Runnable {

  @Spec private CommandSpec spec;

  @Override
  public void run() {
    throw new CommandLine.ParameterException(spec.commandLine(), "Name a command.");
  }
}
