package dayworth.command;

import dayworth.decision.Case;
import dayworth.decision.WeighAnswer;
import dayworth.decision.WeighQuestion;
import dayworth.report.CurveText;
import dayworth.report.ResultJson;
import dayworth.report.ResultsNotWritten;
import dayworth.report.WeighFiles;
import dayworth.report.WeighText;
import dayworth.value.TimeScale;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** {@code dayworth weigh}. */
@Command(name = "weigh", description = "Put the choices side by side, and say how far each holds.")
final class WeighCommand extends CaseCommand {

  @Mixin private EffortOptions effort = new EffortOptions();

  @Override
  TimeScale finest() {
    return TimeScale.WHOLE;
  }

  @Override
  int answer(Case read) throws ResultsNotWritten {
    WeighAnswer answer = ask(read);
    Map<String, byte[]> files = WeighFiles.of(answer, Version.text());
    Path target = write(files, files.keySet());
    List<String> lines = new ArrayList<>(WeighText.lines(answer, style(), CurveText.WIDEST));
    lines.addAll(CurveText.written(target.toString(), files.keySet(), CurveText.WIDEST));
    say(lines, ResultJson.ofWeigh(answer, Version.text()));
    return Exit.DONE;
  }

  private WeighAnswer ask(Case read) {
    try (ProgressLine progress = ProgressLine.start(err(), isTerminal())) {
      return WeighQuestion.ask(read, otherLosses(), effort.from(), progress);
    }
  }
}
