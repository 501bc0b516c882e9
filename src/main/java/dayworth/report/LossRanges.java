package dayworth.report;

import dayworth.decision.BestByLoss;
import dayworth.decision.BestByLoss.Range;
import dayworth.decision.BestByLoss.Tried;
import dayworth.decision.Case;
import dayworth.decision.LossSweep;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;

/** Which finish is best, if the losses of output are others than the case says. */
final class LossRanges {

  private static final String INDENT = "    ";

  private final BestByLoss best;
  private final List<Range> ranges;
  private final Case of;
  private final MoneyLook look;
  private final Style style;
  private final int width;

  LossRanges(BestByLoss best, Style style, int width) {
    this.best = best;
    this.ranges = best.ranges();
    this.of = best.tried().get(0).curve().of();
    this.look =
        MoneyLook.of(
            ranges.stream()
                .flatMap(range -> Stream.of(range.from().saved(), range.to().saved()))
                .toList());
    this.style = style;
    this.width = width;
  }

  List<String> lines() {
    List<String> lines = new ArrayList<>(List.of(""));
    if (ranges.size() == 1) {
      prose(lines, whatever());
    } else {
      prose(lines, "Which finish is best, if all losses of output were so many times the case's");
      table(lines);
    }
    prose(lines, howSought());
    LossText.of(of(best.now()).buildUp().bought()).forEach(text -> prose(lines, text));
    return lines;
  }

  private Case of(Quantity factor) {
    return best.tried().stream()
        .filter(tried -> tried.factor().equals(factor))
        .findFirst()
        .orElseThrow()
        .curve()
        .of();
  }

  private String whatever() {
    Range all = ranges.get(0);
    return "Whatever the losses of output from "
        + factor(all.from())
        + " to "
        + factor(all.to())
        + " times the case's, "
        + Wording.when(all.from().curve().of(), all.from().best().duration(), "", "")
        + " is best, "
        + note(all)
        + ".";
  }

  private void table(List<String> lines) {
    TextColumns columns = new TextColumns(width - INDENT.length());
    columns.add("", false, ranges.stream().map(LossRanges::range).toList());
    if (new Dates(of).areKnown()) {
      columns.add("", false, ranges.stream().map(LossRanges::date).toList());
    }
    columns.add("", true, ranges.stream().map(LossRanges::duration).toList());
    columns.add("", false, ranges.stream().map(this::note).toList());
    List<String> rows = columns.lines();
    for (int i = 0; i < ranges.size(); i++) {
      // The header, which is empty, comes before the first row.
      String row = rows.get(i + 1);
      lines.add(ranges.get(i).holds(best.now()) ? style.bold("  > " + row) : INDENT + row);
    }
  }

  private static String range(Range range) {
    return range.from().equals(range.to())
        ? factor(range.from())
        : factor(range.from()) + " to " + factor(range.to());
  }

  private static String date(Range range) {
    return new Dates(range.from().curve().of())
        .spokenFinish("", range.from().best().duration(), "");
  }

  /** The losses move the best finish within a day or a unit. */
  private static String duration(Range range) {
    String from = duration(range.from());
    String to = duration(range.to());
    return from.equals(to) ? from : Wording.grouped(units(range.from())) + " to " + to;
  }

  private static String duration(Tried tried) {
    return Wording.duration(tried.curve().of(), tried.best().duration());
  }

  private static BigDecimal units(Tried tried) {
    return tried.curve().of().network().scale().units(tried.best().duration());
  }

  private String note(Range range) {
    String here =
        range.holds(best.now())
            ? "; this answer: " + WayFigures.number(best.now()).toPlainString()
            : "";
    boolean gains = range.from().saved().signum() > 0 || range.to().saved().signum() > 0;
    return (gains ? saved(range) + " better" : "no better") + " than carrying on" + here;
  }

  private String saved(Range range) {
    String from = look.text(range.from().saved());
    String to = look.text(range.to().saved());
    return from.equals(to) ? from : from + " to " + to;
  }

  private String howSought() {
    String step = WayFigures.number(LossSweep.STEP).toPlainString();
    List<Tried> tried = best.tried();
    return "Sought, not solved: all finishes were computed again at "
        + Wording.count(tried.size(), "factor", "factors")
        + " from "
        + factor(tried.get(0))
        + " to "
        + factor(tried.get(tried.size() - 1))
        + ", and each change of the best one is narrowed down by halving to "
        + step
        + (best.isNarrowed() ? "" : ", as far as the limit on factors or time allowed")
        + ". A change and its reversal between two of them would be missed. Finishes "
        + (new Dates(of).areKnown() ? "on one day" : "in one " + of.unit().word())
        + " count as one."
        + (best.isBounded()
            ? " With larger factors a week would yield nothing, or work take too long."
            : "")
        + (best.unproved() == 0
            ? ""
            : " At "
                + Wording.count(best.unproved(), "factor", "factors")
                + " not every finish is proved.");
  }

  private static String factor(Tried tried) {
    return WayFigures.number(tried.factor()).toPlainString();
  }

  private void prose(List<String> lines, String text) {
    lines.addAll(Wording.wrap(text, Wording.INDENT, width));
  }
}
