package dayworth.report;

import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import dayworth.decision.PlanChange;
import dayworth.decision.StepFacts;
import dayworth.engine.Step;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import java.util.function.Predicate;

/** What the next units of earlier finish cost, what they are worth, and who is shortened. */
final class PriceTable {

  private static final int MOST_ROWS = 24;
  private static final int IDS_WIDTH = 22;
  private static final String INDENT = "    ";

  /** A step or, where the least total is inside it, a part of one. */
  private record Part(StepFacts facts, long from, long to) {

    Step step() {
      return facts.step();
    }
  }

  private final CurveAnswer answer;
  private final List<Part> parts = new ArrayList<>();

  /** How many parts come before the least total. */
  private final int stop;

  PriceTable(CurveAnswer answer) {
    this.answer = answer;
    long least = answer.leastTotal().duration();
    for (StepFacts facts : answer.steps()) {
      Step step = facts.step();
      if (step.to() >= answer.latestShown()) {
        continue;
      }
      boolean inside = step.to() < least && least < step.from();
      if (inside) {
        parts.add(new Part(facts, step.from(), least));
      }
      parts.add(new Part(facts, inside ? least : step.from(), step.to()));
    }
    stop = (int) parts.stream().filter(part -> part.to() >= least).count();
  }

  List<String> lines(int width) {
    List<String> lines = new ArrayList<>();
    if (parts.isEmpty()) {
      return lines;
    }
    int first = Math.max(0, Math.min(stop - MOST_ROWS / 2, parts.size() - MOST_ROWS));
    List<Part> shown = parts.subList(first, Math.min(parts.size(), first + MOST_ROWS));
    TextColumns columns = columns(shown, width - INDENT.length());
    String worth = hasWorth() ? ", and what they are worth" : "";
    lines.add("  What the next " + answer.of().unit().word() + "s cost" + worth);
    columns.lines().forEach(line -> lines.add(INDENT + line));
    if (hasWorth()) {
      // The title and the header come before the first part.
      lines.add(2 + stop - first, stopLine(width));
    }
    if (!columns.dropped().isEmpty()) {
      String names = String.join(", ", columns.dropped());
      lines.addAll(Wording.wrap("No room for: " + names, INDENT, width));
    }
    if (shown.size() < parts.size()) {
      int left = parts.size() - shown.size();
      lines.add(INDENT + Wording.count(left, "row is", "rows are") + " left out: see steps.csv");
    }
    return lines;
  }

  private TextColumns columns(List<Part> shown, int width) {
    MoneyLook look = MoneyLook.of(shown.stream().map(part -> price(part.step())).toList());
    TextColumns columns = new TextColumns(width);
    columns.add(answer.of().unit().word() + "s", false, column(shown, this::fromTo));
    columns.add("price", true, column(shown, part -> look.text(price(part.step()))));
    if (hasWorth()) {
      columns.add("worth", true, column(shown, this::worth));
    }
    columns.add("shortened", false, column(shown, part -> ids(part, c -> !c.isGivenBack())));
    if (shown.stream()
        .anyMatch(p -> p.facts().changes().stream().anyMatch(PlanChange::isGivenBack))) {
      columns.add("given back", false, column(shown, part -> ids(part, PlanChange::isGivenBack)));
    }
    return columns;
  }

  private static List<String> column(List<Part> shown, Function<Part, String> cell) {
    return shown.stream().map(cell).toList();
  }

  private String fromTo(Part part) {
    return units(part.from()) + " to " + units(part.to());
  }

  private String units(long ticks) {
    return Wording.grouped(answer.of().network().scale().units(ticks));
  }

  private BigDecimal price(Step step) {
    return perUnit(step.pricePerTick()).cents();
  }

  private Money perUnit(Money perTick) {
    return perTick.times(answer.of().network().scale().ticksPerUnit());
  }

  private String ids(Part part, Predicate<PlanChange> which) {
    List<String> ids =
        part.facts().changes().stream()
            .filter(which)
            .map(change -> answer.of().network().activity(change.activity()).id())
            .toList();
    return Wording.ids(ids, IDS_WIDTH);
  }

  private boolean hasWorth() {
    Money first = answer.whole(answer.rows().get(0)).sum();
    return answer.rows().stream().anyMatch(row -> !answer.whole(row).sum().equals(first));
  }

  /** By how much the money that depends on the finish falls, for a unit: least to most. */
  private String worth(Part part) {
    List<BigDecimal> worths = new ArrayList<>();
    for (int i = 1; i < answer.rows().size(); i++) {
      Finish later = answer.rows().get(i - 1);
      Finish sooner = answer.rows().get(i);
      if (later.duration() <= part.from() && sooner.duration() >= part.to()) {
        Money fall = answer.whole(later).sum().minus(answer.whole(sooner).sum());
        worths.add(perUnit(fall.dividedBy(later.duration() - sooner.duration())).cents());
      }
    }
    BigDecimal low = worths.stream().reduce(BigDecimal::min).orElse(BigDecimal.ZERO);
    BigDecimal high = worths.stream().reduce(BigDecimal::max).orElse(BigDecimal.ZERO);
    MoneyLook look = MoneyLook.of(List.of(low, high));
    return low.compareTo(high) == 0 ? look.text(low) : look.text(low) + " to " + look.text(high);
  }

  private String stopLine(int width) {
    String other = answer.least().size() > 1 ? "no finish" : "no other finish";
    String words = "-------- least total: " + other + " is cheaper ";
    if (INDENT.length() + words.length() > width) {
      words = "-------- least total ";
    }
    return INDENT + words + "-".repeat(Math.max(0, width - 14 - words.length()));
  }
}
