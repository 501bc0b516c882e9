package dayworth.report;

import dayworth.contract.Terms;
import dayworth.decision.Case;
import dayworth.decision.CrossCheck;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import dayworth.decision.FinishTooEarly;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;

/** The short answer of {@code dayworth curve} for a terminal. */
public final class CurveText {

  /** No line is longer, however wide the terminal is. */
  public static final int WIDEST = 94;

  private CurveText() {}

  /**
   * The lines of the answer; the first says it all.
   *
   * @param width columns of the terminal; more than {@link #WIDEST} are not used
   */
  public static List<String> lines(CurveAnswer answer, Style style, int width) {
    int used = Math.min(width, WIDEST);
    FinishTable finishes = new FinishTable(answer);
    List<String> lines = new ArrayList<>();
    String sentence = sentence(answer, finishes.look(), used);
    lines.add(style.bold(Wording.answer(sentence, answer.of().currency(), used)));
    lines.addAll(prose(Wording.status(answer.of()), used));
    lines.addAll(prose(LossText.factor(answer.of()).orElse(""), used));
    lines.add("");
    lines.addAll(finishes.lines(style, used));
    lines.addAll(prose(ties(answer), used));
    lines.addAll(prose(lows(answer, finishes.look()), used));
    List<String> prices = new PriceTable(answer).lines(used);
    if (!prices.isEmpty()) {
      lines.add("");
      lines.addAll(prices);
    }
    lines.addAll(prose(new LumpText(answer).sentence(), used));
    List<String> switches = new SwitchTable(answer).lines(used);
    if (!switches.isEmpty()) {
      lines.add("");
      lines.addAll(switches);
    }
    lines.addAll(prose(later(answer), used));
    lines.add("");
    lines.addAll(prose(new ObstacleText(answer.of(), answer.curve()).sentence(), used));
    lines.add("");
    lines.addAll(prose(proof(answer), used));
    return lines;
  }

  /** What is said where a finish is asked for that cannot be had. */
  public static List<String> tooEarly(FinishTooEarly asked, Style style, int width) {
    return tooEarly(Wording.duration(asked.of(), asked.asked()), asked, style, width);
  }

  /** The same of a finish that goes by another name than its duration. */
  static List<String> tooEarly(String name, FinishTooEarly asked, Style style, int width) {
    int used = Math.min(width, WIDEST);
    Case of = asked.of();
    List<String> lines = new ArrayList<>();
    long shortest = asked.curve().shortest();
    String nearest =
        Wording.duration(of, shortest) + new Dates(of).spokenFinish(", ", shortest, "");
    lines.add(style.bold(name + " cannot be had. The nearest is " + nearest + "."));
    lines.add("");
    lines.addAll(prose(new ObstacleText(of, asked.curve()).sentence(), used));
    return lines;
  }

  /** The line that tells where the results are. */
  public static List<String> written(String folder, Collection<String> names, int width) {
    List<String> said = new ArrayList<>();
    int pictures = 0;
    for (String name : names) {
      if (name.contains("/")) {
        pictures++;
      } else {
        said.add(name.replaceFirst("\\.[a-z]+$", ""));
      }
    }
    if (pictures > 0) {
      said.add(Wording.count(pictures, "picture", "pictures"));
    }
    String text = "Written: " + folder + " (" + String.join(", ", said) + ")";
    return prose(Wording.safe(text), Math.min(width, WIDEST));
  }

  private static List<String> prose(String text, int width) {
    return text.isEmpty() ? List.of() : Wording.wrap(text, Wording.INDENT, width);
  }

  /** Where a date and the working days do not leave room for the currency, they are days. */
  private static String sentence(CurveAnswer answer, MoneyLook look, int width) {
    Case of = answer.of();
    long least = answer.leastTotal().duration();
    Dates dates = new Dates(of);
    String duration = Wording.workingDuration(of, least);
    if (!dates.areKnown()) {
      return sentence(answer, look, "in " + duration);
    }
    String whole = sentence(answer, look, dates.spokenFinish("on ", least, " (" + duration + ")"));
    String days = dates.spokenFinish("on ", least, " (" + Wording.duration(of, least) + ")");
    return whole.length() + 2 + of.currency().length() <= width
        ? whole
        : sentence(answer, look, days);
  }

  private static String sentence(CurveAnswer answer, MoneyLook look, String when) {
    Finish least = answer.leastTotal();
    String finish = "Least total: finish " + when;
    String asPlanned = Wording.asPlanned(answer.of());
    BigDecimal better = answer.asPlanned().total().subtract(least.total());
    if (better.signum() > 0) {
      return finish + ", " + look.text(better) + " better than " + asPlanned + ".";
    }
    return least.duration() == answer.asPlanned().duration()
        ? finish + ", " + asPlanned + "."
        : finish + ", no better than " + asPlanned + ".";
  }

  /** Finishes that are left out of what is shown. */
  private static String later(CurveAnswer answer) {
    long longest = answer.rows().get(0).duration();
    return longest <= answer.latestShown()
        ? ""
        : "Later finishes, to "
            + Wording.duration(answer.of(), longest)
            + ", save running cost or section money but cost more in all: see curve.csv.";
  }

  /** Empty where one finish alone has the least total. */
  static String ties(CurveAnswer answer) {
    int count = answer.least().size();
    if (count < 2) {
      return "";
    }
    Finish last = answer.least().get(count - 1);
    return count
        + " finishes share the least total; the longest is "
        + Wording.finish(answer.of(), answer.leastTotal().duration())
        + ", the shortest "
        + Wording.finish(answer.of(), last.duration())
        + ".";
  }

  /** Finishes from which the total rises both ways and that are not the least. */
  private static String lows(CurveAnswer answer, MoneyLook look) {
    List<String> lows = new ArrayList<>();
    List<Finish> rows = compared(answer);
    Money least = total(answer.leastTotal());
    BigDecimal left =
        answer.asPlanned().direct().cents().add(answer.asPlanned().other().fixed().cents());
    boolean falling = true;
    for (int i = 0; i < rows.size(); i++) {
      Money here = total(rows.get(i));
      int next = i + 1 < rows.size() ? total(rows.get(i + 1)).compareTo(here) : 1;
      if (falling && next > 0 && here.compareTo(least) > 0) {
        lows.add(
            Wording.duration(answer.of(), rows.get(i).duration())
                + " ("
                + new Dates(answer.of()).spokenFinish("", rows.get(i).duration(), ", ")
                + look.text(rows.get(i).total().subtract(left))
                + ")");
      }
      falling = next == 0 ? falling : next < 0;
    }
    int shown = Math.min(3, lows.size());
    String more = shown < lows.size() ? " and " + (lows.size() - shown) + " more" : "";
    return lows.isEmpty()
        ? ""
        : "The total also turns, without being the least, at "
            + String.join(", ", lows.subList(0, shown))
            + more
            + ".";
  }

  /**
   * Where time costs by the date, every hour or shift given to a day that is paid for anyway saves
   * direct cost; only the ends of days are then compared.
   */
  private static List<Finish> compared(CurveAnswer answer) {
    Terms terms = answer.of().terms();
    return terms
        .calendar()
        .filter(calendar -> terms.timeRelated().per().isByDate())
        .map(
            calendar ->
                answer.rows().stream().filter(row -> calendar.isEndOfDay(row.duration())).toList())
        .orElse(answer.rows());
  }

  private static Money total(Finish finish) {
    return finish.direct().plus(finish.running()).plus(finish.other().sum());
  }

  /** Where money is not convex, what is compared is the branch that a finish's plan lies in. */
  private static String whereCompared(CurveAnswer answer) {
    CrossCheck check = answer.crossCheck();
    return answer.of().isConvex()
        ? Wording.count(check.atBreakpoints(), "breakpoint", "breakpoints")
            + " and "
            + Wording.count(check.between(), "point", "points")
            + " between them"
        : "the branches of " + Wording.count(check.comparisons().size(), "finish", "finishes");
  }

  /** What is known of the rest, which is the best that was found. */
  private static String gap(CurveAnswer answer) {
    if (answer.unproved().isEmpty()) {
      return "";
    }
    BigDecimal most =
        answer.unproved().stream()
            .map(finish -> finish.gap().cents())
            .reduce(BigDecimal.ZERO, BigDecimal::max);
    String cut = answer.isCut() ? ", when the time that was given was over" : "";
    return "; the rest is at most " + MoneyLook.of(List.of(most)).text(most) + " too dear" + cut;
  }

  static String proof(CurveAnswer answer) {
    CrossCheck check = answer.crossCheck();
    String proved =
        "Proved: "
            + answer.provedRows()
            + " of "
            + Wording.count(answer.rows().size(), "finish", "finishes")
            + gap(answer)
            + ". ";
    int points = check.comparisons().size();
    int silent = check.unanswered().size();
    if (points == 0) {
      return proved
          + (silent == 0
              ? "The linear programme was not asked."
              : "The linear programme gave no answer: " + check.unanswered().get(0).reason() + ".");
    }
    BigDecimal largest = check.largestDifference();
    String sampled =
        points < check.ofPoints() ? " (" + points + " of " + check.ofPoints() + ")" : "";
    return proved
        + (largest.signum() == 0
            ? "The linear programme agrees at "
            : "The linear programme was compared at ")
        + whereCompared(answer)
        + sampled
        + "; largest difference "
        + largest.toPlainString()
        + "."
        + (silent == 0
            ? ""
            : " It gave no answer at "
                + Wording.count(silent, "other point", "other points")
                + ".");
  }
}
