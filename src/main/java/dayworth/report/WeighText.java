package dayworth.report;

import dayworth.decision.Case;
import dayworth.decision.WeighAnswer;
import dayworth.decision.WeighAnswer.ByExtension;
import dayworth.decision.Weighing;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** The short answer of {@code dayworth weigh} for a terminal. */
public final class WeighText {

  private static final String INDENT = "    ";

  private static final int MOST_EXTENSIONS = 12;

  private final WeighAnswer answer;
  private final Case of;
  private final Style style;
  private final int width;

  private WeighText(WeighAnswer answer, Style style, int width) {
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
  public static List<String> lines(WeighAnswer answer, Style style, int width) {
    return new WeighText(answer, style, width).lines();
  }

  private List<String> lines() {
    Weighing granted = answer.granted();
    ChoiceTable table = new ChoiceTable(granted);
    List<String> lines = new ArrayList<>();
    String sentence = sentence(granted);
    lines.add(style.bold(Wording.answer(sentence, of.currency(), width)));
    lines.add("");
    LossText.factor(of).ifPresent(text -> prose(lines, text));
    lines.addAll(table.lines(width));
    if (!CurveText.ties(granted.curve()).isEmpty()) {
      prose(lines, CurveText.ties(granted.curve()));
    }
    if (!table.leftOut().isEmpty()) {
      lines.add("");
      prose(lines, table.leftOut());
    }
    lines.addAll(new HowFar(granted, style, width).lines());
    answer.byLoss().ifPresent(best -> lines.addAll(new LossRanges(best, style, width).lines()));
    answer.claimed().ifPresent(claimed -> claimed(lines, claimed));
    lines.add("");
    prose(lines, CurveText.proof(granted.curve()));
    lines.add("");
    prose(
        lines,
        "Damages, bonus and entitlement depend on the contract and the law that governs it. This"
            + " is not legal advice: read the contract and take advice from a licensed"
            + " professional."
            + (answer.claimed().isEmpty()
                ? ""
                : " Whether an extension of time is due is not judged here."));
    return lines;
  }

  private String sentence(Weighing weighing) {
    BigDecimal saved = weighing.saved(weighing.best());
    if (saved.signum() <= 0) {
      return "Carry on as planned: no other finish is cheaper.";
    }
    boolean pays = weighing.asItStands().other().damages().signum() > 0;
    return "Finish "
        + Wording.when(of, weighing.best().duration(), "on ", "in ")
        + ": "
        + MoneyLook.of(List.of(saved)).text(saved)
        + " better than carrying on"
        + (pays ? " and paying damages." : ".");
  }

  private void claimed(List<String> lines, Weighing claimed) {
    ChoiceTable table = new ChoiceTable(claimed);
    String due =
        claimed
            .curve()
            .of()
            .terms()
            .contractFinish()
            .map(
                by ->
                    by.date().map(Dates::spoken).orElseGet(() -> Wording.duration(of, by.ticks())))
            .orElseThrow();
    lines.add("");
    String granted = "Were the extension to " + due + " granted, which is claimed and is not: ";
    String better = sentence(claimed);
    String start = better.substring(0, 1).toLowerCase(Locale.ROOT);
    Wording.wrap(granted + start + better.substring(1), Wording.INDENT, width)
        .forEach(line -> lines.add(style.bold(line)));
    lines.add("");
    lines.addAll(table.lines(width));
    lines.addAll(new HowFar(claimed, style, width).lines());
    lines.add("");
    lines.add("  Which finish is best, by the working days of extension");
    extensions().forEach(line -> lines.add(INDENT + line));
  }

  private List<String> extensions() {
    List<ByExtension> all = answer.byExtension().stream().limit(MOST_EXTENSIONS).toList();
    TextColumns columns = new TextColumns(width - INDENT.length());
    columns.add("", false, all.stream().map(WeighText::range).toList());
    Dates dates = new Dates(of);
    if (dates.areKnown()) {
      columns.add("", false, dates.column(all.stream().map(e -> e.best().duration()).toList()));
    }
    columns.add(
        "", true, all.stream().map(e -> Wording.duration(of, e.best().duration())).toList());
    List<String> lines = new ArrayList<>(columns.lines().subList(1, all.size() + 1));
    int left = answer.byExtension().size() - all.size();
    if (left > 0) {
      lines.add(Wording.count(left, "row is", "rows are") + " left out: see result.json");
    }
    return lines;
  }

  private static String range(ByExtension extension) {
    String from = String.format(Locale.ROOT, "%,d", extension.from());
    if (extension.to().isEmpty()) {
      return extension.from() == 0 ? "any" : from + " and more";
    }
    String to = String.format(Locale.ROOT, "%,d", extension.to().get());
    return from.equals(to) ? from : from + " to " + to;
  }

  private void prose(List<String> lines, String text) {
    lines.addAll(Wording.wrap(text, Wording.INDENT, width));
  }
}
