package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.report.brief.page.Part;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** What is told of any one finish; the slider changes from one telling to the next. */
final class FinishTelling {

  private static final int MOST_PICKS = 16;
  private static final int MOST_MARKS = 10;

  private final BriefAnswer answer;
  private final Words words;
  private final Outcome outcome;
  private final List<Stretch> stretches;
  private final String shortest;

  /**
   * Tells of finishes.
   *
   * @param shortest why no plan is shorter than the last of them, as a sentence
   */
  FinishTelling(
      BriefAnswer answer, Words words, Outcome outcome, List<Stretch> stretches, String shortest) {
    this.answer = answer;
    this.words = words;
    this.outcome = outcome;
    this.stretches = stretches;
    this.shortest = shortest;
  }

  /** Something that is shortened or given back. */
  record Pick(int activity, Part.Tally tally, Money cost, String price) {}

  private BriefAnswer.State state(int s) {
    return answer.states().get(s);
  }

  String heading(int s) {
    long finish = state(s).finish().duration();
    return "At "
        + words.workingTime(finish)
        + words.date(finish).map(date -> ", " + Words.longDate(date)).orElse("");
  }

  /** For those who hear the slider. */
  String spoken(int s) {
    long finish = state(s).finish().duration();
    return words.workingTime(finish)
        + words.date(finish).map(date -> ", " + Words.longDate(date)).orElse("")
        + ", total "
        + words.money(outcome.depends(state(s).finish()));
  }

  List<Part.Amount> lines(int s) {
    var finish = state(s).finish();
    List<Part.Amount> lines = new ArrayList<>();
    add(lines, "extra", "Extra direct cost", outcome.extraDirect(finish));
    if (outcome.hasRunning()) {
      add(lines, "run", "Running cost", Outcome.running(finish));
    }
    if (outcome.hasTimeRelated()) {
      add(lines, "time", "Time-related cost", Outcome.timeRelated(finish));
    }
    if (outcome.hasDamages()) {
      add(lines, "dam", "Damages", Outcome.damages(finish));
    }
    if (outcome.hasBonus()) {
      add(lines, "bonus", "Bonus", Outcome.bonus(finish).negate());
    }
    lines.add(
        new Part.Amount("total", "Total", words.money(outcome.depends(finish)), Part.Weight.TOTAL));
    lines.add(
        new Part.Amount(
            "diff",
            "Against carrying on",
            words.money(outcome.better(finish).negate()),
            Part.Weight.DIFFERENCE));
    return lines;
  }

  private void add(List<Part.Amount> lines, String id, String name, BigDecimal amount) {
    lines.add(new Part.Amount(id, name, words.money(amount), Part.Weight.PLAIN));
  }

  /** What is shortened and what is given back, in file order; of very many the dearest. */
  List<Pick> picks(int s) {
    List<Pick> all = all(s);
    if (all.size() <= MOST_PICKS) {
      return all;
    }
    List<Pick> dearest = new ArrayList<>(all);
    dearest.sort(Comparator.comparing(Pick::cost).reversed());
    List<Pick> kept = dearest.subList(0, MOST_PICKS);
    return all.stream().filter(kept::contains).toList();
  }

  /** How many have no room, and what they cost; or that nothing is shortened. */
  String rest(int s) {
    List<Pick> all = all(s);
    if (all.isEmpty()) {
      return "Nothing is shortened.";
    }
    List<Pick> shown = picks(s);
    List<Pick> left = all.stream().filter(pick -> !shown.contains(pick)).toList();
    if (left.isEmpty()) {
      return "";
    }
    Money cost = left.stream().map(Pick::cost).reduce(Money.ZERO, Money::plus);
    return "and " + left.size() + " more, together " + words.money(cost);
  }

  private List<Pick> all(int s) {
    List<Pick> bought = new ArrayList<>();
    List<Pick> back = new ArrayList<>();
    for (int i = 0; i < answer.of().network().size(); i++) {
      if (!answer.of().isToGo(i)) {
        continue;
      }
      long now = MapRows.bought(answer, state(s), i);
      long most = now;
      for (int before = 0; before < s; before++) {
        most = Math.max(most, MapRows.bought(answer, state(before), i));
      }
      if (now > 0) {
        bought.add(bought(i, Ways.extra(answer.of().network(), state(s).timing().plan(), i), now));
      }
      if (most > now) {
        back.add(new Pick(i, tally(most - now, true), Money.ZERO, ""));
      }
    }
    bought.addAll(back);
    return bought;
  }

  private Pick bought(int activity, Money cost, long ticks) {
    return new Pick(activity, tally(ticks, false), cost, words.money(cost));
  }

  private Part.Tally tally(long ticks, boolean isBack) {
    long unit = words.ticksPerUnit();
    long marks = ticks % unit == 0 && ticks / unit <= MOST_MARKS ? ticks / unit : 0;
    return new Part.Tally(
        (int) marks, isBack, isBack ? words.figure(ticks) + " given back" : words.time(ticks));
  }

  /** The last and the next unit, and the chains. */
  String say(int s) {
    List<String> said = new ArrayList<>();
    String unit = words.unit();
    if (s > 0) {
      Stretch last = stretches.get(s - 1);
      said.add("The last " + unit + " bought" + costs(last) + ".");
    }
    Optional<Stretch> next =
        s < stretches.size() ? Optional.of(stretches.get(s)) : Optional.empty();
    said.add(next.map(one -> "The next" + costs(one) + ".").orElse(shortest));
    said.add(chains(s));
    return String.join(" ", said);
  }

  private String costs(Stretch one) {
    String worth = outcome.hasWorth() ? " and is worth " + words.money(one.worth()) : "";
    return " costs " + words.money(one.price()) + worth;
  }

  String chains(int s) {
    BigInteger count = state(s).chainCount();
    int critical = state(s).critical();
    return Words.capital(chainCount(count))
        + (count.equals(BigInteger.ONE) ? " is critical, " : " are critical, ")
        + critical
        + " of "
        + answer.of().toGo()
        + (answer.of().toGo() == 1 ? " activity." : " activities.");
  }

  static String chainCount(BigInteger count) {
    boolean countable = count.bitLength() < 31;
    String number =
        countable ? Words.number(count.intValueExact()) : "more than two thousand million";
    return number + (count.equals(BigInteger.ONE) ? " chain" : " chains");
  }
}
