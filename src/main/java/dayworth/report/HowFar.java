package dayworth.report;

import dayworth.contract.Per;
import dayworth.decision.BestByRate;
import dayworth.decision.Case;
import dayworth.decision.Finish;
import dayworth.decision.Weighing;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/** How far the best choice holds, for a terminal. */
final class HowFar {

  private static final String INDENT = "    ";

  /** What shortening may cost more than estimated, in per cent. */
  private static final List<Long> DEARER = List.of(10L, 25L, 50L);

  private final Weighing weighing;
  private final Case of;
  private final Style style;
  private final int width;
  private final List<String> lines = new ArrayList<>();

  HowFar(Weighing weighing, Style style, int width) {
    this.weighing = weighing;
    this.of = weighing.curve().of();
    this.style = style;
    this.width = width;
  }

  /** A block for each rate, for the cost of shortening, and for a wrong damages rate. */
  List<String> lines() {
    weighing.byDamages().ifPresent(best -> byRate(best, "damages", of.terms().damages().per()));
    byRate(weighing.byTimeRelated(), "time-related cost", of.terms().timeRelated().per());
    dearer();
    wrongRates();
    return lines;
  }

  private void byRate(BestByRate best, String money, Per per) {
    lines.add("");
    if (best.ranges().size() == 1) {
      String finish = when(best.present().finish());
      prose("Whatever the rate of " + money + ", " + finish + " is best.");
      return;
    }
    String title = "Which finish is best, if " + money + " for " + Lateness.one(of, per) + " were";
    lines.addAll(new BreakEvenTable(of, best).lines(title, style, width));
  }

  private void dearer() {
    lines.add("");
    prose(holds());
    if (weighing.byCompression().ranges().size() == 1) {
      return;
    }
    List<Money> multiples =
        DEARER.stream().map(percent -> Money.of(100 + percent).dividedBy(100)).toList();
    List<Finish> best =
        multiples.stream().map(x -> weighing.byCompression().at(x).finish()).toList();
    List<BigDecimal> totals = new ArrayList<>();
    List<BigDecimal> chosen = new ArrayList<>();
    for (int i = 0; i < multiples.size(); i++) {
      totals.add(total(best.get(i), multiples.get(i)));
      chosen.add(total(weighing.best(), multiples.get(i)));
    }
    MoneyLook look = MoneyLook.of(Stream.concat(totals.stream(), chosen.stream()).toList());
    TextColumns columns = new TextColumns(width - INDENT.length());
    columns.add("", false, DEARER.stream().map(percent -> percent + " % more").toList());
    columns.add("this choice", true, chosen.stream().map(look::text).toList());
    columns.add("least then", true, totals.stream().map(look::text).toList());
    addFinishes(columns, best);
    columns.lines().forEach(line -> lines.add(INDENT + line));
    if (!of.momentMoney().isNone()) {
      prose(
          "Each finish keeps its plan here; where running cost or sections weigh in, another plan may"
              + " be cheaper then.");
    }
  }

  /** Without the money that is the same in every choice. */
  private BigDecimal total(Finish finish, Money multiple) {
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

  private String holds() {
    BestByRate.Range range = weighing.byCompression().present();
    String name = when(weighing.best()) + " stays best ";
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

  private void wrongRates() {
    if (weighing.wrongRates().isEmpty()) {
      return;
    }
    lines.add("");
    if (weighing.wrongRates().stream().allMatch(wrong -> wrong.tooMuch().isZero())) {
      prose("It also stays best without damages, and at half or twice their rate.");
      return;
    }
    prose("What this choice costs too much if the damages rate is really another");
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
            .map(r -> r.tooMuch().isZero() ? "still the best" : "best then: " + when(r.best()))
            .toList());
    columns.lines().forEach(line -> lines.add(INDENT + line));
  }

  private String when(Finish finish) {
    return Wording.when(of, finish.duration(), "", "");
  }

  private void prose(String text) {
    lines.addAll(Wording.wrap(text, Wording.INDENT, width));
  }
}
