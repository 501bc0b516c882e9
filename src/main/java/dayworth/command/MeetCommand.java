package dayworth.command;

import dayworth.decision.Case;
import dayworth.decision.FinishTooEarly;
import dayworth.decision.MeetAnswer;
import dayworth.decision.MeetQuestion;
import dayworth.decision.Wish;
import dayworth.report.CurveFiles;
import dayworth.report.CurveText;
import dayworth.report.MeetText;
import dayworth.report.ResultJson;
import dayworth.report.ResultsNotWritten;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** {@code dayworth meet}. */
@Command(name = "meet", description = "Find and prove the cheapest plan for a date or some money.")
final class MeetCommand extends ProvingCommand {

  /** More than any case costs. */
  private static final BigDecimal MOST_MONEY = new BigDecimal("1e18");

  private static final int MOST_MONEY_DECIMALS = 4;

  @ArgGroup(exclusive = true)
  private Asked asked = new Asked();

  /** One of them. */
  private static final class Asked {

    @Option(
        names = "--by",
        paramLabel = "DATE",
        converter = DateOption.class,
        description = "Finish by this date.")
    private Optional<LocalDate> by = Optional.empty();

    @Option(
        names = "--in",
        paramLabel = "UNITS",
        converter = NumberOption.class,
        description = "Finish within so many units.")
    private Optional<BigDecimal> in = Optional.empty();

    @Option(
        names = "--within",
        paramLabel = "MONEY",
        converter = NumberOption.class,
        description = "Finish as early as so much above the plan as it stands buys.")
    private Optional<BigDecimal> within = Optional.empty();
  }

  @Override
  TimeScale finest() {
    if (asked.by.isEmpty() && asked.in.isEmpty() && asked.within.isEmpty()) {
      throw wrongUsage("meet wants one of --by DATE, --in UNITS and --within MONEY");
    }
    if (asked.within.isPresent()) {
      requireMoney(asked.within.get());
      return new TimeScale(TimeScale.MOST_DECIMALS);
    }
    return asked.in.map(units -> scaleOf("--in", units)).orElse(TimeScale.WHOLE);
  }

  private void requireMoney(BigDecimal most) {
    if (most.signum() < 0) {
      throw wrongUsage("--within wants an amount of 0 or more");
    }
    if (most.stripTrailingZeros().scale() > MOST_MONEY_DECIMALS) {
      throw wrongUsage("--within wants at most 4 decimals");
    }
    if (most.compareTo(MOST_MONEY) > 0) {
      throw wrongUsage("--within wants at most " + MOST_MONEY.toPlainString());
    }
  }

  @Override
  int answer(Case read) throws ResultsNotWritten {
    Wish wish = wish(read);
    try {
      tell(ask(read, wish));
      return Exit.DONE;
    } catch (FinishTooEarly tooEarly) {
      print(err(), MeetText.tooEarly(wish, tooEarly, style(), CurveText.WIDEST));
      return Exit.NO_ANSWER;
    }
  }

  private Wish wish(Case read) {
    if (asked.by.isPresent()) {
      LocalDate date = asked.by.get();
      return read.terms()
          .calendar()
          .map(calendar -> Wish.ByDate.of(date, calendar))
          .orElseThrow(
              () ->
                  wrongUsage(
                      "--by wants a case with dates: a row for start_date in terms.csv, or --in"));
    }
    TimeScale scale = read.network().scale();
    return asked
        .in
        .<Wish>map(units -> new Wish.In(scale.ticks(units)))
        .orElseGet(() -> new Wish.Within(Money.of(asked.within.orElseThrow())));
  }

  private MeetAnswer ask(Case read, Wish wish) throws FinishTooEarly {
    try (ProgressLine progress = ProgressLine.start(err(), isTerminal())) {
      return MeetQuestion.ask(read, wish, crossChecks(read), effort(), progress);
    }
  }

  private void tell(MeetAnswer answer) throws ResultsNotWritten {
    Written written = write(answer.curve(), CurveFiles.of(answer, Version.text()), Set.of());
    String folder = written.folder().toString();
    List<String> lines = new ArrayList<>(MeetText.lines(answer, folder, style(), CurveText.WIDEST));
    lines.addAll(CurveText.written(folder, written.names(), CurveText.WIDEST));
    say(lines, ResultJson.ofMeet(answer, Version.text()));
  }
}
