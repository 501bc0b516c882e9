package dayworth.report;

import dayworth.contract.Per;
import dayworth.decision.BestByRate;
import dayworth.decision.Case;
import dayworth.decision.Finish;
import dayworth.decision.WeighAnswer;
import dayworth.decision.WeighAnswer.ByExtension;
import dayworth.decision.Weighing;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;

/** The short answer of {@code dayworth weigh} for a terminal. */
public final class WeighText {

  private static final String INDENT = "    ";

  private static final int MOST_EXTENSIONS = 12;

  /** What shortening may cost more than estimated, in per cent. */
  private static final List<Long> DEARER = List.of(10L, 25L, 50L);

  private final WeighAnswer answer;
  private final Case of;
  private final Style style;
  private final int width;

  private WeighText(WeighAnswer answer, Style style, int width) {
    this.answer = answer;
    this.of = answer.of();
    this.style = style;
    this.width = Math.min(width, CurveText.WIDEST);
  }

  /**
   * The lines of the answer; the first says it all.
   *
   * @param width columns of the terminal
   */
  public static List<String> lines(WeighAnswer answer, Style style, int width) {
    return new WeighText(answer, style, width).lines();
  }

  private List<String> lines() {
    Weighing granted = answer.granted();
    ChoiceTable table = new ChoiceTable(granted);
    List<String> lines = new ArrayList<>();
    String sentence = sentence(granted, table.look());
    lines.add(style.bold(Wording.answer(sentence, of.currency(), width)));
    lines.add("");
    lines.addAll(table.lines(width));
    if (!CurveText.ties(granted.curve()).isEmpty()) {
      prose(lines, CurveText.ties(granted.curve()));
    }
    if (!table.leftOut().isEmpty()) {
      lines.add("");
      prose(lines, table.leftOut());
    }
    howFar(lines, granted);
    answer.claimed().ifPresent(claimed -> claimed(lines, claimed));
    lines.add("");
    prose(lines, CurveText.proof(granted.curve()));
    lines.add("");
    prose(
        lines,
        "Damages, bonus and entitlement depend on the contract and the law that governs it. This"
            + " is not legal advice: read the contract and take advice from a licensed"
            + " professional."
            + (answer.claimed().isEmpty()
                ? ""
                : " Whether an extension of time is due is not judged here."));
    return lines;
  }

  private String sentence(Weighing weighing, MoneyLook look) {
    BigDecimal saved = weighing.saved(weighing.best());
    if (saved.signum() <= 0) {
      return "Carry on as planned: no other finish is cheaper.";
    }
    boolean pays = weighing.asItStands().other().damages().signum() > 0;
    return "Finish "
        + when(weighing.best(), "on ", "in ")
        + ": "
        + look.text(saved)
        + " better than carrying on"
        + (pays ? " and paying damages." : ".");
  }

  /** A finish by its date, or without dates by its duration. */
  private String when(Finish finish, String beforeDate, String beforeDuration) {
    Dates dates = new Dates(of);
    return dates.areKnown()
        ? dates.spokenFinish(beforeDate, finish.duration(), "")
        : beforeDuration + Wording.workingDuration(of, finish.duration());
  }

  private void claimed(List<String> lines, Weighing claimed) {
    ChoiceTable table = new ChoiceTable(claimed);
    String due =
        claimed
            .curve()
            .of()
            .terms()
            .contractFinish()
            .map(
                by ->
                    by.date().map(Dates::spoken).orElseGet(() -> Wording.duration(of, by.ticks())))
            .orElseThrow();
    lines.add("");
    String granted = "Were the extension to " + due + " granted, which is claimed and is not: ";
    String better = sentence(claimed, table.look());
    String start = better.substring(0, 1).toLowerCase(Locale.ROOT);
    Wording.wrap(granted + start + better.substring(1), Wording.INDENT, width)
        .forEach(line -> lines.add(style.bold(line)));
    lines.add("");
    lines.addAll(table.lines(width));
    howFar(lines, claimed);
    lines.add("");
    lines.add("  Which finish is best, by the working days of extension");
    extensions().forEach(line -> lines.add(INDENT + line));
  }

  private List<String> extensions() {
    List<ByExtension> all = answer.byExtension().stream().limit(MOST_EXTENSIONS).toList();
    TextColumns columns = new TextColumns(width - INDENT.length());
    columns.add("", false, all.stream().map(WeighText::range).toList());
    Dates dates = new Dates(of);
    if (dates.areKnown()) {
      columns.add("", false, dates.column(all.stream().map(e -> e.best().duration()).toList()));
    }
    columns.add(
        "", true, all.stream().map(e -> Wording.duration(of, e.best().duration())).toList());
    List<String> lines = new ArrayList<>(columns.lines().subList(1, all.size() + 1));
    int left = answer.byExtension().size() - all.size();
    if (left > 0) {
      lines.add(Wording.count(left, "row is", "rows are") + " left out: see result.json");
    }
    return lines;
  }

  private static String range(ByExtension extension) {
    String from = String.format(Locale.ROOT, "%,d", extension.from());
    if (extension.to().isEmpty()) {
      return extension.from() == 0 ? "any" : from + " and more";
    }
    String to = String.format(Locale.ROOT, "%,d", extension.to().get());
    return from.equals(to) ? from : from + " to " + to;
  }

  private void howFar(List<String> lines, Weighing weighing) {
    weighing
        .byDamages()
        .ifPresent(best -> byRate(lines, best, "damages", of.terms().damages().per()));
    byRate(lines, weighing.byTimeRelated(), "time-related cost", of.terms().timeRelated().per());
    dearer(lines, weighing);
    wrongRates(lines, weighing);
  }

  private void byRate(List<String> lines, BestByRate best, String money, Per per) {
    lines.add("");
    if (best.ranges().size() == 1) {
      String finish = when(best.present().finish(), "", "");
      prose(lines, "Whatever the rate of " + money + ", " + finish + " is best.");
      return;
    }
    String title = "Which finish is best, if " + money + " for " + Lateness.one(of, per) + " were";
    lines.addAll(new BreakEvenTable(of, best).lines(title, style, width));
  }

  private void dearer(List<String> lines, Weighing weighing) {
    lines.add("");
    prose(lines, holds(weighing));
    List<Money> multiples =
        DEARER.stream().map(percent -> Money.of(100 + percent).dividedBy(100)).toList();
    List<Finish> best =
        multiples.stream().map(x -> weighing.byCompression().at(x).finish()).toList();
    List<BigDecimal> totals = new ArrayList<>();
    List<BigDecimal> chosen = new ArrayList<>();
    for (int i = 0; i < multiples.size(); i++) {
      totals.add(total(weighing, best.get(i), multiples.get(i)));
      chosen.add(total(weighing, weighing.best(), multiples.get(i)));
    }
    MoneyLook look = MoneyLook.of(Stream.concat(totals.stream(), chosen.stream()).toList());
    TextColumns columns = new TextColumns(width - INDENT.length());
    columns.add("", false, DEARER.stream().map(percent -> percent + " % more").toList());
    columns.add("this choice", true, chosen.stream().map(look::text).toList());
    columns.add("least then", true, totals.stream().map(look::text).toList());
    addFinishes(columns, best);
    columns.lines().forEach(line -> lines.add((INDENT + line).stripTrailing()));
  }

  /** Without the money that is the same in every choice. */
  private static BigDecimal total(Weighing weighing, Finish finish, Money multiple) {
    Finish planned = weighing.asItStands();
    return weighing
        .totalAt(finish, multiple)
        .cents()
        .subtract(planned.direct().cents())
        .subtract(planned.other().fixed().cents());
  }

  private void addFinishes(TextColumns columns, List<Finish> finishes) {
    Dates dates = new Dates(of);
    if (dates.areKnown()) {
      columns.add("", false, dates.column(finishes.stream().map(Finish::duration).toList()));
    }
    columns.add("", true, finishes.stream().map(f -> Wording.duration(of, f.duration())).toList());
  }

  private String holds(Weighing weighing) {
    BestByRate.Range range = weighing.byCompression().present();
    String name = when(weighing.best(), "", "") + " stays best ";
    Optional<String> less =
        Optional.of(range.from())
            .filter(from -> !from.isZero())
            .map(from -> percent(Money.of(1).minus(from)) + " % less");
    Optional<String> more = range.to().map(to -> percent(to.minus(Money.of(1))) + " % more");
    if (more.isEmpty()) {
      return name
          + less.map(share -> "until shortening costs " + share + " than estimated.")
              .orElse("whatever shortening costs.");
    }
    return name
        + less.map(share -> "while shortening costs from " + share + " to " + more.get())
            .orElse("until shortening costs " + more.get())
        + " than estimated.";
  }

  /** Rounded down to a tenth of a per cent, so that no more is promised than holds. */
  private static String percent(Money share) {
    BigDecimal tenths = share.times(100).rounded(1, RoundingMode.FLOOR).stripTrailingZeros();
    return Wording.grouped(tenths.scale() < 0 ? tenths.setScale(0) : tenths);
  }

  private void wrongRates(List<String> lines, Weighing weighing) {
    if (weighing.wrongRates().isEmpty()) {
      return;
    }
    lines.add("");
    if (weighing.wrongRates().stream().allMatch(wrong -> wrong.tooMuch().isZero())) {
      prose(lines, "It also stays best without damages, and at half or twice their rate.");
      return;
    }
    prose(lines, "What this choice costs too much if the damages rate is really another");
    TextColumns columns = new TextColumns(width - INDENT.length());
    List<Weighing.WrongRate> rates = weighing.wrongRates();
    MoneyLook look =
        MoneyLook.of(
            rates.stream()
                .flatMap(r -> List.of(r.rate().cents(), r.tooMuch().cents()).stream())
                .toList());
    columns.add("rate", true, rates.stream().map(r -> look.text(r.rate().cents())).toList());
    columns.add("too much", true, rates.stream().map(r -> look.text(r.tooMuch().cents())).toList());
    columns.add(
        "",
        false,
        rates.stream()
            .map(
                r ->
                    r.tooMuch().isZero()
                        ? "still the best"
                        : "best then: " + when(r.best(), "", ""))
            .toList());
    columns.lines().forEach(line -> lines.add(INDENT + line));
  }

  private void prose(List<String> lines, String text) {
    lines.addAll(Wording.wrap(text, Wording.INDENT, width));
  }
}
