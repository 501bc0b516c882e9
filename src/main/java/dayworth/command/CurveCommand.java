package dayworth.command;

import dayworth.decision.Case;
import dayworth.decision.CurveAnswer;
import dayworth.decision.CurveQuestion;
import dayworth.decision.FinishTooEarly;
import dayworth.engine.linear.LinearProgramme;
import dayworth.report.CurveFiles;
import dayworth.report.CurveText;
import dayworth.report.ResultJson;
import dayworth.report.ResultsNotWritten;
import dayworth.report.picture.Pictures;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Set;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** {@code dayworth curve}. */
@Command(name = "curve", description = "Compute and prove what each finish costs.")
final class CurveCommand extends CaseCommand {

  /** Longer than any project that a case may hold. */
  private static final BigDecimal MOST_UNITS = BigDecimal.valueOf(1_000_000_000);

  @Option(
      names = "--at",
      paramLabel = "UNITS",
      description = "Write the plan for this duration; the least total if not given.")
  private Optional<BigDecimal> at = Optional.empty();

  @Option(
      names = "--crosscheck",
      paramLabel = "all|none|N",
      description = "How many points to compare with the linear programme.",
      converter = CrossCheckSize.Parser.class)
  private Optional<CrossCheckSize> crosscheck = Optional.empty();

  @Option(names = "--no-pictures", description = "Write no pictures, only tables.")
  private boolean noPictures;

  @Override
  TimeScale finest() {
    if (at.filter(units -> units.signum() < 0).isPresent()) {
      throw wrongUsage("--at wants a duration of 0 or more");
    }
    if (at.filter(units -> units.stripTrailingZeros().scale() > TimeScale.MOST_DECIMALS)
        .isPresent()) {
      throw wrongUsage("--at wants at most 3 decimals");
    }
    if (at.filter(units -> units.compareTo(MOST_UNITS) > 0).isPresent()) {
      throw wrongUsage("--at wants at most " + MOST_UNITS);
    }
    return at.map(TimeScale::of).orElse(TimeScale.WHOLE);
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

  @Override
  int answer(Case read) throws ResultsNotWritten {
    TimeScale scale = read.network().scale();
    OptionalLong asked =
        at.map(units -> OptionalLong.of(scale.ticks(units))).orElseGet(OptionalLong::empty);
    long size =
        crosscheck.map(CrossCheckSize::most).orElseGet(() -> CrossCheckSize.usual(read.network()));
    try {
      tell(ask(read, asked, size));
      return Exit.DONE;
    } catch (FinishTooEarly tooEarly) {
      print(err(), CurveText.tooEarly(tooEarly, style(), CurveText.WIDEST));
      return Exit.NO_ANSWER;
    }
  }

  private CurveAnswer ask(Case read, OptionalLong asked, long size) throws FinishTooEarly {
    try (ProgressLine progress = ProgressLine.start(err(), isTerminal())) {
      return CurveQuestion.ask(read, asked, size, progress);
    }
  }

  private void tell(CurveAnswer answer) throws ResultsNotWritten {
    Map<String, byte[]> files = new LinkedHashMap<>(CurveFiles.of(answer, Version.text()));
    Set<String> owned = new LinkedHashSet<>(files.keySet());
    owned.addAll(Pictures.NAMES);
    if (!noPictures) {
      files.putAll(Pictures.of(answer));
    }
    Path target = write(files, owned);
    List<String> lines = new ArrayList<>(CurveText.lines(answer, style(), CurveText.WIDEST));
    lines.addAll(CurveText.written(target.toString(), files.keySet(), CurveText.WIDEST));
    say(lines, ResultJson.ofCurve(answer, Version.text()));
  }
}
