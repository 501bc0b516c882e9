package dayworth.report;

import dayworth.decision.Case;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import dayworth.decision.FinishTooEarly;
import dayworth.decision.MeetAnswer;
import dayworth.decision.PlanProof;
import dayworth.decision.Wish;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/** The short answer of {@code dayworth meet} for a terminal. */
public final class MeetText {

  private final MeetAnswer answer;
  private final Case of;
  private final BoughtTable bought;
  private final MoneyLook look;
  private final int width;

  private MeetText(MeetAnswer answer, int width) {
    this.answer = answer;
    this.of = answer.of();
    this.bought = new BoughtTable(answer);
    this.look = bought.look();
    this.width = Math.min(width, CurveText.WIDEST);
  }

  /**
   * The lines of the answer; the first says it all.
   *
   * @param folder where the proof sheet lies, as people know it
   * @param width columns of the terminal
   */
  public static List<String> lines(MeetAnswer answer, String folder, Style style, int width) {
    MeetText text = new MeetText(answer, width);
    List<String> lines = new ArrayList<>();
    lines.add(style.bold(Wording.answer(text.sentence(), text.of.currency(), text.width)));
    lines.add("");
    text.add(lines, text.facts());
    LossText.factor(text.of).ifPresent(said -> text.add(lines, said));
    if (!answer.bought().isEmpty()) {
      lines.add("");
      lines.addAll(text.bought.lines(text.width));
    }
    lines.addAll(text.reasons());
    lines.add("");
    lines.addAll(text.bought.chains(text.width));
    lines.add("");
    text.add(lines, CurveText.proof(answer.curve()));
    text.add(lines, text.sheet(folder));
    return lines;
  }

  /** Nothing where no measure in use is built up from labour hours. */
  private List<String> reasons() {
    SpellReasons reasons =
        new SpellReasons(
            of,
            answer.bought().stream()
                .map(MeetAnswer.Bought::measure)
                .filter(measure -> measure != Plan.NO_MEASURE)
                .toList());
    List<String> lines = new ArrayList<>();
    if (!reasons.isEmpty()) {
      lines.add("");
      add(lines, reasons.sentences());
      add(lines, reasons.cautions());
    }
    return lines;
  }

  /** What is said where the wish cannot come true. */
  public static List<String> tooEarly(Wish wish, FinishTooEarly asked, Style style, int width) {
    String name =
        wish instanceof Wish.ByDate by
            ? Dates.spoken(by.date())
            : Wording.duration(asked.of(), asked.asked());
    List<String> lines = new ArrayList<>(CurveText.tooEarly(name, asked, style, width));
    List<String> rest = new ArrayList<>(restDay(asked.of(), wish, width));
    if (!rest.isEmpty()) {
      rest.add("");
    }
    lines.addAll(2, rest);
    return lines;
  }

  private static List<String> restDay(Case of, Wish wish, int width) {
    if (!(wish instanceof Wish.ByDate by)
        || of.terms().calendar().orElseThrow().isWorked(by.date())) {
      return List.of();
    }
    String said =
        by.ticks() > 0
            ? "It is no working day: to finish by it is to finish on "
                + Dates.spoken(of.terms().calendar().get().finishDate(by.ticks()))
                + ", the working day before."
            : "No working day of the project comes by then.";
    return Wording.wrap(said, Wording.INDENT, width);
  }

  private String sentence() {
    if (answer.wish() instanceof Wish.Within within) {
      return within(within);
    }
    String name = named();
    if (answer.isMetAsPlanned()) {
      return answer.extra().signum() < 0
          ? name + " is met as planned, and for " + savedText() + " less by another plan."
          : name
              + (answer.bought().isEmpty()
                  ? " is met as planned: nothing has to be bought."
                  : " is met as planned; what follows pays by itself.");
    }
    if (answer.extra().signum() < 0) {
      return name + " can be met for " + savedText() + " less" + cost() + " than as planned.";
    }
    String extra = look.text(answer.extra().cents());
    return name + " can be met for " + extra + " of extra" + cost() + ", and for no less.";
  }

  private String within(Wish.Within within) {
    long gained = answer.curve().asPlanned().duration() - answer.finish().duration();
    MoneyLook amounts = MoneyLook.of(List.of(within.most().cents(), answer.extra().cents()));
    String most = amounts.text(within.most().cents());
    if (gained <= 0) {
      return most + " buys no earlier finish than as planned: " + finish() + ".";
    }
    if (answer.extra().signum() <= 0) {
      String saved =
          answer.extra().isZero() ? "" : ", for " + savedText() + " less than as planned";
      return Wording.duration(of, gained) + " cost nothing: " + finish() + saved + ".";
    }
    String which =
        answer.finish().duration() == answer.curve().shortest().duration()
            ? ", the shortest possible"
            : "";
    boolean all = answer.extra().equals(within.most());
    String spent = all ? "" : amounts.text(answer.extra().cents()) + " of ";
    return spent + most + " buys " + Wording.duration(of, gained) + ": " + finish() + which + ".";
  }

  private String cost() {
    return of.momentMoney().running().isEmpty() ? " direct cost" : " direct and running cost";
  }

  private String savedText() {
    return look.text(answer.extra().negate().cents());
  }

  /** The wish as a sentence begins. */
  private String named() {
    if (answer.wish() instanceof Wish.ByDate by) {
      return Dates.spoken(by.date());
    }
    if (answer.wish() instanceof Wish.In in) {
      return answer.isMetAsPlanned()
          ? Wording.duration(of, in.ticks())
          : Wording.finish(of, in.ticks());
    }
    return "";
  }

  private String finish() {
    Dates dates = new Dates(of);
    String duration = Wording.workingDuration(of, answer.finish().duration());
    return dates.areKnown()
        ? dates.spokenFinish("finish on ", answer.finish().duration(), " (" + duration + ")")
        : "finish in " + duration;
  }

  private List<String> facts() {
    List<String> facts = new ArrayList<>();
    facts.addAll(restDay(of, answer.wish(), width).stream().map(String::strip).toList());
    if (answer.isMetAsPlanned()) {
      facts.add("As planned: " + Wording.finish(of, answer.curve().asPlanned().duration()) + ".");
    } else {
      facts.add(durations());
    }
    answer.lastPrice().ifPresent(price -> facts.add(lastPrice(price)));
    if (answer.wish() instanceof Wish.Within) {
      answer.finish().pricePerUnit().ifPresent(price -> facts.add(nextPrice(price)));
    }
    facts.add(comparison());
    return List.of(String.join(" ", facts));
  }

  private String durations() {
    String now = of.network().scale().text(answer.finish().duration());
    return now + " instead of " + Wording.duration(of, answer.curve().asPlanned().duration()) + ".";
  }

  private String lastPrice(Money price) {
    return "The last " + of.unit().word() + " costs " + look(price).text(price.cents()) + ".";
  }

  private String nextPrice(Money price) {
    return "The next " + of.unit().word() + " would cost " + look(price).text(price.cents()) + ".";
  }

  private static MoneyLook look(Money amount) {
    return MoneyLook.of(List.of(amount.cents()));
  }

  private String comparison() {
    CurveAnswer curve = answer.curve();
    Finish least = curve.leastTotal();
    BigDecimal above = answer.finish().total().subtract(least.total());
    if (above.signum() == 0) {
      return "No finish has a lower total.";
    }
    String amount = MoneyLook.of(List.of(above)).text(above);
    Dates dates = new Dates(of);
    String where =
        dates.areKnown()
            ? dates.spokenFinish("", least.duration(), "")
            : Wording.duration(of, least.duration());
    return "In all it is " + amount + " dearer than the least total (" + where + ").";
  }

  private String sheet(String folder) {
    PlanProof sheet = answer.proof();
    String rounding =
        sheet.rounding().signum() == 0
            ? ""
            : ", of which rounding " + sheet.rounding().toPlainString();
    return Wording.safe(
        "Proof sheet: "
            + folder
            + "/proof.csv (plan "
            + total(sheet.planCost())
            + ", bound "
            + total(sheet.bound())
            + rounding
            + (sheet.branchCount() > 1 ? ", the least of " + sheet.branchCount() + " branches" : "")
            + ")");
  }

  private static String total(BigDecimal total) {
    BigDecimal needed = total.stripTrailingZeros();
    return Wording.grouped(needed.scale() < 2 ? needed.setScale(2) : needed);
  }

  private void add(List<String> lines, List<String> prose) {
    prose.forEach(text -> add(lines, text));
  }

  private void add(List<String> lines, String prose) {
    lines.addAll(Wording.wrap(prose, Wording.INDENT, width));
  }
}
