package dayworth.report;

import dayworth.contract.Due;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Function;

/** The finishes that are spoken of, with what each costs above the plan as it stands. */
final class FinishTable {

  private record Row(String name, Finish finish) {}

  private final CurveAnswer answer;
  private final List<Row> rows = new ArrayList<>();
  private final Dates dates;
  private final MoneyLook look;

  FinishTable(CurveAnswer answer) {
    this.answer = answer;
    this.dates = new Dates(answer.of());
    rows.add(new Row(Wording.asPlanned(answer.of()), answer.asPlanned()));
    rows.add(new Row("least total", answer.leastTotal()));
    answer.atContract().ifPresent(finish -> rows.add(new Row("contract finish", finish)));
    rows.add(new Row("shortest", answer.shortest()));
    rows.add(new Row("crash everything", answer.crashEverything()));
    List<BigDecimal> amounts = new ArrayList<>();
    for (Row row : rows) {
      amounts.add(extraDirect(row.finish()));
      amounts.add(row.finish().total().subtract(sameForAll()));
      amounts.add(row.finish().other().timeRelated().cents());
      amounts.add(row.finish().other().damages().cents());
    }
    look = MoneyLook.of(amounts);
  }

  MoneyLook look() {
    return look;
  }

  List<String> lines(Style style, int width) {
    int room = width - Wording.INDENT.length();
    TextColumns columns = columns(room, look);
    boolean rounded = dates.areKnown() && !columns.dropped().isEmpty() && look.decimals() > 0;
    if (rounded) {
      // A date takes the room that cents would need.
      columns = columns(room, new MoneyLook(0));
    }
    List<String> lines = new ArrayList<>();
    for (String line : columns.lines()) {
      // The header is line 0, as planned is 1, the least total 2.
      lines.add(lines.size() == 2 ? style.bold("> " + line) : Wording.INDENT + line);
    }
    waste().ifPresent(wasted -> lines.addAll(Wording.wrap(wasted, "    ", width)));
    if (!columns.dropped().isEmpty()) {
      String names = String.join(", ", columns.dropped());
      lines.addAll(Wording.wrap("No room for: " + names, "  ", width));
    }
    if (rounded) {
      String exact = "Amounts are rounded to whole ones here; curve.csv has the cents.";
      lines.addAll(Wording.wrap(exact, "  ", width));
    }
    cannotBeMet(answer).ifPresent(line -> lines.addAll(Wording.wrap(line, "  ", width)));
    if (sameForAll().signum() != 0) {
      lines.addAll(Wording.wrap(leftOut(), "  ", width));
    }
    return lines;
  }

  private TextColumns columns(int width, MoneyLook look) {
    TextColumns columns = new TextColumns(width);
    columns.add("", false, rows.stream().map(Row::name).toList());
    columns.add(answer.of().unit().word() + "s", true, column(f -> units(f.duration())));
    addDates(columns);
    columns.add("extra direct", true, column(f -> look.text(extraDirect(f))));
    addTime(columns, look);
    money(columns, look, "damages", f -> f.other().damages().cents());
    money(columns, look, "bonus", f -> f.other().bonus().cents().negate());
    columns.add("total", true, column(f -> look.text(f.total().subtract(sameForAll()))));
    return columns;
  }

  /** Beside dates there is room for one column only; the two are apart in curve.csv. */
  private void addTime(TextColumns columns, MoneyLook look) {
    boolean runs = rows.stream().anyMatch(row -> !row.finish().running().isZero());
    if (runs && dates.areKnown()) {
      money(
          columns,
          look,
          "time, running",
          f -> f.other().timeRelated().cents().add(f.running().cents()));
    } else {
      money(columns, look, "running", f -> f.running().cents());
      money(columns, look, "time-related", f -> f.other().timeRelated().cents());
    }
  }

  /** Dates stand close to the durations, their header to the left. */
  private void addDates(TextColumns columns) {
    if (dates.areKnown()) {
      List<String> finishes =
          dates.column(rows.stream().map(row -> row.finish().duration()).toList());
      int width = finishes.get(0).length();
      columns.add(String.format(Locale.ROOT, "%-" + width + "s", "finish"), true, finishes);
    }
  }

  /** Money that no finish has is left out. */
  private void money(
      TextColumns columns, MoneyLook look, String name, Function<Finish, BigDecimal> amount) {
    if (rows.stream().anyMatch(row -> amount.apply(row.finish()).signum() != 0)) {
      columns.add(name, true, column(finish -> look.text(amount.apply(finish))));
    }
  }

  private List<String> column(Function<Finish, String> cell) {
    return rows.stream().map(row -> cell.apply(row.finish())).toList();
  }

  private String units(long ticks) {
    return Wording.grouped(answer.of().network().scale().units(ticks));
  }

  private BigDecimal extraDirect(Finish finish) {
    return finish.direct().cents().subtract(answer.asPlanned().direct().cents());
  }

  private BigDecimal sameForAll() {
    Finish planned = answer.asPlanned();
    return planned.direct().cents().add(planned.other().fixed().cents());
  }

  private String leftOut() {
    boolean fixed = !answer.asPlanned().other().fixed().isZero();
    String amount = MoneyLook.of(List.of(sameForAll())).text(sameForAll());
    return amount
        + " of direct cost "
        + Wording.asPlanned(answer.of())
        + (fixed ? " and fixed cost" : "")
        + " is the same in every row and is left out.";
  }

  private Optional<String> waste() {
    Finish crash = answer.crashEverything();
    BigDecimal wasted = crash.total().subtract(answer.shortest().total());
    boolean same = crash.duration() == answer.shortest().duration();
    return same && wasted.signum() > 0
        ? Optional.of(
            look.text(wasted)
                + " of it is wasted: it reaches the same "
                + Wording.duration(answer.of(), crash.duration()))
        : Optional.empty();
  }

  /** What is said of a contract finish that no plan meets. */
  static Optional<String> cannotBeMet(CurveAnswer answer) {
    return answer
        .of()
        .terms()
        .contractFinish()
        .filter(due -> due.ticks() < answer.shortest().duration())
        .map(due -> "The contract finish" + named(answer, due) + " cannot be met.");
  }

  private static String named(CurveAnswer answer, Due due) {
    return due.date()
        .map(date -> ", " + Dates.spoken(date) + ",")
        .orElseGet(
            () -> " of " + Wording.grouped(answer.of().network().scale().units(due.ticks())));
  }
}
