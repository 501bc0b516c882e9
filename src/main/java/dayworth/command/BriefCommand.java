package dayworth.command;

import dayworth.decision.BriefAnswer;
import dayworth.decision.BriefQuestion;
import dayworth.decision.Case;
import dayworth.decision.FinishTooEarly;
import dayworth.report.BriefText;
import dayworth.report.CurveText;
import dayworth.report.ResultJson;
import dayworth.report.ResultsNotWritten;
import dayworth.report.brief.Brief;
import dayworth.value.TimeScale;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code dayworth brief}. */
@Command(name = "brief", description = "Write the paper that puts a plan before a client.")
final class BriefCommand extends CaseCommand {

  @Option(
      names = "--plan",
      paramLabel = "UNITS|DATE|least",
      converter = WhichPlan.Parser.class,
      description = "The finish to argue for; the least total if not given.")
  private Optional<WhichPlan> plan = Optional.empty();

  @Option(
      names = "--as",
      paramLabel = "html|md",
      description = "A page that needs nothing else, or its text as Markdown; html if not given.")
  private Form as = Form.html;

  @Mixin private EffortOptions effort = new EffortOptions();

  /** How the brief is written; the names are those of the command line. */
  enum Form {
    html,
    md
  }

  @Override
  TimeScale finest() {
    return plan.map(WhichPlan::scale).orElse(TimeScale.WHOLE);
  }

  @Override
  int answer(Case read) throws ResultsNotWritten {
    OptionalLong at =
        plan.map(which -> which.ticks(read, this::wrongUsage)).orElse(OptionalLong.empty());
    try {
      tell(ask(read, at));
      return Exit.DONE;
    } catch (FinishTooEarly tooEarly) {
      print(err(), CurveText.tooEarly(tooEarly, style(), CurveText.WIDEST));
      return Exit.NO_ANSWER;
    }
  }

  private BriefAnswer ask(Case read, OptionalLong at) throws FinishTooEarly {
    try (ProgressLine progress = ProgressLine.start(err(), isTerminal())) {
      return BriefQuestion.ask(read, at, effort.from(), progress);
    }
  }

  private void tell(BriefAnswer answer) throws ResultsNotWritten {
    Map<String, byte[]> files = as == Form.html ? Brief.html(answer) : Brief.markdown(answer);
    Path target = write(files, files.keySet());
    List<String> lines = new ArrayList<>(BriefText.lines(answer, style(), CurveText.WIDEST));
    for (String name : files.keySet()) {
      lines.add("  Written: " + target.resolve(name));
    }
    say(lines, ResultJson.ofMeet(answer.chosen(), Version.text()));
  }
}
