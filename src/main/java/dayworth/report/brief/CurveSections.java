package dayworth.report.brief;

import dayworth.contract.Terms;
import dayworth.decision.BriefAnswer;
import dayworth.decision.Finish;
import dayworth.network.Activity;
import dayworth.report.brief.page.Part;
import dayworth.report.brief.page.Section;
import java.math.BigDecimal;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What each finish costs, what the next unit of time costs, and what is shortened for it. */
final class CurveSections {

  private final BriefAnswer answer;
  private final Words words;
  private final Outcome outcome;
  private final List<Stretch> stretches;
  private final Numbering numbering;

  CurveSections(
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
  }

  // Money against the finish

  Section curve() {
    String name = numbering.figure();
    Part figure = new Part.Figure(new CurvePicture(answer, words, outcome).picture(name));
    return beside("curve", curveHeading(), figure, name, List.of(new Part.Notes(curveNotes())));
  }

  private String curveHeading() {
    if (!outcome.hasWorth()) {
      return "Each finish has a least cost";
    }
    Finish least = answer.curve().leastTotal();
    return answer.curve().least().size() > 1
        ? "Each finish has a least cost; "
            + Words.number(answer.curve().least().size())
            + " of them share the lowest"
        : "Each finish has a least cost; the lowest of them is "
            + words
                .date(least.duration())
                .map(this::dayAndMonth)
                .orElse(words.time(least.duration()));
  }

  private String dayAndMonth(LocalDate date) {
    return Words.longDate(date).replaceFirst("^\\S+ ", "").replaceFirst(" \\d{4}$", "");
  }

  private List<String> curveNotes() {
    List<String> notes = new ArrayList<>();
    if (outcome.sameForAll().signum() != 0) {
      boolean fixed = !outcome.planned().other().fixed().isZero();
      notes.add(
          "The direct cost of the work "
              + (answer.of().progress().isPresent() ? "to go " : "")
              + "as planned"
              + (fixed ? " and the fixed cost, together " : ", ")
              + words.money(outcome.sameForAll())
              + (fixed ? ", are the same" : ", is the same")
              + " in every choice and left out.");
    }
    if (outcome.hasWorth()) {
      notes.add(shape());
    } else {
      notes.add(
          "The case names no time-related cost, damages or bonus, so every earlier finish only costs"
              + " more.");
    }
    waste().ifPresent(notes::add);
    return notes;
  }

  /** How the total falls and rises, as it really does. */
  private String shape() {
    List<BigDecimal> totals =
        answer.states().stream().map(state -> state.finish().total()).toList();
    int low = 0;
    for (int i = 1; i < totals.size(); i++) {
      if (totals.get(i).compareTo(totals.get(low)) < 0) {
        low = i;
      }
    }
    boolean falls = true;
    for (int i = 1; i < totals.size(); i++) {
      int order = totals.get(i).compareTo(totals.get(i - 1));
      falls &= i <= low ? order <= 0 : order >= 0;
    }
    String unit = words.aUnit();
    String shape =
        falls
            ? low == 0
                ? "The total rises from the first " + words.unit() + " bought on."
                : low == totals.size() - 1
                    ? "The total falls all the way: each "
                        + words.unit()
                        + " is worth what it costs."
                    : "The total falls while "
                        + unit
                        + " is worth more than it costs and rises from then on."
            : "The total does not only fall and then rise: it has several low points, and the lowest"
                + " of them counts.";
    return shape + weekend().map(text -> " " + text).orElse("");
  }

  /** Where damages go by the calendar, several days of them go with one working day. */
  private Optional<String> weekend() {
    if (!answer.of().terms().damages().per().isByDate() || !outcome.hasDamages()) {
      return Optional.empty();
    }
    for (int i = 1; i < answer.states().size(); i++) {
      Finish later = answer.states().get(i - 1).finish();
      Finish sooner = answer.states().get(i).finish();
      LocalDate from = words.date(later.duration()).orElseThrow();
      LocalDate to = words.date(sooner.duration()).orElseThrow();
      boolean across =
          ChronoUnit.DAYS.between(to, from) >= 3 && from.getDayOfWeek() == DayOfWeek.MONDAY;
      if (across && Outcome.damages(later).compareTo(Outcome.damages(sooner)) > 0) {
        return Optional.of(
            "It drops sharply where a finish moves from a Monday back to the week before, because"
                + " a weekend of damages goes with it.");
      }
    }
    return Optional.empty();
  }

  private Optional<String> waste() {
    Finish crash = answer.curve().crashEverything();
    Finish shortest = answer.curve().shortest();
    BigDecimal wasted = crash.total().subtract(shortest.total());
    return crash.duration() == shortest.duration() && wasted.signum() > 0
        ? Optional.of(
            "Crashing every activity reaches the same "
                + words.time(crash.duration())
                + " as the shortest plan. It spends "
                + words.money(wasted)
                + " more, on shortening that moves nothing.")
        : Optional.empty();
  }

  // The price of a unit

  Section price() {
    String name = numbering.figure();
    Part figure =
        stretches.isEmpty()
            ? new Part.Gap("No earlier finish can be bought.", "No plan of this case is shorter.")
            : new Part.Figure(new PricePicture(answer, words, stretches).picture(name));
    return beside("price", priceHeading(), figure, name, List.of(new Part.Notes(priceNotes())));
  }

  private String priceHeading() {
    int chosen = answer.chosenState();
    boolean bought = stretches.subList(0, chosen).stream().allMatch(Stretch::pays);
    Optional<Stretch> next =
        chosen < stretches.size() ? Optional.of(stretches.get(chosen)) : Optional.empty();
    long from = answer.states().get(0).finish().duration();
    long ticks = from - answer.finish().duration();
    if (!outcome.hasWorth() || stretches.isEmpty()) {
      return "What the next " + words.unit() + " costs";
    }
    if (chosen == 0) {
      return next.filter(Stretch::pays).isPresent()
          ? "What the next " + words.unit() + " costs, and what it is worth"
          : "The first " + words.unit() + " costs more than it is worth";
    }
    if (bought && next.filter(Stretch::pays).isEmpty()) {
      String few = words.timeInWords(ticks);
      boolean one = ticks == words.ticksPerUnit();
      return Words.capital(few)
          + (one ? " costs less than it is worth" : " cost less than they are worth")
          + (next.isPresent() ? "; the next does not" : ", all there are");
    }
    return "What the next " + words.unit() + " costs, and what it is worth";
  }

  private List<String> priceNotes() {
    List<String> notes = new ArrayList<>();
    worth().ifPresent(notes::add);
    Terms terms = answer.of().terms();
    boolean reached = answer.curve().atContract().isPresent();
    if (reached && (outcome.hasDamages() || outcome.hasBonus())) {
      boolean bonus = outcome.hasBonus();
      notes.add(
          "Once the contract finish is reached there are no damages left to save"
              + (bonus
                  ? ", only a bonus of "
                      + words.money(terms.bonus().rate())
                      + " "
                      + words.one(terms.bonus().per())
                      + "."
                  : "."));
    }
    if (!answer.of().momentMoney().isNone()) {
      notes.add(
          "Running cost and the money of sections hang on when single activities are done; they are"
              + " in the price, not in the worth.");
    }
    if (stretches.size() > 1) {
      notes.add(
          rises()
              ? "The price rises because more chains hold the finish at once, or because what was"
                  + " cheapest is used up. The section on what is bought gives the reason for each"
                  + " step."
              : "The price does not only rise: running cost and sections change with the plan, and a"
                  + " finish can be cheaper than the one before it.");
    }
    return notes;
  }

  private boolean rises() {
    for (int i = 1; i < stretches.size(); i++) {
      if (stretches.get(i).price().compareTo(stretches.get(i - 1).price()) < 0) {
        return false;
      }
    }
    return true;
  }

  private Optional<String> worth() {
    if (!outcome.hasWorth() || stretches.isEmpty()) {
      return Optional.empty();
    }
    Terms terms = answer.of().terms();
    List<String> made = new ArrayList<>();
    if (outcome.hasTimeRelated()) {
      made.add(
          "time-related cost of "
              + words.money(terms.timeRelated().rate())
              + " "
              + words.one(terms.timeRelated().per()));
    }
    if (outcome.hasDamages()) {
      made.add(
          "damages of "
              + words.money(terms.damages().rate())
              + " "
              + words.one(terms.damages().per()));
    }
    if (made.isEmpty()) {
      return Optional.empty();
    }
    BigDecimal least =
        stretches.stream().map(Stretch::worth).min(BigDecimal::compareTo).orElseThrow();
    BigDecimal most =
        stretches.stream().map(Stretch::worth).max(BigDecimal::compareTo).orElseThrow();
    String range =
        least.compareTo(most) == 0
            ? words.money(least) + " throughout."
            : "from " + words.money(least) + " to " + words.money(most) + ".";
    return Optional.of(
        Words.capital(words.workingUnit().equals("hour") ? "an hour" : "a " + words.workingUnit())
            + " is worth what it saves, "
            + Words.list(made, 2)
            + ": "
            + range);
  }

  // The map

  Section map() {
    String name = numbering.figure();
    MapPicture map = new MapPicture(answer, words);
    List<Part> notes = new ArrayList<>();
    notes.add(map.key());
    notes.add(new Part.Notes(mapNotes(map)));
    return beside(
        "map",
        "What is shortened at each finish" + (map.anyRelaxed() ? ", and what is given back" : ""),
        new Part.Figure(map.picture(name)),
        name,
        notes);
  }

  private List<String> mapNotes(MapPicture map) {
    List<String> notes = new ArrayList<>();
    givenBack().ifPresent(notes::add);
    if (map.rows().quiet() > 0) {
      notes.add(
          Words.capital(Words.count(map.rows().quiet(), "activity is", "activities are"))
              + " never critical nor shortened and not shown.");
    }
    if (map.rows().crowded() > 0) {
      notes.add(
          Words.capital(
                  Words.count(map.rows().crowded(), "more activity is", "more activities are"))
              + " critical or shortened at some finish and not shown for want of room: the rows are"
              + " those of which most is bought. plan.csv and steps.csv have them all.");
    }
    return notes;
  }

  /** The first activity that the chosen plan buys less of than a longer one did. */
  private Optional<String> givenBack() {
    int chosen = answer.chosenState();
    for (int i = 0; i < answer.of().network().size(); i++) {
      int peak = 0;
      for (int s = 0; s <= chosen; s++) {
        if (bought(s, i) > bought(peak, i)) {
          peak = s;
        }
      }
      long back = bought(peak, i) - bought(chosen, i);
      if (back > 0) {
        return Optional.of(givenBack(i, peak, back));
      }
    }
    return Optional.empty();
  }

  private String givenBack(int activity, int peak, long back) {
    Activity one = answer.of().network().activity(activity);
    int end = peak;
    while (bought(end, activity) > bought(answer.chosenState(), activity)) {
      end++;
    }
    boolean single = back == words.ticksPerUnit();
    return Words.capital(words.timeInWords(back))
        + " of "
        + Words.id(one)
        + (single ? " is" : " are")
        + " bought on the way to "
        + words.time(answer.states().get(peak).finish().duration())
        + " and given back on the way to "
        + words.figure(answer.states().get(end).finish().duration())
        + ". A plan that only ever adds would keep "
        + (single ? "it" : "them")
        + ", and pay "
        + words.money(one.slope().times(back))
        + " for nothing.";
  }

  private long bought(int state, int activity) {
    return MapRows.bought(answer, answer.states().get(state), activity);
  }

  private static Section beside(
      String id, String heading, Part figure, String name, List<Part> notes) {
    return new Section(
        id,
        heading,
        List.of(
            new Part.Beside(
                List.of(figure),
                new Part.Remark("Note on " + name.toLowerCase(java.util.Locale.ROOT), notes))));
  }
}
