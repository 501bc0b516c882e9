package dayworth.report.picture;

import dayworth.contract.Due;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What the picture of the curve says in words. */
final class CurveWording {

  private final CurveAnswer answer;
  private final Words words;
  private final Amounts amounts;

  CurveWording(CurveAnswer answer, Words words, Amounts amounts) {
    this.answer = answer;
    this.words = words;
    this.amounts = amounts;
  }

  String title() {
    Finish least = answer.leastTotal();
    BigDecimal better = answer.asPlanned().total().subtract(least.total());
    String finish = "Finishing in " + words.time(least.duration()) + " costs least";
    if (better.signum() > 0) {
      return finish + ": " + words.money(better) + " less than " + words.asPlanned();
    }
    return finish + (startsAsPlanned() ? ", " : ", no less than ") + words.asPlanned();
  }

  String note() {
    List<String> said = new ArrayList<>(List.of(words.project() + "."));
    BigDecimal leftOut = amounts.leftOut();
    if (leftOut.signum() == 0) {
      said.add("Money that depends on the finish." + words.amountsIn());
    } else {
      String kinds = amounts.hasFixed() ? " of direct and fixed cost" : " of direct cost";
      said.add(
          "Money that depends on the finish: "
              + words.money(leftOut)
              + kinds
              + " is the same for every finish and is left out.");
    }
    if (answer.least().size() > 1) {
      Finish last = answer.least().get(answer.least().size() - 1);
      said.add(
          Words.count(answer.least().size(), "finish shares", "finishes share")
              + " the least total, down to "
              + words.time(last.duration())
              + ".");
    }
    if (!startsAsPlanned()) {
      Finish planned = answer.asPlanned();
      said.add(
          asPlanned() + ": " + words.time(planned.duration()) + ", total " + total(planned) + ".");
    }
    contractOutside().ifPresent(said::add);
    waste().ifPresent(said::add);
    return String.join(" ", said);
  }

  String description() {
    Finish least = answer.leastTotal();
    List<String> points = new ArrayList<>();
    points.add(point(firstName(), answer.rows().get(0)));
    points.add(point("least total", least));
    answer.atContract().ifPresent(due -> points.add(point("contract finish", due)));
    points.add(point("shortest possible", answer.shortest()));
    return "Money that depends on the finish, against the finish, the longest on the left. "
        + String.join("; ", points)
        + ". All figures are in curve.csv.";
  }

  Label firstPoint() {
    return label(Look.INK, firstName(), answer.rows().get(0));
  }

  Label lastPoint() {
    return label(Look.INK, "Shortest possible", answer.shortest());
  }

  private Label label(java.awt.Color ink, String name, Finish finish) {
    return new Label(
        ink, 1, List.of(name, words.time(finish.duration()), "total " + total(finish)));
  }

  private String firstName() {
    return startsAsPlanned() ? asPlanned() : "Least direct cost";
  }

  private String asPlanned() {
    return words.asPlanned().replace("as ", "As ");
  }

  private boolean startsAsPlanned() {
    Finish first = answer.rows().get(0);
    return answer.asPlanned().duration() == first.duration()
        && answer.asPlanned().total().compareTo(first.total()) == 0;
  }

  private String point(String name, Finish finish) {
    return name + " " + words.time(finish.duration()) + ", " + total(finish);
  }

  private String total(Finish finish) {
    return words.money(amounts.total(finish));
  }

  private Optional<String> contractOutside() {
    long longest = answer.rows().get(0).duration();
    long shortest = answer.shortest().duration();
    return answer
        .of()
        .terms()
        .contractFinish()
        .map(Due::ticks)
        .filter(due -> due > longest || due < shortest)
        .map(
            due ->
                due < 0
                    ? "The contract finish has passed."
                    : "The contract finish, "
                        + words.time(due)
                        + (due > longest ? ", is later than all of these." : ", cannot be met."));
  }

  private Optional<String> waste() {
    Finish crash = answer.crashEverything();
    BigDecimal wasted = crash.total().subtract(answer.shortest().total());
    boolean same = crash.duration() == answer.shortest().duration();
    return same && wasted.signum() > 0
        ? Optional.of(
            "Crashing every activity also gives "
                + words.time(crash.duration())
                + ", at a total of "
                + total(crash)
                + ": "
                + words.money(wasted)
                + " of it is wasted.")
        : Optional.empty();
  }
}
