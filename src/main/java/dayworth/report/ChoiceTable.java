package dayworth.report;

import dayworth.contract.Section;
import dayworth.decision.Case;
import dayworth.decision.Choice;
import dayworth.decision.Finish;
import dayworth.decision.TimeUnit;
import dayworth.decision.Weighing;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;

/** The choices side by side, a column each; those with the same finish share one. */
final class ChoiceTable {

  private final Weighing weighing;
  private final Case of;
  private final Dates dates;
  private final Lateness late;
  private final List<Choice> shown = new ArrayList<>();
  private final List<String> shared = new ArrayList<>();
  private final List<String> names = new ArrayList<>();
  private final List<List<String>> cells = new ArrayList<>();
  private final MoneyLook look;

  ChoiceTable(Weighing weighing) {
    this.weighing = weighing;
    this.of = weighing.curve().of();
    this.dates = new Dates(of);
    this.late = new Lateness(of);
    weighing.choices().stream()
        .sorted(Comparator.comparing(choice -> choice.kind() == Choice.Kind.MOST_BONUS))
        .forEach(this::share);
    shown.sort(Comparator.comparing(Choice::kind));
    List<BigDecimal> amounts = new ArrayList<>();
    for (Choice choice : shown) {
      Finish finish = choice.finish();
      amounts.add(finish.total().subtract(sameForAll()));
      amounts.add(extraDirect(finish));
      amounts.add(finish.running().cents());
      amounts.add(finish.other().timeRelated().cents());
      amounts.add(finish.other().damages().cents());
    }
    look = MoneyLook.of(amounts);
    addRows();
  }

  MoneyLook look() {
    return look;
  }

  List<String> lines(int width) {
    TextColumns columns = new TextColumns(width - Wording.INDENT.length());
    columns.add("", false, names);
    for (int c = 0; c < shown.size(); c++) {
      int choice = c;
      columns.add(header(shown.get(c)), true, cells.stream().map(row -> row.get(choice)).toList());
    }
    List<String> lines = new ArrayList<>();
    columns.lines().forEach(line -> lines.add(Wording.INDENT + line));
    if (!columns.dropped().isEmpty()) {
      String left = "No room for: " + String.join(", ", columns.dropped());
      lines.addAll(Wording.wrap(left, Wording.INDENT, width));
    }
    sections()
        .forEach(line -> lines.addAll(Wording.wrap(Wording.safe(line), Wording.INDENT, width)));
    shared.forEach(line -> lines.addAll(Wording.wrap(line, Wording.INDENT, width)));
    FinishTable.cannotBeMet(weighing.curve())
        .ifPresent(line -> lines.addAll(Wording.wrap(line, Wording.INDENT, width)));
    return lines;
  }

  /** What no choice changes; empty where that is nothing. */
  String leftOut() {
    if (sameForAll().signum() == 0) {
      return "";
    }
    boolean fixed = !weighing.asItStands().other().fixed().isZero();
    return MoneyLook.of(List.of(sameForAll())).text(sameForAll())
        + (fixed ? " of direct cost as planned and fixed cost" : " of direct cost as planned")
        + " is the same in every choice and is left out.";
  }

  private void share(Choice choice) {
    for (Choice other : shown) {
      if (other.finish().duration() == choice.finish().duration()
          && other.finish().total().compareTo(choice.finish().total()) == 0) {
        String also = spoken(other) + " is also " + spoken(choice) + ".";
        shared.add(also.substring(0, 1).toUpperCase(Locale.ROOT) + also.substring(1));
        return;
      }
    }
    shown.add(choice);
  }

  private void addRows() {
    if (dates.areKnown()) {
      List<String> finishes = dates.column(shown.stream().map(c -> c.finish().duration()).toList());
      add("finish", finishes.stream().map(date -> date.replace("  ", " ")).toList());
    }
    add(of.unit() == TimeUnit.DAY ? "working days" : of.unit().word() + "s", f -> units(f));
    if (late.isKnown()) {
      add(late.name(), late::text);
    }
    add("extra direct cost", finish -> look.text(extraDirect(finish)));
    money("running cost", finish -> finish.running().cents());
    money("time-related cost", finish -> finish.other().timeRelated().cents());
    money("damages", finish -> finish.other().damages().cents());
    money("bonus", finish -> finish.other().bonus().cents().negate());
    add("total", finish -> look.text(finish.total().subtract(sameForAll())));
    add("against carrying on", finish -> look.text(weighing.saved(finish).negate()));
  }

  /** Money that no choice has is left out. */
  private void money(String name, Function<Finish, BigDecimal> amount) {
    if (shown.stream().anyMatch(choice -> amount.apply(choice.finish()).signum() != 0)) {
      add(name, finish -> look.text(amount.apply(finish)));
    }
  }

  private void add(String name, Function<Finish, String> cell) {
    add(name, shown.stream().map(choice -> cell.apply(choice.finish())).toList());
  }

  private void add(String name, List<String> row) {
    names.add(name);
    cells.add(row);
  }

  private String units(Finish finish) {
    return Wording.grouped(of.network().scale().units(finish.duration()));
  }

  private BigDecimal extraDirect(Finish finish) {
    return finish.direct().cents().subtract(weighing.asItStands().direct().cents());
  }

  private BigDecimal sameForAll() {
    Finish planned = weighing.asItStands();
    return planned.direct().cents().add(planned.other().fixed().cents());
  }

  private String header(Choice choice) {
    return switch (choice.kind()) {
      case SECTION_DATE -> "section " + (sectionNames().indexOf(choice.section()) + 1);
      case AS_IT_STANDS -> "carry on";
      case LEAST_TOTAL -> "least total";
      case CONTRACT_FINISH -> "contract";
      case MOST_BONUS -> "most bonus";
      case SHORTEST -> "shortest";
    };
  }

  private List<String> sectionNames() {
    return of.momentMoney().sections().stream().map(Section::name).toList();
  }

  /** Which section a column is for. */
  private List<String> sections() {
    return shown.stream()
        .filter(choice -> choice.kind() == Choice.Kind.SECTION_DATE)
        .map(choice -> header(choice) + " on time: " + choice.section() + ".")
        .map(line -> line.substring(0, 1).toUpperCase(Locale.ROOT) + line.substring(1))
        .toList();
  }

  private static String spoken(Choice choice) {
    return switch (choice.kind()) {
      case SECTION_DATE -> "the cheapest with " + choice.section() + " on time";
      case AS_IT_STANDS -> "carrying on";
      case LEAST_TOTAL -> "the least total";
      case CONTRACT_FINISH -> "the contract finish";
      case MOST_BONUS -> "the finish with the most bonus";
      case SHORTEST -> "the shortest finish";
    };
  }
}
