package dayworth.report.picture;

import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What the picture of prices says in words. */
final class PriceWording {

  private static final int MOST_RUNS = 60;

  private final CurveAnswer answer;
  private final Words words;
  private final List<Stretch> stretches;

  PriceWording(CurveAnswer answer, Words words, List<Stretch> stretches) {
    this.answer = answer;
    this.words = words;
    this.stretches = stretches;
  }

  String title() {
    Finish least = answer.leastTotal();
    String finish = words.time(least.duration());
    Optional<Stretch> next = next();
    if (stretches.isEmpty()) {
      return "No finish before " + finish + " can be bought";
    }
    if (next.isEmpty()) {
      return "Buying time pays all the way to " + finish + ", the shortest possible";
    }
    String price = words.amount(next.get().price());
    boolean even = next.get().price().compareTo(next.get().worth()) == 0;
    String end =
        even
            ? price + ", just what it is worth"
            : price + " and is worth " + words.amount(next.get().worth());
    return least.duration() == answer.rows().get(0).duration()
        ? "Buying time does not pay: the first " + words.unit() + " costs " + end
        : "Buying time pays down to " + finish + "; the next costs " + end;
  }

  String note() {
    return words.project()
        + ". Heavy line: what the next "
        + words.unit()
        + " of earlier finish costs. Patterned: what it is worth. Where the line is above the"
        + " pattern, the "
        + words.unit()
        + " by itself costs more than it is worth."
        + words.amountsIn();
  }

  String description() {
    List<String> said = new ArrayList<>();
    for (Stretch run : runs()) {
      said.add(
          "from "
              + words.figure(run.from())
              + " to "
              + words.figure(run.to())
              + " costs "
              + words.money(run.price())
              + ", worth "
              + words.money(run.worth()));
    }
    int kept = Math.min(MOST_RUNS, said.size());
    String more = kept < said.size() ? "; the rest is in curve.csv" : "";
    return "The price of a "
        + words.unit()
        + " against what it is worth, the longest finish on the left. In "
        + words.many()
        + ": "
        + String.join("; ", said.subList(0, kept))
        + more
        + ".";
  }

  /** The label at the least total. */
  Label stop() {
    String at =
        answer.least().size() > 1 ? "Least total first reached at " : "Stop at the least total, ";
    String time = words.time(answer.leastTotal().duration());
    String then =
        next()
            .map(
                next ->
                    "The next "
                        + words.unit()
                        + " costs "
                        + words.amount(next.price())
                        + " and is worth "
                        + words.amount(next.worth()))
            .orElse("Nothing shorter is possible");
    return new Label(Look.PLUM, 1, List.of(at + time, then));
  }

  Label contract(long due) {
    return new Label(Look.INK, 1, List.of("Contract finish", words.time(due)));
  }

  private Optional<Stretch> next() {
    long least = answer.leastTotal().duration();
    return stretches.stream().filter(stretch -> stretch.from() == least).findFirst();
  }

  /** Neighbours of equal price and worth put together. */
  private List<Stretch> runs() {
    List<Stretch> runs = new ArrayList<>();
    for (Stretch next : stretches) {
      Stretch last = runs.isEmpty() ? next : runs.get(runs.size() - 1);
      boolean same =
          last.price().compareTo(next.price()) == 0 && last.worth().compareTo(next.worth()) == 0;
      if (runs.isEmpty() || !same) {
        runs.add(next);
      } else {
        runs.set(
            runs.size() - 1,
            new Stretch(
                last.from(), next.to(), next.price(), next.time(), next.damages(), next.bonus()));
      }
    }
    return runs;
  }
}
