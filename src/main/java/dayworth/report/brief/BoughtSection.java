package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.decision.MeetAnswer.Bought;
import dayworth.decision.StepReason;
import dayworth.decision.Submission;
import dayworth.engine.Change;
import dayworth.network.Activity;
import dayworth.network.MeasurePackage;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
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
import java.util.List;
import java.util.Optional;

/** What is bought, at what cost and price, and step by step why. */
final class BoughtSection {

  private static final int MOST_CHAINS_NAMED = 4;
  private static final int FIRST_STEPS = 7;
  private static final int LAST_STEPS = 7;
  private static final int MOST_MARKS = 10;

  private final BriefAnswer answer;
  private final Words words;
  private final Outcome outcome;
  private final Numbering numbering;
  private final ChainNames names;
  private final StepWhy why;
  private final List<Stretch> stretches;

  BoughtSection(
      BriefAnswer answer,
      Words words,
      Outcome outcome,
      List<Stretch> stretches,
      Numbering numbering) {
    this.answer = answer;
    this.words = words;
    this.outcome = outcome;
    this.stretches = stretches;
    this.numbering = numbering;
    List<StepReason> told = new ArrayList<>();
    for (Piece piece : shown(pieces())) {
      told.add(answer.reasons().get(piece.reason()));
    }
    this.names = new ChainNames(answer, told);
    this.why = new StepWhy(answer, words, names);
  }

  Section section() {
    List<Part> parts = new ArrayList<>();
    if (answer.chosen().bought().isEmpty()) {
      parts.add(new Part.Prose(List.of("Nothing is bought: the work goes on at its normal pace.")));
    } else {
      parts.add(new Part.Sheet(bought()));
      offChains().ifPresent(parts::add);
      parts.addAll(new BuiltUpMeasures(answer, words, numbering).parts());
      unexplained().ifPresent(parts::add);
      parts.addAll(price());
    }
    if (!answer.reasons().isEmpty()) {
      parts.add(new Part.Sheet(steps()));
    }
    return new Section("bought", "What is bought, and why", parts);
  }

  /** Whether the case says how each activity is shortened. */
  private Optional<Part> unexplained() {
    List<Integer> bare =
        answer.chosen().bought().stream()
            .map(Bought::activity)
            .filter(i -> Ways.measure(answer.of().network(), plan(), i).isEmpty())
            .toList();
    if (bare.isEmpty()) {
      return Optional.empty();
    }
    String of =
        usesMeasures()
            ? "of " + Words.list(bare.stream().map(words::id).toList(), 6)
            : "of each activity";
    return Optional.of(
        new Part.Gap(
            "Not in the case: how this time is made.",
            "The case gives a price for "
                + words.aUnit()
                + " "
                + of
                + ", not the method, crew and hours. Add them as measures.csv or labour.csv, and this"
                + " part names each measure with its build-up and the source of every productivity"
                + " figure."));
  }

  // By activity

  private Table bought() {
    boolean dated = words.hasDates();
    List<Column> columns = new ArrayList<>();
    columns.add(Column.words("Activity"));
    if (usesMeasures()) {
      columns.add(Column.words("Measure"));
    }
    columns.add(Column.words(Words.capital(words.workingUnits())));
    columns.add(Column.figures("Price of " + words.aUnit()));
    columns.add(Column.figures("Cost"));
    columns.add(Column.words(dated ? "Works from, to" : "From, to (" + words.units() + ")"));
    columns.add(Column.words("On the chains"));
    List<Row> rows = new ArrayList<>();
    for (Bought one : answer.chosen().bought()) {
      rows.add(row(one));
    }
    rows.addAll(packages());
    rows.add(sumRow("All shortening", words.money(outcome.extraDirect()), Row.Kind.SUM));
    String gained =
        outcome.gained() > 0
            ? "The " + words.workingTimeInWords(outcome.gained()) + " gained, by activity"
            : "What is shortened, by activity";
    return new Table(numbering.table(), gained, columns, rows, Table.Look.STACKING);
  }

  private Row row(Bought one) {
    Activity activity = answer.of().network().activity(one.activity());
    long now = activity.normal() - one.ticks();
    Money extra = Ways.extra(answer.of().network(), plan(), one.activity());
    String atEnd = now == activity.crash() ? ", its shortest" : "";
    long unit = words.ticksPerUnit();
    long marks =
        one.ticks() % unit == 0 && one.ticks() / unit <= MOST_MARKS ? one.ticks() / unit : 0;
    List<Cell> cells = new ArrayList<>();
    cells.add(new Table.Named(Words.id(activity), Words.name(activity)));
    if (usesMeasures()) {
      cells.add(Cell.of(by(one.activity())));
    }
    cells.addAll(
        List.of(
            new Table.Counted(
                new Part.Tally(
                    (int) marks,
                    false,
                    words.figure(activity.normal()) + " to " + words.figure(now) + atEnd)),
            Cell.of(words.money(extra.times(unit).dividedBy(one.ticks()))),
            Cell.of(words.money(extra)),
            Cell.of(fromTo(one.activity())),
            Cell.of(onChains(one))));
    return new Row(Row.Kind.PLAIN, cells);
  }

  private Plan plan() {
    return answer.chosen().curve().asked().timing().plan();
  }

  private boolean usesMeasures() {
    return plan().usesMeasures();
  }

  /** The measure and what is noted of it. */
  private String by(int activity) {
    return Ways.measure(answer.of().network(), plan(), activity)
        .map(
            measure ->
                Words.safe(measure.name())
                    + (measure.note().isEmpty() ? "" : " (" + Words.safe(measure.note()) + ")"))
        .orElse("along its line");
  }

  private List<Row> packages() {
    List<Row> rows = new ArrayList<>();
    for (int index : plan().packages(answer.of().network())) {
      MeasurePackage shared = answer.of().network().measures().packages().get(index);
      rows.add(
          sumRow(
              "Package " + Words.safe(shared.name()) + ", paid once",
              words.money(shared.cost()),
              Row.Kind.PLAIN));
    }
    return rows;
  }

  private Row sumRow(String name, String cost, Row.Kind kind) {
    List<Cell> cells = new ArrayList<>(List.of(Cell.of(name), Cell.blank(), Cell.blank()));
    if (usesMeasures()) {
      cells.add(Cell.blank());
    }
    cells.addAll(List.of(Cell.of(cost), Cell.blank(), Cell.blank()));
    return new Row(kind, cells);
  }

  private String fromTo(int activity) {
    Timing timing = answer.chosen().curve().asked().timing();
    long from = timing.start(activity);
    long to = timing.finish(activity);
    return words
        .calendar()
        .map(
            dates ->
                answer
                        .of()
                        .status(activity)
                        .started()
                        .map(date -> "began " + Words.dayMonth(date))
                        .orElseGet(() -> Words.dayMonth(dates.startDate(from, to)))
                    + " to "
                    + Words.dayMonth(dates.finishDate(to)))
        .orElseGet(() -> words.figure(from) + " to " + words.figure(to));
  }

  private String onChains(Bought one) {
    List<String> on = names.passing(answer.chosen().chains(), one.activity());
    if (on.isEmpty()) {
      return isCritical(one.activity()) ? "one that is not listed here" : "none, it has float";
    }
    return Words.list(on, MOST_CHAINS_NAMED).replace(" and ", ", ");
  }

  private boolean isCritical(int activity) {
    return answer.of().isCritical(answer.chosen().curve().asked().timing(), activity);
  }

  /** Money that hangs on moments makes it pay to shorten what does not hold the finish. */
  private Optional<Part> offChains() {
    List<Integer> off =
        answer.chosen().bought().stream()
            .map(Bought::activity)
            .filter(i -> !isCritical(i))
            .toList();
    if (off.isEmpty() || answer.of().momentMoney().isNone()) {
      return Optional.empty();
    }
    String ids = Words.list(off.stream().map(words::id).toList(), 6);
    return Optional.of(
        new Part.Prose(
            List.of(
                ids
                    + (off.size() == 1 ? " does" : " do")
                    + " not hold the finish: "
                    + (off.size() == 1 ? "it is" : "they are")
                    + " done faster for the running cost and the money of sections that hang on"
                    + " when single activities are done.")));
  }

  // Cost and price

  private List<Part> price() {
    Submission submission = answer.of().submission();
    Optional<BigDecimal> percent = submission.onCostPercent();
    Optional<Money> proposal = submission.proposalCost();
    if (percent.isEmpty() && proposal.isEmpty()) {
      return List.of(
          new Part.Gap(
              "Not in the case: what turns cost into a price.",
              "All figures here are cost. With rows on_cost_percent and proposal_cost in terms.csv"
                  + " this part adds overheads, profit and the cost of this proposal, and states the"
                  + " price."));
    }
    BigDecimal cost = outcome.extraDirect();
    BigDecimal onCost =
        percent
            .map(p -> cost.multiply(p).movePointLeft(2).setScale(2, RoundingMode.HALF_UP))
            .orElse(BigDecimal.ZERO);
    BigDecimal writing = proposal.map(Money::cents).orElse(BigDecimal.ZERO);
    List<Row> rows = new ArrayList<>();
    rows.add(priceRow("Extra direct cost of the shortening", cost));
    percent.ifPresent(
        p ->
            rows.add(
                priceRow(
                    "On-cost, "
                        + Words.grouped(
                            p.stripTrailingZeros().scale() < 0
                                ? p.setScale(0)
                                : p.stripTrailingZeros())
                        + " % of it",
                    onCost)));
    proposal.ifPresent(p -> rows.add(priceRow("Cost of preparing this proposal", writing)));
    Row sum = priceRow("Price of finishing earlier", cost.add(onCost).add(writing));
    rows.add(new Row(Row.Kind.SUM, sum.cells()));
    List<Part> parts = new ArrayList<>();
    parts.add(
        new Part.Sheet(
            new Table(
                numbering.table(),
                "From cost to price",
                List.of(Column.words("Part"), Column.figures("Amount")),
                rows,
                Table.Look.STACKING)));
    BigDecimal time = outcome.timeRelatedSaved().add(outcome.runningSaved());
    if (time.signum() > 0) {
      parts.add(
          new Part.Prose(
              List.of(
                  "Beside this price, "
                      + words.money(time)
                      + " of time-related and running cost does not arise. To whom that is credited"
                      + " is for the agreement to say.")));
    }
    return parts;
  }

  private Row priceRow(String name, BigDecimal amount) {
    return new Row(Row.Kind.PLAIN, List.of(Cell.of(name), Cell.of(words.money(amount))));
  }

  // Step by step

  /** A step, or the part of one that lies on one side of the chosen finish. */
  private record Piece(int reason, long from, long to, boolean isBought) {}

  private List<Piece> pieces() {
    List<Piece> pieces = new ArrayList<>();
    long first = answer.states().get(0).finish().duration();
    long chosen = answer.finish().duration();
    for (int k = 0; k < answer.reasons().size(); k++) {
      long from = answer.reasons().get(k).step().from();
      long to = answer.reasons().get(k).step().to();
      if (to >= first) {
        continue;
      }
      from = Math.min(from, first);
      if (from > chosen) {
        pieces.add(new Piece(k, from, Math.max(to, chosen), true));
      }
      if (to < chosen) {
        pieces.add(new Piece(k, Math.min(from, chosen), to, false));
        break;
      }
    }
    return pieces;
  }

  /** Of very many the first and the last. */
  private static List<Piece> shown(List<Piece> all) {
    if (all.size() <= FIRST_STEPS + LAST_STEPS + 1) {
      return all;
    }
    List<Piece> some = new ArrayList<>(all.subList(0, FIRST_STEPS));
    some.addAll(all.subList(all.size() - LAST_STEPS, all.size()));
    return some;
  }

  private Table steps() {
    List<Piece> all = pieces();
    List<Piece> shown = shown(all);
    List<Row> rows = new ArrayList<>();
    for (int i = 0; i < shown.size(); i++) {
      if (i == FIRST_STEPS && shown.size() < all.size()) {
        int left = all.size() - shown.size();
        rows.add(
            new Row(
                Row.Kind.QUIET,
                List.of(
                    Cell.of(left + " more steps"),
                    Cell.blank(),
                    Cell.blank(),
                    Cell.of("are not shown here; steps.csv has them."))));
      }
      rows.add(row(shown.get(i)));
    }
    return new Table(
        numbering.table(),
        "Step by step: the chains that hold the finish, and the cheapest way to shorten all of them"
            + " by one "
            + words.unit()
            + ". What is shortened is underlined, what is given back is underlined with dashes.",
        List.of(
            Column.words(Words.capital(words.units())),
            Column.words("Price of " + words.aUnit()),
            Column.words("Chains that force it"),
            Column.words("Why")),
        rows,
        Table.Look.REASONS);
  }

  private Row row(Piece piece) {
    StepReason reason = answer.reasons().get(piece.reason());
    String because = why.of(piece.reason());
    return new Row(
        piece.isBought() ? Row.Kind.PLAIN : Row.Kind.QUIET,
        List.of(
            Cell.of(words.figure(piece.from()) + " to " + words.figure(piece.to())),
            addUp(reason),
            chains(reason),
            Cell.of(piece.isBought() ? because : because + " " + notBought())));
  }

  private String notBought() {
    Optional<Stretch> next =
        stretches.stream()
            .filter(stretch -> stretch.from() == answer.finish().duration())
            .findFirst();
    if (!outcome.hasWorth() || next.isEmpty()) {
      return "Not bought.";
    }
    String worth =
        Words.capital(words.aUnit()) + " is worth " + words.money(next.get().worth()) + " here, ";
    return next.get().pays()
        ? worth + "more than its price, but the total falls no further; not bought."
        : worth + "less than its price: not bought.";
  }

  private Cell addUp(StepReason reason) {
    List<Table.Addend> addends = new ArrayList<>();
    Money sum = Money.ZERO;
    for (Change change : reason.step().changes()) {
      Activity activity = answer.of().network().activity(change.activity());
      Money share = share(reason, change.activity());
      sum = sum.plus(share);
      addends.add(
          new Table.Addend(Words.shortId(activity), words.amount(share), change.isRelaxation()));
    }
    Money price = reason.step().pricePerTick().times(words.ticksPerUnit());
    Money other = price.minus(sum);
    if (!other.isZero()) {
      String name = answer.of().momentMoney().isNone() ? "packages" : "other";
      addends.add(new Table.Addend(name, words.amount(other), false));
    }
    if (addends.size() > 8) {
      int left = addends.size() - 7;
      addends = new ArrayList<>(addends.subList(0, 7));
      addends.add(new Table.Addend("and " + left + " more", "", false));
    }
    return new Table.AddUp(addends, words.money(price));
  }

  /** What an activity adds to the price of a unit, exactly. */
  private Money share(StepReason reason, int activity) {
    Network network = answer.of().network();
    return Ways.extra(network, reason.after(), activity)
        .minus(Ways.extra(network, reason.before(), activity))
        .times(words.ticksPerUnit())
        .dividedBy(reason.step().ticks());
  }

  private Cell chains(StepReason reason) {
    List<Table.Chain> chains = new ArrayList<>();
    for (List<Integer> chain : reason.chains()) {
      chains.add(
          new Table.Chain(names.of(chain), chain.stream().map(i -> knot(reason, i)).toList()));
    }
    String rest =
        reason.hasAllChains()
            ? ""
            : "these are some of " + FinishTelling.chainCount(reason.chainCount());
    return new Table.Chains(chains, rest);
  }

  private Table.Knot knot(StepReason reason, int activity) {
    Table.Knot.Change change = Table.Knot.Change.NONE;
    for (Change one : reason.step().changes()) {
      if (one.activity() == activity) {
        change = one.isRelaxation() ? Table.Knot.Change.GIVEN_BACK : Table.Knot.Change.SHORTENED;
      }
    }
    return new Table.Knot(Words.shortId(answer.of().network().activity(activity)), change);
  }
}
