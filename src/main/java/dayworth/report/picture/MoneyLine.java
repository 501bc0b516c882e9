package dayworth.report.picture;

import dayworth.contract.Terms;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import java.awt.Color;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;

/**
 * One kind of money against the finish.
 *
 * @param ink the colour of its name, a little darker than the line
 * @param amount of a finish
 * @param isStaircase whether it goes by the date, so that it is the same all through a working day
 */
record MoneyLine(
    Pen pen, Color ink, String name, Function<Finish, BigDecimal> amount, boolean isStaircase) {

  /** The parts that the case has, then direct cost, then the total, which is painted last. */
  static List<MoneyLine> of(CurveAnswer answer, Amounts amounts) {
    Terms terms = answer.of().terms();
    boolean runs = answer.rows().stream().anyMatch(row -> !row.running().isZero());
    String time = runs ? "Time-related, running" : "Time-related cost";
    List<MoneyLine> parts =
        List.of(
            new MoneyLine(
                Pen.TIME,
                Look.SLATE_INK,
                time,
                amounts::timeRelated,
                !runs && terms.timeRelated().per().isByDate()),
            new MoneyLine(
                Pen.DAMAGES,
                Look.BRICK,
                "Damages",
                amounts::damages,
                terms.damages().per().isByDate()),
            new MoneyLine(
                Pen.BONUS,
                Look.OLIVE_INK,
                "Bonus",
                amounts::bonus,
                terms.bonus().per().isByDate()));
    List<MoneyLine> lines = new ArrayList<>();
    for (MoneyLine part : parts) {
      if (answer.rows().stream().anyMatch(row -> part.amount().apply(row).signum() != 0)) {
        lines.add(part);
      }
    }
    if (answer.relaxed().isPresent()) {
      lines.add(
          new MoneyLine(
              Pen.LEAST_DIRECT,
              Look.QUIET,
              "If measures could be split",
              amounts::leastExtraDirect,
              false));
    }
    lines.add(
        new MoneyLine(Pen.DIRECT, Look.INK, "Extra direct cost", amounts::extraDirect, false));
    lines.add(new MoneyLine(Pen.TOTAL, Look.PLUM, "Total", amounts::total, false));
    return lines;
  }

  boolean isTotal() {
    return pen.equals(Pen.TOTAL);
  }

  /** Whether it is paid at some finishes only. */
  boolean stopsAtZero() {
    return pen.equals(Pen.DAMAGES) || pen.equals(Pen.BONUS);
  }

  MoneyAxis.Range range(CurveAnswer answer) {
    double[] all =
        answer.rows().stream()
            .mapToDouble(row -> amount.apply(row).doubleValue())
            .sorted()
            .toArray();
    return new MoneyAxis.Range(all[0], all[all.length - 1]);
  }
}
