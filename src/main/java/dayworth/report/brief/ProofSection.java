package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.decision.Finish;
import dayworth.decision.PlanProof;
import dayworth.engine.proof.Arc;
import dayworth.engine.proof.ProofSheet;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.page.Section;
import dayworth.report.brief.page.Table;
import dayworth.report.brief.page.Table.Cell;
import dayworth.report.brief.page.Table.Column;
import dayworth.report.brief.page.Table.Row;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Why no cheaper plan exists, with the sheet that proves it, and every finish with all its money.
 */
final class ProofSection {

  private static final int MOST_BRANCHES = 60;

  private final BriefAnswer answer;
  private final Words words;
  private final Outcome outcome;
  private final List<Stretch> stretches;
  private final Numbering numbering;
  private final PlanProof proof;

  ProofSection(
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
    this.proof = answer.chosen().proof();
  }

  Section section() {
    List<Part> parts = new ArrayList<>();
    String name = numbering.table();
    if (proof.blocks().size() == 1) {
      ProofSheet sheet = proof.blocks().get(0).sheet();
      parts.add(new Part.Claim(claim(name, sheet)));
      parts.add(new Part.Sheet(sheet(name, proof.blocks().get(0).network(), sheet)));
    } else {
      parts.add(new Part.Claim(branchedClaim(name)));
      parts.add(new Part.Sheet(branches(name)));
    }
    parts.add(new Part.Sheet(finishes()));
    String title =
        isProved() ? "No cheaper plan exists" : "How much cheaper another plan could be at most";
    return new Section("proof", title, parts);
  }

  private boolean isProved() {
    return proof.blocks().size() == 1
        || cents(proof.bound()).compareTo(cents(proof.planCost())) >= 0;
  }

  // One flow proves it

  private String claim(String name, ProofSheet sheet) {
    String flow =
        sheet.rows().stream()
            .filter(row -> row.arc().filter(arc -> arc.over() == Arc.Over.PROMISE).isPresent())
            .findFirst()
            .flatMap(ProofSheet.Row::flow)
            .map(words::money)
            .orElse(words.money(BigDecimal.ZERO));
    String total = words.money(cents(beyondFixed(sheet, true)));
    return name
        + " gives each activity a rate for "
        + words.aUnit()
        + ", never above its own price of "
        + words.aUnit()
        + " unless it is already at its shortest, and all that enters a point of the network leaves"
        + " it again: "
        + flow
        + " from start to finish. Whatever the plan, a finish in "
        + words.time(answer.finish().duration())
        + " then cannot cost less in shortening than the fourth column adds up to, "
        + total
        + "; and this plan costs exactly that.";
  }

  private static BigDecimal cents(BigDecimal amount) {
    return amount.setScale(2, RoundingMode.HALF_UP);
  }

  /** What a sheet adds up to without the cheapest way of each activity, which is on both sides. */
  private static BigDecimal beyondFixed(ProofSheet sheet, boolean bound) {
    return sheet.rows().stream()
        .filter(row -> row.kind() != ProofSheet.Kind.FIXED)
        .map(row -> (bound ? row.bound() : row.planCost()).orElse(BigDecimal.ZERO))
        .reduce(BigDecimal.ZERO, BigDecimal::add);
  }

  private Table sheet(String name, Network network, ProofSheet sheet) {
    List<Row> rows = new ArrayList<>();
    for (ProofSheet.Row row : sheet.rows()) {
      boolean told =
          row.kind() != ProofSheet.Kind.FIXED
              && (row.bound().filter(b -> b.signum() != 0).isPresent()
                  || row.planCost().isPresent());
      if (told) {
        rows.add(row(network, row));
      }
    }
    rows.add(
        new Row(
            Row.Kind.SUM,
            List.of(
                Cell.of("Equal, so proved"),
                Cell.blank(),
                Cell.blank(),
                Cell.of(number(beyondFixed(sheet, true))),
                Cell.blank(),
                Cell.of(number(beyondFixed(sheet, false))))));
    String in = words.currencyName().isEmpty() ? "" : ", in " + words.currencyName();
    return new Table(
        name,
        "Proof sheet for "
            + words.time(answer.finish().duration())
            + in
            + ", without the cheapest cost of each activity, which every plan pays. Add up both"
            + " columns: they meet.",
        List.of(
            Column.words("Activity or wait"),
            Column.figures("Rate for " + words.aUnit()),
            Column.figures(Words.capital(words.units())),
            Column.figures("Must cost at least"),
            Column.figures("Plan buys"),
            Column.figures("Plan costs")),
        rows,
        Table.Look.SCROLLING);
  }

  private Row row(Network network, ProofSheet.Row row) {
    return new Row(
        Row.Kind.PLAIN,
        List.of(
            name(network, row),
            Cell.of(row.flow().map(this::number).orElse("")),
            Cell.of(row.length().map(Words::grouped).orElse("")),
            Cell.of(row.bound().map(this::number).orElse("")),
            Cell.of(buys(network, row)),
            Cell.of(row.planCost().map(this::number).orElse(""))));
  }

  private String buys(Network network, ProofSheet.Row row) {
    if (row.planCost().isEmpty() || row.activity() < 0 || row.arc().isEmpty()) {
      return "";
    }
    Activity activity = network.activity(row.activity());
    long now = answer.chosen().curve().asked().timing().plan().duration(row.activity());
    long from = row.arc().get().over() == Arc.Over.SLOPE ? activity.normal() : activity.crash();
    return words.figure(Math.abs(from - now))
        + " × "
        + words.amount(activity.slope().times(words.ticksPerUnit()));
  }

  private Cell name(Network network, ProofSheet.Row row) {
    if (row.kind() == ProofSheet.Kind.ROUNDING) {
      return Cell.of("Lost by rounding the rates");
    }
    if (row.arc().isEmpty()) {
      return Cell.of(row.name().isEmpty() ? "Money that every plan pays" : Words.safe(row.name()));
    }
    Arc arc = row.arc().get();
    return switch (arc.over()) {
      case SLOPE -> named(network, arc.index(), "");
      case CRASH -> named(network, arc.index(), ", at its shortest");
      case BACK_OVER_NORMAL -> named(network, arc.index(), ", no longer than normal");
      case BACK_OVER_CRASH -> named(network, arc.index(), ", cheaper when short");
      case FROM_PROJECT -> named(network, arc.index(), ", not started before");
      case FROM_PROJECT_TO_FINISH -> named(network, arc.index(), ", not finished before");
      case TO_PROJECT -> named(network, arc.index(), ", to the end");
      case LINK -> Cell.of(wait(network, network.link(arc.index())));
      case SPAN -> Cell.of(Words.safe(network.spans().get(arc.index()).name()));
      case PROMISE -> Cell.of("Less the finish");
    };
  }

  private static Cell named(Network network, int activity, String more) {
    Activity one = network.activity(activity);
    return new Table.Named(Words.id(one), Words.name(one) + more);
  }

  private String wait(Network network, Link link) {
    String from = Words.id(network.activity(link.predecessor()));
    String to = Words.id(network.activity(link.successor()));
    return (link.lag() < 0 ? "Lead of " : "Wait of ")
        + words.time(Math.abs(link.lag()))
        + " from "
        + from
        + " to "
        + to;
  }

  /** As many decimals as needed, but no more than can be read. */
  private String number(BigDecimal number) {
    BigDecimal exact = number.stripTrailingZeros();
    if (exact.scale() <= 0) {
      return Words.grouped(exact.setScale(0, RoundingMode.UNNECESSARY));
    }
    return Words.grouped(
        exact.setScale(Math.min(6, Math.max(2, exact.scale())), RoundingMode.HALF_UP));
  }

  // Branches prove it

  private String branchedClaim(String name) {
    List<String> whys = new ArrayList<>();
    List<String> by = new ArrayList<>();
    if (answer.of().network().hasChoices()) {
      whys.add("measures are taken wholly or not at all");
      by.add("which measures they take");
    }
    if (!answer.of().momentMoney().charges().isEmpty()) {
      whys.add("part of the money goes by calendar days or begun weeks");
      by.add("when the dates in question come");
    }
    return Words.capital(Words.list(whys, 2))
        + ", so no single sheet can prove the plan. All plans were divided into "
        + proof.branchCount()
        + " groups by "
        + Words.list(by, 2)
        + "; "
        + name
        + " gives for each what its plans cost at least, none less than "
        + words.money(cents(proof.bound()))
        + ", and this plan costs "
        + words.money(cents(proof.planCost()))
        + (isProved()
            ? "."
            : ". Within the effort allowed, a plan cheaper by at most "
                + words.money(cents(proof.planCost()).subtract(cents(proof.bound())))
                + " could not be ruled out.");
  }

  private Table branches(String name) {
    List<Row> rows = new ArrayList<>();
    for (PlanProof.Block block : proof.blocks().subList(1, proof.blocks().size())) {
      if (rows.size() == MOST_BRANCHES) {
        rows.add(
            new Row(
                Row.Kind.QUIET,
                List.of(
                    Cell.of(
                        proof.branchCount() - MOST_BRANCHES + " more groups, in proof.csv of meet"),
                    Cell.blank())));
        break;
      }
      rows.add(
          new Row(
              Row.Kind.PLAIN,
              List.of(
                  Cell.of("Group " + Words.safe(block.branch())),
                  Cell.of(words.money(cents(block.sheet().bound()))))));
    }
    rows.add(
        new Row(
            Row.Kind.SUM,
            List.of(
                Cell.of("This plan: direct and running cost and section money"),
                Cell.of(words.money(cents(proof.planCost()))))));
    return new Table(
        name,
        "What the plans of each group cost at least",
        List.of(Column.words("Group of plans"), Column.figures("At least")),
        rows,
        Table.Look.STACKING);
  }

  // Every finish

  private Table finishes() {
    List<Column> columns = new ArrayList<>();
    columns.add(Column.words(Words.capital(words.units())));
    if (words.hasDates()) {
      columns.add(Column.words("Finish"));
    }
    columns.add(Column.figures("Price of the last " + words.unit()));
    if (outcome.hasWorth()) {
      columns.add(Column.figures("Its worth"));
    }
    columns.add(Column.figures("Extra direct"));
    money(columns, outcome.hasRunning(), "Running");
    money(columns, outcome.hasTimeRelated(), "Time-related");
    money(columns, outcome.hasDamages(), "Damages");
    money(columns, outcome.hasBonus(), "Bonus");
    columns.add(Column.figures("Total"));
    List<Row> rows = new ArrayList<>();
    for (int s = 0; s < answer.states().size(); s++) {
      Row.Kind kind = s == answer.chosenState() ? Row.Kind.CHOSEN : Row.Kind.PLAIN;
      rows.add(new Row(kind, cells(s)));
    }
    int left = answer.curve().shown().rows().size() - answer.states().size();
    String some = left > 0 ? " Of very many finishes some are shown; curve.csv has all." : "";
    return new Table(
        numbering.table(),
        "Every finish with the money that depends on it." + some,
        columns,
        rows,
        Table.Look.SCROLLING);
  }

  private static void money(List<Column> columns, boolean isThere, String name) {
    if (isThere) {
      columns.add(Column.figures(name));
    }
  }

  private List<Cell> cells(int s) {
    Finish finish = answer.states().get(s).finish();
    Optional<Stretch> last = s > 0 ? Optional.of(stretches.get(s - 1)) : Optional.empty();
    List<Cell> cells = new ArrayList<>();
    cells.add(Cell.of(words.figure(finish.duration())));
    if (words.hasDates()) {
      cells.add(Cell.of(words.finish(finish.duration())));
    }
    cells.add(Cell.of(last.map(one -> words.amount(one.price())).orElse("")));
    if (outcome.hasWorth()) {
      cells.add(Cell.of(last.map(one -> words.amount(one.worth())).orElse("")));
    }
    cells.add(Cell.of(words.amount(outcome.extraDirect(finish))));
    if (outcome.hasRunning()) {
      cells.add(Cell.of(words.amount(Outcome.running(finish))));
    }
    if (outcome.hasTimeRelated()) {
      cells.add(Cell.of(words.amount(Outcome.timeRelated(finish))));
    }
    if (outcome.hasDamages()) {
      cells.add(Cell.of(words.amount(Outcome.damages(finish))));
    }
    if (outcome.hasBonus()) {
      cells.add(Cell.of(words.amount(Outcome.bonus(finish).negate())));
    }
    cells.add(Cell.of(words.amount(outcome.depends(finish))));
    return cells;
  }
}
