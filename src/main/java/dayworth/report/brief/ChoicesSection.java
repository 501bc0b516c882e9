package dayworth.report.brief;

import dayworth.contract.Per;
import dayworth.decision.BestByRate;
import dayworth.decision.BriefAnswer;
import dayworth.decision.Choice;
import dayworth.decision.Finish;
import dayworth.decision.WeighAnswer;
import dayworth.decision.Weighing;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.page.Section;
import dayworth.report.brief.page.Table;
import dayworth.report.brief.page.Table.Cell;
import dayworth.report.brief.page.Table.Column;
import dayworth.report.brief.page.Table.Row;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Function;

/** The choices side by side, and how far the one that is put forward holds. */
final class ChoicesSection {

  private static final int MOST_CHOICES = 6;
  private static final int MOST_RANGES = 12;
  private static final List<Long> DEARER = List.of(10L, 25L, 50L);

  private final BriefAnswer answer;
  private final Words words;
  private final Outcome outcome;
  private final Numbering numbering;
  private final List<String> names = new ArrayList<>();
  private final List<Finish> choices = new ArrayList<>();
  private final List<String> notes = new ArrayList<>();

  ChoicesSection(BriefAnswer answer, Words words, Outcome outcome, Numbering numbering) {
    this.answer = answer;
    this.words = words;
    this.outcome = outcome;
    this.numbering = numbering;
    choose(answer.weigh().granted());
  }

  private void choose(Weighing weighing) {
    List<Choice> inOrder = new ArrayList<>(weighing.choices());
    inOrder.sort(Comparator.comparing(choice -> choice.kind() == Choice.Kind.MOST_BONUS));
    for (Choice choice : inOrder) {
      add(name(choice), choice.finish());
      if (choice.kind() == Choice.Kind.LEAST_TOTAL && !answer.isLeastTotal()) {
        add("Put forward", answer.finish());
      }
    }
  }

  private void add(String name, Finish finish) {
    for (int i = 0; i < choices.size(); i++) {
      Finish other = choices.get(i);
      if (other.duration() == finish.duration() && other.total().compareTo(finish.total()) == 0) {
        notes.add(names.get(i) + " and " + name.toLowerCase(Locale.ROOT) + " are the same finish.");
        return;
      }
    }
    if (choices.size() == MOST_CHOICES) {
      notes.add(
          name
              + " is left out for want of room: "
              + words.both(finish.duration())
              + ", "
              + words.money(outcome.depends(finish))
              + ".");
    } else {
      names.add(name);
      choices.add(finish);
    }
  }

  private String name(Choice choice) {
    return switch (choice.kind()) {
      case AS_IT_STANDS ->
          Outcome.damages(outcome.planned()).signum() > 0 ? "Carry on and pay" : "Carry on";
      case LEAST_TOTAL -> "Least total";
      case CONTRACT_FINISH -> "Contract finish";
      case SECTION_DATE -> Words.safe(choice.section()) + " on time";
      case MOST_BONUS -> "Most bonus";
      case SHORTEST -> "Shortest";
    };
  }

  Section section() {
    List<Part> parts = new ArrayList<>();
    parts.add(new Part.Drawn(new ChoicePicture(words, outcome, choices, names).picture(), table()));
    if (!notes.isEmpty()) {
      parts.add(new Part.Remark("Note on the choices", List.of(new Part.Notes(notes))));
    }
    Weighing granted = answer.weigh().granted();
    List<Part> ranges = new ArrayList<>();
    granted
        .byDamages()
        .filter(best -> best.ranges().size() > 1)
        .ifPresent(
            best ->
                ranges.add(
                    ranges(best, "damages", "Damages for ", answer.of().terms().damages().per())));
    if (granted.byTimeRelated().ranges().size() > 1) {
      ranges.add(
          ranges(
              granted.byTimeRelated(),
              "time-related cost",
              "Time-related cost for ",
              answer.of().terms().timeRelated().per()));
    }
    if (ranges.isEmpty()) {
      parts.add(new Part.Remark("How far this holds", List.of(new Part.Notes(firm(granted)))));
    } else {
      parts.add(
          new Part.Beside(
              ranges,
              new Part.Remark("How far this holds", List.of(new Part.Notes(firm(granted))))));
    }
    answer.weigh().claimed().ifPresent(claimed -> parts.addAll(claimed(answer.weigh(), claimed)));
    return new Section("choices", "The choices side by side", parts);
  }

  // The table

  private Table table() {
    List<Column> columns = new ArrayList<>();
    columns.add(Column.words(""));
    for (int i = 0; i < choices.size(); i++) {
      boolean chosen = choices.get(i).duration() == answer.finish().duration() && isPutForward(i);
      columns.add(new Column(names.get(i), chosen ? Column.Content.CHOSEN : Column.Content.WORDS));
    }
    List<Row> rows = new ArrayList<>();
    if (words.hasDates()) {
      rows.add(row("Finish", finish -> words.finish(finish.duration())));
    }
    rows.add(row(Words.capital(words.workingUnits()), finish -> words.figure(finish.duration())));
    if (outcome.contract().isPresent()) {
      rows.add(
          row(
              "Against the contract finish",
              finish -> outcome.lateness(finish, words).orElseThrow()));
    }
    rows.add(row("Extra direct cost", finish -> words.money(outcome.extraDirect(finish))));
    if (outcome.hasRunning()) {
      rows.add(row("Running cost", finish -> words.money(Outcome.running(finish))));
    }
    if (outcome.hasTimeRelated()) {
      rows.add(row("Time-related cost", finish -> words.money(Outcome.timeRelated(finish))));
    }
    if (outcome.hasDamages()) {
      rows.add(row("Damages", finish -> words.money(Outcome.damages(finish))));
    }
    if (outcome.hasBonus()) {
      rows.add(row("Bonus", finish -> words.money(Outcome.bonus(finish).negate())));
    }
    Row total =
        row("Total that depends on the finish", finish -> words.money(outcome.depends(finish)));
    rows.add(new Row(Row.Kind.SUM, total.cells()));
    rows.add(row("Against carrying on", finish -> words.money(outcome.better(finish).negate())));
    String caption =
        Words.capital(Words.count(choices.size(), "finish", "finishes"))
            + " worth comparing, drawn and written in the same columns."
            + (outcome.sameForAll().signum() == 0 ? "" : " What is the same in all is left out.");
    return new Table(numbering.table(), caption, columns, rows, Table.Look.EVEN);
  }

  private boolean isPutForward(int i) {
    return choices.get(i).total().compareTo(answer.finish().total()) == 0;
  }

  private Row row(String name, Function<Finish, String> cell) {
    List<Cell> cells = new ArrayList<>();
    cells.add(Cell.of(name));
    choices.forEach(finish -> cells.add(Cell.of(cell.apply(finish))));
    return new Row(Row.Kind.PLAIN, cells);
  }

  // How far it holds

  private Part ranges(BestByRate best, String money, String head, Per per) {
    List<BestByRate.Range> ranges = best.ranges();
    int now = ranges.indexOf(best.present());
    int first = Math.max(0, Math.min(now - MOST_RANGES / 2, ranges.size() - MOST_RANGES));
    int end = Math.min(ranges.size(), first + MOST_RANGES);
    List<Row> rows = new ArrayList<>();
    for (int i = first; i < end; i++) {
      BestByRate.Range range = ranges.get(i);
      List<Cell> cells = new ArrayList<>();
      cells.add(Cell.of(span(range) + (i == now ? " (now " + words.money(best.now()) + ")" : "")));
      String capped = range.isCapped() ? ", damages at their cap" : "";
      if (words.hasDates()) {
        cells.add(Cell.of(words.finish(range.finish().duration()) + capped));
      } else {
        cells.add(Cell.of(words.time(range.finish().duration()) + capped));
      }
      cells.add(Cell.of(words.figure(range.finish().duration())));
      rows.add(new Row(i == now ? Row.Kind.CHOSEN : Row.Kind.PLAIN, cells));
    }
    String left =
        end - first < ranges.size()
            ? "; " + (ranges.size() - end + first) + " more are in weigh.csv"
            : "";
    return new Part.Sheet(
        new Table(
            numbering.table(),
            "Which finish is best, if the rate of " + money + " were different" + left,
            List.of(
                Column.words(head + words.one(per)),
                Column.words("Best finish"),
                Column.figures(Words.capital(words.units()))),
            rows,
            Table.Look.STACKING));
  }

  private String span(BestByRate.Range range) {
    String from = words.money(range.from());
    Optional<String> to = range.to().map(words::money);
    if (range.from().isZero()) {
      return to.map(end -> "up to " + end).orElse("whatever it is");
    }
    return to.map(end -> from + " to " + end).orElse("above " + from);
  }

  private List<String> firm(Weighing weighing) {
    List<String> said = new ArrayList<>();
    said.add(holds(weighing));
    if (outcome.hasWorth() && weighing.byCompression().ranges().size() > 1) {
      long most = DEARER.get(DEARER.size() - 1);
      Money multiple = Money.of(100 + most).dividedBy(100);
      BigDecimal then =
          weighing
              .totalAt(weighing.asItStands(), multiple)
              .cents()
              .subtract(weighing.totalAt(answer.finish(), multiple).cents());
      said.add(
          "If shortening cost "
              + most
              + "\u00a0% more than estimated, the finish put forward would "
              + (then.signum() >= 0
                  ? "still be " + words.money(then) + " better"
                  : "be " + words.money(then.negate()) + " dearer")
              + " than carrying on.");
    }
    for (Weighing.WrongRate wrong : weighing.wrongRates()) {
      if (!wrong.tooMuch().isZero() && !wrong.rate().equals(answer.of().terms().damages().rate())) {
        said.add(
            "If damages were really "
                + words.money(wrong.rate())
                + " "
                + words.one(answer.of().terms().damages().per())
                + ", the least total of today would cost "
                + words.money(wrong.tooMuch())
                + " too much: "
                + words.finish(wrong.best().duration())
                + " would be best.");
      }
    }
    return said;
  }

  private String holds(Weighing weighing) {
    BestByRate.Range range = weighing.byCompression().present();
    String name =
        "The least total, " + words.finish(weighing.best().duration()) + ", stays the best ";
    Optional<String> less =
        Optional.of(range.from())
            .filter(from -> !from.isZero())
            .map(from -> percent(Money.of(1).minus(from)) + "\u00a0% less");
    Optional<String> more = range.to().map(to -> percent(to.minus(Money.of(1))) + "\u00a0% more");
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
    return Words.grouped(tenths.scale() < 0 ? tenths.setScale(0) : tenths);
  }

  // With the extension of time that is claimed

  private List<Part> claimed(WeighAnswer weigh, Weighing claimed) {
    List<Row> rows = new ArrayList<>();
    for (Choice choice : claimed.choices()) {
      Finish finish = choice.finish();
      rows.add(
          new Row(
              choice.kind() == Choice.Kind.LEAST_TOTAL ? Row.Kind.CHOSEN : Row.Kind.PLAIN,
              List.of(
                  Cell.of(name(choice)),
                  Cell.of(words.both(finish.duration())),
                  Cell.of(words.money(Outcome.damages(finish))),
                  Cell.of(words.money(outcome.depends(finish))),
                  Cell.of(words.money(claimed.saved(finish).negate())))));
    }
    String due = answer.of().terms().extension().map(e -> words.due(e.due())).orElseThrow();
    List<Part> parts = new ArrayList<>();
    parts.add(
        new Part.Sheet(
            new Table(
                numbering.table(),
                "The same choices if the extension to " + due + ", which is claimed, were granted",
                List.of(
                    Column.words("Choice"),
                    Column.words("Finish"),
                    Column.figures("Damages"),
                    Column.figures("Total"),
                    Column.figures("Against carrying on")),
                rows,
                Table.Look.STACKING)));
    List<Row> by = new ArrayList<>();
    weigh
        .byExtension()
        .forEach(
            range ->
                by.add(
                    new Row(
                        Row.Kind.PLAIN,
                        List.of(
                            Cell.of(
                                range
                                    .to()
                                    .map(
                                        to ->
                                            to == range.from()
                                                ? String.valueOf(to)
                                                : range.from() + " to " + to)
                                    .orElse(range.from() + " or more")),
                            Cell.of(words.both(range.best().duration()))))));
    parts.add(
        new Part.Sheet(
            new Table(
                numbering.table(),
                "Which finish is best, by the working days of extension that are granted",
                List.of(Column.words("Working days granted"), Column.words("Best finish")),
                by.subList(0, Math.min(by.size(), MOST_RANGES)),
                Table.Look.STACKING)));
    return parts;
  }
}
