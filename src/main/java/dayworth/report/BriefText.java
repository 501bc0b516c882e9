package dayworth.report;

import dayworth.decision.BriefAnswer;
import dayworth.decision.Case;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/** The short answer of {@code dayworth brief} for a terminal. */
public final class BriefText {

  private BriefText() {}

  /**
   * The lines of the answer; the first says it all.
   *
   * @param width columns of the terminal
   */
  public static List<String> lines(BriefAnswer answer, Style style, int width) {
    Case of = answer.of();
    int widest = Math.min(width, CurveText.WIDEST);
    BigDecimal better = answer.curve().asPlanned().total().subtract(answer.finish().total());
    String finish = Wording.when(of, answer.finish().duration(), "on ", "in ");
    String amount = MoneyLook.of(List.of(better)).text(better.abs());
    String sentence =
        "The brief argues for a finish "
            + finish
            + (better.signum() == 0
                ? "."
                : ": "
                    + amount
                    + (better.signum() > 0 ? " better" : " dearer")
                    + " than carrying on.");
    List<String> lines = new ArrayList<>();
    lines.add(style.bold(Wording.answer(sentence, of.currency(), widest)));
    lines.add("");
    lines.addAll(Wording.wrap(CurveText.proof(answer.chosen().curve()), Wording.INDENT, widest));
    return lines;
  }
}
