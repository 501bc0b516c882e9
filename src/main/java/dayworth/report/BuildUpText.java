package dayworth.report;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.Way;
import dayworth.decision.BuildUpAnswer;
import dayworth.decision.Case;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;

/** The short answer of {@code dayworth buildup} for a terminal. */
public final class BuildUpText {

  private final BuildUpAnswer answer;
  private final Case of;
  private final Style style;
  private final int width;

  private BuildUpText(BuildUpAnswer answer, Style style, int width) {
    this.answer = answer;
    this.of = answer.of();
    this.style = style;
    this.width = Math.min(width, CurveText.WIDEST);
  }

  /**
   * The lines of the answer; the first says it all.
   *
   * @param width columns of the terminal
   */
  public static List<String> lines(BuildUpAnswer answer, Style style, int width) {
    return new BuildUpText(answer, style, width).lines();
  }

  /** What is said where there is nothing to build up. */
  public static String nothing(Case of) {
    boolean known = of.inputs().stream().anyMatch(input -> input.name().equals("labour.csv"));
    return known
        ? "No work with labour is to go, so there is nothing to build up."
        : "There is nothing to build up: the case has no labour.csv.";
  }

  private List<String> lines() {
    List<String> lines = new ArrayList<>();
    lines.add(style.bold(Wording.answer(sentence(), of.currency(), width)));
    lines.add("");
    if (answer.asked().isEmpty()) {
      lines.addAll(new SpellSummary(answer).lines(width));
    } else {
      lines.addAll(new SpellLines(answer, answer.shown().get(0)).lines(width));
    }
    lines.add("");
    LossText.of(answer.all().bought()).forEach(text -> prose(lines, text));
    LossText.factor(of).ifPresent(text -> prose(lines, text));
    lines.add("");
    cautions().forEach(text -> prose(lines, text));
    prose(lines, CautionText.WHO_DECIDES);
    lines.add("");
    return lines;
  }

  private String sentence() {
    List<WayFigures> offered =
        answer.shown().stream()
            .flatMap(built -> built.measures().map(way -> new WayFigures(built, way)))
            .filter(figures -> figures.saved().signum() > 0)
            .toList();
    if (offered.isEmpty()) {
      return "No pattern buys any time.";
    }
    Money least =
        offered.stream().flatMap(f -> f.perUnitSaved().stream()).min(Money::compareTo).get();
    String price = MoneyLook.of(List.of(least.cents())).text(least.cents());
    String from = "from " + price + " for each " + of.unit().word() + " saved.";
    if (answer.asked().isPresent()) {
      ActivityBuildUp built = answer.shown().get(0);
      return Wording.safe(id(built))
          + " can be done faster in "
          + Wording.count(offered.size(), "way", "ways")
          + ", "
          + from;
    }
    long activities = offered.stream().map(f -> f.built().activity()).distinct().count();
    return "Working patterns buy time in "
        + Wording.count((int) activities, "activity", "activities")
        + ": "
        + Wording.count(offered.size(), "measure", "measures")
        + ", "
        + from;
  }

  private List<String> cautions() {
    return answer.all().bought().stream()
        .flatMap(pattern -> CautionText.of(pattern, answer.cautions(pattern)).stream())
        .toList();
  }

  private String id(ActivityBuildUp built) {
    return of.network().activity(built.activity()).id();
  }

  private void prose(List<String> lines, String text) {
    lines.addAll(Wording.wrap(text, Wording.INDENT, width));
  }

  /** Weeks of a spell, as lists name them. */
  static String weeks(Way way) {
    return way.spell().roundedWeeks().toPlainString();
  }
}
