package dayworth.command;

import dayworth.decision.Case;
import dayworth.decision.CurveAnswer;
import dayworth.decision.CurveQuestion;
import dayworth.decision.FinishTooEarly;
import dayworth.report.CurveFiles;
import dayworth.report.CurveText;
import dayworth.report.ResultJson;
import dayworth.report.ResultsNotWritten;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Set;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** {@code dayworth curve}. */
@Command(name = "curve", description = "Compute and prove what each finish costs.")
final class CurveCommand extends ProvingCommand {

  /** The proof of another plan than the one that is written here would mislead. */
  private static final Set<String> OTHERS = Set.of("proof.csv");

  @Option(
      names = "--at",
      paramLabel = "UNITS",
      converter = NumberOption.class,
      description = "Write the plan for this duration; the least total if not given.")
  private Optional<BigDecimal> at = Optional.empty();

  @Override
  TimeScale finest() {
    return at.map(units -> scaleOf("--at", units)).orElse(TimeScale.WHOLE);
  }

  @Override
  int answer(Case read) throws ResultsNotWritten {
    TimeScale scale = read.network().scale();
    OptionalLong asked =
        at.map(units -> OptionalLong.of(scale.ticks(units))).orElseGet(OptionalLong::empty);
    try {
      tell(ask(read, asked));
      return Exit.DONE;
    } catch (FinishTooEarly tooEarly) {
      print(err(), CurveText.tooEarly(tooEarly, style(), CurveText.WIDEST));
      return Exit.NO_ANSWER;
    }
  }

  private CurveAnswer ask(Case read, OptionalLong asked) throws FinishTooEarly {
    try (ProgressLine progress = ProgressLine.start(err(), isTerminal())) {
      return CurveQuestion.ask(read, asked, crossChecks(read), effort(), progress);
    }
  }

  private void tell(CurveAnswer answer) throws ResultsNotWritten {
    Written written = write(answer, CurveFiles.of(answer, Version.text()), OTHERS);
    List<String> lines = new ArrayList<>(CurveText.lines(answer, style(), CurveText.WIDEST));
    lines.addAll(CurveText.written(written.folder().toString(), written.names(), CurveText.WIDEST));
    say(lines, ResultJson.ofCurve(answer, Version.text()));
  }
}
