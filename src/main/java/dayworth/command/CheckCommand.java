package dayworth.command;

import dayworth.decision.Case;
import dayworth.decision.CheckAnswer;
import dayworth.decision.CheckQuestion;
import dayworth.report.CheckText;
import dayworth.report.CurveText;
import dayworth.report.ResultJson;
import dayworth.value.TimeScale;
import picocli.CommandLine.Command;

/** {@code dayworth check}. */
@Command(name = "check", description = "Read a case and tell the facts of its network.")
final class CheckCommand extends CaseCommand {

  @Override
  TimeScale finest() {
    return TimeScale.WHOLE;
  }

  @Override
  int answer(Case read) {
    CheckAnswer answer = CheckQuestion.ask(read);
    say(
        CheckText.lines(answer, style(), CurveText.WIDEST),
        ResultJson.ofCheck(answer, Version.text()));
    CheckText.notes(answer, CurveText.WIDEST).forEach(err()::println);
    return Exit.DONE;
  }
}
